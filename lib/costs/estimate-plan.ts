import { intervalOf, pertMean, type ThreePoint } from "@/lib/costs/pert";
import type { CheckedRework } from "@/lib/costs/rework-input";
import { tallyTerms, type AllowedPlan, type NamedRange, type Tally } from "@/lib/costs/rework-tally";
import { COST_LINE_KEYS, COST_LINES, lostShare, type CostLine } from "@/lib/costs/rework-terms";
import type { StripMethod } from "@/lib/costs/strip-methods";
import { cautionsFor, sourcesFor, type StripStep } from "@/lib/costs/strip-plan";
import { InputError } from "@/lib/input-error";
import { splitCents } from "@/lib/money";
import type { Layer } from "@/lib/plating/deposit-stack";
import { layerMassG } from "@/lib/plating/faraday";
import { metalOf } from "@/lib/plating/metals";

/** A three-point figure with its PERT mean. */
export interface Minutes extends ThreePoint {
  mean: number;
}

/** What one batch costs to put right. Money is whole cents; the lines add up to `meanCents` to the cent. */
export interface ReworkEstimate {
  method: StripMethod;
  meanCents: number;
  low90Cents: number;
  high90Cents: number;
  lines: { key: CostLine; name: string; meanCents: number }[];
  /** Hands-on. */
  minutes: Minutes;
  tankMinutes: Minutes;
  metalWrittenOffG: number;
  /** What widens the range most, widest first: names, and each with its share of the variance. */
  widest: string[];
  spread: { name: string; share: number }[];
  /** How each layer comes off, from the top one down. */
  steps: readonly StripStep[];
  cautions: string[];
  sources: string[];
  /** What was assumed because nobody said. */
  assumed: string[];
}

/** Said on every estimate that had to leave scrap risk out. */
export const NO_PART_VALUE = "No part value given: scrap risk is left out.";

/** The figures of one way, without the words: what is compared, summed and stored. */
export type ReworkFigures = Omit<
  ReworkEstimate,
  "widest" | "spread" | "steps" | "cautions" | "sources" | "assumed"
> & {
  /** Least and most cents of each uncertain thing. */
  ranges: NamedRange[];
};

/** Works a plan out: every uncertain thing is a term; means add by line, variances add over all. */
export function planFigures(facts: CheckedRework, plan: AllowedPlan): ReworkFigures {
  const tally = tallyTerms(facts, plan);
  addThicknessRanges(tally, facts, plan);
  const exactByLine = COST_LINE_KEYS.map((key) => tally.meanByLine[key]);
  const exact = sumOf(exactByLine);
  if (!(exact < Number.MAX_SAFE_INTEGER)) {
    throw new InputError("quantity", "This comes to more money than can be counted.");
  }
  const least = sumOf(tally.ranges.map((range) => range.low));
  const most = sumOf(tally.ranges.map((range) => range.high));
  const interval = intervalOf(exact, varianceOf(tally.ranges), Math.max(0, least), most);
  const lineCents = splitCents(exactByLine);
  const meanCents = sumOf(lineCents);
  return {
    method: plan.method,
    meanCents,
    low90Cents: Math.min(meanCents, Math.round(interval.low90)),
    high90Cents: Math.max(meanCents, Math.round(interval.high90)),
    lines: COST_LINE_KEYS.map((key, index) => ({ key, name: COST_LINES[key], meanCents: lineCents[index] ?? 0 })),
    minutes: withMean(tally.handsOn),
    tankMinutes: withMean(tally.tank),
    metalWrittenOffG: writtenOffG(facts, plan),
    ranges: tally.ranges,
  };
}

/** Puts the words to the figures: what widens the range, cautions, sources, what was assumed. */
export function describeEstimate(facts: CheckedRework, plan: AllowedPlan, figures: ReworkFigures): ReworkEstimate {
  const { ranges, ...rest } = figures;
  const spread = spreadOf(ranges);
  return {
    ...rest,
    widest: spread.filter(({ share }) => share >= LEAST_NAMED_SHARE).map(({ name }) => name),
    spread,
    steps: plan.steps,
    cautions: cautionsFor(plan.steps, facts.baseMetal, facts.stageFound),
    sources: [...sourcesFor(plan.steps), facts.times.source],
    assumed: facts.partValueStated ? [] : [NO_PART_VALUE],
  };
}

function addThicknessRanges(tally: Tally, facts: CheckedRework, plan: AllowedPlan): void {
  for (const [index, layer] of facts.onPart.entries()) {
    const range = thicknessRange(facts, plan, index, layer);
    if (range) tally.ranges.push(range);
  }
}

/**
 * How far the cost moves when one layer is as thin or as thick as it may be, around its mean. Cost is linear in thickness,
 * so the two ends say it all. The range is around 0: the mean is already counted.
 */
function thicknessRange(facts: CheckedRework, plan: AllowedPlan, index: number, layer: Layer): NamedRange | undefined {
  const { thicknessLowUm: low, thicknessHighUm: high } = layer;
  if (low === undefined || high === undefined || low === high) return undefined;
  const costAt = (thicknessUm: number) => {
    const steps = plan.steps.map((step) =>
      step.layer === layer ? { ...step, layer: { ...layer, thicknessUm } } : step,
    );
    const { meanByLine } = tallyTerms(facts, { ...plan, steps });
    return COST_LINE_KEYS.reduce((sum, key) => sum + meanByLine[key], 0);
  };
  const middle = costAt(layer.thicknessUm);
  return {
    name: `Thickness of the ${metalOf(layer.metal).name}, layer ${index + 1}`,
    low: costAt(low) - middle,
    high: costAt(high) - middle,
  };
}

/** Below a twentieth of the spread a contributor is not worth a name. */
const LEAST_NAMED_SHARE = 0.05;

function spreadOf(ranges: readonly NamedRange[]): { name: string; share: number }[] {
  const variance = varianceOf(ranges);
  if (!(variance > 0)) return [];
  return ranges
    .map(({ name, low, high }) => ({ name, share: ((high - low) / 6) ** 2 / variance }))
    .filter(({ share }) => share > 0)
    .sort((a, b) => b.share - a.share);
}

function writtenOffG({ quantity, areaDm2, rates }: CheckedRework, plan: AllowedPlan): number {
  return plan.steps.reduce(
    (sum, step) => sum + layerMassG(step.layer, quantity * areaDm2, step.layer.thicknessUm) * lostShare(step, rates),
    0,
  );
}

function varianceOf(ranges: readonly NamedRange[]): number {
  return ranges.reduce((sum, range) => sum + ((range.high - range.low) / 6) ** 2, 0);
}

function sumOf(amounts: readonly number[]): number {
  return amounts.reduce((sum, amount) => sum + amount, 0);
}

function withMean(minutes: ThreePoint): Minutes {
  const { low, likely, high } = minutes;
  return { low, likely, high, mean: pertMean(minutes) };
}
