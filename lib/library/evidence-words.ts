import { dayWords } from "@/lib/cases/moment-words";
import { counted } from "@/lib/cases/part-words";
import type { ClassTrend } from "./class-trend";
import type { FixRecord } from "./fix-record";
import { LEAST_CASES } from "./shop-share";

const percent = (share: number) => Math.round(share * 100);

/**
 * What became of a fix, in a sentence with its range.
 * @example 7 sound of 9: "Worked 7 of 9; 45 to 94 %"
 */
export function workedWords({ tries, sound, range }: FixRecord): string {
  if (tries.length === 0) return "Not tried here yet";
  const worked = `Worked ${sound} of ${tries.length}`;
  return range.enough ? `${worked}; ${percent(range.low)} to ${percent(range.high)} %` : worked;
}

/** The median of the cards' minutes, and over how many cards it is. */
export function minutesWords({ medianMinutes, timed, tries }: FixRecord): string | null {
  if (medianMinutes === null) return null;
  const over = timed === tries.length ? "" : `, of the ${timed} with minutes`;
  return `Median ${medianMinutes} min a card${over}`;
}

/** The sentence over a trend's drawing. */
export function trendWords({ months, cases, halves }: ClassTrend): string {
  if (cases === 0) return "No case in the last 12 months.";
  const most = months.reduce((best, month) => (month.cases > best.cases ? month : best));
  const sum = `${counted(cases, "case")} in the last 12 months, most in ${most.long}: ${most.cases}.`;
  if (!halves || cases < LEAST_CASES) return sum;
  return `${sum} ${halves.since} in the last six months, ${halves.before} in the six before.`;
}

/** Cases per 1,000 parts struck, in a sentence; null where no run says how many were struck. */
export function rateWords({ perThousand, cases }: ClassTrend): string | null {
  if (!perThousand) return null;
  const { rate, partsStruck, months } = perThousand;
  const parts = new Intl.NumberFormat("en-US").format(partsStruck);
  if (cases < LEAST_CASES) return null;
  return `${rate.toFixed(1)} cases per 1,000 parts struck: ${perThousand.cases} against ${parts} parts in the runs of ${counted(months, "month")}.`;
}

/** What a trend rests on. */
export function trendRests(shopFirstAt: number | null, timeZone: string): string {
  const since = shopFirstAt === null ? "" : ` The shop has kept cases since ${dayWords(shopFirstAt, timeZone)}.`;
  return `Confirmed cases by the month in which they were opened; the last month still runs. The lists behind the figures also hold parts that were called so and wait for a second look.${since}`;
}
