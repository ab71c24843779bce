import { pertMean, timesFactor, type ThreePoint } from "@/lib/costs/pert";
import type { ShopRates } from "@/lib/costs/rates";
import type { CheckedRework } from "@/lib/costs/rework-input";
import { reworkTerms, type CostLine, type ReworkTerm } from "@/lib/costs/rework-terms";
import type { StripPlan } from "@/lib/costs/strip-plan";

/** A plan that is offered. */
export type AllowedPlan = Extract<StripPlan, { allowed: true }>;

/** One uncertain thing and the cents that it may cost at least and at most. */
export interface NamedRange {
  name: string;
  low: number;
  high: number;
}

/** The sums of all terms of a plan. */
export interface Tally {
  meanByLine: Record<CostLine, number>;
  handsOn: ThreePoint;
  tank: ThreePoint;
  /** Least and most cents of each term. */
  ranges: NamedRange[];
}

/** Adds up the terms of a plan: means by line, minutes, and each term's ends. */
export function tallyTerms(facts: CheckedRework, plan: AllowedPlan): Tally {
  const tally: Tally = {
    meanByLine: { labour: 0, line: 0, metalWrittenOff: 0, metalAgain: 0, chemistry: 0, waste: 0, scrapRisk: 0 },
    handsOn: { low: 0, likely: 0, high: 0 },
    tank: { low: 0, likely: 0, high: 0 },
    ranges: [],
  };
  const { quantity, areaDm2, stageFound, partValueCents, rates, times } = facts;
  const { method, steps } = plan;
  const terms = reworkTerms({ quantity, areaDm2, stageFound, partValueCents, rates, times, method, steps });
  const { minutesCorrection: given } = facts;
  const minutesCorrection = typeof given === "number" ? given : given[method];
  for (const term of terms) addTerm(tally, term, rates, minutesCorrection);
  return tally;
}

function addTerm(tally: Tally, term: ReworkTerm, rates: ShopRates, minutesCorrection: number): void {
  const range: NamedRange = { name: term.name, low: 0, high: 0 };
  if (term.handsOnMinutes) {
    const minutes = timesFactor(term.handsOnMinutes, minutesCorrection);
    addTo(tally.handsOn, minutes);
    addCents(tally, range, "labour", minutes, rates.labourCentsPerHour / 60);
  }
  if (term.tankMinutes) {
    addTo(tally.tank, term.tankMinutes);
    addCents(tally, range, "line", term.tankMinutes, rates.lineCentsPerHour / 60);
  }
  if (term.cents) for (const { line, amount } of term.cents) addCents(tally, range, line, amount, 1);
  tally.ranges.push(range);
}

function addCents(tally: Tally, range: NamedRange, line: CostLine, amount: ThreePoint, centsEach: number): void {
  tally.meanByLine[line] += pertMean(amount) * centsEach;
  range.low += amount.low * centsEach;
  range.high += amount.high * centsEach;
}

function addTo(total: ThreePoint, more: ThreePoint): void {
  total.low += more.low;
  total.likely += more.likely;
  total.high += more.high;
}
