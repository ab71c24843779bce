import type { ShelfKind } from "./entry-kinds";
import { FILE_LIMITS, libraryFileSchema, LIBRARY_FORMAT, LIBRARY_VERSION } from "./library-file.schema";
import type { Shelf } from "./library-entry";

export type ReadLibrary =
  { read: true; shop: string; exportedAt: string; shelf: Shelf } | { read: false; problems: string[] };

/** Problems named at once; a file with more is mended step by step. */
const MOST_PROBLEMS = 12;

/**
 * Reads a library file. Whatever is wrong with it is said in words, with the place in the file; nothing is guessed.
 * @param text the file's text, of any content and length
 * @example readLibraryFile("{") === { read: false, problems: ["The file is not JSON. …"] }
 */
export function readLibraryFile(text: string): ReadLibrary {
  const early = tooMuch(text);
  if (early) return refused(early);
  let raw: unknown;
  try {
    raw = JSON.parse(text.replace(/^\uFEFF/, ""));
  } catch {
    return refused("The file is not JSON. Choose a file that was taken out here, or check its brackets and quotes.");
  }
  const strange = otherFormat(raw) ?? plainTextProblem(raw, "");
  if (strange) return refused(strange);
  const parsed = libraryFileSchema.safeParse(raw);
  if (!parsed.success)
    return refused(...parsed.error.issues.map((issue) => `${placeOf(issue.path)}: ${issue.message}`));
  const { shop, exportedAt, classes, causes, fixes, cautions, sources } = parsed.data;
  const shelf: Shelf = { classes, causes, fixes, cautions, sources };
  const twice = named(shelf).flatMap(([list, names]) =>
    [...new Set(names.filter((name, index) => names.indexOf(name) !== index))].map(
      (name) => `${list}: “${name}” stands twice.`,
    ),
  );
  return twice.length > 0 ? refused(...twice) : { read: true, shop, exportedAt, shelf };
}

const refused = (...problems: string[]): ReadLibrary => ({
  read: false,
  problems:
    problems.length > MOST_PROBLEMS
      ? [...problems.slice(0, MOST_PROBLEMS), `And ${problems.length - MOST_PROBLEMS} more.`]
      : problems,
});

/** Size and depth, before anything is built from it. */
function tooMuch(text: string): string | null {
  if (text.trim() === "") return "The file is empty.";
  if (new TextEncoder().encode(text).length > FILE_LIMITS.bytes)
    return `The file is larger than ${FILE_LIMITS.bytes / 1024 / 1024} MB. A library is far smaller.`;
  let depth = 0;
  let inText = false;
  for (let at = 0; at < text.length; at += 1) {
    const letter = text[at];
    if (inText) {
      if (letter === "\\") at += 1;
      else if (letter === '"') inText = false;
    } else if (letter === '"') inText = true;
    else if (letter === "{" || letter === "[") depth += 1;
    else if (letter === "}" || letter === "]") depth -= 1;
    if (depth > FILE_LIMITS.depth) return `The file nests deeper than ${FILE_LIMITS.depth} levels. A library does not.`;
  }
  return null;
}

function otherFormat(raw: unknown): string | null {
  if (typeof raw !== "object" || raw === null || Array.isArray(raw))
    return "The file is no library: it is not a JSON object.";
  const { format, version } = raw as Record<string, unknown>;
  if (format !== LIBRARY_FORMAT) return `The file is no library: its “format” is not “${LIBRARY_FORMAT}”.`;
  if (version !== LIBRARY_VERSION)
    return `The file is of version ${JSON.stringify(version) ?? "none"}; this shop reads version ${LIBRARY_VERSION}.`;
  return null;
}

/** A tag or a script address. "< 5 µm" is none: a tag has a letter behind its bracket. */
const MARKUP = /<\/?[a-z!][^>]*>?|javascript:/i;
/** Control characters have no place in words; line ends and tabs do. */
// eslint-disable-next-line no-control-regex
const CONTROL = /[\u0000-\u0008\u000B\u000C\u000E-\u001F\u007F\u202A-\u202E\u2066-\u2069]/;

/** The first text that is not plain, with its place; names count too. The depth is limited already. */
function plainTextProblem(value: unknown, place: string): string | null {
  if (typeof value === "string") {
    if (MARKUP.test(value)) return `${place}: holds markup or a script. The library is plain text.`;
    return CONTROL.test(value) ? `${place}: holds characters that cannot be seen. The library is plain text.` : null;
  }
  if (typeof value !== "object" || value === null) return null;
  for (const [name, inner] of Object.entries(value)) {
    if (name === "__proto__" || name === "constructor")
      return `${place || "The file"}: holds the name “${name}”, which no library has.`;
    const problem = plainTextProblem(inner, place ? `${place}.${name}` : name);
    if (problem) return problem;
  }
  return null;
}

const placeOf = (path: readonly PropertyKey[]) => (path.length > 0 ? path.map(String).join(".") : "The file");

/** Every name of a shelf by the list in which it stands. */
function named(shelf: Shelf): [string, string[]][] {
  return [
    ["classes", shelf.classes.map((each) => each.slug)],
    ["causes", shelf.causes.map((each) => each.slug)],
    ["fixes", shelf.fixes.map((each) => each.slug)],
    ["cautions", shelf.cautions.map((each) => each.key)],
    ["sources", shelf.sources.map((each) => each.key)],
  ];
}

/** The entries of a shelf, each with its kind: what others point at comes first. */
export function entriesOf(shelf: Shelf) {
  const of = <Kind extends ShelfKind, Body>(kind: Kind, bodies: readonly Body[]) =>
    bodies.map((body) => ({ kind, body }));
  return [
    ...of("source", shelf.sources),
    ...of("caution", shelf.cautions),
    ...of("class", shelf.classes),
    ...of("cause", shelf.causes),
    ...of("fix", shelf.fixes),
  ];
}
