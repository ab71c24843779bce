/** Hand-worked amounts stand in tests/lib/costs/strip-estimate.test.ts; here are the rules of the library's table. */
import { describe, expect, it } from "vitest";
import { shelf } from "@/db/seed/library/shelf";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { compareAtStrike } from "@/lib/costs/strip-estimate";
import { TYPICAL_PLATES, typicalBaseMetals, typicalStrip, type TypicalStrip } from "@/lib/library/typical-strip";

function stripOf(...args: Parameters<typeof typicalStrip>): TypicalStrip {
  const strip = typicalStrip(...args);
  if (!strip) throw new Error("Nothing could be reckoned.");
  return strip;
}

describe("what it typically costs to strip", () => {
  const strip = stripOf(["steel", "brass"], STARTING_RATES);

  it("is dearer after every final plate than at the strike", () => {
    for (const row of strip.rows) expect(row.meanCents, row.plate).toBeGreaterThan(strip.atStrike.meanCents);
  });

  it("says each base metal once for each final plate", () => {
    for (const plate of TYPICAL_PLATES) {
      const metals = strip.rows.filter((row) => row.plate === plate.words).flatMap((row) => row.baseMetals);
      expect(metals.toSorted(), plate.words).toEqual(["brass", "steel"]);
    }
  });

  it("is the estimate for one part of 1 dm² with a usual strike", () => {
    const { atStrike, later } = compareAtStrike({
      quantity: 1,
      areaDm2: 1,
      baseMetal: "steel",
      stack: [
        { metal: "Cu", thicknessUm: 0.5 },
        { metal: "Ni", thicknessUm: 10 },
      ],
      stageFound: "after-final-plate",
      rates: STARTING_RATES,
    });
    expect(strip.atStrike.meanCents).toBe(atStrike.meanCents);
    expect(strip.rows[0]).toMatchObject({ plate: "Nickel 10 µm", meanCents: later.meanCents });
  });

  it("follows the shop's rates", () => {
    const dear = stripOf(["steel"], { ...STARTING_RATES, labourCentsPerHour: 2 * STARTING_RATES.labourCentsPerHour });
    expect(dear.atStrike.meanCents).toBeGreaterThan(strip.atStrike.meanCents);
  });

  it("leaves out a plate whose metal has no price, and names the metal", () => {
    const { Pd: _none, ...metalCentsPerG } = STARTING_RATES.metalCentsPerG;
    const without = stripOf(["steel"], { ...STARTING_RATES, metalCentsPerG });
    expect(without.unpriced).toEqual(["palladium"]);
    expect(without.rows.some((row) => row.plate.includes("palladium"))).toBe(false);
    expect(typicalStrip(["steel"], { ...STARTING_RATES, metalCentsPerG: {} })).toBeNull();
  });

  it("stands on every fault of the shelf that ships, and not on sound", () => {
    for (const entry of shelf.classes) {
      const causes = shelf.causes.filter((cause) => cause.classSlugs.includes(entry.slug));
      const metals = typicalBaseMetals(causes);
      expect(metals.length > 0, entry.slug).toBe(entry.slug !== "sound");
      expect(typicalStrip(metals, STARTING_RATES) === null, entry.slug).toBe(entry.slug === "sound");
    }
  });

  it("takes the base metals that the likeliest causes put at risk, three at most", () => {
    expect(
      typicalBaseMetals([
        { likelihood: 0.2, baseMetals: ["steel", "brass"] },
        { likelihood: 0.5, baseMetals: ["zinc", "brass", "other"] },
        { likelihood: 0.1, baseMetals: ["silver"] },
      ]),
    ).toEqual(["brass", "zinc", "steel"]);
  });
});
