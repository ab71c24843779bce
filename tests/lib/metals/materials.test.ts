import { describe, expect, it } from "vitest";
import { BASE_METALS } from "@/lib/cases/case-words";
import { MATERIALS } from "@/lib/metals/materials";
import { PUBLISHED } from "./weighings";

/** Our word for the table's family, where it is not the same. */
const BASE_METAL_OF: Record<string, string> = {
  "nickel silver": "nickel-silver",
  "nickel alloy": "nickel",
  tin: "pewter",
  ...Object.fromEntries(
    ["titanium", "magnesium", "lead", "platinum", "palladium", "tungsten"].map((family) => [family, "other"]),
  ),
};
const PULL_OF: Record<string, string[]> = {
  none: ["none"],
  strong: ["strong"],
  "strong below 358 C": ["strong"],
  weak: ["faint"],
  "none to weak": ["none", "faint"],
  "none to weak (rises with cold work)": ["none", "faint"],
};

describe("the table of metals", () => {
  it("holds the 47 published materials, each with its figures, magnet and colour", () => {
    expect(MATERIALS).toHaveLength(47);
    expect(MATERIALS.map((each) => each.name)).toEqual(PUBLISHED.map((row) => row.material));
    for (const [at, row] of PUBLISHED.entries()) {
      expect(MATERIALS[at], row.material).toMatchObject({
        lowGPerCm3: row.low,
        typicalGPerCm3: row.typical,
        highGPerCm3: row.high,
        baseMetal: BASE_METAL_OF[row.family] ?? row.family,
        pull: PULL_OF[row.magnet],
        colour: row.colour,
      });
    }
  });

  it("names each row's source, and says from memory where it is", () => {
    for (const [at, row] of PUBLISHED.entries()) {
      const source = MATERIALS[at]?.source ?? "";
      expect(source.startsWith(row.source.replace("lb/in3", "lb/in³")), row.material).toBe(true);
      expect(/from memory/.test(source), row.material).toBe(row.fromMemory);
    }
  });

  it("puts the typical density within the range, and knows every base metal of the shop", () => {
    for (const { name, lowGPerCm3, typicalGPerCm3, highGPerCm3 } of MATERIALS) {
      expect(lowGPerCm3 <= typicalGPerCm3 && typicalGPerCm3 <= highGPerCm3 && lowGPerCm3 < highGPerCm3, name).toBe(
        true,
      );
    }
    expect(new Set(MATERIALS.map((each) => each.baseMetal))).toEqual(new Set(BASE_METALS));
  });
});
