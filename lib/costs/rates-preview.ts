import type { BaseMetal, StageFound } from "@/lib/cases/case-words";
import { checkCents } from "@/lib/costs/check-cost";
import type { ReworkFigures } from "@/lib/costs/estimate-plan";
import type { MinutesCorrections } from "@/lib/costs/estimate-record";
import { withStartingPrices } from "@/lib/costs/metal-prices";
import type { RateFigures } from "@/lib/costs/rate-fields";
import { reworkFigures } from "@/lib/costs/strip-estimate";
import type { StripMethod } from "@/lib/costs/strip-methods";
import type { StripTable } from "@/lib/costs/strip-plan";
import type { Layer } from "@/lib/plating/deposit-stack";

/** A rework to try rates on: a case of the shop, or its usual job. Plain data, so that the browser can work it out. */
export interface RatesExample {
  quantity: number;
  areaDm2: number;
  baseMetal: BaseMetal;
  /** From the base out. */
  stack: readonly Layer[];
  /** Null: nobody said; scrap risk is then left out. */
  partValueCents: number | null;
  stageFound: StageFound;
  method: StripMethod | null;
  minutesCorrection: MinutesCorrections;
}

/** One line of cost under both rates. */
export interface PreviewLine {
  key: ReworkFigures["lines"][number]["key"];
  name: string;
  nowCents: number;
  thenCents: number;
}

/** The rework at one stage under both rates. The lines add up to the whole, now and then, to the cent. */
export interface PreviewStage {
  now: Pick<ReworkFigures, "method" | "meanCents" | "low90Cents" | "high90Cents">;
  then: Pick<ReworkFigures, "method" | "meanCents" | "low90Cents" | "high90Cents">;
  lines: PreviewLine[];
}

export interface RatesPreview {
  /** After the final plate, or sent back, where the example was. */
  later: PreviewStage;
  atStrike: PreviewStage;
  /** One look at one part, at its usual seconds. Cents with a fraction. */
  check: { nowCents: number; thenCents: number };
  /** Share of bad parts above which looking at every one pays, for parts like these; null where later is no dearer. */
  breakEven: { now: number; then: number } | null;
}

/**
 * What new rates do to a rework, before anything is saved: the same parts, minutes and materials, priced twice. Throws
 * `InputError` naming the field. A metal without a price counts at its starting price, as it does for cases.
 */
export function previewRates(
  example: RatesExample,
  table: StripTable,
  now: RateFigures,
  then: RateFigures,
): RatesPreview {
  const stageFound = example.stageFound === "at-strike" ? "after-final-plate" : example.stageFound;
  const stage = (at: StageFound, method: StripMethod | null) =>
    compare(priced(example, table, now, at, method), priced(example, table, then, at, method));
  const later = stage(stageFound, example.method);
  const atStrike = stage("at-strike", null);
  const check = {
    nowCents: checkCents(now.labourCentsPerHour),
    thenCents: checkCents(then.labourCentsPerHour),
  };
  const missNow = (later.now.meanCents - atStrike.now.meanCents) / example.quantity;
  const missThen = (later.then.meanCents - atStrike.then.meanCents) / example.quantity;
  const hasMiss = missNow > 0 && missThen > 0;
  const breakEven = hasMiss ? { now: check.nowCents / missNow, then: check.thenCents / missThen } : null;
  return { later, atStrike, check, breakEven };
}

function priced(
  { method: _own, partValueCents, ...example }: RatesExample,
  table: StripTable,
  figures: RateFigures,
  stageFound: StageFound,
  method: StripMethod | null,
): ReworkFigures {
  const { rates } = withStartingPrices({ ...figures, validFromAt: 0 }, example.stack);
  return reworkFigures({
    ...example,
    table,
    stageFound,
    rates,
    method: method ?? undefined,
    partValueCents: partValueCents ?? undefined,
  });
}

function compare(now: ReworkFigures, then: ReworkFigures): PreviewStage {
  return {
    now,
    then,
    lines: now.lines
      .map(({ key, name, meanCents }) => ({
        key,
        name: withMinutes(key, name, now),
        nowCents: meanCents,
        thenCents: then.lines.find((line) => line.key === key)?.meanCents ?? 0,
      }))
      .filter(({ nowCents, thenCents }) => nowCents > 0 || thenCents > 0),
  };
}

function withMinutes(key: PreviewLine["key"], name: string, { minutes, tankMinutes }: ReworkFigures): string {
  if (key === "labour") return `${name}, ${Math.round(minutes.mean)} min`;
  if (key === "line") return `${name}, ${Math.round(tankMinutes.mean)} min`;
  return name;
}
