import { InputError } from "@/lib/input-error";
import { aDm2ToAsf, asfToADm2, celsiusToF, fahrenheitToC } from "@/lib/units";

/** What a check on a strike measures. The name ends in the unit in which it is kept. */
export const CHECK_KINDS = ["voltageV", "bathTempC", "secondsToDeposit", "currentDensityADm2"] as const;
export type CheckKind = (typeof CHECK_KINDS)[number];

/** Which units a shop reads: °C and A/dm², or °F and A/ft². Volts and seconds are the same in both. */
export const UNIT_SYSTEMS = ["metric", "us"] as const;
export type UnitSystem = (typeof UNIT_SYSTEMS)[number];

interface CheckUnit {
  sign: string;
  /** Other ways in which people write the sign. */
  typed: readonly string[];
  /** From this unit into the one in which the check is kept, and back. */
  toKept: (value: number) => number;
  fromKept: (value: number) => number;
}

const asItIs = (value: number) => value;
const plain = (sign: string, ...typed: string[]): CheckUnit => ({ sign, typed, toKept: asItIs, fromKept: asItIs });

const METRIC: Record<CheckKind, CheckUnit> = {
  voltageV: plain("V", "volt", "volts"),
  bathTempC: plain("°C", "c"),
  secondsToDeposit: plain("s", "sec", "seconds"),
  currentDensityADm2: plain("A/dm²", "a/dm2", "asd"),
};
const US: Record<CheckKind, CheckUnit> = {
  ...METRIC,
  bathTempC: { sign: "°F", typed: ["f"], toKept: fahrenheitToC, fromKept: celsiusToF },
  currentDensityADm2: { sign: "A/ft²", typed: ["a/ft2", "asf"], toKept: asfToADm2, fromKept: aDm2ToAsf },
};
const UNITS: Record<UnitSystem, Record<CheckKind, CheckUnit>> = { metric: METRIC, us: US };

/**
 * A reading in the units that the shop reads, to three figures. Value as it is kept.
 * @example checkWords("bathTempC", 54.444, "us") === "130 °F"
 */
export function checkWords(kind: CheckKind, value: number, system: UnitSystem = "metric"): string {
  const { sign, fromKept } = UNITS[system][kind];
  return `${Number(fromKept(value).toPrecision(3))} ${sign}`;
}

/**
 * How far apart two readings are, in the units that the shop reads: a difference has no zero point, so 3 °C apart are
 * 5.4 °F. Difference as it is kept.
 * @example differenceWords("bathTempC", -3, "us") === "5.4 °F"
 */
export function differenceWords(kind: CheckKind, difference: number, system: UnitSystem = "metric"): string {
  const { sign, fromKept } = UNITS[system][kind];
  return `${Number(Math.abs(fromKept(difference) - fromKept(0)).toPrecision(3))} ${sign}`;
}

const TYPED = /^(-?\d{1,6}(?:[.,]\d{1,6})?)\s*(.*)$/;

/**
 * A reading as people write it, in the unit in which it is kept: "130 °F", "1.1 V", "15 A/ft²". A bare number is in the
 * shop's own units. Throws `InputError` naming the kind for text that is no reading, or one in another thing's unit.
 * @example readCheck("bathTempC", "130 °F") is 54.44
 */
export function readCheck(kind: CheckKind, typed: string, system: UnitSystem = "metric"): number {
  const [, figure, unit = ""] = TYPED.exec(typed.trim()) ?? [];
  const known = figure === undefined ? undefined : unitTyped(kind, unit, system);
  if (figure === undefined || known === undefined) {
    const signs = [...new Set([METRIC[kind].sign, US[kind].sign])].join(" or ");
    throw new InputError(kind, `Give a number in ${signs}, such as ${checkWords(kind, EXAMPLE[kind], system)}.`);
  }
  return known.toKept(Number(figure.replace(",", ".")));
}

const EXAMPLE: Record<CheckKind, number> = {
  voltageV: 0.8,
  bathTempC: 54,
  secondsToDeposit: 30,
  currentDensityADm2: 1.5,
};

function unitTyped(kind: CheckKind, unit: string, system: UnitSystem): CheckUnit | undefined {
  if (unit === "") return UNITS[system][kind];
  const wanted = unit.toLowerCase();
  return [METRIC[kind], US[kind]].find(({ sign, typed }) => sign.toLowerCase() === wanted || typed.includes(wanted));
}
