/**
 * The time of day on the shop's wall clock.
 * @param at UTC milliseconds
 * @param timeZone IANA name
 * @example timeOfDay(Date.UTC(2026, 6, 14, 7, 12), "Europe/Stockholm") === "09:12"
 */
export function timeOfDay(at: number, timeZone: string): string {
  return new Intl.DateTimeFormat("en-GB", { timeZone, hour: "2-digit", minute: "2-digit" }).format(at);
}

/**
 * Day and time on the shop's wall clock, without the year: for tags and cards, which are young.
 * @example dayAndTime(Date.UTC(2026, 6, 14, 7, 12), "Europe/Stockholm") === "14 Jul, 09:12"
 */
export function dayAndTime(at: number, timeZone: string): string {
  const day = new Intl.DateTimeFormat("en-GB", { timeZone, day: "numeric", month: "short" }).format(at);
  return `${day}, ${timeOfDay(at, timeZone)}`;
}
