import type { ShopRates } from "@/lib/costs/rates";

/** Shown wherever a shop still uses them. */
export const STARTING_RATES_SOURCE = "starting rates, from memory: set your own";

/**
 * What a new shop starts with until its owner sets the shop's own rates. All from memory: money amounts of a small job
 * shop in US cents, metal prices of the order seen in mid-2026. They are to be replaced, and every screen says so.
 */
export const STARTING_RATES: ShopRates = {
  validFromAt: 0,
  labourCentsPerHour: 5200,
  lineCentsPerHour: 4200,
  metalCentsPerG: {
    Cu: 1,
    Ni: 1.8,
    Au: 12860,
    Ag: 130,
    Pd: 4150,
    Rh: 18500,
    Pt: 4200,
    Cr: 1.2,
    Zn: 0.35,
    Sn: 3.6,
    Co: 4,
    Fe: 0.2,
    Cd: 0.6,
    Pb: 0.25,
    In: 45,
  },
  recoveryShare: { Au: 0.6, Pd: 0.5, Pt: 0.5, Rh: 0.4, Ag: 0.5 },
  solutionCentsPerL: 610,
  wasteCentsPerL: 380,
  abrasiveCentsPerMinute: 10,
};
