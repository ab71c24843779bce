/**
 * A case's reference: year and month in the shop's time zone, then the running number of that month.
 * @param atMs UTC milliseconds of the snap
 * @param timeZone IANA name of the shop's zone
 * @returns e.g. "2607" for July 2026
 */
export function yearMonth(atMs: number, timeZone: string): string {
  const parts = new Intl.DateTimeFormat("en-GB", { timeZone, year: "2-digit", month: "2-digit" }).formatToParts(atMs);
  const of = (type: string) => parts.find((part) => part.type === type)?.value ?? "00";
  return `${of("year")}${of("month")}`;
}

/** @example formatCaseRef("2607", 42) === "CT-2607-0042" */
export function formatCaseRef(month: string, runningNumber: number): string {
  return `CT-${month}-${String(runningNumber).padStart(4, "0")}`;
}

/** What a reference looks like in a URL or a search field. */
export const CASE_REF_PATTERN = /^CT-\d{4}-\d{4,7}$/;
