/** What the editor's forms send. A draft may be blank anywhere; what is published goes through `library.schema`. */
import { z } from "zod";
import { entryFromForm, type FormValues } from "./entry-form";
import { ENTRY_KINDS } from "./entry-kinds";
import { SOURCE_KINDS } from "./library-entry";
import { LIBRARY_LIMITS } from "./library.schema";
import { MERGE_CHOICES } from "./merge-entry";

/** Longest draft as JSON, in letters: many times the longest entry that could be published by hand. */
const DRAFT_CHARS = 100_000;

const entry = z.enum(ENTRY_KINDS, { error: "This is no kind of entry." });
const slug = z.string().regex(/^[a-z0-9-]{1,120}$/, "This is no name of the library.");
const rowNumber = z.coerce.number("Give a number.").int("Give a whole number.").positive("Give a number above 0.");
const revision = z.coerce.number("Give a number.").int("Give a whole number.").min(0, "Give no number below 0.");
const note = z
  .string()
  .trim()
  .max(LIBRARY_LIMITS.lineChars, `Keep the reason under ${LIBRARY_LIMITS.lineChars} letters.`)
  .default("");
/** The button that was pressed; the page's main button sends none. */
const intent = z.enum(["draft", "publish"]).default("publish");

const aim = { entry, slug, baseRevision: revision };

const values = z.custom<FormValues>(
  (raw) =>
    typeof raw === "object" &&
    raw !== null &&
    Object.values(raw).every(
      (value) => typeof value === "string" || (Array.isArray(value) && value.every((each) => typeof each === "string")),
    ),
  "The form holds something that is no text.",
);

const head = z.object({
  entry,
  /** Empty: an entry that is being made. */
  slug: slug.or(z.literal("").transform(() => null)),
  baseRevision: revision,
  note,
  intent,
  newCitation: z.string().trim().max(LIBRARY_LIMITS.textChars).default(""),
  newKind: z.enum(SOURCE_KINDS).default("published"),
});

/** A draft to keep or to publish. */
export const saveEntryInput = values.transform((raw, context) => {
  const parsed = head.safeParse(raw);
  if (!parsed.success) {
    for (const issue of parsed.error.issues)
      context.addIssue({ code: "custom", path: issue.path, message: issue.message });
    return z.NEVER;
  }
  const body = entryFromForm(parsed.data.entry, raw);
  if (JSON.stringify(body).length > DRAFT_CHARS) {
    context.addIssue({ code: "custom", path: ["form"], message: "That is longer than an entry can be. Shorten it." });
    return z.NEVER;
  }
  return { ...parsed.data, body };
});
export type SaveEntry = z.output<typeof saveEntryInput>;

/** Which words stand where two editors differ: one field for each, `choice.title`. */
export const settleEntryInput = values.transform((raw, context) => {
  const shape = z.object({ entry, slug, draftId: rowNumber, theirRevision: revision, note, intent });
  const parsed = shape.safeParse(raw);
  const choices = z
    .record(z.string(), z.enum(MERGE_CHOICES))
    .safeParse(
      Object.fromEntries(
        Object.entries(raw).flatMap(([name, value]) =>
          name.startsWith("choice.") ? [[name.slice("choice.".length), value]] : [],
        ),
      ),
    );
  if (!parsed.success || !choices.success) {
    for (const issue of [...(parsed.error?.issues ?? []), ...(choices.error?.issues ?? [])])
      context.addIssue({ code: "custom", path: issue.path, message: issue.message });
    return z.NEVER;
  }
  return { ...parsed.data, choices: choices.data };
});
export type SettleEntry = z.output<typeof settleEntryInput>;

export const dropDraftInput = z.object({ entry, slug });

export const bringBackInput = z.object({ ...aim, revisionId: rowNumber });
export type BringBack = z.output<typeof bringBackInput>;

export const removeEntryInput = z.object({ ...aim, note });
export type RemoveEntry = z.output<typeof removeEntryInput>;
