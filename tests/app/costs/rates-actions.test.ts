import { beforeEach, describe, expect, it, vi } from "vitest";
import { addRates } from "@/app/(shop)/costs/actions";
import type { Db } from "@/db/open";
import { listAudit } from "@/db/queries/audit";
import { getRatesAt, listMetalsInUse, listRatesHistory } from "@/db/queries/rates";
import { shopRates } from "@/db/schema";
import { insertJob } from "@/db/seed/factories/insert-job";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { ratesForm } from "@/tests/fixtures/rates-form";
import { emptyDatabase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const world = vi.hoisted(() => ({ db: null as unknown, member: null as unknown }));
vi.mock("@/db/client", () => ({ getDb: () => world.db }));
vi.mock("@/lib/server/session", () => ({ currentMember: async () => world.member }));
vi.mock("next/cache", () => ({ revalidatePath: () => undefined }));

let db: Db;
let shop: TestShop;
/** 1 August 2026 begins in Stockholm, the zone of the test shops, at 22:00 UTC the evening before. */
const AUGUST_AT = Date.UTC(2026, 6, 31, 22);

beforeEach(async () => {
  vi.useFakeTimers({ now: TEST_NOW, toFake: ["Date"] });
  db = emptyDatabase();
  shop = await makeShop(db);
  Object.assign(world, { db, member: shop.members.owner });
  return () => vi.useRealTimers();
});

const set = (changed: Record<string, string> = {}) => addRates(null, ratesForm(changed));
const rowsOf = (shopId: number) => listRatesHistory(db, shopId);
const audited = (shopId: number) => listAudit(db, shopId, { limit: 9 }).entries;

describe("setting rates", () => {
  it("adds a row from the start of that day in the shop's zone, with who, when and the source", async () => {
    expect(await set({ labour: "56", source: "wage letter" })).toEqual({
      ok: true,
      value: { from: "1 Aug 2026", changed: 1 },
    });
    expect(rowsOf(shop.shopId)[0]).toMatchObject({
      validFromAt: AUGUST_AT,
      setByName: shop.members.owner.name,
      setAt: TEST_NOW,
      rates: { labourCentsPerHour: 5600, source: "wage letter" },
    });
  });

  it("changes no row that stands, and nothing before the day", async () => {
    const before = db.select().from(shopRates).all();
    const heldInJuly = getRatesAt(db, shop.shopId, AUGUST_AT - 1);
    await set({ labour: "56" });
    expect(db.select().from(shopRates).all().slice(0, before.length)).toEqual(before);
    expect(getRatesAt(db, shop.shopId, AUGUST_AT - 1)).toEqual(heldInJuly);
    expect(getRatesAt(db, shop.shopId, AUGUST_AT).labourCentsPerHour).toBe(5600);
  });

  it("corrects a mistake by a later row from the same day", async () => {
    await set({ labour: "560" });
    await set({ labour: "56" });
    expect(rowsOf(shop.shopId)).toHaveLength(3);
    expect(getRatesAt(db, shop.shopId, AUGUST_AT).labourCentsPerHour).toBe(5600);
  });

  it("is written in the audit trail, with what changed", async () => {
    await set({ labour: "56", source: "wage letter" });
    expect(audited(shop.shopId)).toMatchObject([
      {
        action: "rates.set",
        subject: "from 1 Aug 2026",
        memberName: shop.members.owner.name,
        detail: { changed: ["Labour €52.00 / h to €56.00 / h"], source: "wage letter" },
      },
    ]);
  });

  it("leaves neither row nor audit entry when the entry cannot be written", async () => {
    db.$client.exec("create trigger no_audit before insert on audit_entries begin select raise(abort, 'full'); end");
    const quiet = vi.spyOn(console, "error").mockImplementation(() => undefined);
    expect(await set({ labour: "56" })).toMatchObject({ ok: false, fault: { code: "broken" } });
    quiet.mockRestore();
    expect(rowsOf(shop.shopId)).toHaveLength(1);
  });

  it("touches no other shop", async () => {
    const other = await makeShop(db);
    await set({ labour: "56" });
    expect(rowsOf(other.shopId)).toHaveLength(1);
    expect(audited(other.shopId)).toEqual([]);
  });
});

describe("rates are refused", () => {
  const refused = async (changed: Record<string, string>) => {
    const state = await set(changed);
    expect(rowsOf(shop.shopId)).toHaveLength(1);
    expect(audited(shop.shopId)).toEqual([]);
    return state && !state.ok ? state : null;
  };

  it.each(["plater", "trainee", "senior"] as const)("to a %s", async (role) => {
    world.member = shop.members[role];
    expect(await refused({ labour: "56" })).toMatchObject({ fault: { code: "refused" } });
  });

  it("to a stranger", async () => {
    world.member = null;
    expect(await refused({ labour: "56" })).toMatchObject({ fault: { code: "signed-out" } });
  });

  it("from a day that has passed, but not from today", async () => {
    // TEST_NOW is 6 July 2026.
    const state = await refused({ labour: "56", validFrom: "2026-07-05" });
    expect(state?.fault.fields).toHaveProperty("validFrom");
    expect(await set({ labour: "56", validFrom: "2026-07-06" })).toMatchObject({ ok: true });
  });

  it("from a day that no calendar has", async () => {
    expect((await refused({ validFrom: "2026-02-30" }))?.fault.fields).toHaveProperty("validFrom");
  });

  it("without a price for a metal that a job is plated with", async () => {
    const state = await refused({ "price-Au": "" });
    expect(state?.fault.fields).toEqual({ "price-Au": "Give the price of gold: jobs here are plated with it." });
  });

  it("when nothing would change", async () => {
    await set();
    const again = await set();
    expect(again).toMatchObject({ ok: false, fault: { code: "conflict" } });
    expect(rowsOf(shop.shopId)).toHaveLength(2);
  });

  it("with everything typed given back", async () => {
    const state = await refused({ labour: "fifty", waste: "4,40", source: "letter" });
    expect(state?.values).toMatchObject({ labour: "fifty", waste: "4,40", source: "letter", "price-Ni": "18.00" });
    expect(Object.keys(state?.fault.fields ?? {})).toEqual(["labour"]);
  });
});

it("the metals in use are those of the shop's own jobs, and the copper of the strike", async () => {
  const other = await makeShop(db);
  insertJob(db, {
    shopId: other.shopId,
    customerId: 2,
    number: "J-9",
    finalStack: [{ metal: "Rh", thicknessUm: 0.3 }],
  });
  expect(listMetalsInUse(db, shop.shopId)).toEqual(["Cu", "Ni", "Au"]);
  expect(listMetalsInUse(db, other.shopId)).toEqual(["Cu", "Ni", "Au", "Rh"]);
});
