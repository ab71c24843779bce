import { decimalText } from "@/lib/decimal";
import type { Colour, Pull } from "@/lib/metals/material-words";
import { CHECK_FIELDS, startingCheck, type ShopUnits, type TypedCheck } from "@/lib/metals/typed-check";
import { celsiusToF } from "@/lib/units";

/** A page's query as the framework hands it over. */
export type Query = Record<string, string | string[] | undefined>;

/** Longer than any weight that a person types. */
const MOST_CHARS = 20;

/** One word of the address; undefined where it is missing, doubled or too long to have been typed. */
export function wordOf(query: Query, name: string, most = MOST_CHARS): string | undefined {
  const word = query[name];
  return typeof word === "string" && word.length <= most ? word : undefined;
}

/**
 * What the address of a part check carries into the fields.
 * @returns `isAsked`: somebody has typed a weight, so what is missing may be said
 */
export function checkFromAddress(query: Query, units: ShopUnits): { typed: TypedCheck; isAsked: boolean } {
  const typed = startingCheck(units);
  for (const field of CHECK_FIELDS) typed[field] = wordOf(query, field) ?? typed[field];
  return { typed, isAsked: typed.air !== "" || typed.water !== "" };
}

/** For which job and case a part is weighed. */
export interface CheckFor {
  job: string | null;
  case: string | null;
}

/** The query that brings the fields back as they stand: to reload, to share. Empty fields are left out. */
export function checkAddress(typed: TypedCheck, { job, case: caseRef }: CheckFor): Record<string, string> {
  const isTyped = typed.air !== "" || typed.water !== "" || typed.pull !== "" || typed.colour !== "";
  const fields = isTyped ? CHECK_FIELDS.map((field) => [field, typed[field]] as const) : [];
  const all = [["job", job ?? ""], ["case", caseRef ?? ""], ...fields] as const;
  return Object.fromEntries(all.filter(([, value]) => value !== ""));
}

/** A kept check's own numbers. */
export interface KeptWeights {
  weightAirG: number;
  weightWaterG: number;
  waterTempC: number;
  balanceErrorG: number;
  pull: Pull | null;
  colour: Colour | null;
}

/** A kept check as it would be typed in again. */
export function typedAgain(kept: KeptWeights, units: ShopUnits): TypedCheck {
  const temp = units === "us" ? celsiusToF(kept.waterTempC) : kept.waterTempC;
  return {
    air: decimalText(kept.weightAirG),
    water: decimalText(kept.weightWaterG),
    temp: decimalText(temp),
    error: decimalText(kept.balanceErrorG),
    pull: kept.pull ?? "",
    colour: kept.colour ?? "",
  };
}
