import Database from "better-sqlite3";
import type { EntryText, FindPlaces } from "@/lib/library/large-library-search";

/** Candidates that are worth weighing one by one. */
const MOST_PLACES = 200;

/** How much a word counts by where it stands: in a name, in an explanation. Found by trying on the phrases in the tests. */
const BY_PLACE = "bm25(2, 1)";

/**
 * A full-text index of one shop's library, in memory and only as long as somebody holds the result: it is made from the
 * library whenever that changes, so nothing in the shop's database has to be kept in step with it, and no shop's words
 * stand beside another's.
 * @returns the places of the best two hundred texts that hold any of the words
 */
export function indexLibraryTexts(texts: readonly EntryText[]): FindPlaces {
  const client = new Database(":memory:");
  client.exec(
    `create virtual table library_search using fts5(named, explained, content = '', tokenize = 'unicode61 remove_diacritics 2')`,
  );
  const insert = client.prepare("insert into library_search (rowid, named, explained) values (?, ?, ?)");
  client.transaction(() => {
    for (const [place, { named, explained }] of texts.entries()) insert.run(place, named, explained);
  })();
  const query = client
    .prepare<[string], number>(
      `select rowid from library_search where library_search match ? and rank match '${BY_PLACE}'
       order by rank limit ${MOST_PLACES}`,
    )
    .pluck();
  return (words) => (words.length > 0 ? query.all(anyOf(words)) : []);
}

/** Index words are letters and digits, and quoted besides: nothing typed can become the index's syntax. */
function anyOf(words: readonly string[]): string {
  return words.map((word) => `"${word.replaceAll('"', '""')}"`).join(" OR ");
}
