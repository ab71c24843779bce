import { foldWord, type SearchTerm } from "./search-query";

/** A stretch of text, and whether the search found it. Drawn as text, so nothing in it can become markup. */
export interface TextPart {
  text: string;
  isMatch: boolean;
}

/**
 * A text cut into what the search found in it and what lies between.
 * @example matchedParts("Thin by the keyway", [{ typed: "keyw", readAs: [] }])
 *   // [{ text: "Thin by the ", isMatch: false }, { text: "keyway", isMatch: true }]
 */
export function matchedParts(text: string, terms: readonly SearchTerm[]): TextPart[] {
  return partsByWord(text, /[\p{L}\p{N}\p{M}]+/gu, (word) => isFound(word, terms));
}

/**
 * A text cut at its words that were found.
 * @param words what a word is, global
 */
export function partsByWord(text: string, words: RegExp, isFoundWord: (word: string) => boolean): TextPart[] {
  const parts: TextPart[] = [];
  let from = 0;
  for (const word of text.matchAll(words)) {
    if (!isFoundWord(word[0])) continue;
    if (word.index > from) parts.push({ text: text.slice(from, word.index), isMatch: false });
    parts.push({ text: word[0], isMatch: true });
    from = word.index + word[0].length;
  }
  if (from < text.length) parts.push({ text: text.slice(from), isMatch: false });
  return parts;
}

/** Whether the search found anything in a text. */
export function holdsMatch(text: string, terms: readonly SearchTerm[]): boolean {
  return matchedParts(text, terms).some((part) => part.isMatch);
}

function isFound(word: string, terms: readonly SearchTerm[]): boolean {
  const folded = foldWord(word);
  return terms.some(
    ({ typed, readAs }) => (typed.length > 1 ? folded.startsWith(typed) : folded === typed) || readAs.includes(folded),
  );
}

/**
 * The stretch of a long text around the first word that was found, or its beginning: whole words, with dots where it
 * was cut.
 * @param most letters, about
 */
export function excerpt(text: string, terms: readonly SearchTerm[], most: number): string {
  if (text.length <= most) return text;
  const [first, second] = matchedParts(text, terms);
  const foundAt = first && second && !first.isMatch ? first.text.length : 0;
  const wanted = Math.max(0, Math.min(foundAt - Math.floor(most / 3), text.length - most));
  const start = wanted === 0 ? 0 : text.indexOf(" ", wanted) + 1;
  const rest = text.slice(start);
  if (rest.length <= most) return `…${rest}`;
  const cut = rest.lastIndexOf(" ", most);
  return `${start > 0 ? "…" : ""}${rest.slice(0, cut > 0 ? cut : most)}…`;
}
