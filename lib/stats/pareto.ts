import { InputError } from "@/lib/input-error";

/** One bar: its own share and the share of it and all before it, both 0 to 1. */
export interface ParetoBar<Key extends string = string> {
  key: Key;
  amount: number;
  share: number;
  cumulative: number;
  cumulativeShare: number;
}

/** The bar that gathers what is left over; it stands last however tall. */
export const OTHER = "other";

/**
 * The few causes that cost most, first: amounts (cents, cases) sorted down, with the running total. Equal amounts keep
 * the order in which they came, `other` stands last. With `most`, only that many bars keep their name and the rest is
 * added to `other`. Nothing in gives nothing out; when all amounts are 0 every share is 0, and nothing is hidden.
 * Throws `InputError` for an amount below 0. Source: checked against the qcc manual's example.
 *
 * Example: 94, 80, 66, 33, 27 run up to 31.33, 58, 80, 91 and 100 %.
 */
export function pareto<Key extends string>(
  amounts: readonly { key: Key; amount: number }[],
  most?: number,
): ParetoBar<Key | typeof OTHER>[] {
  for (const { key, amount } of amounts) {
    if (!(amount >= 0 && Number.isFinite(amount)))
      throw new InputError("amounts", `The amount of ${key} is not 0 or more.`);
  }
  if (most !== undefined && !(Number.isInteger(most) && most >= 1))
    throw new InputError("most", "Keep at least one bar.");
  const named = amounts.filter((bar) => bar.key !== OTHER).sort((a, b) => b.amount - a.amount);
  const leftOver = amounts.filter((bar) => bar.key === OTHER);
  const kept: { key: Key | typeof OTHER; amount: number }[] = named.slice(0, most);
  const gathered = [...named.slice(kept.length), ...leftOver];
  if (gathered.length > 0) kept.push({ key: OTHER, amount: gathered.reduce((sum, bar) => sum + bar.amount, 0) });
  return runUp(kept);
}

function runUp<Key extends string>(bars: readonly { key: Key; amount: number }[]): ParetoBar<Key>[] {
  const total = bars.reduce((sum, bar) => sum + bar.amount, 0);
  const shareOf = (amount: number) => (total === 0 ? 0 : amount / total);
  let cumulative = 0;
  return bars.map(({ key, amount }) => {
    cumulative += amount;
    return { key, amount, share: shareOf(amount), cumulative, cumulativeShare: shareOf(cumulative) };
  });
}
