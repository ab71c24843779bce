import { NextRequest } from "next/server";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { POST } from "@/app/api/part-check/route";
import { emptyDatabase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const world = vi.hoisted(() => ({ db: null as unknown, member: null as unknown }));
vi.mock("@/db/client", () => ({ getDb: () => world.db }));
vi.mock("@/lib/server/session", () => ({ currentMember: async () => world.member }));

let shop: TestShop;
beforeEach(async () => {
  vi.stubEnv("NEXTAUTH_URL", "http://localhost:3000");
  const db = emptyDatabase();
  shop = await makeShop(db);
  Object.assign(world, { db, member: shop.members.plater });
});

async function post(body: unknown) {
  const request = new NextRequest("http://localhost:3000/api/part-check", {
    method: "POST",
    headers: { "content-type": "application/json" },
    body: typeof body === "string" ? body : JSON.stringify(body),
  });
  const answer = await POST(request, { params: Promise.resolve({}) });
  return { status: answer.status, type: answer.headers.get("content-type"), body: await answer.json() };
}

// A solid part of zinc die cast Alloy 3, 6.60 g/cm³ (ASTM B86): 100 g in air, 84.894 g in water of 20 °C.
const ZINC = { weightAirG: 100, weightWaterG: 84.89, waterTempC: 20 };

describe("POST /api/part-check", () => {
  it("tells a plater what the part may be, how sure, and what to do with it", async () => {
    const { status, body } = await post({ ...ZINC, magnetic: false, colour: "Blue-grey" });
    expect(status).toBe(200);
    expect(Math.abs(body.densityGPerCm3 - 6.6)).toBeLessThan(0.005);
    expect(body.uncertaintyGPerCm3).toBeGreaterThan(0);
    expect(body.candidates[0]).toEqual({
      metal: "zinc die cast Alloy 3 (ASTM AG40A, Z33525)",
      baseMetal: "zinc",
      rangeGPerCm3: [6.5, 6.7],
      typicalGPerCm3: 6.6,
      fit: expect.any(Number),
      source: expect.stringContaining("ASTM B86"),
    });
    expect(body.warnings.join(" ")).toMatch(/hollow, porous or plated/);
    expect(body.ruledOut[0]).toHaveProperty("reason");
    expect(body.sources.join(" ")).toMatch(/Tanaka/);
    expect(body.given).toEqual({ ...ZINC, balanceErrorG: 0.01, magnetic: "none", colour: "blue-grey" });
    expect(body).toHaveProperty("route");
  });

  it("takes numbers as typed, and the looks left out", async () => {
    const { body } = await post({ weightAirG: "100", weightWaterG: "84,89", waterTempC: "20" });
    expect(body).toMatchObject({ given: { ...ZINC, magnetic: null, colour: null } });
  });

  it("has no route for a part that nothing fits", async () => {
    // 5.2 g/cm³ lies between titanium and zinc, where no metal of the table is.
    const { status, body } = await post({ ...ZINC, weightWaterG: 80.82 });
    expect([status, body.candidates, body.route]).toEqual([200, [], null]);
  });

  const refused: [string, Record<string, unknown>, string][] = [
    ["no weight in air", { weightAirG: undefined }, "weightAirG"],
    ["no weight in water", { weightWaterG: undefined }, "weightWaterG"],
    ["no temperature", { waterTempC: undefined }, "waterTempC"],
    ["text for a weight", { weightAirG: "heavy" }, "weightAirG"],
    ["a negative weight", { weightAirG: -100 }, "weightAirG"],
    ["a weight of zero", { weightAirG: 0 }, "weightAirG"],
    ["a weight beyond all scales", { weightAirG: 1e308 }, "weightAirG"],
    ["nothing in water", { weightWaterG: 0 }, "weightWaterG"],
    ["a part that floats", { weightWaterG: -1 }, "weightWaterG"],
    ["heavier in water than in air", { weightWaterG: 120 }, "weightWaterG"],
    ["as heavy in water as in air", { weightWaterG: 100 }, "weightWaterG"],
    ["ice", { waterTempC: -5 }, "waterTempC"],
    ["steam", { waterTempC: 1e308 }, "waterTempC"],
    ["a balance without error", { balanceErrorG: 0 }, "balanceErrorG"],
    ["a negative balance error", { balanceErrorG: -0.1 }, "balanceErrorG"],
    ["text for the balance error", { balanceErrorG: "small" }, "balanceErrorG"],
    ["a balance too coarse to tell", { balanceErrorG: 10 }, "balanceErrorG"],
    ["a colour that nobody knows", { colour: "mauve" }, "colour"],
    ["a pull that nobody knows", { magnetic: "very" }, "magnetic"],
  ];
  it.each(refused)("answers 400 and names the field in words: %s", async (_, change, field) => {
    const { status, type, body } = await post({ ...ZINC, ...change });
    expect([status, type]).toEqual([400, "application/problem+json"]);
    expect(body).toMatchObject({ code: "invalid", status: 400 });
    expect(Object.keys(body.fields)).toEqual([field]);
    expect(body.fields[field]).toMatch(/^[A-Z].+\.$/);
  });

  it("answers 400 to a body that is no JSON object", async () => {
    for (const body of ["{weightAirG: 1", "[]", "7", "null"]) {
      expect(await post(body), body).toMatchObject({ status: 400, type: "application/problem+json" });
    }
  });

  it("refuses a stranger", async () => {
    world.member = null;
    expect(await post(ZINC)).toMatchObject({ status: 401, body: { code: "signed-out" } });
  });
});
