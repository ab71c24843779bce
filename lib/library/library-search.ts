/** Search over classes, causes and fixes that knows the shop's words and forgives spelling. Pure: build once, ask often. */
import Fuse, { type FuseResultMatch } from "fuse.js";
import type { TextPart } from "@/lib/cases/matched-words";
import { answersAmong, hitOf, toHit, type LibrarySearch } from "@/lib/library/library-hit";
import { documentsOf, type LibraryEntries, type SearchDocument } from "@/lib/library/search-documents";
import { placeWords, vocabularyOf } from "@/lib/library/search-words";
import { buildWordIndex, holdersOf } from "@/lib/library/word-index";
import { askedOf } from "@/lib/library/word-match";

/**
 * For what no word of the library is near to, its letters as a whole: 'lefttoolong', 'wontstick'. Only texts long enough for
 * that to say something; the score is Fuse's, 0 for the same letters. Looser, and 'truck tyre' is a struck part.
 */
const LETTERS = { leastTyped: 8, mostTyped: 60, threshold: 0.3, worstScore: 0.25, mostHits: 5 } as const;

/**
 * Builds the search over a library of a few hundred entries; a larger one goes through `buildLargeLibrarySearch`. The result
 * answers what was typed with the best hits first, at most 24; nothing typed, or nothing that the library knows, gives
 * nothing. Words may come in any order, misspelt, as slang or as an alloy name.
 * @example buildLibrarySearch(shelf)("sleepy brass")[0] // { slug: "underactivation", kind: "class", … }
 */
export function buildLibrarySearch(entries: LibraryEntries): LibrarySearch {
  const documents = documentsOf(entries);
  const vocabulary = vocabularyOf(documents.map((document) => document.prose));
  const index = buildWordIndex(documents);
  const byLetters = lettersSearch(documents);
  return (typed) => {
    const placed = placeWords(typed, vocabulary);
    const asked = askedOf(placed, index);
    const answers = answersAmong(holdersOf(placed, index), asked, index);
    return answers.length > 0 ? answers.map((each) => toHit(each, asked)) : byLetters(typed.trim());
  };
}

function lettersSearch(documents: readonly SearchDocument[]): LibrarySearch {
  let fuse: Fuse<SearchDocument> | null = null;
  return (typed) => {
    if (typed.length < LETTERS.leastTyped || typed.length > LETTERS.mostTyped) return [];
    fuse ??= new Fuse(documents, {
      keys: ["phrases.said"],
      threshold: LETTERS.threshold,
      ignoreLocation: true,
      ignoreFieldNorm: true,
      includeScore: true,
      includeMatches: true,
    });
    return fuse
      .search(typed, { limit: LETTERS.mostHits })
      .filter(({ score }) => (score ?? 1) <= LETTERS.worstScore)
      .map(({ item, score, matches }) => hitOf(item, score ?? 1, partsByLetters(item, matches?.[0])));
  };
}

/** What Fuse matched, cut at its letters: its ranges hold their last letter too. */
function partsByLetters({ title }: SearchDocument, match: FuseResultMatch | undefined): TextPart[] {
  const text = match?.value ?? title;
  const parts: TextPart[] = [];
  let from = 0;
  for (const [first, last] of match?.indices ?? []) {
    if (first > from) parts.push({ text: text.slice(from, first), isMatch: false });
    parts.push({ text: text.slice(first, last + 1), isMatch: true });
    from = last + 1;
  }
  if (from < text.length) parts.push({ text: text.slice(from), isMatch: false });
  return parts;
}
