import type { ReworkEstimate } from "@/lib/costs/estimate-plan";
import type { MinutesCorrections } from "@/lib/costs/estimate-record";
import { withStartingPrices } from "@/lib/costs/metal-prices";
import type { ShopRates } from "@/lib/costs/rates";
import { compareMethods, estimateRework, type MethodOption } from "@/lib/costs/strip-estimate";
import { STRIP_METHOD_TITLES, STRIP_METHODS } from "@/lib/costs/strip-methods";
import type { StripTable } from "@/lib/costs/strip-plan";
import type { StripAnswer, StripInput } from "@/lib/costs/strip.schema";

/** What the shop's own figures are at this moment. */
export interface StripShop {
  currency: string;
  rates: ShopRates & { source: string };
  table: StripTable;
  corrections: MinutesCorrections;
}

/**
 * Every way to take a deposit off a batch with its cost, a refused one with the reason and no figure, and beside them
 * the same fault put right at the strike. With a method in the input that way alone. Throws `InputError` naming the field.
 */
export function stripAnswerFor(input: StripInput, shop: StripShop): StripAnswer {
  const stack = input.stack.map(({ metal, thicknessUm }) => ({ metal: metal.symbol, thicknessUm }));
  const { rates, assumed } = withStartingPrices(shop.rates, stack);
  const facts = {
    quantity: input.quantity,
    areaDm2: input.areaDm2,
    baseMetal: input.baseMetal.metal,
    stack,
    partValueCents: input.partValueCents,
    rates,
    table: shop.table,
    minutesCorrection: shop.corrections,
  };
  const stageFound = input.stageFound.word;
  const all = compareMethods({ ...facts, stageFound });
  const options = input.method ? all.filter((option) => option.method === input.method?.word) : all;
  const atStrike = estimateRework({ ...facts, stageFound: "at-strike" });
  const estimates = [...options.flatMap((option) => (option.allowed ? [option.estimate] : [])), atStrike];
  return {
    given: givenIn(input),
    baseMetal: facts.baseMetal,
    stageFound,
    currency: shop.currency,
    ratesFromAt: rates.validFromAt,
    options: options.map((option) => optionAnswer(option, shop.corrections)),
    atStrike: { method: atStrike.method, ...figuresOf(atStrike) },
    assumed: [...new Set([...assumed, ...estimates.flatMap((estimate) => estimate.assumed)])],
    sources: [
      ...new Set([...estimates.flatMap((estimate) => estimate.sources), `Rates: ${rates.source}`, ...recordsIn(shop)]),
    ],
  };
}

function optionAnswer(option: MethodOption, corrections: MinutesCorrections): StripAnswer["options"][number] {
  const { method } = option;
  const title = STRIP_METHOD_TITLES[method];
  if (!option.allowed) return { method, title, allowed: false, why: option.why };
  const { cautions, widest } = option.estimate;
  const figures = figuresOf(option.estimate);
  return { method, title, allowed: true, ...figures, minutesCorrection: corrections[method], widest, cautions };
}

function figuresOf({ minutes, tankMinutes, metalWrittenOffG, ...money }: ReworkEstimate) {
  const { meanCents: mean, low90Cents: low90, high90Cents: high90 } = money;
  const lines = money.lines.map(({ key, name, meanCents }) => ({ key, name, mean: meanCents }));
  return { minutes, tankMinutes, metalWrittenOffG, cost: { mean, low90, high90, lines } };
}

/** The input as it was sent. */
function givenIn({ baseMetal, stageFound, method, stack, ...numbers }: StripInput): Record<string, unknown> {
  return {
    ...numbers,
    baseMetal: baseMetal.typed,
    stack: stack.map(({ metal, thicknessUm }) => ({ metal: metal.typed, thicknessUm })),
    stageFound: stageFound.typed,
    ...(method ? { method: method.typed } : {}),
  };
}

function recordsIn({ corrections }: StripShop): string[] {
  return STRIP_METHODS.flatMap((method) =>
    corrections[method] === 1
      ? []
      : [
          `Minutes of ${STRIP_METHOD_TITLES[method].toLowerCase()}: × ${corrections[method].toFixed(2)}, from this shop's own rework cards`,
        ],
  );
}
