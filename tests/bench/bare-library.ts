import Database from "better-sqlite3";
import Fuse from "fuse.js";
import type { SearchDocument } from "@/lib/library/search-documents";

/** What a search of the library comes down to without ours: the library Fuse by itself, and full-text SQL by itself. */

/** Fuse as its own manual sets it up for words in any order, on an index built beforehand. Long texts are left out: with them it takes three times as long. */
export function bareFuse(documents: readonly SearchDocument[]): (typed: string) => unknown {
  const keys = ["title", "phrases.said"];
  const fuse = new Fuse(
    documents,
    { keys, useTokenSearch: true, ignoreLocation: true, threshold: 0.35, includeMatches: true },
    Fuse.createIndex(keys, documents),
  );
  return (typed) => fuse.search(typed, { limit: 24 });
}

/** Titles, slugs and kinds of the best 200 entries that hold any of the words. The words are given: it mends nothing. */
export function bareFullText(documents: readonly SearchDocument[]): (words: readonly string[]) => unknown {
  const client = new Database(":memory:");
  client.exec("create virtual table entries using fts5(words, slug unindexed, title unindexed, kind unindexed)");
  const insert = client.prepare("insert into entries values (?, ?, ?, ?)");
  for (const { words, slug, title, kind } of documents) insert.run([...words.keys()].join(" "), slug, title, kind);
  const query = client.prepare("select slug, title, kind from entries where entries match ? order by rank limit 200");
  return (words) => (words.length > 0 ? query.all(words.map((word) => `"${word}"`).join(" OR ")) : []);
}
