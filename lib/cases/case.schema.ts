import { z } from "zod";
import { STRIP_METHODS } from "@/lib/costs/strip-methods";
import {
  BASE_METALS,
  DISPOSITIONS,
  LIMITS,
  METHODS,
  OUTCOMES,
  STAGES_FOUND,
  SYMPTOM_KEYS,
  type Sureness,
} from "./case-words";
import { CASE_REF_PATTERN } from "./case-ref";

const choose = (what: string) => `Choose ${what}.`;

/** A form sends every number as text. An empty field is a missing one, never 0. */
const wholeNumber = (from: number, to: number, what: string) =>
  z.preprocess(
    (raw) => (raw === "" || raw === null ? undefined : typeof raw === "string" ? Number(raw) : raw),
    z
      .number({ error: `Type ${what} as a whole number.` })
      .int(`Type ${what} as a whole number.`)
      .min(from, `${capital(what)} is at least ${from}.`)
      .max(to, `${capital(what)} is at most ${to}.`),
  );

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

const rowNumber = (what: string) => wholeNumber(1, Number.MAX_SAFE_INTEGER, what);
const optionalRowNumber = z.preprocess(
  (raw) => (raw === "" || raw === null ? undefined : raw),
  rowNumber("the number").optional(),
);

const note = z.string().trim().max(LIMITS.noteChars, `Keep the note under ${LIMITS.noteChars} characters.`).default("");
const reason = z
  .string({ error: "Say why, in a few words." })
  .trim()
  .min(3, "Say why, in a few words.")
  .max(LIMITS.noteChars, `Keep the reason under ${LIMITS.noteChars} characters.`);

const slug = z
  .string({ error: choose("a class") })
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, choose("a class"))
  .max(60);

/** "" or "cant-tell" is an honest answer: the person looked and could not tell. */
const calledClass = z.preprocess(
  (raw) => (raw === "" || raw === "cant-tell" || raw === undefined ? null : raw),
  slug.nullable(),
);

const sureness = z.preprocess(
  (raw) => (typeof raw === "string" ? Number(raw) : raw),
  z.union([z.literal(1), z.literal(2), z.literal(3)], { error: choose("how sure you are") }),
) as z.ZodType<Sureness>;

const list = <Item extends z.ZodType>(item: Item, most: number, words: string) =>
  z.preprocess(
    (raw) => (raw === undefined || raw === "" ? [] : Array.isArray(raw) ? raw : [raw]),
    z.array(item).max(most, words),
  );

const photoIds = list(
  z.uuid("A photo has no proper number. Take it again."),
  LIMITS.photosPerSnap,
  `At most ${LIMITS.photosPerSnap} photos. Take one away.`,
);

export const caseRef = z.string().regex(CASE_REF_PATTERN, "That is not a case reference. They look like CT-2607-0042.");

/** A snap: the facts of a suspect part and the first call. Photos may still be on their way. */
export const snapSchema = z.object({
  snapKey: z.uuid("The form has lost its number. Reload the page; your photos stay."),
  photoIds: photoIds.refine((ids) => ids.length > 0, "Take at least one photo of the part."),
  workOrderId: rowNumber("the job"),
  runId: optionalRowNumber,
  baseMetal: z.enum(BASE_METALS, { error: choose("the base metal") }),
  alloy: z.string().trim().max(LIMITS.nameChars).default(""),
  method: z.enum(METHODS, { error: choose("bath or brush") }),
  foundStationId: rowNumber("the station"),
  solutionIds: list(rowNumber("a solution"), 12, "At most 12 solutions."),
  stageFound: z.enum(STAGES_FOUND, { error: choose("where it was found") }),
  quantity: wholeNumber(1, LIMITS.quantity, "the number of parts"),
  symptoms: list(z.enum(SYMPTOM_KEYS), SYMPTOM_KEYS.length, "Too many symptoms."),
  note,
  calledClass,
  sure: sureness,
});
export type Snap = z.output<typeof snapSchema>;

export const callSchema = z.object({ ref: caseRef, calledClass, sure: sureness });
export type CallInput = z.output<typeof callSchema>;

/** One step of a rework card as the senior sends it. */
const cardStep = z.object({
  title: z.string().trim().min(1, "Give the step a name.").max(LIMITS.nameChars),
  detail: z.string().trim().max(LIMITS.noteChars).default(""),
  plannedMinutes: wholeNumber(0, LIMITS.minutes, "the minutes"),
  cautionKeys: list(z.string().max(60), 12, "At most 12 cautions for a step."),
});
export type CardStepInput = z.output<typeof cardStep>;

/** A form sends the steps as one JSON field, a route as a list. */
const cardSteps = z.preprocess((raw, context) => {
  if (typeof raw !== "string") return raw;
  if (raw === "") return [];
  try {
    return JSON.parse(raw) as unknown;
  } catch {
    context.addIssue({ code: "custom", message: "The card's steps could not be read. Reload the page." });
    return z.NEVER;
  }
}, z.array(cardStep).max(20, "A card holds at most 20 steps.").default([]));

/** The second look: class, cause, what to do, and the card where it is rework. */
export const confirmationSchema = z
  .object({
    ref: caseRef,
    classSlug: slug,
    causeId: rowNumber("the cause"),
    sure: sureness.default(3),
    disposition: z.enum(DISPOSITIONS, { error: choose("what is to be done") }),
    why: note,
    fixId: optionalRowNumber,
    cardTitle: z.string().trim().max(LIMITS.nameChars).default(""),
    steps: cardSteps,
  })
  .refine((input) => input.disposition !== "rework" || input.steps.length > 0, {
    path: ["steps"],
    message: "A rework card needs at least one step.",
  })
  .refine((input) => input.disposition === "rework" || input.why.length >= 3, {
    path: ["why"],
    message: "Say why it is not reworked, in a few words.",
  });
export type Confirmation = z.output<typeof confirmationSchema>;

/** The part was sound all along. */
export const releaseSchema = z.object({ ref: caseRef, why: note });

export const tickSchema = z.object({
  ref: caseRef,
  stepId: rowNumber("the step"),
  spentMinutes: wholeNumber(0, LIMITS.minutes, "the minutes"),
});

export const outcomeSchema = z
  .object({ ref: caseRef, outcome: z.enum(OUTCOMES, { error: choose("what the re-strike shows") }), note, photoIds })
  .refine((input) => input.photoIds.length > 0 || input.note.length >= 3, {
    path: ["photoIds"],
    message: "Take a photo of the re-strike, or write why there is none.",
  });
export type OutcomeInput = z.output<typeof outcomeSchema>;

export const disposeSchema = z.object({
  ref: caseRef,
  disposition: z.enum(["scrap", "concession", "regrade"], { error: choose("scrap, concession or regrade") }),
  why: reason,
});

/** Taking a confirmation back, or opening a closed case again. */
export const backSchema = z.object({ ref: caseRef, why: reason });

/** Correcting a fact of a part that is still held. The old value stays in the history. */
export const amendSchema = z.object({
  ref: caseRef,
  quantity: wholeNumber(1, LIMITS.quantity, "the number of parts"),
  baseMetal: z.enum(BASE_METALS, { error: choose("the base metal") }),
  stageFound: z.enum(STAGES_FOUND, { error: choose("where it was found") }),
  note,
});
export type Amendment = z.output<typeof amendSchema>;

/** How the deposit is to come off; empty: the cheapest way that is safe. */
export const chooseStripSchema = z.object({
  ref: caseRef,
  method: z.preprocess(
    (raw) => (raw === "" || raw === undefined ? null : raw),
    z.enum(STRIP_METHODS, { error: choose("how the deposit is to come off") }).nullable(),
  ),
});
export type StripChoice = z.output<typeof chooseStripSchema>;

export const exemplarSchema = z.object({ ref: caseRef, photoId: z.uuid(), chosen: z.stringbool().or(z.boolean()) });
