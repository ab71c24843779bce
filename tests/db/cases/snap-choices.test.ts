import { eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import { getLastSnap, listSeniorNames, listSnapChoices } from "@/db/queries/snap-choices";
import { runs, runSolutions, solutions, workOrders } from "@/db/schema";
import { insertJob } from "@/db/seed/factories/insert-job";
import { SHELF_CLASSES } from "@/lib/cases/case-words";
import { TEST_NOW } from "../../fixtures/crew-factory";
import { emptyDatabase, makeCase, makeShop, type TestShop } from "../../fixtures/shop-factory";

let db: Db;
let shop: TestShop;
let other: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
  other = await makeShop(db);
});

function addRun(code: string, workOrderId: number, struckAt: number): number {
  const row = {
    shopId: shop.shopId,
    code,
    workOrderId,
    method: "bath",
    memberId: shop.members.plater.memberId,
  } as const;
  return db
    .insert(runs)
    .values({ ...row, partsStruck: 48, struckAt })
    .returning({ id: runs.id })
    .get().id;
}

describe("what a snap may name", () => {
  it("lists the shop's open jobs, the newest first, and no closed one", () => {
    const customerId =
      db.select({ id: workOrders.customerId }).from(workOrders).where(eq(workOrders.id, shop.jobId)).get()?.id ?? 0;
    const newer = insertJob(db, { shopId: shop.shopId, customerId, number: "J-4000", openedAt: TEST_NOW });
    insertJob(db, { shopId: shop.shopId, customerId, number: "J-1000", openedAt: TEST_NOW, closedAt: TEST_NOW });
    expect(listSnapChoices(db, shop.shopId).jobs.map((job) => job.id)).toEqual([newer, shop.jobId]);
  });

  it("offers no solution that is retired", () => {
    db.update(solutions).set({ retiredAt: TEST_NOW }).where(eq(solutions.id, shop.activatorId)).run();
    expect(listSnapChoices(db, shop.shopId).solutions).toEqual([]);
  });

  it("gives each run with the solutions it used, the newest run first", () => {
    const first = addRun("R-1", shop.jobId, TEST_NOW);
    const second = addRun("R-2", shop.jobId, TEST_NOW + 1);
    db.insert(runSolutions).values({ shopId: shop.shopId, runId: first, solutionId: shop.activatorId }).run();
    const found = listSnapChoices(db, shop.shopId).runs;
    expect(found.map((run) => [run.id, run.solutionIds])).toEqual([
      [second, []],
      [first, [shop.activatorId]],
    ]);
  });

  it("offers the classes of the library in its order", () => {
    const slugs = listSnapChoices(db, shop.shopId).classes.map((each) => each.slug);
    expect(slugs.slice(0, 5)).toEqual(SHELF_CLASSES.slice(0, 5));
  });

  it("never shows another shop's jobs, solutions or runs", () => {
    const mine = listSnapChoices(db, shop.shopId);
    const theirs = listSnapChoices(db, other.shopId);
    expect(mine.jobs.map((job) => job.id)).not.toContain(theirs.jobs[0]?.id);
    expect(mine.solutions.map((each) => each.id)).not.toContain(theirs.solutions[0]?.id);
  });
});

describe("the last snap", () => {
  it("is the newest case that this person opened, with its solutions", () => {
    makeCase(db, shop, { alloy: "C385" });
    makeCase(db, shop, { baseMetal: "steel", alloy: "", now: TEST_NOW + 1, by: shop.members.otherPlater });
    expect(getLastSnap(db, shop.shopId, shop.members.plater.memberId)).toMatchObject({
      workOrderId: shop.jobId,
      alloy: "C385",
      solutionIds: [shop.activatorId],
    });
  });

  it("is nothing for somebody who has not snapped yet", () => {
    makeCase(db, shop);
    expect(getLastSnap(db, shop.shopId, shop.members.trainee.memberId)).toBeNull();
  });
});

it("names the senior techs of the shop, and nobody else", () => {
  expect(listSeniorNames(db, shop.shopId)).toEqual([shop.members.senior.name]);
});
