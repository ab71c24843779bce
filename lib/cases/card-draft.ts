import { LIMITS } from "./case-words";

/** A step of the library's fix, as the second look gets it. */
export interface FixStepOffer {
  title: string;
  detail: string;
  /** Working minutes: for one part when `perPart`, else for the batch. */
  minutes: number;
  perPart: boolean;
  cautionKeys: string[];
}

/** A step of the card while the senior still works on it. `minutes` is what stands in the field, typed or not. */
export interface DraftStep {
  /** Names the row on the screen while steps move; says nothing about the order. */
  key: string;
  title: string;
  detail: string;
  minutes: string;
  cautionKeys: string[];
}

/**
 * The minutes a step is planned for: a step that is done part by part takes as many times longer.
 * @param quantity parts on the case, 1 or more
 * @returns whole minutes, at most what a card may hold (a day)
 * @example plannedMinutes({ minutes: 6, perPart: true }, 3) === 18
 */
export function plannedMinutes(step: Pick<FixStepOffer, "minutes" | "perPart">, quantity: number): number {
  const minutes = step.perPart ? step.minutes * quantity : step.minutes;
  return Math.min(LIMITS.minutes, Math.round(minutes));
}

/** A fix of the library as a card for this many parts, ready to be changed. */
export function draftFromFix(fix: { id: number; steps: readonly FixStepOffer[] }, quantity: number): DraftStep[] {
  return fix.steps.map((step, index) => ({
    key: `${fix.id}-${index}`,
    title: step.title,
    detail: step.detail,
    minutes: String(plannedMinutes(step, quantity)),
    cautionKeys: [...step.cautionKeys],
  }));
}

/** Changes the words or minutes of one step. Its cautions stay: they belong to the work, not to the wording. */
export function changeStep(
  steps: readonly DraftStep[],
  key: string,
  change: Partial<Pick<DraftStep, "title" | "detail" | "minutes">>,
): DraftStep[] {
  return steps.map((step) => (step.key === key ? { ...step, ...change } : step));
}

/** Moves a step one place up (-1) or down (1). At either end it stays. */
export function moveStep(steps: readonly DraftStep[], key: string, by: -1 | 1): DraftStep[] {
  const from = steps.findIndex((step) => step.key === key);
  const to = from + by;
  const moving = steps[from];
  if (!moving || to < 0 || to >= steps.length) return [...steps];
  return steps.toSpliced(from, 1).toSpliced(to, 0, moving);
}

export function removeStep(steps: readonly DraftStep[], key: string): DraftStep[] {
  return steps.filter((step) => step.key !== key);
}

/** An empty step at the end, for what the library does not know. */
export function addStep(steps: readonly DraftStep[], key: string): DraftStep[] {
  return [...steps, { key, title: "", detail: "", minutes: "5", cautionKeys: [] }];
}

/** Minutes of the whole card; a field that holds no number counts as 0 until it does. */
export function draftMinutes(steps: readonly DraftStep[]): number {
  return steps.reduce((sum, step) => sum + (Number(step.minutes) || 0), 0);
}

/** The card as it is sent. */
export function draftToSend(steps: readonly DraftStep[]) {
  return steps.map(({ title, detail, minutes, cautionKeys }) => ({
    title,
    detail,
    plannedMinutes: minutes,
    cautionKeys,
  }));
}
