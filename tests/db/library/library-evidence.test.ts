import { and, asc, eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import { recordOutcome } from "@/db/changes/do-rework";
import type { Db } from "@/db/open";
import { countClassIn, getFirstOpened, listFixTries, sumStruckIn } from "@/db/queries/library-evidence";
import { requireCase } from "@/db/queries/cases";
import { libraryFixes, runs } from "@/db/schema";
import type { Outcome } from "@/lib/cases/case-words";
import { recordsByFix } from "@/lib/library/fix-record";
import { workedWords } from "@/lib/library/evidence-words";
import { longScans } from "../../bench/long-scans";
import { tickCard } from "../../fixtures/closed-case";
import { TEST_NOW } from "../../fixtures/crew-factory";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "../../fixtures/shop-factory";

const DAY = 86_400_000;

let db: Db;
let shop: TestShop;
let other: TestShop;
let polish: { id: number; slug: string };
let strip: { id: number; slug: string };

/** One round: confirmed as this class, done with this fix in so many minutes, and what the re-strike showed. */
function round(
  ref: string,
  classSlug: string,
  fixId: number,
  minutesEach: number,
  outcome: Outcome,
  at: number,
  in_ = shop,
) {
  confirmFor(db, in_, requireCase(db, in_.shopId, ref), { classSlug, fixId }, at);
  tickCard(db, in_, ref, minutesEach, at + 60_000);
  const hands = { shopId: in_.shopId, memberId: in_.members.plater.memberId, now: at + 120_000 };
  recordOutcome(db, hands, requireCase(db, in_.shopId, ref), { ref, outcome, note: "tape", photoIds: [] });
}

const twoFixes = (of: TestShop) =>
  db
    .select({ id: libraryFixes.id, slug: libraryFixes.slug })
    .from(libraryFixes)
    .where(eq(libraryFixes.shopId, of.shopId))
    .orderBy(asc(libraryFixes.id))
    .limit(2)
    .all();

/**
 * By hand: polish against underactivation came out sound, sound, same fault (then round 2 sound) and another fault;
 * strip once, sound. A case that began as underactivation ended as dewetting. The other shop has one of its own.
 */
beforeAll(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
  other = await makeShop(db);
  const [a, b] = twoFixes(shop);
  const [foreign] = twoFixes(other);
  if (!a || !b || !foreign) throw new Error("The shelf has no two fixes.");
  [polish, strip] = [a, b];
  const held = (daysLater: number) => makeCase(db, shop, { now: TEST_NOW + daysLater * DAY }).ref;
  const at = (daysLater: number) => TEST_NOW + daysLater * DAY + 3_600_000;
  round(held(0), "underactivation", polish.id, 5, "sound", at(0));
  round(held(1), "underactivation", polish.id, 10, "sound", at(1));
  const twice = held(2);
  round(twice, "underactivation", polish.id, 20, "same-fault", at(2));
  round(twice, "underactivation", polish.id, 30, "sound", at(3));
  const turned = held(3);
  round(turned, "underactivation", polish.id, 40, "another-fault", at(4));
  round(turned, "dewetting", strip.id, 7, "sound", at(5));
  round(held(5), "underactivation", strip.id, 15, "sound", at(6));
  // Card sent, nothing done yet: no outcome, so no try.
  confirmFor(db, shop, requireCase(db, shop.shopId, held(6)), { fixId: polish.id }, at(7));
  makeCase(db, shop, { now: TEST_NOW + 7 * DAY });
  round(makeCase(db, other).ref, "underactivation", foreign.id, 5, "sound", TEST_NOW + 3_600_000, other);
});

describe("fixes tried against a class", () => {
  it("are the shop's own cards by their own round's class, with their minutes", () => {
    const tries = listFixTries(db, shop.shopId, "underactivation");
    const of = (slug: string) =>
      tries
        .filter((each) => each.fixSlug === slug)
        .map(({ round: number, outcome, spentMinutes }) => [number, outcome, spentMinutes]);
    // Two steps a card, so twice the minutes each.
    expect(of(polish.slug)).toEqual([
      [1, "another-fault", 80],
      [2, "sound", 60],
      [1, "same-fault", 40],
      [1, "sound", 20],
      [1, "sound", 10],
    ]);
    expect(of(strip.slug)).toEqual([[1, "sound", 30]]);
  });
  it("give what worked and the exact median minutes", () => {
    const record = recordsByFix(listFixTries(db, shop.shopId, "underactivation")).get(polish.slug);
    expect(record && workedWords(record)).toBe("Worked 3 of 5");
    expect(record?.medianMinutes).toBe(40);
  });
  it("count a round that turned into another class there, and there only", () => {
    const [only, ...more] = listFixTries(db, shop.shopId, "dewetting");
    expect([only?.fixSlug, only?.round, only?.outcome]).toEqual([strip.slug, 2, "sound"]);
    expect(more).toEqual([]);
  });
  it("are none of a class that nobody confirmed", () => expect(listFixTries(db, shop.shopId, "burning")).toEqual([]));
});

describe("how often a class came up", () => {
  const weeks = [
    { fromAt: TEST_NOW, untilAt: TEST_NOW + 2 * DAY },
    { fromAt: TEST_NOW + 2 * DAY, untilAt: TEST_NOW + 7 * DAY },
    { fromAt: TEST_NOW + 7 * DAY, untilAt: TEST_NOW + 30 * DAY },
  ];
  it("counts confirmed cases by when they were opened, each in one stretch", () => {
    // Days 0 and 1; days 2, 5 and 6 (day 3 ended as dewetting); the held case of day 7 is nobody's yet.
    expect(countClassIn(db, shop.shopId, "underactivation", weeks)).toEqual([2, 3, 0]);
    expect(countClassIn(db, shop.shopId, "dewetting", weeks)).toEqual([0, 1, 0]);
  });
  it("says since when, of the class and of the shop", () => {
    expect(getFirstOpened(db, shop.shopId, "dewetting")).toEqual({ ofClass: TEST_NOW + 3 * DAY, any: TEST_NOW });
    expect(getFirstOpened(db, shop.shopId, "burning")).toEqual({ ofClass: null, any: TEST_NOW });
  });
  it("sums the parts that the shop's own runs struck", () => {
    const run = (at: TestShop, code: string, partsStruck: number, struckAt: number) =>
      db
        .insert(runs)
        .values({
          shopId: at.shopId,
          code,
          workOrderId: at.jobId,
          method: "bath",
          memberId: at.members.plater.memberId,
          partsStruck,
          struckAt,
        })
        .run();
    run(shop, "R-1", 40, TEST_NOW);
    run(shop, "R-2", 60, TEST_NOW + DAY);
    run(shop, "R-3", 25, TEST_NOW + 2 * DAY);
    run(other, "R-1", 999, TEST_NOW);
    expect(sumStruckIn(db, shop.shopId, weeks)).toEqual([100, 25, 0]);
    db.delete(runs)
      .where(and(eq(runs.shopId, shop.shopId)))
      .run();
  });
});

it("no figure of a class's page reads all cases of the shop", () => {
  const scans = longScans(db, () => {
    listFixTries(db, shop.shopId, "underactivation");
    countClassIn(db, shop.shopId, "underactivation", [{ fromAt: 0, untilAt: 1 }]);
    sumStruckIn(db, shop.shopId, [{ fromAt: 0, untilAt: 1 }]);
    getFirstOpened(db, shop.shopId, "underactivation");
  });
  // What is sorted was cut to 1,000 rows before: the newest cases of the class, the newest further rounds, their tries.
  expect(scans.filter((step) => step.startsWith("SCAN"))).toEqual([]);
});
