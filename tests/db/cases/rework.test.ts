import { beforeEach, describe, expect, it } from "vitest";
import { recordOutcome, tickStep } from "@/db/changes/do-rework";
import type { Db } from "@/db/open";
import { requireCase, type CaseStanding } from "@/db/queries/cases";
import type { SignedIn } from "@/db/queries/crew";
import { countReworkTags, getReworkCard, listReworkTags } from "@/db/queries/rework";
import { TEST_NOW } from "../../fixtures/crew-factory";
import {
  confirmFor,
  emptyDatabase,
  makeCase,
  makeShop,
  stationNamed,
  type TestShop,
} from "../../fixtures/shop-factory";

let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

const all = { limit: 50 };
const doerOf = (member: SignedIn, now = TEST_NOW + 120_000) => ({
  shopId: shop.shopId,
  memberId: member.memberId,
  now,
});

function cardOf(ref: string) {
  const card = getReworkCard(db, shop.shopId, ref);
  if (!card) throw new Error(`No card of ${ref}`);
  return card;
}

/** Ticks the first open step. */
function tick(ref: string, by: SignedIn, spentMinutes = 5): void {
  const step = cardOf(ref).steps.find((each) => each.tickedAt === null);
  if (!step) throw new Error(`All steps of ${ref} are ticked`);
  tickStep(db, doerOf(by), requireCase(db, shop.shopId, ref), { stepId: step.id, spentMinutes });
}

const readyCard = (minutesLater = 1): CaseStanding =>
  confirmFor(db, shop, makeCase(db, shop), {}, TEST_NOW + minutesLater * 60_000);

describe("the rework list", () => {
  it("shows cards that are ready or begun, and no part that is only held", () => {
    const held = makeCase(db, shop);
    const ready = readyCard();
    const begun = readyCard(2);
    tick(begun.ref, shop.members.plater);
    const refs = listReworkTags(db, shop.shopId, all).map((card) => card.ref);
    expect(refs).toEqual([ready.ref, begun.ref]);
    expect(refs).not.toContain(held.ref);
    expect(countReworkTags(db, shop.shopId)).toBe(2);
  });

  it("counts the ticks of each card", () => {
    const { ref } = readyCard();
    expect(listReworkTags(db, shop.shopId, all)[0]).toMatchObject({
      ref,
      state: "confirmed",
      steps: 2,
      ticked: 0,
      begunById: null,
    });
    tick(ref, shop.members.plater);
    expect(listReworkTags(db, shop.shopId, all)[0]).toMatchObject({
      state: "in-rework",
      steps: 2,
      ticked: 1,
      begunById: shop.members.plater.memberId,
    });
  });

  it("parts the cards that a person began from the others, without losing or doubling any", () => {
    const mine = readyCard();
    const theirs = readyCard(2);
    const fresh = readyCard(3);
    tick(mine.ref, shop.members.plater);
    tick(theirs.ref, shop.members.otherPlater);
    const me = shop.members.plater.memberId;
    expect(listReworkTags(db, shop.shopId, { ...all, begunBy: me }).map((card) => card.ref)).toEqual([mine.ref]);
    expect(listReworkTags(db, shop.shopId, { ...all, notBegunBy: me }).map((card) => card.ref)).toEqual([
      theirs.ref,
      fresh.ref,
    ]);
  });

  it("goes on where a page ended", () => {
    const refs = [readyCard(1), readyCard(2), readyCard(2), readyCard(3)].map((each) => each.ref);
    const first = listReworkTags(db, shop.shopId, { limit: 2 });
    const second = listReworkTags(db, shop.shopId, { limit: 50, after: first.at(-1) });
    expect([...first, ...second].map((card) => card.ref)).toEqual(refs);
  });

  it("narrows to the station that the cause traces back to", () => {
    readyCard();
    const stations = ["clean", "rinse-1", "activate", "strike"].map((slug) => stationNamed(shop.stationIds, slug));
    const counts = stations.map((stationId) => listReworkTags(db, shop.shopId, { ...all, stationId }).length);
    expect(counts.reduce((sum, count) => sum + count, 0)).toBe(1);
    expect(stations.map((stationId) => countReworkTags(db, shop.shopId, stationId))).toEqual(counts);
  });

  it("never shows another shop's card", async () => {
    const other = await makeShop(db);
    const { ref } = readyCard();
    expect(listReworkTags(db, other.shopId, all)).toEqual([]);
    expect(getReworkCard(db, other.shopId, ref)).toBeNull();
  });
});

describe("a rework card", () => {
  it("shows its steps in order, and who ticked which with what minutes", () => {
    const { ref } = readyCard();
    tick(ref, shop.members.otherPlater, 9);
    expect(cardOf(ref).steps.map((step) => [step.title, step.tickedBy, step.spentMinutes])).toEqual([
      ["Polish the strike back", shop.members.otherPlater.name, 9],
      ["Strike again", null, null],
    ]);
  });

  it("stays readable with its outcome after the part has gone back on hold", () => {
    const { ref } = readyCard();
    tick(ref, shop.members.plater);
    tick(ref, shop.members.plater);
    const input = { ref, outcome: "same-fault", note: "still hazy", photoIds: [] } as const;
    recordOutcome(db, doerOf(shop.members.plater), requireCase(db, shop.shopId, ref), { ...input, photoIds: [] });
    expect(cardOf(ref)).toMatchObject({
      state: "held",
      round: 1,
      caseRound: 2,
      outcome: "same-fault",
      outcomeNote: "still hazy",
      outcomeBy: shop.members.plater.name,
    });
    expect(listReworkTags(db, shop.shopId, all)).toEqual([]);
  });

  it("is the one of the newest round, once a second card was sent", () => {
    const { ref } = readyCard();
    tick(ref, shop.members.plater);
    tick(ref, shop.members.plater);
    const again = { ref, outcome: "same-fault", note: "still hazy", photoIds: [] } as const;
    recordOutcome(db, doerOf(shop.members.plater), requireCase(db, shop.shopId, ref), { ...again, photoIds: [] });
    confirmFor(db, shop, requireCase(db, shop.shopId, ref), { cardTitle: "Second try" }, TEST_NOW + 300_000);
    expect(cardOf(ref)).toMatchObject({ round: 2, caseRound: 2, cardTitle: "Second try", outcome: null });
    expect(cardOf(ref).steps.every((step) => step.tickedAt === null)).toBe(true);
  });

  it("is none for a part that is still held for the first time", () => {
    expect(getReworkCard(db, shop.shopId, makeCase(db, shop).ref)).toBeNull();
  });
});
