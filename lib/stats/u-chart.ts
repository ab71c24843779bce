import { InputError, requirePositive, requireWhole, type NotEnough } from "@/lib/input-error";
import { chartPoint, LEAST_SAMPLES, type ControlChart } from "@/lib/stats/p-chart";

/** One sample: how many faults, over how many units (parts, dm², shifts; a fraction is fine). */
export interface FaultCount {
  faults: number;
  units: number;
}

/**
 * Faults per unit, sample by sample, with three-sigma limits, for samples of different size; a part may carry several
 * faults, so the rate may exceed 1. Lower limits are kept at 0. Too few samples give `{ enough: false }`.
 * Throws `InputError`. Source: Montgomery, Introduction to Statistical Quality Control, u chart.
 *
 * Example: 153 faults over 107.5 units: centre 1.4233.
 */
export function uChart(
  samples: readonly FaultCount[],
  options: { centre?: number; least?: number } = {},
): ControlChart | NotEnough {
  for (const [index, { faults, units }] of samples.entries()) {
    requireWhole(`samples.${index}.faults`, faults, 0, Number.MAX_SAFE_INTEGER);
    requirePositive(`samples.${index}.units`, units, Number.MAX_SAFE_INTEGER);
  }
  const need = options.least ?? LEAST_SAMPLES;
  if (samples.length < need) return { enough: false, have: samples.length, need };
  const faults = samples.reduce((sum, sample) => sum + sample.faults, 0);
  const units = samples.reduce((sum, sample) => sum + sample.units, 0);
  const centre = options.centre ?? faults / units;
  if (!(centre >= 0 && Number.isFinite(centre))) throw new InputError("centre", "A rate is 0 or more.");
  const points = samples.map((sample) =>
    chartPoint(sample.faults / sample.units, centre, Math.sqrt(centre / sample.units), Infinity),
  );
  return { enough: true, centre, points };
}
