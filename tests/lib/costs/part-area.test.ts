/**
 * Expected areas are worked by hand from the formulas of plane and solid geometry with π = 3.14159265 (CRC Standard
 * Mathematical Tables, mensuration formulas); no figure comes from the code.
 */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { AREA_FORMULAS, AREA_SHAPES, LENGTHS_OF, partAreaDm2, type SimpleShape } from "@/lib/costs/part-area";
import { InputError } from "@/lib/input-error";

const SHAPES = AREA_SHAPES.filter((shape): shape is SimpleShape => shape !== "typed");

describe("the area of a simple shape", () => {
  it("a plate of 10 × 5 cm has two faces of 50 cm²: 1 dm²", () => {
    expect(partAreaDm2("plate", { length: 10, width: 5 })).toBeCloseTo(1, 12);
  });

  it("a rod of 2 cm by 10 cm: mantle 62.8319 cm² and two ends of 3.14159 cm² are 0.69115 dm²", () => {
    expect(partAreaDm2("rod", { diameter: 2, length: 10 })).toBeCloseTo(0.691150384, 8);
  });

  it("a tube of 3 cm, 2 cm inside, 10 cm: 94.2478 out, 62.8319 in, two rims of 3.92699 are 1.649336 dm²", () => {
    expect(partAreaDm2("tube", { diameter: 3, inside: 2, length: 10 })).toBeCloseTo(1.64933614, 7);
  });

  it("a box of 4 × 3 × 2 cm: 12, 8 and 6 cm², each twice, are 0.52 dm²", () => {
    expect(partAreaDm2("box", { length: 4, width: 3, height: 2 })).toBeCloseTo(0.52, 12);
  });

  it("a disc of 10 cm has two faces of 78.5398 cm²: 1.570796 dm²", () => {
    expect(partAreaDm2("disc", { diameter: 10 })).toBeCloseTo(1.570796327, 8);
  });

  it("a ball of 10 cm has 314.159 cm²: 3.141593 dm²", () => {
    expect(partAreaDm2("sphere", { diameter: 10 })).toBeCloseTo(3.141592654, 8);
  });
});

describe("areas hang together", () => {
  const length = fc.double({ min: 0.01, max: 500, noNaN: true });
  const lengths = fc.record({ length, width: length, height: length, diameter: length, inside: length });

  it("twice as long every way is four times the area, for every shape", () => {
    fc.assert(
      fc.property(fc.constantFrom(...SHAPES), lengths, (shape, drawn) => {
        const given = { ...drawn, inside: Math.min(drawn.inside, drawn.diameter * 0.99) };
        const doubled = Object.fromEntries(Object.entries(given).map(([name, cm]) => [name, cm * 2]));
        expect(partAreaDm2(shape, doubled) / partAreaDm2(shape, given)).toBeCloseTo(4, 9);
      }),
    );
  });

  it("a rod bored out gains the bore and loses its two ends", () => {
    const rod = partAreaDm2("rod", { diameter: 3, length: 10 });
    const tube = partAreaDm2("tube", { diameter: 3, inside: 2, length: 10 });
    // Bore π·2·10 cm²; two holes of π cm² in the ends.
    expect(tube - rod).toBeCloseTo((Math.PI * 20 - 2 * Math.PI) / 100, 10);
  });

  it("a cube as a box is six of its faces", () => {
    expect(partAreaDm2("box", { length: 3, width: 3, height: 3 })).toBeCloseTo(0.54, 12);
  });
});

describe("impossible lengths", () => {
  const fieldOf = (run: () => unknown) => {
    try {
      run();
    } catch (error) {
      return error instanceof InputError ? error.field : error;
    }
    return undefined;
  };

  it.each([NaN, 0, -1, Infinity, 1e308])("a length of %d is refused, by name", (bad) => {
    expect(fieldOf(() => partAreaDm2("plate", { length: bad, width: 5 }))).toBe("length");
    expect(fieldOf(() => partAreaDm2("sphere", { diameter: bad }))).toBe("diameter");
  });

  it("a missing length is refused, by name", () => {
    for (const shape of SHAPES) expect(fieldOf(() => partAreaDm2(shape, {}))).toBe(LENGTHS_OF[shape][0]);
  });

  it("a tube whose inside is not smaller than its outside is refused", () => {
    expect(fieldOf(() => partAreaDm2("tube", { diameter: 2, inside: 2, length: 10 }))).toBe("inside");
  });

  it("every shape has a formula that names each of its lengths", () => {
    const letters = { length: "l", width: "w", height: "h", diameter: "d", inside: "i" };
    for (const shape of SHAPES) {
      for (const name of LENGTHS_OF[shape]) expect(AREA_FORMULAS[shape]).toMatch(new RegExp(`\\b${letters[name]}`));
    }
  });
});
