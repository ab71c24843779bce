import { z } from "zod";
import { priceFieldName, recoveredFieldName } from "@/lib/costs/rate-fields";
import { figuresFrom, RATES_LIMITS } from "@/lib/costs/typed-rates";
import { readDecimal } from "@/lib/decimal";
import { DEPOSIT_METALS } from "@/lib/plating/metals";

const NOT_A_NUMBER = "Write a number such as 56 or 56.50, without spaces or a thousands mark.";

/** A typed amount of money: in whole units of the currency. */
const amount = (what: string) =>
  z
    .string({ error: `Give ${what}.` })
    .trim()
    .min(1, `Give ${what}.`)
    .transform((typed, context) => readWithin(typed, RATES_LIMITS.money, context));

/** The same, where an empty field means that nothing is set. */
const amountOrNone = (most: number) =>
  z
    .string()
    .trim()
    .optional()
    .transform((typed, context) => (typed ? readWithin(typed, most, context) : undefined));

function readWithin(typed: string, most: number, context: z.RefinementCtx): number {
  const figure = readDecimal(typed);
  if (figure === undefined) context.addIssue(NOT_A_NUMBER);
  else if (figure > most) context.addIssue(`Write at most ${most.toLocaleString("en-US")}.`);
  else return figure;
  return z.NEVER;
}

const price = amountOrNone(RATES_LIMITS.money);
const recovered = amountOrNone(RATES_LIMITS.percent);
// Object.fromEntries forgets its keys; they are exactly the metals'.
const priceInputs = Object.fromEntries(DEPOSIT_METALS.map((metal) => [priceFieldName(metal), price])) as Record<
  ReturnType<typeof priceFieldName>,
  typeof price
>;
const recoveredInputs = Object.fromEntries(
  DEPOSIT_METALS.map((metal) => [recoveredFieldName(metal), recovered]),
) as Record<ReturnType<typeof recoveredFieldName>, typeof recovered>;

const typedRates = z.object({
  validFrom: z
    .string({ error: "Give the day from which the rates hold." })
    .regex(/^\d{4}-\d{2}-\d{2}$/, "Give the day from which the rates hold."),
  source: z
    .string({ error: "Say where the figures come from." })
    .trim()
    .min(1, "Say where the figures come from: an invoice, a price list, your own reckoning.")
    .max(RATES_LIMITS.sourceChars, `Keep it to ${RATES_LIMITS.sourceChars} characters.`),
  labour: amount("the labour rate"),
  line: amount("the line burden"),
  abrasive: amount("the price of abrasive"),
  solution: amount("the price of strip solution"),
  waste: amount("the price of hauled waste"),
  ...priceInputs,
  ...recoveredInputs,
});

/**
 * What the owner types to set rates from a day on: money in whole units of the shop's currency, recovery in percent. Comes
 * out as rates in cents and shares. An empty price or share is left out: not set.
 */
export const ratesInput = typedRates.transform(({ validFrom, source, ...typed }) => ({
  validFrom,
  source,
  figures: figuresFrom(typed),
}));
export type RatesInput = z.output<typeof ratesInput>;
