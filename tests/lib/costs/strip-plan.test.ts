import { describe, expect, it } from "vitest";
import { BASE_METALS, type BaseMetal } from "@/lib/cases/case-words";
import { isStopCaution } from "@/lib/costs/strip-cautions";
import { DISSOLVING_ROWS, POLISHING_ROW } from "@/lib/costs/strip-method-rows";
import { STRIP_METHODS, type StripMethod } from "@/lib/costs/strip-methods";
import { cautionsFor, planStrip, sourcesFor } from "@/lib/costs/strip-plan";
import type { Layer } from "@/lib/plating/deposit-stack";

const stackOf = (...metals: Layer["metal"][]): Layer[] => metals.map((metal) => ({ metal, thicknessUm: 1 }));
const bathsOf = (method: StripMethod, baseMetal: BaseMetal, ...metals: Layer["metal"][]) => {
  const plan = planStrip(method, baseMetal, stackOf(...metals));
  return plan.allowed ? plan.steps.map((step) => step.row.id) : plan.why;
};

describe("a bath that attacks the base metal is not offered", () => {
  // Which baths attack what: trade forum finishing.com/349/73, specialtytest.com, pfonline.com stripping-nickel-chrome.
  it("cyanide nickel strip on brass, copper and zinc", () => {
    for (const baseMetal of ["brass", "copper", "zinc"] as const) {
      expect(bathsOf("chemical", baseMetal, "Cu", "Ni")).toMatch(/^It attacks/);
    }
    expect(bathsOf("chemical", "steel", "Cu", "Ni")).toEqual(["nickel-copper-cyanide", "nickel-copper-cyanide"]);
  });

  it("cyanide gold strip on copper, silver and brass", () => {
    for (const baseMetal of ["brass", "copper", "silver"] as const) {
      expect(bathsOf("chemical", baseMetal, "Au")).toMatch(/^It attacks/);
    }
    expect(bathsOf("chemical", "stainless", "Au")).toEqual(["gold-cyanide-peroxide"]);
  });

  it("caustic chromium strip on zinc and aluminium", () => {
    for (const baseMetal of ["zinc", "aluminium"] as const) {
      expect(bathsOf("electrolytic", baseMetal, "Cr")).toMatch(/Caustic dissolves/);
    }
    expect(bathsOf("electrolytic", "steel", "Cr")).toEqual(["chromium-caustic"]);
  });

  it("nothing but polishing on a base metal that nobody vouches for", () => {
    expect(bathsOf("chemical", "other", "Cu", "Ni")).toMatch(/Nobody vouches/);
    expect(bathsOf("electrolytic", "other", "Ag")).toMatch(/Nobody vouches/);
  });

  it("and no bath takes rhodium: it only lifts over nickel", () => {
    expect(bathsOf("chemical", "brass", "Ni", "Rh")).toMatch(/No chemical immersion bath for rhodium/);
    expect(bathsOf("electrolytic", "brass", "Cu", "Ni", "Rh")).toEqual([
      "rhodium-lift-anodic",
      "nickel-sulfuric-anodic",
      "polish-back",
    ]);
    expect(bathsOf("electrolytic", "brass", "Cu", "Ag", "Rh")).toMatch(/nickel lies right beneath/);
  });

  it("no row both vouches for a base metal and attacks it, or takes a metal off a part made of it", () => {
    const own: Partial<Record<Layer["metal"], BaseMetal>> = {
      Cu: "copper",
      Ni: "nickel",
      Au: "gold",
      Ag: "silver",
      Zn: "zinc",
    };
    for (const row of DISSOLVING_ROWS) {
      for (const baseMetal of row.safeOn) expect(row.attacks[baseMetal], `${row.id} on ${baseMetal}`).toBeUndefined();
      for (const metal of row.takesOff) {
        const same = own[metal];
        if (same) expect(row.safeOn, `${row.id} takes ${metal}`).not.toContain(same);
      }
    }
  });
});

describe("a plan for every part", () => {
  it("can always polish, layer by layer from the top", () => {
    for (const baseMetal of BASE_METALS) {
      const plan = planStrip("polish-back", baseMetal, stackOf("Cu", "Ni", "Cr"));
      if (!plan.allowed) throw new Error(plan.why);
      expect(plan.steps.map((step) => step.layer.metal)).toEqual(["Cr", "Ni", "Cu"]);
    }
  });

  it("polishes off a thin strike that a bath left, and refuses a thick one", () => {
    expect(bathsOf("electrolytic", "brass", "Cu", "Ni")).toEqual(["nickel-sulfuric-anodic", "polish-back"]);
    const thick: Layer[] = [
      { metal: "Cu", thicknessUm: 20 },
      { metal: "Ni", thicknessUm: 5 },
    ];
    expect(planStrip("electrolytic", "brass", thick)).toMatchObject({ allowed: false });
  });

  it("names its sources and its cautions, strong ones first", () => {
    for (const method of STRIP_METHODS) {
      const plan = planStrip(method, "steel", stackOf("Cu", "Ni"));
      if (!plan.allowed) throw new Error(plan.why);
      expect(sourcesFor(plan.steps).length).toBeGreaterThan(0);
      const strong = cautionsFor(plan.steps, "steel", "after-final-plate").map(isStopCaution);
      expect(strong.lastIndexOf(true)).toBeLessThan(strong.indexOf(false));
    }
  });

  it("warns of hydrogen on steel, and keeps that off brass", () => {
    const words = (baseMetal: BaseMetal) => {
      const plan = planStrip("electrolytic", baseMetal, stackOf("Cu", "Ni"));
      return plan.allowed ? cautionsFor(plan.steps, baseMetal, "after-final-plate").join(" ") : plan.why;
    };
    expect(words("steel")).toMatch(/brittle/);
    expect(words("iron")).toMatch(/brittle/);
    expect(words("brass")).toMatch(/Never let acid meet cyanide/);
    expect(words("brass")).not.toMatch(/brittle/);
  });
});

describe("the table of strips", () => {
  it("has a source for every solution and every rate, and rates that run upward from above 0", () => {
    for (const row of DISSOLVING_ROWS) {
      expect(row.source.length, row.id).toBeGreaterThan(10);
      expect(row.rateSource.length, row.id).toBeGreaterThan(5);
      for (const { low, likely, high } of [row.rateUmPerMin, row.holdingGPerL]) {
        expect(low, row.id).toBeGreaterThan(0);
        expect(likely, row.id).toBeGreaterThanOrEqual(low);
        expect(high, row.id).toBeGreaterThanOrEqual(likely);
      }
    }
    expect(POLISHING_ROW.source).toMatch(/from memory/);
    expect(new Set(DISSOLVING_ROWS.map((row) => row.id)).size).toBe(DISSOLVING_ROWS.length);
  });

  it("takes nothing off faster than Faraday's law lets a current: µm/h per A/dm² of Ni 12.3, Ag 38.4, Au 38.0, Cr(VI) 4.5, Sn 30.3", () => {
    const most: Record<string, number> = {
      "nickel-sulfuric-anodic": (12.3 * 5) / 60,
      "silver-cyanide-anodic": 38.4 / 60,
      "gold-thiourea-anodic": 38.1 / 60,
      "chromium-caustic": (4.5 * 5) / 60,
      "tin-caustic-anodic": (30.3 * 3) / 60,
    };
    for (const [id, rate] of Object.entries(most)) {
      const row = DISSOLVING_ROWS.find((one) => one.id === id);
      expect(row?.rateUmPerMin.high, id).toBeLessThan(rate);
      // Six tenths of it is the most that is reached in practice.
      expect(row?.rateUmPerMin.high, id).toBeCloseTo(rate * 0.6, 2);
    }
  });
});
