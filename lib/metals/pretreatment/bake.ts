/** The bake of high-strength steel after plating, against hydrogen. */
import { requirePositive } from "@/lib/input-error";

/** One step of the table: from just above `overMPa` to `toMPa`. */
export interface BakeStep {
  overMPa: number;
  toMPa: number;
  hours: number;
}

/** ASTM B850 (ISO 9588 is its equal), Table 1, as a public bake chart quotes it: 190 to 220 °C, at least these hours. */
export const BAKE_STEPS: readonly BakeStep[] = [
  { overMPa: 1000, toMPa: 1100, hours: 8 },
  { overMPa: 1100, toMPa: 1200, hours: 10 },
  { overMPa: 1200, toMPa: 1300, hours: 12 },
  { overMPa: 1300, toMPa: 1400, hours: 14 },
  { overMPa: 1400, toMPa: 1500, hours: 16 },
  { overMPa: 1500, toMPa: 1600, hours: 18 },
  { overMPa: 1600, toMPa: 1700, hours: 20 },
  { overMPa: 1700, toMPa: 1800, hours: 22 },
];

/** Oven temperature of that table, °C. */
export const BAKE_TEMP_C = { low: 190, high: 220 } as const;

export type Bake =
  /** The table asks for none. An engineer may still. */
  | { asks: "none" }
  | { asks: "bake"; leastHours: number; lowTempC: number; highTempC: number }
  /** Stronger than the table goes: an engineer sets it. */
  | { asks: "engineer" };

/**
 * How long a plated steel part of this tensile strength stays in the oven at the least. Advice: an engineer sets the bake.
 * @param tensileMPa tensile strength, above 0
 * @throws InputError when it is no positive number
 * Source: ASTM B850, Table 1.
 * @example bakeHours(1250) // { asks: "bake", leastHours: 12, lowTempC: 190, highTempC: 220 }
 */
export function bakeHours(tensileMPa: number): Bake {
  requirePositive("tensileMPa", tensileMPa, Number.MAX_VALUE);
  const step = BAKE_STEPS.find(({ overMPa, toMPa }) => tensileMPa > overMPa && tensileMPa <= toMPa);
  if (step) return { asks: "bake", leastHours: step.hours, lowTempC: BAKE_TEMP_C.low, highTempC: BAKE_TEMP_C.high };
  return tensileMPa > 1000 ? { asks: "engineer" } : { asks: "none" };
}
