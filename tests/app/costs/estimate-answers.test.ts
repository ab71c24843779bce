import { eq } from "drizzle-orm";
import { beforeEach, describe, expect, it, vi } from "vitest";
import type { Db } from "@/db/open";
import { shopRates } from "@/db/schema";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import {
  CHANCE as chance,
  estimate,
  INSPECT as inspect,
  PIECES as pieces,
  PLATE_BY_CURRENT as byCurrent,
  PLATE_FOR_THICKNESS as forThickness,
  STRIP as strip,
  type EstimateRoute,
} from "@/tests/fixtures/estimate-routes";
import { referenceRows } from "@/tests/fixtures/reference-rows";
import { emptyDatabase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const world = vi.hoisted(() => ({ db: null as unknown, member: null as unknown }));
vi.mock("@/db/client", () => ({ getDb: () => world.db }));
vi.mock("@/lib/server/session", () => ({ currentMember: async () => world.member }));

let db: Db;
let shop: TestShop;
beforeEach(async () => {
  if (!db) {
    db = emptyDatabase();
    shop = await makeShop(db);
  }
  Object.assign(world, { db, member: shop.members.senior });
});

async function ok(route: EstimateRoute, body: unknown) {
  const answer = await estimate(route, body);
  expect(answer.status, answer.text).toBe(200);
  return answer.body;
}

describe("POST /api/estimates/plate", () => {
  it("plates 41.17 g of silver in an hour at 10.23 A (F1: OpenStax Chemistry 2e 17.7; it prints 41.19 from rounded steps)", async () => {
    const { massG, ampereHours, thicknessUm } = await ok("plate", byCurrent);
    expect(massG).toBeCloseTo(41.173, 2);
    expect(ampereHours).toBeCloseTo(10.23, 10);
    // Silver of 10.49 g/cm³ (CRC) on 200 cm².
    expect(thicknessUm).toBeCloseTo((41.173 / 10.49 / 200) * 1e4, 1);
  });

  it("takes 11.0 hours for 0.010 mm of trivalent chromium on 3.3 m² at 33.46 A (F2: OpenStax Chemistry 2e 17.7)", async () => {
    const body = { metal: "chromium", valence: 3, areaDm2: 330, thicknessUm: 10, currentDensityADm2: 33.46 / 330 };
    const { massG, minutes, currentA } = await ok("plate", { ...body, efficiency: 1 });
    expect(minutes / 60).toBeCloseTo(10.965, 2);
    expect(massG).toBeCloseTo(237.27, 1);
    expect(currentA).toBeCloseTo(33.46, 10);
  });

  it("gives nickel of 8.907 g/cm³ 12.294 µm for an ampere-hour on a dm² (F3: reference article on nickel plating)", async () => {
    const body = { metal: "Ni", currentA: 1, minutes: 60, efficiency: 1, areaDm2: 1, densityGCm3: 8.907 };
    const { thicknessUm } = await ok("plate", body);
    expect(Math.abs(thicknessUm - 12.294)).toBeLessThan(0.005);
  });

  it("gives 5.0 µm of chromium for a mean 14 A in 20 minutes on 125 cm² at 15 % (F4: Groover's constants, n = 3)", async () => {
    const body = { metal: "Cr", valence: 3, currentA: 14, minutes: 20, efficiency: 0.15, areaDm2: 1.25 };
    expect(Math.abs((await ok("plate", body)).thicknessUm - 5)).toBeLessThan(0.06);
  });

  it("plates 1.186 g of copper from an acid bath with one ampere-hour (F5: public calculator page)", async () => {
    const { massG, equivalentGPerAh } = await ok("plate", {
      ...{ metal: "copper", valence: 2, currentA: 1, minutes: 60, efficiency: 1, areaDm2: 1 },
    });
    expect(Math.abs(massG - 1.186)).toBeLessThan(0.001);
    expect(equivalentGPerAh).toBe(massG);
  });

  it("takes 11.31 A·h and 22.6 minutes at 30 A for 0.002 in on 37.7 in² (F6: Surface Finishing Guidebook, brush plating, 150 A·h per in³)", async () => {
    // The book's factor holds the losses: 8.90 g/cm³ × 16.387 cm³/in³ ÷ 1.095 g/(A·h) is 133.2 A·h per in³ without any.
    const efficiency = (8.9 * 16.387064) / 1.095 / 150;
    const areaDm2 = 37.7 * 0.064516;
    const body = { metal: "Ni", areaDm2, thicknessUm: 50.8, efficiency, currentDensityADm2: 30 / areaDm2 };
    const { ampereHours, minutes } = await ok("plate", body);
    expect(ampereHours).toBeCloseTo(11.31, 2);
    expect(minutes).toBeCloseTo(22.6, 1);
  });

  it("agrees with every row of the trade guidebook's nickel time table at 95 % (printed to two figures)", async () => {
    const rows = referenceRows("nickel_time_table.csv");
    expect(rows).toHaveLength(33);
    for (const row of rows) {
      const [thicknessUm, currentDensityADm2] = [Number(row.thickness_um), Number(row.current_density_A_dm2)];
      const { minutes, massG } = await ok("plate", { ...forThickness, areaDm2: 1, thicknessUm, currentDensityADm2 });
      expect(Math.abs(minutes / Number(row.published_minutes) - 1)).toBeLessThan(0.06);
      expect(Math.abs(massG - Number(row.published_g_per_dm2))).toBeLessThan(0.006);
    }
  });

  it("has the handbook's electrochemical equivalent for each metal and valence (older atomic masses: within 0.13 %)", async () => {
    const rows = referenceRows("electrochemical_equivalents.csv").filter((row) => row.published_g_per_Ah !== "");
    expect(rows.length).toBeGreaterThanOrEqual(11);
    for (const row of rows) {
      const body = { ...byCurrent, metal: row.symbol, valence: Number(row.valence) };
      const { equivalentGPerAh } = await ok("plate", body);
      expect(Math.abs(equivalentGPerAh / Number(row.published_g_per_Ah) - 1), row.metal).toBeLessThan(0.0013);
    }
  });

  it("repeats what was given, names its sources and what it assumed, and lets every member reckon", async () => {
    world.member = shop.members.trainee;
    const body = { metal: "nickel", areaDm2: 3, thicknessUm: 4, currentDensityADm2: 4 };
    const { given, sources, assumed, valence } = await ok("plate", body);
    expect(given).toEqual(body);
    expect(sources.join()).toMatch(/Faraday/);
    expect(assumed).toHaveLength(2);
    expect(valence).toBe(2);
    expect((await ok("plate", forThickness)).assumed).toEqual([]);
  });
});

describe("POST /api/estimates/inspect (Deming, Out of the Crisis, chapter 15: all above k1/k2, none below)", () => {
  it("says check all for k1 1, k2 50 and 3 % bad, with the Wilson interval", async () => {
    const answer = await ok("inspect", inspect);
    expect(answer).toMatchObject({ given: inspect, breakEvenRate: 0.02, rate: 0.03, advice: "check-all" });
    expect(answer.sources.join()).toMatch(/Deming/);
  });

  it("says check none for k1 0.25, k2 50 and 0.1 %, and when a check costs as much as a miss", async () => {
    const rare = await ok("inspect", { checkCost: 0.25, missCost: 50, inspected: 10_000, bad: 10 });
    expect(rare).toMatchObject({ breakEvenRate: 0.005, advice: "check-none" });
    const dear = await ok("inspect", { checkCost: 5, missCost: 5, inspected: 20, bad: 20 });
    expect(dear).toMatchObject({ breakEvenRate: 1, advice: "check-none" });
  });

  it("says too few runs for 4 bad of 200, .00780 to .05029 (R binom), and where nothing was inspected, with no rate", async () => {
    const few = await ok("inspect", { checkCost: 1, missCost: 50, inspected: 200, bad: 4 });
    expect(few.advice).toBe("too-few-runs");
    expect(few.interval[0]).toBeCloseTo(0.0078044, 6);
    expect(few.interval[1]).toBeCloseTo(0.0502871, 6);
    const none = await ok("inspect", { checkCost: 1, missCost: 50, inspected: 0, bad: 0 });
    expect(none).toMatchObject({ rate: null, interval: [0, 1], advice: "too-few-runs" });
  });
});

describe("POST /api/estimates/test-pieces (success-run theorem)", () => {
  it("takes 59 pieces to see 5 % bad with 95 %, and 22 to see 10 % with 90 %", async () => {
    expect(await ok("test-pieces", { badShare: 0.05, wantedChance: 0.95 })).toMatchObject({ pieces: 59 });
    expect(await ok("test-pieces", chance)).toMatchObject({ pieces: 22, given: chance });
  });

  it("says the chance of the pieces given, and both when both were asked", async () => {
    const answer = await ok("test-pieces", pieces);
    expect(answer.chance).toBeCloseTo(1 - 0.95 ** 59, 12);
    expect(answer).not.toHaveProperty("pieces");
    const both = await ok("test-pieces", { ...pieces, pieces: 10, wantedChance: 0.95 });
    expect(both).toMatchObject({ pieces: 59, given: { pieces: 10 } });
    expect(both.chance).toBeCloseTo(1 - 0.95 ** 10, 12);
  });
});

describe("POST /api/estimates/strip", () => {
  it("answers every way with its range, a refused one with the reason and no figure, and the same fault at the strike", async () => {
    const answer = await ok("strip", strip);
    const [polish, chemical, electrolytic] = answer.options;
    expect(answer.options.map((option: { method: string }) => option.method)).toEqual([
      "polish-back",
      "chemical",
      "electrolytic",
    ]);
    expect(chemical).toEqual({
      method: "chemical",
      title: "Chemical immersion",
      allowed: false,
      why: expect.any(String),
    });
    expect(chemical.why).toMatch(/attacks brass/);
    for (const { minutes, cost, cautions, metalWrittenOffG } of [polish, electrolytic]) {
      // PERT mean, (a + 4m + b)/6: Malcolm et al., Operations Research 7 (1959) 646.
      expect(minutes.mean).toBeCloseTo((minutes.low + 4 * minutes.likely + minutes.high) / 6, 9);
      expect(cost.lines.reduce((sum: number, line: { mean: number }) => sum + line.mean, 0)).toBe(cost.mean);
      expect(cost.low90).toBeLessThan(cost.mean);
      expect(cost.high90).toBeGreaterThan(cost.mean);
      expect(cautions.length).toBeGreaterThan(0);
      expect(metalWrittenOffG).toBeGreaterThan(0);
    }
    expect(answer.atStrike.cost.mean).toBeLessThan(electrolytic.cost.mean);
    expect(answer).toMatchObject({ given: strip, currency: "EUR", assumed: [] });
    expect(answer.sources.join()).toMatch(/from memory/);
  });

  it("rests on the shop's rates: metal again is the weight of the stack at their prices, by hand 14,795 cents", async () => {
    // 7.44 dm²: 1.14992 g gold × 12860, 3.3108 g nickel × 1.8, 0.666624 g copper × 1.
    const { options } = await ok("strip", strip);
    const again = options[0].cost.lines.find((line: { name: string }) => line.name === "Metal again");
    expect(Math.abs(again.mean - 14_795)).toBeLessThanOrEqual(1);
    expect(options[0].metalWrittenOffG).toBeCloseTo(5.1274, 4);
  });

  it("with a way named answers that one alone, refused or not", async () => {
    const one = await ok("strip", { ...strip, method: "electrolytic" });
    expect(one.options).toMatchObject([{ method: "electrolytic", allowed: true }]);
    expect(one.given.method).toBe("electrolytic");
    const refused = await ok("strip", { ...strip, method: "chemical" });
    expect(refused.options).toMatchObject([
      { method: "chemical", allowed: false, why: expect.stringMatching(/brass/) },
    ]);
  });

  it("knows base metals by the names that people type, and stages with spaces", async () => {
    const names = { "zinc die cast": "zinc", "nickel silver": "nickel-silver", C360: "brass", 304: "stainless" };
    for (const [baseMetal, meant] of Object.entries(names)) {
      const answer = await ok("strip", { ...strip, baseMetal, stageFound: "after final plate" });
      expect(answer).toMatchObject({ baseMetal: meant, stageFound: "after-final-plate", given: { baseMetal } });
    }
  });

  it("stands on the starting price of a metal that the shop has not priced, and says so; as it says that no value was given", async () => {
    const { Au: _, ...metalCentsPerG } = STARTING_RATES.metalCentsPerG;
    const row = eq(shopRates.shopId, shop.shopId);
    const before = db.select({ rates: shopRates.rates }).from(shopRates).where(row).get();
    if (!before) throw new Error("the shop has rates");
    const priced = await ok("strip", strip);
    db.update(shopRates)
      .set({ rates: { ...before.rates, metalCentsPerG } })
      .where(row)
      .run();
    const { partValueCents: __, ...unvalued } = strip;
    const answer = await ok("strip", unvalued);
    const same = await ok("strip", strip);
    db.update(shopRates).set({ rates: before.rates }).where(row).run();
    expect(answer.assumed.join(" ")).toMatch(/No price set for gold.*No part value/);
    expect(same.atStrike.cost).toEqual(priced.atStrike.cost);
  });

  it("is for seniors and the owner: a plater is told who may", async () => {
    world.member = shop.members.plater;
    expect(await estimate("strip", strip)).toMatchObject({
      status: 403,
      body: { title: expect.stringMatching(/owner/) },
    });
    expect(await estimate("inspect", inspect)).toMatchObject({ status: 403 });
  });
});
