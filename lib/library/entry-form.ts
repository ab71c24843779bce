import type { DraftBody, EntryKind } from "./entry-kinds";

/** A form's fields by name, as sent. A name that stands for a list holds an array. */
export type FormValues = Readonly<Record<string, string | readonly string[]>>;

/** Most rows that a form may send of a table, blank ones included. */
const MOST_ROWS = 60;

/**
 * The form's fields for an entry. Shares are percent; lists have one item a line; rows are `steps.0.title`.
 * `entryFromForm(kind, formOfEntry(kind, body))` is the body again.
 */
export function formOfEntry(kind: EntryKind, body: DraftBody): FormValues {
  const lines = (name: string) => list(body[name]).map(String).join("\n");
  const names = (name: string) => list(body[name]).map(String);
  const common = { title: words(body.title), sourceKeys: names("sourceKeys") };
  if (kind === "class") {
    return {
      ...common,
      short: words(body.short),
      atStrike: words(body.atStrike),
      inFinalPlate: words(body.inFinalPlate),
      checks: lines("checks"),
      prevention: lines("prevention"),
      stripNote: words(body.stripNote),
      otherLikelihood: percent(body.otherLikelihood),
      synonyms: lines("synonyms"),
      ...rowsOut("tells", list(body.tells), (row) => ({ versus: words(row.versus), tell: words(row.tell) })),
    };
  }
  if (kind === "cause") {
    const [main = "", ...others] = names("classSlugs");
    return {
      ...common,
      station: words(body.station),
      classSlug: main,
      classSlugs: others,
      why: words(body.why),
      proof: words(body.proof),
      likelihood: percent(body.likelihood),
      baseMetals: names("baseMetals"),
      synonyms: lines("synonyms"),
    };
  }
  return {
    ...common,
    causeSlugs: names("causeSlugs"),
    whenNot: words(body.whenNot),
    materials: lines("materials"),
    ...rowsOut("steps", list(body.steps), stepOut),
  };
}

function stepOut(step: DraftBody): Record<string, string | string[]> {
  return {
    title: words(step.title),
    detail: words(step.detail),
    minutes: words(step.minutes),
    per: step.perPart === true ? "part" : "batch",
    station: words(step.station),
    cautionKeys: list(step.cautionKeys).map(String),
  };
}

/** What a form says, as a draft: blank rows are left out, and a figure that is no number stays as it was typed. */
export function entryFromForm(kind: EntryKind, values: FormValues): DraftBody {
  const common = { title: said(values, "title"), sourceKeys: chosen(values, "sourceKeys") };
  if (kind === "class") {
    return {
      ...common,
      short: said(values, "short"),
      atStrike: said(values, "atStrike"),
      inFinalPlate: said(values, "inFinalPlate"),
      tells: rowsIn(values, "tells", ["versus", "tell"]).map((at) => ({
        versus: said(values, `${at}.versus`),
        tell: said(values, `${at}.tell`),
      })),
      checks: lineList(values, "checks"),
      prevention: lineList(values, "prevention"),
      stripNote: said(values, "stripNote"),
      otherLikelihood: share(said(values, "otherLikelihood") || "0"),
      synonyms: lineList(values, "synonyms"),
    };
  }
  if (kind === "cause") {
    const main = said(values, "classSlug");
    const others = chosen(values, "classSlugs").filter((slug) => slug !== main);
    return {
      ...common,
      station: said(values, "station"),
      classSlugs: main ? [main, ...others] : others,
      why: said(values, "why"),
      proof: said(values, "proof"),
      likelihood: share(said(values, "likelihood")),
      baseMetals: chosen(values, "baseMetals"),
      synonyms: lineList(values, "synonyms"),
    };
  }
  return {
    ...common,
    causeSlugs: chosen(values, "causeSlugs"),
    steps: rowsIn(values, "steps", ["title", "detail", "minutes"]).map((at) => ({
      title: said(values, `${at}.title`),
      detail: said(values, `${at}.detail`),
      minutes: figure(said(values, `${at}.minutes`)),
      perPart: said(values, `${at}.per`) === "part",
      cautionKeys: chosen(values, `${at}.cautionKeys`),
      station: said(values, `${at}.station`) || null,
    })),
    whenNot: said(values, "whenNot"),
    materials: lineList(values, "materials"),
  };
}

/** The rows of a table in a form, by the number in their names. */
export function rowNumbers(values: FormValues, table: string): number[] {
  const numbers = Object.keys(values).flatMap((name) => {
    const [start, number] = name.split(".");
    return start === table && number !== undefined && /^\d{1,3}$/.test(number) ? [Number(number)] : [];
  });
  return [...new Set(numbers)].toSorted((a, b) => a - b).slice(0, MOST_ROWS);
}

function rowsOut(table: string, rows: unknown[], out: (row: DraftBody) => Record<string, string | string[]>) {
  const entries = rows.flatMap((row, index) =>
    Object.entries(out(isRecord(row) ? row : {})).map(([name, value]) => [`${table}.${index}.${name}`, value] as const),
  );
  return Object.fromEntries(entries);
}

function rowsIn(values: FormValues, table: string, telling: readonly string[]): string[] {
  return rowNumbers(values, table)
    .map((number) => `${table}.${number}`)
    .filter((at) => telling.some((name) => said(values, `${at}.${name}`) !== ""));
}

const isRecord = (value: unknown): value is DraftBody => typeof value === "object" && value !== null;
const list = (value: unknown): unknown[] => (Array.isArray(value) ? value : []);
const words = (value: unknown) => (value === undefined || value === null ? "" : String(value));
const percent = (value: unknown) => words(typeof value === "number" ? Math.round(value * 1e6) / 1e4 : value);

/** Browsers send line ends as CR LF. */
function said(values: FormValues, name: string): string {
  const value = values[name];
  return typeof value === "string" ? value.replaceAll("\r\n", "\n").trim() : "";
}

function chosen(values: FormValues, name: string): string[] {
  const value = values[name];
  const all = typeof value === "string" ? [value] : (value ?? []);
  return [...new Set(all)].filter((each) => each !== "");
}

const lineList = (values: FormValues, name: string) =>
  said(values, name)
    .split("\n")
    .map((line) => line.trim())
    .filter((line) => line !== "");

function figure(typed: string): number | string {
  const number = Number(typed.replace(",", "."));
  return typed === "" || !Number.isFinite(number) ? typed : number;
}

function share(typed: string): number | string {
  const number = figure(typed.replace(/%$/, "").trim());
  return typeof number === "number" ? Math.round(number * 1e4) / 1e6 : typed;
}
