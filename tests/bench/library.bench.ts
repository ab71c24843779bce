import Fuse from "fuse.js";
import { searchCases } from "@/db/queries/case-search";
import { indexLibraryTexts } from "@/db/library-full-text";
import { shelf } from "@/db/seed/library/shelf";
import { matchExpression } from "@/lib/cases/search-query";
import { buildLargeLibrarySearch } from "@/lib/library/large-library-search";
import { buildLibrarySearch } from "@/lib/library/library-search";
import { sizeOf } from "@/lib/library/library-size";
import { documentsOf } from "@/lib/library/search-documents";
import { placeWords, vocabularyOf } from "@/lib/library/search-words";
import { largeLibrary } from "@/tests/fixtures/large-library";
import { SEARCH_PHRASES } from "@/tests/lib/library/search-phrases";
import { bareFullText, bareFuse } from "./bare-library";
import { bareSearch } from "./bare-sql";
import { makeBenchDatabase } from "./bench-database";
import { race, raceOver, timed } from "./race";

/**
 * The library's answer at each key of forty phrases, as shipped and with 5,000 entries, and the search over 100,000 cases:
 * against bare Fuse, and where there is full text against its bare SQL, turn by turn. Exits 1 outside a limit.
 *   node --conditions=react-server --import tsx tests/bench/library.bench.ts
 */
const PHRASES = 40;
const MOST_OF_FUSE = 1.2;
const MOST_OF_SQL = 3;
const TIMES_FASTER_THAN_FUSE = 10;
const LARGE = 5_000;
const CASES = 100_000;
const RUNS = 40;
/** Fuse takes seconds over thousands, so it is asked little. */
const FUSE_KEYS = 12;

let isOver = false;
function report(
  name: string,
  { oursMs, bareMs }: { oursMs: number; bareMs: number },
  bare: string,
  most: number,
): void {
  const ratio = oursMs / bareMs;
  isOver ||= !(ratio <= most);
  const figures = `${oursMs.toFixed(2)} ms, ${bare} ${bareMs.toFixed(2)} ms`;
  const said =
    most < 1
      ? `${(1 / ratio).toFixed(0)} times faster (at least ${TIMES_FASTER_THAN_FUSE})`
      : `ratio ${ratio.toFixed(2)} (at most ${most})`;
  console.log(`${name.padEnd(40)} ${figures}, ${said}`);
}

/** Every phrase as it is typed, letter by letter: each in its turn from all over the set. */
const step = SEARCH_PHRASES.length / PHRASES;
const phrases = Array.from({ length: PHRASES }, (_, index) => SEARCH_PHRASES[Math.floor(index * step)]?.typed ?? "");
const keys = phrases.flatMap((typed) => Array.from(typed, (_, index) => typed.slice(0, index + 1)));
/** Keys spread over the phrases and over their lengths. */
const fewKeys = Array.from(
  { length: FUSE_KEYS },
  (_, index) => keys[Math.floor((index * keys.length) / FUSE_KEYS)] ?? "",
);

console.log(`${phrases.length} phrases, ${keys.length} keys.`);
atShippedSize();
withManyEntries();
await withManyCases();
process.exit(isOver ? 1 : 0);

function atShippedSize(): void {
  const { median, sum } = raceOver(keys, buildLibrarySearch(shelf), bareFuse(documentsOf(shelf)));
  report(`${sizeOf(shelf)} entries, a key, median`, median, "bare Fuse", MOST_OF_FUSE);
  report(`${sizeOf(shelf)} entries, all keys`, sum, "bare Fuse", MOST_OF_FUSE);
}

function withManyEntries(): void {
  const entries = largeLibrary(shelf, LARGE);
  const name = `${sizeOf(entries).toLocaleString("en")} entries`;
  let search = buildLibrarySearch({ classes: [], causes: [], fixes: [] });
  const buildMs = timed(() => (search = buildLargeLibrarySearch(entries, indexLibraryTexts)));
  console.log(`${name} are indexed in ${buildMs.toFixed(0)} ms, once after something was published.`);
  const documents = documentsOf(entries);
  const vocabulary = vocabularyOf(documents.map(({ prose }) => prose));
  const fullText = bareFullText(documents);
  const words = new Map(
    keys.map((typed) => [
      typed,
      [...new Set(placeWords(typed, vocabulary).flatMap(({ readings }) => readings.map(({ stem }) => stem)))],
    ]),
  );
  const { median, sum } = raceOver(keys, search, (typed) => fullText(words.get(typed) ?? []));
  report(`${name}, a key, median`, median, "bare SQL", MOST_OF_SQL);
  report(`${name}, all keys`, sum, "bare SQL", MOST_OF_SQL);
  const againstFuse = raceOver(fewKeys, search, bareFuse(documents));
  report(`${name}, ${FUSE_KEYS} keys, median`, againstFuse.median, "bare Fuse", 1 / TIMES_FASTER_THAN_FUSE);
}

async function withManyCases(): Promise<void> {
  const { db, shopId, remove } = await makeBenchDatabase(CASES, (said) => console.log(said));
  const now = Date.now();
  const texts = db.$client
    .prepare<[string]>("select case_id, job, class, cause, notes from case_texts where scope = ?")
    .all(`s${shopId}`);
  const fuse = new Fuse(texts, {
    keys: ["job", "class", "cause", "notes"],
    useTokenSearch: true,
    ignoreLocation: true,
    threshold: 0.35,
  });
  for (const typed of ["underactivaton", "brass keyway", "pachy shels", "smutt"]) {
    const ours = () => searchCases(db, shopId, typed, {}, now);
    const { terms, isLoose } = ours();
    const bare = bareSearch(db.$client, matchExpression(shopId, terms, isLoose ? "any" : "all"));
    const raced = race(RUNS, ours, bare);
    const name = `${texts.length.toLocaleString("en")} cases, ${typed}`;
    report(name, raced, "bare SQL", MOST_OF_SQL);
    const fuseMs = timed(() => fuse.search(typed, { limit: 200 }));
    report(name, { oursMs: raced.oursMs, bareMs: fuseMs }, "bare Fuse", 1 / TIMES_FASTER_THAN_FUSE);
  }
  remove();
}
