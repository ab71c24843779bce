import type { StageFound } from "@/lib/cases/case-words";
import type { AllowedWay } from "@/lib/costs/allowed-ways";
import { HARDNESS, REFERENCE_HV } from "@/lib/costs/hardness";
import { certainly, inverseOf, timesFactor, type ThreePoint } from "@/lib/costs/pert";
import { metalPrice, type ShopRates } from "@/lib/costs/rates";
import type { ReworkTimes } from "@/lib/costs/rework-times";
import type { DissolvingRow, PolishingRow } from "@/lib/costs/strip-methods";
import { layerMassG } from "@/lib/plating/faraday";
import { metalOf, type DepositMetal } from "@/lib/plating/metals";

/** The lines of an estimate, in the order in which they are shown. */
export const COST_LINES = {
  labour: "Labour",
  line: "Line time",
  metalWrittenOff: "Metal written off",
  metalAgain: "Metal again",
  chemistry: "Chemistry",
  waste: "Waste",
  scrapRisk: "Scrap risk",
} as const;
export type CostLine = keyof typeof COST_LINES;
export const COST_LINE_KEYS = Object.keys(COST_LINES) as [CostLine, ...CostLine[]];

/**
 * What a term grows with: nothing (once a batch), the parts, their area in dm², the plating minutes of their loads, the
 * value of the parts in cents, or the area in dm² times the thickness in µm of one layer.
 */
export type GrowsWith = "batch" | "parts" | "area" | "plating" | "value" | { layer: number };

/**
 * One thing that nobody knows exactly, for one unit of what it grows with, and all that hangs on it. Hands-on and tank
 * minutes of one term move together (a slow bath costs both), so they are one figure for the range; terms among
 * themselves are independent.
 */
export interface ReworkTerm {
  name: string;
  per: GrowsWith;
  /** It moves together with the term that follows, as one: a slow day makes both long. */
  withNext?: true;
  handsOnMinutes?: ThreePoint;
  tankMinutes?: ThreePoint;
  /** Cents that are neither labour nor line time, by line. */
  cents?: { line: CostLine; amount: ThreePoint }[];
  /** Metal that does not come back as money. */
  metalLostG?: number;
}

/** What the terms hang on; the size of the batch is no part of it. */
export interface TermFacts {
  way: AllowedWay;
  stageFound: StageFound;
  rates: ShopRates;
  times: ReworkTimes;
}

/** All terms of one way. Set-up and the return are once a batch; everything else grows with something. */
export function reworkTerms(facts: TermFacts): ReworkTerm[] {
  const { way, stageFound, times } = facts;
  const atStrike = stageFound === "at-strike";
  const setUp = atStrike ? times.setUpAtStrikeMinutes : times.setUpMinutes;
  const handling = atStrike ? times.handlingAtStrikeMinutesPerPart : times.handlingMinutesPerPart;
  const scrap = atStrike ? times.scrapShareAtStrike : times.scrapShareAfterPlate[way.method];
  const terms: ReworkTerm[] = [
    { name: "Set-up minutes", per: "batch", handsOnMinutes: setUp[way.method] },
    { name: "Handling each part", per: "parts", handsOnMinutes: handling },
    ...layerTerms(facts),
    ...lineTerms(times, atStrike),
    { name: "Scrap risk", per: "value", cents: [{ line: "scrapRisk", amount: scrap }] },
  ];
  if (stageFound === "returned") {
    terms.push({ name: "Handling the return", per: "batch", handsOnMinutes: times.returnMinutes });
  }
  return terms;
}

/** Each layer off, from the top one down, and after a bath a light polish. */
function layerTerms(facts: TermFacts): ReworkTerm[] {
  const { way, times, rates } = facts;
  const terms = way.rows.map((row, index): ReworkTerm => {
    const metal = way.metals[index];
    if (metal === undefined) throw new RangeError(`The way has a row for layer ${index + 1}, which is not there.`);
    return row.method === "polish-back"
      ? polishingTerm(row, metal, index, rates)
      : strippingTerm(row, metal, index, facts);
  });
  terms.reverse();
  if (way.rows.some((row) => row.method !== "polish-back")) {
    terms.push({
      name: "Polish after the bath",
      per: "area",
      ...polishing(times.afterStripPolishMinutesPerDm2, rates),
    });
  }
  return terms;
}

function polishingTerm(row: PolishingRow, metal: DepositMetal, layer: number, rates: ShopRates): ReworkTerm {
  const { minutesPerDm2Um: rate } = row;
  const { hv } = HARDNESS[metal];
  const minutes = {
    low: (rate.low * hv.low) / REFERENCE_HV,
    likely: (rate.likely * hv.likely) / REFERENCE_HV,
    high: (rate.high * hv.high) / REFERENCE_HV,
  };
  const { handsOnMinutes, cents } = polishing(minutes, rates);
  // Polishing brings no metal back.
  const metalAgain = metalTerm(metal, 0, rates);
  const name = `Polishing the ${metalOf(metal).name}`;
  return { name, per: { layer }, handsOnMinutes, ...metalAgain, cents: [...cents, ...metalAgain.cents] };
}

/** Polishing uses up abrasive as long as it lasts. */
function polishing(minutes: ThreePoint, rates: ShopRates) {
  const abrasive = timesFactor(minutes, rates.abrasiveCentsPerMinute);
  return { handsOnMinutes: minutes, cents: [{ line: "chemistry" as const, amount: abrasive }] };
}

function strippingTerm(row: DissolvingRow, metal: DepositMetal, layer: number, facts: TermFacts): ReworkTerm {
  const { times, rates } = facts;
  // A slow bath is the high end of the minutes; a litre that holds little is the high end of the litres.
  const tankMinutes = timesFactor(inverseOf(row.rateUmPerMin), 1 / times.loadDm2);
  const litres = timesFactor(inverseOf(row.holdingGPerL), layerMassG({ metal }, 1, 1));
  const metalAgain = metalTerm(metal, rates.recoveryShare[metal] ?? 0, rates);
  return {
    name: `Stripping the ${metalOf(metal).name}`,
    per: { layer },
    tankMinutes,
    handsOnMinutes: timesFactor(tankMinutes, times.attendedShare),
    ...metalAgain,
    cents: [
      { line: "chemistry", amount: timesFactor(litres, row.solutionCentsPerL ?? rates.solutionCentsPerL) },
      { line: "waste", amount: timesFactor(litres, rates.wasteCentsPerL) },
      ...metalAgain.cents,
    ],
  };
}

/** Metal of a layer of 1 µm on 1 dm²: what is lost of it, and what it costs to put on again. Without doubt. */
function metalTerm(metal: DepositMetal, recoveredShare: number, rates: ShopRates) {
  const massG = layerMassG({ metal }, 1, 1);
  const worth = massG * metalPrice(rates, metal);
  const lost = 1 - recoveredShare;
  return {
    metalLostG: massG * lost,
    cents: [
      { line: "metalWrittenOff" as const, amount: certainly(worth * lost) },
      { line: "metalAgain" as const, amount: certainly(worth) },
    ],
  };
}

/** The whole line again up to the strike, later through to the end; and the plating itself. */
function lineTerms(times: ReworkTimes, atStrike: boolean): ReworkTerm[] {
  const name = "The line again";
  const perDm2 = 1 / times.loadDm2;
  const terms: ReworkTerm[] = [
    { name, per: "parts", withNext: true, handsOnMinutes: times.lineToStrikeMinutesPerPart },
    { name, per: "area", tankMinutes: timesFactor(times.lineToStrikeTankMinutes, perDm2) },
  ];
  if (!atStrike) {
    terms.unshift(
      { name, per: "parts", withNext: true, handsOnMinutes: times.lineBeyondStrikeMinutesPerPart },
      { name, per: "area", withNext: true, tankMinutes: timesFactor(times.lineBeyondStrikeTankMinutes, perDm2) },
    );
  }
  const tankMinutes = times.platingTimeFactor;
  const handsOnMinutes = timesFactor(tankMinutes, times.attendedShare);
  return [...terms, { name: "Plating again", per: "plating", tankMinutes, handsOnMinutes }];
}
