import { beforeEach, describe, expect, it, vi } from "vitest";
import { insertStripRows } from "@/db/changes/insert-strip-rows";
import type { Db } from "@/db/open";
import { getCostFacts } from "@/db/queries/case-costs";
import { openPriceBook } from "@/db/queries/price-book";
import { getStripRow, getStripTableAt, insertStripRow } from "@/db/queries/strip-table";
import { stripRows } from "@/db/schema";
import { DISSOLVING_ROWS, POLISHING_ROW } from "@/lib/costs/strip-method-rows";
import type { DissolvingRow } from "@/lib/costs/strip-methods";
import { SHIPPED_STRIP_TABLE } from "@/lib/costs/strip-plan";
import { insertShop, TEST_NOW } from "@/tests/fixtures/crew-factory";
import { emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const DAY_MS = 86_400_000;
const PERSULFATE = "copper-persulfate";
let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

const ratesAt = (at: number) =>
  getStripTableAt(db, shop.shopId, at).dissolving.find((row) => row.id === PERSULFATE)?.rateUmPerMin.likely;

/** The owner saves a row, as the form does. */
function save(slug: string, at: number, change: Partial<DissolvingRow>, retired = false): void {
  const standing = getStripRow(db, shop.shopId, PERSULFATE);
  if (!standing || standing.row.method === "polish-back") throw new Error("no such way");
  insertStripRow(db, {
    shopId: shop.shopId,
    slug,
    row: { ...standing.row, ...change, id: slug },
    retired,
    position: standing.position,
    setById: shop.members.owner.memberId,
    setAt: at,
  });
}

describe("a shop's ways to strip", () => {
  it("are at first a copy of those that ship, in their order", () => {
    const { dissolving, polishing } = getStripTableAt(db, shop.shopId, TEST_NOW);
    expect(dissolving).toEqual(DISSOLVING_ROWS);
    expect(polishing).toEqual(POLISHING_ROW);
  });

  it("hold from when they were set: a part of an earlier day keeps the row of its day", () => {
    save(PERSULFATE, TEST_NOW + 2 * DAY_MS, { rateUmPerMin: { low: 2, likely: 3, high: 4 } });
    expect(ratesAt(TEST_NOW + DAY_MS)).toBe(1);
    expect(ratesAt(TEST_NOW + 3 * DAY_MS)).toBe(3);
  });

  it("see a part from before the shop had its table by the rows that came with the shop", () => {
    expect(ratesAt(TEST_NOW - 100 * DAY_MS)).toBe(1);
  });

  it("a way that the shop added later was not there before", () => {
    save("own-bath", TEST_NOW + 2 * DAY_MS, {});
    const idsAt = (at: number) => getStripTableAt(db, shop.shopId, at).dissolving.map((row) => row.id);
    expect(idsAt(TEST_NOW + DAY_MS)).not.toContain("own-bath");
    expect(idsAt(TEST_NOW - DAY_MS)).not.toContain("own-bath");
    expect(idsAt(TEST_NOW + 2 * DAY_MS)).toContain("own-bath");
  });

  it("a retired way is offered no more, until it is brought back", () => {
    save(PERSULFATE, TEST_NOW + DAY_MS, {}, true);
    save(PERSULFATE, TEST_NOW + 3 * DAY_MS, {}, false);
    expect([0, 1, 2, 3].map((days) => ratesAt(TEST_NOW + days * DAY_MS))).toEqual([1, undefined, undefined, 1]);
  });

  it("are those that ship while a shop has no row at all", () => {
    expect(getStripTableAt(db, insertShop(db), TEST_NOW)).toBe(SHIPPED_STRIP_TABLE);
  });

  it("given a second time add nothing, and leave alone what the owner changed or retired", () => {
    save(PERSULFATE, TEST_NOW + DAY_MS, {}, true);
    const before = db.select().from(stripRows).all();
    expect(insertStripRows(db, shop.shopId, TEST_NOW)).toBe(0);
    expect(db.select().from(stripRows).all()).toEqual(before);
  });

  it("cannot be written over, not even by a query", () => {
    expect(() => db.update(stripRows).set({ retired: true }).run()).toThrow(/append-only/);
    expect(() => db.delete(stripRows).run()).toThrow(/append-only/);
  });
});

describe("the price of a case", () => {
  it("rests on the table of the day on which the part was snapped", () => {
    const early = makeCase(db, shop, { now: TEST_NOW + DAY_MS });
    save(PERSULFATE, TEST_NOW + 2 * DAY_MS, { rateUmPerMin: { low: 2, likely: 3, high: 4 } });
    const late = makeCase(db, shop, { now: TEST_NOW + 3 * DAY_MS });
    const likely = (id: number) =>
      getCostFacts(db, shop.shopId, id)?.table?.dissolving.find((row) => row.id === PERSULFATE)?.rateUmPerMin.likely;
    expect([likely(early.id), likely(late.id)]).toEqual([1, 3]);
  });

  it("of many cases in one go reads rates, table and record once", () => {
    const ids = Array.from({ length: 30 }, () => makeCase(db, shop).id);
    const prepare = vi.spyOn(db.$client, "prepare");
    const book = openPriceBook(db, shop.shopId);
    for (const id of ids) getCostFacts(db, shop.shopId, id, book);
    const reads = (table: string) => prepare.mock.calls.filter(([sql]) => sql.includes(`from "${table}"`)).length;
    expect(reads("strip_rows")).toBe(1);
    expect(reads("shop_rates")).toBe(1);
    expect(prepare.mock.calls.filter(([sql]) => sql.includes("closed_cases")).length).toBe(1);
  });
});
