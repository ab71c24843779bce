import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { CHECK_KINDS, checkWords, differenceWords, readCheck, UNIT_SYSTEMS } from "@/lib/plating/window-units";

describe("a reading as the shop writes it", () => {
  it("is understood in either unit: 130 °F is 54.4 °C (trade guide's set point), 15 A/ft² is 1.61 A/dm² (1 ft = 3.048 dm)", () => {
    for (const typed of ["130 °F", "130F", "130 f"]) expect(readCheck("bathTempC", typed)).toBeCloseTo(54.444, 3);
    for (const typed of ["15 A/ft²", "15 asf", "15 a/ft2"])
      expect(readCheck("currentDensityADm2", typed)).toBeCloseTo(15 / 3.048 ** 2, 12);
    expect(readCheck("voltageV", "1.1 V")).toBe(1.1);
    expect(readCheck("voltageV", "1,1 volts")).toBe(1.1);
    expect(readCheck("secondsToDeposit", "48 s")).toBe(48);
  });

  it("without a unit is in the shop's own", () => {
    expect(readCheck("bathTempC", "54")).toBe(54);
    expect(readCheck("bathTempC", "212", "us")).toBe(100);
  });

  it("is stated in the units that the shop reads, a difference without the zero point", () => {
    expect(checkWords("bathTempC", 54.444, "us")).toBe("130 °F");
    expect(checkWords("bathTempC", 54.444)).toBe("54.4 °C");
    expect(checkWords("currentDensityADm2", 1, "us")).toBe("9.29 A/ft²");
    expect(checkWords("voltageV", 1.1, "us")).toBe("1.1 V");
    expect(differenceWords("bathTempC", 5, "us")).toBe("9 °F");
    expect(differenceWords("bathTempC", -5)).toBe("5 °C");
  });

  it("survives being stated and read again, to three figures", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...CHECK_KINDS),
        fc.constantFrom(...UNIT_SYSTEMS),
        fc.double({ min: 1, max: 90, noNaN: true }),
        (kind, system, value) => {
          const again = readCheck(kind, checkWords(kind, value, system), system);
          expect(Math.abs(again - value)).toBeLessThanOrEqual(0.006 * (value + 32));
        },
      ),
    );
  });

  it("is refused by name when it is none, or in another thing's unit, with what to write", () => {
    for (const typed of ["", "warm", "1e308 V", "130 V", "--3", "1/2"]) {
      expect(() => readCheck("bathTempC", typed)).toThrow(
        expect.objectContaining({ field: "bathTempC", problem: "Give a number in °C or °F, such as 54 °C." }),
      );
    }
  });
});
