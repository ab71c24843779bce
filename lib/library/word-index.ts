/** Which entries hold which word and how telling each word is: found by looking up, so that a key press costs no scan. */
import type { SearchDocument } from "@/lib/library/search-documents";
import type { PlacedWord } from "@/lib/library/search-words";

export interface WordIndex {
  documents: readonly SearchDocument[];
  /** Index word → places of the entries that hold it. */
  holders: ReadonlyMap<string, readonly number[]>;
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
  return { documents, holders };
}

/** How telling a word is: the fewer entries hold it, the more. A word that none holds tells as much as one that one does. */
export function tellingOf(word: string, { documents, holders }: WordIndex): number {
  return Math.log(1 + documents.length / Math.max(1, holders.get(word)?.length ?? 0));
}

/** Every entry that holds a reading of any of the words. */
export function holdersOf(placed: readonly PlacedWord[], { documents, holders }: WordIndex): SearchDocument[] {
  const places = new Set<number>();
  for (const { readings } of placed) {
    for (const { stem } of readings) for (const place of holders.get(stem) ?? []) places.add(place);
  }
  return [...places].sort((a, b) => a - b).flatMap((place) => documents[place] ?? []);
}
