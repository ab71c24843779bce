import { OTHER, pareto } from "@/lib/stats/pareto";

export interface LedgerRow {
  key: string;
  label: string;
  cases: number;
  parts: number;
  /** Cents. */
  cost: number;
  /** Of the total, 0 to 1. */
  share: number;
  /** Running share down to this row, 0 to 1. */
  cumulative: number;
}

interface Amount {
  key: string;
  label: string;
  cases: number;
  parts: number;
  costCents: number;
}

/**
 * The ledger's rows, dearest first, with their running share. With `most`, the rest is gathered into one last row.
 * The costs of the rows add up to the total to the cent.
 */
export function ledgerRows(amounts: readonly Amount[], most?: number): { rows: LedgerRow[]; totalCents: number } {
  const totalCents = amounts.reduce((sum, each) => sum + each.costCents, 0);
  const bars = pareto(
    amounts.map((each) => ({ key: each.key, amount: each.costCents })),
    most,
  );
  const kept = new Set(bars.map((bar) => bar.key));
  const rows = bars.map((bar): LedgerRow => {
    const own = amounts.filter((each) =>
      bar.key === OTHER ? !kept.has(each.key) || each.key === OTHER : each.key === bar.key,
    );
    return {
      key: bar.key,
      label: bar.key === OTHER ? `Other, ${own.length}` : (own[0]?.label ?? bar.key),
      cases: own.reduce((sum, each) => sum + each.cases, 0),
      parts: own.reduce((sum, each) => sum + each.parts, 0),
      cost: bar.amount,
      share: bar.share,
      cumulative: bar.cumulativeShare,
    };
  });
  return { rows, totalCents };
}

/**
 * How many of the first rows make up the vital few: those that reach 80 % of the money together (Juran's rule of
 * thumb, common practice). At least one where there is any money.
 */
export function vitalFew(rows: readonly LedgerRow[]): number {
  const reached = rows.findIndex((row) => row.cumulative >= 0.8);
  return reached === -1 ? rows.length : reached + 1;
}
