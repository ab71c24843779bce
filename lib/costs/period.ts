import { InputError } from "@/lib/input-error";

/** A stretch of the shop's calendar: whole days, in the shop's time zone. */
export interface Period {
  /** First and last day, as in "2026-07-01". */
  from: string;
  to: string;
  /** UTC milliseconds: `fromAt` belongs to it, `untilAt` no longer does. */
  fromAt: number;
  untilAt: number;
}

const DAY = /^(\d{4})-(\d{2})-(\d{2})$/;
const HOUR_MS = 3_600_000;

/** The day that a moment falls on in a time zone. @example dayOf(0, "UTC") === "1970-01-01" */
export function dayOf(at: number, timeZone: string): string {
  return new Intl.DateTimeFormat("en-CA", { timeZone, year: "numeric", month: "2-digit", day: "2-digit" }).format(at);
}

/**
 * The moment a day begins in a time zone. Found by looking, so that days of 23 and 25 hours come out right.
 * @throws InputError when the text is no day of the calendar
 */
export function dayStart(day: string, timeZone: string, field = "day"): number {
  const parts = DAY.exec(day);
  const noon = parts ? Date.UTC(Number(parts[1]), Number(parts[2]) - 1, Number(parts[3]), 12) : Number.NaN;
  if (!parts || Number.isNaN(noon) || dayOf(noon, "UTC") !== day) {
    throw new InputError(field, "Write the day as in 2026-07-14.");
  }
  // No zone is further than 14 hours from UTC; half hours are the smallest step of any shift.
  let at = noon - 26 * HOUR_MS;
  while (dayOf(at, timeZone) < day) at += HOUR_MS / 2;
  return at;
}

/** The day after. */
export function nextDay(day: string): string {
  return shiftDay(day, 1);
}

/** A day moved by whole days. */
export function shiftDay(day: string, days: number): string {
  const parts = DAY.exec(day);
  if (!parts) throw new InputError("day", "Write the day as in 2026-07-14.");
  return dayOf(Date.UTC(Number(parts[1]), Number(parts[2]) - 1, Number(parts[3]) + days, 12), "UTC");
}

/**
 * A period by its first and last day.
 * @throws InputError naming `from` or `to`
 */
export function periodOf(from: string, to: string, timeZone: string): Period {
  const fromAt = dayStart(from, timeZone, "from");
  dayStart(to, timeZone, "to");
  if (to < from) throw new InputError("to", "The last day lies before the first one. Turn them round.");
  return { from, to, fromAt, untilAt: dayStart(nextDay(to), timeZone, "to") };
}

export const SPANS = ["month", "quarter", "year"] as const;
export type Span = (typeof SPANS)[number];
const SPAN_DAYS: Record<Span, number> = { month: 30, quarter: 91, year: 365 };
export const SPAN_WORDS: Record<Span, string> = { month: "30 days", quarter: "91 days", year: "365 days" };

/** The last 30, 91 or 365 days, today included. */
export function lastSpan(span: Span, now: number, timeZone: string): Period {
  const to = dayOf(now, timeZone);
  return periodOf(shiftDay(to, 1 - SPAN_DAYS[span]), to, timeZone);
}
