import { z } from "zod";
import { COLOURS, type Colour, type Pull } from "@/lib/metals/material-words";

/** Words for a filed spot besides our own. */
const OTHER_COLOURS: Record<string, Colour> = {
  gold: "yellow",
  brown: "red",
  "brown-red": "red",
  copper: "red",
  gray: "grey",
  "dull grey": "grey",
  "dull gray": "grey",
  "blue-gray": "blue-grey",
  bluish: "blue-grey",
  silver: "silver-white",
  white: "silver-white",
  "grey-white": "silver-white",
  "gray-white": "silver-white",
  "silver-grey": "silver-white",
  "silver-gray": "silver-white",
};

const PULL_WORDS: Record<string, Pull> = {
  none: "none",
  false: "none",
  faint: "faint",
  weak: "faint",
  strong: "strong",
  true: "strong",
};

/** An empty field of a form and an absent one of a route are the same: nobody said. */
const orNothing = (raw: unknown) => (raw === null || (typeof raw === "string" && raw.trim() === "") ? undefined : raw);

/** A number, or one typed with a point or a comma. A comma before three digits could be either, so it is neither. */
const TYPED_NUMBER = /^[-+]?\d+(?:\.\d+|,(?!\d{3}$)\d+)?(?:e[-+]?\d+)?$/i;

const toNumber = (raw: unknown) =>
  typeof raw === "string" && TYPED_NUMBER.test(raw.trim()) ? Number(raw.trim().replace(",", ".")) : orNothing(raw);

const number = (what: string) =>
  z.number({
    error: ({ input }) => (input === undefined ? `Give ${what}.` : "Write a number such as 86.4, without a unit."),
  });
const figure = (what: string) => z.preprocess(toNumber, number(what));
const figureOrNone = (what: string) => z.preprocess(toNumber, number(what).optional());

const lowered = (raw: unknown) =>
  typeof raw === "string" || typeof raw === "boolean" ? orNothing(String(raw).trim().toLowerCase()) : orNothing(raw);

/** One of a list of words, in any case, or nothing. */
const wordFrom = <Word>(words: Record<string, Word>, problem: string) =>
  z.preprocess(
    lowered,
    z
      .string({ error: problem })
      .transform((typed, context) => {
        const word = Object.hasOwn(words, typed) ? words[typed] : undefined;
        if (word !== undefined) return word;
        context.addIssue(problem);
        return z.NEVER;
      })
      .optional(),
  );

const COLOUR_WORDS: Record<string, Colour> = {
  ...OTHER_COLOURS,
  ...Object.fromEntries(COLOURS.map((colour) => [colour, colour])),
};

/**
 * What a form or `POST /api/part-check` may send: numbers, or numbers as typed. Weights in g, water in °C. `magnetic` is
 * true (pulls hard), false, or a word; `colour` a word for a filed spot. Ranges are `measureDensity`'s to refuse.
 */
export const partCheckSchema = z
  .object({
    weightAirG: figure("the weight in air, in g"),
    weightWaterG: figure("the weight in water, in g"),
    waterTempC: figure("the water's temperature, in °C"),
    balanceErrorG: figureOrNone("how far the balance may be off, in g"),
    magnetic: wordFrom(PULL_WORDS, "Use one of: none, faint, strong."),
    colour: wordFrom(COLOUR_WORDS, `Use one of: ${COLOURS.join(", ")}.`),
  })
  .transform(({ magnetic, ...rest }) => ({ ...rest, pull: magnetic }));
export type PartCheckForm = z.output<typeof partCheckSchema>;
