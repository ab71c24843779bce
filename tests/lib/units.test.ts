import fc from "fast-check";
import { describe, expect, it } from "vitest";
import * as units from "@/lib/units";

describe("units of the trade", () => {
  it("convert as NIST Handbook 44, appendix C, prints them", () => {
    expect(units.fahrenheitToC(212)).toBe(100);
    expect(units.fahrenheitToC(130)).toBeCloseTo(54.444, 3);
    expect(units.celsiusToF(-40)).toBe(-40);
    expect(units.milToUm(1)).toBe(25.4);
    expect(units.squareInchToDm2(1)).toBe(0.064516);
    expect(units.troyOunceToG(1)).toBe(31.1034768);
    expect(units.ozPerGallonToGPerL(1)).toBeCloseTo(7.489, 3);
    expect(units.aDm2ToAsf(1)).toBeCloseTo(9.290304, 9);
  });

  it("agree with a bath sheet that gives both: 7 oz/gal is 52 g/L, 9 oz/gal is 67 g/L (pfonline.com stripping-nickel-chrome)", () => {
    expect(Math.round(units.ozPerGallonToGPerL(7))).toBe(52);
    expect(Math.round(units.ozPerGallonToGPerL(9))).toBe(67);
  });

  it("come back to where they started", () => {
    fc.assert(
      fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), (value) => {
        const near = (back: number) =>
          expect(Math.abs(back - value)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(value)));
        near(units.celsiusToF(units.fahrenheitToC(value)));
        near(units.umToMil(units.milToUm(value)));
        near(units.dm2ToSquareInch(units.squareInchToDm2(value)));
        near(units.gToTroyOunce(units.troyOunceToG(value)));
        near(units.aDm2ToAsf(units.asfToADm2(value)));
        near(units.gPerLToOzPerGallon(units.ozPerGallonToGPerL(value)));
      }),
    );
  });
});
