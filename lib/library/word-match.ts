/** How well an entry answers what was typed. */
import type { BaseMetal } from "@/lib/cases/case-words";
import { metalsOfNumbers } from "@/lib/library/named-metals";
import type { SearchDocument, SearchPhrase } from "@/lib/library/search-documents";
import type { PlacedWord } from "@/lib/library/search-words";
import { strangeTelling, tellingOf, type WordIndex } from "@/lib/library/word-index";

/** What was typed, each word with its readings and how telling it is. */
export interface Asked {
  words: { readings: ReadonlyMap<string, number>; telling: number }[];
  telling: number;
  /** Base metals whose alloy numbers were typed. */
  metals: ReadonlySet<BaseMetal>;
  /** 0 to 1: how surely its words were placed in the library, on average. */
  sureness: number;
}

/** A word read less surely than this is not counted as held. */
const RATHER_SURE = 0.55;

export interface WordMatch {
  /** Words of what was typed that the entry holds, rather surely. */
  held: number;
  /** 0 to 1: how much of what was typed the entry holds, by where it holds it and how surely it was meant. */
  cover: number;
  /** 0 to 1: how like one phrase of the entry what was typed is. */
  likeness: number;
  /** That phrase; null where only the entry's explanations hold what was typed. */
  said: string | null;
}

export function askedOf(placed: readonly PlacedWord[], index: WordIndex): Asked {
  const words = placed.map(({ readings }) => {
    const known = readings.map(({ stem }) => tellingOf(stem, index));
    return {
      // The surest last, so that it is the one that stays.
      readings: new Map(
        readings.toSorted((a, b) => a.sureness - b.sureness).map(({ stem, sureness }) => [stem, sureness]),
      ),
      telling: known.length > 0 ? Math.max(...known.slice(0, 3)) : strangeTelling(index),
    };
  });
  const surest = placed.map(({ readings }) => Math.max(0, ...readings.map(({ sureness }) => sureness)));
  return {
    words,
    telling: total(words.map((word) => word.telling)),
    metals: metalsOfNumbers(placed.map((each) => each.typed)),
    sureness: total(surest) / Math.max(1, surest.length),
  };
}

export function matchOf(document: SearchDocument, asked: Asked, index: WordIndex): WordMatch {
  let held = 0;
  let covered = 0;
  for (const { readings, telling } of asked.words) {
    let [best, surest] = [0, 0];
    for (const [stem, sureness] of readings) {
      const weight = document.words.get(stem);
      if (weight === undefined) continue;
      best = Math.max(best, sureness * weight);
      surest = Math.max(surest, sureness);
    }
    covered += best * telling;
    if (surest >= RATHER_SURE) held += 1;
  }
  const share = isOfOtherMetal(document, asked) ? OTHER_METAL_SHARE : 1;
  const cover = asked.telling > 0 ? (share * covered) / asked.telling : 0;
  const phrase = nearestPhrase(document.phrases, asked, index);
  if (phrase.likeness > 0) return { held, cover, said: phrase.said, likeness: share * phrase.likeness };
  const metal = nearestPhrase(document.metalPhrases, asked, index);
  return { held, cover, likeness: 0, said: metal.likeness > 0 ? metal.said : null };
}

/** What is left of an entry for other metals than the one whose number was typed: 'C360 black' is not about zinc. */
const OTHER_METAL_SHARE = 0.6;

function isOfOtherMetal({ baseMetals }: SearchDocument, { metals }: Asked): boolean {
  return metals.size > 0 && baseMetals.length > 0 && !baseMetals.some((metal) => metals.has(metal));
}

function nearestPhrase(phrases: readonly SearchPhrase[], asked: Asked, index: WordIndex) {
  let best = { said: "", likeness: 0 };
  for (const phrase of phrases) {
    const likeness = likenessOf(phrase, asked, index);
    if (likeness > best.likeness) best = { said: phrase.said, likeness };
  }
  return best;
}

/** How much a phrase loses by what it says besides: half of what it loses by what it does not say. */
const OWN_SHARE = 0.5;

/** Shared words over all words of both, each by how telling it is. */
function likenessOf(phrase: SearchPhrase, asked: Asked, index: WordIndex): number {
  let shared = 0;
  for (const { readings, telling } of asked.words) {
    let best = 0;
    for (const word of phrase.words) best = Math.max(best, readings.get(word) ?? 0);
    shared += best * telling;
  }
  if (shared === 0) return 0;
  const own = total(phrase.words.map((word) => tellingOf(word, index)));
  return phrase.weight * Math.min(1, ((1 + OWN_SHARE) * shared) / (asked.telling + OWN_SHARE * own));
}

function total(each: readonly number[]): number {
  return each.reduce((sum, one) => sum + one, 0);
}
