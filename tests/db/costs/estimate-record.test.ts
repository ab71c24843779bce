import { eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import { disposeCase } from "@/db/changes/close-case";
import type { Db } from "@/db/open";
import { requireCase } from "@/db/queries/cases";
import { getCostFacts } from "@/db/queries/case-costs";
import { correctionFor, listCorrections, listEstimatePairs } from "@/db/queries/estimate-record";
import { caseCosts } from "@/db/schema";
import { closeSound } from "@/tests/fixtures/closed-case";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const DAY_MS = 86_400_000;
let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

const figuresOf = (caseId: number) =>
  db.select().from(caseCosts).where(eq(caseCosts.caseId, caseId)).orderBy(caseCosts.id).all();
const estimateOf = (caseId: number) => {
  const figure = figuresOf(caseId).findLast((each) => each.basis === "estimate");
  if (!figure?.minutes) throw new Error("The case has no estimate with minutes.");
  return { ...figure, minutes: figure.minutes };
};
/** Closes like cases, a day apart, each with two steps of these minutes. */
const closeMany = (count: number, minutesEach: number, classSlug?: string) =>
  Array.from({ length: count }, (_, index) =>
    closeSound(db, shop, minutesEach, { classSlug, now: TEST_NOW + index * DAY_MS }),
  );

describe("a price", () => {
  it("keeps how the deposit comes off and the hands-on minutes; a recorded one the minutes of the card", () => {
    const { id } = closeSound(db, shop, 17);
    // At the strike a part is polished back.
    expect(estimateOf(id)).toMatchObject({ method: "polish-back", minutesCorrection: 1 });
    // Two steps of 17 minutes.
    expect(figuresOf(id).at(-1)).toMatchObject({ basis: "recorded", method: "polish-back", minutes: 34 });
  });
});

describe("estimate against recorded", () => {
  it("pairs the last estimate of a case that closed as sound with the minutes of its cards", () => {
    const closed = closeSound(db, shop, 20);
    expect(listEstimatePairs(db, shop.shopId)).toEqual([
      {
        ref: closed.ref,
        classSlug: "underactivation",
        method: "polish-back",
        estimated: estimateOf(closed.id).minutes,
        recorded: 40,
      },
    ]);
  });

  it("leaves out what is open, and what was scrapped", () => {
    const held = makeCase(db, shop);
    const confirmed = confirmFor(db, shop, makeCase(db, shop));
    const doer = { shopId: shop.shopId, memberId: shop.members.senior.memberId, now: TEST_NOW + DAY_MS };
    disposeCase(db, doer, confirmed, { disposition: "scrap", why: "eaten away" });
    expect(requireCase(db, shop.shopId, held.ref).state).toBe("held");
    expect(listEstimatePairs(db, shop.shopId)).toEqual([]);
  });

  it("says how many there are while there are fewer than eight", () => {
    closeMany(3, 20);
    // The design: at least 8 pairs.
    expect(correctionFor(db, shop.shopId, "underactivation", "polish-back")).toEqual({
      enough: false,
      have: 3,
      need: 8,
    });
    expect(correctionFor(db, shop.shopId, "peeling", "chemical")).toEqual({ enough: false, have: 0, need: 8 });
    expect(listCorrections(db, shop.shopId)).toMatchObject([
      { classSlug: null, method: "polish-back", pairs: 3, recordedMinutes: 120 },
      { classSlug: "underactivation", method: "polish-back", pairs: 3, recordedMinutes: 120 },
    ]);
  });

  it("narrows to a class and a method", () => {
    closeMany(2, 20);
    closeSound(db, shop, 30, { classSlug: "dewetting" });
    expect(listEstimatePairs(db, shop.shopId, { classSlug: "dewetting" })).toHaveLength(1);
    expect(listEstimatePairs(db, shop.shopId, { method: "polish-back" })).toHaveLength(3);
    expect(listEstimatePairs(db, shop.shopId, { method: "chemical" })).toEqual([]);
  });

  it("never reads another shop's record", async () => {
    const other = await makeShop(db);
    closeMany(8, 20);
    expect(listEstimatePairs(db, other.shopId)).toEqual([]);
    const { id } = makeCase(db, other);
    expect(estimateOf(id).minutesCorrection).toBe(1);
  });
});

describe("the correction of later estimates", () => {
  it("begins with the eighth pair of the class: half the way, by pairs / (pairs + 8)", () => {
    const alone = estimateOf(closeMany(8, 25)[0]?.id ?? 0).minutes;
    const raw = 50 / alone;
    const { minutes, minutesCorrection } = estimateOf(makeCase(db, shop).id);
    expect(minutesCorrection).toBeCloseTo(1 + (raw - 1) * (8 / 16), 9);
    expect(minutes).toBeCloseTo(alone * minutesCorrection, 9);
  });

  it("a class with too few pairs takes the method's record over all classes", () => {
    const alone = estimateOf(closeMany(8, 25)[0]?.id ?? 0).minutes;
    const raw = 50 / alone;
    const { minutesCorrection } = estimateOf(makeCase(db, shop, { calledClass: "pitting" }).id);
    expect(minutesCorrection).toBeCloseTo(1 + (raw - 1) * (8 / 16), 9);
  });

  it("another method stays as it is", () => {
    closeMany(8, 25);
    const facts = getCostFacts(db, shop.shopId, makeCase(db, shop, { stageFound: "after-final-plate" }).id);
    expect(facts?.minutesCorrection).toMatchObject({ chemical: 1, electrolytic: 1 });
    expect(facts?.minutesCorrection["polish-back"]).not.toBe(1);
  });

  it("is divided out of the pair, so that it is never learnt twice", () => {
    const closed = closeMany(40, 25);
    const alone = estimateOf(closed[0]?.id ?? 0).minutes;
    // The later ones were estimated with a correction, and the pair still holds the bare estimate.
    expect(estimateOf(closed.at(-1)?.id ?? 0).minutes).toBeGreaterThan(alone * 1.05);
    for (const pair of listEstimatePairs(db, shop.shopId)) expect(pair.estimated).toBeCloseTo(alone, 9);
    const correction = correctionFor(db, shop.shopId, "underactivation", "polish-back");
    if (!correction.enough) throw new Error("40 pairs are enough");
    expect(correction.rawRatio).toBeCloseTo(50 / alone, 9);
    expect(correction.ratio).toBeCloseTo(1 + (50 / alone - 1) * (40 / 48), 9);
  });

  it("does not touch a case that is closed: its minutes are recorded", () => {
    const closed = closeMany(9, 25);
    const facts = getCostFacts(db, shop.shopId, closed[0]?.id ?? 0);
    expect(facts).toMatchObject({ minutesCorrection: { "polish-back": 1 }, recorded: { minutes: 50 } });
  });
});
