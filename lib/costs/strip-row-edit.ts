import type { ThreePoint } from "@/lib/costs/pert";
import { CAUTION_KEYS, type CautionKey } from "@/lib/costs/strip-cautions";
import { DISSOLVING_ROWS } from "@/lib/costs/strip-method-rows";
import type { DissolvingRow } from "@/lib/costs/strip-methods";
import { reasonFieldName, standingOn } from "@/lib/costs/strip-row-fields";
import type { AddBath, BathFigures } from "@/lib/costs/strip-row.schema";
import { decimalText } from "@/lib/decimal";

/** The cautions that ship with a way: none of them can be taken away. A way of the shop's own has none. */
export function shippedCautions(slug: string): readonly CautionKey[] {
  return DISSOLVING_ROWS.find((row) => row.id === slug)?.cautions ?? [];
}

/**
 * A bath with the figures that the shop gives it. Cautions that ship with it stay, whatever was sent; a figure that was
 * only shown rounded and sent back as it was shown keeps all its digits.
 */
export function editedBath(before: DissolvingRow, figures: BathFigures): DissolvingRow {
  const { safe, cautions, ...given } = figures;
  const holdingGPerL = unlessMoved(before.holdingGPerL, given.holdingGPerL);
  const isHoldingSame = holdingGPerL === before.holdingGPerL;
  const safeBecause = Object.fromEntries(safe.flatMap(({ metal, reason }) => (reason ? [[metal, reason]] : [])));
  const kept = new Set([...shippedCautions(before.id), ...cautions]);
  const added = CAUTION_KEYS.filter((key) => kept.has(key) && !before.cautions.includes(key));
  return {
    ...before,
    ...given,
    rateUmPerMin: unlessMoved(before.rateUmPerMin, given.rateUmPerMin),
    holdingGPerL,
    holdingSource: isHoldingSame ? before.holdingSource : given.rateSource,
    safeOn: safe.map(({ metal }) => metal),
    safeBecause,
    cautions: [...before.cautions.filter((key) => kept.has(key)), ...added],
  };
}

/** A bath that the shop adds. */
export function addedBath(id: string, { figures, ...solution }: AddBath): DissolvingRow {
  const { safe, cautions, ...given } = figures;
  return {
    id,
    ...solution,
    ...given,
    holdingSource: given.rateSource,
    safeOn: safe.map(({ metal }) => metal),
    safeBecause: Object.fromEntries(safe.flatMap(({ metal, reason }) => (reason ? [[metal, reason]] : []))),
    cautions: CAUTION_KEYS.filter((key) => cautions.includes(key)),
  };
}

function unlessMoved(before: ThreePoint, after: ThreePoint): ThreePoint {
  const text = ({ low, likely, high }: ThreePoint) => [low, likely, high].map(decimalText).join();
  return text(before) === text(after) ? before : after;
}

/**
 * What must be said besides the figures: who found out that it is safe on a base metal, and where changed figures come
 * from. Field names with what to do; empty when all is said.
 */
export function unsaid(before: DissolvingRow | null, after: DissolvingRow): Record<string, string> {
  const fields: Record<string, string> = {};
  for (const metal of after.safeOn) {
    if (metal === "other" || before?.safeOn.includes(metal)) continue;
    if (standingOn(after, metal).reason) continue;
    fields[reasonFieldName(metal)] = "Say how you know: a trial on scrap, with its day, or the supplier’s word.";
  }
  if (!before) return fields;
  const isFigureMoved = after.rateUmPerMin !== before.rateUmPerMin || after.holdingGPerL !== before.holdingGPerL;
  if (isFigureMoved && after.rateSource === before.rateSource) {
    fields.rateSource = "The figures changed: say where the new ones come from, such as “measured here” with the day.";
  }
  return fields;
}

/** A short name for the addresses of a way of the shop's own, from what is in the bath; `taken` ones are left alone. */
export function ownSlug(solution: string, taken: ReadonlySet<string>): string {
  const words = solution
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, "-")
    .replace(/^-+|-+$/g, "")
    .slice(0, 40)
    .replace(/-+$/, "");
  const stem = `own-${words || "bath"}`;
  let slug = stem;
  for (let number = 2; taken.has(slug); number += 1) slug = `${stem}-${number}`;
  return slug;
}
