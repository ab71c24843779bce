import { InputError } from "@/lib/input-error";

/**
 * Rounds parts of a sum to whole cents so that they still add up to the rounded sum (largest remainder): a bill whose
 * lines do not add up is not believed. Parts are amounts in cents with fractions, 0 or more; the order is kept; ties go
 * to the earlier part. No parts give no cents. Throws `InputError` for a negative, broken or uncountably large part.
 *
 * Example: `splitCents([0.5, 0.5, 1])` is `[1, 0, 1]`.
 */
export function splitCents(exactCents: readonly number[]): number[] {
  let exactTotal = 0;
  let floorTotal = 0;
  const cents = exactCents.slice();
  for (let index = 0; index < cents.length; index += 1) {
    const exact = exactCents[index] ?? 0;
    if (!(exact >= 0)) throw new InputError("cents", "An amount of money is 0 or more.");
    const floor = Math.floor(exact);
    exactTotal += exact;
    floorTotal += floor;
    cents[index] = floor;
  }
  if (!(exactTotal < Number.MAX_SAFE_INTEGER))
    throw new InputError("cents", "This comes to more money than can be counted.");
  let missing = Math.round(exactTotal) - floorTotal;
  while (missing > 0) {
    let best = 0;
    let bestRest = -1;
    for (let index = 0; index < cents.length; index += 1) {
      const rest = (exactCents[index] ?? 0) - (cents[index] ?? 0);
      // A part that was already topped up has a negative rest and cannot win again.
      if (rest > bestRest) {
        best = index;
        bestRest = rest;
      }
    }
    cents[best] = (cents[best] ?? 0) + 1;
    missing -= 1;
  }
  return cents;
}

/**
 * An amount as people write it. Whole units when `whole` is set (headlines), else with cents. Currency is an ISO 4217
 * code. Throws `InputError` for an amount that is not a whole number of cents.
 *
 * Example: `formatMoney(177517, "USD")` is `$1,775.17`; with `{ whole: true }` it is `$1,775`.
 */
export function formatMoney(
  cents: number,
  currency: string,
  options: { whole?: boolean; locale?: string } = {},
): string {
  if (!Number.isSafeInteger(cents)) throw new InputError("cents", "Money is a whole number of cents.");
  const digits = options.whole ? 0 : 2;
  return formatterFor(options.locale ?? "en-US", currency, digits).format(cents / 100);
}

// A number formatter is dear to make and has no state: one for each locale, currency and precision is kept.
const formatters = new Map<string, Intl.NumberFormat>();

function formatterFor(locale: string, currency: string, digits: number): Intl.NumberFormat {
  const key = `${locale}|${currency}|${digits}`;
  const kept = formatters.get(key);
  if (kept) return kept;
  const made = new Intl.NumberFormat(locale, {
    style: "currency",
    currency,
    minimumFractionDigits: digits,
    maximumFractionDigits: digits,
  });
  formatters.set(key, made);
  return made;
}

/** What a stretch of time costs, in cents with fractions (round once, at the end): minutes × cents per hour ÷ 60. */
export function centsForMinutes(minutes: number, centsPerHour: number): number {
  return (minutes * centsPerHour) / 60;
}
