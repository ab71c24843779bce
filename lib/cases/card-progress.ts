export interface StepProgress {
  id: number;
  plannedMinutes: number;
  spentMinutes: number | null;
  tickedAt: number | null;
}

/** How far a rework card has come. */
export interface CardProgress {
  steps: number;
  ticked: number;
  /** Place of the first open step, counted from 1; null once all are ticked. */
  openStep: number | null;
  /** 0 to 1; 0 for a card without steps. */
  share: number;
  /** What the card says in all, and what the ticked steps took; minutes. */
  plannedMinutes: number;
  spentMinutes: number;
}

/**
 * @param steps of one card, in order
 * @example cardProgress([]).openStep === null
 */
export function cardProgress(steps: readonly StepProgress[]): CardProgress {
  const ticked = steps.filter((step) => step.tickedAt !== null).length;
  const firstOpen = steps.findIndex((step) => step.tickedAt === null);
  return {
    steps: steps.length,
    ticked,
    openStep: firstOpen < 0 ? null : firstOpen + 1,
    share: steps.length === 0 ? 0 : ticked / steps.length,
    plannedMinutes: steps.reduce((sum, step) => sum + step.plannedMinutes, 0),
    spentMinutes: steps.reduce((sum, step) => sum + (step.tickedAt === null ? 0 : (step.spentMinutes ?? 0)), 0),
  };
}

/**
 * A card's state in the words of its tag.
 * @example progressWords({ steps: 5, ticked: 2 }) === "Step 3 of 5"
 */
export function progressWords({ steps, ticked }: Pick<CardProgress, "steps" | "ticked">): string {
  if (ticked === 0) return "Card ready";
  if (ticked >= steps) return "Re-strike due";
  return `Step ${ticked + 1} of ${steps}`;
}
