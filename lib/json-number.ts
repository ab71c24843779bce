import { z } from "zod";

/** What a number of a JSON route is, in the words in which it is asked for and refused. */
export interface NumberWords {
  /** "the area of one part in dm²" */
  what: string;
  example: number;
  most: number;
}

/** A JSON number above 0. Text is refused even when it looks like a number: a route that guesses hides a mistake. */
export const numberAboveZero = (words: NumberWords) =>
  asked(words)
    .positive(`${capital(words.what)} is above 0. Give a number such as ${words.example}.`)
    .max(words.most, tooMuch(words));

/** A JSON number of 0 or more. */
export const numberFromZero = (words: NumberWords) =>
  asked(words)
    .nonnegative(`${capital(words.what)} is 0 or more. Give a number such as ${words.example}.`)
    .max(words.most, tooMuch(words));

/** A whole JSON number from `least` on. */
export const wholeJsonNumber = (words: NumberWords & { least: number }) =>
  asked(words)
    .max(words.most, tooMuch(words))
    .refine((value) => Number.isInteger(value) && value >= words.least, {
      error: `${capital(words.what)} is a whole number, ${words.least} or more. Give one such as ${words.example}.`,
    });

function asked({ what, example }: NumberWords) {
  return z.number({
    error: (issue) =>
      issue.input === undefined
        ? `Give ${what}, such as ${example}.`
        : `Give ${what} as a plain number, such as ${example}, without quotes.`,
  });
}

function tooMuch({ what, most, example }: NumberWords): string {
  return `${capital(what)} is at most ${most.toLocaleString("en-US")}. Give a number such as ${example}.`;
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);
