import { requireOneOf, requireWhole } from "@/lib/input-error";

/** Two-sided normal quantiles. Source: standard tables of the normal distribution. */
export const Z_OF_CONFIDENCE = { "90": 1.6448536269514722, "95": 1.959963984540054, "99": 2.5758293035489004 } as const;
/** Confidence in percent, as a word of a closed list. */
export type Confidence = keyof typeof Z_OF_CONFIDENCE;

/** A share with its interval, all from 0 to 1. */
export interface ShareInterval {
  low: number;
  high: number;
}

/**
 * Interval of a share seen as `count` in `total` (bad parts among struck parts), by Wilson's score method: honest at
 * 0 of 20 and at 20 of 20, where the textbook interval has no width. With a total of 0 nothing is known: 0 to 1.
 * Throws `InputError` for counts that are not whole, negative, or more than the total.
 * Source: Wilson 1927; Newcombe, Statistics in Medicine 17 (1998) 857, method 3.
 *
 * Example: 0 of 20 at 95 %: 0 to 0.161.
 */
export function wilsonInterval(count: number, total: number, confidence: Confidence = "95"): ShareInterval {
  requireWhole("total", total, 0, Number.MAX_SAFE_INTEGER);
  requireWhole("count", count, 0, total);
  requireOneOf("confidence", confidence, ["90", "95", "99"]);
  if (total === 0) return { low: 0, high: 1 };
  const z2 = Z_OF_CONFIDENCE[confidence] ** 2;
  const share = count / total;
  const centre = share + z2 / (2 * total);
  const half = Math.sqrt(z2 * ((share * (1 - share)) / total + z2 / (4 * total * total)));
  const scale = 1 + z2 / total;
  return {
    // At the ends the exact answer is 0 or 1; rounding would miss it by 1e-17.
    low: count === 0 ? 0 : Math.max(0, (centre - half) / scale),
    high: count === total ? 1 : Math.min(1, (centre + half) / scale),
  };
}
