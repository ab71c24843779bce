/** One photo of a sitting, as its rack shows it. */
export interface SittingPhoto {
  result: "right" | "missed" | "open";
  isNow: boolean;
}

/** One sitting: the photos called so far, the one that is asked, and those still to come. */
export interface Sitting {
  photos: SittingPhoto[];
  /** Which photo this is, from 1. */
  place: number;
  right: number;
  missed: number;
}

interface SittingInput {
  /** What was called so far in the drill, or that day, oldest first. */
  answers: readonly { questionId: string; isRight: boolean }[];
  /** The question on the screen. */
  questionId: string;
  /** Photos in one sitting. */
  size: number;
  /** Photos that could still be asked, the one on the screen not counted. */
  left: number;
}

/**
 * The sitting that a question belongs to. Answers are laid out in sittings of `size`; the last one is as long as there
 * are photos for it. "Can't tell" counts as missed here: it comes back like a miss.
 * @example after 5 answers and with plenty left, the sixth question is photo 6 of 10
 */
export function sittingOf({ answers, questionId, size, left }: SittingInput): Sitting {
  const found = answers.findIndex((answer) => answer.questionId === questionId);
  const index = found === -1 ? answers.length : found;
  const start = Math.floor(index / size) * size;
  const called = answers.slice(start, start + size);
  const asked = found === -1 ? 1 : 0;
  const total = Math.min(size, called.length + asked + left);
  const photos = Array.from({ length: total }, (_, place): SittingPhoto => {
    const answer = called[place];
    return {
      result: answer ? (answer.isRight ? "right" : "missed") : "open",
      isNow: start + place === index,
    };
  });
  const right = called.filter((answer) => answer.isRight).length;
  return { photos, place: index - start + 1, right, missed: called.length - right };
}

/** "4 called right, 1 missed"; nothing before the first call. */
export function sittingWords({ right, missed }: Sitting): string {
  if (right + missed === 0) return "";
  return missed === 0 ? `${right} called right` : `${right} called right, ${missed} missed`;
}
