import { requireBetween, requireWhole } from "@/lib/input-error";
import { Z_OF_CONFIDENCE } from "@/lib/stats/wilson";

/** Beyond so many more parts it is no plan any more: checking all and checking none then cost nearly the same. */
export const MOST_MORE_PARTS = 100_000;

/** What was looked at so far, and the share above which checking pays (from `inspectAdvice`). */
export interface MoreInput {
  breakEvenRate: number;
  inspected: number;
  bad: number;
}

/**
 * How many more parts it takes until the 95 % Wilson interval leaves the break-even, if bad parts go on coming at the
 * present rate. Wilson's interval is the score test turned round, so it leaves p₀ as soon as (p − p₀)² > z²·p₀(1 − p₀)/n,
 * and n follows without searching. 0 when it has left already. `null`: more than 100,000 more, or nothing looked at yet
 * (no rate to go by). It is a forecast: the next parts may come better or worse. Throws `InputError` naming the field.
 * Source: Wilson, Journal of the American Statistical Association 22 (1927) 209.
 *
 * Example: break-even 2 %, 3 bad of 100: 653 more.
 */
export function morePartsToTell({ breakEvenRate, inspected, bad }: MoreInput): number | null {
  requireBetween("breakEvenRate", breakEvenRate, 0, Number.MAX_VALUE);
  requireWhole("inspected", inspected, 0, Number.MAX_SAFE_INTEGER);
  requireWhole("bad", bad, 0, inspected);
  if (inspected === 0) return null;
  if (breakEvenRate >= 1) return 0;
  const distance = bad / inspected - breakEvenRate;
  if (distance === 0) return null;
  const needed = (Z_OF_CONFIDENCE["95"] ** 2 * breakEvenRate * (1 - breakEvenRate)) / distance ** 2;
  const more = Math.max(0, Math.floor(needed) + 1 - inspected);
  return more > MOST_MORE_PARTS ? null : more;
}

/** A forecast is no exact figure: two figures that count, rounded up. @example aboutParts(653) === 660 */
export function aboutParts(parts: number): number {
  if (parts < 10) return parts;
  const step = 10 ** (Math.floor(Math.log10(parts)) - 1);
  return Math.ceil(parts / step) * step;
}
