import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/input-error";
import { waterDensityGPerCm3 } from "@/lib/metals/water-density";
import { readTable } from "@/tests/fixtures/reference/read-table";

// Tanaka and others, Metrologia 38 (2001) 301, and Kell, J. Chem. Eng. Data 20 (1975) 97, in kg/m³ to four places.
const rows = readTable("water_density.csv").map((row) => ({
  tempC: Number(row.temp_C),
  tanaka: Number(row.tanaka2001_kg_m3),
  kell: Number(row.kell1975_kg_m3),
}));

describe("density of water", () => {
  it("is the CIPM formula's at each of thirteen temperatures, to its last printed place", () => {
    expect(rows).toHaveLength(13);
    for (const { tempC, tanaka } of rows) {
      expect(Math.abs(waterDensityGPerCm3(tempC) * 1000 - tanaka), `${tempC} °C`).toBeLessThan(0.00006);
    }
  });

  it("agrees with the older equation of Kell to 0.005 kg/m³", () => {
    for (const { tempC, kell } of rows) {
      expect(Math.abs(waterDensityGPerCm3(tempC) * 1000 - kell), `${tempC} °C`).toBeLessThan(0.005);
    }
  });

  it("is greatest just below 4 °C", () => {
    const densest = waterDensityGPerCm3(3.983035);
    for (const tempC of [0, 3, 3.9, 4.1, 5, 40]) expect(waterDensityGPerCm3(tempC)).toBeLessThan(densest);
  });

  it("is refused outside 0 to 40 °C, where the formula does not hold", () => {
    for (const tempC of [-0.1, 40.1, 1e308, NaN, -Infinity]) {
      expect(() => waterDensityGPerCm3(tempC), String(tempC)).toThrow(InputError);
      expect(() => waterDensityGPerCm3(tempC)).toThrow(/^waterTempC: .* from 0 to 40/);
    }
  });
});
