import fc from "fast-check";
import { eq } from "drizzle-orm";
import { beforeEach, describe, expect, it, vi } from "vitest";
import type { Db } from "@/db/open";
import { shopRates } from "@/db/schema";
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

interface Good {
  route: EstimateRoute;
  name: string;
  body: Record<string, unknown>;
  /** Counts and values of which 0 is one. */
  zeroIsFine?: string[];
  optional?: string[];
}
const GOOD: Good[] = [
  { route: "plate", name: "plate, for a thickness", body: forThickness, optional: ["valence", "efficiency"] },
  { route: "plate", name: "plate, by current", body: byCurrent, optional: ["valence", "efficiency"] },
  { route: "inspect", name: "inspect", body: inspect, zeroIsFine: ["inspected", "bad"] },
  { route: "test-pieces", name: "test-pieces, pieces given", body: pieces },
  { route: "test-pieces", name: "test-pieces, chance wanted", body: chance },
  { route: "strip", name: "strip", body: strip, zeroIsFine: ["partValueCents"], optional: ["partValueCents"] },
];
const BAD_ANYWHERE: [string, unknown][] = [
  ["null", null],
  ["a list", []],
  ["an object", {}],
  ["true", true],
];
const BAD_NUMBERS: [string, unknown][] = [
  ["text", "abc"],
  ["a number as text", "12"],
  ["negative", -1],
  ["zero", 0],
  ["1e308", 1e308],
  ["-1e308", -1e308],
  ...BAD_ANYWHERE,
];
const BAD_WORDS: [string, unknown][] = [
  ["a number", 12],
  ["an unknown word", "unobtainium"],
  ["nothing", ""],
  ...BAD_ANYWHERE,
];
const BAD_LISTS: [string, unknown][] = [
  ["empty", []],
  ["text", "Cu"],
  ["a number", 3],
  ["null", null],
  ["an object", {}],
];

const badness = GOOD.flatMap(({ route, name, body, zeroIsFine = [], optional = [] }) =>
  Object.entries(body).flatMap(([field, value]) => {
    const bad = typeof value === "number" ? BAD_NUMBERS : Array.isArray(value) ? BAD_LISTS : BAD_WORDS;
    const kinds = bad.filter(([kind]) => !(kind === "zero" && zeroIsFine.includes(field)));
    if (!optional.includes(field)) kinds.push(["missing", undefined]);
    return kinds.map(([kind, put]) => ({
      route,
      field,
      kind,
      body: { ...body, [field]: put },
      name: `${name}: ${field}, ${kind}`,
    }));
  }),
);

/** A refusal as RFC 9457 has it, with words for the person beside each field. */
async function refused(route: EstimateRoute, body: unknown, contentType?: string): Promise<string[]> {
  const answer = await estimate(route, body, contentType);
  expect(answer.status, answer.text).toBe(400);
  expect(answer.type).toBe("application/problem+json");
  expect(answer.body).toMatchObject({ status: 400, code: "invalid", title: expect.any(String) });
  const words = Object.values<string>(answer.body.fields);
  for (const each of words) {
    expect(each).toMatch(/^[A-Z].{10,}\.$/);
    expect(each).toMatch(/\b(Give|Name|Use|List|Check|must be)\b/i);
  }
  return Object.keys(answer.body.fields);
}

describe("bad input is refused, the field named, with what to do", () => {
  it.each(badness)("$name", async ({ route, field, kind, body }) => {
    const fields = await refused(route, body);
    // Where one of two would do, both are named.
    if (route === "test-pieces" && kind === "missing" && field !== "badShare") {
      expect(fields).toEqual(["pieces", "wantedChance"]);
    } else expect(fields).toEqual([field]);
  });

  it.each(Object.entries({ plate: forThickness, inspect, "test-pieces": pieces, strip }))(
    "%s: what is no JSON object, and a number that overflows on its way in",
    async (name, body) => {
      const route = name as EstimateRoute; // the keys above
      for (const text of ["{nope", "", "[]", "null", "12", '"abc"'])
        expect(await refused(route, text)).toEqual(["body"]);
      expect((await refused(route, JSON.stringify(body), "text/plain")).length).toBeGreaterThan(0);
      const [field] = Object.entries(body).find(([, value]) => typeof value === "number") ?? ["none"];
      const endless = JSON.stringify({ ...body, [field]: "endless" }).replace('"endless"', "1e999");
      expect(await refused(route, endless)).toEqual([field]);
    },
  );

  it("plate: the missing fields of the form that is nearer", async () => {
    expect(await refused("plate", { metal: "Ni" })).toEqual(["areaDm2", "thicknessUm", "currentDensityADm2"]);
    expect(await refused("plate", { metal: "Ni", areaDm2: 1, minutes: 3 })).toEqual(["currentA"]);
    expect(await refused("plate", { metal: "Ni", areaDm2: 1, currentDensityADm2: 3 })).toEqual(["thicknessUm"]);
    expect(await refused("plate", { ...forThickness, currentA: 3, minutes: 3 })).toEqual(["currentA"]);
    expect(await refused("plate", { ...forThickness, valence: 3 })).toEqual(["valence"]);
    expect(await refused("plate", { ...forThickness, valence: 1.5 })).toEqual(["valence"]);
    expect(await refused("plate", { ...forThickness, efficiency: 95 })).toEqual(["efficiency"]);
  });

  it("plate: an efficiency or a density of current so small that the time is endless", async () => {
    expect(await refused("plate", { ...forThickness, efficiency: 1e-310 })).toEqual(["efficiency"]);
    expect(await refused("plate", { ...forThickness, currentDensityADm2: 5e-324 })).toEqual(["currentDensityADm2"]);
  });

  it("inspect: more bad parts than inspected, parts of a part, a break-even beyond counting", async () => {
    expect(await refused("inspect", { ...inspect, bad: 10_001 })).toEqual(["bad"]);
    expect(await refused("inspect", { ...inspect, inspected: 10.5 })).toEqual(["inspected"]);
    expect(await refused("inspect", { ...inspect, missCost: 5e-324 })).toEqual(["missCost"]);
  });

  it("test-pieces: certainty, half a piece, a share so small that it takes more than a million", async () => {
    expect(await refused("test-pieces", { badShare: 0.05, wantedChance: 1 })).toEqual(["wantedChance"]);
    expect(await refused("test-pieces", { badShare: 0.05, pieces: 2.5 })).toEqual(["pieces"]);
    expect(await refused("test-pieces", { badShare: 1e-9, wantedChance: 0.9 })).toEqual(["badShare"]);
  });

  it("strip: layers out of order, and each layer by its place", async () => {
    const stackOf = (...metals: string[]) => ({ ...strip, stack: metals.map((metal) => ({ metal, thicknessUm: 1 })) });
    for (const upsideDown of [stackOf("Au", "Ni", "Cu"), stackOf("Cr", "Ni"), stackOf("Rh", "Cu"), stackOf("Ag", "Cu")])
      expect(await refused("strip", upsideDown)).toEqual(["stack"]);
    expect(await refused("strip", stackOf("Au", "Ag", "Ni"))).toEqual(["stack"]);
    expect(await refused("strip", stackOf("Cu", "Xx"))).toEqual(["stack.1.metal"]);
    for (const thicknessUm of [0, -1, 1e308, "5", null, undefined, [], {}]) {
      const body = {
        ...strip,
        stack: [
          { metal: "Cu", thicknessUm: 1 },
          { metal: "Ni", thicknessUm },
        ],
      };
      expect(await refused("strip", body)).toEqual(["stack.1.thicknessUm"]);
    }
    expect(await refused("strip", { ...strip, stack: [7] })).toEqual(["stack.0"]);
    expect(await refused("strip", { ...strip, quantity: 2.5 })).toEqual(["quantity"]);
    expect(await refused("strip", { ...strip, method: "magic" })).toEqual(["method"]);
    expect(await refused("strip", { ...strip, method: null })).toEqual(["method"]);
  });

  it("strip: more money than can be counted", async () => {
    const row = eq(shopRates.shopId, shop.shopId);
    const before = db.select({ rates: shopRates.rates }).from(shopRates).where(row).get();
    if (!before) throw new Error("the shop has rates");
    const metalCentsPerG = { ...before.rates.metalCentsPerG, Au: 1e9 };
    db.update(shopRates)
      .set({ rates: { ...before.rates, metalCentsPerG } })
      .where(row)
      .run();
    const much = { ...strip, quantity: 100_000, areaDm2: 10_000, stack: [{ metal: "Au", thicknessUm: 1000 }] };
    const fields = await refused("strip", much).finally(() => {
      db.update(shopRates).set({ rates: before.rates }).where(row).run();
    });
    expect(fields).toEqual(["quantity"]);
  });
});

describe("whatever the numbers, the answer holds numbers or a refusal", () => {
  // The ends of what a JSON number can be, and what lies between.
  const anyNumber = fc.oneof(
    fc.constantFrom(5e-324, 1e-300, 1e-12, 0.5, 1, 2, 59, 1e6, 1e12, 1e300),
    fc.double({ min: 0, max: 1e5, noNaN: true }),
    fc.integer({ min: 1, max: 2000 }),
  );
  it.each(GOOD)("$name", async ({ route, body }) => {
    const fields = Object.keys(body).filter((field) => typeof body[field] === "number" && field !== "valence");
    const anyBody = fc.record(Object.fromEntries(fields.map((field) => [field, anyNumber])));
    await fc.assert(
      fc.asyncProperty(anyBody, async (numbers) => {
        const { status, body: answer, text } = await estimate(route, { ...body, ...numbers });
        if (status === 400) expect(Object.keys(answer.fields).length).toBeGreaterThan(0);
        else {
          expect(status).toBe(200);
          // JSON writes NaN and Infinity as null.
          expect(text.replace('"rate":null', "")).not.toContain("null");
        }
      }),
      { numRuns: 150 },
    );
  });
});
