import type { BaseMetal } from "@/lib/cases/case-words";
import { STRIP_METHODS, type StripMethod, type StripRow } from "@/lib/costs/strip-methods";
import { planStrip, type StripTable } from "@/lib/costs/strip-plan";
import { THICKEST_STRIKE_UM, type Layer } from "@/lib/plating/deposit-stack";
import type { DepositMetal } from "@/lib/plating/metals";

/** A way that is allowed: the row that takes off each layer, and its metal, both from the base out. */
export interface AllowedWay {
  method: StripMethod;
  rows: readonly StripRow[];
  metals: readonly DepositMetal[];
}

/** What was found for the stacks that begin alike, metal by metal from the base out. */
interface Found {
  /** With a base layer as thin as a strike, and with a thicker one. */
  thin?: readonly AllowedWay[];
  thick?: readonly AllowedWay[];
  above: Map<DepositMetal, Found>;
}

const FOUND = new WeakMap<StripTable, Map<BaseMetal, Found>>();

/**
 * The ways that `planStrip` allows for what lies on a part, in the usual order. Which baths are taken hangs on the table,
 * the base metal, the metals of the layers and on whether the lowest is thin enough to polish, and on nothing else of a
 * batch; so it is found once for them and remembered as long as the table is.
 */
export function allowedWays(table: StripTable, baseMetal: BaseMetal, onPart: readonly Layer[]): readonly AllowedWay[] {
  const found = placeOf(table, baseMetal, onPart);
  const isThin = (onPart[0]?.thicknessUm ?? 0) <= THICKEST_STRIKE_UM;
  const known = isThin ? found.thin : found.thick;
  if (known) return known;
  const metals = onPart.map((layer) => layer.metal);
  const ways = STRIP_METHODS.flatMap((method): AllowedWay[] => {
    const plan = planStrip(method, baseMetal, onPart, table);
    return plan.allowed ? [{ method, rows: plan.steps.map((step) => step.row).reverse(), metals }] : [];
  });
  found[isThin ? "thin" : "thick"] = ways;
  return ways;
}

function placeOf(table: StripTable, baseMetal: BaseMetal, onPart: readonly Layer[]): Found {
  let ofTable = FOUND.get(table);
  if (!ofTable) FOUND.set(table, (ofTable = new Map()));
  let found = placeIn(ofTable, baseMetal);
  for (const { metal } of onPart) found = placeIn(found.above, metal);
  return found;
}

function placeIn<Key>(places: Map<Key, Found>, key: Key): Found {
  const known = places.get(key);
  if (known) return known;
  const place: Found = { above: new Map() };
  places.set(key, place);
  return place;
}
