import { BASE_METAL_TITLES, type BaseMetal } from "@/lib/cases/case-words";
import { decimalText } from "@/lib/decimal";
import type { DraftBody, ShelfKind } from "./entry-kinds";

/** How a field is written: a line, a text, a list with one item a line, chosen names, a share, a word, tells, steps. */
export type FieldForm = "line" | "text" | "list" | "keys" | "share" | "word" | "tells" | "steps";

export interface EntryField {
  name: string;
  label: string;
  form: FieldForm;
}

const field = (name: string, label: string, form: FieldForm): EntryField => ({ name, label, form });
const SOURCES = field("sourceKeys", "Sources", "keys");
const SYNONYMS = field("synonyms", "What people also say", "list");

/** The fields of each kind that may differ between two revisions, in the order in which they are shown. */
export const ENTRY_FIELDS: Record<ShelfKind, readonly EntryField[]> = {
  class: [
    field("title", "Name", "line"),
    field("short", "In one line", "line"),
    field("atStrike", "At the strike", "text"),
    field("inFinalPlate", "Later, in the final plate", "text"),
    field("tells", "Tell it from its look-alikes", "tells"),
    field("checks", "Checks at the bench", "list"),
    field("prevention", "So that it stays away", "list"),
    field("stripNote", "What taking it off means", "text"),
    field("otherLikelihood", "Share of another cause", "share"),
    SYNONYMS,
    SOURCES,
  ],
  cause: [
    field("title", "Name", "line"),
    field("station", "Where on the line", "word"),
    field("classSlugs", "Shows as", "keys"),
    field("why", "Why it happens", "text"),
    field("proof", "Proof", "text"),
    field("likelihood", "Share of its class's cases", "share"),
    field("baseMetals", "Base metals at risk", "keys"),
    SYNONYMS,
    SOURCES,
  ],
  fix: [
    field("title", "Name", "line"),
    field("causeSlugs", "Puts right", "keys"),
    field("steps", "Steps", "steps"),
    field("whenNot", "When not to", "text"),
    field("materials", "Have ready", "list"),
    SOURCES,
  ],
  caution: [field("level", "Level", "word"), field("text", "Words", "text"), field("sourceKey", "Source", "word")],
  source: [field("kind", "Kind", "word"), field("citation", "Citation", "text")],
};

/** What a name stands for on screen; a name that is not known is shown as it is. */
export type NameWords = (name: string) => string;

/**
 * A field's value as plain text, for reading and for comparing word by word; empty for a field not filled in.
 * @example fieldText({ name: "likelihood", label: "", form: "share" }, 0.35) === "35%"
 */
export function fieldText({ form }: EntryField, value: unknown, words: NameWords = metalOrName): string {
  if (value === undefined || value === null) return "";
  if (form === "share")
    return typeof value === "number" ? `${decimalText(Math.round(value * 10_000) / 100)}%` : String(value);
  if (!Array.isArray(value)) return form === "word" ? words(String(value)) : String(value);
  if (form === "keys") return value.map((name) => words(String(name))).join("\n");
  if (form === "tells") return value.map((row) => `${words(text(row, "versus"))}: ${text(row, "tell")}`).join("\n");
  if (form === "steps") return value.map((row, index) => stepText(row, index + 1, words)).join("\n\n");
  return value.map(String).join("\n");
}

function stepText(step: unknown, number: number, words: NameWords): string {
  const station = text(step, "station");
  const cautions = part(step, "cautionKeys");
  const minutes = `${text(step, "minutes") || "?"} min${part(step, "perPart") === true ? " a part" : ""}`;
  const lines = [
    `${number}. ${text(step, "title")} (${minutes}, ${station ? words(station) : "at the bench"})`,
    text(step, "detail"),
  ];
  if (Array.isArray(cautions) && cautions.length > 0)
    lines.push(`Cautions: ${cautions.map((key) => words(String(key))).join("; ")}`);
  return lines.join("\n");
}

function part(row: unknown, name: string): unknown {
  return typeof row === "object" && row !== null ? (row as DraftBody)[name] : undefined;
}

function text(row: unknown, name: string): string {
  const value = part(row, name);
  return value === undefined || value === null ? "" : String(value);
}

/** Base metals by their titles, all else as it is. */
export const metalOrName: NameWords = (name) =>
  Object.hasOwn(BASE_METAL_TITLES, name) ? BASE_METAL_TITLES[name as BaseMetal] : name;
