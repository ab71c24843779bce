/**
 * A moment as the shop's wall clock shows it: "6 Jul 2026, 14:05".
 * @param at UTC milliseconds
 * @param timeZone IANA name, like "Europe/Stockholm"
 * @throws RangeError for a time zone that does not exist
 */
export function clockWords(at: number, timeZone: string): string {
  return new Intl.DateTimeFormat("en-GB", {
    timeZone,
    day: "numeric",
    month: "short",
    year: "numeric",
    hour: "2-digit",
    minute: "2-digit",
  }).format(at);
}
