import type { ShopRates } from "@/lib/costs/rates";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { metalOf, type DepositMetal } from "@/lib/plating/metals";

/**
 * The shop's rates with a price for each of these metals: where the shop has none yet, the starting price stands in and
 * is named in `assumed`. An estimate must not fail, nor quietly count nothing, because a price is missing.
 */
export function withStartingPrices<Rates extends ShopRates>(
  rates: Rates,
  metals: readonly { metal: DepositMetal }[],
): { rates: Rates; assumed: string[] } {
  const missing = unpriced(rates, metals);
  if (missing.length === 0) return { rates, assumed: [] };
  const metalCentsPerG = { ...rates.metalCentsPerG };
  for (const metal of missing) metalCentsPerG[metal] = STARTING_RATES.metalCentsPerG[metal];
  const assumed = missing.map((metal) => `No price set for ${metalOf(metal).name}: the starting price is assumed.`);
  return { rates: { ...rates, metalCentsPerG }, assumed };
}

function unpriced(rates: ShopRates, metals: readonly { metal: DepositMetal }[]): DepositMetal[] {
  const missing: DepositMetal[] = [];
  for (const { metal } of metals) {
    if (rates.metalCentsPerG[metal] === undefined && !missing.includes(metal)) missing.push(metal);
  }
  return missing;
}
