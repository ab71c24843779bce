import type { StageFound } from "@/lib/cases/case-words";
import { HARDNESS, REFERENCE_HV } from "@/lib/costs/hardness";
import { addTogether, certainly, inverseOf, timesFactor, type ThreePoint } from "@/lib/costs/pert";
import { metalPrice, type ShopRates } from "@/lib/costs/rates";
import type { ReworkTimes } from "@/lib/costs/rework-times";
import type { StripMethod } from "@/lib/costs/strip-methods";
import type { StripStep } from "@/lib/costs/strip-plan";
import { layerMassG } from "@/lib/plating/faraday";
import { metalOf } from "@/lib/plating/metals";
import { usualPlateMinutes } from "@/lib/plating/plate-practice";

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
 * One thing that nobody knows exactly, and all that hangs on it. Hands-on and tank minutes of one term move together
 * (a slow bath costs both), so they are one figure for the range; terms among themselves are independent.
 */
export interface ReworkTerm {
  name: string;
  handsOnMinutes?: ThreePoint;
  tankMinutes?: ThreePoint;
  /** Cents that are neither labour nor line time, by line. */
  cents?: { line: CostLine; amount: ThreePoint }[];
}

/** What the terms are worked out from; everything is checked before it comes here. */
export interface ReworkFacts {
  quantity: number;
  areaDm2: number;
  stageFound: StageFound;
  method: StripMethod;
  steps: readonly StripStep[];
  partValueCents: number;
  rates: ShopRates;
  times: ReworkTimes;
}

/** All terms of one batch. What scales with parts, area or thickness does so here; set-up and return are once a batch. */
export function reworkTerms(facts: ReworkFacts): ReworkTerm[] {
  const terms = [setUpTerm(facts), handlingTerm(facts), ...facts.steps.map((step) => stepTerm(step, facts))];
  const { times, quantity, areaDm2 } = facts;
  if (facts.steps.some((step) => step.kind === "dissolve")) {
    const polish = timesFactor(times.afterStripPolishMinutesPerDm2, quantity * areaDm2);
    const abrasive = timesFactor(polish, facts.rates.abrasiveCentsPerMinute);
    terms.push({
      name: "Polish after the bath",
      handsOnMinutes: polish,
      cents: [{ line: "chemistry", amount: abrasive }],
    });
  }
  terms.push(lineAgainTerm(facts), platingTerm(facts), metalTerm(facts), scrapTerm(facts));
  if (facts.stageFound === "returned") terms.push({ name: "Handling the return", handsOnMinutes: times.returnMinutes });
  return terms;
}

function setUpTerm({ stageFound, method, times }: ReworkFacts): ReworkTerm {
  const minutes = stageFound === "at-strike" ? times.setUpAtStrikeMinutes : times.setUpMinutes;
  return { name: "Set-up minutes", handsOnMinutes: minutes[method] };
}

function handlingTerm({ stageFound, quantity, times }: ReworkFacts): ReworkTerm {
  const each = stageFound === "at-strike" ? times.handlingAtStrikeMinutesPerPart : times.handlingMinutesPerPart;
  return { name: "Handling each part", handsOnMinutes: timesFactor(each, quantity) };
}

function stepTerm(step: StripStep, facts: ReworkFacts): ReworkTerm {
  const areaDm2 = facts.quantity * facts.areaDm2;
  const { metal, thicknessUm } = step.layer;
  if (step.kind === "polish") {
    const { minutesPerDm2Um: rate } = step.row;
    const { hv } = HARDNESS[metal];
    const per = (areaDm2 * thicknessUm) / REFERENCE_HV;
    const minutes = {
      low: rate.low * hv.low * per,
      likely: rate.likely * hv.likely * per,
      high: rate.high * hv.high * per,
    };
    const abrasive = timesFactor(minutes, facts.rates.abrasiveCentsPerMinute);
    return {
      name: `Polishing the ${metalOf(metal).name}`,
      handsOnMinutes: minutes,
      cents: [{ line: "chemistry", amount: abrasive }],
    };
  }
  const loads = areaDm2 / facts.times.loadDm2;
  const { rateUmPerMin: rate, holdingGPerL: holding } = step.row;
  // A slow bath is the high end of the minutes; a litre that holds little is the high end of the litres.
  const tank = timesFactor(inverseOf(rate), thicknessUm * loads);
  const litres = timesFactor(inverseOf(holding), layerMassG(step.layer, areaDm2, thicknessUm));
  return {
    name: `Stripping the ${metalOf(metal).name}`,
    handsOnMinutes: timesFactor(tank, facts.times.attendedShare),
    tankMinutes: tank,
    cents: [
      { line: "chemistry", amount: timesFactor(litres, step.row.solutionCentsPerL ?? facts.rates.solutionCentsPerL) },
      { line: "waste", amount: timesFactor(litres, facts.rates.wasteCentsPerL) },
    ],
  };
}

function lineAgainTerm({ stageFound, quantity, areaDm2, times }: ReworkFacts): ReworkTerm {
  const loads = (quantity * areaDm2) / times.loadDm2;
  if (stageFound === "at-strike") {
    return {
      name: "The line again",
      handsOnMinutes: timesFactor(times.lineToStrikeMinutesPerPart, quantity),
      tankMinutes: timesFactor(times.lineToStrikeTankMinutes, loads),
    };
  }
  return {
    name: "The line again",
    handsOnMinutes: timesFactor(
      addTogether(times.lineToStrikeMinutesPerPart, times.lineBeyondStrikeMinutesPerPart),
      quantity,
    ),
    tankMinutes: timesFactor(addTogether(times.lineToStrikeTankMinutes, times.lineBeyondStrikeTankMinutes), loads),
  };
}

function platingTerm({ steps, quantity, areaDm2, times }: ReworkFacts): ReworkTerm {
  let minutes = 0;
  for (const { layer } of steps) minutes += usualPlateMinutes(layer);
  const tank = timesFactor(times.platingTimeFactor, (minutes * quantity * areaDm2) / times.loadDm2);
  return { name: "Plating again", handsOnMinutes: timesFactor(tank, times.attendedShare), tankMinutes: tank };
}

function metalTerm(facts: ReworkFacts): ReworkTerm {
  let writtenOff = 0;
  let again = 0;
  for (const step of facts.steps) {
    const massG = layerMassG(step.layer, facts.quantity * facts.areaDm2, step.layer.thicknessUm);
    const price = metalPrice(facts.rates, step.layer.metal);
    writtenOff += massG * price * lostShare(step, facts.rates);
    again += massG * price;
  }
  return {
    name: "Metal",
    cents: [
      { line: "metalWrittenOff", amount: certainly(writtenOff) },
      { line: "metalAgain", amount: certainly(again) },
    ],
  };
}

function scrapTerm({ stageFound, method, quantity, partValueCents, times }: ReworkFacts): ReworkTerm {
  const share = stageFound === "at-strike" ? times.scrapShareAtStrike : times.scrapShareAfterPlate[method];
  return { name: "Scrap risk", cents: [{ line: "scrapRisk", amount: timesFactor(share, quantity * partValueCents) }] };
}

/** Share of a layer's metal that does not come back as money. Polishing brings nothing back. */
export function lostShare(step: StripStep, rates: ShopRates): number {
  return step.kind === "polish" ? 1 : 1 - (rates.recoveryShare[step.layer.metal] ?? 0);
}
