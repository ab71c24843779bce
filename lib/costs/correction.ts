import { InputError, type NotEnough } from "@/lib/input-error";

/** One done rework: what the estimate said and what the card recorded, in the same unit (hands-on minutes, or cents). */
export interface EstimatedAndRecorded {
  estimated: number;
  recorded: number;
}

/** Pairs below which a ratio says more about luck than about the shop. */
export const LEAST_PAIRS = 8;
/** The estimate's own standing, in pairs: with as many recorded ones, the correction goes half the way. From memory. */
export const PRIOR_PAIRS = 8;

/** No correction is above this: a record twenty times the estimate is a slip of the keyboard, or another kind of work. */
export const MOST_CORRECTION = 20;

/** What later estimates are multiplied by. */
export interface Correction {
  enough: true;
  pairs: number;
  /** All recorded over all estimated. */
  rawRatio: number;
  /** The raw ratio drawn towards 1, the more so the fewer pairs there are; above 0, at most `MOST_CORRECTION`. */
  ratio: number;
}

/**
 * How this shop's real rework compares to the estimate, for one class and method: total recorded over total estimated,
 * shrunk towards 1 by `pairs / (pairs + 8)`. Fewer than 8 pairs: `{ enough: false }`, and estimates stay as they are.
 * Throws `InputError` for an estimate that is not above 0 or a record below 0.
 *
 * Example: 8 pairs estimated at 10 and recorded at 14: raw 1.4, ratio 1.2.
 */
export function correctionFrom(pairs: readonly EstimatedAndRecorded[]): Correction | NotEnough {
  let estimatedTotal = 0;
  let recordedTotal = 0;
  for (const [index, { estimated, recorded }] of pairs.entries()) {
    if (!(estimated > 0 && Number.isFinite(estimated)))
      throw new InputError(`pairs.${index}.estimated`, "An estimate is above 0.");
    if (!(recorded >= 0 && Number.isFinite(recorded)))
      throw new InputError(`pairs.${index}.recorded`, "A record is 0 or more.");
    estimatedTotal += estimated;
    recordedTotal += recorded;
  }
  if (pairs.length < LEAST_PAIRS) return { enough: false, have: pairs.length, need: LEAST_PAIRS };
  const rawRatio = recordedTotal / estimatedTotal;
  const weight = pairs.length / (pairs.length + PRIOR_PAIRS);
  return {
    enough: true,
    pairs: pairs.length,
    rawRatio,
    ratio: Math.min(MOST_CORRECTION, 1 + (rawRatio - 1) * weight),
  };
}
