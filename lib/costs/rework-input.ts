import { BASE_METALS, LIMITS, STAGES_FOUND, type BaseMetal, type StageFound } from "@/lib/cases/case-words";
import { sizesOf } from "@/lib/costs/price-list";
import type { ShopRates } from "@/lib/costs/rates";
import type { MinutesCorrections } from "@/lib/costs/estimate-record";
import { MOST_CORRECTION } from "@/lib/costs/correction";
import { USUAL_REWORK_TIMES, type ReworkTimes } from "@/lib/costs/rework-times";
import { STRIP_METHODS, type StripMethod } from "@/lib/costs/strip-methods";
import { SHIPPED_STRIP_TABLE, type StripTable } from "@/lib/costs/strip-plan";
import { requireBetween, requireOneOf, requirePositive, requireWhole } from "@/lib/input-error";
import { checkStack, strikeOf, type Layer } from "@/lib/plating/deposit-stack";
import { usualPlateMinutes } from "@/lib/plating/plate-practice";

/** What a rework estimate needs to know about a batch of like parts. */
export interface ReworkInput {
  quantity: number;
  /** Of one part. */
  areaDm2: number;
  baseMetal: BaseMetal;
  /** The whole deposit as it is or would have become, from the base metal out. */
  stack: readonly Layer[];
  stageFound: StageFound;
  /** Left out: the cheapest one that does not attack the base metal. */
  method?: StripMethod;
  /** Of one part, before plating. Left out: scrap risk is not reckoned, and the estimate says so. */
  partValueCents?: number;
  rates: ShopRates;
  /** Recorded against estimated minutes in this shop, for each method (`estimate-record.ts`) or one for all; left out: 1. */
  minutesCorrection?: number | MinutesCorrections;
  times?: ReworkTimes;
  table?: StripTable;
}

export const REWORK_LIMITS = {
  areaDm2: 10_000,
  partValueCents: 1e11,
  correction: MOST_CORRECTION,
} as const;

/** The input with its defaults filled in and its stack cut to what lies on the part at this stage. */
export interface CheckedRework extends Required<Omit<ReworkInput, "method" | "stack">> {
  method: StripMethod | undefined;
  onPart: readonly Layer[];
  /** No layer's thickness is a range. */
  thicknessKnown: boolean;
  /** What a price list is multiplied with. */
  sizes: readonly number[];
  partValueStated: boolean;
}

/** Refuses impossible input with `InputError` naming the field, and fills in what was left out. */
export function checkReworkInput(input: ReworkInput): CheckedRework {
  requireWhole("quantity", input.quantity, 1, LIMITS.quantity);
  requirePositive("areaDm2", input.areaDm2, REWORK_LIMITS.areaDm2);
  requireOneOf("baseMetal", input.baseMetal, BASE_METALS);
  requireOneOf("stageFound", input.stageFound, STAGES_FOUND);
  if (input.method !== undefined) requireOneOf("method", input.method, STRIP_METHODS);
  checkStack(input.stack);
  checkMoney(input);
  const there = input.stageFound === "at-strike" ? strikeOf(input.stack) : input.stack;
  const thicknessKnown = there.every((layer) => layer.thicknessLowUm === layer.thicknessHighUm);
  const onPart = thicknessKnown ? there : there.map(meanLayer);
  const times = input.times ?? USUAL_REWORK_TIMES;
  const partValueCents = input.partValueCents ?? 0;
  const { quantity, areaDm2 } = input;
  return {
    quantity,
    areaDm2,
    baseMetal: input.baseMetal,
    stageFound: input.stageFound,
    method: input.method,
    onPart,
    thicknessKnown,
    sizes: batchSizes({ quantity, areaDm2, onPart, times, partValueCents }),
    partValueCents,
    partValueStated: input.partValueCents !== undefined,
    rates: input.rates,
    minutesCorrection: input.minutesCorrection ?? 1,
    times,
    table: input.table ?? SHIPPED_STRIP_TABLE,
  };
}

/** The sizes of a batch: parts, area, plating minutes, value, and each layer's area times its thickness. */
export function batchSizes(
  batch: Pick<CheckedRework, "quantity" | "areaDm2" | "onPart" | "times" | "partValueCents">,
): number[] {
  const { quantity, onPart: layers, times } = batch;
  const batchAreaDm2 = quantity * batch.areaDm2;
  let minutes = 0;
  for (const layer of layers) minutes += usualPlateMinutes(layer);
  const platingMinutes = (minutes * batchAreaDm2) / times.loadDm2;
  return sizesOf({ quantity, batchAreaDm2, platingMinutes, valueCents: quantity * batch.partValueCents, layers });
}

function checkMoney({ partValueCents, minutesCorrection }: ReworkInput): void {
  if (partValueCents !== undefined) requireBetween("partValueCents", partValueCents, 0, REWORK_LIMITS.partValueCents);
  if (typeof minutesCorrection === "object") {
    for (const method of STRIP_METHODS) checkCorrection(minutesCorrection[method]);
  } else if (minutesCorrection !== undefined) checkCorrection(minutesCorrection);
}

function checkCorrection(ratio: number): void {
  requirePositive("minutesCorrection", ratio, REWORK_LIMITS.correction);
}

/** A layer known as a range counts with its PERT mean; without a range it is itself. */
function meanLayer(layer: Layer): Layer {
  const { thicknessLowUm: low, thicknessHighUm: high } = layer;
  if (low === undefined || high === undefined) return layer;
  return { ...layer, thicknessUm: (low + 4 * layer.thicknessUm + high) / 6 };
}
