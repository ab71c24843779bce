/** Conversions: 1 mil is 25.4 µm and 1 in² is 0.064516 dm², exact (NIST Handbook 44, appendix C). */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readStrip } from "@/lib/costs/read-strip";
import { EMPTY_STRIP, queryOf, STRIP_FIELDS, typedFrom, type StripTyped } from "@/lib/costs/strip-address";
import { STRIP_QUERY_NAMES, stripAddress } from "@/lib/costs/strip-address.schema";
import { changeStack, withAreaUnit, withThicknessUnit } from "@/lib/costs/strip-typing";

const open = (address: string) => {
  const search = new URLSearchParams(address);
  const raw = Object.fromEntries([...new Set(search.keys())].map((name) => [name, search.getAll(name)]));
  return typedFrom(stripAddress.parse(raw), EMPTY_STRIP);
};
const read = (address: string) => readStrip(open(address));
const SHELLS =
  "metal1=Cu&thickness1=1&metal2=Ni&thickness2=5&metal3=Au&thickness3=0.6&to3=1.2&parts=12&area=0.62&value=610&base=brass";

describe("the estimator's address", () => {
  it("empty: one part with the usual strike and 5 µm of nickel, and no value", () => {
    const { batch, faults } = read("");
    expect(faults).toEqual({});
    expect(batch).toMatchObject({ quantity: 1, areaDm2: 1, partValueCents: undefined });
    expect(batch?.stack).toEqual([
      { metal: "Cu", thicknessUm: 0.5 },
      { metal: "Ni", thicknessUm: 5 },
    ]);
  });

  it("holds a whole batch, layers from the base out, a range with its middle as likely", () => {
    expect(read(SHELLS).batch).toMatchObject({
      quantity: 12,
      areaDm2: 0.62,
      partValueCents: 61_000,
      baseMetal: "brass",
      stageFound: "after-final-plate",
      stack: [
        { metal: "Cu", thicknessUm: 1 },
        { metal: "Ni", thicknessUm: 5 },
        { metal: "Au", thicknessUm: expect.closeTo(0.9, 10), thicknessLowUm: 0.6, thicknessHighUm: 1.2 },
      ],
    });
  });

  it("says the same after a round through the fields", () => {
    const typed = open(SHELLS);
    expect(open(new URLSearchParams(queryOf(typed)).toString())).toEqual(typed);
  });

  it("keeps the case it came from, and that its value was cleared", () => {
    const query = queryOf({ ...EMPTY_STRIP, value: "" }, { case: "CT-2607-0042" });
    expect(query).toMatchObject({ case: "CT-2607-0042", value: "" });
    expect(typedFrom(stripAddress.parse(query), { ...EMPTY_STRIP, value: "610" }).value).toBe("");
  });

  it("takes mil and in²", () => {
    const { batch } = read("metal1=Cu&thickness1=0.2&thicknessUnit=mil&area=10&areaUnit=in2");
    expect(batch?.stack[0]?.thicknessUm).toBeCloseTo(5.08, 10);
    expect(batch?.areaDm2).toBeCloseTo(0.64516, 10);
  });

  it("works the area out from a shape, in cm or inches", () => {
    expect(read("shape=plate&length=10&width=5").batch?.areaDm2).toBeCloseTo(1, 10);
    // 2 × 1 × 1 in² = 2 in².
    expect(read("shape=plate&length=1&width=1&lengthUnit=in").batch?.areaDm2).toBeCloseTo(0.129032, 10);
  });
});

describe("a mistyped address", () => {
  it.each([
    ["parts=0", "parts"],
    ["parts=twelve", "parts"],
    ["parts=1.5", "parts"],
    ["parts=100001", "parts"],
    ["area=", "area"],
    ["area=-1", "area"],
    ["area=1e308", "area"],
    ["area=10001", "area"],
    ["value=x", "value"],
    ["value=-5", "value"],
    ["base=unobtainium", "base"],
    ["found=tomorrow", "found"],
    ["shape=blob", "shape"],
    ["shape=rod&diameter=2", "length"],
    ["shape=tube&diameter=2&inside=3&length=5", "inside"],
    ["metal1=Xx&thickness1=1", "metal1"],
    ["metal1=Cu&thickness1=0", "thickness1"],
    ["metal1=Cu&thickness1=abc", "thickness1"],
    ["metal1=Cu&thickness1=1001", "thickness1"],
    ["metal1=Cu&thickness1=2&to1=1", "to1"],
    ["metal1=Cu&thickness1=1&metal3=Ni&thickness3=5", "metal2"],
    ["metal1=Au&thickness1=1&metal2=Ni&thickness2=5", "stack"],
  ])("%s names the field %s and gives no batch", (address, field) => {
    const { batch, faults } = read(address);
    expect(batch).toBeNull();
    expect(faults[field]).toMatch(/^[A-Z].*\.$/);
  });

  it("keeps what was typed beside the fault", () => {
    const typed = open("area=about+one&metal1=Cu&thickness1=thin");
    expect(typed).toMatchObject({ area: "about one", layers: [{ metal: "Cu", thickness: "thin" }] });
  });

  it("names every field that is wrong at once", () => {
    expect(Object.keys(read("parts=0&area=x&base=?").faults)).toEqual(
      expect.arrayContaining(["parts", "area", "base"]),
    );
  });

  it("thirteen layers are one too many", () => {
    const layers = Array.from({ length: 13 }, (_, index) => `metal${index + 1}=Cu&thickness${index + 1}=1`).join("&");
    expect(read(layers).faults.stack).toBe("List at most 12 layers.");
  });

  it("a way that is not known leaves the figures standing", () => {
    const { batch, faults } = read("way=magic");
    expect(batch?.method).toBeUndefined();
    expect(faults.way).toBeDefined();
  });

  it("whatever it says, reading it never throws", () => {
    const value = fc.oneof(
      fc.string(),
      fc.array(fc.string()),
      fc.constantFrom(undefined, "1", "Cu", "-1", "1e308", "NaN"),
    );
    const query = fc.dictionary(fc.constantFrom(...STRIP_QUERY_NAMES), value);
    fc.assert(
      fc.property(query, (raw) => {
        const { batch, faults } = readStrip(typedFrom(stripAddress.parse(raw), EMPTY_STRIP));
        expect(batch !== null || Object.keys(faults).length > 0).toBe(true);
      }),
    );
  });

  it("a number where a text belongs, and names nobody knows, are passed over", () => {
    expect(stripAddress.parse({ parts: 12, nonsense: "x", area: [] })).toEqual({});
  });
});

describe("pressing beside the stack", () => {
  const metals = (typed: StripTyped) => typed.layers.map((layer) => layer.metal).join(" ");

  it("adds what most often comes next, takes the top one off, and stops at one and at twelve layers", () => {
    expect(metals(changeStack(EMPTY_STRIP, "add"))).toBe("Cu Ni Au");
    expect(metals(changeStack(EMPTY_STRIP, "off"))).toBe("Cu");
    expect(metals(changeStack(changeStack(EMPTY_STRIP, "off"), "off"))).toBe("Cu");
    let full = EMPTY_STRIP;
    for (let press = 0; press < 20; press += 1) full = changeStack(full, "add");
    expect(full.layers).toHaveLength(12);
  });

  it("moves a layer one place down, and the lowest one nowhere", () => {
    expect(metals(changeStack(EMPTY_STRIP, "down-2"))).toBe("Ni Cu");
    expect(changeStack(EMPTY_STRIP, "down-1")).toEqual(EMPTY_STRIP);
    expect(changeStack(EMPTY_STRIP, "down-99")).toEqual(EMPTY_STRIP);
    expect(changeStack(EMPTY_STRIP, "up")).toEqual(EMPTY_STRIP);
  });

  it("another unit keeps the thickness and leaves what is no number", () => {
    const inMil = withThicknessUnit(
      { ...EMPTY_STRIP, layers: [{ metal: "Ni", thickness: "25.4", to: "thick" }] },
      "mil",
    );
    expect(inMil.layers[0]).toEqual({ metal: "Ni", thickness: "1", to: "thick" });
    expect(withAreaUnit({ ...EMPTY_STRIP, area: "0.6452" }, "in2").area).toBe("10.0006");
  });
});

it("the address knows every field of the form", () => {
  expect(STRIP_QUERY_NAMES).toEqual(expect.arrayContaining([...STRIP_FIELDS]));
});
