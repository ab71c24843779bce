/** Turns what somebody typed into an expression of the full-text index. Nothing typed can become its syntax. */

/** A word of a search: what was typed, and the words of the shop's own cases that it was read as. */
export interface SearchTerm {
  typed: string;
  /** Likeliest first. Empty: the word stands as it was typed, whole or as the beginning of one. */
  readAs: readonly string[];
}

const MOST_WORDS = 8;
const MOST_LETTERS = 40;

/** As the index folds its words: small letters, no accents. */
export function foldWord(word: string): string {
  return word.normalize("NFD").replace(/\p{M}/gu, "").toLowerCase();
}

/**
 * The words of a search, folded, each once, at most eight. Single letters are left out unless there is nothing else:
 * they stand in every case.
 * @example typedWords('Pachy "shells" * OR') // ["pachy", "shells", "or"]
 */
export function typedWords(text: string): string[] {
  const words = (foldWord(text).match(/[\p{L}\p{N}]+/gu) ?? []).map((word) => word.slice(0, MOST_LETTERS));
  const telling = words.filter((word) => word.length > 1 || /\p{N}/u.test(word));
  return [...new Set(telling.length > 0 ? telling : words)].slice(0, MOST_WORDS);
}

/** Whether a word holds a digit: job numbers and references are taken as typed, never mended. */
export function hasDigit(word: string): boolean {
  return /\p{N}/u.test(word);
}

/** The columns that people search; `scope` is not among them, so nobody finds a shop by its mark. */
const COLUMNS = "{ref job class cause notes}";

/**
 * The index expression that finds these words in one shop only.
 * @param join all of the words, or any of them
 * @example matchExpression(7, [{ typed: "smutt", readAs: ["smut"] }], "all")
 *   // 'scope : "s7" AND {ref job class cause notes} : (("smutt" * OR "smut"))'
 */
export function matchExpression(shopId: number, terms: readonly SearchTerm[], join: "all" | "any"): string {
  const words = terms.map(({ typed, readAs }) => `(${[begins(typed), ...readAs.map(quoted)].join(" OR ")})`);
  return `scope : "s${shopId}" AND ${COLUMNS} : (${words.join(join === "all" ? " AND " : " OR ")})`;
}

/** The expression that tells whether a shop's cases hold a word at all. */
export function wordExpression(shopId: number, word: string): string {
  return `scope : "s${shopId}" AND ${COLUMNS} : (${quoted(word)})`;
}

/** The expression for a running number, in references only. */
export function runningNumberExpression(shopId: number, runningNumber: string): string {
  return `scope : "s${shopId}" AND ref : ${quoted(runningNumber)}`;
}

function quoted(word: string): string {
  return `"${word.replaceAll('"', '""')}"`;
}

/** One character begins too many words: it must stand alone. */
function begins(word: string): string {
  return word.length > 1 ? `${quoted(word)} *` : quoted(word);
}
