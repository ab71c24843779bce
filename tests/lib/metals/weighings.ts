import { readTable } from "@/tests/fixtures/reference/read-table";

/** Conventional air, OIML R 111, and water at 20 °C, Tanaka 2001: g/cm³. */
const AIR = 0.0012;
const WATER_AT_20 = 0.9982067;

/** What a balance shows for a solid part of that density in air and in water of 20 °C: weight less the lift of what it displaces. */
export function weighingOf(densityGPerCm3: number, weightAirG = 500) {
  const volumeCm3 = weightAirG / (densityGPerCm3 - AIR);
  return { weightAirG, weightWaterG: weightAirG - volumeCm3 * (WATER_AT_20 - AIR), waterTempC: 20 };
}

/** The published table of densities: handbook and trade values, each row with its source. */
export const PUBLISHED = readTable("densities.csv").map((row) => ({
  material: row.material ?? "",
  family: row.family ?? "",
  low: Number(row.low_g_cm3),
  typical: Number(row.typical_g_cm3),
  high: Number(row.high_g_cm3),
  magnet: row.magnet ?? "",
  colour: row.colour ?? "",
  source: row.source ?? "",
  fromMemory: /from memory/.test(`${row.source} ${row.seen_in}`),
}));

/** The published typical density of a material, g/cm³. */
export function published(material: string): number {
  const row = PUBLISHED.find((each) => each.material === material);
  if (!row) throw new Error(`The table has no ${material}.`);
  return row.typical;
}
