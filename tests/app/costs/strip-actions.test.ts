import { beforeEach, describe, expect, it, vi } from "vitest";
import { addBath, changeBath, changePolishing, turnWay } from "@/app/(shop)/costs/strip/ways/actions";
import type { Db } from "@/db/open";
import { listAudit } from "@/db/queries/audit";
import { getStripRow, getStripTableAt, listStripHistory } from "@/db/queries/strip-table";
import { stripRows } from "@/db/schema";
import type { DissolvingRow } from "@/lib/costs/strip-methods";
import { planStrip } from "@/lib/costs/strip-plan";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { emptyDatabase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";
import { bathForm, formOf, newBathForm, polishForm } from "@/tests/fixtures/strip-form";

const world = vi.hoisted(() => ({ db: null as unknown, member: null as unknown }));
vi.mock("@/db/client", () => ({ getDb: () => world.db }));
vi.mock("@/lib/server/session", () => ({ currentMember: async () => world.member }));
vi.mock("next/cache", () => ({ revalidatePath: () => undefined }));
vi.mock("next/navigation", () => ({
  redirect: (to: string) => {
    throw new Error(`to ${to}`);
  },
}));

const DAY_MS = 86_400_000;
const LATER = TEST_NOW + 3 * DAY_MS;
const ZINC = "zinc-hydrochloric";
const MEASURED = { rateLow: "8", rateLikely: "12", rateHigh: "16", rateSource: "measured here, 9 Jul 2026" };
let db: Db;
let shop: TestShop;
/** Rows that the shop begins with. */
let shipped: number;

beforeEach(async () => {
  vi.useFakeTimers({ now: LATER, toFake: ["Date"] });
  db = emptyDatabase();
  shop = await makeShop(db);
  Object.assign(world, { db, member: shop.members.owner });
  shipped = rows().length;
  return () => vi.useRealTimers();
});

function standing(slug: string): { id: number; row: DissolvingRow; retired: boolean } {
  const found = getStripRow(db, shop.shopId, slug);
  if (!found || found.row.method === "polish-back") throw new Error(`no bath ${slug}`);
  return { ...found, row: found.row };
}
const change = (slug: string, changed: Record<string, string | readonly string[]>, from = standing(slug).id) =>
  changeBath(null, bathForm(from, standing(slug).row, changed));
const rows = (shopId = shop.shopId) => listStripHistory(db, shopId);
const audited = (shopId = shop.shopId) => listAudit(db, shopId, { limit: 9 }).entries;
const tableNow = (at = LATER) => getStripTableAt(db, shop.shopId, at);

describe("changing a way", () => {
  it("adds a row with who and when; it holds from then on and not before", async () => {
    expect(await change(ZINC, MEASURED)).toMatchObject({ ok: true, value: { slug: ZINC } });
    expect(rows()).toHaveLength(shipped + 1);
    expect(rows()[0]).toMatchObject({ slug: ZINC, setByName: shop.members.owner.name, setAt: LATER, retired: false });
    const likely = (at: number) => tableNow(at).dissolving.find((row) => row.id === ZINC)?.rateUmPerMin.likely;
    expect([likely(LATER - 1), likely(LATER)]).toEqual([10, 12]);
  });

  it("is written in the audit trail, with what changed", async () => {
    await change(ZINC, MEASURED);
    expect(audited()).toMatchObject([
      {
        action: "strip.set",
        subject: "Hydrochloric acid 10 to 50 % by volume",
        detail: {
          changed: [
            "Rate: 5 · 10 · 20 µm/min to 8 · 12 · 16 µm/min",
            "Source of the figures: 5 to 20 µm/min, from memory to measured here, 9 Jul 2026",
          ],
        },
      },
    ]);
  });

  it("changes no row that stands, and no other shop", async () => {
    const other = await makeShop(db);
    const before = db.select().from(stripRows).all();
    await change(ZINC, MEASURED);
    expect(db.select().from(stripRows).all().slice(0, before.length)).toEqual(before);
    expect(rows(other.shopId)).toHaveLength(shipped);
    expect(audited(other.shopId)).toEqual([]);
  });

  it("keeps every digit of a figure that was only shown rounded", async () => {
    const { rateUmPerMin } = standing("nickel-sulfuric-anodic").row;
    await change("nickel-sulfuric-anodic", { price: "7.25" });
    expect(standing("nickel-sulfuric-anodic").row).toMatchObject({ rateUmPerMin, solutionCentsPerL: 725 });
  });

  it("says of a litre that was measured that it was measured", async () => {
    await change(ZINC, { ...MEASURED, holdingLikely: "70" });
    expect(standing(ZINC).row).toMatchObject({
      holdingGPerL: { low: 30, likely: 70, high: 100 },
      holdingSource: "measured here, 9 Jul 2026",
    });
  });

  it("refuses rates that do not rise, are not above 0 or are no numbers, beside their field, and keeps what was typed", async () => {
    for (const [changed, field] of [
      [{ rateLow: "13", rateLikely: "12" }, "rateLikely"],
      [{ rateHigh: "11" }, "rateHigh"],
      [{ rateLow: "0" }, "rateLow"],
      [{ holdingLow: "-1" }, "holdingLow"],
      [{ rateLikely: "fast" }, "rateLikely"],
      [{ rateHigh: "1e308" }, "rateHigh"],
      [{ source: "" }, "source"],
    ] as const) {
      const state = await change(ZINC, { ...MEASURED, ...changed });
      if (!state || state.ok) throw new Error(`${field} went through`);
      expect(Object.keys(state.fault.fields ?? {}), field).toEqual([field]);
      expect(state.values).toMatchObject({ ...MEASURED, ...changed });
    }
    expect(rows()).toHaveLength(shipped);
  });

  it("asks where new figures come from", async () => {
    const { rateSource: _same, ...figures } = MEASURED;
    const state = await change(ZINC, figures);
    expect(state).toMatchObject({ ok: false, fault: { fields: { rateSource: expect.any(String) as string } } });
  });

  it("refuses to save what holds already", async () => {
    expect(await change(ZINC, {})).toMatchObject({ ok: false, fault: { code: "conflict" } });
    expect(rows()).toHaveLength(shipped);
  });
});

describe("what a bath does to a base metal", () => {
  /** By this bath alone. */
  const offered = (baseMetal: "nickel" | "other") => {
    const { dissolving, polishing } = tableNow();
    const table = { dissolving: dissolving.filter((row) => row.id === ZINC), polishing };
    return planStrip("chemical", baseMetal, [{ metal: "Zn", thicknessUm: 8 }], table);
  };

  it("a base metal in neither list stays one that nobody vouches for", async () => {
    await change(ZINC, MEASURED);
    expect(offered("nickel")).toMatchObject({
      allowed: false,
      why: expect.stringMatching(/^Nobody vouches/) as string,
    });
    await change(ZINC, { "on-copper": "unknown" });
    expect(standing(ZINC).row.safeOn).not.toContain("copper");
    expect(standing(ZINC).row.attacks.copper).toBeUndefined();
  });

  it("is vouched for only with a word on how the shop knows, and then it is offered there", async () => {
    const bare = await change(ZINC, { "on-nickel": "safe" });
    expect(bare).toMatchObject({ ok: false, fault: { fields: { "why-nickel": expect.any(String) as string } } });
    expect(offered("nickel").allowed).toBe(false);
    await change(ZINC, { "on-nickel": "safe", "why-nickel": "trial on scrap, 8 Jul" });
    expect(offered("nickel").allowed).toBe(true);
    expect(standing(ZINC).row.safeBecause).toEqual({ nickel: "trial on scrap, 8 Jul" });
  });

  it("is marked as attacking only with the reason, and then it is refused with it", async () => {
    const bare = await change(ZINC, { "on-copper": "attacks" });
    expect(bare).toMatchObject({ ok: false, fault: { fields: { "why-copper": expect.any(String) as string } } });
    await change(ZINC, { "on-nickel": "attacks", "why-nickel": "Dulls it in a minute." });
    expect(offered("nickel")).toMatchObject({ why: expect.stringMatching(/Dulls it in a minute/) as string });
  });

  it("can never be said of a base metal that has no name", async () => {
    await change(ZINC, { ...MEASURED, "on-other": "safe", "why-other": "always worked" });
    expect(offered("other").allowed).toBe(false);
  });
});

describe("cautions", () => {
  it("that ship with a way stay, whatever is sent; others come and go", async () => {
    const floor = standing(ZINC).row.cautions;
    await change(ZINC, { ...MEASURED, "cautions[]": ["heatsUp"] });
    expect(standing(ZINC).row.cautions).toEqual(expect.arrayContaining([...floor, "heatsUp"]));
    await change(ZINC, { ...MEASURED, price: "3" });
    expect(standing(ZINC).row.cautions.toSorted()).toEqual(floor.toSorted());
  });

  it("that nobody knows are refused", async () => {
    const state = await change(ZINC, { ...MEASURED, "cautions[]": ["harmless"] });
    expect(state).toMatchObject({ ok: false, fault: { code: "invalid" } });
  });
});

describe("two who save at once", () => {
  it("the second is told what the first saved, keeps what was typed, and may save again on top", async () => {
    const from = standing(ZINC).id;
    await change(ZINC, MEASURED, from);
    const typed = { rateLow: "4", rateLikely: "9", rateHigh: "18", rateSource: "supplier's letter" };
    const late = await change(ZINC, typed, from);
    if (!late || late.ok) throw new Error("The second save went through.");
    expect(late.fault.code).toBe("conflict");
    expect(late.fault.message).toMatch(/5 · 10 · 20 µm\/min to 8 · 12 · 16 µm\/min/);
    expect(late.fault.message).toContain(shop.members.owner.name);
    expect(late.values).toMatchObject(typed);
    expect(rows()).toHaveLength(shipped + 1);
    expect(await change(ZINC, typed)).toMatchObject({ ok: true });
    expect(standing(ZINC).row.rateUmPerMin.likely).toBe(9);
  });

  it("a row of another way or of another shop is no place to begin from", async () => {
    const other = await makeShop(db);
    const theirs = getStripRow(db, other.shopId, ZINC)?.id ?? 0;
    for (const from of [theirs, standing("tin-caustic-anodic").id, 999_999])
      expect(await change(ZINC, MEASURED, from)).toMatchObject({ ok: false, fault: { code: "not-found" } });
  });
});

describe("retiring", () => {
  const turn = (slug: string, retired: boolean) =>
    turnWay(
      null,
      formOf({ slug, startedFrom: String(getStripRow(db, shop.shopId, slug)?.id), retired: String(retired) }),
    );

  it("takes a way out of what is offered, and brings it back", async () => {
    await turn(ZINC, true);
    expect(tableNow().dissolving.map((row) => row.id)).not.toContain(ZINC);
    expect(tableNow(LATER - 1).dissolving.map((row) => row.id)).toContain(ZINC);
    vi.setSystemTime(LATER + 1);
    await turn(ZINC, false);
    expect(tableNow(LATER + 1).dissolving.map((row) => row.id)).toContain(ZINC);
    expect(audited().map((entry) => entry.action)).toEqual(["strip.brought-back", "strip.retired"]);
  });

  it("does nothing twice, and never takes polishing away", async () => {
    await turn(ZINC, true);
    expect(await turn(ZINC, true)).toMatchObject({ ok: false, fault: { code: "conflict" } });
    expect(await turn("polish-back", true)).toMatchObject({ ok: false, fault: { code: "conflict" } });
    expect(rows()).toHaveLength(shipped + 1);
  });
});

describe("adding a way", () => {
  const OWN = "own-ferric-chloride-100-g-l";

  it("puts a bath of the shop's own after the others, under a name of its own", async () => {
    await expect(addBath(null, newBathForm({ "on-steel": "safe", "why-steel": "trial" }))).rejects.toThrow(OWN);
    await expect(addBath(null, newBathForm())).rejects.toThrow(`${OWN}-2`);
    const copper = tableNow().dissolving.filter((row) => row.takesOff.includes("Cu"));
    expect(copper.slice(-2)).toMatchObject([
      { id: OWN, safeOn: ["steel"], bathTempC: [20, 30], method: "chemical" },
      { id: `${OWN}-2`, safeOn: [] },
    ]);
    expect(audited()[0]).toMatchObject({ action: "strip.added", subject: "Ferric chloride 100 g/L" });
  });

  it("refuses one that takes nothing off, has no solution, or is vouched for without a word", async () => {
    for (const [changed, field] of [
      [{ "takesOff[]": [] }, "takesOff"],
      [{ solution: " " }, "solution"],
      [{ tempHigh: "10" }, "tempHigh"],
      [{ method: "polish-back" }, "method"],
      [{ "on-brass": "safe" }, "why-brass"],
    ] as const) {
      const state = await addBath(null, newBathForm(changed));
      if (!state || state.ok) throw new Error(`${field} went through`);
      expect(Object.keys(state.fault.fields ?? {})).toEqual([field]);
    }
    expect(rows()).toHaveLength(shipped);
  });
});

describe("polishing", () => {
  const polish = (changed: Record<string, string>) => {
    const found = getStripRow(db, shop.shopId, "polish-back");
    if (!found) throw new Error("no polishing");
    return changePolishing(null, polishForm(found.id, found.row, changed));
  };

  it("takes the shop's own minutes", async () => {
    await polish({ rateLikely: "0.7", source: "clocked here" });
    expect(tableNow().polishing).toMatchObject({
      minutesPerDm2Um: { low: 0.3, likely: 0.7, high: 1.2 },
      source: "clocked here",
    });
  });

  it("is no bath, and a bath is no polishing", async () => {
    const { id, row } = standing(ZINC);
    const wrong = await changePolishing(null, formOf({ slug: row.id, startedFrom: String(id), rateLow: "1", rateLikely: "2", rateHigh: "3", source: "x" })); // prettier-ignore
    expect(wrong).toMatchObject({ ok: false, fault: { code: "not-found" } });
  });
});

describe("ways are refused", () => {
  it.each(["plater", "trainee", "senior"] as const)("to a %s", async (role) => {
    world.member = shop.members[role];
    expect(await change(ZINC, MEASURED)).toMatchObject({ ok: false, fault: { code: "refused" } });
    expect(await addBath(null, newBathForm())).toMatchObject({ ok: false, fault: { code: "refused" } });
    expect(rows()).toHaveLength(shipped);
  });

  it("to a stranger", async () => {
    world.member = null;
    expect(await change(ZINC, MEASURED)).toMatchObject({ ok: false, fault: { code: "signed-out" } });
  });
});
