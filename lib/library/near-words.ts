/** The words of a library laid out so that a misspelt one finds its neighbours without comparing it to each. */
import { editDistance } from "@/lib/library/edit-distance";

/** A word that may be meant. */
interface Known {
  word: string;
  /** The word it is indexed as, where shops spell it in two ways. */
  indexed: string;
  /** How often the library says it. */
  count: number;
  /** One bit a letter: words with too many letters of their own are too far. */
  letters: number;
}

export interface NearWords {
  byLength: ReadonlyMap<number, readonly Known[]>;
  bySound: ReadonlyMap<string, readonly Known[]>;
  byLetters: ReadonlyMap<string, readonly Known[]>;
}

export interface NearWord {
  word: string;
  /** 0 to 1: the more of it was spelt right, the surer. */
  sureness: number;
}

const LEAST_LETTERS = 3;
const MOST_NEAR = 3;
/** How far a word counts that only sounds alike: a little more than one edit. */
const SOUND_ALIKE = 1.25;
const SOUND_ALIKE_SURENESS = 0.6;
/** A shorter word sounds like too many. */
const LEAST_SOUNDED = 4;
/** Letters that a sound-alike may be longer or shorter by. */
const SOUND_ALIKE_LETTERS = 2;
/** What one edit in a word takes off, against the word's length. */
const LOST_BY_EDIT = 2;
/** All its letters are there, in another order. */
const SWAPPED_SURENESS = 0.65;

/**
 * @param words each with how often the library says it
 * @param spellings other spelling → the one that is indexed
 * @param stems what the words are cut to, for a misspelt word in a shape that the library does not use
 */
export function nearWordsOf(
  words: ReadonlyMap<string, number>,
  spellings: Readonly<Record<string, string>>,
  stems: Iterable<string>,
): NearWords {
  const all: Known[] = [...words].map(([word, count]) => known(word, word, count));
  for (const [word, indexed] of Object.entries(spellings)) {
    const count = words.get(indexed);
    if (count !== undefined && word.length > LEAST_LETTERS) all.push(known(word, indexed, count));
  }
  for (const stem of stems) if (!words.has(stem) && stem.length > LEAST_LETTERS) all.push(known(stem, stem, 0));
  const apt = all.filter(({ word }) => word.length >= LEAST_LETTERS && !/\d/.test(word));
  return {
    byLength: grouped(apt, ({ word }) => word.length),
    bySound: grouped(
      apt.filter(({ word }) => soundOf(word).length > 1),
      ({ word }) => soundOf(word),
    ),
    byLetters: grouped(apt, ({ word }) => lettersSorted(word)),
  };
}

function known(word: string, indexed: string, count: number): Known {
  return { word, indexed, count, letters: lettersOf(word) };
}

function grouped<Key>(all: readonly Known[], keyOf: (each: Known) => Key): Map<Key, Known[]> {
  const groups = new Map<Key, Known[]>();
  for (const each of all) {
    const key = keyOf(each);
    const group = groups.get(key);
    if (group) group.push(each);
    else groups.set(key, [each]);
  }
  return groups;
}

/** The words nearest to a misspelt one, at most three, all equally far; those said most first. */
export function nearestWords(typed: string, near: NearWords): NearWord[] {
  if (typed.length < LEAST_LETTERS) return [];
  const far = new Map<Known, number>();
  const alike = typed.length < LEAST_SOUNDED ? [] : (near.bySound.get(soundOf(typed)) ?? []);
  for (const each of alike) {
    if (Math.abs(each.word.length - typed.length) <= SOUND_ALIKE_LETTERS) far.set(each, SOUND_ALIKE);
  }
  for (const { each, edits } of withinReach(typed, near)) {
    const reach = typed[0] === each.word[0] ? edits : edits + 0.5;
    far.set(each, Math.min(reach, far.get(each) ?? reach));
  }
  for (const each of near.byLetters.get(lettersSorted(typed)) ?? []) {
    if (each.word[0] === typed[0]) far.set(each, 1);
  }
  const nearest = Math.min(...far.values());
  return [...far]
    .filter(([, each]) => each === nearest)
    .map(([each]) => each)
    .sort((a, b) => b.count - a.count || (a.word < b.word ? -1 : 1))
    .slice(0, MOST_NEAR)
    .map((each) => ({ word: each.indexed, sureness: surenessOf(typed, each.word, nearest) }));
}

/** Words that few enough edits make of what was typed: one edit in a short word, up to three in a long one. */
function withinReach(typed: string, { byLength }: NearWords): { each: Known; edits: number }[] {
  const allowed = typed.length < 6 ? 1 : typed.length < 10 ? 2 : 3;
  const letters = lettersOf(typed);
  const reached: { each: Known; edits: number }[] = [];
  for (let length = typed.length - allowed; length <= typed.length + allowed; length += 1) {
    for (const each of byLength.get(length) ?? []) {
      if (bitsOf(letters ^ each.letters) > 2 * allowed) continue;
      const edits = editDistance(typed, each.word);
      if (edits <= allowed) reached.push({ each, edits });
    }
  }
  return reached;
}

function surenessOf(typed: string, word: string, far: number): number {
  if (lettersSorted(typed) === lettersSorted(word)) return SWAPPED_SURENESS;
  return far === SOUND_ALIKE
    ? SOUND_ALIKE_SURENESS
    : Math.max(0.3, 1 - (LOST_BY_EDIT * far) / Math.max(typed.length, word.length));
}

function lettersOf(word: string): number {
  let letters = 0;
  for (const letter of word) letters |= 1 << (letter.charCodeAt(0) - 97);
  return letters;
}

function bitsOf(letters: number): number {
  let bits = 0;
  for (let left = letters; left !== 0; left &= left - 1) bits += 1;
  return bits;
}

function lettersSorted(word: string): string {
  return [...word].sort().join("");
}

/** What is left when spelling is taken away: ruff and rough, flaik and flake, oxadashun and oxidation sound alike. */
function soundOf(word: string): string {
  return word
    .replace(/ph/g, "f")
    .replace(/[ts]i(?=o)/g, "s")
    .replace(/ough/g, "of")
    .replace(/ck|q/g, "k")
    .replace(/c(?=[eiy])/g, "s")
    .replace(/c/g, "k")
    .replace(/z/g, "s")
    .replace(/(?!^)[aeiouywh]/g, "")
    .replace(/(.)\1+/g, "$1");
}
