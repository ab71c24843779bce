import { randomUUID } from "node:crypto";
import { eq, gt } from "drizzle-orm";
import fc from "fast-check";
import { beforeAll, beforeEach, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import { countCasebook, MOST_COUNTED } from "@/db/queries/casebook";
import { listCasebookPhotos } from "@/db/queries/casebook-beside";
import { getCasebookPage } from "@/db/queries/casebook-page";
import { cases, photos } from "@/db/schema";
import { insertCustomer, insertJob } from "@/db/seed/factories/insert-job";
import type { CasebookCursor } from "@/lib/cases/casebook-cursor";
import type { CasebookFilter } from "@/lib/cases/casebook-filter";
import { TEST_NOW } from "../../fixtures/crew-factory";
import { causeOf, emptyDatabase, makeCase, makeShop, stationNamed, type TestShop } from "../../fixtures/shop-factory";

type CaseRow = typeof cases.$inferSelect;

let db: Db;
let shop: TestShop;
let other: TestShop;
/** A held case of each shop; the rest of a test's cases are made after their pattern. */
let model: CaseRow;
let otherModel: CaseRow;

beforeAll(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
  other = await makeShop(db);
  model = caseRow(makeCase(db, shop).id);
  otherModel = caseRow(makeCase(db, other).id);
});
beforeEach(() => {
  db.delete(cases).where(gt(cases.id, otherModel.id)).run();
});

function caseRow(id: number): CaseRow {
  const row = db.select().from(cases).where(eq(cases.id, id)).get();
  if (!row) throw new Error(`No case ${id}`);
  return row;
}

/** Bare cases after the shop's model: row only, which is all that a list reads. */
function insertCases(rows: Partial<CaseRow>[], like: CaseRow = model): CaseRow[] {
  return rows.map((row) => {
    const bare = { ...like, ref: `CT-2607-${randomUUID()}`, snapKey: randomUUID(), ...row, id: undefined };
    return db.insert(cases).values(bare).returning().get();
  });
}

const closedAs = (closedAt: number, closing: CaseRow["closing"] = "sound"): Partial<CaseRow> => ({
  state: "closed",
  closing,
  closedAt,
  confirmedClass: "underactivation",
});

/** Follows a page's link until there is none. */
function walk(way: "next" | "previous", filter: CasebookFilter, order: "newest" | "oldest", from?: CasebookCursor) {
  const pages: number[][] = [];
  let last: CasebookCursor | null = from ?? null;
  for (let cursor: CasebookCursor | undefined = from; ;) {
    const page = getCasebookPage(db, shop.shopId, { query: { order, cursor }, filter }, TEST_NOW);
    pages.push(page.rows.map((row) => row.id));
    last = page.previous;
    const on: CasebookCursor | null = page[way];
    if (!on) return { pages, last };
    cursor = on;
  }
}

/** The same list by a plain reading of all rows: what pages must add up to. */
function plainList(
  order: "newest" | "oldest",
  has: (row: CaseRow) => boolean,
  timeOf: (row: CaseRow) => number,
): number[] {
  const rows = db.select().from(cases).where(eq(cases.shopId, shop.shopId)).all().filter(has);
  const rising = rows.sort((a, b) => timeOf(a) - timeOf(b) || a.id - b.id).map((row) => row.id);
  return order === "newest" ? rising.reverse() : rising;
}

describe("turning pages", () => {
  const bareCase = fc.record({
    // Few moments for many cases, so that most share theirs.
    openedAt: fc.integer({ min: TEST_NOW - 6, max: TEST_NOW }),
    baseMetal: fc.constantFrom("brass" as const, "steel" as const),
    isClosed: fc.boolean(),
  });
  const bareCases = fc.array(bareCase, { minLength: 0, maxLength: 80 });
  const orders = fc.constantFrom("newest" as const, "oldest" as const);

  function refill(rows: { openedAt: number; baseMetal: "brass" | "steel"; isClosed: boolean }[]): void {
    db.delete(cases).where(gt(cases.id, otherModel.id)).run();
    insertCases(rows.map(({ isClosed, ...row }) => ({ ...row, ...(isClosed ? closedAs(row.openedAt + 3) : {}) })));
  }

  it("shows every case once on the way there and once on the way back", () => {
    fc.assert(
      fc.property(bareCases, orders, fc.boolean(), (rows, order, onlyBrass) => {
        refill(rows);
        const filter: CasebookFilter = onlyBrass ? { baseMetal: "brass" } : {};
        const expected = plainList(
          order,
          (row) => !onlyBrass || row.baseMetal === "brass",
          (row) => row.openedAt,
        );
        const there = walk("next", filter, order);
        expect(there.pages.flat()).toEqual(expected);
        if (there.last) {
          const back = walk("previous", filter, order, there.last).pages.reverse();
          const lastPage = there.pages.at(-1) ?? [];
          expect([...back.flat(), ...lastPage]).toEqual(expected);
        }
      }),
      { numRuns: 25 },
    );
  });

  it("does the same for a closing period, by when the cases were closed", () => {
    fc.assert(
      fc.property(bareCases, orders, (rows, order) => {
        refill(rows);
        const filter: CasebookFilter = { closedFromAt: TEST_NOW - 2, closedUntilAt: TEST_NOW + 2, baseMetal: "steel" };
        const expected = plainList(
          order,
          (row) =>
            row.closedAt !== null &&
            row.closedAt >= TEST_NOW - 2 &&
            row.closedAt < TEST_NOW + 2 &&
            row.baseMetal === "steel",
          (row) => row.closedAt ?? 0,
        );
        const there = walk("next", filter, order);
        expect(there.pages.flat()).toEqual(expected);
        if (there.last) {
          const back = walk("previous", filter, order, there.last).pages.reverse();
          expect([...back.flat(), ...(there.pages.at(-1) ?? [])]).toEqual(expected);
        }
      }),
      { numRuns: 25 },
    );
  });

  it("keeps to the period even where a cursor was made up", () => {
    insertCases([closedAs(TEST_NOW + 50), closedAs(TEST_NOW), closedAs(TEST_NOW - 50)]);
    const filter = { closedFromAt: TEST_NOW - 10, closedUntilAt: TEST_NOW + 10 };
    const cursor = { kind: "on" as const, at: TEST_NOW + 1_000_000, id: 1 };
    const page = getCasebookPage(db, shop.shopId, { query: { cursor }, filter }, TEST_NOW);
    expect(page.rows.map((row) => row.closedAt)).toEqual([TEST_NOW]);
  });

  it("keeps its place while new cases come in", () => {
    insertCases(Array.from({ length: 40 }, (_, index) => ({ openedAt: TEST_NOW - index })));
    const first = getCasebookPage(db, shop.shopId, { query: {}, filter: {} }, TEST_NOW);
    insertCases([{ openedAt: TEST_NOW + 60_000 }]);
    const second = getCasebookPage(
      db,
      shop.shopId,
      { query: { cursor: first.next ?? undefined }, filter: {} },
      TEST_NOW,
    );
    const firstIds = new Set(first.rows.map((row) => row.id));
    expect(second.rows.some((row) => firstIds.has(row.id))).toBe(false);
    expect(first.rows.length + second.rows.length).toBe(41);
  });
});

describe("filters", () => {
  const shown = (filter: CasebookFilter) =>
    getCasebookPage(db, shop.shopId, { query: {}, filter }, TEST_NOW).rows.map((row) => row.id);

  it("each let through only what they name", () => {
    const cause = causeOf(db, shop, "underactivation");
    const rinse = [...shop.stationIds].find(([slug]) => slug !== "activate")?.[1] ?? 0;
    const [caused, traced, steel, returned, byOther, scrap, peeling] = insertCases([
      { ...closedAs(TEST_NOW), confirmedCauseId: cause },
      { tracedStationId: rinse },
      { baseMetal: "stainless" },
      { stageFound: "returned" },
      { openedById: shop.members.otherPlater.memberId },
      closedAs(TEST_NOW, "scrap"),
      { calledClass: "peeling" },
    ]).map((row) => row.id);
    expect(shown({ causeId: cause })).toEqual([caused]);
    expect(shown({ stationId: rinse })).toEqual([traced]);
    expect(shown({ baseMetal: "stainless" })).toEqual([steel]);
    expect(shown({ stageFound: "returned" })).toEqual([returned]);
    expect(shown({ openedById: shop.members.otherPlater.memberId })).toEqual([byOther]);
    expect(shown({ status: "scrap" })).toEqual([scrap]);
    expect(shown({ classSlug: "peeling" })).toEqual([peeling]);
    expect(shown({ status: "closed" }).sort()).toEqual([caused, scrap].sort());
  });

  it("take a held case by its newest call, and a confirmed one by what was confirmed", () => {
    const [held, corrected] = insertCases([
      { calledClass: "peeling", confirmedClass: "burning" },
      { state: "confirmed", calledClass: "peeling", confirmedClass: "pitting" },
    ]).map((row) => row.id);
    expect(shown({ classSlug: "peeling" })).toEqual([held]);
    expect(shown({ classSlug: "pitting" })).toEqual([corrected]);
    expect(shown({ classSlug: "burning" })).toEqual([]);
  });

  it("narrow together", () => {
    const [both] = insertCases([
      { stageFound: "returned", baseMetal: "stainless" },
      { stageFound: "returned" },
      { baseMetal: "stainless" },
    ]).map((row) => row.id);
    expect(shown({ stageFound: "returned", baseMetal: "stainless" })).toEqual([both]);
  });

  it("gather a customer's cases over all their jobs, newest first, few or many", () => {
    const customerId = insertCustomer(db, shop.shopId, "Lockyer Fittings");
    const jobs = ["J-1", "J-2"].map((number) =>
      insertJob(db, { shopId: shop.shopId, customerId, number: `${number}-${randomUUID()}` }),
    );
    const few = insertCases(
      [0, 1, 2, 3].map((index) => ({ workOrderId: jobs[index % 2], openedAt: TEST_NOW - 100 + index })),
    ).map((row) => row.id);
    expect(shown({ customerId })).toEqual(few.toReversed());
    insertCases(
      Array.from({ length: MOST_COUNTED }, (_, index) => ({ workOrderId: jobs[0], openedAt: TEST_NOW - 5000 + index })),
    );
    expect(shown({ customerId }).slice(0, 4)).toEqual(few.toReversed());
  });

  it("count exactly up to a thousand, and say that there are more beyond", () => {
    insertCases(Array.from({ length: MOST_COUNTED - 1 }, () => ({})));
    expect(countCasebook(db, shop.shopId, {})).toEqual({ count: 1000, isCapped: false });
    insertCases([{}]);
    expect(countCasebook(db, shop.shopId, {})).toEqual({ count: 1000, isCapped: true });
  });
});

describe("another shop", () => {
  it("shows in no page, no count and no filter", () => {
    insertCases([{ baseMetal: "pewter" }], otherModel);
    const station = stationNamed(other.stationIds, "activate");
    for (const filter of [{}, { baseMetal: "pewter" as const }, { stationId: station }]) {
      const page = getCasebookPage(db, shop.shopId, { query: {}, filter }, TEST_NOW);
      expect(page.rows.every((row) => row.id === model.id)).toBe(true);
      expect(page.count.count).toBe(page.rows.length);
    }
  });
});

describe("photos of a page", () => {
  it("are the first of the snap and the first of the last re-strike, once they can be shown", () => {
    const photo = (id: string, row: Partial<typeof photos.$inferInsert>): typeof photos.$inferInsert => ({
      id,
      shopId: shop.shopId,
      caseId: model.id,
      purpose: "suspect",
      state: "ready",
      memberId: shop.members.plater.memberId,
      fileName: "",
      createdAt: TEST_NOW,
      ...row,
    });
    db.insert(photos)
      .values([
        photo("snap-2", { position: 1 }),
        photo("snap-1", { position: 0 }),
        photo("again-1", { purpose: "re-strike", round: 1 }),
        photo("again-2b", { purpose: "re-strike", round: 2, position: 1 }),
        photo("again-2a", { purpose: "re-strike", round: 2, position: 0 }),
        photo("on-its-way", { purpose: "re-strike", round: 3, state: "awaited" }),
      ])
      .run();
    const pair = listCasebookPhotos(db, shop.shopId, [model.id]).get(model.id);
    expect([pair?.before?.id, pair?.after?.id]).toEqual(["snap-1", "again-2a"]);
    expect(listCasebookPhotos(db, other.shopId, [model.id]).size).toBe(0);
  });
});
