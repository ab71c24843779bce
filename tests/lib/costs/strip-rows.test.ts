import { describe, expect, it } from "vitest";
import { BASE_METALS } from "@/lib/cases/case-words";
import { HARDNESS } from "@/lib/costs/hardness";
import { DISSOLVING_ROWS, POLISHING_ROW } from "@/lib/costs/strip-method-rows";
import { STRIP_METHODS } from "@/lib/costs/strip-methods";
import { planStrip } from "@/lib/costs/strip-plan";
import { DEPOSIT_METALS, type DepositMetal } from "@/lib/plating/metals";
import { readTable } from "@/tests/fixtures/reference/read-table";

/** Which row answers each line of the published table, in its order; null: polishing, or no bath at all. */
const ANSWERS = [
  "chromium-hydrochloric",
  "chromium-caustic",
  "chromium-carbonate",
  "nickel-sulfuric-anodic",
  "nickel-copper-cyanide",
  "nickel-copper-nitric",
  "nickel-copper-amine-anodic",
  "stainless-nitric",
  "copper-chromic",
  "copper-persulfate",
  "silver-cyanide-anodic",
  "gold-cyanide-peroxide",
  "gold-thiourea-anodic",
  "palladium-cyanide",
  "rhodium-lift-anodic",
  "zinc-hydrochloric",
  "tin-caustic-anodic",
  null,
] as const;

const SYMBOLS: Record<string, DepositMetal[]> = {
  chromium: ["Cr"],
  nickel: ["Ni"],
  "nickel and copper": ["Ni", "Cu"],
  "nickel, copper, bronze": ["Ni", "Cu"],
  "most deposits": ["Ni", "Cu", "Ag"],
  copper: ["Cu"],
  "copper strike": ["Cu"],
  silver: ["Ag"],
  gold: ["Au"],
  palladium: ["Pd"],
  rhodium: ["Rh"],
  zinc: ["Zn"],
  tin: ["Sn"],
};

describe("the ways that ship, against the published table of strips", () => {
  const lines = readTable("strip_methods.csv");

  it("hold every line of it: deposit, kind, temperature, and the part metals that it is for", () => {
    expect(lines).toHaveLength(ANSWERS.length);
    for (const [index, line] of lines.entries()) {
      const row = DISSOLVING_ROWS.find((each) => each.id === ANSWERS[index]);
      if (ANSWERS[index] === null) {
        expect(line.method).toBe("polish back");
        continue;
      }
      if (!row) throw new Error(`No row ${ANSWERS[index]}.`);
      expect(row.takesOff, row.id).toEqual(expect.arrayContaining(SYMBOLS[line.deposit ?? ""] ?? ["nothing"]));
      if (line.method === "chemical" || line.method === "electrolytic") expect(row.method, row.id).toBe(line.method);
      const [low, high] = (line.temperature_C ?? "").split("-").map(Number);
      expect(row.bathTempC[0], row.id).toBeGreaterThanOrEqual(low ?? NaN);
      expect(row.bathTempC[1], row.id).toBeLessThanOrEqual(high ?? NaN);
    }
  });

  it("say of every figure whether it is published or from memory", () => {
    for (const [index, line] of lines.entries()) {
      const row = DISSOLVING_ROWS.find((each) => each.id === ANSWERS[index]);
      if (row && line.seen_in === "from memory") expect(row.source, row.id).toMatch(/from memory/);
      // A site that the table names is named beside the row.
      const site = /[a-z]+\.com(\/\d+\/\d+)?/.exec(line.seen_in ?? "")?.[0];
      if (row && site) expect(row.source, row.id).toContain(site);
    }
  });
});

describe("every deposit on every base metal", () => {
  it("is offered or refused with a reason, by every way, and can always be polished", () => {
    let offered = 0;
    for (const metal of DEPOSIT_METALS) {
      for (const baseMetal of BASE_METALS) {
        for (const method of STRIP_METHODS) {
          const plan = planStrip(method, baseMetal, [{ metal, thicknessUm: 3 }]);
          if (plan.allowed) offered += 1;
          else expect(plan.why, `${metal} on ${baseMetal} by ${method}`).toMatch(/^(It attacks|Nobody|No |It works)/);
          if (method === "polish-back") expect(plan.allowed).toBe(true);
        }
      }
    }
    expect(offered).toBeGreaterThan(DEPOSIT_METALS.length * BASE_METALS.length);
  });

  it("has a bath for each deposit that the shop lays, on the base metals on which it can be had", () => {
    for (const metal of ["Cu", "Ni", "Cr", "Ag", "Au", "Pd", "Zn", "Sn", "Cd"] as const) {
      const baths = STRIP_METHODS.filter(
        (method) => method !== "polish-back" && planStrip(method, "steel", [{ metal, thicknessUm: 3 }]).allowed,
      );
      expect(baths.length, metal).toBeGreaterThan(0);
    }
  });

  it("no row vouches for a base metal without a name", () => {
    for (const row of DISSOLVING_ROWS) expect(row.safeOn, row.id).not.toContain("other");
  });
});

describe("polishing time", () => {
  it("goes by the published hardness of the deposit", () => {
    const published = readTable("deposit_hardness.csv");
    const rangeOf = (name: string) => {
      const lines = published.filter((line) => line.deposit?.startsWith(name));
      return [Math.min(...lines.map((line) => Number(line.HV_low))), Math.max(...lines.map((line) => Number(line.HV_high)))] as const; // prettier-ignore
    };
    const named = [
      ["Ni", "nickel, Watts"],
      ["Cu", "copper, acid or cyanide"],
      ["Ag", "silver"],
      ["Pd", "palladium"],
      ["Rh", "rhodium"],
      ["Zn", "zinc"],
      ["Sn", "tin"],
    ] as const;
    for (const [metal, name] of named) {
      const [low, high] = rangeOf(name);
      expect([HARDNESS[metal].hv.low, HARDNESS[metal].hv.high], metal).toEqual([low, high]);
    }
    // Soft to hard gold (ASTM B488 codes A to C), micro-cracked to typical hard chromium.
    expect([HARDNESS.Au.hv.low, HARDNESS.Au.hv.high]).toEqual([40, 200]);
    expect([HARDNESS.Cr.hv.low, HARDNESS.Cr.hv.high]).toEqual([800, 1100]);
    expect(POLISHING_ROW.source).toMatch(/from memory/);
  });
});
