import { InputError, requireWhole, type NotEnough } from "@/lib/input-error";

/** One sample: how many were looked at, how many were bad. */
export interface Sample {
  inspected: number;
  bad: number;
}

/** A point of the chart. Limits step with the size of the sample. */
export interface ChartPoint {
  rate: number;
  lower: number;
  upper: number;
  outside: "above" | "below" | "no";
  /** Standard deviations from the centre: what the runs rules read. */
  z: number;
}

export interface ControlChart {
  enough: true;
  centre: number;
  points: ChartPoint[];
}

/** Samples below which a centre line and limits mean little. Source: 20 to 25 is the usual rule, 8 a floor from memory. */
export const LEAST_SAMPLES = 8;

/**
 * Fault rate sample by sample (a week, a run) with three-sigma limits around the mean rate, for samples of different
 * size. Limits are kept within 0 and 1. A sample in which nothing was inspected is an error: leave it out.
 * Too few samples give `{ enough: false }`. A centre found from other samples may be given. Throws `InputError`.
 * Source: Shewhart; NIST/SEMATECH e-Handbook 6.3.3.2.
 *
 * Example: 30 samples of 50 with 347 bad: centre .2313, limits .0524 and .4102.
 */
export function pChart(
  samples: readonly Sample[],
  options: { centre?: number; least?: number } = {},
): ControlChart | NotEnough {
  samples.forEach(checkSample);
  const need = options.least ?? LEAST_SAMPLES;
  if (samples.length < need) return { enough: false, have: samples.length, need };
  const centre = options.centre ?? sumOf(samples, "bad") / sumOf(samples, "inspected");
  if (!(centre >= 0 && centre <= 1)) throw new InputError("centre", "A rate lies between 0 and 1.");
  const points = samples.map(({ inspected, bad }) => {
    const sigma = Math.sqrt((centre * (1 - centre)) / inspected);
    return chartPoint(bad / inspected, centre, sigma, 1);
  });
  return { enough: true, centre, points };
}

/** A point with its three-sigma limits, kept between 0 and `most`. */
export function chartPoint(rate: number, centre: number, sigma: number, most: number): ChartPoint {
  const lower = Math.max(0, centre - 3 * sigma);
  const upper = Math.min(most, centre + 3 * sigma);
  // Half a billionth of slack: a point on its limit is not outside it.
  const outside = rate > upper + 5e-10 ? "above" : rate < lower - 5e-10 ? "below" : "no";
  return { rate, lower, upper, outside, z: sigma === 0 ? 0 : (rate - centre) / sigma };
}

function checkSample({ inspected, bad }: Sample, index: number): void {
  requireWhole(`samples.${index}.inspected`, inspected, 1, Number.MAX_SAFE_INTEGER);
  requireWhole(`samples.${index}.bad`, bad, 0, inspected);
}

function sumOf(samples: readonly Sample[], key: keyof Sample): number {
  return samples.reduce((sum, sample) => sum + sample[key], 0);
}
