import { allowedWays } from "@/lib/costs/allowed-ways";
import { describeByList, figuresByList, type ReworkEstimate, type ReworkFigures } from "@/lib/costs/estimate-plan";
import { meanByList, priceLists, type PriceList } from "@/lib/costs/price-list";
import { checkReworkInput, type CheckedRework, type ReworkInput } from "@/lib/costs/rework-input";
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
 * takes the cheapest that does not attack the base metal; at the strike that is nearly always polishing.
 * Throws `InputError` naming the field; for a method that attacks the base metal, field `method` with the reason.
 */
export function estimateRework(input: ReworkInput): ReworkEstimate {
  const facts = checkReworkInput(input);
  const list = chosenList(facts);
  const plan = planFor(facts, list.way.method);
  if (!plan.allowed) throw new InputError("method", plan.why);
  return describeByList(facts, list, plan.steps);
}

/** The figures of `estimateRework` without its words, for many cases at once. Throws as it does. */
export function reworkFigures(input: ReworkInput): ReworkFigures {
  const facts = checkReworkInput(input);
  return figuresByList(facts, chosenList(facts));
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

/** Puts seeing it at the strike beside the ways to do it later. Throws `InputError` as `estimateRework`. */
export function compareAtStrike(input: ReworkInput): StrikeComparison {
  const stageFound = input.stageFound === "at-strike" ? "after-final-plate" : input.stageFound;
  const later = estimateRework({ ...input, stageFound });
  const options = compareMethods({ ...input, stageFound });
  const atStrike = estimateRework({ ...input, stageFound: "at-strike", method: undefined });
  return { atStrike, later, options, savedCents: Math.max(0, later.meanCents - atStrike.meanCents) };
}

/** The price list of the way that was given, or of the cheapest that is allowed; of two that cost the same the first. */
function chosenList(facts: CheckedRework): PriceList {
  let best: PriceList | undefined;
  let bestCents = Infinity;
  const lists = listsOf(facts);
  const first = lists[0];
  if (first && lists.length === 1 && facts.method === undefined) return first;
  for (const list of lists) {
    if (facts.method !== undefined && facts.method !== list.way.method) continue;
    const cents = Math.round(meanByList(list, facts.sizes));
    if (best !== undefined && cents >= bestCents) continue;
    best = list;
    bestCents = cents;
  }
  if (best !== undefined) return best;
  const plan = facts.method === undefined ? undefined : planFor(facts, facts.method);
  // Polishing is always allowed, so without a method this is a fault of the table, not of the input.
  const why = plan?.allowed === false ? plan.why : "No way to take this deposit off is in the table.";
  throw new InputError("method", why);
}

/** The price lists of every way that is allowed, in the usual order. */
function listsOf(facts: CheckedRework): readonly PriceList[] {
  return priceLists(allowedWays(facts.table, facts.baseMetal, facts.onPart), facts);
}

function planFor(facts: CheckedRework, method: StripMethod): StripPlan {
  return planStrip(method, facts.baseMetal, facts.onPart, facts.table);
}

function optionFor(facts: CheckedRework, method: StripMethod): MethodOption {
  const plan = planFor(facts, method);
  if (!plan.allowed) return plan;
  const list = listsOf(facts).find((each) => each.way.method === method);
  if (!list) throw new InputError("method", "This way is planned, but not among those that are allowed.");
  return { method, allowed: true, estimate: describeByList(facts, list, plan.steps) };
}
