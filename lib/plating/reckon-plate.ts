import { plateForThickness, platedByCurrent } from "@/lib/plating/faraday";
import {
  ATOMIC_MASS_SOURCE,
  DENSITY_SOURCE,
  metalOf,
  requireValence,
  VALENCE_SOURCE,
  type DepositMetal,
} from "@/lib/plating/metals";
import type { PlateAnswer, PlateInput } from "@/lib/plating/plate.schema";

/**
 * Answers either question about a deposit: how long must it hang for a thickness, or what did this current and time put
 * on. Repeats what was given and names what was assumed. Throws `InputError` naming the field.
 *
 * Example: nickel, 4 µm at 4 A/dm² and 95 %: 5.1 minutes (trade guidebook's table).
 */
export function reckonPlate(input: PlateInput): PlateAnswer {
  const { symbol } = input.metal;
  const valence = requireValence(symbol, input.valence);
  const efficiency = input.efficiency ?? 1;
  const deposit = { metal: symbol, valence, densityGCm3: input.densityGCm3, areaDm2: input.areaDm2, efficiency };
  const { form, metal, ...numbers } = input;
  const given = { metal: metal.typed, ...withoutGaps(numbers) };
  const rest = {
    given,
    metal: symbol,
    valence,
    efficiency,
    assumed: assumedIn(input, symbol, valence),
    sources: SOURCES,
  };
  if (form === "for-thickness") {
    const { thicknessUm, currentDensityADm2 } = input;
    return { ...rest, thicknessUm, ...plateForThickness({ ...deposit, thicknessUm, currentDensityADm2 }) };
  }
  const { currentA, minutes } = input;
  return { ...rest, currentA, minutes, ...platedByCurrent({ ...deposit, currentA, minutes }) };
}

const SOURCES = [
  "Faraday's law; Faraday constant of CODATA 2018 and 2022",
  ATOMIC_MASS_SOURCE,
  `Density: ${DENSITY_SOURCE}`,
  `Valence: ${VALENCE_SOURCE}`,
];

function assumedIn(input: PlateInput, symbol: DepositMetal, valence: number): string[] {
  const assumed: string[] = [];
  if (input.valence === undefined) {
    const { name, bath } = metalOf(symbol);
    assumed.push(`No valence given: ${valence} is assumed for ${name}${bath === undefined ? "" : ` (${bath})`}.`);
  }
  if (input.efficiency === undefined) assumed.push("No efficiency given: 1, that is 100 %, is assumed.");
  return assumed;
}

function withoutGaps(numbers: Record<string, number | undefined>): Record<string, number> {
  const kept = Object.entries(numbers).filter((entry): entry is [string, number] => entry[1] !== undefined);
  return Object.fromEntries(kept);
}
