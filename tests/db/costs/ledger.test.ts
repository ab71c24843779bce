import { beforeEach, describe, expect, it } from "vitest";
import { sql } from "drizzle-orm";
import { releaseCase } from "@/db/changes/confirm-case";
import type { Db } from "@/db/open";
import { countLedgerBasis, listCostBy, listCostByStage } from "@/db/queries/ledger";
import { cases } from "@/db/schema";
import { LEDGER_GROUPS } from "@/lib/costs/ledger.schema";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const DAY_MS = 86_400_000;
let db: Db;
let shop: TestShop;

/** Closes a case at once: scrapped at its second look, on that day. */
function scrapped(on: TestShop, classSlug: string, now: number, quantity = 1): void {
  const held = makeCase(db, on, { now, quantity, stageFound: quantity > 2 ? "after-final-plate" : "at-strike" });
  confirmFor(db, on, held, { classSlug, disposition: "scrap", why: "eaten away", steps: [] }, now + 60_000);
}

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
  for (const [index, classSlug] of ["dewetting", "underactivation", "dewetting", "oxidation", "pitting"].entries()) {
    scrapped(shop, classSlug, TEST_NOW + index * DAY_MS, 1 + index);
  }
});

const scope = { fromAt: TEST_NOW, untilAt: TEST_NOW + 10 * DAY_MS };
const total = (rows: { costCents: number }[]) => rows.reduce((sum, row) => sum + row.costCents, 0);
const sumOfCases = (shopId: number) =>
  db
    .select({ cents: sql<number>`sum(${cases.costCents})` })
    .from(cases)
    .where(sql`shop_id = ${shopId}`)
    .get()?.cents;

describe("the ledger", () => {
  it("comes to the sum of its cases to the cent, whatever it is added up by", () => {
    for (const by of LEDGER_GROUPS)
      expect(total(listCostBy(db, shop.shopId, by, scope)), by).toBe(sumOfCases(shop.shopId));
    expect(total(listCostByStage(db, shop.shopId, scope))).toBe(sumOfCases(shop.shopId));
  });

  it("holds a case from the moment its day begins until the last day ends", () => {
    const closedAt = TEST_NOW + 60_000;
    const only = (fromAt: number, untilAt: number) => listCostBy(db, shop.shopId, "class", { fromAt, untilAt });
    expect(only(closedAt, closedAt + 1)).toHaveLength(1);
    expect(only(closedAt + 1, closedAt + 2)).toHaveLength(0);
    expect(only(closedAt - 1, closedAt)).toHaveLength(0);
  });

  it("knows nothing of another shop", async () => {
    const other = await makeShop(db);
    scrapped(other, "peeling", TEST_NOW, 9);
    expect(total(listCostBy(db, shop.shopId, "cause", scope))).toBe(sumOfCases(shop.shopId));
    expect(listCostBy(db, shop.shopId, "class", scope).map((row) => row.key)).not.toContain("peeling");
  });

  it("leaves out a false alarm, and says what lies open beside the sum", () => {
    const before = total(listCostBy(db, shop.shopId, "cause", scope));
    const doer = {
      shopId: shop.shopId,
      memberId: shop.members.senior.memberId,
      now: TEST_NOW + DAY_MS,
      asTrainee: false,
    };
    releaseCase(db, doer, makeCase(db, shop), "only light");
    const open = makeCase(db, shop);
    expect(total(listCostBy(db, shop.shopId, "cause", scope))).toBe(before);
    const basis = countLedgerBasis(db, shop.shopId, scope);
    expect(basis.open.cases).toBe(1);
    expect(basis.recorded + basis.estimated).toBe(5);
    expect(open.state).toBe("held");
  });
});
