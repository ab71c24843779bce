import { InputError } from "@/lib/input-error";

/** A figure that nobody knows exactly: the least it will be, what it will most likely be, the most. */
export interface ThreePoint {
  low: number;
  likely: number;
  high: number;
}

/** Two-sided 90 % of a normal distribution. */
export const Z_90 = 1.6448536269514722;

/** Writes a three-point figure shortly: `threePoint(5, 8, 14)`. Throws `InputError` when it does not run upward. */
export function threePoint(low: number, likely: number, high: number): ThreePoint {
  return checkThreePoint("threePoint", { low, likely, high });
}

/** The figure itself, when it is finite and runs from low over likely to high. Throws `InputError` for the field. */
export function checkThreePoint(field: string, value: ThreePoint): ThreePoint {
  const { low, likely, high } = value;
  if (!(low <= likely && likely <= high && Number.isFinite(low) && Number.isFinite(high))) {
    throw new InputError(field, "Give low, likely and high in rising order.");
  }
  return value;
}

/**
 * Mean of a three-point figure, (low + 4·likely + high)/6.
 * Source: Malcolm, Roseboom, Clark and Fazar, Operations Research 7 (1959) 646.
 *
 * Example: 5, 8, 14 has mean 8.5.
 */
export function pertMean({ low, likely, high }: ThreePoint): number {
  return (low + 4 * likely + high) / 6;
}

/** Variance of a three-point figure, ((high − low)/6)². Same source. Example: 5, 8, 14 has variance 2.25. */
export function pertVariance({ low, high }: ThreePoint): number {
  return ((high - low) / 6) ** 2;
}

/** A sum of independent three-point figures. */
export interface PertSum {
  mean: number;
  standardDeviation: number;
  low90: number;
  high90: number;
}

/**
 * Sum of independent figures: means add, variances add. The 90 % interval is the normal one, kept within the least and
 * the most that the sum can be. No figures sum to 0.
 *
 * Example: tasks with means 3.17, 8.5, 4.17, 2 and deviations 0.5, 1.5, 0.5, 0.33 take 17.83, deviation 1.69.
 */
export function sumPert(figures: readonly ThreePoint[]): PertSum {
  let mean = 0;
  let variance = 0;
  let least = 0;
  let most = 0;
  for (const figure of figures) {
    mean += pertMean(figure);
    variance += pertVariance(figure);
    least += figure.low;
    most += figure.high;
  }
  return intervalOf(mean, variance, least, most);
}

/** Mean with its 90 % interval from a mean, a variance and the ends that cannot be passed. */
export function intervalOf(mean: number, variance: number, least: number, most: number): PertSum {
  const standardDeviation = Math.sqrt(variance);
  const half = Z_90 * standardDeviation;
  return {
    mean,
    standardDeviation,
    low90: Math.min(mean, Math.max(least, mean - half)),
    high90: Math.max(mean, Math.min(most, mean + half)),
  };
}

/** The figure times a factor of 0 or more. */
export function timesFactor({ low, likely, high }: ThreePoint, factor: number): ThreePoint {
  return { low: low * factor, likely: likely * factor, high: high * factor };
}

/** Sum of two figures that move together: a slow day makes both long. */
export function addTogether(a: ThreePoint, b: ThreePoint): ThreePoint {
  return { low: a.low + b.low, likely: a.likely + b.likely, high: a.high + b.high };
}

/** One over a figure above 0: a high rate is a short time. */
export function inverseOf({ low, likely, high }: ThreePoint): ThreePoint {
  return { low: 1 / high, likely: 1 / likely, high: 1 / low };
}

/** A figure without doubt. */
export function certainly(amount: number): ThreePoint {
  return { low: amount, likely: amount, high: amount };
}
