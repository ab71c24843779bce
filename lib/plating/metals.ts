import { InputError } from "@/lib/input-error";

/** One metal as a deposit. */
export interface Metal {
  name: string;
  atomicMassGMol: number;
  densityGCm3: number;
  /** Charges of the ion in the baths that plate it, the usual one first. */
  valences: readonly [number, ...number[]];
  /** Where the valences hold, when it is not plain. */
  bath?: string;
}

/** Atomic mass: isotope-weighted IUPAC values as in the npm package chemical-elements 2.3.3. */
export const ATOMIC_MASS_SOURCE = "IUPAC isotope-weighted atomic masses (npm chemical-elements 2.3.3)";
/** Density of the solid metal. A deposit may be a few percent lighter. */
export const DENSITY_SOURCE = "CRC Handbook class values, from memory";
export const VALENCE_SOURCE = "handbook table of electrochemical equivalents";

/** The metals that a shop deposits. Sources of the columns: the three constants above. */
export const METALS = {
  Cu: {
    name: "copper",
    atomicMassGMol: 63.546,
    densityGCm3: 8.96,
    valences: [1, 2],
    bath: "1 in cyanide, 2 in acid and pyrophosphate",
  },
  Ni: { name: "nickel", atomicMassGMol: 58.6933, densityGCm3: 8.9, valences: [2] },
  Au: {
    name: "gold",
    atomicMassGMol: 196.9666,
    densityGCm3: 19.32,
    valences: [1, 3],
    bath: "1 in cyanide and sulfite, 3 in acid",
  },
  Ag: { name: "silver", atomicMassGMol: 107.8681, densityGCm3: 10.49, valences: [1] },
  Pd: { name: "palladium", atomicMassGMol: 106.4153, densityGCm3: 12.02, valences: [2] },
  Rh: { name: "rhodium", atomicMassGMol: 102.9055, densityGCm3: 12.41, valences: [3] },
  Pt: { name: "platinum", atomicMassGMol: 195.0845, densityGCm3: 21.45, valences: [4, 2] },
  Cr: {
    name: "chromium",
    atomicMassGMol: 51.9961,
    densityGCm3: 7.19,
    valences: [6, 3],
    bath: "6 in a hexavalent bath, 3 in a trivalent",
  },
  Zn: { name: "zinc", atomicMassGMol: 65.3778, densityGCm3: 7.13, valences: [2] },
  Sn: { name: "tin", atomicMassGMol: 118.7101, densityGCm3: 7.31, valences: [2, 4], bath: "2 in acid, 4 in stannate" },
  Co: { name: "cobalt", atomicMassGMol: 58.9332, densityGCm3: 8.9, valences: [2] },
  Fe: { name: "iron", atomicMassGMol: 55.8451, densityGCm3: 7.87, valences: [2] },
  Cd: { name: "cadmium", atomicMassGMol: 112.4116, densityGCm3: 8.65, valences: [2] },
  Pb: { name: "lead", atomicMassGMol: 207.2169, densityGCm3: 11.34, valences: [2] },
  In: { name: "indium", atomicMassGMol: 114.8181, densityGCm3: 7.31, valences: [3] },
} as const satisfies Record<string, Metal>;

/** Symbol of a metal that a shop deposits. */
export type DepositMetal = keyof typeof METALS;

// Object.keys forgets the keys' type; the object is `as const` and not extended anywhere.
export const DEPOSIT_METALS = Object.keys(METALS) as [DepositMetal, ...DepositMetal[]];

/** The metal's figures. */
export function metalOf(symbol: DepositMetal): Metal {
  return METALS[symbol];
}

/**
 * The symbol for what a person typed: a symbol or an English name, in any case. Throws `InputError` for the field given.
 *
 * Example: `parseMetal("Nickel")` is `"Ni"`.
 */
export function parseMetal(typed: string, field = "metal"): DepositMetal {
  const wanted = String(typed).trim().toLowerCase();
  const found = DEPOSIT_METALS.find((symbol) => symbol.toLowerCase() === wanted || METALS[symbol].name === wanted);
  if (found === undefined) throw new InputError(field, `Use one of: ${DEPOSIT_METALS.join(", ")}.`);
  return found;
}

/** The charge to reckon with: the one given, if this metal is plated with it, else the usual one. Throws `InputError`. */
export function requireValence(symbol: DepositMetal, valence: number | undefined, field = "valence"): number {
  const { valences, name } = metalOf(symbol);
  if (valence === undefined) return valences[0];
  if (!valences.includes(valence)) {
    throw new InputError(field, `For ${name} use ${valences.join(" or ")}.`);
  }
  return valence;
}
