import { describe, expect, it } from "vitest";
import { ALLOY_NAMES } from "@/lib/library/alloy-names";
import { declaredFit } from "@/lib/metals/declared";
import type { MeasuredDensity } from "@/lib/metals/weigh-part";
import { PUBLISHED } from "./weighings";

const reads = (densityGPerCm3: number, uncertaintyGPerCm3 = 0.02): MeasuredDensity => ({
  densityGPerCm3,
  uncertaintyGPerCm3,
  waterDensityGPerCm3: 0.998,
});

/** Job cards' words and the row of the published table that they mean. */
const NAMED = [
  ["brass", "C360", "free-cutting brass C36000"],
  ["brass", "UNS C36000, half hard", "free-cutting brass C36000"],
  ["brass", "360 brass", "free-cutting brass C36000"],
  ["steel", "AISI 4140", "alloy steel (4140)"],
  ["stainless", "304", "stainless 304 / 304L"],
  ["stainless", "304L sheet", "stainless 304 / 304L"],
  ["zinc", "zamak 3", "zinc die cast Alloy 3 (ASTM AG40A, Z33525)"],
  ["zinc", "Zamak3", "zinc die cast Alloy 3 (ASTM AG40A, Z33525)"],
  ["zinc", "Alloy 3", "zinc die cast Alloy 3 (ASTM AG40A, Z33525)"],
  ["zinc", "ZA-12", "zinc die cast ZA-12"],
  ["aluminium", "6061-T6", "aluminium 6061"],
  ["nickel-silver", "C752", "nickel silver C75200 (18 % Ni)"],
  ["nickel", "Monel", "nickel-copper alloy 400"],
  ["gold", "18k white", "gold 18k white"],
  ["other", "tungsten", "tungsten (gold look-alike by density)"],
] as const;

describe("the metal that the job card declares", () => {
  it.each(NAMED)("is read as its own alloy: %s %s", (baseMetal, alloy, material) => {
    const row = PUBLISHED.find((each) => each.material === material);
    const fit = declaredFit(reads(5), baseMetal, alloy);
    expect(fit).toMatchObject({ known: true, fits: false, lowGPerCm3: row?.low, highGPerCm3: row?.high });
  });

  it("does not fit a zinc part declared brass, and the sentence says both figures", () => {
    expect(declaredFit(reads(6.64), "brass", "C360")).toEqual({
      fits: false,
      known: true,
      lowGPerCm3: 8.45,
      highGPerCm3: 8.53,
      name: "Brass C360",
      words: "Brass C360 is 8.45 to 8.53 g/cm³. This part reads 6.64, outside its error.",
    });
  });

  it("fits when the reading's error reaches the range, and not when it falls short", () => {
    // C360 begins at 8.45 (CDA).
    expect(declaredFit(reads(8.43, 0.03), "brass", "C360").fits).toBe(true);
    expect(declaredFit(reads(8.43, 0.01), "brass", "C360").fits).toBe(false);
    expect(declaredFit(reads(8.5), "brass", "C360").words).toMatch(/This part reads 8\.50: it fits\.$/);
  });

  it("without an alloy, or with one that nobody knows, is the whole base metal", () => {
    const whole = declaredFit(reads(8.5), "brass");
    expect([whole.lowGPerCm3 <= 8.4, whole.highGPerCm3 >= 8.73]).toEqual([true, true]);
    expect(declaredFit(reads(8.5), "brass", "job 88-Q")).toMatchObject({
      lowGPerCm3: whole.lowGPerCm3,
      highGPerCm3: whole.highGPerCm3,
      name: "Brass job 88-Q",
      words: expect.stringMatching(/^Brass of any alloy is /),
    });
    expect(declaredFit(reads(8.5), "brass", "  ").name).toBe("Brass");
  });

  it("is all of a name that several metals share", () => {
    // 14k: white from 12.55, yellow to 13.75 (jewellery tables).
    expect(declaredFit(reads(13), "gold", "14k")).toMatchObject({ lowGPerCm3: 12.55, highGPerCm3: 13.75, fits: true });
  });

  it("is never judged when the card says another metal and no more", () => {
    for (const alloy of [undefined, "", "unknown metal"]) {
      const fit = declaredFit(reads(6.64), "other", alloy);
      expect(fit).toMatchObject({ fits: true, known: false });
      expect(Number.isFinite(fit.lowGPerCm3 + fit.highGPerCm3)).toBe(true);
    }
  });

  it("is not read as a metal of another family: a brass card that says 6061 is brass", () => {
    expect(declaredFit(reads(2.7), "brass", "6061").fits).toBe(false);
  });

  it("has an answer for each name that a job card uses", () => {
    for (const [baseMetal, names] of Object.entries(ALLOY_NAMES)) {
      for (const name of names) {
        const fit = declaredFit(reads(5), baseMetal as keyof typeof ALLOY_NAMES, name);
        expect(fit.lowGPerCm3, `${baseMetal} ${name}`).toBeLessThan(fit.highGPerCm3);
      }
    }
  });

  it("does not call true alloys false that lie at the edge of their family", () => {
    // Data-sheet densities, from memory: D2 7.70, 7075 2.81, C230 8.75, C954 7.45, Kovar 8.36.
    const honest = [
      ["steel", "D2", 7.7],
      ["aluminium", "7075-T6", 2.81],
      ["brass", "red brass", 8.75],
      ["bronze", "C954", 7.45],
      ["nickel", "Kovar", 8.36],
    ] as const;
    for (const [baseMetal, alloy, density] of honest) {
      expect(declaredFit(reads(density), baseMetal, alloy).fits, alloy).toBe(true);
      expect(declaredFit(reads(density), baseMetal).fits, baseMetal).toBe(true);
    }
  });
});
