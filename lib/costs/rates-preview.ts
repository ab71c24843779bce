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
  const moves = movingLines(example, now, then);
  const stage = (at: StageFound, method: StripMethod | null) =>
    compare(priced(example, table, now, at, method), priced(example, table, then, at, method), moves);
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

function compare(now: ReworkFigures, then: ReworkFigures, moves: ReadonlySet<PreviewLine["key"]>): PreviewStage {
  const lines = now.lines.map(({ key, name, meanCents }) => ({
    key,
    name: withMinutes(key, name, now),
    nowCents: meanCents,
    thenCents: then.lines.find((line) => line.key === key)?.meanCents ?? 0,
  }));
  const settled = now.method === then.method ? settleRounding(lines, moves) : lines;
  return { now, then, lines: settled.filter(({ nowCents, thenCents }) => nowCents > 0 || thenCents > 0) };
}

/**
 * Rounding to whole cents can lift a line that no changed rate touches by a cent. Such a line stays as it was, and the
 * cent goes to the line that moves most, so that the lines still add up.
 */
function settleRounding(lines: readonly PreviewLine[], moves: ReadonlySet<PreviewLine["key"]>): PreviewLine[] {
  const drift = (line: PreviewLine) => (moves.has(line.key) ? 0 : line.thenCents - line.nowCents);
  const total = lines.reduce((sum, line) => sum + drift(line), 0);
  const moving = lines.filter(({ key }) => moves.has(key));
  const most = moving.toSorted(
    (a, b) => Math.abs(b.thenCents - b.nowCents) - Math.abs(a.thenCents - a.nowCents) || b.nowCents - a.nowCents,
  )[0];
  return lines.map((line) => ({
    ...line,
    thenCents: line.thenCents - drift(line) + (line === most ? total : 0),
  }));
}

/** The lines that the changed rates can move. Scrap risk rests on the part's value, which is no rate. */
function movingLines({ stack }: RatesExample, now: RateFigures, then: RateFigures): Set<PreviewLine["key"]> {
  const isPrice = stack.some(({ metal }) => now.metalCentsPerG[metal] !== then.metalCentsPerG[metal]);
  const isRecovery = stack.some(({ metal }) => now.recoveryShare[metal] !== then.recoveryShare[metal]);
  const differ: [PreviewLine["key"], boolean][] = [
    ["labour", now.labourCentsPerHour !== then.labourCentsPerHour],
    ["line", now.lineCentsPerHour !== then.lineCentsPerHour],
    ["metalWrittenOff", isPrice || isRecovery],
    ["metalAgain", isPrice],
    [
      "chemistry",
      now.solutionCentsPerL !== then.solutionCentsPerL || now.abrasiveCentsPerMinute !== then.abrasiveCentsPerMinute,
    ],
    ["waste", now.wasteCentsPerL !== then.wasteCentsPerL],
  ];
  return new Set(differ.flatMap(([key, isDifferent]) => (isDifferent ? [key] : [])));
}

function withMinutes(key: PreviewLine["key"], name: string, { minutes, tankMinutes }: ReworkFigures): string {
  if (key === "labour") return `${name}, ${Math.round(minutes.mean)} min`;
  if (key === "line") return `${name}, ${Math.round(tankMinutes.mean)} min`;
  return name;
}
