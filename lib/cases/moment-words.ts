const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;
const DAY_MS = 24 * HOUR_MS;

/**
 * How long something waits, in the fewest words that say it: minutes under an hour, hours and minutes under a day,
 * then days and hours.
 * @param waitedMs milliseconds, 0 or more; a clock that runs behind counts as 0
 * @example waitWords(38 * 60_000) === "38 min"
 * @example waitWords(125 * 60_000) === "2 h 05"
 */
export function waitWords(waitedMs: number): string {
  const waited = Math.max(0, waitedMs);
  if (waited < HOUR_MS) return `${Math.floor(waited / MINUTE_MS)} min`;
  if (waited < DAY_MS) {
    const minutes = Math.floor((waited % HOUR_MS) / MINUTE_MS);
    return `${Math.floor(waited / HOUR_MS)} h ${String(minutes).padStart(2, "0")}`;
  }
  const days = Math.floor(waited / DAY_MS);
  const hours = Math.floor((waited % DAY_MS) / HOUR_MS);
  const dayWords = days === 1 ? "1 day" : `${days} days`;
  return days < 3 && hours > 0 ? `${dayWords} ${hours} h` : dayWords;
}

/**
 * A moment on the shop's wall clock, short: the year shows only when it is not this one.
 * @param at UTC milliseconds
 * @param timeZone IANA name of the shop's zone
 * @example momentWords(Date.UTC(2026, 5, 22, 8, 14), "UTC", Date.UTC(2026, 6, 1)) === "22 Jun 08:14"
 */
export function momentWords(at: number, timeZone: string, now: number): string {
  const yearOf = (moment: number) => new Intl.DateTimeFormat("en-GB", { timeZone, year: "numeric" }).format(moment);
  const day = new Intl.DateTimeFormat("en-GB", { timeZone, day: "numeric", month: "short" }).format(at);
  const time = new Intl.DateTimeFormat("en-GB", { timeZone, hour: "2-digit", minute: "2-digit" }).format(at);
  const year = yearOf(at);
  return year === yearOf(now) ? `${day} ${time}` : `${day} ${year} ${time}`;
}

/** A day on the shop's calendar: "1 Jun 2026". */
export function dayWords(at: number, timeZone: string): string {
  return new Intl.DateTimeFormat("en-GB", { timeZone, day: "numeric", month: "short", year: "numeric" }).format(at);
}
