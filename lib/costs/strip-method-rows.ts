import type { BaseMetal } from "@/lib/cases/case-words";
import { threePoint, type ThreePoint } from "@/lib/costs/pert";
import type { DissolvingRow, PolishingRow } from "@/lib/costs/strip-methods";
import type { DepositMetal } from "@/lib/plating/metals";
import { umPerHourAtOneADm2 } from "@/lib/plating/faraday";

// Over 200 lines on purpose: one table of the trade's strips, which is read as a whole.

/** Share of Faraday's rate that an anodic strip reaches in practice. From memory. */
const SHARE_IN_PRACTICE = { low: 0.25, likely: 0.4, high: 0.6 } as const;
const MEMORY = "from memory";
const FARADAY_RATE =
  "Faraday's law at the current density named; a quarter to six tenths of it in practice, from memory";

/** Rate of an anodic strip, µm/min: Faraday's at a current density, times the share reached in practice. */
function anodicRate(metal: DepositMetal, valence: number, currentDensityADm2: number): ThreePoint {
  const mostUmPerMin = (umPerHourAtOneADm2({ metal, valence }) * currentDensityADm2) / 60;
  const { low, likely, high } = SHARE_IN_PRACTICE;
  return threePoint(low * mostUmPerMin, likely * mostUmPerMin, high * mostUmPerMin);
}

const COPPER_KIN: readonly BaseMetal[] = ["copper", "brass", "bronze", "nickel-silver"];

function because(metals: readonly BaseMetal[], reason: string): Partial<Record<BaseMetal, string>> {
  return Object.fromEntries(metals.map((metal) => [metal, reason]));
}

const ITS_OWN_NICKEL = "The bath cannot tell the plated nickel from the part's own.";
const ITS_OWN_COPPER =
  "The bath takes copper, and the part is made of it: it goes on into the part, first at edges and threads.";
const CYANIDE_EATS_COPPER =
  "Cyanide does not stop at the copper: it goes on into the part, first at edges and threads.";
const ACID_EATS_ZINC = "Acid dissolves zinc die cast at once.";
const ACID_EATS_ALUMINIUM = "The acid attacks aluminium and undercuts the deposit.";
const CAUSTIC_EATS_ZINC = "Caustic dissolves zinc.";
const CAUSTIC_EATS_ALUMINIUM = "Caustic dissolves aluminium.";
const CAUSTIC_EATS_TIN = "Caustic dissolves the tin in pewter.";
const CYANIDE_EATS_PRECIOUS = "Cyanide with an oxidant dissolves silver and gold.";
const NITRIC_EATS = "Nitric acid dissolves the part itself.";

/**
 * Baths by deposit, the preferred one first. Solutions are published where the source says so; rates and holding
 * capacities are mostly from memory and shown as such. Common practice, not advice: the safety data sheet goes first.
 */
export const DISSOLVING_ROWS: readonly DissolvingRow[] = [
  {
    id: "chromium-hydrochloric",
    method: "chemical",
    takesOff: ["Cr"],
    solution: "Hydrochloric acid 125 mL/L",
    bathTempC: [43, 54],
    rateUmPerMin: threePoint(0.1, 0.25, 0.5),
    holdingGPerL: threePoint(5, 15, 30),
    safeOn: ["steel", "iron", "nickel", "copper", "brass", "bronze"],
    attacks: {
      zinc: ACID_EATS_ZINC,
      aluminium: ACID_EATS_ALUMINIUM,
      stainless: "Hydrochloric acid pits stainless steel.",
      pewter: "Hydrochloric acid dissolves the tin in pewter.",
    },
    cautions: ["acidAndCyanide", "highStrengthSteel", "acidMist"],
    source:
      "trade column, pfonline.com stripping-nickel-chrome; base metals beyond nickel, copper and steel from memory",
    rateSource: `minutes for decorative chromium; ${MEMORY}`,
  },
  {
    id: "chromium-caustic",
    method: "electrolytic",
    takesOff: ["Cr"],
    solution: "Sodium hydroxide 52 g/L, part as anode",
    bathTempC: [20, 25],
    current: "6 V, about 5 A/dm²",
    rateUmPerMin: anodicRate("Cr", 6, 5),
    holdingGPerL: threePoint(5, 15, 30),
    safeOn: ["steel", "iron", "nickel", "stainless"],
    attacks: {
      zinc: CAUSTIC_EATS_ZINC,
      aluminium: CAUSTIC_EATS_ALUMINIUM,
      pewter: CAUSTIC_EATS_TIN,
      brass: "As anode in caustic, brass darkens and loses its zinc.",
    },
    cautions: ["hexavalent", "hotCaustic"],
    source: "trade column, pfonline.com stripping-nickel-chrome; brass, pewter and stainless from memory",
    rateSource: FARADAY_RATE,
  },
  {
    id: "chromium-carbonate",
    method: "electrolytic",
    takesOff: ["Cr"],
    solution: "Sodium carbonate 67 g/L, part as anode",
    bathTempC: [20, 25],
    current: "6 V, about 3 A/dm²",
    rateUmPerMin: anodicRate("Cr", 6, 3),
    holdingGPerL: threePoint(5, 15, 30),
    safeOn: ["steel", "iron", "nickel"],
    attacks: {
      zinc: "As anode, zinc dissolves.",
      aluminium: "As anode in soda, aluminium dissolves.",
      pewter: "As anode in soda, the tin in pewter dissolves.",
      brass: "As anode in soda, brass darkens and loses its zinc.",
    },
    cautions: ["hexavalent", "smuts"],
    source:
      "trade column, pfonline.com stripping-nickel-chrome, for nickel on steel; current and other base metals from memory",
    rateSource: FARADAY_RATE,
  },
  {
    id: "nickel-copper-cyanide",
    method: "chemical",
    takesOff: ["Ni", "Cu"],
    solution: "Hot alkaline cyanide with a nitro-aromatic oxidant",
    bathTempC: [55, 65],
    rateUmPerMin: threePoint(10 / 60, 17 / 60, 25 / 60),
    holdingGPerL: threePoint(8, 15, 30),
    safeOn: ["steel", "iron", "stainless"],
    attacks: {
      ...because(COPPER_KIN, CYANIDE_EATS_COPPER),
      zinc: "The bath dissolves zinc.",
      aluminium: CAUSTIC_EATS_ALUMINIUM,
      nickel: ITS_OWN_NICKEL,
      ...because(["silver", "gold"], CYANIDE_EATS_PRECIOUS),
      pewter: CAUSTIC_EATS_TIN,
    },
    cautions: ["acidAndCyanide", "trainedOnly", "cyanideOxidant", "nickel"],
    source: "trade forum, finishing.com/349/73; waste code F009; base metals beyond copper, brass and zinc from memory",
    rateSource: `10 to 25 µm/h, ${MEMORY}`,
  },
  {
    id: "nickel-copper-nitric",
    method: "chemical",
    takesOff: ["Ni", "Cu"],
    solution: "Concentrated nitric acid with sodium chloride 40 g/L",
    bathTempC: [65, 75],
    rateUmPerMin: threePoint(3, 6, 9),
    holdingGPerL: threePoint(20, 40, 80),
    safeOn: ["steel", "stainless"],
    attacks: {
      ...because([...COPPER_KIN, "silver", "zinc", "pewter"], NITRIC_EATS),
      nickel: ITS_OWN_NICKEL,
      aluminium: "Chloride in the acid pits aluminium.",
    },
    cautions: ["trainedOnly", "nitrogenOxides", "acidAndCyanide", "keepDry", "highStrengthSteel"],
    source: "shop article, ntndfebmagnet.com; base metals beyond steel and stainless from memory",
    rateSource: `about 6 µm/min, same article; its range ${MEMORY}`,
  },
  {
    id: "stainless-nitric",
    method: "chemical",
    takesOff: ["Ni", "Cu", "Ag", "Zn", "Pb", "Cd", "Co", "Fe"],
    solution: "Nitric acid 50 % by volume",
    bathTempC: [20, 25],
    rateUmPerMin: threePoint(0.1, 0.3, 1),
    holdingGPerL: threePoint(20, 40, 80),
    safeOn: ["stainless"],
    attacks: {
      ...because([...COPPER_KIN, "silver", "zinc", "pewter", "steel", "iron"], NITRIC_EATS),
      nickel: ITS_OWN_NICKEL,
    },
    cautions: ["trainedOnly", "nitrogenOxides", "acidAndCyanide", "watchTime"],
    source: "stress-coupon reuse procedure, specialtytest.com; which deposits, from memory",
    rateSource: `15 minutes to 2 hours, same procedure; as a rate ${MEMORY}`,
  },
  {
    id: "nickel-sulfuric-anodic",
    method: "electrolytic",
    takesOff: ["Ni", "Co"],
    solution: "Sulfuric acid about 625 mL/L, part as anode, lead cathodes",
    bathTempC: [20, 30],
    current: "6 V, about 5 A/dm²",
    rateUmPerMin: anodicRate("Ni", 2, 5),
    holdingGPerL: threePoint(15, 30, 60),
    safeOn: ["steel", "iron", "copper", "brass", "bronze"],
    attacks: {
      zinc: ACID_EATS_ZINC,
      aluminium: ACID_EATS_ALUMINIUM,
      nickel: ITS_OWN_NICKEL,
      "nickel-silver": "The acid takes nickel, and nickel silver holds up to a fifth of it.",
      pewter: "The acid darkens and etches pewter.",
    },
    cautions: ["acidAndCyanide", "highStrengthSteel", "acidMist", "nickel", "dilutionHeat", "pitting", "stopAtCopper"],
    source: "trade columns, pfonline.com stripping-nickel-chrome, finishing.com/349/73; brass and bronze from memory",
    rateSource: FARADAY_RATE,
  },
  {
    id: "nickel-copper-amine-anodic",
    method: "electrolytic",
    takesOff: ["Ni", "Cu"],
    solution: "Triethanolamine 60 to 70, sodium hydroxide 60 to 75, sodium nitrate 15 to 20 g/L, part as anode",
    bathTempC: [35, 50],
    current: "1.5 to 2.5 A/dm²",
    rateUmPerMin: threePoint(12 / 60, 20 / 60, 27 / 60),
    holdingGPerL: threePoint(10, 20, 40),
    safeOn: ["steel"],
    attacks: {
      ...because(COPPER_KIN, ITS_OWN_COPPER),
      zinc: CAUSTIC_EATS_ZINC,
      aluminium: CAUSTIC_EATS_ALUMINIUM,
      nickel: ITS_OWN_NICKEL,
      pewter: CAUSTIC_EATS_TIN,
    },
    cautions: ["hotCaustic", "nickel", "watchTime"],
    source: "shop article, ntndfebmagnet.com; base metals beyond steel from memory",
    rateSource: `about 20 µm/h, same article with a doubtful unit; its range ${MEMORY}`,
  },
  {
    id: "copper-persulfate",
    method: "chemical",
    takesOff: ["Cu"],
    solution: "Ammonium persulfate 60 to 120 g/L with ammonia, pH 9 to 10",
    bathTempC: [20, 30],
    rateUmPerMin: threePoint(0.5, 1, 2),
    holdingGPerL: threePoint(10, 20, 35),
    safeOn: ["steel", "iron", "stainless"],
    attacks: {
      ...because(COPPER_KIN, ITS_OWN_COPPER),
      zinc: "Ammonia with persulfate dissolves zinc.",
      aluminium: "The alkaline bath etches aluminium.",
      silver: "Persulfate with ammonia dissolves silver.",
    },
    cautions: ["heatsUp"],
    source: `common practice, ${MEMORY}`,
    rateSource: `0.5 to 2 µm/min, ${MEMORY}`,
  },
  {
    id: "copper-chromic",
    method: "chemical",
    takesOff: ["Cu"],
    solution: "Chromic acid 240 g/L with sulfuric acid 16 mL/L",
    bathTempC: [20, 25],
    rateUmPerMin: threePoint(10 / 60, 18 / 60, 30 / 60),
    holdingGPerL: threePoint(10, 25, 50),
    safeOn: ["steel", "iron"],
    attacks: {
      ...because(COPPER_KIN, ITS_OWN_COPPER),
      zinc: ACID_EATS_ZINC,
      aluminium: "Chromic acid with sulfuric etches aluminium.",
      silver: "Chromic acid attacks silver.",
    },
    cautions: ["hexavalent", "trainedOnly", "acidAndCyanide"],
    source: "stress-coupon reuse procedure, specialtytest.com; base metals beyond brass and zinc from memory",
    rateSource: `10 to 30 µm/h, ${MEMORY}`,
  },
  {
    id: "silver-cyanide-anodic",
    method: "electrolytic",
    takesOff: ["Ag"],
    solution: "Sodium hydroxide 60 g/L, sodium cyanide 120 g/L, part as anode",
    bathTempC: [20, 25],
    current: "1 to 4 V, about 1 A/dm²",
    rateUmPerMin: anodicRate("Ag", 1, 1),
    holdingGPerL: threePoint(15, 30, 60),
    safeOn: ["stainless", "steel", "iron"],
    attacks: {
      ...because(COPPER_KIN, "As anode in cyanide, the copper in the part dissolves too, slowly."),
      zinc: CAUSTIC_EATS_ZINC,
      aluminium: CAUSTIC_EATS_ALUMINIUM,
      ...because(["silver", "gold"], "Cyanide dissolves silver and gold of the part too."),
      pewter: CAUSTIC_EATS_TIN,
    },
    cautions: ["acidAndCyanide", "trainedOnly", "recover"],
    source: "stress-coupon reuse procedure, specialtytest.com; base metals beyond copper and brass from memory",
    rateSource: FARADAY_RATE,
  },
  {
    id: "silver-sulfuric-nitric",
    method: "chemical",
    takesOff: ["Ag"],
    solution: "Concentrated sulfuric acid 19 parts with concentrated nitric acid 1 part",
    bathTempC: [70, 80],
    rateUmPerMin: threePoint(0.5, 1.5, 3),
    holdingGPerL: threePoint(10, 20, 40),
    safeOn: ["copper", "brass", "bronze", "nickel-silver"],
    attacks: {
      ...because(["steel", "iron"], "The acid etches steel as soon as water gets in."),
      zinc: ACID_EATS_ZINC,
      aluminium: ACID_EATS_ALUMINIUM,
      silver: "The bath cannot tell the plated silver from the part's own.",
      pewter: "The acid eats into pewter.",
    },
    cautions: ["trainedOnly", "nitrogenOxides", "acidAndCyanide", "dilutionHeat", "dryOrItEtches", "recover"],
    source: `common practice, ${MEMORY}`,
    rateSource: `0.5 to 3 µm/min, ${MEMORY}`,
  },
  {
    id: "gold-cyanide-peroxide",
    method: "chemical",
    takesOff: ["Au"],
    solution: "Sodium cyanide 120 g/L with hydrogen peroxide 25 mL/L",
    bathTempC: [20, 25],
    rateUmPerMin: threePoint(0.5, 1.5, 3),
    holdingGPerL: threePoint(5, 10, 20),
    safeOn: ["stainless", "nickel", "steel", "iron"],
    attacks: {
      ...because(COPPER_KIN, CYANIDE_EATS_COPPER),
      zinc: "The bath dissolves zinc.",
      aluminium: CAUSTIC_EATS_ALUMINIUM,
      ...because(["silver", "gold"], CYANIDE_EATS_PRECIOUS),
      pewter: CAUSTIC_EATS_TIN,
    },
    cautions: ["acidAndCyanide", "trainedOnly", "cyanideOxidant", "recover"],
    source: "stress-coupon reuse procedure, specialtytest.com; steel from memory",
    rateSource: `0.5 to 3 µm/min, falling with age, ${MEMORY}`,
  },
  {
    id: "gold-thiourea-anodic",
    method: "electrolytic",
    takesOff: ["Au"],
    solution: "Thiourea in dilute acid, part as anode",
    bathTempC: [20, 60],
    current: "2 to 6 V, about 1 A/dm²",
    rateUmPerMin: anodicRate("Au", 1, 1),
    holdingGPerL: threePoint(5, 10, 20),
    safeOn: ["steel", "iron", "stainless", "nickel", "copper", "brass", "bronze", "nickel-silver"],
    attacks: {
      zinc: ACID_EATS_ZINC,
      aluminium: ACID_EATS_ALUMINIUM,
      gold: "The bath cannot tell the plated gold from the part's own.",
      silver: "Thiourea dissolves silver too.",
    },
    cautions: ["acidAndCyanide", "thiourea", "acidMist", "recover"],
    source: `common practice, ${MEMORY}`,
    rateSource: FARADAY_RATE,
  },
  {
    id: "palladium-cyanide",
    method: "chemical",
    takesOff: ["Pd"],
    solution: "Alkaline cyanide with a nitro-aromatic oxidant",
    bathTempC: [40, 60],
    rateUmPerMin: threePoint(0.1, 0.25, 0.5),
    holdingGPerL: threePoint(3, 6, 12),
    safeOn: ["steel", "iron", "stainless"],
    attacks: {
      ...because(COPPER_KIN, CYANIDE_EATS_COPPER),
      nickel: "Cyanide with an oxidant takes nickel too.",
      zinc: "The bath dissolves zinc.",
      aluminium: CAUSTIC_EATS_ALUMINIUM,
      ...because(["silver", "gold"], CYANIDE_EATS_PRECIOUS),
      pewter: CAUSTIC_EATS_TIN,
    },
    cautions: ["acidAndCyanide", "trainedOnly", "cyanideOxidant", "recover"],
    source: `common practice, ${MEMORY}`,
    rateSource: `0.1 to 0.5 µm/min, ${MEMORY}`,
  },
  {
    id: "palladium-chloride-anodic",
    method: "electrolytic",
    takesOff: ["Pd"],
    solution: "Chloride and nitrite, part as anode",
    bathTempC: [40, 60],
    current: "about 1 A/dm²",
    rateUmPerMin: threePoint(0.1, 0.25, 0.5),
    holdingGPerL: threePoint(3, 6, 12),
    safeOn: ["steel", "nickel"],
    attacks: {
      ...because(COPPER_KIN, "As anode in chloride, copper alloys dissolve."),
      stainless: "As anode in chloride, stainless steel pits.",
      zinc: "As anode in chloride, zinc dissolves.",
      aluminium: "As anode in chloride, aluminium pits.",
      silver: "As anode in chloride, silver blackens.",
    },
    cautions: ["trainedOnly", "recover", "watchTime"],
    source: `common practice, ${MEMORY}`,
    rateSource: `0.1 to 0.5 µm/min, ${MEMORY}`,
  },
  {
    id: "rhodium-lift-anodic",
    method: "electrolytic",
    takesOff: ["Rh"],
    solution: "Dilute sulfuric acid, part as anode: it eats the nickel beneath and the rhodium lifts",
    bathTempC: [20, 25],
    current: "about 2 A/dm²",
    rateUmPerMin: threePoint(0.02, 0.05, 0.1),
    holdingGPerL: threePoint(5, 15, 30),
    safeOn: ["copper", "brass", "bronze"],
    attacks: {
      ...because(["steel", "iron"], "Dilute sulfuric acid etches steel as soon as the nickel is open."),
      zinc: ACID_EATS_ZINC,
      aluminium: ACID_EATS_ALUMINIUM,
      nickel: ITS_OWN_NICKEL,
      "nickel-silver": "The acid takes nickel, and nickel silver holds up to a fifth of it.",
      pewter: "The acid darkens and etches pewter.",
    },
    needsBeneath: "Ni",
    cautions: ["acidAndCyanide", "acidMist", "flakes", "recover", "nickel"],
    source: `common practice, ${MEMORY}`,
    rateSource: MEMORY,
  },
  {
    id: "zinc-hydrochloric",
    method: "chemical",
    takesOff: ["Zn"],
    solution: "Hydrochloric acid 10 to 50 % by volume",
    bathTempC: [20, 25],
    rateUmPerMin: threePoint(5, 10, 20),
    holdingGPerL: threePoint(30, 60, 100),
    safeOn: ["steel", "iron", "copper"],
    attacks: {
      zinc: ACID_EATS_ZINC,
      aluminium: ACID_EATS_ALUMINIUM,
      stainless: "Hydrochloric acid pits stainless steel.",
      brass: "Hydrochloric acid draws the zinc out of brass.",
      pewter: "Hydrochloric acid dissolves the tin in pewter.",
    },
    cautions: ["highStrengthSteel", "acidAndCyanide", "acidMist", "watchTime"],
    source: `common practice, ${MEMORY}`,
    rateSource: `5 to 20 µm/min, ${MEMORY}`,
  },
  {
    id: "cadmium-ammonium-nitrate",
    method: "chemical",
    takesOff: ["Cd"],
    solution: "Ammonium nitrate 120 g/L",
    bathTempC: [20, 30],
    rateUmPerMin: threePoint(0.5, 1.5, 3),
    holdingGPerL: threePoint(10, 20, 40),
    safeOn: ["steel", "iron", "stainless"],
    attacks: {
      zinc: "The bath dissolves zinc.",
      ...because(COPPER_KIN, "Ammonium nitrate takes up copper: it goes on into the part."),
      aluminium: "The bath pits aluminium.",
    },
    cautions: ["cadmium", "watchTime"],
    source: `common practice, ${MEMORY}`,
    rateSource: `0.5 to 3 µm/min, ${MEMORY}`,
  },
  {
    id: "tin-caustic-anodic",
    method: "electrolytic",
    takesOff: ["Sn"],
    solution: "Sodium hydroxide 100 to 120 g/L, part as anode",
    bathTempC: [70, 90],
    current: "6 V, about 3 A/dm²",
    rateUmPerMin: anodicRate("Sn", 2, 3),
    holdingGPerL: threePoint(20, 40, 60),
    safeOn: ["steel", "iron", "stainless", "copper", "nickel"],
    attacks: {
      zinc: CAUSTIC_EATS_ZINC,
      aluminium: CAUSTIC_EATS_ALUMINIUM,
      pewter: CAUSTIC_EATS_TIN,
      brass: "As anode in hot caustic, brass darkens and loses its zinc.",
    },
    cautions: ["hotCaustic"],
    source: `common practice, ${MEMORY}`,
    rateSource: FARADAY_RATE,
  },
];

/** Polishing: a flash of 0.2 to 1 µm of copper takes seconds to a minute per dm². */
export const POLISHING_ROW: PolishingRow = {
  id: "polish-back",
  method: "polish-back",
  minutesPerDm2Um: threePoint(0.3, 0.6, 1.2),
  cautions: ["dust", "cleanFirst"],
  source: `fine abrasive or soft wheel, then clean again; minutes and scaling by hardness, ${MEMORY}`,
};
