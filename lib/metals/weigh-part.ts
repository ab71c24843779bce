import { InputError, requirePositive } from "@/lib/input-error";
import { AIR_DENSITY_G_PER_CM3, waterDensityGPerCm3 } from "@/lib/metals/water-density";

/** One part on the balance, dry in air and then hung in water. */
export interface Weighing {
  weightAirG: number;
  weightWaterG: number;
  waterTempC: number;
  /** How far one reading of the balance may be off, as one standard deviation. */
  balanceErrorG?: number;
}

export interface MeasuredDensity {
  densityGPerCm3: number;
  /** Half width of the 95 % range: the true density lies within density ± this, as far as the balance goes. */
  uncertaintyGPerCm3: number;
  waterDensityGPerCm3: number;
}

/** A bench balance that shows hundredths of a gram, from memory. */
export const DEFAULT_BALANCE_ERROR_G = 0.01;
export const HEAVIEST_PART_G = 1e6;
/** 95 %, JCGM 100 (GUM), 6.2 and annex G. */
const COVERAGE_FACTOR = 2;

/**
 * Density of a solid part by weighing it in air and in water, with the lift of the air taken into account:
 * ρ = (ρ_water·W_air − ρ_air·W_water) / (W_air − W_water). Weights in g, above 0 and at most 1 t; water 0 to 40 °C.
 * The uncertainty holds the balance alone, both readings alike (JCGM 100, first-order propagation, coverage factor 2).
 * Throws `InputError` naming the field: a part that weighs no less in water, one that floats, a balance too coarse.
 *
 * Example: 8.63 g in air and 7.80 g in water of 20 °C is 10.37 g/cm³.
 */
export function measureDensity(weighing: Weighing): MeasuredDensity {
  const { weightAirG, weightWaterG, waterTempC, balanceErrorG = DEFAULT_BALANCE_ERROR_G } = weighing;
  requirePositive("weightAirG", weightAirG, HEAVIEST_PART_G);
  requireSinks(weightWaterG);
  requirePositive("balanceErrorG", balanceErrorG, HEAVIEST_PART_G);
  const water = waterDensityGPerCm3(waterTempC);
  if (weightWaterG >= weightAirG) {
    throw new InputError(
      "weightWaterG",
      "In water the part must weigh less than in air. Swap the two, or weigh again.",
    );
  }
  const liftG = weightAirG - weightWaterG;
  requireTellingLift(liftG, balanceErrorG);

  // Divided before multiplied, so that very small and very large parts neither overflow nor vanish.
  const airShare = weightAirG / liftG;
  const waterShare = weightWaterG / liftG;
  const densityGPerCm3 = water * airShare - AIR_DENSITY_G_PER_CM3 * waterShare;
  // ∂ρ/∂W_air = −W_water·(ρ_water − ρ_air)/lift², ∂ρ/∂W_water = W_air·(ρ_water − ρ_air)/lift².
  const perReading = (water - AIR_DENSITY_G_PER_CM3) * (balanceErrorG / liftG);
  const uncertaintyGPerCm3 = COVERAGE_FACTOR * perReading * Math.hypot(airShare, waterShare);
  if (!Number.isFinite(densityGPerCm3) || !Number.isFinite(uncertaintyGPerCm3)) {
    throw new InputError("weightWaterG", "These weights give no density that can be written down. Weigh again.");
  }
  return { densityGPerCm3, uncertaintyGPerCm3, waterDensityGPerCm3: water };
}

function requireSinks(weightWaterG: number): void {
  if (typeof weightWaterG === "number" && weightWaterG <= 0) {
    throw new InputError(
      "weightWaterG",
      "A part that weighs nothing in water floats: it is hollow or holds air, and cannot be told by weighing. Give a number above 0.",
    );
  }
  requirePositive("weightWaterG", weightWaterG, HEAVIEST_PART_G);
}

/** The difference carries both readings' errors, √2 of one. Within twice that, the part may have no weight in it at all. */
function requireTellingLift(liftG: number, balanceErrorG: number): void {
  if (liftG > COVERAGE_FACTOR * Math.SQRT2 * balanceErrorG) return;
  throw new InputError(
    "balanceErrorG",
    "The two weights differ by no more than this balance can be off. Weigh a heavier part, several parts at once, or use a finer balance.",
  );
}
