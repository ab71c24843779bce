import type { BaseMetal, Closing, StageFound } from "@/lib/cases/case-words";
import { NO_PART_VALUE, type ReworkFigures } from "@/lib/costs/estimate-plan";
import type { MinutesCorrections } from "@/lib/costs/estimate-record";
import { HIGHEST_RATE_CENTS, type ShopRates } from "@/lib/costs/rates";
import { COST_LINES, type CostLine } from "@/lib/costs/rework-terms";
import type { StripMethod } from "@/lib/costs/strip-methods";
import type { StripTable } from "@/lib/costs/strip-plan";
import { requireBetween } from "@/lib/input-error";
import { centsForMinutes, splitCents } from "@/lib/money";
import type { Layer } from "@/lib/plating/deposit-stack";

/** What is known of a case when its cost is asked for. `null`: nobody said; a usual value stands in and is named. */
export interface CaseCostInput {
  quantity: number;
  areaDm2: number | null;
  baseMetal: BaseMetal;
  /** The job's whole deposit from the base out. */
  stack: readonly Layer[] | null;
  stageFound: StageFound;
  partValueCents: number | null;
  rates: ShopRates;
  method?: StripMethod | null;
  /** Rounds of rework so far, the present one included. */
  rounds?: number;
  minutesCorrection?: number | MinutesCorrections;
  /** The shop's ways to take a deposit off on the case's day; left out: those that ship. */
  table?: StripTable;
  /** How the case was closed, when it was. */
  closing?: Closing | null;
  /** From the rework cards of all rounds, once they are done. */
  recorded?: RecordedRework | null;
}

/** What a done rework card says it took. Materials left out: the estimate of materials stays. */
export interface RecordedRework {
  minutes: number;
  tankMinutes?: number | null;
  materialsCents?: number | null;
}

/** The lines of a case: those of an estimate, and what only a closed case has. */
export const CASE_LINES = { ...COST_LINES, materials: "Materials recorded", partsScrapped: "Parts scrapped" } as const;
export type CaseLine = CostLine | "materials" | "partsScrapped";

/** What a case costs, and what the figure rests on. The lines add up to `meanCents` to the cent; lines of 0 are left out. */
export interface CaseCost {
  basis: "estimated" | "recorded" | "scrapped" | "no rework";
  meanCents: number;
  low90Cents: number;
  high90Cents: number;
  lines: { key: CaseLine; name: string; meanCents: number }[];
  /** Hands-on minutes, all rounds. */
  minutes: number;
  metalWrittenOffG: number;
  method: StripMethod | null;
  assumed: string[];
}

/** The estimate once per round: means add, and so do variances, so the range widens with the root of the rounds. */
export function estimatedCost(estimate: ReworkFigures, assumed: string[], rounds: number): CaseCost {
  const root = Math.sqrt(rounds);
  const lines: CaseCost["lines"] = [];
  // Whole cents once are whole cents each time: nothing is left to round.
  for (const { key, name, meanCents } of estimate.lines) {
    if (meanCents > 0) lines.push({ key, name, meanCents: meanCents * rounds });
  }
  const meanCents = estimate.meanCents * rounds;
  return {
    basis: "estimated",
    meanCents,
    low90Cents: Math.max(0, Math.round(meanCents - (estimate.meanCents - estimate.low90Cents) * root)),
    high90Cents: Math.round(meanCents + (estimate.high90Cents - estimate.meanCents) * root),
    lines,
    minutes: estimate.minutes.mean * rounds,
    metalWrittenOffG: estimate.metalWrittenOffG * rounds,
    method: estimate.method,
    assumed,
  };
}

const ESTIMATED_MATERIALS: readonly CaseLine[] = ["metalWrittenOff", "metalAgain", "chemistry", "waste"];

/** Recorded figures in place of estimated ones. The parts came through, so no scrap risk is left. */
export function recordedCost(
  input: CaseCostInput,
  estimate: ReworkFigures,
  assumed: string[],
  rounds: number,
): CaseCost {
  const { minutes, tankMinutes, materialsCents } = input.recorded ?? { minutes: 0 };
  const estimated = new Map<CaseLine, number>(estimate.lines.map(({ key, meanCents }) => [key, meanCents * rounds]));
  const kept: [CaseLine, number][] = [];
  const recorded: [CaseLine, number][] = [["labour", centsForMinutes(minutes, input.rates.labourCentsPerHour)]];
  if (isGiven(tankMinutes)) recorded.push(["line", centsForMinutes(tankMinutes, input.rates.lineCentsPerHour)]);
  else kept.push(["line", estimated.get("line") ?? 0]);
  if (isGiven(materialsCents)) recorded.push(["materials", materialsCents]);
  else kept.push(...ESTIMATED_MATERIALS.map((key): [CaseLine, number] => [key, estimated.get(key) ?? 0]));
  // What is still estimated is as uncertain, in proportion, as the whole estimate was.
  const share =
    estimate.meanCents === 0 ? 0 : kept.reduce((sum, [, cents]) => sum + cents, 0) / (estimate.meanCents * rounds);
  const stillAssumed = assumed.filter((words) => words !== NO_PART_VALUE);
  return caseCostOf("recorded", [...recorded, ...kept], {
    below: (estimate.meanCents - estimate.low90Cents) * Math.sqrt(rounds) * share,
    above: (estimate.high90Cents - estimate.meanCents) * Math.sqrt(rounds) * share,
    minutes,
    metalWrittenOffG: estimate.metalWrittenOffG * rounds,
    method: estimate.method,
    assumed: kept.length > 0 ? [...stillAssumed, STILL_ESTIMATED] : [],
  });
}

const STILL_ESTIMATED = "Minutes are recorded; line time or materials are still the estimate.";
const NO_VALUE_SCRAPPED = "No part value given: the scrapped parts count as nothing.";

/** Scrapped: the parts' value, the metal on them and the work that went in. Nothing is left uncertain. */
export function scrappedCost(input: CaseCostInput, estimate: ReworkFigures, assumed: string[]): CaseCost {
  const others = assumed.filter((words) => words !== NO_PART_VALUE);
  const metal = estimate.lines.find(({ key }) => key === "metalWrittenOff")?.meanCents ?? 0;
  const work = workOnlyCost(input, "scrapped");
  return caseCostOf(
    "scrapped",
    [
      ...work.lines.map(({ key, meanCents }): [CaseLine, number] => [key, meanCents]),
      ["metalWrittenOff", metal],
      ["partsScrapped", (input.partValueCents ?? 0) * input.quantity],
    ],
    {
      below: 0,
      above: 0,
      minutes: work.minutes,
      metalWrittenOffG: estimate.metalWrittenOffG,
      method: null,
      assumed: input.partValueCents === null ? [...others, NO_VALUE_SCRAPPED] : others,
    },
  );
}

/** Only what was recorded: nothing had to be put right. */
export function workOnlyCost(input: CaseCostInput, basis: "scrapped" | "no rework"): CaseCost {
  requireBetween("labourCentsPerHour", input.rates.labourCentsPerHour, 0, HIGHEST_RATE_CENTS);
  const { minutes, materialsCents } = input.recorded ?? { minutes: 0 };
  const lines: [CaseLine, number][] = [["labour", centsForMinutes(minutes, input.rates.labourCentsPerHour)]];
  if (isGiven(materialsCents)) lines.push(["materials", materialsCents]);
  return caseCostOf(basis, lines, { below: 0, above: 0, minutes, metalWrittenOffG: 0, method: null, assumed: [] });
}

type CaseCostRest = Pick<CaseCost, "minutes" | "metalWrittenOffG" | "method" | "assumed"> & {
  below: number;
  above: number;
};

function caseCostOf(
  basis: CaseCost["basis"],
  exact: readonly (readonly [CaseLine, number])[],
  rest: CaseCostRest,
): CaseCost {
  const cents = splitCents(exact.map(([, amount]) => amount));
  const meanCents = cents.reduce((sum, amount) => sum + amount, 0);
  return {
    basis,
    meanCents,
    low90Cents: Math.max(0, Math.round(meanCents - rest.below)),
    high90Cents: Math.round(meanCents + rest.above),
    lines: exact
      .map(([key], index) => ({ key, name: CASE_LINES[key], meanCents: cents[index] ?? 0 }))
      .filter((line) => line.meanCents > 0),
    minutes: rest.minutes,
    metalWrittenOffG: rest.metalWrittenOffG,
    method: rest.method,
    assumed: rest.assumed,
  };
}

/** Throws `InputError` for recorded figures below 0 or absurd. */
export function checkRecorded({ minutes, tankMinutes, materialsCents }: RecordedRework): void {
  requireBetween("recorded.minutes", minutes, 0, 1e6);
  if (isGiven(tankMinutes)) requireBetween("recorded.tankMinutes", tankMinutes, 0, 1e6);
  if (isGiven(materialsCents)) requireBetween("recorded.materialsCents", materialsCents, 0, 1e12);
}

const isGiven = (value: number | null | undefined): value is number => value !== null && value !== undefined;
