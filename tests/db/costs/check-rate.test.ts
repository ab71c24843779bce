/** Counts and sums are added up by hand beside each case. */
import { beforeEach, describe, expect, it } from "vitest";
import { disposeCase, reopenCase, takeBack } from "@/db/changes/close-case";
import { releaseCase } from "@/db/changes/confirm-case";
import { recordOutcome, tickStep } from "@/db/changes/do-rework";
import type { Db } from "@/db/open";
import { requireCase, type CaseStanding } from "@/db/queries/cases";
import { getCheckRate, getCostPerPart } from "@/db/queries/check-rate";
import { listJobMix } from "@/db/queries/job-mix";
import { getDearestLaterCase, listExampleCases } from "@/db/queries/rate-examples";
import { reworkSteps, runs } from "@/db/schema";
import { insertCustomer, insertJob } from "@/db/seed/factories/insert-job";
import { getCheckWorth } from "@/lib/server/costs/check-worth";
import { getRatesBench } from "@/lib/server/costs/rate-examples";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const DAY_MS = 86_400_000;
const SPAN = { fromAt: TEST_NOW - DAY_MS, toAt: TEST_NOW + DAY_MS };
let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

let codes = 0;
interface RunFacts {
  struckAt?: number;
  on?: TestShop;
  jobId?: number;
}

function makeRun(partsStruck: number, { struckAt = TEST_NOW - 60_000, on = shop, jobId }: RunFacts = {}): number {
  codes += 1;
  return db
    .insert(runs)
    .values({
      shopId: on.shopId,
      code: `R-${codes}`,
      workOrderId: jobId ?? on.jobId,
      method: "bath",
      memberId: on.members.plater.memberId,
      partsStruck,
      struckAt,
    })
    .returning({ id: runs.id })
    .get().id;
}

const senior = (on = shop) => ({
  shopId: on.shopId,
  memberId: on.members.senior.memberId,
  now: TEST_NOW + 120_000,
  asTrainee: false,
});
const scrap = { disposition: "scrap", why: "eaten away", steps: [] } as const;
const confirmed = (held: CaseStanding, on = shop) => confirmFor(db, on, held, { ...scrap, steps: [] });
const rateOf = (on = shop, span = SPAN) => getCheckRate(db, on.shopId, span);

/** Ticks a confirmed case's whole card and says what the re-strike showed. */
function reworked(row: CaseStanding, outcome: "sound" | "same-fault"): void {
  for (const step of db.select({ id: reworkSteps.id }).from(reworkSteps).all()) {
    tickStep(db, senior(), requireCase(db, shop.shopId, row.ref), { stepId: step.id, spentMinutes: 5 });
  }
  const now = requireCase(db, shop.shopId, row.ref);
  recordOutcome(db, senior(), now, { ref: row.ref, outcome, note: "", photoIds: [] });
}

describe("how often the strike check finds a bad part", () => {
  it("counts the parts of every run as looked at, and those held and confirmed as bad", () => {
    const [first, second] = [makeRun(40), makeRun(60)];
    makeRun(100);
    confirmed(makeCase(db, shop, { runId: first, quantity: 3 }));
    confirmed(makeCase(db, shop, { runId: first, quantity: 2 }));
    confirmed(makeCase(db, shop, { runId: second, quantity: 4 }));
    // 40 + 60 + 100 struck; 3 + 2 + 4 bad, in two of three runs.
    expect(rateOf()).toMatchObject({ runs: 3, inspected: 200, bad: 9, badRuns: 2, struckInBadRuns: 100 });
  });

  it("leaves out what is only held, a false alarm, a fault found later, and a case of no run", () => {
    const runId = makeRun(50);
    makeCase(db, shop, { runId, quantity: 5 });
    releaseCase(db, senior(), makeCase(db, shop, { runId, quantity: 7 }), "only light");
    confirmed(makeCase(db, shop, { runId, quantity: 1, stageFound: "after-final-plate" }));
    confirmed(makeCase(db, shop, { quantity: 9 }));
    expect(rateOf()).toMatchObject({ runs: 1, inspected: 50, bad: 0, badRuns: 0 });
  });

  it("does not count a confirmation that was taken back, until it is confirmed again", () => {
    const row = confirmFor(db, shop, makeCase(db, shop, { runId: makeRun(50), quantity: 6 }));
    expect(rateOf().bad).toBe(6);
    takeBack(db, senior(), row, "the wrong tag");
    expect(rateOf().bad).toBe(0);
    confirmed(requireCase(db, shop.shopId, row.ref));
    expect(rateOf().bad).toBe(6);
  });

  it("counts a part once, however often its re-strike fails, and still when its case is opened again", () => {
    const row = confirmFor(db, shop, makeCase(db, shop, { runId: makeRun(50), quantity: 6 }));
    reworked(row, "same-fault");
    expect(requireCase(db, shop.shopId, row.ref).state).toBe("held");
    expect(rateOf().bad).toBe(6);
    const again = confirmFor(db, shop, requireCase(db, shop.shopId, row.ref));
    disposeCase(db, senior(), again, { disposition: "regrade", why: "sold as seconds" });
    reopenCase(db, senior(), requireCase(db, shop.shopId, row.ref), "the customer refused them");
    expect(rateOf()).toMatchObject({ bad: 6, inspected: 50 });
  });

  it("never finds more bad parts in a run than were struck", () => {
    confirmed(makeCase(db, shop, { runId: makeRun(4), quantity: 9 }));
    expect(rateOf()).toMatchObject({ inspected: 4, bad: 4 });
  });

  it("takes the runs from the first moment until just before the last one", () => {
    makeRun(10, { struckAt: SPAN.fromAt });
    makeRun(20, { struckAt: SPAN.toAt - 1 });
    makeRun(40, { struckAt: SPAN.toAt });
    makeRun(80, { struckAt: SPAN.fromAt - 1 });
    expect(rateOf().inspected).toBe(30);
  });

  it("knows nothing of another shop, and says none for a shop without runs", async () => {
    const other = await makeShop(db);
    confirmed(makeCase(db, other, { runId: makeRun(30, { on: other }), quantity: 5 }), other);
    expect(rateOf()).toEqual({ runs: 0, inspected: 0, bad: 0, badRuns: 0, struckInBadRuns: 0, badRunCents: 0 });
    expect(rateOf(other)).toMatchObject({ inspected: 30, bad: 5 });
  });
});

describe("what the cases cost by part, and what is struck most", () => {
  it("adds up closed cases by where they were found, without false alarms", () => {
    confirmed(makeCase(db, shop, { quantity: 2, stageFound: "after-final-plate" }));
    confirmed(makeCase(db, shop, { quantity: 1, stageFound: "returned" }));
    confirmed(makeCase(db, shop, { quantity: 5 }));
    releaseCase(db, senior(), makeCase(db, shop, { quantity: 8 }), "only light");
    const cost = getCostPerPart(db, shop.shopId, SPAN);
    expect(cost).toMatchObject({ laterCases: 2, laterParts: 3, strikeCases: 1, strikeParts: 5 });
    // Scrapped: the parts' value of $42.00 each at least.
    expect(cost.laterCents).toBeGreaterThanOrEqual(3 * 4200);
    expect(cost.strikeCents).toBeGreaterThanOrEqual(5 * 4200);
  });

  it("lists the jobs by the parts struck of them, the most first, each with its strike under its plate", () => {
    const customerId = insertCustomer(db, shop.shopId, "Orrin & Pike");
    const jobId = insertJob(db, { shopId: shop.shopId, customerId, number: "J-2", partValueCents: 0 });
    makeRun(30);
    makeRun(50, { jobId });
    const [most, next] = listJobMix(db, shop.shopId, SPAN);
    expect(most).toMatchObject({ number: "J-2", parts: 50, partValueCents: null });
    expect(next).toMatchObject({ number: "J-3318", parts: 30 });
    expect(next?.stack.map(({ metal }) => metal)).toEqual(["Cu", "Ni", "Au"]);
  });
});

describe("the owner's answer and the examples that rates are tried on", () => {
  it("rests on the estimate for what was struck while there are few cases, and begins test pieces from the runs", () => {
    confirmed(makeCase(db, shop, { runId: makeRun(50), quantity: 5 }));
    makeRun(50);
    const worth = getCheckWorth(db, shop.shopId, SPAN, TEST_NOW);
    expect(worth).toMatchObject({ inspected: 100, bad: 5, runs: 2 });
    expect(worth.missFrom).toContain("estimate for the job struck");
    expect(worth.missCents).toBeGreaterThan(0);
    // 5 of the 50 struck in the bad run; one run of two.
    expect(worth.testPieces).toMatchObject({ badPercent: "10", faultyRunPercent: "50" });
  });

  it("has no answer and no example for a shop that has struck nothing", () => {
    expect(getCheckWorth(db, shop.shopId, SPAN, TEST_NOW)).toMatchObject({ missCents: null, inspected: 0 });
    expect(getRatesBench(db, shop.shopId, TEST_NOW)).toMatchObject({ examples: [], shopShare: null });
  });

  it("tries rates on the dearest case found later, the job struck most, and closed cases by their reference", () => {
    makeRun(50);
    const cheap = confirmed(makeCase(db, shop, { quantity: 1, stageFound: "after-final-plate" }));
    const dear = confirmed(makeCase(db, shop, { quantity: 6, stageFound: "returned" }));
    confirmed(makeCase(db, shop, { quantity: 20 }));
    reworked(confirmFor(db, shop, makeCase(db, shop, { quantity: 2 })), "sound");
    expect(getDearestLaterCase(db, shop.shopId, 0)?.ref).toBe(dear.ref);
    expect(getDearestLaterCase(db, shop.shopId, TEST_NOW + 1)).toBeNull();
    expect(cheap.ref).not.toBe(dear.ref);
    expect(listExampleCases(db, shop.shopId).map(({ quantity }) => quantity)).toEqual([2]);
    const { examples, table } = getRatesBench(db, shop.shopId, TEST_NOW + DAY_MS);
    expect(examples.map(({ kind, ref }) => [kind, ref === null])).toEqual([
      ["dearest", false],
      ["usual", true],
      ["case", false],
    ]);
    // A fault found at the strike is tried as if it had gone on, by a way that is safe then.
    expect(examples[2]).toMatchObject({ stageFound: "at-strike", quantity: 2 });
    expect(table.dissolving.every(({ takesOff }) => takesOff.some((metal) => ["Cu", "Ni", "Au"].includes(metal)))).toBe(
      true,
    );
  });
});
