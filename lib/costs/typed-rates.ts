import {
  fieldText,
  priceFieldName,
  priceUnit,
  RATE_FIELDS,
  recoveredFieldName,
  type RateField,
  type RateFigures,
} from "@/lib/costs/rate-fields";
import { HIGHEST_RATE_CENTS } from "@/lib/costs/rates";
import { readDecimal } from "@/lib/decimal";
import { DEPOSIT_METALS } from "@/lib/plating/metals";

export const RATES_LIMITS = {
  sourceChars: 240,
  /** Whole units of the currency. */
  money: HIGHEST_RATE_CENTS / 100,
  percent: 100,
} as const;

/** The figures of a rates form as they are typed: money in whole units of the currency, recovery in percent. */
export type TypedFigures = Record<"labour" | "line" | "abrasive" | "solution" | "waste", number> &
  Partial<Record<ReturnType<typeof priceFieldName> | ReturnType<typeof recoveredFieldName>, number>>;

/** Typed figures as rates in cents and shares. A price or share that is left out is not set. */
export function figuresFrom(typed: TypedFigures): RateFigures {
  const metalCentsPerG: RateFigures["metalCentsPerG"] = Object.fromEntries(
    DEPOSIT_METALS.flatMap((metal) => {
      const figure = typed[priceFieldName(metal)];
      return figure === undefined ? [] : [[metal, inCents(figure / priceUnit(metal).grams)]];
    }),
  );
  const recoveryShare: RateFigures["recoveryShare"] = Object.fromEntries(
    DEPOSIT_METALS.flatMap((metal) => {
      const percent = typed[recoveredFieldName(metal)];
      return percent === undefined ? [] : [[metal, percent / 100]];
    }),
  );
  return {
    labourCentsPerHour: inCents(typed.labour),
    lineCentsPerHour: inCents(typed.line),
    abrasiveCentsPerMinute: inCents(typed.abrasive),
    solutionCentsPerL: inCents(typed.solution),
    wasteCentsPerL: inCents(typed.waste),
    metalCentsPerG,
    recoveryShare,
  };
}

/** Whole units to cents. Rounded far below the four decimals that may be typed for a kilogram, to shed binary dust. */
function inCents(figure: number): number {
  return Number((figure * 100).toFixed(8));
}

/** What a form holds while it is being typed. */
export interface RatesReading {
  /** Null while a figure is no figure yet. */
  figures: RateFigures | null;
  /** Labels of the rates that are no figures yet, in the order of the form. */
  waitsFor: string[];
  /** By field name: how far it moves, for those that differ from what holds. */
  moves: Readonly<Record<string, string>>;
}

/**
 * Reads a rates form as it is typed, without the server's sentences: what the figures would be, which ones are no figures
 * yet, and how far each moves from what holds.
 * @param textOf what stands in a field; undefined for a field that is not there
 * @param mayBeEmpty whether an empty field means "not set"
 */
export function readRates(
  held: RateFigures,
  textOf: (name: string) => string | undefined,
  mayBeEmpty: (name: string) => boolean,
): RatesReading {
  const typed: Record<string, number> = {};
  const waitsFor: string[] = [];
  const moves: Record<string, string> = {};
  for (const field of RATE_FIELDS) {
    const text = (textOf(field.name) ?? "").trim();
    const figure = text === "" ? undefined : readFigure(field, text);
    if (figure === undefined && (text !== "" || !mayBeEmpty(field.name))) {
      waitsFor.push(field.label);
      continue;
    }
    if (figure !== undefined) typed[field.name] = figure;
    const move = moveWords(field, field.read(held), figure);
    if (move) moves[field.name] = move;
  }
  // Every plain rate was either read or is waited for, so without anything to wait for the figures are whole.
  const figures = waitsFor.length === 0 ? figuresFrom(typed as TypedFigures) : null;
  return { figures, waitsFor, moves };
}

function readFigure(field: RateField, text: string): number | undefined {
  const figure = readDecimal(text);
  const most = field.unit === "%" ? RATES_LIMITS.percent : RATES_LIMITS.money;
  return figure !== undefined && figure <= most ? figure : undefined;
}

/** How far a rate moves: "+7.7%", points for a share; "" when it stays. */
function moveWords(field: RateField, from: number | undefined, to: number | undefined): string {
  if (fieldText(field, from) === fieldText(field, to)) return "";
  if (from === undefined) return "new";
  if (to === undefined) return "not set";
  if (field.unit === "%") return `${signed(to - from)} points`;
  return from === 0 ? "from 0" : `${signed((to / from - 1) * 100)}%`;
}

/** One decimal with its sign. A move too small for a decimal still moves. */
function signed(figure: number): string {
  const sign = figure < 0 ? "−" : "+";
  const size = Math.abs(figure);
  return `${sign}${size < 0.05 ? "0.0" : Number(size.toFixed(1)).toLocaleString("en-US")}`;
}
