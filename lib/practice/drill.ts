/** Bounds of a drill. */
export const DRILL_LIMITS = { photos: 40, titleChars: 80, people: 60 } as const;

/** How one person stands in a drill. */
export interface DrillStanding {
  /** Photos called so far. */
  called: number;
  right: number;
  /** Photos that the drill asks for, or fewer where the shop has no more of them. */
  photos: number;
  isDone: boolean;
}

/**
 * How a person stands in a drill.
 * @param wanted photos that the senior asked for
 * @param askable photos that could still be asked, not counting those called
 */
export function drillStanding(done: { called: number; right: number }, wanted: number, askable: number): DrillStanding {
  const photos = Math.min(wanted, done.called + askable);
  return { ...done, photos, isDone: done.called >= photos };
}

/** "4 of 10, 3 right", "Done: 7 of 10 right", "Not begun". */
export function standingWords({ called, right, photos, isDone }: DrillStanding): string {
  if (called === 0) return isDone ? "No photo of it here" : `Not begun, ${photos} to call`;
  return isDone ? `Done: ${right} of ${called} right` : `${called} of ${photos}, ${right} right`;
}
