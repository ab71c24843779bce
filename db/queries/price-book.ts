import { minutesCorrections, type CorrectionRow, type MinutesCorrections } from "@/lib/costs/estimate-record";
import { ratesAt } from "@/lib/costs/rates";
import type { StripTable } from "@/lib/costs/strip-plan";
import type { Handle } from "../open";
import { listCorrections } from "./estimate-record";
import { listRates, type DatedRates } from "./rates";
import { readStripTables } from "./strip-table";

/** What the prices of one shop's cases rest on besides the case. Each part is read when it is first asked for, and once. */
export interface PriceBook {
  /** Throws `InputError` when the shop has no rates at all. */
  ratesAt: (at: number) => DatedRates;
  stripTableAt: (at: number) => StripTable;
  correctionsOf: (classSlug: string | null) => MinutesCorrections;
}

/** Opens a shop's price book as it stands. Good for one call: what is set later is not in it. */
export function openPriceBook(db: Handle, shopId: number): PriceBook {
  let rates: DatedRates[] | undefined;
  let tableAt: ((at: number) => StripTable) | undefined;
  let record: CorrectionRow[] | undefined;
  const corrections = new Map<string | null, MinutesCorrections>();
  return {
    ratesAt: (at) => ratesAt((rates ??= listRates(db, shopId)), at),
    stripTableAt: (at) => (tableAt ??= readStripTables(db, shopId))(at),
    correctionsOf: (classSlug) => {
      const known = corrections.get(classSlug);
      if (known) return known;
      const found = minutesCorrections((record ??= listCorrections(db, shopId)), classSlug);
      corrections.set(classSlug, found);
      return found;
    },
  };
}
