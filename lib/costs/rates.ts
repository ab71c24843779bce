import { InputError, requireBetween } from "@/lib/input-error";
import { METALS, metalOf, type DepositMetal } from "@/lib/plating/metals";

/**
 * What a shop pays and charges itself, from a date on. Rows are added, never changed; a case keeps the rates of its day.
 * All rates in cents of the shop's one currency, before tax. A rate may have a fraction of a cent (nickel costs 1.8
 * cents a gram); amounts are whole cents and are rounded once, at the end.
 */
export interface ShopRates {
  /** UTC milliseconds. */
  validFromAt: number;
  labourCentsPerHour: number;
  /** Heat, power, air and rent of the tanks while a part occupies them. */
  lineCentsPerHour: number;
  metalCentsPerG: Readonly<Partial<Record<DepositMetal, number>>>;
  /** Share of a stripped metal that comes back as money, 0 to 1. A metal left out: nothing. Polishing brings nothing back. */
  recoveryShare: Readonly<Partial<Record<DepositMetal, number>>>;
  solutionCentsPerL: number;
  wasteCentsPerL: number;
  /** Wheels, abrasive and cloths for a minute of polishing. */
  abrasiveCentsPerMinute: number;
}

/** No rate is above this: ten million in whole money. Beyond it is a slip of the keyboard. */
export const HIGHEST_RATE_CENTS = 1e9;

/** The rates that are one number each. */
export const PLAIN_RATES = [
  "labourCentsPerHour",
  "lineCentsPerHour",
  "solutionCentsPerL",
  "wasteCentsPerL",
  "abrasiveCentsPerMinute",
] as const;

/** Throws `InputError` naming the first rate that is missing, negative or absurd. */
export function checkRates(rates: ShopRates): void {
  for (const field of PLAIN_RATES) requireBetween(field, rates[field], 0, HIGHEST_RATE_CENTS);
  if (!Number.isFinite(rates.validFromAt))
    throw new InputError("validFromAt", "Give the day from which the rates hold.");
  for (const symbol of Object.keys(METALS) as DepositMetal[]) {
    const price = rates.metalCentsPerG[symbol];
    if (price !== undefined) requireBetween(`metalCentsPerG.${symbol}`, price, 0, HIGHEST_RATE_CENTS);
    const share = rates.recoveryShare[symbol];
    if (share !== undefined) requireBetween(`recoveryShare.${symbol}`, share, 0, 1);
  }
}

/** Price of a metal, cents per g. Throws `InputError` when the shop has none for it: a quiet zero would lie. */
export function metalPrice(rates: ShopRates, metal: DepositMetal): number {
  const price = rates.metalCentsPerG[metal];
  if (price === undefined)
    throw new InputError(`metalCentsPerG.${metal}`, `Give the shop's price for ${metalOf(metal).name}.`);
  return price;
}

/**
 * The rates that held at a moment: the row with the latest start not after it; of two with the same start the later in
 * the list, because a mistake is corrected by a later row. Before the first row, the first row: a case older than the
 * shop's first rates is costed with them. Throws `InputError` when the shop has no rates at all.
 */
export function ratesAt<Rates extends Pick<ShopRates, "validFromAt">>(list: readonly Rates[], at: number): Rates {
  let held: Rates | undefined;
  let first: Rates | undefined;
  for (const row of list) {
    if (row.validFromAt <= at && (held === undefined || row.validFromAt >= held.validFromAt)) held = row;
    if (first === undefined || row.validFromAt <= first.validFromAt) first = row;
  }
  const found = held ?? first;
  if (found === undefined) throw new InputError("rates", "The shop has no rates yet. Set them first.");
  return found;
}
