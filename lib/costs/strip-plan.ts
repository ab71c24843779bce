import { BASE_METAL_TITLES, type BaseMetal, type StageFound } from "@/lib/cases/case-words";
import { CAUTIONS, type CautionKey } from "@/lib/costs/strip-cautions";
import { DISSOLVING_ROWS, POLISHING_ROW } from "@/lib/costs/strip-method-rows";
import {
  STRIP_METHOD_TITLES,
  type DissolvingRow,
  type PolishingRow,
  type StripMethod,
} from "@/lib/costs/strip-methods";
import { THICKEST_STRIKE_UM, type Layer } from "@/lib/plating/deposit-stack";
import { metalOf, type DepositMetal } from "@/lib/plating/metals";

/** How one layer comes off. */
export type StripStep =
  { kind: "dissolve"; layer: Layer; row: DissolvingRow } | { kind: "polish"; layer: Layer; row: PolishingRow };

/** The whole stack by one method, from the top layer down, or why not: at which layer, and for which bath. */
export type StripPlan =
  | { allowed: true; method: StripMethod; steps: StripStep[] }
  | { allowed: false; method: StripMethod; why: string; layer: Layer; refusedRow?: DissolvingRow };

/** The strips to plan with: the shop's own table, or the one that ships. */
export interface StripTable {
  dissolving: readonly DissolvingRow[];
  polishing: PolishingRow;
}
export const SHIPPED_STRIP_TABLE: StripTable = { dissolving: DISSOLVING_ROWS, polishing: POLISHING_ROW };

/**
 * Plans how a stack (base out) comes off a base metal by one method. A bath is taken only where it is known not to go on
 * into the base metal; one that attacks it, or of which nobody knows, is refused with the reason, and no figure is worked
 * out for it. A thin strike left under layers that a bath took off may be polished.
 */
export function planStrip(
  method: StripMethod,
  baseMetal: BaseMetal,
  stack: readonly Layer[],
  table: StripTable = SHIPPED_STRIP_TABLE,
): StripPlan {
  const steps: StripStep[] = [];
  let dissolved = 0;
  for (let index = stack.length - 1; index >= 0; index -= 1) {
    const layer = stack[index];
    if (!layer) continue;
    if (method === "polish-back") {
      steps.push({ kind: "polish", layer, row: table.polishing });
      continue;
    }
    const choice = chooseBath(method, baseMetal, layer, stack[index - 1]?.metal, table);
    if (choice.row) {
      steps.push({ kind: "dissolve", layer, row: choice.row });
      dissolved += 1;
    } else if (dissolved > 0 && index === 0 && layer.thicknessUm <= THICKEST_STRIKE_UM) {
      steps.push({ kind: "polish", layer, row: table.polishing });
    } else {
      return { allowed: false, method, why: choice.why, layer, refusedRow: choice.refusedRow };
    }
  }
  return { allowed: true, method, steps };
}

type BathChoice = { row: DissolvingRow } | { row?: undefined; why: string; refusedRow?: DissolvingRow };

function chooseBath(
  method: "chemical" | "electrolytic",
  baseMetal: BaseMetal,
  layer: Layer,
  beneath: DepositMetal | undefined,
  table: StripTable,
): BathChoice {
  let refused: { why: string; refusedRow: DissolvingRow } | undefined;
  for (const row of table.dissolving) {
    if (row.method !== method || !row.takesOff.includes(layer.metal)) continue;
    const why = whyNot(row, baseMetal, layer, beneath);
    if (why === undefined) return { row };
    refused ??= { why, refusedRow: row };
  }
  const title = STRIP_METHOD_TITLES[method].toLowerCase();
  return refused ?? { why: `No ${title} bath for ${metalOf(layer.metal).name} is in the table.` };
}

/** Why this bath is not taken for this layer on this base metal; undefined: it is. */
function whyNot(
  row: DissolvingRow,
  baseMetal: BaseMetal,
  layer: Layer,
  beneath: DepositMetal | undefined,
): string | undefined {
  const attack = row.attacks[baseMetal];
  if (attack !== undefined) return `It attacks ${nameOf(baseMetal)}. ${attack}`;
  if (!row.safeOn.includes(baseMetal))
    return `Nobody vouches for it on ${nameOf(baseMetal)}. Try it on a scrap piece, or ask the supplier.`;
  if (row.needsBeneath !== undefined && row.needsBeneath !== beneath)
    return `It works only where ${metalOf(row.needsBeneath).name} lies right beneath the ${metalOf(layer.metal).name}.`;
  return undefined;
}

function nameOf(baseMetal: BaseMetal): string {
  return baseMetal === "other" ? "a base metal that is not named" : BASE_METAL_TITLES[baseMetal].toLowerCase();
}

/** Cautions that concern steel only, and would be noise on brass. */
const STEEL_ONLY: ReadonlySet<CautionKey> = new Set<CautionKey>(["highStrengthSteel", "keepDry", "pitting"]);

/** The cautions of a plan, strong ones first. Ones that concern steel only are left out elsewhere. */
export function cautionsFor(steps: readonly StripStep[], baseMetal: BaseMetal, stageFound: StageFound): string[] {
  const isSteel = baseMetal === "steel" || baseMetal === "iron";
  const keys = new Set<CautionKey>();
  for (const { kind, layer, row } of steps) {
    for (const key of row.cautions) if (isSteel || !STEEL_ONLY.has(key)) keys.add(key);
    if (kind === "polish" && layer.metal === "Ni") keys.add("nickelDust");
    if (kind === "polish" && stageFound !== "at-strike") keys.add("edges");
  }
  keys.add("sheetAndPermits");
  const stopFirst = [...keys].sort((a, b) => Number(CAUTIONS[b].stop) - Number(CAUTIONS[a].stop));
  return stopFirst.map((key) => CAUTIONS[key].words);
}

/** Where the solutions and rates of a plan come from, in words. */
export function sourcesFor(steps: readonly StripStep[]): string[] {
  const sources = new Set<string>();
  for (const step of steps) {
    const { name } = metalOf(step.layer.metal);
    if (step.kind === "polish") {
      sources.add(`Polishing: ${step.row.source}`);
    } else {
      sources.add(`${step.row.solution}, for ${name}: ${step.row.source}`);
      sources.add(`Rate for ${name}: ${step.row.rateSource}`);
      sources.add(`Metal that a litre holds: ${step.row.holdingSource ?? "from memory"}`);
    }
  }
  return [...sources];
}
