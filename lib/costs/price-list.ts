import type { StageFound } from "@/lib/cases/case-words";
import type { AllowedWay } from "@/lib/costs/allowed-ways";
import type { MinutesCorrections } from "@/lib/costs/estimate-record";
import { addTogether, pertMean, timesFactor, type ThreePoint } from "@/lib/costs/pert";
import { HIGHEST_RATE_CENTS, metalPrice, PLAIN_RATES, type ShopRates } from "@/lib/costs/rates";
import { reworkTerms, type CostLine, type GrowsWith, type ReworkTerm } from "@/lib/costs/rework-terms";
import type { ReworkTimes } from "@/lib/costs/rework-times";
import { requireBetween } from "@/lib/input-error";

/** What is worked out for each size of a batch, and its place there: mean cents of each line, in their order, then the rest. */
export const FIGURE_AT = {
  labour: 0,
  line: 1,
  metalWrittenOff: 2,
  metalAgain: 3,
  chemistry: 4,
  waste: 5,
  scrapRisk: 6,
  meanCents: 7,
  leastCents: 8,
  mostCents: 9,
  handsOnLow: 10,
  handsOnLikely: 11,
  handsOnHigh: 12,
  tankLow: 13,
  tankLikely: 14,
  tankHigh: 15,
  metalLostG: 16,
} as const satisfies Record<CostLine, number> & Record<string, number>;
type Figure = keyof typeof FIGURE_AT;
const WIDTH = 17;

/** How far one term may go, for one unit of its size. */
export interface UnitSpread {
  name: string;
  size: number;
  /** It moves together with the next. */
  withNext: boolean;
  lowCents: number;
  highCents: number;
}

/**
 * What one way costs, unit by unit: a part, a dm², a dm² of a layer one µm thick. It holds for any size of batch of these
 * layers, and a batch is priced by multiplying it out.
 */
export interface PriceList {
  way: AllowedWay;
  /** For each size in turn (`sizesOf`) its figures, each at its `FIGURE_AT`. */
  perSize: Float64Array;
  spreads: readonly UnitSpread[];
  /** Of each spread, most less least cents. */
  widths: Float64Array;
}

/** A fresh row for the figures of a batch. */
export const emptyFigures = (): Float64Array => new Float64Array(WIDTH);

/** All figures of a batch: each size times its row of the list. Written into `figures`, which is handed back. */
export function multiplyOut(list: PriceList, sizes: readonly number[], figures: Float64Array): Float64Array {
  const { perSize } = list;
  for (let place = 0; place < WIDTH; place += 1) {
    let sum = 0;
    for (let size = 0, at = place; size < sizes.length; size += 1, at += WIDTH) {
      sum += (perSize[at] ?? 0) * (sizes[size] ?? 0);
    }
    figures[place] = sum;
  }
  return figures;
}

/** What a batch costs by a list: mean, cents with fractions. Enough to find the cheapest way. */
export function meanByList({ perSize }: PriceList, sizes: readonly number[]): number {
  let cents = 0;
  let at: number = FIGURE_AT.meanCents;
  for (const times of sizes) {
    cents += (perSize[at] ?? 0) * times;
    at += WIDTH;
  }
  return cents;
}

/** Place of each size; those of the layers follow, from the base out. */
const SIZE_AT = { batch: 0, parts: 1, area: 2, plating: 3, value: 4 } as const;
const FIRST_LAYER = 5;

/** What a list is multiplied out with, in the order of the places above. */
export function sizesOf(batch: {
  quantity: number;
  /** Of all parts together. */
  batchAreaDm2: number;
  /** Tank minutes to plate all layers again, times the loads. */
  platingMinutes: number;
  /** Of all parts together. */
  valueCents: number;
  layers: readonly { thicknessUm: number }[];
}): number[] {
  const sizes = [1, batch.quantity, batch.batchAreaDm2, batch.platingMinutes, batch.valueCents];
  for (const { thicknessUm } of batch.layers) sizes.push(batch.batchAreaDm2 * thicknessUm);
  return sizes;
}

function placeOf(per: GrowsWith): number {
  return typeof per === "object" ? FIRST_LAYER + per.layer : SIZE_AT[per];
}

/** What price lists hang on besides the way. */
export interface ListFacts {
  rates: ShopRates;
  times: ReworkTimes;
  stageFound: StageFound;
  minutesCorrection: number | MinutesCorrections;
}

interface KnownLists extends Omit<ListFacts, "rates"> {
  lists: readonly PriceList[];
}
const KNOWN = new WeakMap<ShopRates, WeakMap<readonly AllowedWay[], KnownLists[]>>();

/**
 * The price lists of these ways, in their order. They are worked out once for a shop's rates and remembered as long as
 * those are: ten thousand cases are priced in one run, and what most of them differ in is their size.
 */
export function priceLists(ways: readonly AllowedWay[], facts: ListFacts): readonly PriceList[] {
  const { rates, times, stageFound, minutesCorrection } = facts;
  let byWays = KNOWN.get(rates);
  if (!byWays) KNOWN.set(rates, (byWays = new WeakMap()));
  let known = byWays.get(ways);
  if (!known) byWays.set(ways, (known = []));
  for (const each of known) {
    if (each.stageFound === stageFound && each.minutesCorrection === minutesCorrection && each.times === times)
      return each.lists;
  }
  checkListRates(rates, ways);
  const lists = ways.map((way) => makeList(way, facts));
  known.push({ times, stageFound, minutesCorrection, lists });
  return lists;
}

/** Rates are checked when a list is made of them, not for each batch. Throws `InputError` naming the rate. */
function checkListRates(rates: ShopRates, ways: readonly AllowedWay[]): void {
  for (const field of PLAIN_RATES) requireBetween(field, rates[field], 0, HIGHEST_RATE_CENTS);
  for (const metal of ways[0]?.metals ?? []) {
    requireBetween(`metalCentsPerG.${metal}`, metalPrice(rates, metal), 0, HIGHEST_RATE_CENTS);
    requireBetween(`recoveryShare.${metal}`, rates.recoveryShare[metal] ?? 0, 0, 1);
  }
}

function makeList(way: AllowedWay, facts: ListFacts): PriceList {
  const { rates, minutesCorrection: given } = facts;
  const minutesCorrection = typeof given === "number" ? given : given[way.method];
  const perSize = new Float64Array((FIRST_LAYER + way.rows.length) * WIDTH);
  const spreads = reworkTerms({ way, ...facts }).map((term): UnitSpread => {
    const size = placeOf(term.per);
    const add = (figure: Figure, amount: number) => {
      const at = size * WIDTH + FIGURE_AT[figure];
      perSize[at] = (perSize[at] ?? 0) + amount;
    };
    const ends = addTerm(term, rates, minutesCorrection, add);
    const { name, withNext = false } = term;
    return { name, size, withNext, lowCents: ends.low, highCents: ends.high };
  });
  const widths = Float64Array.from(spreads, ({ lowCents, highCents }) => highCents - lowCents);
  return { way, perSize, spreads, widths };
}

const NOTHING: ThreePoint = { low: 0, likely: 0, high: 0 };

/** Adds a term's minutes, corrected by the shop's own record, and its cents by line. @returns all its cents together */
function addTerm(
  term: ReworkTerm,
  rates: ShopRates,
  minutesCorrection: number,
  add: (figure: Figure, amount: number) => void,
): ThreePoint {
  const handsOn = timesFactor(term.handsOnMinutes ?? NOTHING, minutesCorrection);
  const tank = term.tankMinutes ?? NOTHING;
  add("handsOnLow", handsOn.low);
  add("handsOnLikely", handsOn.likely);
  add("handsOnHigh", handsOn.high);
  add("tankLow", tank.low);
  add("tankLikely", tank.likely);
  add("tankHigh", tank.high);
  add("metalLostG", term.metalLostG ?? 0);
  let ends = NOTHING;
  const addCents = (line: CostLine, cents: ThreePoint) => {
    add(line, pertMean(cents));
    ends = addTogether(ends, cents);
  };
  addCents("labour", timesFactor(handsOn, rates.labourCentsPerHour / 60));
  addCents("line", timesFactor(tank, rates.lineCentsPerHour / 60));
  for (const { line, amount } of term.cents ?? []) addCents(line, amount);
  add("meanCents", pertMean(ends));
  add("leastCents", ends.low);
  add("mostCents", ends.high);
  return ends;
}
