import { createEmptyCard, fsrs, Rating, type CardInput, type FSRSParameters, type Grade } from "ts-fsrs";
import type { Sureness } from "@/lib/cases/case-words";

/** What the scheduler keeps of one photo for one person: its own fields, with the moment as UTC milliseconds. */
export interface PhotoMemory {
  stability: number;
  difficulty: number;
  elapsed_days: number;
  scheduled_days: number;
  learning_steps: number;
  reps: number;
  lapses: number;
  state: number;
  lastReviewAt: number | null;
}

/** A call on a practice photo, as far as memory is concerned. "Can't tell" is not right. */
export interface JudgedCall {
  isRight: boolean;
  sure: Sureness;
}

/**
 * How photos come back. Weights and the wanted share of 0.9 are the defaults of ts-fsrs 5.4.2 (FSRS-6). Off: the steps
 * of minutes, since practice is a matter of days, and the random spread, since the same calls must give the same plan.
 */
export const MEMORY_SETTINGS: Partial<FSRSParameters> = { enable_short_term: false, enable_fuzz: false };
/** Where the settings come from, for the screen that shows what comes back when. */
export const MEMORY_SOURCE = "FSRS-6 with the standard weights of ts-fsrs 5.4.2, aimed at 9 of 10 remembered";

const RIGHT: Record<Sureness, Grade> = { 1: Rating.Hard, 2: Rating.Good, 3: Rating.Easy };

/**
 * The scheduler's grade of a call: wrong is "again", a right guess "hard", fairly sure "good", certain "easy".
 * How sure one was of a wrong call changes nothing: it has to come back all the same.
 */
export function gradeOf({ isRight, sure }: JudgedCall): Grade {
  return isRight ? RIGHT[sure] : Rating.Again;
}

/**
 * What is remembered of a photo after a call, and when the photo comes back: a whole number of days later, at least one.
 * @param memory what was kept before; null at the first call
 * @param at UTC milliseconds of the call
 * @param settings other weights, for checking against published schedules
 */
export function remember(
  memory: PhotoMemory | null,
  call: JudgedCall,
  at: number,
  settings: Partial<FSRSParameters> = MEMORY_SETTINGS,
): { memory: PhotoMemory; dueAt: number } {
  const { card } = fsrs(settings).next(cardOf(memory, at), at, gradeOf(call));
  const { due, last_review, ...after } = card;
  return { memory: { ...after, lastReviewAt: last_review?.getTime() ?? null }, dueAt: due.getTime() };
}

function cardOf(memory: PhotoMemory | null, at: number): CardInput {
  if (!memory) return createEmptyCard(at);
  const { lastReviewAt, ...kept } = memory;
  return { ...kept, due: at, last_review: lastReviewAt };
}
