/** Which entries hold which word and how telling each word is: found by looking up, so that a key press costs no scan. */
import type { SearchDocument } from "@/lib/library/search-documents";
import type { PlacedWord } from "@/lib/library/search-words";

export interface WordIndex {
  documents: readonly SearchDocument[];
  /** Index word → places of the entries that hold it. */
  holders: ReadonlyMap<string, readonly number[]>;
  /** How telling each index word is: the fewer entries hold it, the more. */
  telling: ReadonlyMap<string, number>;
}

export function buildWordIndex(documents: readonly SearchDocument[]): WordIndex {
  const holders = new Map<string, number[]>();
  for (const [place, document] of documents.entries()) {
    for (const word of document.words.keys()) {
      const held = holders.get(word);
      if (held) held.push(place);
      else holders.set(word, [place]);
    }
  }
  const telling = new Map([...holders].map(([word, held]) => [word, Math.log(1 + documents.length / held.length)]));
  return { documents, holders, telling };
}

/** Entries that a word is taken to stand in when the library does not know it: it may as well be the shop's name for a part. */
const STRANGE_HOLDERS = 6;

/** How telling a word is that the library does not know. */
export function strangeTelling({ documents }: WordIndex): number {
  return Math.log(1 + documents.length / STRANGE_HOLDERS);
}

/** How telling a word of the library is. */
export function tellingOf(word: string, index: WordIndex): number {
  return index.telling.get(word) ?? strangeTelling(index);
}

/** Every entry that holds a reading of any of the words. */
export function holdersOf(placed: readonly PlacedWord[], { documents, holders }: WordIndex): SearchDocument[] {
  const places = new Set<number>();
  for (const { readings } of placed) {
    for (const { stem } of readings) for (const place of holders.get(stem) ?? []) places.add(place);
  }
  return [...places].sort((a, b) => a - b).flatMap((place) => documents[place] ?? []);
}
