import { eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import { listAudit } from "@/db/queries/audit";
import { getCaseMoney } from "@/db/queries/case-costs";
import { listSnapChoices } from "@/db/queries/snap-choices";
import { countOpenJobs, getJob, listCustomerNames, listJobs, placeOfJob } from "@/db/queries/work-orders";
import { caseCosts, cases, customers } from "@/db/schema";
import type { OpenJob } from "@/lib/cases/job.schema";
import { FaultError, type Fault } from "@/lib/fault";
import { changeJob, closeJob, openJob, reopenJob } from "@/lib/server/cases/jobs";
import { TEST_NOW } from "../../fixtures/crew-factory";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "../../fixtures/shop-factory";

let db: Db;
let shop: TestShop;
let other: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
  other = await makeShop(db);
});

const input = (changes: Partial<OpenJob> = {}): OpenJob => ({
  number: "J-4000",
  customer: "Orrin & Pike",
  partName: "rotor",
  baseMetal: "steel",
  alloy: null,
  quantity: 12,
  areaDm2: 2.5,
  partValueCents: undefined,
  finalStack: [{ metal: "Ni", thicknessUm: 10 }],
  ...changes,
});

function faultOf(call: () => unknown): Fault | undefined {
  try {
    call();
  } catch (error) {
    if (error instanceof FaultError) return error.fault;
    throw error;
  }
  return undefined;
}

const numbersOf = (shopId: number, closed = false) =>
  listJobs(db, shopId, { closed, limit: 50 }).map((job) => job.number);

describe("opening a job", () => {
  it("puts it on top of the list and into the snap's choices", () => {
    openJob(db, shop.members.plater, input(), TEST_NOW);
    expect(numbersOf(shop.shopId)).toEqual(["J-4000", "J-3318"]);
    expect(listSnapChoices(db, shop.shopId).jobs[0]).toMatchObject({ number: "J-4000", partName: "rotor" });
  });

  it("gives no number twice within a shop, in capitals or not, open or closed", () => {
    closeJob(db, shop.members.senior, shop.jobId, TEST_NOW);
    const found = faultOf(() => openJob(db, shop.members.plater, input({ number: "j-3318" }), TEST_NOW));
    expect(found).toMatchObject({ code: "invalid", fields: { number: expect.stringContaining("j-3318") as string } });
    expect(numbersOf(shop.shopId)).toEqual([]);
  });

  it("lets two shops use one number", () => {
    openJob(db, shop.members.plater, input(), TEST_NOW);
    openJob(db, other.members.plater, input(), TEST_NOW);
    expect(numbersOf(other.shopId)).toEqual(["J-4000", "J-3318"]);
  });

  it("keeps one customer under one name, and makes the one it does not know", () => {
    openJob(db, shop.members.plater, input({ customer: "orrin & pike" }), TEST_NOW);
    openJob(db, shop.members.plater, input({ number: "J-4001", customer: "Harbour Works" }), TEST_NOW);
    expect(listCustomerNames(db, shop.shopId)).toEqual(["Harbour Works", "Orrin & Pike"]);
    expect(db.select().from(customers).where(eq(customers.shopId, other.shopId)).all()).toHaveLength(1);
  });

  it("takes a value from a senior only: a plater may not see it", () => {
    const call = () => openJob(db, shop.members.plater, input({ partValueCents: 4200 }), TEST_NOW);
    expect(faultOf(call)?.code).toBe("refused");
    openJob(db, shop.members.senior, input({ partValueCents: 4200 }), TEST_NOW);
    expect(listJobs(db, shop.shopId, { closed: false, limit: 1 })[0]?.partValueCents).toBe(4200);
  });
});

describe("the list", () => {
  it("shows each job once from page to page, those opened at one moment too", () => {
    for (const number of ["J-1", "J-2", "J-3"]) openJob(db, shop.members.plater, input({ number }), TEST_NOW);
    const first = listJobs(db, shop.shopId, { closed: false, limit: 2 });
    const last = first.at(-1);
    const rest = listJobs(db, shop.shopId, { closed: false, limit: 9, after: last && placeOfJob(last) });
    expect([...first, ...rest].map((job) => job.number)).toEqual(["J-3", "J-2", "J-1", "J-3318"]);
  });

  it("counts the cases that hang on hold, not those that a senior has confirmed", () => {
    makeCase(db, shop);
    makeCase(db, shop);
    confirmFor(db, shop, makeCase(db, shop));
    makeCase(db, other);
    expect(getJob(db, shop.shopId, shop.jobId)?.heldCases).toBe(2);
  });

  it("never shows another shop's jobs, nor lets them be changed", () => {
    openJob(db, other.members.plater, input({ number: "THEIRS" }), TEST_NOW);
    expect(numbersOf(shop.shopId)).toEqual(["J-3318"]);
    expect(countOpenJobs(db, shop.shopId)).toBe(1);
    expect(getJob(db, shop.shopId, other.jobId)).toBeUndefined();
    expect(faultOf(() => closeJob(db, shop.members.senior, other.jobId, TEST_NOW))?.code).toBe("not-found");
    expect(getJob(db, other.shopId, other.jobId)?.closedAt).toBeNull();
  });
});

describe("keeping a job right", () => {
  const change = { quantity: 60, areaDm2: 1.2, partValueCents: 4500, finalStack: [] };

  it("prices its open cases again, so that queue and case page agree; a closed case keeps its cost", () => {
    const held = makeCase(db, shop, { stageFound: "after-final-plate" });
    const scrapped = makeCase(db, shop);
    confirmFor(db, shop, scrapped, { disposition: "scrap", why: "eaten away", steps: [] });
    const priceOf = (id: number) =>
      db.select({ atRisk: cases.atRiskCents, cost: cases.costCents }).from(cases).where(eq(cases.id, id)).get();
    const figures = () => db.select().from(caseCosts).orderBy(caseCosts.id).all();
    const [heldBefore, scrappedBefore, record] = [priceOf(held.id), priceOf(scrapped.id), figures()];
    changeJob(db, shop.members.senior, { jobId: shop.jobId, ...change, partValueCents: 90_000 }, TEST_NOW);
    // Scrap risk is a share of the parts' value, and that went from €42 to €900.
    expect(priceOf(held.id)?.cost).toBeGreaterThan(heldBefore?.cost ?? 0);
    expect(priceOf(held.id)?.atRisk).toBe(getCaseMoney(db, shop.shopId, held.id)?.atRisk.meanCents);
    expect(priceOf(scrapped.id)).toEqual(scrappedBefore);
    expect(figures().slice(0, record.length)).toEqual(record);
    expect(figures()).toHaveLength(record.length + 1);
  });

  it("writes what changed into the trail", () => {
    changeJob(db, shop.members.senior, { jobId: shop.jobId, ...change }, TEST_NOW);
    expect(getJob(db, shop.shopId, shop.jobId)).toMatchObject({ quantity: 60, partValueCents: 4500, finalStack: [] });
    const [entry] = listAudit(db, shop.shopId, { limit: 1 }).entries;
    // The factory's job: 48 parts of €42.00 each, 5 µm of nickel and 0.8 µm of gold.
    expect(entry).toMatchObject({
      action: "job.changed",
      subject: "J-3318",
      detail: {
        changed: [
          "quantity from 48 parts to 60 parts",
          "value of a part from €42.00 to €45.00",
          "layers from Ni 5 µm, Au 0.8 µm to the strike alone",
        ],
      },
    });
  });

  it("puts right what its parts are made of, says so in the trail, and leaves it where the form did not ask", () => {
    const metal = { baseMetal: "zinc" as const, alloy: "Alloy 3" };
    changeJob(db, shop.members.senior, { jobId: shop.jobId, ...change, metal }, TEST_NOW);
    expect(getJob(db, shop.shopId, shop.jobId)).toMatchObject(metal);
    const [entry] = listAudit(db, shop.shopId, { limit: 1 }).entries;
    expect(entry?.detail).toMatchObject({
      changed: expect.arrayContaining(["base metal from brass C360 to zinc die cast Alloy 3"]) as unknown,
    });
    changeJob(db, shop.members.senior, { jobId: shop.jobId, ...change, quantity: 61 }, TEST_NOW);
    expect(getJob(db, shop.shopId, shop.jobId)).toMatchObject(metal);
  });

  it("keeps the value where the form did not ask for it", () => {
    changeJob(db, shop.members.senior, { jobId: shop.jobId, ...change, partValueCents: undefined }, TEST_NOW);
    expect(getJob(db, shop.shopId, shop.jobId)?.partValueCents).toBe(4200);
  });

  it("changes nothing of a closed job, and writes nothing where nothing differs", () => {
    changeJob(db, shop.members.senior, { jobId: shop.jobId, ...change }, TEST_NOW);
    const again = () => changeJob(db, shop.members.senior, { jobId: shop.jobId, ...change }, TEST_NOW);
    expect(faultOf(again)?.code).toBe("conflict");
    closeJob(db, shop.members.senior, shop.jobId, TEST_NOW);
    const late = () => changeJob(db, shop.members.senior, { jobId: shop.jobId, ...change, quantity: 1 }, TEST_NOW);
    expect(faultOf(late)?.code).toBe("conflict");
  });

  it("takes a closed job out of the snap's choices, and back in once it is open again", () => {
    closeJob(db, shop.members.senior, shop.jobId, TEST_NOW);
    expect(listSnapChoices(db, shop.shopId).jobs).toEqual([]);
    expect(numbersOf(shop.shopId, true)).toEqual(["J-3318"]);
    expect(faultOf(() => closeJob(db, shop.members.senior, shop.jobId, TEST_NOW))?.code).toBe("conflict");
    reopenJob(db, shop.members.senior, shop.jobId, TEST_NOW);
    expect(numbersOf(shop.shopId)).toEqual(["J-3318"]);
  });
});
