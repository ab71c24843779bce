import { dayOf, dayStart, shiftDay } from "@/lib/costs/period";

/** Months that a trend looks back over, the running one included. */
export const TREND_MONTHS = 12;

/** A month of the shop's calendar. */
export interface Month {
  /** First and last day, as in "2026-07-01". */
  from: string;
  to: string;
  /** UTC milliseconds: `fromAt` belongs to it, `untilAt` no longer does. */
  fromAt: number;
  untilAt: number;
  /** "Jul", and "July 2026" in full. */
  short: string;
  long: string;
}

/**
 * The last twelve months in the shop's zone, oldest first; the last is the one that runs.
 * @param now UTC milliseconds
 */
export function lastMonths(now: number, timeZone: string): Month[] {
  const months: Month[] = [];
  let from = `${dayOf(now, timeZone).slice(0, 7)}-01`;
  let next = `${shiftDay(from, 31).slice(0, 7)}-01`;
  for (let count = 0; count < TREND_MONTHS; count += 1) {
    const at = Date.parse(`${from}T12:00:00Z`);
    const name = (month: "short" | "long", year?: "numeric") =>
      new Intl.DateTimeFormat("en-US", { timeZone: "UTC", month, year }).format(at);
    months.unshift({
      from,
      to: shiftDay(next, -1),
      fromAt: dayStart(from, timeZone),
      untilAt: dayStart(next, timeZone),
      short: name("short"),
      long: name("long", "numeric"),
    });
    next = from;
    from = `${shiftDay(from, -1).slice(0, 7)}-01`;
  }
  return months;
}

/** A month of a class's trend. */
export interface TrendMonth extends Month {
  cases: number;
  /** Parts struck in the runs of the month; 0 where no run was logged. */
  partsStruck: number;
  /** The shop kept cases by then. */
  isRecorded: boolean;
}

export interface ClassTrend {
  months: readonly TrendMonth[];
  cases: number;
  /** Cases per 1,000 parts struck, over the months that have runs; null where none has. */
  perThousand: { rate: number; cases: number; partsStruck: number; months: number } | null;
  /** The two halves of the year; null while the shop has kept cases for less than all of it. */
  halves: { before: number; since: number } | null;
}

/**
 * The trend of a class over the last months.
 * @param counts cases and parts struck of each month, in its order
 * @param shopFirstAt when the shop's first case of any class was opened; null when it has none
 */
export function classTrend(
  months: readonly Month[],
  counts: { cases: readonly number[]; partsStruck: readonly number[] },
  shopFirstAt: number | null,
): ClassTrend {
  const rows = months.map((month, index) => ({
    ...month,
    cases: counts.cases[index] ?? 0,
    partsStruck: counts.partsStruck[index] ?? 0,
    isRecorded: shopFirstAt !== null && shopFirstAt < month.untilAt,
  }));
  const total = (some: readonly TrendMonth[]) => some.reduce((sum, month) => sum + month.cases, 0);
  const half = rows.length / 2;
  const struck = rows.filter((month) => month.partsStruck > 0);
  const partsStruck = struck.reduce((sum, month) => sum + month.partsStruck, 0);
  const first = rows[0];
  return {
    months: rows,
    cases: total(rows),
    perThousand:
      partsStruck > 0
        ? { rate: (1000 * total(struck)) / partsStruck, cases: total(struck), partsStruck, months: struck.length }
        : null,
    halves:
      first && shopFirstAt !== null && shopFirstAt < first.fromAt
        ? { before: total(rows.slice(0, half)), since: total(rows.slice(half)) }
        : null,
  };
}
