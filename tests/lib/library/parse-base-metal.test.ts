import { describe, expect, it } from "vitest";
import { BASE_METAL_TITLES, BASE_METALS } from "@/lib/cases/case-words";
import { ALLOY_NAMES } from "@/lib/library/alloy-names";
import { parseBaseMetal } from "@/lib/library/parse-base-metal";

describe("a base metal as people type it", () => {
  it("is known by our word, its title and every alloy name, each of one metal only", () => {
    for (const metal of BASE_METALS) {
      for (const name of [metal, BASE_METAL_TITLES[metal], ...ALLOY_NAMES[metal]]) {
        expect(parseBaseMetal(name), name).toBe(metal);
        expect(parseBaseMetal(` ${name.toUpperCase()} `), name).toBe(metal);
      }
    }
  });

  // UNS, AISI and ASTM designations.
  it.each([
    ["zinc die cast", "zinc"],
    ["nickel silver", "nickel-silver"],
    ["Nickel_Silver", "nickel-silver"],
    ["C360", "brass"],
    ["Brass C360", "brass"],
    ["leaded brass, UNS C36000", "brass"],
    ["AISI 304", "stainless"],
    ["304 stainless steel", "stainless"],
    ["6061-T6", "aluminium"],
    ["C260 H02", "brass"],
    ["zamak 3", "zinc"],
    ["beryllium copper", "copper"],
  ])("%s is %s", (typed, metal) => {
    expect(parseBaseMetal(typed)).toBe(metal);
  });

  it("is refused when it names none, or two", () => {
    for (const typed of ["", "wood", "T6", "alloy", "steel brass", "nickel plated steel", "brassy", "constructor"]) {
      expect(() => parseBaseMetal(typed), typed).toThrow(expect.objectContaining({ field: "baseMetal" }));
    }
  });
});
