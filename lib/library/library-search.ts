/** Search over classes, causes and fixes that knows the shop's words and forgives spelling. Pure: build once, ask often. */
import Fuse from "fuse.js";
import { documentsOf, type LibraryEntries, type SearchDocument } from "@/lib/library/search-documents";
import { placeWords, vocabularyOf } from "@/lib/library/search-words";
import { buildWordIndex, holdersOf } from "@/lib/library/word-index";
import { askedOf, matchOf, type Asked, type WordMatch } from "@/lib/library/word-match";

export interface LibraryHit {
  slug: string;
  title: string;
  kind: SearchDocument["kind"];
  /** Slugs of the defect classes that the hit belongs to. */
  classes: string[];
  /** 0 is a perfect match, 1 none. Order only: not a probability. */
  score: number;
  /** The entry's own words that answered, for the screen to show: 'sleepy brass'. */
  matched: string;
}

export type LibrarySearch = (typed: string) => LibraryHit[];

const MOST_HITS = 24;

/**
 * Least of what was typed that an entry must hold to answer: little, since people tell stories; more where it holds one
 * word of it and the rest is strange to the library, else 'coffee machine' would be a drying ring. Set on the phrases and
 * the nonsense in the tests.
 */
const LEAST_MATCH = 0.3;
const LEAST_IN_A_STORY = 0.2;
const LEAST_WORDS_OF_A_STORY = 4;
const LEAST_AMONG_STRANGE = 0.55;
/** Words placed less surely than this, on average, are strange to the library. */
const STRANGE = 0.62;

/**
 * For what no word of the library is near to, its letters as a whole: 'lefttoolong', 'wontstick'. Only texts long enough for
 * that to say something; the score is Fuse's, 0 for the same letters. Looser, and 'truck tyre' is a struck part.
 */
const LETTERS = { leastTyped: 8, mostTyped: 60, threshold: 0.3, worstScore: 0.25, mostHits: 5 } as const;

/** How much of the order is one phrase that says it all, against its words lying about in the entry. */
const PHRASE_SHARE = 0.5;

/**
 * Builds the search over a library. The result answers what was typed with the best hits first, at most 24; nothing typed,
 * or nothing that the library knows, gives nothing. Words may come in any order, misspelt, as slang or as an alloy name.
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
    const hits = holdersOf(placed, index)
      .map((document) => ({ document, match: matchOf(document, asked, index) }))
      .filter(({ match }) => answers(match, asked))
      .map(({ document, match }) => toHit(document, match))
      .sort((a, b) => a.score - b.score)
      .slice(0, MOST_HITS);
    return hits.length > 0 ? hits : byLetters(typed.trim());
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
      .map(({ item, score, matches }) => hitOf(item, score ?? 1, matches?.[0]?.value ?? item.title));
  };
}

function answers({ held, cover, likeness }: WordMatch, { words, sureness }: Asked): boolean {
  return Math.max(cover, likeness) >= leastFor(held, words.length, sureness);
}

function leastFor(held: number, words: number, sureness: number): number {
  if (held > 1 && words >= LEAST_WORDS_OF_A_STORY) return LEAST_IN_A_STORY;
  return held > 1 || sureness >= STRANGE ? LEAST_MATCH : LEAST_AMONG_STRANGE;
}

function toHit(document: SearchDocument, { cover, likeness, said }: WordMatch): LibraryHit {
  return hitOf(document, 1 - ((1 - PHRASE_SHARE) * cover + PHRASE_SHARE * likeness), said);
}

function hitOf({ slug, title, kind, classes }: SearchDocument, score: number, matched: string): LibraryHit {
  return { slug, title, kind, classes, score, matched };
}
