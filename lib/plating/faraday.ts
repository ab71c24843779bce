import { InputError, requireBetween, requirePositive } from "@/lib/input-error";
import { metalOf, requireValence, type DepositMetal } from "@/lib/plating/metals";

/** Charge of one mole of electrons, C/mol. Exact since 2019: e × N_A (CODATA 2018 and 2022). */
export const FARADAY_C_PER_MOL = 96485.33212331001;

/** Limits of what a shop can mean; beyond them it is a slip of the keyboard. */
export const PLATE_LIMITS = {
  areaDm2: 1e9,
  thicknessUm: 1e4,
  currentA: 1e6,
  currentDensityADm2: 1e4,
  minutes: 1e6,
} as const;

/** Grams of metal from one dm² covered one µm thick is density × 0.01: 1 dm² × 1 µm = 0.01 cm³. */
const CM3_PER_DM2_UM = 0.01;

/** A metal, with the charge of its ion in this bath and, if the deposit's own density is known, that density. */
export interface Deposit {
  metal: DepositMetal;
  /** Left out: the usual one for the metal. */
  valence?: number;
  /** g/cm³. Left out: that of the solid metal. */
  densityGCm3?: number;
}

/**
 * Grams that one ampere-hour deposits when nothing of it is lost: 3600·M/(n·F). Source: Faraday's law.
 * Throws `InputError` for a valence that the metal is not plated with.
 *
 * Example: nickel, valence 2: 1.095 g/(A·h).
 */
export function equivalentGPerAh({ metal, valence }: Deposit): number {
  return (3600 * metalOf(metal).atomicMassGMol) / (requireValence(metal, valence) * FARADAY_C_PER_MOL);
}

/** Mass of a layer, g: area × thickness × density. Throws `InputError` when area or thickness is not above 0. */
export function layerMassG(deposit: Deposit, areaDm2: number, thicknessUm: number): number {
  requirePositive("areaDm2", areaDm2, PLATE_LIMITS.areaDm2);
  requirePositive("thicknessUm", thicknessUm, PLATE_LIMITS.thicknessUm);
  return areaDm2 * thicknessUm * CM3_PER_DM2_UM * densityOf(deposit);
}

/** What a wanted thickness takes. */
export interface PlateTime {
  massG: number;
  equivalentGPerAh: number;
  ampereHours: number;
  currentA: number;
  minutes: number;
}

/**
 * Time and charge for a wanted thickness: how long must this part hang? Area in dm², thickness in µm, current density
 * in A/dm², efficiency of the cathode above 0 and at most 1. Throws `InputError` naming the field.
 *
 * Example: nickel, 4 µm at 4 A/dm² and 95 %: 5.1 minutes (trade guidebook's table).
 */
export function plateForThickness(
  wanted: Deposit & { areaDm2: number; thicknessUm: number; efficiency: number; currentDensityADm2: number },
): PlateTime {
  const massG = layerMassG(wanted, wanted.areaDm2, wanted.thicknessUm);
  requireEfficiency(wanted.efficiency);
  requirePositive("currentDensityADm2", wanted.currentDensityADm2, PLATE_LIMITS.currentDensityADm2);
  const equivalent = equivalentGPerAh(wanted);
  const ampereHours = requireCountable("efficiency", massG / (equivalent * wanted.efficiency));
  const currentA = wanted.currentDensityADm2 * wanted.areaDm2;
  // The area cancels out: current goes with it.
  const hoursAtOneADm2 = wanted.thicknessUm / (umPerHourAtOneADm2(wanted) * wanted.efficiency);
  const minutes = requireCountable("currentDensityADm2", (hoursAtOneADm2 / wanted.currentDensityADm2) * 60);
  return { massG, equivalentGPerAh: equivalent, ampereHours, currentA, minutes };
}

/** What came out of a known current and time. */
export interface PlatedResult {
  massG: number;
  ampereHours: number;
  equivalentGPerAh: number;
  thicknessUm: number;
}

/**
 * Mass and mean thickness from current and time: what is on this part? Current in A, area in dm².
 * Thickness is the mean over the area; edges get more, recesses less. Throws `InputError` naming the field.
 *
 * Example: silver, 10.23 A for 60 minutes at 100 %: 41.17 g (OpenStax Chemistry 2e, 17.7).
 */
export function platedByCurrent(
  given: Deposit & { currentA: number; minutes: number; efficiency: number; areaDm2: number },
): PlatedResult {
  requirePositive("areaDm2", given.areaDm2, PLATE_LIMITS.areaDm2);
  const { massG, ampereHours, equivalentGPerAh: equivalent } = massByCurrent(given);
  return {
    massG,
    ampereHours,
    equivalentGPerAh: equivalent,
    thicknessUm: thicknessOfMassUm(given, massG, given.areaDm2),
  };
}

/** Mass from current and time, g, for when the area is not known. Throws `InputError` naming the field. */
export function massByCurrent(
  given: Deposit & { currentA: number; minutes: number; efficiency: number },
): Omit<PlatedResult, "thicknessUm"> {
  requirePositive("currentA", given.currentA, PLATE_LIMITS.currentA);
  requirePositive("minutes", given.minutes, PLATE_LIMITS.minutes);
  requireEfficiency(given.efficiency);
  const ampereHours = (given.currentA * given.minutes) / 60;
  const equivalent = equivalentGPerAh(given);
  return { massG: ampereHours * equivalent * given.efficiency, ampereHours, equivalentGPerAh: equivalent };
}

/** Mean thickness, µm, of a mass spread over an area: the part weighed before and after. Throws `InputError`. */
export function thicknessOfMassUm(deposit: Deposit, massG: number, areaDm2: number): number {
  requireBetween("massG", massG, 0, 1e12);
  requirePositive("areaDm2", areaDm2, PLATE_LIMITS.areaDm2);
  return requireCountable("areaDm2", massG / (areaDm2 * CM3_PER_DM2_UM * densityOf(deposit)));
}

/**
 * The most that a current can take off or put on, µm per hour at 1 A/dm² and 100 %.
 *
 * Example: nickel 12.3, gold from cyanide 38.0.
 */
export function umPerHourAtOneADm2(deposit: Deposit): number {
  return equivalentGPerAh(deposit) / (CM3_PER_DM2_UM * densityOf(deposit));
}

function densityOf({ metal, densityGCm3 }: Deposit): number {
  return densityGCm3 === undefined ? metalOf(metal).densityGCm3 : requirePositive("densityGCm3", densityGCm3, 30);
}

/** A result that can be counted. One that is endless is the fault of an input so small that nobody means it. */
function requireCountable(field: string, result: number): number {
  if (!Number.isFinite(result))
    throw new InputError(field, "So small a number has no result that can be counted. Give a greater one.");
  return result;
}

function requireEfficiency(efficiency: number): number {
  return requirePositive("efficiency", efficiency, 1);
}
