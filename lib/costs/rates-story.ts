import { rateChanges, type RateChange, type RateFigures } from "@/lib/costs/rate-fields";

interface DatedRow {
  id: number;
  validFromAt: number;
}

/**
 * Rows of rates with what each changed against the row that held before it, and which one holds now. A row that another
 * one with the same start corrected never holds.
 * @param rows the latest start first; of two with the same start the later entered first
 */
export function ratesStory<Row extends DatedRow & { rates: RateFigures }>(
  rows: readonly Row[],
  now: number,
  currency: string,
): { row: Row; standing: "ahead" | "now" | "before"; changes: RateChange[] | null }[] {
  const started = rows.find((row) => row.validFromAt <= now);
  // Before the first row's start, the first row holds: `ratesAt` says so too.
  const held = started ?? rows.at(-1);
  return rows.map((row, index) => {
    const before = rows[index + 1];
    return {
      row,
      standing: row === held ? "now" : row.validFromAt > now ? "ahead" : "before",
      changes: before ? rateChanges(before.rates, row.rates, currency) : null,
    };
  });
}
