import { beforeEach, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { getLatestPartCheck, listLatestPartChecks, listPartChecks } from "@/db/queries/part-checks";
import { listSnapChoices } from "@/db/queries/snap-choices";
import { getJob } from "@/db/queries/work-orders";
import { partChecks } from "@/db/schema";
import { insertCustomer, insertJob } from "@/db/seed/factories/insert-job";
import { jobMisfit } from "@/lib/metals/misfit";
import { changeJob } from "@/lib/server/cases/jobs";
import { keepPartCheck } from "@/lib/server/metals/keep-part-check";
import { FaultError } from "@/lib/fault";
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

/**
 * 48.6 g in air and 41.3 g in water of 22 °C is (0.997773·48.6 − 0.0012·41.3)/7.3 = 6.636 g/cm³ (worked by hand; water
 * from Tanaka 2001): zinc die cast by ASTM B86, far from brass C360 at 8.45 to 8.53.
 */
const ZINC = { air: "48.6", water: "41.3", temp: "22", error: "0.1", pull: "none", colour: "blue-grey" };
/** (0.997773·84.9 − 0.0012·74.93)/9.97 = 8.488 g/cm³: brass C360. */
const BRASS = { air: "84.9", water: "74.93", temp: "22", error: "0.01", pull: "", colour: "" };

const keep = (typed: typeof ZINC, { by = shop.members.plater, jobId = shop.jobId, ref = "", now = TEST_NOW } = {}) =>
  keepPartCheck(db, by, { ...typed, jobId, case: ref || undefined }, now);

const misfit = (member: SignedIn = shop.members.plater, jobId = shop.jobId) => {
  const job = getJob(db, member.shopId, jobId);
  if (!job) throw new Error("The shop has lost its job.");
  const check = getLatestPartCheck(db, member.shopId, { workOrderId: jobId });
  return jobMisfit(check, job, { shop: member.shop, now: TEST_NOW });
};

function faultOf(call: () => unknown) {
  try {
    call();
  } catch (error) {
    if (error instanceof FaultError) return error.fault;
    throw error;
  }
  throw new Error("It was not refused.");
}

describe("keeping a part check", () => {
  it("stores what was weighed, what it came to, what was declared then, who and when", () => {
    expect(keep(ZINC)).toEqual({ job: "J-3318", caseRef: null, fits: false });
    const [row] = listPartChecks(db, shop.shopId, { workOrderId: shop.jobId }, 9);
    expect(row).toMatchObject({
      weightAirG: 48.6,
      weightWaterG: 41.3,
      waterTempC: 22,
      balanceErrorG: 0.1,
      pull: "none",
      colour: "blue-grey",
      declaredBaseMetal: "brass",
      declaredAlloy: "C360",
      fits: false,
      likelyBaseMetal: "zinc",
      by: shop.members.plater.name,
      at: TEST_NOW,
      caseId: null,
    });
    expect(row?.densityGPerCm3).toBeCloseTo(6.636, 2);
  });

  it("adds a row for each weighing and changes none", () => {
    keep(ZINC);
    const before = db.select().from(partChecks).all();
    keep(BRASS, { now: TEST_NOW + 1 });
    expect(db.select().from(partChecks).all().slice(0, 1)).toEqual(before);
    expect(listPartChecks(db, shop.shopId, { workOrderId: shop.jobId }, 9).map((row) => row.weightAirG)).toEqual([
      84.9, 48.6,
    ]);
  });

  it("reads a decimal comma, and the water of a shop that thinks in °F", () => {
    const american = { ...shop.members.plater, shop: { ...shop.members.plater.shop, units: "us" as const } };
    keep({ ...ZINC, air: "48,6", temp: "71.6" }, { by: american });
    // 71.6 °F is 22 °C (exact: (71.6 − 32) × 5/9).
    const latest = getLatestPartCheck(db, shop.shopId, { workOrderId: shop.jobId });
    expect(latest?.weightAirG).toBe(48.6);
    expect(latest?.waterTempC).toBeCloseTo(22, 9);
  });

  it("keeps it on the case that it was weighed for", () => {
    const { ref, id } = makeCase(db, shop);
    expect(keep(ZINC, { ref })).toEqual({ job: "J-3318", caseRef: ref, fits: false });
    expect(listPartChecks(db, shop.shopId, { caseId: id }, 9)).toHaveLength(1);
  });

  it.each([
    [{ ...ZINC, air: "41.3", water: "48.6" }, "water"],
    [{ ...ZINC, air: "" }, "air"],
    [{ ...ZINC, air: "abc" }, "air"],
    [{ ...ZINC, temp: "60" }, "temp"],
    [{ ...ZINC, error: "9" }, "error"],
    [{ ...ZINC, colour: "pink" }, "colour"],
  ])("refuses weights that cannot be, beside the field, and stores nothing (%#)", (typed, field) => {
    const fault = faultOf(() => keep(typed));
    expect(fault.code).toBe("invalid");
    expect(Object.keys(fault.fields ?? {})).toEqual([field]);
    expect(db.select().from(partChecks).all()).toEqual([]);
  });

  it("refuses a case of another job", () => {
    const customerId = insertCustomer(db, shop.shopId, "Orrin & Pike");
    const jobId = insertJob(db, { shopId: shop.shopId, customerId, number: "J-4000" });
    const { ref } = makeCase(db, shop);
    expect(faultOf(() => keep(ZINC, { jobId, ref })).fields).toHaveProperty("case");
    expect(db.select().from(partChecks).all()).toEqual([]);
  });

  it("knows no job and no case of another shop", () => {
    expect(faultOf(() => keep(ZINC, { jobId: other.jobId })).code).toBe("not-found");
    const { ref } = makeCase(db, other);
    makeCase(db, shop);
    const second = makeCase(db, other).ref;
    expect(second).not.toBe(ref);
    // The other shop's second case has a number that this shop has not given yet.
    expect(faultOf(() => keep(ZINC, { ref: second })).code).toBe("not-found");
    expect(db.select().from(partChecks).all()).toEqual([]);
  });
});

describe("the warning of a job", () => {
  it("says what the part weighs like and what was declared, with who weighed it", () => {
    keep(ZINC);
    expect(misfit()?.words).toBe("Weighs like zinc die cast, 6.64 ± 0.24 g/cm³. Declared brass C360.");
    expect(misfit()?.who).toContain(shop.members.plater.name);
    expect(misfit()?.href).toContain("job=J-3318&air=48.6&water=41.3");
  });

  it("shows at the snap", () => {
    expect(listSnapChoices(db, shop.shopId).jobs[0]?.misfit).toBeUndefined();
    keep(ZINC);
    expect(listSnapChoices(db, shop.shopId).jobs[0]?.misfit).toContain("Weighs like zinc die cast");
    expect(listSnapChoices(db, other.shopId).jobs[0]?.misfit).toBeUndefined();
  });

  it("goes when a later part fits, and comes back when a still later one does not", () => {
    keep(ZINC);
    keep(BRASS, { now: TEST_NOW + 1 });
    expect(misfit()).toBeUndefined();
    keep(ZINC, { now: TEST_NOW + 2 });
    expect(misfit()).toBeDefined();
  });

  it("goes when a senior puts the job's metal right", () => {
    keep(ZINC);
    const figures = { quantity: 48, areaDm2: 1.2, partValueCents: 4200, finalStack: [] };
    const metal = { baseMetal: "zinc" as const, alloy: "Alloy 3" };
    changeJob(db, shop.members.senior, { jobId: shop.jobId, metal, ...figures }, TEST_NOW + 1);
    expect(misfit()).toBeUndefined();
    expect(getLatestPartCheck(db, shop.shopId, { workOrderId: shop.jobId })?.fits).toBe(false);
  });

  it("is the newest check of each job, and of no other shop's", () => {
    const customerId = insertCustomer(db, shop.shopId, "Orrin & Pike");
    const second = insertJob(db, { shopId: shop.shopId, customerId, number: "J-4000" });
    keep(ZINC);
    keep(BRASS, { now: TEST_NOW + 1 });
    keep(ZINC, { jobId: second });
    keep(ZINC, { by: other.members.plater, jobId: other.jobId });
    const latest = listLatestPartChecks(db, shop.shopId, [shop.jobId, second, other.jobId]);
    expect([...latest].map(([jobId, row]) => [jobId, row.weightAirG]).sort()).toEqual(
      [
        [shop.jobId, 84.9],
        [second, 48.6],
      ].sort(),
    );
    expect(listLatestPartChecks(db, shop.shopId, [])).toEqual(new Map());
  });
});
