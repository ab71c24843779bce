import { z } from "zod";
import { SURENESS, type Sureness } from "@/lib/cases/case-words";
import { CANT_TELL } from "@/lib/cases/snap-draft";
import { DRILL_LIMITS } from "./drill";

/** A question's random id: 128 bits, as base64url. */
export const questionId = z.string().regex(/^[\w-]{22}$/, "That is not a practice question. Ask for the next photo.");

const blank = (raw: unknown) => (raw === "" || raw === null ? undefined : raw);
const rowNumber = z.coerce.number({ error: "Reload the page and try again." }).int().positive();
const slug = (words: string) =>
  z
    .string({ error: words })
    .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, words)
    .max(60, words);

/** Asking for a photo: of a drill, or of one's own practice. */
export const askInput = z.object({ drillId: z.preprocess(blank, rowNumber.optional()) });
export type AskInput = z.output<typeof askInput>;

export const questionInput = z.object({ id: questionId });

export const questionPhotoInput = z.object({
  id: questionId,
  size: z.enum(["view", "thumb"], { error: "is view or thumb" }).default("view"),
});

const calledClass = z.preprocess(
  (raw) => (raw === CANT_TELL ? null : blank(raw)),
  slug("Pick a class, or can't tell.").nullable(),
);

const sureness = z.preprocess(
  (raw) => SURENESS.find((notch) => String(notch) === String(raw)),
  z.custom<Sureness>().optional(),
);

/** A call on a practice photo. Who can't tell claims nothing: their sureness counts as a guess, whatever the dial says. */
export const answerInput = z
  .object({ id: questionId, calledClass, sure: sureness })
  .refine((answer) => answer.calledClass === null || answer.sure !== undefined, {
    path: ["sure"],
    message: "Say how sure you are.",
  })
  .transform(({ sure, ...answer }) => ({
    ...answer,
    sure: (answer.calledClass === null ? 1 : sure) ?? (1 as Sureness),
  }));
export type AnswerInput = z.output<typeof answerInput>;

const list = <Item extends z.ZodType>(item: Item) =>
  z.preprocess((raw) => (raw === undefined || raw === "" ? [] : Array.isArray(raw) ? raw : [raw]), z.array(item));

/** A drill as a senior sets it. No class chosen means every class that the shop has photos of. */
export const drillInput = z.object({
  title: z
    .string({ error: "Give the drill a name." })
    .trim()
    .min(1, "Give the drill a name.")
    .max(DRILL_LIMITS.titleChars, `Keep the name to ${DRILL_LIMITS.titleChars} characters.`),
  classSlugs: list(slug("Choose classes of the library.")),
  photoCount: z.coerce
    .number({ error: "Type how many photos." })
    .int("Type how many photos, as a whole number.")
    .min(1, "A drill has at least 1 photo.")
    .max(DRILL_LIMITS.photos, `A drill has at most ${DRILL_LIMITS.photos} photos.`),
  memberIds: list(rowNumber).refine((ids) => ids.length > 0, "Choose who is to do it."),
  /** The last day to do it, as in 2026-12-24; empty: no day is set. */
  dueDay: z.preprocess(
    blank,
    z
      .string()
      .regex(/^\d{4}-\d{2}-\d{2}$/, "Write the day as in 2026-12-24.")
      .optional(),
  ),
});
export type DrillInput = z.output<typeof drillInput>;

export const drillIdInput = z.object({ drillId: rowNumber });
