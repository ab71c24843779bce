import { intervalOf, type ThreePoint } from "@/lib/costs/pert";
import {
  emptyFigures,
  FIGURE_AT,
  meanByList,
  multiplyOut,
  varianceByList,
  type PriceList,
} from "@/lib/costs/price-list";
import { batchSizes, type CheckedRework } from "@/lib/costs/rework-input";
import { COST_LINE_KEYS, COST_LINES, type CostLine } from "@/lib/costs/rework-terms";
import type { StripMethod } from "@/lib/costs/strip-methods";
import { cautionsFor, sourcesFor, type StripStep } from "@/lib/costs/strip-plan";
import { InputError } from "@/lib/input-error";
import { splitCents } from "@/lib/money";
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
export type ReworkFigures = Omit<ReworkEstimate, "widest" | "spread" | "steps" | "cautions" | "sources" | "assumed">;

/** Filled anew for each batch; what is worked out is copied out of them before anything else can run. */
const SUMS = emptyFigures();
const EXACT: number[] = COST_LINE_KEYS.map(() => Number.NaN);

/**
 * Multiplies a price list out for a batch: means add by line, variances add over all. Money is rounded to cents once,
 * here. Throws `InputError` when it comes to more money than can be counted.
 */
export function figuresByList(facts: CheckedRework, list: PriceList): ReworkFigures {
  const sums = multiplyOut(list, facts.sizes, SUMS);
  let exactCents = 0;
  for (let line = 0; line < EXACT.length; line += 1) exactCents += EXACT[line] = sums[line] ?? 0;
  if (!(exactCents < Number.MAX_SAFE_INTEGER)) {
    throw new InputError("quantity", "This comes to more money than can be counted. Give fewer parts.");
  }
  const spread = thicknessRanges(facts, list);
  const least = sumOfRanges(spread, "low", sums[FIGURE_AT.leastCents] ?? 0);
  const most = sumOfRanges(spread, "high", sums[FIGURE_AT.mostCents] ?? 0);
  const variance = varianceByList(list, facts.sizes) + varianceOf(spread);
  const { low90, high90 } = intervalOf(exactCents, variance, Math.max(0, least), most);
  const meanCents = Math.round(exactCents);
  return {
    method: list.way.method,
    meanCents,
    low90Cents: Math.min(meanCents, Math.round(low90)),
    high90Cents: Math.max(meanCents, Math.round(high90)),
    lines: namedLines(splitCents(EXACT)),
    minutes: minutesAt(sums, FIGURE_AT.handsOnLow),
    tankMinutes: minutesAt(sums, FIGURE_AT.tankLow),
    metalWrittenOffG: sums[FIGURE_AT.metalLostG] ?? 0,
  };
}

const NAMED_LINES = COST_LINE_KEYS.map((key) => ({ key, name: COST_LINES[key] }));

function namedLines(lineCents: readonly number[]): ReworkFigures["lines"] {
  return NAMED_LINES.map(({ key, name }, line) => ({ key, name, meanCents: lineCents[line] ?? 0 }));
}

/** Figures and words of a way: what widens the range, cautions, sources, what was assumed. */
export function describeByList(facts: CheckedRework, list: PriceList, steps: readonly StripStep[]): ReworkEstimate {
  const spread = sharesOf([...namedRanges(list, facts.sizes), ...thicknessRanges(facts, list)]);
  return {
    ...figuresByList(facts, list),
    widest: spread.filter(({ share }) => share >= LEAST_NAMED_SHARE).map(({ name }) => name),
    spread,
    steps,
    cautions: cautionsFor(steps, facts.baseMetal, facts.stageFound),
    sources: [...sourcesFor(steps), facts.times.source],
    assumed: facts.partValueStated ? [] : [NO_PART_VALUE],
  };
}

/** One uncertain thing and the cents that it may cost at least and at most. */
interface NamedRange {
  name: string;
  low: number;
  high: number;
}

/** Each uncertain thing of a batch; things that move together are one. */
function namedRanges({ spreads }: PriceList, sizes: readonly number[]): NamedRange[] {
  const ranges: NamedRange[] = [];
  let low = 0;
  let high = 0;
  for (const { name, size, withNext, lowCents, highCents } of spreads) {
    low += lowCents * (sizes[size] ?? 0);
    high += highCents * (sizes[size] ?? 0);
    if (withNext) continue;
    ranges.push({ name, low, high });
    low = 0;
    high = 0;
  }
  return ranges;
}

const SURE: readonly NamedRange[] = [];

/**
 * How far the cost moves when one layer is as thin or as thick as it may be, around its mean. Cost is linear in thickness,
 * so the two ends say it all. The range is around 0: the mean is already counted.
 */
function thicknessRanges(facts: CheckedRework, list: PriceList): readonly NamedRange[] {
  if (facts.thicknessKnown) return SURE;
  return facts.onPart.flatMap((layer, index): NamedRange[] => {
    if (layer.thicknessLowUm === undefined || layer.thicknessHighUm === undefined) return [];
    const costAt = (thicknessUm: number) => {
      const onPart = facts.onPart.with(index, { ...layer, thicknessUm });
      return meanByList(list, batchSizes({ ...facts, onPart }));
    };
    const middle = costAt(layer.thicknessUm);
    const name = `Thickness of the ${metalOf(layer.metal).name}, layer ${index + 1}`;
    return [{ name, low: costAt(layer.thicknessLowUm) - middle, high: costAt(layer.thicknessHighUm) - middle }];
  });
}

function sumOfRanges(ranges: readonly NamedRange[], end: "low" | "high", start: number): number {
  let sum = start;
  for (const range of ranges) sum += range[end];
  return sum;
}

function varianceOf(ranges: readonly NamedRange[]): number {
  let variance = 0;
  for (const { low, high } of ranges) variance += ((high - low) / 6) ** 2;
  return variance;
}

/** Below a twentieth of the spread a contributor is not worth a name. */
const LEAST_NAMED_SHARE = 0.05;

function sharesOf(ranges: readonly NamedRange[]): { name: string; share: number }[] {
  const variance = varianceOf(ranges);
  if (!(variance > 0)) return [];
  return ranges
    .map(({ name, low, high }) => ({ name, share: ((high - low) / 6) ** 2 / variance }))
    .filter(({ share }) => share > 0)
    .sort((a, b) => b.share - a.share);
}

/** Low, likely and high stand one behind the other. */
function minutesAt(sums: Float64Array, at: number): Minutes {
  const low = sums[at] ?? 0;
  const likely = sums[at + 1] ?? 0;
  const high = sums[at + 2] ?? 0;
  return { low, likely, high, mean: (low + 4 * likely + high) / 6 };
}
