/** What a shop may send when it edits or imports library entries: shape and limits only; links are `library-check`'s. */
import { z } from "zod";
import { BASE_METALS, LIMITS, STATION_KINDS } from "@/lib/cases/case-words";
import {
  CAUTION_LEVELS,
  SOURCE_KINDS,
  type FixStep,
  type LibraryCaution,
  type LibraryCause,
  type LibraryClass,
  type LibraryFix,
  type LibrarySource,
  type Shelf,
} from "@/lib/library/library-entry";

/** Longest text of one field and longest list of one entry: room for a full page, not for a book. */
export const LIBRARY_LIMITS = { textChars: 2000, lineChars: 240, listItems: 60, steps: 20 } as const;

const slug = z
  .string()
  .max(LIMITS.nameChars)
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, "Use small letters, digits and single hyphens.");
const line = z.string().trim().min(1, "Write something here.").max(LIBRARY_LIMITS.lineChars);
const text = z.string().trim().min(1, "Write something here.").max(LIBRARY_LIMITS.textChars);
const slugs = z.array(slug).max(LIBRARY_LIMITS.listItems);
const sourceKeys = slugs.min(1, "Name at least one source: a standard, 'common practice' or 'from memory'.");
const lines = z.array(line).max(LIBRARY_LIMITS.listItems);
const texts = z.array(text).max(LIBRARY_LIMITS.listItems);
const share = z.number().min(0).max(1);

export const libraryClassSchema = z.object({
  slug,
  title: line,
  short: line,
  atStrike: text,
  inFinalPlate: text,
  tells: z.array(z.object({ versus: slug, tell: text })).max(LIBRARY_LIMITS.listItems),
  checks: texts,
  prevention: texts,
  stripNote: text,
  otherLikelihood: share,
  sourceKeys,
  synonyms: lines,
  position: z.number().int().min(0),
}) satisfies z.ZodType<LibraryClass>;

export const libraryCauseSchema = z.object({
  slug,
  classSlugs: slugs.min(1, "Name the class that it shows as."),
  title: line,
  station: z.enum(STATION_KINDS),
  why: text,
  proof: text,
  likelihood: share,
  baseMetals: z.array(z.enum(BASE_METALS)).min(1, "Name at least one base metal at risk."),
  sourceKeys,
  synonyms: lines,
}) satisfies z.ZodType<LibraryCause>;

export const fixStepSchema = z.object({
  title: line,
  detail: text,
  minutes: z.number().positive("Give the minutes that the step takes.").max(LIMITS.minutes),
  perPart: z.boolean(),
  cautionKeys: slugs,
  station: z.enum(STATION_KINDS).nullable(),
}) satisfies z.ZodType<FixStep>;

export const libraryFixSchema = z.object({
  slug,
  causeSlugs: slugs.min(1, "Name the cause that it fixes."),
  title: line,
  steps: z.array(fixStepSchema).min(1, "Write at least one step.").max(LIBRARY_LIMITS.steps),
  whenNot: text,
  materials: lines,
  sourceKeys,
}) satisfies z.ZodType<LibraryFix>;

export const libraryCautionSchema = z.object({
  key: slug,
  level: z.enum(CAUTION_LEVELS),
  text,
  sourceKey: slug,
}) satisfies z.ZodType<LibraryCaution>;

export const librarySourceSchema = z.object({
  key: slug,
  kind: z.enum(SOURCE_KINDS),
  citation: text,
}) satisfies z.ZodType<LibrarySource>;

export const shelfSchema = z.object({
  classes: z.array(libraryClassSchema),
  causes: z.array(libraryCauseSchema),
  fixes: z.array(libraryFixSchema),
  cautions: z.array(libraryCautionSchema),
  sources: z.array(librarySourceSchema),
}) satisfies z.ZodType<Shelf>;
