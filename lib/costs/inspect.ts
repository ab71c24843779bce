import { InputError, requireBetween, requirePositive, requireWhole } from "@/lib/input-error";
import { wilsonInterval } from "@/lib/stats/wilson";

/** Is looking at every strike worth it? Money in cents. */
export interface InspectInput {
  /** What it costs to check one part at the strike. */
  checkCost: number;
  /** What it costs when a bad part goes on to the final plate. */
  missCost: number;
  /** Parts looked at in the runs that the answer rests on, and how many of them were bad. */
  inspected: number;
  bad: number;
}

export type InspectAdvice = "check-all" | "check-none" | "too-few-runs";

export interface InspectAnswer {
  /** Share of bad parts above which checking all pays. May be above 1: then it never does. */
  breakEvenRate: number;
  /** Share of bad parts seen; absent when nothing was looked at. */
  rate?: number;
  /** 95 % interval of the rate. */
  interval: [low: number, high: number];
  advice: InspectAdvice;
  sources: string[];
}

/**
 * Deming's all-or-none rule: check every part when the share of bad ones lies above checkCost/missCost, none when below;
 * there is no third best. The share is known only as an interval (Wilson), so where that spans the break-even the answer
 * is "too few runs". A check that costs as much as a miss is never worth it. Throws `InputError` naming the field.
 * Source: Deming, Out of the Crisis, chapter 15.
 *
 * Example: a check of 1, a miss of 50, 300 bad of 10,000: break-even 2 %, seen 3 %, check all.
 */
export function inspectAdvice({ checkCost, missCost, inspected, bad }: InspectInput): InspectAnswer {
  requireBetween("checkCost", checkCost, 0, 1e12);
  requirePositive("missCost", missCost, 1e12);
  requireWhole("inspected", inspected, 0, Number.MAX_SAFE_INTEGER);
  requireWhole("bad", bad, 0, inspected);
  const breakEvenRate = checkCost / missCost;
  if (!Number.isFinite(breakEvenRate)) {
    throw new InputError("missCost", "So small a cost has no break-even that can be counted. Give a greater one.");
  }
  const { low, high } = wilsonInterval(bad, inspected);
  return {
    breakEvenRate,
    ...(inspected > 0 ? { rate: bad / inspected } : {}),
    interval: [low, high],
    advice: adviceFor(breakEvenRate, low, high),
    sources: [
      "Deming, Out of the Crisis, chapter 15 (all or none)",
      "Wilson interval: Newcombe, Statistics in Medicine 17 (1998) 857",
    ],
  };
}

function adviceFor(breakEvenRate: number, low: number, high: number): InspectAdvice {
  if (breakEvenRate >= 1 || high < breakEvenRate) return "check-none";
  return low > breakEvenRate ? "check-all" : "too-few-runs";
}
