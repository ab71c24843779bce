import type { ShopRates } from "@/lib/costs/rates";
import { DEPOSIT_METALS, metalOf, type DepositMetal } from "@/lib/plating/metals";

/** What a shop sets at once: its rates without their date. */
export type RateFigures = Omit<ShopRates, "validFromAt">;

/** One rate as people write it: money for a unit, or percent. */
export interface RateField {
  /** Its name in a form. */
  name: string;
  label: string;
  /** What belongs to it. */
  note?: string;
  group: "time" | "metal" | "recovered" | "solution";
  /** What the money is for; "%" is a share and no money. */
  unit: "h" | "min" | "L" | "g" | "kg" | "%";
  metal?: DepositMetal;
  /** The figure in this unit: money in whole units of the currency, shares in percent. Undefined: not set. */
  read: (rates: RateFigures) => number | undefined;
}

/** Noble metals are bought by the gram, the rest by the kilogram. */
const BY_GRAM: ReadonlySet<DepositMetal> = new Set<DepositMetal>(["Au", "Ag", "Pd", "Rh", "Pt"]);

export const priceFieldName = (metal: DepositMetal) => `price-${metal}` as const;
export const recoveredFieldName = (metal: DepositMetal) => `recovered-${metal}` as const;

/** The unit in which a metal's price is typed, and how many grams it is. */
export function priceUnit(metal: DepositMetal): { unit: "g" | "kg"; grams: number } {
  return BY_GRAM.has(metal) ? { unit: "g", grams: 1 } : { unit: "kg", grams: 1000 };
}

const PLAIN_FIELDS: readonly RateField[] = [
  {
    name: "labour",
    label: "Labour",
    note: "wage and on-costs",
    group: "time",
    unit: "h",
    read: (rates) => rates.labourCentsPerHour / 100,
  },
  {
    name: "line",
    label: "Line burden",
    note: "heat, power, air, rent of the tanks",
    group: "time",
    unit: "h",
    read: (rates) => rates.lineCentsPerHour / 100,
  },
  {
    name: "abrasive",
    label: "Abrasive",
    note: "wheels, paper and cloths while polishing",
    group: "time",
    unit: "min",
    read: (rates) => rates.abrasiveCentsPerMinute / 100,
  },
  {
    name: "solution",
    label: "Strip solution",
    note: "made up",
    group: "solution",
    unit: "L",
    read: (rates) => rates.solutionCentsPerL / 100,
  },
  {
    name: "waste",
    label: "Hauled waste",
    note: "as the hauler bills it",
    group: "solution",
    unit: "L",
    read: (rates) => rates.wasteCentsPerL / 100,
  },
];

function metalFields(metal: DepositMetal): RateField[] {
  const name = metalOf(metal).name;
  const label = name.charAt(0).toUpperCase() + name.slice(1);
  const { unit, grams } = priceUnit(metal);
  const price = (rates: RateFigures) => rates.metalCentsPerG[metal];
  const share = (rates: RateFigures) => rates.recoveryShare[metal];
  return [
    {
      name: priceFieldName(metal),
      label,
      group: "metal",
      unit,
      metal,
      read: (rates) => scaled(price(rates), grams / 100),
    },
    {
      name: recoveredFieldName(metal),
      label: `${label} recovered`,
      group: "recovered",
      unit: "%",
      metal,
      read: (rates) => scaled(share(rates), 100),
    },
  ];
}

function scaled(figure: number | undefined, factor: number): number | undefined {
  return figure === undefined ? undefined : figure * factor;
}

/** Every rate, in the order in which they are set: time, metals, solution and waste. */
export const RATE_FIELDS: readonly RateField[] = [...PLAIN_FIELDS, ...DEPOSIT_METALS.flatMap(metalFields)];

/** A figure as it stands in a field: money with at least two decimals, percent with none unless it has some. */
export function fieldText(field: Pick<RateField, "unit">, figure: number | undefined): string {
  if (figure === undefined) return "";
  const exact = Number(figure.toFixed(4));
  if (field.unit === "%") return String(exact);
  return Number(exact.toFixed(2)) === exact ? exact.toFixed(2) : String(exact);
}

/**
 * A rate in words.
 * @example rateWords({ unit: "kg" }, 18, "USD") === "$18.00 / kg"
 */
export function rateWords(field: Pick<RateField, "unit">, figure: number | undefined, currency: string): string {
  if (figure === undefined) return "not set";
  if (field.unit === "%") return `${fieldText(field, figure)}%`;
  const money = new Intl.NumberFormat("en-US", { style: "currency", currency, maximumFractionDigits: 4 });
  return `${money.format(figure)} / ${field.unit}`;
}

/** The sign that a currency is written with: "$", "€". */
export function currencySign(currency: string): string {
  const parts = new Intl.NumberFormat("en-US", { style: "currency", currency }).formatToParts(0);
  return parts.find((part) => part.type === "currency")?.value ?? currency;
}

/** One rate that differs between two rows. */
export interface RateChange {
  label: string;
  from: string;
  to: string;
}

/** What a row changed against the one before it, in words, in the order of the form. */
export function rateChanges(before: RateFigures, after: RateFigures, currency: string): RateChange[] {
  return RATE_FIELDS.flatMap((field) => {
    const from = rateWords(field, field.read(before), currency);
    const to = rateWords(field, field.read(after), currency);
    return from === to ? [] : [{ label: field.label, from, to }];
  });
}
