import type { Correction } from "@/lib/costs/correction";
import { HARDNESS } from "@/lib/costs/hardness";
import type { ThreePoint } from "@/lib/costs/pert";
import { RATE_FIELDS, rateWords, type RateField } from "@/lib/costs/rate-fields";
import type { StripReckoning } from "@/lib/costs/reckon-strip";
import { USUAL_REWORK_TIMES } from "@/lib/costs/rework-times";
import { STARTING_RATES_SOURCE } from "@/lib/costs/starting-rates";
import { STRIP_METHOD_TITLES, type DissolvingRow } from "@/lib/costs/strip-methods";
import type { StripStep } from "@/lib/costs/strip-plan";
import { figureWords, metalTitle } from "@/lib/costs/strip-words";
import type { NotEnough } from "@/lib/input-error";
import { metalOf } from "@/lib/plating/metals";

/** Where a figure comes from: named in print, from memory, some of each, or set by the shop. */
export type SourceKind = "published" | "memory" | "part" | "shop";

/** One figure that the estimate rests on. */
export interface BasisRow {
  figure: string;
  value: string;
  from: string;
  kind: SourceKind;
}

/** Kind of a source as the tables write it: clauses parted by semicolons, those from memory say so. */
export function sourceKind(source: string): Exclude<SourceKind, "shop"> {
  const fromMemory = source.split(";").map((clause) => clause.includes("from memory"));
  if (fromMemory.every(Boolean)) return "memory";
  return fromMemory.some(Boolean) ? "part" : "published";
}

/** What the shown rates rest on, and since when. */
export interface RatesWords {
  /** "1 Jun 2026" */
  from: string;
  source: string;
  currency: string;
}

/** The trade's figures behind the way that is shown: baths and rates of each layer, polishing, times. */
export function basisRows({ chosen }: StripReckoning): BasisRow[] {
  const rows = [...chosen.steps.flatMap(stepRows), timesRow()];
  const seen = new Set<string>();
  return rows.filter((row) => !seen.has(row.figure + row.value) && seen.add(row.figure + row.value));
}

function stepRows(step: StripStep): BasisRow[] {
  const title = metalTitle(step.layer.metal);
  if (step.kind === "dissolve") return bathRows(step.row, title);
  const hardness = HARDNESS[step.layer.metal];
  return [
    row("Polishing", `${between(step.row.minutesPerDm2Um)} min per dm² and µm at 100 HV`, step.row.source),
    row(`${title}, hardness`, `${between(hardness.hv)} HV`, hardness.source),
  ];
}

function bathRows(bath: DissolvingRow, title: string): BasisRow[] {
  const { low, likely, high } = bath.rateUmPerMin;
  const isSlow = likely < 1;
  const factor = isSlow ? 60 : 1;
  const rate = `${between({ low: low * factor, likely: likely * factor, high: high * factor })} µm/${isSlow ? "h" : "min"}`;
  return [
    row(`${title} off`, bath.solution, bath.source),
    row(`${title}, rate`, bath.current ? `${rate} at ${bath.current}` : rate, bath.rateSource),
    row(`${title}, a litre holds`, `${between(bath.holdingGPerL)} g`, bath.holdingSource ?? "from memory"),
  ];
}

function timesRow(): BasisRow {
  return row("Set-up, handling, line, scrap", "Minutes and shares of a small job shop", USUAL_REWORK_TIMES.source);
}

/** The shop's rates behind it: time, solution, waste, and the metals that are on the part. */
export function rateRows({ chosen, rates }: StripReckoning, words: RatesWords): BasisRow[] {
  const metals = new Set(chosen.steps.map((step) => step.layer.metal));
  const isMemory = words.source === STARTING_RATES_SOURCE;
  const from = isMemory
    ? `${words.source.charAt(0).toUpperCase()}${words.source.slice(1)}`
    : `Shop's rate, ${words.from}`;
  const isShown = (field: RateField) =>
    field.metal === undefined || (metals.has(field.metal) && field.read(rates) !== undefined);
  return RATE_FIELDS.filter(isShown).map((field) => ({
    figure: field.group === "metal" ? `${field.label}, price` : field.label,
    value: rateWords(field, field.read(rates), words.currency),
    from,
    kind: isMemory ? "memory" : "shop",
  }));
}

/** What the shop's own jobs say to the minutes of this way. */
export function correctionWords(
  method: StripReckoning["chosen"]["method"],
  correction: Correction | NotEnough,
): string {
  const way = STRIP_METHOD_TITLES[method].toLowerCase();
  if (!correction.enough) return `Not enough jobs yet by ${way}: ${correction.have} of ${correction.need}`;
  return `Minutes × ${figureWords(correction.ratio)}, from ${correction.pairs} jobs by ${way}`;
}

/** What to do about a thing that widens the range; undefined where nothing simple helps. */
export function narrowWords(name: string): string | undefined {
  if (name === "Scrap risk") return "Strip one part first. If it gauges true, most of the width goes.";
  if (name.startsWith("Thickness of")) return "Measure it on one part.";
  if (name.startsWith("Stripping the")) return "Time the first load, then work it out again.";
  if (name.startsWith("Polishing the")) return "Polish one part against the clock.";
  return undefined;
}

/** The spread with one share a name: layers of one metal that are polished one by one are one thing to a reader. */
export function spreadByName(spread: readonly { name: string; share: number }[]): { name: string; share: number }[] {
  const shares = new Map<string, number>();
  for (const { name, share } of spread) shares.set(name, (shares.get(name) ?? 0) + share);
  return [...shares].map(([name, share]) => ({ name, share })).toSorted((a, b) => b.share - a.share);
}

/** The chance of scrap behind a way, "2 to 18%". */
export function scrapWords({ chosen, batch }: StripReckoning): string {
  const { scrapShareAtStrike, scrapShareAfterPlate } = USUAL_REWORK_TIMES;
  const share = batch.stageFound === "at-strike" ? scrapShareAtStrike : scrapShareAfterPlate[chosen.method];
  return `${figureWords(share.low * 100)} to ${figureWords(share.high * 100)}%`;
}

/** The thickness range behind a layer's name, when one was given: "0.6 to 1.2 µm". */
export function thicknessRangeWords({ batch }: StripReckoning, name: string): string | undefined {
  const layer = batch.stack.find(
    (each, index) => name === `Thickness of the ${metalOf(each.metal).name}, layer ${index + 1}`,
  );
  if (layer?.thicknessLowUm === undefined || layer.thicknessHighUm === undefined) return undefined;
  return `${figureWords(layer.thicknessLowUm)} to ${figureWords(layer.thicknessHighUm)} µm`;
}

function row(figure: string, value: string, source: string): BasisRow {
  return { figure, value, from: source.charAt(0).toUpperCase() + source.slice(1), kind: sourceKind(source) };
}

function between({ low, high }: ThreePoint): string {
  return `${figureWords(low)} to ${figureWords(high)}`;
}
