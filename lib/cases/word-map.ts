import { editDistance } from "@/lib/library/search-words";

/** The words of the case texts with how many cases hold each, laid out so that a misspelt one finds its neighbours. */
export interface WordMap {
  /** Cases that hold the word. */
  counts: ReadonlyMap<string, number>;
  /** All words in order, for those that begin alike. */
  sorted: readonly string[];
  /** Two letters in a row → the words that hold them, as places in `sorted`. */
  pairs: ReadonlyMap<string, readonly number[]>;
}

const SHORT_WORD = 6;

/** Builds the map. Words with digits do not belong in it: a number is not misspelt, it is another number. */
export function buildWordMap(words: Iterable<{ word: string; cases: number }>): WordMap {
  const counts = new Map<string, number>();
  for (const { word, cases } of words) counts.set(word, cases);
  const sorted = [...counts.keys()].sort();
  const pairs = new Map<string, number[]>();
  for (const [place, word] of sorted.entries()) {
    for (const pair of new Set(pairsOf(word))) {
      const held = pairs.get(pair);
      if (held) held.push(place);
      else pairs.set(pair, [place]);
    }
  }
  return { counts, sorted, pairs };
}

/** The words that begin so, in order, at most `most`. */
export function wordsBeginning(map: WordMap, beginning: string, most: number): string[] {
  const found: string[] = [];
  for (let place = firstNotBefore(map.sorted, beginning); found.length < most; place += 1) {
    const word = map.sorted[place];
    if (!word?.startsWith(beginning)) return found;
    found.push(word);
  }
  return found;
}

/**
 * The words within reach of a misspelt one, nearest first, then those that most cases hold: one edit away for words
 * under six letters, two for longer ones (an insertion, deletion, change or swap of neighbours is one edit).
 * @example nearWords(buildWordMap([{ word: "smut", cases: 9 }]), "smutt") // ["smut"]
 */
export function nearWords(map: WordMap, typed: string): string[] {
  const allowed = typed.length < SHORT_WORD ? 1 : 2;
  const near: { word: string; far: number; cases: number }[] = [];
  for (const word of likeWords(map, typed, allowed)) {
    const far = editDistance(typed, word);
    if (far > 0 && far <= allowed) near.push({ word, far, cases: map.counts.get(word) ?? 0 });
  }
  return near.sort((a, b) => a.far - b.far || b.cases - a.cases || (a.word < b.word ? -1 : 1)).map(({ word }) => word);
}

/** Words of about the same length that share enough pairs: an edit spoils at most three, a swap of neighbours. */
function likeWords(map: WordMap, typed: string, allowed: number): string[] {
  const asked = new Set(pairsOf(typed));
  const shared = new Map<number, number>();
  for (const pair of asked) {
    for (const place of map.pairs.get(pair) ?? []) shared.set(place, (shared.get(place) ?? 0) + 1);
  }
  const needed = Math.max(1, asked.size - 3 * allowed);
  const like: string[] = [];
  for (const [place, pairs] of shared) {
    const word = map.sorted[place];
    if (word && pairs >= needed && Math.abs(word.length - typed.length) <= allowed) like.push(word);
  }
  return like;
}

/** Pairs of neighbours, with the word's two ends. */
function pairsOf(word: string): string[] {
  const ended = `^${word}$`;
  return Array.from({ length: ended.length - 1 }, (_, index) => ended.slice(index, index + 2));
}

function firstNotBefore(sorted: readonly string[], word: string): number {
  let [low, high] = [0, sorted.length];
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((sorted[middle] ?? "") < word) low = middle + 1;
    else high = middle;
  }
  return low;
}
