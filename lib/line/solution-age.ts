const DAY_MS = 86_400_000;

/** How a solution stands against the days that the shop gives it. */
export interface SolutionAge {
  /** Whole days since it was made up, the first day being 1. */
  day: number;
  windowDays: number;
  /** Days past the window; 0 inside it. */
  daysOver: number;
  /** Age over window: 0 fresh, 1 spent, more when over. */
  share: number;
  words: string;
}

/**
 * A solution's age in the words of the line strip.
 * @param madeUpAt UTC milliseconds
 * @param windowDays days from make-up to the planned change, above 0
 * @example solutionAge(0, 14, 5 * 86_400_000).words === "day 6 of 14"
 */
export function solutionAge(madeUpAt: number, windowDays: number, now: number): SolutionAge {
  const days = Math.max(0, (now - madeUpAt) / DAY_MS);
  const day = Math.floor(days) + 1;
  const daysOver = Math.max(0, Math.floor(days) - windowDays);
  const words = daysOver > 0 ? `${daysOver} ${daysOver === 1 ? "day" : "days"} over` : `day ${day} of ${windowDays}`;
  return {
    day,
    windowDays,
    daysOver,
    share: days / windowDays,
    words: day > windowDays && daysOver === 0 ? "change due" : words,
  };
}
