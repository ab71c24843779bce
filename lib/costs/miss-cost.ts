import type { BaseMetal } from "@/lib/cases/case-words";
import { moneyAtRisk } from "@/lib/costs/case-cost";
import type { MinutesCorrections } from "@/lib/costs/estimate-record";
import type { ShopRates } from "@/lib/costs/rates";
import type { StripTable } from "@/lib/costs/strip-plan";
import type { Layer } from "@/lib/plating/deposit-stack";

/** Own cases below which the estimate stands in: a mean of seven says more about luck than about the shop. */
export const LEAST_LATER_CASES = 8;

/** What the shop's closed cases cost, by where the fault was found. */
export interface OwnCost {
  laterCases: number;
  laterParts: number;
  laterCents: number;
  strikeCases: number;
  strikeParts: number;
  strikeCents: number;
}

/** A job with the parts that were struck of it. */
export interface MixJob {
  parts: number;
  areaDm2: number;
  baseMetal: BaseMetal;
  /** From the base out. */
  stack: readonly Layer[];
  partValueCents: number | null;
}

export interface EstimateBasis {
  /** Parts that usually show the fault together: set-up is shared among them. */
  batch: number;
  rates: ShopRates;
  table?: StripTable;
  minutesCorrection?: MinutesCorrections;
}

/** Cents a part, and in words where they come from. */
export interface MissCost {
  cents: number;
  from: string;
}

/**
 * What a bad part costs more when it goes on to the final plate than when it is held at the strike: from the shop's own
 * closed cases where at least eight were found later, and eight at the strike; else the estimate for the jobs that it
 * strikes, weighted by their parts. 0 when later was no dearer. Null: too few cases, and no job to estimate from.
 */
export function missCost(
  own: OwnCost,
  ownWords: string,
  jobs: readonly MixJob[],
  basis: EstimateBasis,
): MissCost | null {
  if (own.laterCases >= LEAST_LATER_CASES && own.strikeCases >= LEAST_LATER_CASES) {
    const cents = own.laterCents / own.laterParts - own.strikeCents / own.strikeParts;
    const from = `mean of the shop’s own ${own.laterCases} cases found later, less that of ${own.strikeCases} found at the strike, ${ownWords}`;
    return { cents: Math.max(0, cents), from };
  }
  const estimated = estimateMiss(jobs, basis);
  if (estimated === null) return null;
  const have = Math.min(own.laterCases, own.strikeCases);
  const jobWords = jobs.length === 1 ? "the job" : `the ${jobs.length} jobs`;
  return {
    cents: estimated,
    from: `estimate for ${jobWords} struck, weighted by parts, until ${LEAST_LATER_CASES} own cases are there (${have} so far, ${ownWords})`,
  };
}

/** Mean over the parts struck; null when nothing was. */
function estimateMiss(jobs: readonly MixJob[], { batch, ...basis }: EstimateBasis): number | null {
  let cents = 0;
  let parts = 0;
  for (const { parts: struck, ...job } of jobs) {
    const later = moneyAtRisk({ ...job, ...basis, quantity: batch, stageFound: "at-strike" });
    cents += ((later.meanCents - later.rightNowCents) / batch) * struck;
    parts += struck;
  }
  return parts === 0 ? null : Math.max(0, cents / parts);
}
