import { BASE_METALS, type BaseMetal } from "@/lib/cases/case-words";
import type { MinutesCorrections } from "@/lib/costs/estimate-record";
import type { ReworkEstimate } from "@/lib/costs/estimate-plan";
import { withStartingPrices } from "@/lib/costs/metal-prices";
import type { ShopRates } from "@/lib/costs/rates";
import type { StripBatch } from "@/lib/costs/read-strip";
import type { ReworkInput } from "@/lib/costs/rework-input";
import { compareMethods, estimateRework, type MethodOption } from "@/lib/costs/strip-estimate";
import type { StripMethod } from "@/lib/costs/strip-methods";
import { planStrip, type StripTable } from "@/lib/costs/strip-plan";
import { InputError } from "@/lib/input-error";
import { strikeOf, weighStack, type Layer, type WeighedLayer } from "@/lib/plating/deposit-stack";

/** What a shop brings to every estimate. */
export interface StripShop {
  rates: ShopRates;
  table: StripTable;
  corrections: MinutesCorrections;
}

export type OfferedWay = Extract<MethodOption, { allowed: true }>;
/** A way that is not offered, and the base metals on which it would be. */
export type RefusedWay = Extract<MethodOption, { allowed: false }> & { offeredOn: BaseMetal[] };

/** Everything that the estimator shows of one batch. */
export interface StripReckoning {
  batch: StripBatch;
  /** The rates with starting prices where the shop has none. */
  rates: ShopRates;
  layers: WeighedLayer[];
  /** The cheapest first. */
  offered: OfferedWay[];
  refused: RefusedWay[];
  /** The way that was picked, or the cheapest. */
  chosen: ReworkEstimate;
  /** The same fault seen at the strike; for one that was, what it costs when it goes on to the final plate. */
  beside: { kind: "at-strike" | "goes-on"; estimate: ReworkEstimate };
  assumed: string[];
  /** Why the way that was picked is not the one that is shown. */
  passedOver?: string;
}

/** Works out a batch by every way, and beside it the same fault at the other stage. Throws `InputError` naming the field. */
export function reckonStrip(batch: StripBatch, shop: StripShop): StripReckoning {
  const { method, alloy: _alloy, ...facts } = batch;
  const priced = withStartingPrices(shop.rates, batch.stack);
  const input: ReworkInput = { ...facts, rates: priced.rates, table: shop.table, minutesCorrection: shop.corrections };
  const options = compareMethods(input);
  const offered = options
    .filter((option): option is OfferedWay => option.allowed)
    .toSorted((a, b) => a.estimate.meanCents - b.estimate.meanCents);
  const refused = options.flatMap((option): RefusedWay[] =>
    option.allowed ? [] : [{ ...option, offeredOn: offeredOn(option.method, batch, shop.table) }],
  );
  const chosen = offered.find((option) => option.method === method) ?? offered[0];
  // Polishing is always offered, so this is a fault of the table, not of the input.
  if (!chosen) throw new InputError("method", "No way to take this deposit off is in the table.");
  const passedOver = refused.find((option) => option.method === method)?.why;
  return {
    batch,
    rates: priced.rates,
    layers: weighStack(batch.stack, batch.areaDm2, batch.quantity).layers,
    offered,
    refused,
    chosen: chosen.estimate,
    beside: besideOf(input),
    assumed: [...chosen.estimate.assumed, ...priced.assumed],
    ...(passedOver === undefined ? {} : { passedOver }),
  };
}

function besideOf(input: ReworkInput): StripReckoning["beside"] {
  if (input.stageFound === "at-strike")
    return { kind: "goes-on", estimate: estimateRework({ ...input, stageFound: "after-final-plate" }) };
  return {
    kind: "at-strike",
    estimate: estimateRework({ ...input, stageFound: "at-strike", method: undefined }),
  };
}

function offeredOn(method: StripMethod, { stack, stageFound }: StripBatch, table: StripTable): BaseMetal[] {
  const onPart: readonly Layer[] = stageFound === "at-strike" ? strikeOf(stack) : stack;
  return BASE_METALS.filter((metal) => metal !== "other" && planStrip(method, metal, onPart, table).allowed);
}

/** Steps of the scale on which all ways are drawn, × 10ⁿ. */
const ROUND = [1, 1.5, 2, 3, 4, 5, 6, 8, 10] as const;

/** The end of the one scale on which ways are drawn, cents: round, and not below any of them. Example: 278,000 → 300,000. */
export function scaleEndCents(estimates: readonly Pick<ReworkEstimate, "high90Cents">[]): number {
  const most = Math.max(100, ...estimates.map((estimate) => estimate.high90Cents));
  const power = 10 ** Math.floor(Math.log10(most));
  return Math.round((ROUND.find((step) => step * power >= most) ?? 10) * power);
}
