import type { NotEnough } from "@/lib/input-error";
import { wilsonInterval } from "@/lib/stats/wilson";

/** Cases below which a share says more about luck than about the shop. */
export const LEAST_CASES = 8;

/** What this shop saw of one cause, beside what the shelf expects. Shares are 0 to 1. */
export interface ShareHere {
  enough: true;
  cases: number;
  of: number;
  share: number;
  /** 95 % range of the share, by Wilson. */
  low: number;
  high: number;
}

/**
 * A cause's share of a class's cases in this shop. Fewer than 8 cases of the class: `{ enough: false }`.
 * Throws `InputError` for counts that are not whole, negative, or more than all.
 * @param cases cases of the class that were put down to this cause
 * @param of cases of the class with any named cause
 *
 * Example: 18 of 20 is a share of 0.9, with a range of 0.699 to 0.972.
 */
export function shareHere(cases: number, of: number): ShareHere | NotEnough {
  const { low, high } = wilsonInterval(cases, of);
  if (of < LEAST_CASES) return { enough: false, have: of, need: LEAST_CASES };
  return { enough: true, cases, of, share: cases / of, low, high };
}

interface RankedCause {
  slug: string;
  /** The shelf's share, 0 to 1. */
  likelihood: number;
  here: ShareHere | NotEnough;
}

/** Causes likeliest first: by this shop's own share where it has cases enough, among equals and else by the shelf's. */
export function byLikelihood<Cause extends RankedCause>(causes: readonly Cause[]): Cause[] {
  const own = ({ here }: RankedCause) => (here.enough ? here.share : 0);
  return causes.toSorted((a, b) => own(b) - own(a) || b.likelihood - a.likelihood || (a.slug < b.slug ? -1 : 1));
}
