import { z } from "zod";
import { CASE_STATES } from "./case-state";
import { BASE_METALS, CLOSINGS, STAGES_FOUND } from "./case-words";
import { readCasebookCursor } from "./casebook-cursor";

/** How a case stands: its state, or, once it is closed, how it ended. */
export const CASE_STANDINGS = [...CASE_STATES, ...CLOSINGS] as const;
export type CaseStandingFilter = (typeof CASE_STANDINGS)[number];

export const CASEBOOK_LIMITS = { queryChars: 200, page: 24 } as const;

/** A form sends every field; an empty one asks for nothing. */
const asked = <Schema extends z.ZodType>(schema: Schema) =>
  z.preprocess((value) => (value === "" ? undefined : value), schema.optional());

const slug = z.string().regex(/^[a-z0-9-]{1,60}$/, "This is no name of the library or the line.");
const rowNumber = z.coerce.number("Give a number.").int("Give a whole number.").positive("Give a number above 0.");
const oneOf = <const Words extends readonly [string, ...string[]]>(words: Words) =>
  z.enum(words, { error: `Use one of: ${words.join(", ")}.` });
const day = z.string().refine(isDay, "Write the day as in 2026-07-14.");

const cursor = z.string().transform((text, context) => {
  const read = readCasebookCursor(text);
  if (read) return read;
  context.addIssue({ code: "custom", message: "This is no cursor of ours. Leave it out to begin at the first page." });
  return z.NEVER;
});

/** The casebook's filters, as its address and its form say them. */
const filterShape = {
  q: asked(
    z.string().trim().max(CASEBOOK_LIMITS.queryChars, `Search with at most ${CASEBOOK_LIMITS.queryChars} letters.`),
  ),
  class: asked(slug),
  cause: asked(slug),
  station: asked(slug),
  metal: asked(oneOf(BASE_METALS)),
  stage: asked(oneOf(STAGES_FOUND)),
  customer: asked(rowNumber),
  status: asked(oneOf(CASE_STANDINGS)),
  by: asked(rowNumber),
  openedFrom: asked(day),
  openedTo: asked(day),
  closedFrom: asked(day),
  closedTo: asked(day),
  /** Only cases with a photo that a senior chose as an exemplar of its class. */
  exemplars: asked(oneOf(["only"])),
};

/** What the casebook is asked, by its page and over HTTP. Days are days of the shop's calendar. */
export const casebookSchema = z
  .object({
    ...filterShape,
    /** By time; without it a search shows its best match first, and all else the newest. */
    order: asked(oneOf(["newest", "oldest"])),
    view: asked(oneOf(["grid", "table"])),
    cursor: asked(cursor),
  })
  .refine((query) => !query.openedFrom || !query.openedTo || query.openedFrom <= query.openedTo, {
    path: ["openedTo"],
    message: "The last day lies before the first one. Turn them round.",
  })
  .refine((query) => !query.closedFrom || !query.closedTo || query.closedFrom <= query.closedTo, {
    path: ["closedTo"],
    message: "The last day lies before the first one. Turn them round.",
  })
  .refine((query) => !query.cursor || (query.cursor.kind === "match") === Boolean(query.q), {
    path: ["cursor"],
    message: "This cursor belongs to another list. Leave it out to begin at the first page.",
  });

export type CasebookQuery = z.output<typeof casebookSchema>;
export type FilterName = keyof typeof filterShape;
export const FILTER_NAMES = Object.keys(filterShape) as FilterName[]; // an object's own keys are all it has here

function isDay(text: string): boolean {
  const at = Date.parse(`${text}T00:00:00Z`);
  return /^\d{4}-\d{2}-\d{2}$/.test(text) && !Number.isNaN(at) && new Date(at).toISOString().startsWith(text);
}
