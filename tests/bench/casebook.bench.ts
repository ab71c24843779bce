import { getCasebookPage } from "@/db/queries/casebook-page";
import { searchCases } from "@/db/queries/case-search";
import { listQueue } from "@/db/queries/second-look";
import type { CasebookCursor } from "@/lib/cases/casebook-cursor";
import type { CasebookFilter } from "@/lib/cases/casebook-filter";
import { CASEBOOK_LIMITS } from "@/lib/cases/casebook.schema";
import { matchExpression } from "@/lib/cases/search-query";
import { bareCasebook, bareQueue, bareSearch } from "./bare-sql";
import { makeBenchDatabase } from "./bench-database";
import { longScans } from "./long-scans";
import { race } from "./race";

/**
 * With 100,000 cases: a casebook page, a search and the queue, each against its bare SQL through the bare driver on the
 * same data, in one run. Exits 1 above 3, or where a list walks or sorts a whole table.
 *   node --conditions=react-server --import tsx tests/bench/casebook.bench.ts
 */
const CASES = 100_000;
const HELD = 4_000;
const LIMIT = 3;
const RUNS = 60;
const DAY_MS = 86_400_000;

const { db, shopId, remove } = await makeBenchDatabase(CASES, (words) => console.log(words));
const client = db.$client;
const now = Date.now();
// The bulk is all closed: some thousands of it wait again, spread over the years.
client
  .prepare(
    `update cases set state = 'held', closing = null, closed_at = null where shop_id = ? and id % ? = 0 and state = 'closed'`,
  )
  .run(shopId, Math.round(CASES / HELD));
client.exec("analyze");

const first = (sql: string) => client.prepare(sql).pluck().get(shopId) as number; // a row number
const causeId = first("select confirmed_cause_id from cases where shop_id = ? group by 1 order by count(*) desc");
const stationId = first("select id from stations where shop_id = ? and kind = 'activate'");
const customerId = first("select id from customers where shop_id = ?");
const openedById = first("select id from members where shop_id = ?");

let isOver = false;
function report(name: string, { oursMs, bareMs }: { oursMs: number; bareMs: number }): void {
  const ratio = oursMs / bareMs;
  isOver ||= !(ratio <= LIMIT);
  const figures = `${oursMs.toFixed(3)} ms, bare SQL ${bareMs.toFixed(3)} ms, ratio ${ratio.toFixed(2)}`;
  console.log(`${name.padEnd(44)} ${figures} (at most ${LIMIT})`);
}

console.log(`${first("select count(*) from cases where shop_id = ?").toLocaleString("en")} cases, medians of ${RUNS}.`);
const year = { closedFromAt: now - 700 * DAY_MS, closedUntilAt: now - 335 * DAY_MS };
const pages: [string, CasebookFilter][] = [
  ["casebook, newest", {}],
  ["casebook, class", { classSlug: "underactivation" }],
  ["casebook, station", { stationId }],
  ["casebook, held", { status: "held" }],
  ["casebook, class and metal", { classSlug: "underactivation", baseMetal: "brass" }],
  ["casebook, customer", { customerId }],
  ["casebook, opener and ending", { openedById, status: "sound" }],
  ["casebook, ledger's cause in a year", { causeId, status: "closed", ...year }],
];
// Before anything is timed: a statement is only seen when it is prepared, and that is done once.
const scans = longScans(db, () => {
  for (const [, filter] of pages) {
    const next = getCasebookPage(db, shopId, { query: {}, filter }, now).next ?? undefined;
    getCasebookPage(db, shopId, { query: { cursor: next }, filter }, now);
  }
  listQueue(db, shopId, { stationId: null, limit: CASEBOOK_LIMITS.page });
});
for (const scan of scans) console.log(`walks or sorts a whole table: ${scan}`);

for (const [name, filter] of pages) {
  const bare = bareCasebook(client, shopId, filter, CASEBOOK_LIMITS.page);
  const page = (cursor?: CasebookCursor) => getCasebookPage(db, shopId, { query: { cursor }, filter }, now);
  report(
    name,
    race(
      RUNS,
      () => page(),
      () => bare(null),
    ),
  );
  const next = page().next;
  if (next && next.kind !== "match")
    report(
      `${name}, next page`,
      race(
        RUNS,
        () => page(next),
        () => bare(next),
      ),
    );
}

for (const typed of ["underactivation", "underactivaton", "brass keyway", "pachy shels", "smutt"]) {
  const { terms, isLoose } = searchCases(db, shopId, typed, {}, now);
  const bare = bareSearch(client, matchExpression(shopId, terms, isLoose ? "any" : "all"));
  report(
    `search, ${typed}`,
    race(RUNS, () => searchCases(db, shopId, typed, {}, now), bare),
  );
}

for (const station of [null, stationId]) {
  const bare = bareQueue(client, shopId, station, CASEBOOK_LIMITS.page);
  const queue = () => listQueue(db, shopId, { stationId: station, limit: CASEBOOK_LIMITS.page });
  report(station === null ? "queue" : "queue, one station", race(RUNS, queue, bare));
}

remove();
process.exit(isOver || scans.length > 0 ? 1 : 0);
