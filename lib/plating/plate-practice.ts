import { plateForThickness } from "@/lib/plating/faraday";
import { DEPOSIT_METALS, type DepositMetal } from "@/lib/plating/metals";

/** How a layer is usually plated, for the time that doing it again takes. */
export interface PlatePractice {
  currentDensityADm2: number;
  efficiency: number;
  source: string;
}

/**
 * Usual current density and cathode efficiency of a decent bath, middle of the range. A shop that knows its own bath
 * gives its own. Nickel's efficiency is that of the guidebook's time table; the rest is common practice, from memory.
 */
export const PLATE_PRACTICE: Record<DepositMetal, PlatePractice> = {
  Cu: {
    currentDensityADm2: 1.5,
    efficiency: 0.5,
    source: "cyanide strike 30 to 60 %, 0.5 to 4 A/dm² (Surface Finishing Guidebook, Table I)",
  },
  Ni: {
    currentDensityADm2: 4,
    efficiency: 0.95,
    source: "nickel time table at 95 % (trade guidebook); density common practice",
  },
  Au: { currentDensityADm2: 0.5, efficiency: 0.9, source: "common practice, from memory" },
  Ag: { currentDensityADm2: 1, efficiency: 0.98, source: "common practice, from memory" },
  Pd: { currentDensityADm2: 1, efficiency: 0.9, source: "common practice, from memory" },
  Rh: { currentDensityADm2: 1.5, efficiency: 0.7, source: "common practice, from memory" },
  Pt: { currentDensityADm2: 1, efficiency: 0.5, source: "common practice, from memory" },
  Cr: { currentDensityADm2: 15, efficiency: 0.15, source: "hexavalent bath, common practice, from memory" },
  Zn: { currentDensityADm2: 2, efficiency: 0.9, source: "common practice, from memory" },
  Sn: { currentDensityADm2: 1.5, efficiency: 0.95, source: "common practice, from memory" },
  Co: { currentDensityADm2: 4, efficiency: 0.95, source: "as nickel, from memory" },
  Fe: { currentDensityADm2: 4, efficiency: 0.9, source: "common practice, from memory" },
  Cd: { currentDensityADm2: 2, efficiency: 0.9, source: "common practice, from memory" },
  Pb: { currentDensityADm2: 1.5, efficiency: 0.95, source: "common practice, from memory" },
  In: { currentDensityADm2: 1.5, efficiency: 0.6, source: "common practice, from memory" },
};

// Time is linear in thickness, so one figure a metal is worked out once and not again for every case.
const MINUTES_PER_UM = new Map<DepositMetal, number>(
  DEPOSIT_METALS.map((metal) => [metal, usualMinutes({ metal, thicknessUm: 1 })]),
);

/**
 * Minutes in the tank that a layer takes in a usual bath, whatever the area: current goes with area. Thickness in µm.
 *
 * Example: 4 µm of nickel: 5.1 minutes (trade guidebook's table).
 */
export function usualPlateMinutes(layer: { metal: DepositMetal; thicknessUm: number; valence?: number }): number {
  if (layer.valence !== undefined) return usualMinutes(layer);
  return (MINUTES_PER_UM.get(layer.metal) ?? 0) * layer.thicknessUm;
}

function usualMinutes(layer: { metal: DepositMetal; thicknessUm: number; valence?: number }): number {
  return plateForThickness({ ...layer, ...PLATE_PRACTICE[layer.metal], areaDm2: 1 }).minutes;
}
