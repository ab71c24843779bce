/** Which entries answer what was typed, how well, and by what: the same rule for a small library and a large one. */
import { partsByWord, type TextPart } from "@/lib/cases/matched-words";
import type { SearchDocument } from "@/lib/library/search-documents";
import { searchWords } from "@/lib/library/search-words";
import type { WordIndex } from "@/lib/library/word-index";
import { matchOf, type Asked, type WordMatch } from "@/lib/library/word-match";

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
  /** The same, cut into the words that answered and what lies between. */
  parts: TextPart[];
}

export type LibrarySearch = (typed: string) => LibraryHit[];

/** An entry that answers, before it is put into words. */
export interface Answer {
  document: SearchDocument;
  score: number;
  /** The phrase of it that answers; null where only its explanations do. */
  said: string | null;
}

const MOST_HITS = 24;

/**
 * Least of what was typed that an entry must hold to answer: little, since people tell stories; more where it holds one
 * word of it and the rest is strange to the library, as in 'parking permit for the north gate'. Set on the phrases and
 * the nonsense in the tests.
 */
const LEAST_MATCH = 0.3;
const LEAST_IN_A_STORY = 0.2;
const LEAST_WORDS_OF_A_STORY = 4;
const LEAST_AMONG_STRANGE = 0.55;
/** Words placed less surely than this, on average, are strange to the library. */
const STRANGE = 0.62;

/** How much of the order is one phrase that says it all, against its words lying about in the entry. */
const PHRASE_SHARE = 0.5;

/** The entries among these that answer, best first, at most 24. */
export function answersAmong(documents: readonly SearchDocument[], asked: Asked, index: WordIndex): Answer[] {
  return documents
    .map((document) => ({ document, match: matchOf(document, asked, index) }))
    .filter(({ match }) => answers(match, asked))
    .map(({ document, match: { cover, likeness, said } }) => ({
      document,
      score: 1 - ((1 - PHRASE_SHARE) * cover + PHRASE_SHARE * likeness),
      said,
    }))
    .sort(byScore)
    .slice(0, MOST_HITS);
}

export function byScore(one: { score: number }, other: { score: number }): number {
  return one.score - other.score;
}

function answers({ held, cover, likeness }: WordMatch, { words, sureness }: Asked): boolean {
  return Math.max(cover, likeness) >= leastFor(held, words.length, sureness);
}

function leastFor(held: number, words: number, sureness: number): number {
  if (held > 1 && words >= LEAST_WORDS_OF_A_STORY) return LEAST_IN_A_STORY;
  return held > 1 || sureness >= STRANGE ? LEAST_MATCH : LEAST_AMONG_STRANGE;
}

/** Puts an answer into words: the phrase, or the sentence of its explanations, that holds most of what was asked. */
export function toHit({ document, score, said }: Answer, asked: Asked): LibraryHit {
  const holds = (word: string) => searchWords(word).some((stem) => asked.words.some((each) => each.readings.has(stem)));
  return hitOf(document, score, markedParts(said ?? tellingSentence(document, asked), holds));
}

export function hitOf({ slug, title, kind, classes }: SearchDocument, score: number, parts: TextPart[]): LibraryHit {
  return { slug, title, kind, classes, score, matched: parts.map(({ text }) => text).join(""), parts };
}

function markedParts(said: string, holds: (word: string) => boolean): TextPart[] {
  return partsByWord(said, /[\p{L}\p{N}\p{M}'’]+/gu, holds);
}

function tellingSentence({ title, body }: SearchDocument, asked: Asked): string {
  let best = { sentence: title, telling: 0 };
  for (const sentence of body.flatMap((line) => line.split(/(?<=[.;])\s+/))) {
    const stems = new Set(searchWords(sentence));
    let telling = 0;
    for (const word of asked.words) {
      let surest = 0;
      for (const [stem, sureness] of word.readings) if (stems.has(stem)) surest = Math.max(surest, sureness);
      telling += surest * word.telling;
    }
    if (telling > best.telling) best = { sentence, telling };
  }
  return best.sentence;
}
