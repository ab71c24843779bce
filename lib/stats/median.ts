/**
 * The exact middle of these numbers; with an even count the mean of the middle two. Null when there is none.
 *
 * Example: of 12, 30 and 18 it is 18; of 12 and 18 it is 15.
 */
export function median(values: readonly number[]): number | null {
  const sorted = values.toSorted((a, b) => a - b);
  const middle = Math.floor(sorted.length / 2);
  const upper = sorted[middle];
  if (upper === undefined) return null;
  const lower = sorted[middle - 1];
  return sorted.length % 2 === 1 || lower === undefined ? upper : (lower + upper) / 2;
}
