import type { BaseMetal, StageFound } from "@/lib/cases/case-words";
import type { StripMethod } from "@/lib/costs/strip-methods";
import { planStrip, type StripTable } from "@/lib/costs/strip-plan";
import { strikeOf, type Layer } from "@/lib/plating/deposit-stack";

interface PartFacts {
  baseMetal: BaseMetal;
  stageFound: StageFound;
  /** The job's whole deposit from the base out; null: nobody said. */
  stack: readonly Layer[] | null;
  table?: StripTable;
}

/** Why a method is not offered for a part as it stands, in a sentence; null when it is. */
export function methodRefusal({ baseMetal, stageFound, stack, table }: PartFacts, method: StripMethod): string | null {
  if (stack === null) return null;
  const plan = planStrip(method, baseMetal, stageFound === "at-strike" ? strikeOf(stack) : stack, table);
  return plan.allowed ? null : plan.why;
}
