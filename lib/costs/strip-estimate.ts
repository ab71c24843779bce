import { describeEstimate, planFigures, type ReworkEstimate, type ReworkFigures } from "@/lib/costs/estimate-plan";
import { checkReworkInput, type CheckedRework, type ReworkInput } from "@/lib/costs/rework-input";
import type { AllowedPlan } from "@/lib/costs/rework-tally";
import { STRIP_METHODS, type DissolvingRow, type StripMethod } from "@/lib/costs/strip-methods";
import { planStrip, type StripPlan } from "@/lib/costs/strip-plan";
import { InputError } from "@/lib/input-error";
import type { Layer } from "@/lib/plating/deposit-stack";

/** One way to take the deposit off: with its estimate, or refused with the reason. */
export type MethodOption =
  | { method: StripMethod; allowed: true; estimate: ReworkEstimate }
  | { method: StripMethod; allowed: false; why: string; layer: Layer; refusedRow?: DissolvingRow };

/**
 * What it costs to put a batch right at the stage at which the fault was found: labour, line time, metal written off and
 * put on again, chemistry, waste and scrap risk (the design's section 2), as mean with a 90 % range. Without a method it
 * takes polishing at the strike, later the cheapest that does not attack the base metal.
 * Throws `InputError` naming the field; for a method that attacks the base metal, field `method` with the reason.
 */
export function estimateRework(input: ReworkInput): ReworkEstimate {
  const facts = checkReworkInput(input);
  const { plan, figures } = workOut(facts);
  return describeEstimate(facts, plan, figures);
}

/** The figures of `estimateRework` without its words, for many cases at once. Throws as it does. */
export function reworkFigures(input: ReworkInput): ReworkFigures {
  return workOut(checkReworkInput(input)).figures;
}

/** Every way to take it off, in the order polish back, chemical, electrolytic; refused ones with the reason and no figure. */
export function compareMethods(input: ReworkInput): MethodOption[] {
  const facts = checkReworkInput(input);
  return STRIP_METHODS.map((method) => optionFor(facts, method));
}

/** The same fault at the strike and after the final plate (or at the later stage that was given). */
export interface StrikeComparison {
  atStrike: ReworkEstimate;
  later: ReworkEstimate;
  options: MethodOption[];
  /** What seeing it at the strike saves, mean against mean; never below 0. */
  savedCents: number;
}

/** Puts polishing back at the strike beside the ways to do it later. Throws `InputError` as `estimateRework`. */
export function compareAtStrike(input: ReworkInput): StrikeComparison {
  const stageFound = input.stageFound === "at-strike" ? "after-final-plate" : input.stageFound;
  const later = estimateRework({ ...input, stageFound });
  const options = compareMethods({ ...input, stageFound });
  const atStrike = estimateRework({ ...input, stageFound: "at-strike", method: "polish-back" });
  return { atStrike, later, options, savedCents: Math.max(0, later.meanCents - atStrike.meanCents) };
}

interface WorkedOut {
  plan: AllowedPlan;
  figures: ReworkFigures;
}

function workOut(facts: CheckedRework): WorkedOut {
  const method = facts.method ?? (facts.stageFound === "at-strike" ? "polish-back" : undefined);
  if (method === undefined) return workOutCheapest(facts);
  const plan = planFor(facts, method);
  if (!plan.allowed) throw new InputError("method", plan.why);
  return { plan, figures: planFigures(facts, plan) };
}

function workOutCheapest(facts: CheckedRework): WorkedOut {
  let best: WorkedOut | undefined;
  for (const method of STRIP_METHODS) {
    const plan = planFor(facts, method);
    if (!plan.allowed) continue;
    const figures = planFigures(facts, plan);
    if (best === undefined || figures.meanCents < best.figures.meanCents) best = { plan, figures };
  }
  // Polishing is always allowed, so this is a fault of the table, not of the input.
  if (best === undefined) throw new InputError("method", "No way to take this deposit off is in the table.");
  return best;
}

function planFor(facts: CheckedRework, method: StripMethod): StripPlan {
  return planStrip(method, facts.baseMetal, facts.onPart, facts.table);
}

function optionFor(facts: CheckedRework, method: StripMethod): MethodOption {
  const plan = planFor(facts, method);
  if (!plan.allowed) return plan;
  return { method, allowed: true, estimate: describeEstimate(facts, plan, planFigures(facts, plan)) };
}
