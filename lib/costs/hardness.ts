import { threePoint, type ThreePoint } from "@/lib/costs/pert";
import type { DepositMetal } from "@/lib/plating/metals";

/** Vickers hardness of a deposit as plated; polishing time goes with it. */
export interface Hardness {
  hv: ThreePoint;
  source: string;
}

/** Soft copper is the yardstick of the polishing rate. */
export const REFERENCE_HV = 100;

/** Ranges as usually plated; the likely value is the middle of the range, from memory, unless the source gives it. */
export const HARDNESS: Record<DepositMetal, Hardness> = {
  Cu: { hv: threePoint(50, 100, 150), source: "common practice, from memory" },
  Ni: { hv: threePoint(150, 250, 350), source: "Watts to bright, trade forum finishing.com/2522" },
  Au: { hv: threePoint(40, 130, 200), source: "ASTM B488 hardness codes, from memory" },
  Ag: { hv: threePoint(60, 100, 140), source: "common practice, from memory" },
  Pd: { hv: threePoint(200, 300, 450), source: "common practice, from memory" },
  Rh: { hv: threePoint(700, 850, 1000), source: "common practice, from memory" },
  Pt: { hv: threePoint(200, 350, 500), source: "from memory" },
  Cr: {
    hv: threePoint(800, 950, 1100),
    source: "hard chromium, trade forum finishing.com/445/17 (900 to 1100); micro-cracked from 800, findanyanswer.com",
  },
  Zn: { hv: threePoint(40, 80, 120), source: "common practice, from memory" },
  Sn: { hv: threePoint(4, 8, 15), source: "common practice, from memory" },
  Co: { hv: threePoint(200, 300, 400), source: "from memory" },
  Fe: { hv: threePoint(150, 250, 400), source: "from memory" },
  Cd: { hv: threePoint(20, 35, 50), source: "from memory" },
  Pb: { hv: threePoint(4, 6, 10), source: "from memory" },
  In: { hv: threePoint(1, 2, 4), source: "from memory" },
};
