/**
 * Refusal of impossible input to a computation: a thickness below zero, a metal that nobody plates, a share of 140 %.
 * `field` is the name of the input as the caller sent it, `problem` a sentence for the person. Routes answer 400 with both.
 */
export class InputError extends RangeError {
  readonly field: string;
  readonly problem: string;

  constructor(field: string, problem: string) {
    super(`${field}: ${problem}`);
    this.name = "InputError";
    this.field = field;
    this.problem = problem;
  }
}

/** Too little data is an answer, not an error: how many there are and how many it takes. */
export interface NotEnough {
  enough: false;
  have: number;
  need: number;
}

/** A finite number between `low` and `high`, both allowed. Throws `InputError` that names the field. */
export function requireBetween(field: string, value: number, low: number, high: number): number {
  // Negated, so that NaN and text that slipped past a type are refused too.
  if (typeof value !== "number" || !(value >= low && value <= high)) {
    throw new InputError(field, `Give a number from ${low} to ${high}.`);
  }
  return value;
}

/** A finite number above 0 and at most `high`. Throws `InputError` that names the field. */
export function requirePositive(field: string, value: number, high: number): number {
  if (typeof value !== "number" || !(value > 0 && value <= high)) {
    throw new InputError(field, `Give a number above 0, at most ${high}.`);
  }
  return value;
}

/** A whole number between `low` and `high`, both allowed. Throws `InputError` that names the field. */
export function requireWhole(field: string, value: number, low: number, high: number): number {
  if (!Number.isInteger(value) || value < low || value > high) {
    throw new InputError(field, `Give a whole number from ${low} to ${high}.`);
  }
  return value;
}

/** One of a closed list of words. Throws `InputError` that names the field and the words. */
export function requireOneOf<Word extends string>(field: string, value: string, words: readonly Word[]): Word {
  for (const word of words) if (word === value) return word;
  throw new InputError(field, `Use one of: ${words.join(", ")}.`);
}
