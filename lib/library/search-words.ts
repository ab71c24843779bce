/**
 * Turns what a shop types into the words that the library is indexed by: small letters, one spelling, word stems,
 * no filler, and misspelt words mended against the library's own vocabulary.
 */
import { nearestWords, nearWordsOf, type NearWords } from "@/lib/library/near-words";
import { FILLER, ONE_SPELLING, STANDS_FOR } from "@/lib/library/shop-spellings";

export { editDistance } from "@/lib/library/edit-distance";

/** The words of a text as written, one spelling each, filler left out unless there is nothing else. */
export function plainWords(text: string): string[] {
  const plain = text
    .toLowerCase()
    .normalize("NFD")
    .replace(/[\u0300-\u036f'’]/g, "")
    .split(/[^a-z0-9]+/)
    .filter((word) => word.length > 0)
    .map((word) => ONE_SPELLING[word] ?? word);
  const telling = plain.filter((word) => !FILLER.has(word));
  return telling.length > 0 ? telling : plain;
}

/**
 * The words of a text as they are indexed: `plainWords`, cut to their stems.
 * @example searchWords("It won't take on the 304 parts") // ["not", "tak", "304"]
 */
export function searchWords(text: string): string[] {
  return plainWords(text).map(stem);
}

/** Cuts the endings that shops vary: peels, peeling, peeled → peel; haze, hazy → haz. Words with digits stay whole. */
function stem(word: string): string {
  if (/\d/.test(word) || word.length < 4) return word;
  const single = word.replace(/(?<=[^s])s$/, "");
  const cut = single.replace(/(ing|ed|ish|[iy]?ness|(?<=at)ion)$/, "");
  const base = cut.length > 2 && /[aeiouy]/.test(cut) ? cut : single;
  const bare = base.length > 3 ? base.replace(/(ie|e|y)$/, "") : base;
  return bare === single ? bare : bare.replace(/([bdgklmnprt])\1$/, "$1");
}

/** Every word of the library as written, with how often it stands there, all their stems, and what is near to what. */
export interface Vocabulary {
  words: ReadonlyMap<string, number>;
  stems: ReadonlySet<string>;
  near: NearWords;
}

export function vocabularyOf(texts: Iterable<string>): Vocabulary {
  const words = new Map<string, number>();
  for (const text of texts) for (const word of plainWords(text)) words.set(word, (words.get(word) ?? 0) + 1);
  const stems = new Set([...words.keys()].map(stem));
  return { words, stems, near: nearWordsOf(words, ONE_SPELLING, stems) };
}

/** One way to read a typed word: an index word, and how surely it is meant (0 to 1; 1 is the word itself). */
export interface Reading {
  stem: string;
  sureness: number;
}

/** A typed word and every way it is read. None: the library has nothing like it. */
export interface PlacedWord {
  typed: string;
  readings: Reading[];
}

/**
 * What was typed, word by word, with every way each word is read: as itself, as the beginning of a word, as words that
 * the shop uses for it, or, when the library neither holds nor continues it, as the two words it was run together from or
 * its nearest ones. Words with digits are never mended.
 */
export function placeWords(typed: string, vocabulary: Vocabulary): PlacedWord[] {
  const placed = plainWords(typed).flatMap((word) => placeWord(word, vocabulary));
  return [...new Map(placed.map((each) => [each.typed, each])).values()];
}

const STANDS_FOR_SURENESS = 0.6;
const BEGUN_SURENESS = 0.85;
const LONGER_SURENESS = 0.5;
/** Stems that a word still being typed may become: more say too little. */
const MOST_BEGUN = 40;
/** From this length on the beginning of a word may as well be another one misspelt: 'stripp'. */
const LONG_BEGINNING = 5;

function placeWord(word: string, vocabulary: Vocabulary): PlacedWord[] {
  const own = stem(word);
  const standing = standIns(word, own, vocabulary);
  if (vocabulary.words.has(word) || vocabulary.stems.has(own)) {
    return [{ typed: word, readings: [{ stem: own, sureness: 1 }, ...standing] }];
  }
  const begun = [...standing, ...stemsBeginning(word, vocabulary)];
  if (/\d/.test(word) || (begun.length > 0 && word.length < LONG_BEGINNING)) return [{ typed: word, readings: begun }];
  const halves = begun.length === 0 ? halvesOf(word, vocabulary) : null;
  if (halves) return halves.flatMap((half) => placeWord(half, vocabulary));
  const near = nearestWords(word, vocabulary.near);
  const mended = (near.length > 0 ? near : nearestWords(own, vocabulary.near)).map((each) => ({
    stem: stem(each.word),
    sureness: each.sureness,
  }));
  const readings = [...begun, ...mended];
  return [{ typed: word, readings: readings.length > 0 ? readings : knownInside(word, vocabulary) }];
}

/** A word that the library has in a shorter form: weldments, weld. */
function knownInside(word: string, vocabulary: Vocabulary): Reading[] {
  for (let length = word.length - 1; length >= Math.max(4, 0.4 * word.length); length -= 1) {
    const shorter = word.slice(0, length);
    if (vocabulary.words.has(shorter)) return [{ stem: stem(shorter), sureness: LONGER_SURENESS }];
  }
  return [];
}

function standIns(word: string, own: string, vocabulary: Vocabulary): Reading[] {
  const meant = STANDS_FOR[word] ?? STANDS_FOR_STEM.get(own) ?? [];
  return meant
    .map(stem)
    .filter((each) => each !== own && vocabulary.stems.has(each))
    .map((each) => ({ stem: each, sureness: STANDS_FOR_SURENESS }));
}

const STANDS_FOR_STEM = new Map(Object.entries(STANDS_FOR).map(([word, meant]) => [stem(word), meant]));

function stemsBeginning(word: string, vocabulary: Vocabulary): Reading[] {
  const begun: Reading[] = [];
  for (const each of vocabulary.stems) {
    if (each.startsWith(word) && begun.push({ stem: each, sureness: BEGUN_SURENESS }) === MOST_BEGUN) break;
  }
  return begun;
}

function halvesOf(word: string, vocabulary: Vocabulary): string[] | null {
  for (let at = 3; at <= word.length - 3; at += 1) {
    const halves = [word.slice(0, at), word.slice(at)];
    if (halves.every((half) => vocabulary.words.has(half))) return halves;
  }
  return null;
}

/**
 * The index words of what was typed, each word as it is most surely meant (two or three where it is a toss-up). A word
 * that the library has nothing like is dropped unless nothing else is left.
 */
export function mendWords(typed: string, vocabulary: Vocabulary): string[] {
  const placed = placeWords(typed, vocabulary);
  const best = placed.flatMap(({ typed: word, readings }) => {
    const surest = Math.max(0, ...readings.map((each) => each.sureness));
    if (surest === BEGUN_SURENESS) return [stem(word)];
    return readings.filter((each) => each.sureness === surest).map((each) => each.stem);
  });
  return [...new Set(best.length > 0 ? best : placed.map((each) => stem(each.typed)))];
}
