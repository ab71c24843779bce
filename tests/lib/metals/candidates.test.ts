import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { candidatesFor } from "@/lib/metals/candidates";
import type { Looks } from "@/lib/metals/material";
import { COLOURS, PULLS } from "@/lib/metals/material-words";
import { measureDensity } from "@/lib/metals/weigh-part";
import { published, weighingOf } from "./weighings";

const narrowed = (densityGPerCm3: number, looks: Looks = {}) =>
  candidatesFor(measureDensity(weighingOf(densityGPerCm3)), looks);
const reading = (densityGPerCm3: number, uncertaintyGPerCm3: number, looks: Looks = {}) =>
  candidatesFor({ densityGPerCm3, uncertaintyGPerCm3, waterDensityGPerCm3: 0.998 }, looks);

/** Solid parts of the published typical density: handbook and trade tables, source in each row of densities.csv. */
const BY_WEIGHT_ALONE = [
  "zinc die cast ZA-8",
  "zinc die cast ZA-12",
  "zinc, wrought",
  "aluminium 6061",
  "aluminium 360",
  "magnesium AZ91",
  "titanium grade 2",
  "titanium Ti-6Al-4V",
  "lead",
  "sterling silver 925",
  "fine silver",
  "gold 14k yellow",
  "gold 18k yellow",
  "beryllium copper C17200",
  "cartridge brass C26000",
  "palladium",
  "platinum",
] as const;

const WITH_A_LOOK: [string, Looks][] = [
  ["low-carbon steel (1018, A36)", { pull: "strong" }],
  ["stainless 304 / 304L", { pull: "none" }],
  ["stainless 410 / 416 / 430", { pull: "strong", colour: "silver-white" }],
  ["grey cast iron", { pull: "strong" }],
  ["pewter (Sn-Sb-Cu, ASTM B560)", { pull: "none" }],
  ["copper C11000", { pull: "none", colour: "red" }],
  ["nickel 200", { pull: "strong" }],
  ["nickel silver C75200 (18 % Ni)", { colour: "silver-white" }],
  ["free-cutting brass C36000", { colour: "yellow" }],
  ["phosphor bronze C51000", { colour: "red" }],
  ["gold, fine", { colour: "yellow" }],
  ["zinc die cast Alloy 3 (ASTM AG40A, Z33525)", { pull: "none", colour: "blue-grey" }],
];

describe("which metals a part may be", () => {
  it.each(BY_WEIGHT_ALONE)("tells %s by its weight alone", (material) => {
    expect(narrowed(published(material)).candidates[0]).toMatchObject({ name: material });
  });

  it.each(WITH_A_LOOK)("tells %s with a magnet or a look at its colour", (material, looks) => {
    expect(narrowed(published(material), looks).candidates[0]).toMatchObject({ name: material });
  });

  it("calls a fit of 1 the typical density, and less the further off it reads", () => {
    // ZA-8, 6.25 to 6.35, typical 6.30 (NADCA).
    const fits = [6.3, 6.32, 6.34, 6.36].map((density) => reading(density, 0.02).candidates[0]?.fit ?? 0);
    expect(fits[0]).toBe(1);
    expect(fits).toEqual([...fits].sort((a, b) => b - a));
    expect(new Set(fits).size).toBe(4);
    expect(fits[3]).toBeGreaterThan(0);
  });

  it("puts the best fit first, and names in order where they tie", () => {
    fc.assert(
      fc.property(fc.double({ min: 1.7, max: 21.6, noNaN: true }), (density) => {
        const { candidates } = narrowed(density);
        const fits = candidates.map((each) => Math.round(each.fit * 1e6));
        expect(fits).toEqual([...fits].sort((a, b) => b - a));
      }),
    );
    // Alloy 3 and Alloy 5 are both 6.60 typically (ASTM B86).
    expect(narrowed(6.6).candidates.map((each) => each.name)).toEqual([
      "zinc die cast Alloy 3 (ASTM AG40A, Z33525)",
      "zinc die cast Alloy 5 (AC41A)",
    ]);
  });

  it("counts a metal whose range only the reading's error reaches", () => {
    // ZA-8 ends at 6.35.
    expect(reading(6.37, 0.03).candidates.map((each) => each.name)).toEqual(["zinc die cast ZA-8"]);
    expect(reading(6.37, 0.01).candidates).toEqual([]);
  });
});

describe("what rules a metal out", () => {
  const why = (looks: Looks, density: number, name: RegExp) =>
    narrowed(density, looks).ruledOut.find((each) => name.test(each.name))?.reason;

  it("is a hard pull for what no magnet moves, and no pull for what a magnet moves hard", () => {
    expect(why({ pull: "strong" }, 8, /304/)).toBe("a magnet would pull a little at most");
    expect(why({ pull: "strong" }, 6.6, /Alloy 3/)).toBe("a magnet would not pull it");
    expect(why({ pull: "none" }, 7.85, /4140/)).toBe("a magnet would pull hard");
    expect(why({ pull: "faint" }, 8.5, /C36000/)).toBe("bare, a magnet would not pull it");
  });

  it("is a colour that the metal never shows", () => {
    expect(why({ colour: "silver-white" }, 8.5, /C36000/)).toBe("it would be yellow");
    expect(why({ colour: "yellow" }, 8.73, /C75200/)).toBe("it would be silver-white");
  });

  it("is how much too heavy or too light the metal is, nearest first, eight at most", () => {
    // From 6.90: ZA alloys lie below, pewter from 7.20 and tin from 7.27 above (ASM, CRC).
    const { ruledOut } = reading(6.9, 0.02);
    const reasons = new Map(ruledOut.map((each) => [each.name, each.reason]));
    expect(reasons.get("pewter (Sn-Sb-Cu, ASTM B560)")).toBe("too heavy by 0.30");
    expect(reasons.get("zinc die cast Alloy 3 (ASTM AG40A, Z33525)")).toBe("too light by 0.20");
    expect(ruledOut).toHaveLength(8);
    const gaps = ruledOut.map((each) => Number(each.reason.match(/[\d.]+$/)?.[0]));
    expect(gaps).toEqual([...gaps].sort((a, b) => a - b));
  });

  it("never rules out a candidate, and never adds one that weight excludes", () => {
    const looks = fc.record({
      pull: fc.option(fc.constantFrom(...PULLS), { nil: undefined }),
      colour: fc.option(fc.constantFrom(...COLOURS), { nil: undefined }),
    });
    fc.assert(
      fc.property(fc.double({ min: 1.7, max: 21.6, noNaN: true }), looks, (density, seen) => {
        const { candidates, ruledOut } = narrowed(density, seen);
        const byWeight = new Set(narrowed(density).candidates.map((each) => each.name));
        const out = new Set(ruledOut.map((each) => each.name));
        for (const { name, fit } of candidates) {
          expect(byWeight.has(name) && !out.has(name)).toBe(true);
          expect(fit >= 0 && fit <= 1).toBe(true);
        }
      }),
    );
  });
});
