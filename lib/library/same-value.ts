/** A value as text with its names in order, so that two that say the same are the same. */
function canonical(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(canonical);
  if (typeof value !== "object" || value === null) return value;
  const entries = Object.entries(value).filter(([, each]) => each !== undefined);
  return Object.fromEntries(
    entries.toSorted(([a], [b]) => (a < b ? -1 : 1)).map(([name, each]) => [name, canonical(each)]),
  );
}

/**
 * Whether two fields say the same, whatever the order of their inner names. A list's order counts.
 * @example sameValue({ a: 1, b: 2 }, { b: 2, a: 1 }) === true
 */
export function sameValue(one: unknown, other: unknown): boolean {
  return JSON.stringify(canonical(one)) === JSON.stringify(canonical(other));
}
