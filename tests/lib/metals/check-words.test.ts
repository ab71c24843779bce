import { describe, expect, it } from "vitest";
import { candidatesFor } from "@/lib/metals/candidates";
import { caseWarning, checkWarning } from "@/lib/metals/check-warning";
import { openWords, restsWords, verdictWords, type Declared } from "@/lib/metals/check-words";
import { declaredFit } from "@/lib/metals/declared";
import { declaredSource } from "@/lib/metals/declared-source";

/** Readings chosen within published ranges: zinc Alloy 3 6.5 to 6.7 (ASTM B86), brass C360 8.45 to 8.53 (CDA), 304 7.9 to 8.03. */
const measured = (densityGPerCm3: number, uncertaintyGPerCm3: number) => ({
  densityGPerCm3,
  uncertaintyGPerCm3,
  waterDensityGPerCm3: 0.9978,
});
const ZINC = measured(6.64, 0.24);
const BRASS_C360: Declared = { baseMetal: "brass", alloy: "C360" };
const said = (reading: ReturnType<typeof measured>, metal: Declared) => ({
  metal,
  fit: declaredFit(reading, metal.baseMetal, metal.alloy),
});
const looks = { pull: "none", colour: "blue-grey" } as const;

describe("the sentence that a part check opens with", () => {
  it("says what it weighs like, and what the job says against it", () => {
    const { candidates } = candidatesFor(ZINC, looks);
    expect(verdictWords(candidates, null)).toBe("It weighs like zinc die cast.");
    expect(verdictWords(candidates, said(ZINC, BRASS_C360))).toBe("It weighs like zinc die cast. The job says brass.");
  });

  it("agrees with a job that is right", () => {
    const { candidates } = candidatesFor(ZINC, looks);
    const zinc = said(ZINC, { baseMetal: "zinc", alloy: "Alloy 3" });
    expect(verdictWords(candidates, zinc)).toBe("It weighs like zinc die cast. The job says so too.");
  });

  it("names the alloy where the kind is right and the alloy is not", () => {
    const reading = measured(8.6, 0.02);
    const { candidates } = candidatesFor(reading, { colour: "yellow" });
    expect(verdictWords(candidates, said(reading, BRASS_C360))).toBe("It weighs like brass. The job says brass C360.");
  });

  it("names up to three metals, and counts more", () => {
    const wide = measured(8.55, 1.6);
    expect(verdictWords(candidatesFor(wide).candidates, null)).toMatch(
      /^It weighs like [a-z ]+, or \w+ other metals\.$/,
    );
    expect(openWords(candidatesFor(wide).candidates)).toContain("Their routes differ");
  });

  it("says so when nothing weighs like it", () => {
    const nothing = measured(5.25, 0.01);
    expect(verdictWords(candidatesFor(nothing).candidates, null)).toBe("It weighs like no metal in the table.");
    expect(openWords([])).toBe("Nothing in the table fits. See what may have misled.");
  });

  it("claims nothing against a job that names no metal", () => {
    const { candidates } = candidatesFor(ZINC, looks);
    const other = said(ZINC, { baseMetal: "other", alloy: null });
    expect(verdictWords(candidates, other)).toBe("It weighs like zinc die cast.");
  });

  it("tells which ranges are only remembered", () => {
    const shown = [
      { name: "one (1)", source: "ASTM B86" },
      { name: "two", source: "CDA, from memory" },
    ];
    const rests = restsWords(ZINC, shown, { tempTyped: "22 °C", balanceErrorG: 0.1 });
    expect(rests).toContain("Water 0.9978 g/cm³ at 22 °C, air 0.0012");
    expect(rests).toContain("Ranges: Two from memory, the rest published.");
  });
});

describe("the warning that a kept check leaves", () => {
  const kept = {
    densityGPerCm3: 6.64,
    uncertaintyGPerCm3: 0.24,
    waterTempC: 22,
    likelyBaseMetal: "zinc" as const,
  };

  it("says what it weighs like and what is declared", () => {
    const words = "Weighs like zinc die cast, 6.64 ± 0.24 g/cm³. Declared brass C360.";
    expect(checkWarning(kept, BRASS_C360)).toBe(words);
  });

  it("is none for a metal that fits, none for no metal, and none where nobody weighed", () => {
    expect(checkWarning(kept, { baseMetal: "zinc", alloy: null })).toBeNull();
    expect(checkWarning(kept, { baseMetal: "other", alloy: null })).toBeNull();
    expect(checkWarning(null, BRASS_C360)).toBeNull();
  });

  it("says the alloy's range where only the alloy is wrong", () => {
    const brass = { ...kept, densityGPerCm3: 8.6, uncertaintyGPerCm3: 0.02, likelyBaseMetal: "brass" as const };
    expect(checkWarning(brass, BRASS_C360)).toBe(
      "Weighs 8.60 ± 0.02 g/cm³. Declared brass C360, which is 8.45 to 8.53.",
    );
  });

  it("tells a case that states another metal than its job which of the two fits", () => {
    const zinc = { baseMetal: "zinc" as const, alloy: null };
    expect(caseWarning(kept, BRASS_C360, zinc)).toContain("This case says zinc die cast, which fits.");
    expect(caseWarning(kept, zinc, BRASS_C360)).toContain("Declared brass C360.");
    expect(caseWarning(kept, zinc, zinc)).toBeNull();
    expect(caseWarning(kept, BRASS_C360, { baseMetal: "steel", alloy: null })).toContain("which does not fit either");
  });
});

describe("where a declared range comes from", () => {
  it("is said of an alloy that is known, and of no other", () => {
    expect(declaredSource(declaredFit(ZINC, "brass", "C360"))).toEqual({
      name: "Brass C360",
      // densities.csv, row C36000: the CDA figure was not seen in print.
      source: expect.stringContaining("from memory") as unknown,
    });
    expect(declaredSource(declaredFit(ZINC, "brass", null))).toBeUndefined();
  });
});
