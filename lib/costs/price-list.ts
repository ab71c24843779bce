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
  leastCents: 7,
  mostCents: 8,
  handsOnLow: 9,
  handsOnLikely: 10,
  handsOnHigh: 11,
  tankLow: 12,
  tankLikely: 13,
  tankHigh: 14,
  metalLostG: 15,
} as const satisfies Record<CostLine, number> & Record<string, number>;
type Figure = keyof typeof FIGURE_AT;
const WIDTH = 16;

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
  /** For each size, mean cents of all lines. */
  meanCents: Float64Array;
  spreads: readonly UnitSpread[];
  /** The same spreads for the sum of their variances, which is wanted for every batch. */
  widths: Widths;
}

/** Of each spread, in turn: most less least cents, the size it is for, and whether it moves together with the next. */
interface Widths {
  cents: Float64Array;
  sizes: Uint8Array;
  withNext: Uint8Array;
}

/** A fresh row for the figures of a batch. */
export const emptyFigures = (): Float64Array => new Float64Array(WIDTH);

/** All figures of a batch: each size times its row of the list. Written into `figures`, which is handed back. */
export function multiplyOut({ perSize }: PriceList, sizes: readonly number[], figures: Float64Array): Float64Array {
  // Four sums side by side: a single one would wait for itself at every step, and this is most of an estimate's time.
  for (let place = 0; place < WIDTH; place += 4) {
    let [first, second, third, fourth] = [0, 0, 0, 0];
    for (let size = 0, at = place; at < perSize.length; size += 1, at += WIDTH) {
      const times = sizes[size] ?? 0;
      first += (perSize[at] ?? 0) * times;
      second += (perSize[at + 1] ?? 0) * times;
      third += (perSize[at + 2] ?? 0) * times;
      fourth += (perSize[at + 3] ?? 0) * times;
    }
    figures[place] = first;
    figures[place + 1] = second;
    figures[place + 2] = third;
    figures[place + 3] = fourth;
  }
  return figures;
}

/** What a batch costs by a list: mean, cents with fractions. Enough to find the cheapest way. */
export function meanByList({ meanCents }: PriceList, sizes: readonly number[]): number {
  let cents = 0;
  for (let size = 0; size < meanCents.length; size += 1) cents += (meanCents[size] ?? 0) * (sizes[size] ?? 0);
  return cents;
}

/** Variance of what a batch costs: of things that are independent it adds; things that move together are one. */
export function varianceByList({ widths }: PriceList, sizes: readonly number[]): number {
  const { cents, sizes: places, withNext } = widths;
  let variance = 0;
  let width = 0;
  for (let term = 0; term < cents.length; term += 1) {
    width += (cents[term] ?? 0) * (sizes[places[term] ?? 0] ?? 0);
    if (withNext[term] === 1) continue;
    variance += (width / 6) ** 2;
    width = 0;
  }
  return variance;
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
  const { quantity, batchAreaDm2, platingMinutes, valueCents, layers } = batch;
  // With room for the three layers that most stacks have; what a list has no row for is not read.
  const sizes = [1, quantity, batchAreaDm2, platingMinutes, valueCents, 0, 0, 0];
  for (let layer = 0; layer < layers.length; layer += 1) {
    sizes[FIRST_LAYER + layer] = batchAreaDm2 * (layers[layer]?.thicknessUm ?? 0);
  }
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
  const meanCents = new Float64Array(FIRST_LAYER + way.rows.length);
  const spreads = reworkTerms({ way, ...facts }).map((term): UnitSpread => {
    const size = placeOf(term.per);
    const add = (figure: Figure, amount: number) => {
      const at = size * WIDTH + FIGURE_AT[figure];
      perSize[at] = (perSize[at] ?? 0) + amount;
    };
    const ends = addTerm(term, rates, minutesCorrection, add);
    meanCents[size] = (meanCents[size] ?? 0) + pertMean(ends);
    const { name, withNext = false } = term;
    return { name, size, withNext, lowCents: ends.low, highCents: ends.high };
  });
  const widths = {
    cents: Float64Array.from(spreads, ({ lowCents, highCents }) => highCents - lowCents),
    sizes: Uint8Array.from(spreads, (spread) => spread.size),
    withNext: Uint8Array.from(spreads, (spread) => Number(spread.withNext)),
  };
  return { way, perSize, meanCents, spreads, widths };
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
  add("leastCents", ends.low);
  add("mostCents", ends.high);
  return ends;
}
