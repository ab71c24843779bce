import { BASE_METALS, type BaseMetal } from "@/lib/cases/case-words";
import type { ReworkEstimate } from "@/lib/costs/estimate-plan";
import type { ShopRates } from "@/lib/costs/rates";
import { compareAtStrike, type StrikeComparison } from "@/lib/costs/strip-estimate";
import type { StripMethod } from "@/lib/costs/strip-methods";
import { SHIPPED_STRIP_TABLE, type StripTable } from "@/lib/costs/strip-plan";
import { strikeThenPlate } from "@/lib/costs/case-stack";
import type { LibraryCause } from "@/lib/library/library-entry";
import type { Layer } from "@/lib/plating/deposit-stack";
import { metalOf, type DepositMetal } from "@/lib/plating/metals";

/** Final plates that many shops lay, with usual thicknesses. From memory. */
export const TYPICAL_PLATES: readonly { key: string; words: string; layers: readonly Layer[] }[] = [
  { key: "ni", words: "Nickel 10 µm", layers: [{ metal: "Ni", thicknessUm: 10 }] },
  {
    key: "ni-au",
    words: "Nickel 5 µm, gold 0.5 µm",
    layers: [
      { metal: "Ni", thicknessUm: 5 },
      { metal: "Au", thicknessUm: 0.5 },
    ],
  },
  {
    key: "ni-pd",
    words: "Nickel 5 µm, palladium 0.5 µm",
    layers: [
      { metal: "Ni", thicknessUm: 5 },
      { metal: "Pd", thicknessUm: 0.5 },
    ],
  },
  {
    key: "ni-rh",
    words: "Nickel 5 µm, rhodium 0.25 µm",
    layers: [
      { metal: "Ni", thicknessUm: 5 },
      { metal: "Rh", thicknessUm: 0.25 },
    ],
  },
];

/** The figures are for one part of this area: a hand-sized fitting. */
export const TYPICAL_AREA_DM2 = 1;

/** Base metals compared: more say the same again. */
const MOST_BASE_METALS = 3;

/** Cents for one part: mean, and the 90 % range. */
export interface StripCost {
  lowCents: number;
  meanCents: number;
  highCents: number;
}

export interface TypicalStripRow extends StripCost {
  plate: string;
  /** Base metals on which it costs the same. */
  baseMetals: BaseMetal[];
  /** The cheapest way that does not attack the base metal. */
  method: StripMethod;
}

export interface TypicalStrip {
  atStrike: StripCost & { method: StripMethod };
  rows: TypicalStripRow[];
  /** Usual cautions of the ways that the figures rest on. */
  cautions: string[];
  sources: string[];
  /** Names of metals that the shop has no price for; their rows are left out. */
  unpriced: string[];
}

/** The base metals that a class's causes put at risk, the likeliest first, at most three. */
export function typicalBaseMetals(causes: readonly Pick<LibraryCause, "baseMetals" | "likelihood">[]): BaseMetal[] {
  const weight = (metal: BaseMetal) =>
    causes.reduce((sum, cause) => sum + (cause.baseMetals.includes(metal) ? cause.likelihood : 0), 0);
  return BASE_METALS.filter((metal) => metal !== "other" && weight(metal) > 0)
    .toSorted((a, b) => weight(b) - weight(a))
    .slice(0, MOST_BASE_METALS);
}

/**
 * What putting one part of 1 dm² right typically costs: at the strike, and after each usual final plate. Null when nothing
 * can be reckoned: no base metal, or no price for any of the plates.
 * @param table the shop's own ways to strip; left out: those that ship
 */
export function typicalStrip(
  baseMetals: readonly BaseMetal[],
  rates: ShopRates,
  table: StripTable = SHIPPED_STRIP_TABLE,
): TypicalStrip | null {
  const unpriced = new Set<string>();
  const rows: TypicalStripRow[] = [];
  const estimates: ReworkEstimate[] = [];
  let atStrike: TypicalStrip["atStrike"] | undefined;
  for (const plate of TYPICAL_PLATES) {
    const stack = strikeThenPlate(plate.layers);
    const missing = stack.filter(({ metal }) => rates.metalCentsPerG[metal] === undefined);
    for (const { metal } of missing) unpriced.add(nameOf(metal));
    if (missing.length > 0) continue;
    for (const baseMetal of baseMetals) {
      const compared = compareOne(baseMetal, stack, rates, table);
      atStrike ??= { method: compared.atStrike.method, ...costOf(compared.atStrike) };
      estimates.push(compared.atStrike, compared.later);
      addRow(rows, plate.words, baseMetal, compared.later);
    }
  }
  if (!atStrike) return null;
  const every = (list: (estimate: ReworkEstimate) => readonly string[]) => [...new Set(estimates.flatMap(list))];
  return {
    atStrike,
    rows,
    cautions: every((estimate) => estimate.cautions),
    sources: every((estimate) => estimate.sources),
    unpriced: [...unpriced],
  };
}

function compareOne(
  baseMetal: BaseMetal,
  stack: readonly Layer[],
  rates: ShopRates,
  table: StripTable,
): StrikeComparison {
  return compareAtStrike({
    quantity: 1,
    areaDm2: TYPICAL_AREA_DM2,
    baseMetal,
    stack,
    stageFound: "after-final-plate",
    rates,
    table,
  });
}

/** Base metals that come to the same figures share a row. */
function addRow(rows: TypicalStripRow[], plate: string, baseMetal: BaseMetal, later: ReworkEstimate): void {
  const cost = costOf(later);
  const same = rows.find(
    (row) =>
      row.plate === plate &&
      row.method === later.method &&
      row.meanCents === cost.meanCents &&
      row.lowCents === cost.lowCents &&
      row.highCents === cost.highCents,
  );
  if (same) same.baseMetals.push(baseMetal);
  else rows.push({ plate, baseMetals: [baseMetal], method: later.method, ...cost });
}

function costOf({ low90Cents, meanCents, high90Cents }: ReworkEstimate): StripCost {
  return { lowCents: low90Cents, meanCents, highCents: high90Cents };
}

function nameOf(metal: DepositMetal): string {
  return metalOf(metal).name;
}
