import { InputError } from "@/lib/input-error";

export const WATER_DENSITY_SOURCE = "Water: Tanaka and others, Metrologia 38 (2001) 301 (the CIPM formula)";

/** The conventional density of air by which balances are set. Local air is within 10 % of it, which moves a metal's density by less than 0.02 %. */
export const AIR_DENSITY_G_PER_CM3 = 0.0012;
export const AIR_DENSITY_SOURCE = "Air: 1.2 kg/m³, the conventional value of OIML R 111";

/** Where the formula holds. */
export const WATER_TEMP_C = { lowest: 0, highest: 40 } as const;

/**
 * Density in g/cm³ of clean, air-free water at `tempC` (0 to 40 °C) and ordinary pressure.
 * Throws `InputError` (field waterTempC) outside. Source: Tanaka and others, Metrologia 38 (2001) 301.
 *
 * Example: `waterDensityGPerCm3(20)` is 0.9982067.
 */
export function waterDensityGPerCm3(tempC: number): number {
  const { lowest, highest } = WATER_TEMP_C;
  // Negated, so that NaN is refused too.
  if (!(tempC >= lowest && tempC <= highest)) {
    throw new InputError("waterTempC", `Give the water's temperature in °C, from ${lowest} to ${highest}.`);
  }
  const fromDensest = tempC - 3.983035;
  const kgPerM3 = 999.97495 * (1 - (fromDensest ** 2 * (tempC + 301.797)) / (522528.9 * (tempC + 69.34881)));
  return kgPerM3 / 1000;
}
