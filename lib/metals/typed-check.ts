import { NOT_A_NUMBER, readDecimal } from "@/lib/decimal";
import { InputError } from "@/lib/input-error";
import { COLOURS, PULLS, type Colour, type Pull } from "@/lib/metals/material-words";
import { WATER_TEMP_C, waterDensityGPerCm3 } from "@/lib/metals/water-density";
import { measureDensity, type Weighing } from "@/lib/metals/weigh-part";
import { celsiusToF, fahrenheitToC } from "@/lib/units";

/** What the check's fields are called, in its form and in its page's address. */
export const CHECK_FIELDS = ["air", "water", "temp", "error", "pull", "colour"] as const;
export type CheckField = (typeof CHECK_FIELDS)[number];
export type TypedCheck = Record<CheckField, string>;

/** A shop's units: the balance shows grams everywhere, the thermometer does not. */
export type ShopUnits = "metric" | "us";

export const tempUnit = (units: ShopUnits): "°C" | "°F" => (units === "us" ? "°F" : "°C");

/** What the fields hold before anybody types: a room's water, and a bench balance that shows tenths of a gram (common practice). */
export const startingCheck = (units: ShopUnits): TypedCheck => ({
  air: "",
  water: "",
  temp: units === "us" ? "68" : "20",
  error: "0.1",
  pull: "",
  colour: "",
});

/** What the weights say in numbers, and what was seen besides. */
export interface CheckInput extends Weighing {
  balanceErrorG: number;
  pull: Pull | undefined;
  colour: Colour | undefined;
}

/** What to do about a field. */
export type CheckFaults = Partial<Record<CheckField, string>>;

/** What was typed, read: nothing to go on yet, something that cannot be, or numbers. */
export type ReadCheck =
  | { kind: "empty"; faults: CheckFaults }
  | { kind: "refused"; faults: CheckFaults }
  | { kind: "ready"; input: CheckInput };

const NUMBER_FIELDS = ["air", "water", "temp", "error"] as const;
type NumberField = (typeof NUMBER_FIELDS)[number];

const ASK: Record<NumberField, string> = {
  air: "Type what it weighs in air, in grams.",
  water: "Type what it weighs hung in water, in grams.",
  temp: "Type the temperature of the water.",
  error: "Type how far the balance may be off, in grams.",
};

/**
 * Reads what was typed into the check's fields. While a number is missing there is nothing to go on: `empty`, with what
 * to type. What cannot be is `refused`, with a sentence beside its field.
 * @param units the shop's: the water's temperature is typed in °C or in °F
 * @example readTypedCheck({ ...startingCheck("metric"), air: "48,6", water: "41.3" }, "metric").kind === "ready"
 */
export function readTypedCheck(typed: TypedCheck, units: ShopUnits): ReadCheck {
  const pull = PULLS.find((word) => word === typed.pull);
  const colour = COLOURS.find((word) => word === typed.colour);
  const wrong: CheckFaults = {};
  if (typed.pull !== "" && pull === undefined) wrong.pull = "Choose how the magnet pulls.";
  if (typed.colour !== "" && colour === undefined) wrong.colour = "Choose a colour of the list.";
  const missing: CheckFaults = {};
  const numbers = { air: NaN, water: NaN, temp: NaN, error: NaN };
  for (const field of NUMBER_FIELDS) {
    const text = typed[field].trim();
    const value = readDecimal(text);
    if (text === "") missing[field] = ASK[field];
    else if (value === undefined) wrong[field] = NOT_A_NUMBER;
    else numbers[field] = value;
  }
  if (Object.keys(wrong).length > 0) return { kind: "refused", faults: { ...missing, ...wrong } };
  if (Object.keys(missing).length > 0) return { kind: "empty", faults: missing };
  const waterTempC = units === "us" ? fahrenheitToC(numbers.temp) : numbers.temp;
  const weights = { weightAirG: numbers.air, weightWaterG: numbers.water, waterTempC, balanceErrorG: numbers.error };
  return weighable({ ...weights, pull, colour }, units);
}

const FIELD_OF: Record<string, CheckField> = {
  weightAirG: "air",
  weightWaterG: "water",
  waterTempC: "temp",
  balanceErrorG: "error",
};

/** Asks the computation whether it can work with these numbers, so that its refusal comes out beside the field. */
function weighable(input: CheckInput, units: ShopUnits): ReadCheck {
  try {
    waterDensityGPerCm3(input.waterTempC);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return { kind: "refused", faults: { temp: tempWords(units) } };
  }
  try {
    measureDensity(input);
    return { kind: "ready", input };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return { kind: "refused", faults: { [FIELD_OF[error.field] ?? "air"]: error.problem } };
  }
}

function tempWords(units: ShopUnits): string {
  const shown = (tempC: number) => Math.round(units === "us" ? celsiusToF(tempC) : tempC);
  return `Water for weighing stands between ${shown(WATER_TEMP_C.lowest)} and ${shown(WATER_TEMP_C.highest)} ${tempUnit(units)}.`;
}
