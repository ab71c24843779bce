import { eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import { addCall } from "@/db/changes/add-call";
import { recordOutcome, tickStep } from "@/db/changes/do-rework";
import type { Db } from "@/db/open";
import { getCaseFacts, getNeighbours, requireCaseFacts } from "@/db/queries/case-page";
import {
  listCaseCalls,
  listCaseCards,
  listCaseEvents,
  listCaseShots,
  listCaseSolutions,
  listLibraryTitles,
} from "@/db/queries/case-records";
import { requireCase } from "@/db/queries/cases";
import { photos, reworkSteps } from "@/db/schema";
import { caseTimeline } from "@/lib/cases/case-timeline";
import { TEST_NOW } from "../../fixtures/crew-factory";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "../../fixtures/shop-factory";

let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

const doer = (now: number) => ({ shopId: shop.shopId, memberId: shop.members.plater.memberId, now, asTrainee: false });

/** Ticks every open step of the case's card, five minutes each. */
function workCard(ref: string, now: number): void {
  const row = requireCase(db, shop.shopId, ref);
  const steps = listCaseCards(db, shop.shopId, row.id).at(-1)?.steps ?? [];
  for (const { position } of steps) {
    const open = db
      .select({ id: reworkSteps.id, position: reworkSteps.position, at: reworkSteps.tickedAt })
      .from(reworkSteps)
      .all();
    const next = open.find((step) => step.position === position && step.at === null);
    if (!next) continue;
    db.transaction((tx) =>
      tickStep(tx, doer(now), requireCase(tx, shop.shopId, ref), { stepId: next.id, spentMinutes: 5 }),
    );
  }
}

describe("the page of a case", () => {
  it("names job, customer, station, caller and called class", () => {
    const held = makeCase(db, shop);
    expect(requireCaseFacts(db, shop.shopId, held.ref)).toMatchObject({
      state: "held",
      quantity: 3,
      openedBy: shop.members.plater.name,
      calledTitle: "Underactivation",
      confirmedTitle: null,
      job: { number: "J-3318", customer: "Orrin & Pike" },
      run: null,
      found: { slug: "strike" },
    });
  });

  it("holds no money, so that it can be shown to everyone", () => {
    const facts = requireCaseFacts(db, shop.shopId, makeCase(db, shop).ref);
    expect(JSON.stringify(facts)).not.toMatch(/cents|cost|risk/i);
  });

  it("does not know another shop's case", async () => {
    const held = makeCase(db, shop);
    const other = await makeShop(db);
    expect(getCaseFacts(db, other.shopId, held.ref)).toBeNull();
    expect(() => requireCaseFacts(db, other.shopId, held.ref)).toThrow(/no case/);
  });

  it("shows the solutions that the part went through, with their make-up", () => {
    const held = makeCase(db, shop);
    expect(listCaseSolutions(db, shop.shopId, held.id)).toMatchObject([{ code: "A-12", windowDays: 14 }]);
  });

  it("tells a whole loop of two rounds in order", () => {
    const held = makeCase(db, shop);
    db.transaction((tx) =>
      addCall(
        tx,
        { ...doer(TEST_NOW + 1), memberId: shop.members.trainee.memberId, asTrainee: true },
        {
          caseId: held.id,
          round: 1,
          kind: "further",
          classSlug: "dewetting",
          sure: 1,
        },
      ),
    );
    confirmFor(db, shop, held);
    workCard(held.ref, TEST_NOW + 120_000);
    db.transaction((tx) =>
      recordOutcome(tx, doer(TEST_NOW + 180_000), requireCase(tx, shop.shopId, held.ref), {
        ref: held.ref,
        outcome: "same-fault",
        note: "Haze again",
        photoIds: [],
      }),
    );
    const timeline = caseTimeline({
      ...listLibraryTitles(db, shop.shopId),
      events: listCaseEvents(db, shop.shopId, held.id),
      calls: listCaseCalls(db, shop.shopId, held.id),
      cards: listCaseCards(db, shop.shopId, held.id),
      quantity: 3,
    });
    expect(timeline.flatMap((round) => round.entries.map((entry) => entry.title))).toEqual([
      "Held",
      "Called",
      "Confirmed",
      "In rework",
      "Same fault",
    ]);
    // Two steps of the card, five minutes each.
    expect(timeline[0]?.entries[3]?.lines).toEqual(["2 of 2 steps, 10 min for 3 parts"]);
  });

  it("lists every card with planned and taken minutes and who ticked", () => {
    const held = confirmFor(db, shop, makeCase(db, shop));
    workCard(held.ref, TEST_NOW + 120_000);
    const [card] = listCaseCards(db, shop.shopId, held.id);
    expect(card?.steps.map((step) => [step.plannedMinutes, step.spentMinutes, step.tickedBy])).toEqual([
      [6, 5, shop.members.plater.name],
      [7, 5, shop.members.plater.name],
    ]);
  });

  it("shows photos that are not here yet, with whose phone they are on", () => {
    const held = makeCase(db, shop);
    expect(listCaseShots(db, shop.shopId, held.id)).toMatchObject([
      { state: "awaited", by: shop.members.plater.name, exemplarOf: null },
    ]);
    db.update(photos).set({ state: "refused", refusal: "It is not a photo." }).where(eq(photos.caseId, held.id)).run();
    expect(listCaseShots(db, shop.shopId, held.id)).toMatchObject([
      { state: "refused", refusal: "It is not a photo." },
    ]);
  });

  it("turns to the case before and after, also where two were opened in the same moment", () => {
    const [first, second, third] = [makeCase(db, shop), makeCase(db, shop), makeCase(db, shop, { now: TEST_NOW + 5 })];
    const of = (held: typeof first) => requireCaseFacts(db, shop.shopId, held.ref);
    expect(getNeighbours(db, shop.shopId, of(first))).toEqual({ earlier: null, later: second.ref });
    expect(getNeighbours(db, shop.shopId, of(second))).toEqual({ earlier: first.ref, later: third.ref });
    expect(getNeighbours(db, shop.shopId, of(third))).toEqual({ earlier: second.ref, later: null });
  });
});
