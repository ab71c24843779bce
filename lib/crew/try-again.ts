/**
 * How long until something may be tried again, in words, rounded up so that it never promises too early.
 * @param waitMs milliseconds, 0 or more
 * @throws RangeError when `waitMs` is negative or not a number
 * @example tryAgainWords(61_000) === "in 2 minutes"
 */
export function tryAgainWords(waitMs: number): string {
  if (!(waitMs >= 0)) throw new RangeError("waitMs must be 0 or more");
  const minutes = Math.max(1, Math.ceil(waitMs / 60_000));
  return minutes === 1 ? "in a minute" : `in ${minutes} minutes`;
}
