import { sql } from "drizzle-orm";
import { buildWordMap, nearWords, wordsBeginning, type WordMap } from "@/lib/cases/word-map";
import { hasDigit, wordExpression, type SearchTerm } from "@/lib/cases/search-query";
import type { Handle } from "../open";
import { preparedOnce } from "../prepared";

/** The index's words as they stood at a moment, for all shops together: whether a shop has one is asked each time. */
interface Vocabulary {
  map: WordMap;
  builtAt: number;
  /** Changes whenever anything was written to the database. */
  mark: string;
  /** "shop word" → the shop's cases hold it. */
  held: Map<string, boolean>;
}

const vocabularies = new WeakMap<Handle, Vocabulary>();

const KEPT_MS = 10 * 60_000;
/** A word that was not found may have been written a moment ago, so then a younger vocabulary is asked. */
const KEPT_AFTER_MISS_MS = 2_000;
const MOST_READINGS = 8;
const MOST_BEGINNINGS = 20;
const LEAST_LETTERS = 4;

/**
 * Reads the words of a search against those of the shop's own cases: one that no case holds, nor one that begins so,
 * becomes the shop's words nearest to it. Words with digits stay as typed.
 * @param now UTC milliseconds
 */
export function readSearchWords(db: Handle, shopId: number, words: readonly string[], now: number): SearchTerm[] {
  const terms = words.map((word) => readWord(db, shopId, vocabularyOf(db, now, KEPT_MS), word));
  if (terms.every((term) => term !== null)) return terms;
  const younger = vocabularyOf(db, now, KEPT_AFTER_MISS_MS);
  return words.map((typed) => readWord(db, shopId, younger, typed) ?? { typed, readAs: [] });
}

/** Null where neither the word nor anything near it stands in the shop's cases. */
function readWord(db: Handle, shopId: number, vocabulary: Vocabulary, typed: string): SearchTerm | null {
  const asTyped = { typed, readAs: [] };
  if (hasDigit(typed)) return asTyped;
  const isHeld = (word: string) => holdsWord(db, shopId, vocabulary, word);
  if (vocabulary.map.counts.has(typed) && isHeld(typed)) return asTyped;
  if (wordsBeginning(vocabulary.map, typed, MOST_BEGINNINGS).some(isHeld)) return asTyped;
  if (typed.length < LEAST_LETTERS) return asTyped;
  const readAs: string[] = [];
  for (const word of nearWords(vocabulary.map, typed)) {
    if (readAs.length < MOST_READINGS && isHeld(word)) readAs.push(word);
  }
  return readAs.length > 0 ? { typed, readAs } : null;
}

/** The vocabulary knows the words of every shop; only those that this one's cases hold may ever be offered. */
function holdsWord(db: Handle, shopId: number, vocabulary: Vocabulary, word: string): boolean {
  const key = `${shopId} ${word}`;
  const known = vocabulary.held.get(key);
  if (known !== undefined) return known;
  const query = preparedOnce(db, "case search word", () =>
    db
      .select({ one: sql<number>`1` })
      .from(sql`case_search`)
      .where(sql`case_search match ${sql.placeholder("expression")}`)
      .limit(1)
      .prepare(),
  );
  const held = query.get({ expression: wordExpression(shopId, word) }) !== undefined;
  vocabulary.held.set(key, held);
  return held;
}

function vocabularyOf(db: Handle, now: number, keptMs: number): Vocabulary {
  const kept = vocabularies.get(db);
  if (kept && now - kept.builtAt < keptMs) return kept;
  const mark = markOf(db);
  if (kept?.mark === mark) return kept;
  // Digits sort before letters: references and job numbers are most of the index's words and are never mended.
  const rows = preparedOnce(db, "case words", () =>
    db
      .select({ word: sql<string>`term`, cases: sql<number>`doc` })
      .from(sql`case_words`)
      .where(sql`term >= ':'`)
      .prepare(),
  ).all();
  const map = buildWordMap(rows.filter(({ word }) => !hasDigit(word)));
  const built = { map, builtAt: now, mark, held: new Map<string, boolean>() };
  vocabularies.set(db, built);
  return built;
}

/** What this connection wrote, and what others did. */
function markOf(db: Handle): string {
  const row = preparedOnce(db, "write mark", () =>
    db
      .select({ own: sql<number>`total_changes()`, others: sql<number>`data_version` })
      .from(sql`pragma_data_version`)
      .prepare(),
  ).get();
  return `${row?.own}-${row?.others}`;
}
