import type { StageFound } from "@/lib/cases/case-words";
import {
  checkRecorded,
  estimatedCost,
  recordedCost,
  scrappedCost,
  workOnlyCost,
  type CaseCost,
  type CaseCostInput,
} from "@/lib/costs/case-cost-lines";
import { NO_PART_VALUE, type ReworkFigures } from "@/lib/costs/estimate-plan";
import { withStartingPrices } from "@/lib/costs/metal-prices";
import { reworkFigures } from "@/lib/costs/strip-estimate";
import { requireWhole } from "@/lib/input-error";
import { USUAL_STRIKE_UM, type Layer } from "@/lib/plating/deposit-stack";

// The types belong to the function and are met beside it.
export type { CaseCost, CaseCostInput };

/** Area of a part of which nobody wrote down the area: a hand-sized fitting. From memory. */
export const USUAL_AREA_DM2 = 1;
/** Deposit of a job of which nobody wrote down the deposit: strike and 5 µm of nickel. From memory. */
export const USUAL_STACK: readonly Layer[] = [
  { metal: "Cu", thicknessUm: USUAL_STRIKE_UM },
  { metal: "Ni", thicknessUm: 5 },
];
const NO_AREA = `No area given: ${USUAL_AREA_DM2} dm² a part is assumed.`;
const NO_STACK = `No deposit given: ${USUAL_STRIKE_UM} µm copper and 5 µm nickel are assumed.`;

/**
 * What a case costs: the one function behind every case's figure. While it is open, the estimate at its stage, once per
 * round; when its cards are done, the recorded minutes and materials in place of the estimate; scrapped, the parts' value
 * and the work that went in; released, conceded or regraded without work, only the minutes recorded.
 * Throws `InputError` naming the field.
 */
export function caseCost(input: CaseCostInput): CaseCost {
  const rounds = requireWhole("rounds", input.rounds ?? 1, 1, 100);
  if (input.recorded) checkRecorded(input.recorded);
  const closing = input.closing ?? null;
  if (closing === "released" || closing === "concession" || closing === "regrade")
    return workOnlyCost(input, "no rework");
  if (closing === "scrap") {
    const { estimate, assumed } = estimateCase({ ...input, method: null });
    return scrappedCost(input, estimate, assumed);
  }
  const { estimate, assumed } = estimateCase(input);
  return input.recorded ? recordedCost(input, estimate, assumed, rounds) : estimatedCost(estimate, assumed, rounds);
}

/** What is at stake while a part hangs: let it go on and fail later, or put it right now. */
export interface MoneyAtRisk {
  meanCents: number;
  low90Cents: number;
  high90Cents: number;
  /** Mean of putting it right at the stage where it is now. */
  rightNowCents: number;
  assumed: string[];
}

/** The stage at which a fault shows that is let through at this one. */
const NEXT_STAGE: Record<StageFound, StageFound> = {
  "at-strike": "after-final-plate",
  "after-final-plate": "returned",
  returned: "returned",
};

/**
 * What it costs if the part goes on and fails later: at the strike, stripping it after the final plate; after the final
 * plate, having it sent back. Beside it, what it costs now. Throws `InputError` naming the field.
 */
export function moneyAtRisk(input: Omit<CaseCostInput, "recorded" | "closing" | "rounds">): MoneyAtRisk {
  const later = estimateCase({ ...input, method: null, stageFound: NEXT_STAGE[input.stageFound] });
  const now = estimateCase(input);
  const { meanCents, low90Cents, high90Cents } = later.estimate;
  return { meanCents, low90Cents, high90Cents, rightNowCents: now.estimate.meanCents, assumed: later.assumed };
}

function estimateCase(input: CaseCostInput): { estimate: ReworkFigures; assumed: string[] } {
  const assumed: string[] = [];
  if (input.areaDm2 === null) assumed.push(NO_AREA);
  if (input.stack === null) assumed.push(NO_STACK);
  const stack = input.stack ?? USUAL_STACK;
  const { rates, assumed: prices } = withStartingPrices(input.rates, stack);
  assumed.push(...prices);
  if (input.partValueCents === null) assumed.push(NO_PART_VALUE);
  const estimate = reworkFigures({
    quantity: input.quantity,
    areaDm2: input.areaDm2 ?? USUAL_AREA_DM2,
    baseMetal: input.baseMetal,
    stack,
    stageFound: input.stageFound,
    method: input.method ?? undefined,
    partValueCents: input.partValueCents ?? undefined,
    minutesCorrection: input.minutesCorrection,
    table: input.table,
    rates,
  });
  return { estimate, assumed };
}
