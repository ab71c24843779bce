/** Search over classes, causes and fixes that knows the shop's words and forgives spelling. Pure: build once, ask often. */
import Fuse, { type IFuseOptions } from "fuse.js";
import {
  documentsOf,
  markBegun,
  markWhole,
  type LibraryEntries,
  type SearchDocument,
  type SearchPhrase,
} from "@/lib/library/search-documents";
import { mendWords, vocabularyOf } from "@/lib/library/search-words";

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
 * Words are mended before Fuse sees them, so it may be strict: at its looser setting 'dust' answers for 'rust'.
 * The looser one is kept for what the mending could not place.
 */
const MENDED_THRESHOLD = 0.1;

const FUSE_OPTIONS: IFuseOptions<SearchDocument> = {
  useTokenSearch: true,
  ignoreLocation: true,
  threshold: 0.35,
  includeScore: true,
  ignoreFieldNorm: true,
  keys: [
    { name: "names", weight: 3 },
    { name: "also", weight: 4 },
    { name: "metals", weight: 1 },
    { name: "all", weight: 3 },
  ],
};

/** How much of a hit's score a phrase that says exactly what was typed takes off. */
const PHRASE_SHARE = 0.9;

/**
 * Builds the search over a library. The result answers what was typed with the best hits first, at most 24;
 * nothing typed gives nothing. Words may come in any order, misspelt, as slang or as an alloy name.
 * @example buildLibrarySearch(shelf)("sleepy brass")[0] // { slug: "underactivation", kind: "class", … }
 */
export function buildLibrarySearch(entries: LibraryEntries): LibrarySearch {
  const documents = documentsOf(entries);
  const vocabulary = vocabularyOf(documents.map((document) => document.prose));
  const exact = new Fuse(documents, { ...FUSE_OPTIONS, threshold: MENDED_THRESHOLD });
  const loose = new Fuse(documents, FUSE_OPTIONS, exact.getIndex());
  return (typed) => {
    const words = mendWords(typed, vocabulary);
    if (words.length === 0) return [];
    const marked = words.map((word) => (vocabulary.stems.has(word) ? markWhole(word) : markBegun(word)));
    const found = exact.search(marked.join(" "), { limit: MOST_HITS });
    const results = found.length > 0 ? found : loose.search(words.join(" "), { limit: MOST_HITS });
    return results.map(({ item, score }) => toHit(item, score ?? 1, words)).sort((a, b) => a.score - b.score);
  };
}

/** Fuse's score, lowered where one phrase of the entry says what was typed, raised where the words lie scattered. */
function toHit(document: SearchDocument, score: number, words: readonly string[]): LibraryHit {
  const { said, likeness } = phraseNearest(document, words);
  return {
    slug: document.slug,
    title: document.title,
    kind: document.kind,
    classes: document.classes,
    score: Math.min(1, score * (1 - PHRASE_SHARE * likeness ** 2)),
    matched: said,
  };
}

/**
 * The phrase of the entry most like what was typed, and how like (0 to 1: shared words over all words of both).
 * A metal's name is said when nothing better is, but counts for nothing: it stands in too many entries.
 * Failing that, the title: its prose answered.
 */
function phraseNearest(document: SearchDocument, words: readonly string[]): { said: string; likeness: number } {
  const phrase = nearestOf(document.phrases, words);
  if (phrase.likeness > 0) return phrase;
  const metal = nearestOf(document.metalPhrases, words);
  return { said: metal.likeness > 0 ? metal.said : document.title, likeness: 0 };
}

function nearestOf(phrases: readonly SearchPhrase[], words: readonly string[]): { said: string; likeness: number } {
  let best = { said: "", likeness: 0 };
  for (const phrase of phrases) {
    const shared = words.filter((word) => phrase.words.some((own) => own.startsWith(word))).length;
    const likeness = (2 * shared) / (words.length + Math.max(phrase.words.length, shared));
    if (likeness > best.likeness) best = { said: phrase.said, likeness };
  }
  return best;
}
