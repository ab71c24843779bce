import { beforeEach, describe, expect, it, vi } from "vitest";
import { keepPartCheck } from "@/app/(shop)/metals/actions";
import type { Db } from "@/db/open";
import { getLatestPartCheck } from "@/db/queries/part-checks";
import { partChecks } from "@/db/schema";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const world = vi.hoisted(() => ({ db: null as unknown, member: null as unknown, shown: [] as string[] }));
vi.mock("@/db/client", () => ({ getDb: () => world.db }));
vi.mock("@/lib/server/session", () => ({ currentMember: async () => world.member }));
vi.mock("next/cache", () => ({ revalidatePath: (path: string) => world.shown.push(path) }));

let db: Db;
let shop: TestShop;

beforeEach(async () => {
  vi.useFakeTimers({ now: TEST_NOW, toFake: ["Date"] });
  db = emptyDatabase();
  shop = await makeShop(db);
  Object.assign(world, { db, member: shop.members.plater, shown: [] });
  return () => vi.useRealTimers();
});

/** Zinc die cast, worked by hand in tests/db/metals/part-checks.test.ts. The job of the test shop declares brass C360. */
const ZINC = { air: "48,6", water: "41.3", temp: "22.0", error: "0.1", pull: "none", colour: "blue-grey" };

function form(values: Record<string, string>): FormData {
  const data = new FormData();
  for (const [name, value] of Object.entries(values)) data.append(name, value);
  return data;
}
const keep = (changed: Record<string, string> = {}) =>
  keepPartCheck(null, form({ ...ZINC, jobId: String(shop.jobId), case: "", ...changed }));

describe("keeping a part check from its page", () => {
  it("answers where it was kept and that the metal does not fit, and renews every page that shows it", async () => {
    const { ref } = makeCase(db, shop);
    expect(await keep({ case: ref })).toEqual({ ok: true, value: { job: "J-3318", caseRef: ref, fits: false } });
    expect(world.shown).toEqual([
      "/metals/check",
      "/cases/jobs",
      "/cases/snap",
      `/cases/${ref}`,
      `/cases/${ref}/second-look`,
    ]);
  });

  it("works everything out again: a density that the form sends along is not believed", async () => {
    await keep({ densityGPerCm3: "8.5", fits: "true", likelyBaseMetal: "brass" });
    expect(getLatestPartCheck(db, shop.shopId, { workOrderId: shop.jobId })).toMatchObject({
      fits: false,
      likelyBaseMetal: "zinc",
    });
  });

  it("keeps what was typed when it is refused, and stores nothing", async () => {
    const answer = await keep({ water: "52" });
    expect(answer).toMatchObject({
      ok: false,
      fault: { code: "invalid", fields: { water: expect.stringContaining("must weigh less than in air") } },
      values: { air: "48,6", water: "52", temp: "22.0", colour: "blue-grey" },
    });
    expect(db.select().from(partChecks).all()).toEqual([]);
  });

  it.each([
    ["jobId", ""],
    ["jobId", "-3"],
    ["jobId", "brass"],
    ["case", "CT-1"],
    ["air", "4".repeat(30)],
    ["air", "-48.6"],
    ["water", "0"],
    ["water", "1e308"],
    ["temp", "hot"],
    ["pull", "sideways"],
  ])("names the field %s when it holds %j", async (field, value) => {
    const answer = await keep({ [field]: value });
    expect(answer).toMatchObject({ ok: false, fault: { code: "invalid" } });
    expect(answer && !answer.ok ? Object.keys(answer.fault.fields ?? {}) : []).toContain(field);
  });

  it("lets a trainee weigh too", async () => {
    world.member = shop.members.trainee;
    expect(await keep()).toMatchObject({ ok: true });
  });
});
