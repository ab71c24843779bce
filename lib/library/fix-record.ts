import type { Outcome } from "@/lib/cases/case-words";
import type { NotEnough } from "@/lib/input-error";
import { median } from "@/lib/stats/median";
import { wilsonInterval } from "@/lib/stats/wilson";
import { LEAST_CASES } from "./shop-share";

/** One rework card that used a fix, once its re-strike was looked at. */
export interface FixTry {
  fixSlug: string;
  /** Reference of its case. */
  ref: string;
  round: number;
  outcome: Outcome;
  /** Recorded on the ticked steps of the card; null where none was written down. */
  spentMinutes: number | null;
}

/** How a fix did in this shop against one class. */
export interface FixRecord {
  tries: readonly FixTry[];
  sound: number;
  /** 95 % range of the share that came out sound (0 to 1), or how many tries are missing for one. */
  range: { enough: true; low: number; high: number } | NotEnough;
  /** Exact median of a card's recorded minutes, over those that have any. */
  medianMinutes: number | null;
  timed: number;
}

/**
 * What became of a fix's tries. A try worked when its re-strike was sound; another fault counts as not worked, because
 * the part was not right afterwards.
 *
 * Example: 7 sound of 9 is a range of 0.453 to 0.937.
 */
export function fixRecord(tries: readonly FixTry[]): FixRecord {
  const sound = tries.filter((each) => each.outcome === "sound").length;
  const minutes = tries.flatMap((each) => each.spentMinutes ?? []);
  return {
    tries,
    sound,
    range:
      tries.length < LEAST_CASES
        ? { enough: false, have: tries.length, need: LEAST_CASES }
        : { enough: true, ...wilsonInterval(sound, tries.length) },
    medianMinutes: median(minutes),
    timed: minutes.length,
  };
}

/** The record of each fix that was tried, by its slug; tries keep their order. */
export function recordsByFix(tries: readonly FixTry[]): Map<string, FixRecord> {
  const slugs = new Set(tries.map((each) => each.fixSlug));
  return new Map([...slugs].map((slug) => [slug, fixRecord(tries.filter((each) => each.fixSlug === slug))]));
}
