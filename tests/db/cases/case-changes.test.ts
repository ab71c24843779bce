import { eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import { amendCase, disposeCase, reopenCase, takeBack } from "@/db/changes/close-case";
import { confirmCase, releaseCase } from "@/db/changes/confirm-case";
import { recordOutcome, tickStep } from "@/db/changes/do-rework";
import { openCase } from "@/db/changes/open-case";
import type { Db } from "@/db/open";
import { requireCase } from "@/db/queries/cases";
import { calls, caseCosts, caseEvents, cases, photos, reworkCards, reworkSteps } from "@/db/schema";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import {
  causeOf,
  confirmFor,
  emptyDatabase,
  makeCase,
  makeConfirmation,
  makeShop,
  makeSnap,
  type TestShop,
} from "@/tests/fixtures/shop-factory";

let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

const plater = () => ({
  shopId: shop.shopId,
  memberId: shop.members.plater.memberId,
  now: TEST_NOW + 120_000,
  asTrainee: false,
});
const senior = () => ({ ...plater(), memberId: shop.members.senior.memberId });
const row = (ref: string) => db.select().from(cases).where(eq(cases.ref, ref)).get();
const eventsOf = (id: number) =>
  db
    .select({ event: caseEvents.event, from: caseEvents.fromState, to: caseEvents.toState })
    .from(caseEvents)
    .where(eq(caseEvents.caseId, id))
    .all();

function tickAll(ref: string, minutes = 10): void {
  const card = db
    .select()
    .from(reworkCards)
    .where(eq(reworkCards.caseId, requireCase(db, shop.shopId, ref).id))
    .all()
    .at(-1);
  for (const step of db
    .select()
    .from(reworkSteps)
    .where(eq(reworkSteps.cardId, card?.id ?? 0))
    .all()) {
    tickStep(db, plater(), requireCase(db, shop.shopId, ref), { stepId: step.id, spentMinutes: minutes });
  }
}

describe("opening a case", () => {
  it("gives each case of a month the next number and starts again next month", () => {
    const august = Date.UTC(2026, 7, 3);
    expect(makeCase(db, shop).ref).toBe("CT-2607-0001");
    expect(makeCase(db, shop).ref).toBe("CT-2607-0002");
    expect(makeCase(db, shop, { now: august }).ref).toBe("CT-2608-0001");
  });

  it("opens one case when the same snap is sent twice", () => {
    const snap = makeSnap(shop);
    const first = openCase(db, { ...plater(), timeZone: "UTC" }, snap);
    const second = openCase(db, { ...plater(), timeZone: "UTC" }, snap);
    expect(second).toEqual({ id: first.id, ref: first.ref, isNew: false });
    expect(db.select().from(cases).all()).toHaveLength(1);
  });

  it("keeps the first call, the history, a price and a place for each photo", () => {
    const held = makeCase(db, shop);
    expect(db.select().from(calls).all()).toMatchObject([{ kind: "first", classSlug: "underactivation", sure: 2 }]);
    expect(eventsOf(held.id)).toEqual([{ event: "opened", from: null, to: "held" }]);
    expect(db.select().from(photos).all()).toMatchObject([{ caseId: held.id, state: "awaited" }]);
    const opened = row(held.ref);
    expect(opened?.atRiskCents).toBeGreaterThan(opened?.costCents ?? 0);
    expect(db.select().from(caseCosts).all()).toMatchObject([{ basis: "estimate", meanCents: opened?.costCents }]);
  });

  it("refuses a job of another shop and says which field", async () => {
    const other = await makeShop(db);
    expect(() => makeCase(db, shop, { workOrderId: other.jobId })).toThrow(/job is not in this shop/);
    expect(db.select().from(cases).all()).toHaveLength(0);
  });

  it("will not take a photo that hangs on another case", () => {
    const snap = makeSnap(shop);
    makeCase(db, shop, { photoIds: snap.photoIds });
    expect(() => makeCase(db, shop, { photoIds: snap.photoIds })).toThrow(/belongs to another case/);
  });
});

describe("the second look", () => {
  it("confirms class, cause and card, and lets only one of two seniors through", () => {
    const held = makeCase(db, shop);
    confirmFor(db, shop, held);
    expect(row(held.ref)).toMatchObject({
      state: "confirmed",
      confirmedClass: "underactivation",
      selfConfirmed: false,
    });
    expect(db.select().from(reworkSteps).all()).toHaveLength(2);
    // The second senior still has the row as it was held.
    expect(() => confirmCase(db, senior(), held, makeConfirmation(db, shop, held.ref))).toThrow(
      /changed this case a moment ago/,
    );
    expect(db.select().from(reworkCards).all()).toHaveLength(1);
  });

  it("refuses a cause of another class", () => {
    const held = makeCase(db, shop);
    const causeId = causeOf(db, shop, "pitting");
    expect(() => confirmFor(db, shop, held, { causeId })).toThrow(/does not belong to the class/);
  });

  it("marks a senior who confirms their own first call", () => {
    const held = makeCase(db, shop, { by: shop.members.senior });
    confirmFor(db, shop, held);
    expect(row(held.ref)?.selfConfirmed).toBe(true);
  });

  it("releases a sound part without cost", () => {
    const held = makeCase(db, shop);
    releaseCase(db, senior(), held, "Only a reflection");
    expect(row(held.ref)).toMatchObject({
      state: "closed",
      closing: "released",
      confirmedClass: "sound",
      costCents: 0,
    });
  });

  it("closes scrap at once, with its reason, at the parts' value or more", () => {
    const held = makeCase(db, shop, { quantity: 2 });
    confirmFor(db, shop, held, { disposition: "scrap", why: "Thread eaten away", steps: [] });
    expect(row(held.ref)).toMatchObject({ state: "closed", closing: "scrap" });
    expect(row(held.ref)?.costCents).toBeGreaterThanOrEqual(2 * 4200);
    expect(eventsOf(held.id).map((each) => each.event)).toEqual(["opened", "confirmed", "disposed"]);
  });
});

describe("the rework card", () => {
  it("is done in order; sound at the re-strike closes the case at its recorded minutes", () => {
    const held = makeCase(db, shop);
    confirmFor(db, shop, held);
    const steps = db.select().from(reworkSteps).all();
    const confirmed = requireCase(db, shop.shopId, held.ref);
    expect(() => tickStep(db, plater(), confirmed, { stepId: steps[1]?.id ?? 0, spentMinutes: 5 })).toThrow(
      /earlier one is not/,
    );
    tickAll(held.ref, 15);
    recordOutcome(db, plater(), requireCase(db, shop.shopId, held.ref), {
      ref: held.ref,
      outcome: "sound",
      note: "",
      photoIds: [crypto.randomUUID()],
    });
    expect(row(held.ref)).toMatchObject({ state: "closed", closing: "sound", costBasis: "recorded" });
    const labour = db
      .select()
      .from(caseCosts)
      .all()
      .at(-1)
      ?.lines.find((line) => line.name === "Labour");
    // 30 minutes at the starting rate of 5200 cents an hour.
    expect(labour?.meanCents).toBe(2600);
  });

  it("goes back for another round of the same case when the fault is still there", () => {
    const held = makeCase(db, shop);
    confirmFor(db, shop, held);
    tickAll(held.ref);
    recordOutcome(db, plater(), requireCase(db, shop.shopId, held.ref), {
      ref: held.ref,
      outcome: "same-fault",
      note: "still hazy",
      photoIds: [],
    });
    expect(row(held.ref)).toMatchObject({ state: "held", round: 2 });
    confirmFor(db, shop, requireCase(db, shop.shopId, held.ref));
    tickAll(held.ref);
    recordOutcome(db, plater(), requireCase(db, shop.shopId, held.ref), {
      ref: held.ref,
      outcome: "sound",
      note: "clean",
      photoIds: [],
    });
    expect(row(held.ref)).toMatchObject({ state: "closed", closing: "sound", round: 2 });
    expect(db.select().from(reworkCards).all()).toHaveLength(2);
  });

  it("cannot end before its last step", () => {
    const held = makeCase(db, shop);
    confirmFor(db, shop, held);
    const input = { ref: held.ref, outcome: "sound" as const, note: "done", photoIds: [] };
    expect(() => recordOutcome(db, plater(), requireCase(db, shop.shopId, held.ref), input)).toThrow(/still open/);
    expect(row(held.ref)?.state).toBe("confirmed");
  });

  it("can be given up for scrap, taken back, and a closed case opened again, each with its reason", () => {
    const first = makeCase(db, shop);
    disposeCase(db, senior(), confirmFor(db, shop, first), { disposition: "scrap", why: "dropped" });
    expect(row(first.ref)).toMatchObject({ state: "closed", closing: "scrap" });
    reopenCase(db, senior(), requireCase(db, shop.shopId, first.ref), "wrong tag");
    expect(row(first.ref)).toMatchObject({ state: "held", round: 2, closing: null });
    const second = makeCase(db, shop);
    takeBack(db, senior(), confirmFor(db, shop, second), "wrong class");
    expect(row(second.ref)).toMatchObject({ state: "held", round: 2 });
    confirmFor(db, shop, requireCase(db, shop.shopId, second.ref));
    expect(row(second.ref)?.state).toBe("confirmed");
  });
});

describe("history", () => {
  it("cannot be changed or deleted, not even by a query", () => {
    makeCase(db, shop);
    expect(() => db.update(caseEvents).set({ why: "rewritten" }).run()).toThrow(/append-only/);
    expect(() => db.delete(calls).run()).toThrow(/append-only/);
  });

  it("keeps the value before a correction", () => {
    const held = makeCase(db, shop);
    amendCase(db, plater(), held, {
      ref: held.ref,
      quantity: 5,
      baseMetal: "bronze",
      stageFound: "at-strike",
      note: "counted again",
    });
    expect(row(held.ref)).toMatchObject({ quantity: 5, baseMetal: "bronze", note: "counted again" });
    const last = db.select().from(caseEvents).all().at(-1);
    expect(last).toMatchObject({ event: "amended", detail: { before: { quantity: 3, baseMetal: "brass" } } });
  });
});
