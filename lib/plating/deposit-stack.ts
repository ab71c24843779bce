import { InputError, requirePositive } from "@/lib/input-error";
import { DEPOSIT_METALS, metalOf, requireValence, type DepositMetal } from "@/lib/plating/metals";
import { layerMassG } from "@/lib/plating/faraday";

/** One layer of a deposit. A stack is listed from the base metal out: strike first, final plate last. */
export interface Layer {
  metal: DepositMetal;
  thicknessUm: number;
  valence?: number;
  /** When the thickness is known only as a range: its ends. Both or neither. */
  thicknessLowUm?: number;
  thicknessHighUm?: number;
}

export const STACK_LIMITS = { layers: 12, thicknessUm: 1000 } as const;

/** The thickest that a strike gets: strike plate, 3 to 5 µm (Surface Finishing Guidebook 2011-12, copper, Table II). */
export const THICKEST_STRIKE_UM = 5;
/** A strike that nobody listed: a thin flash. Plain strike or flash is 0.2 to 2.5 µm (common practice, from memory). */
export const USUAL_STRIKE_UM = 0.5;

/** Finishes on which no shop lays an undercoat: seen there, the list is upside down. */
const FINISHES: readonly DepositMetal[] = ["Au", "Ag", "Rh", "Pt", "Pd", "Cr"];
const UNDERCOATS: readonly DepositMetal[] = ["Cu", "Ni", "Zn", "Fe", "Co"];
const PLACE_OF: ReadonlyMap<string, "finish" | "undercoat" | "either"> = new Map(
  DEPOSIT_METALS.map((metal) => [
    metal,
    FINISHES.includes(metal) ? "finish" : UNDERCOATS.includes(metal) ? "undercoat" : "either",
  ]),
);

/** Throws `InputError("stack…")` when the stack is empty, has an impossible layer or lists its layers upside down. */
export function checkStack(stack: readonly Layer[]): void {
  if (!Array.isArray(stack) || stack.length === 0) throw new InputError("stack", "List at least one layer.");
  if (stack.length > STACK_LIMITS.layers) {
    throw new InputError("stack", `List at most ${STACK_LIMITS.layers} layers.`);
  }
  let finish: Layer | undefined;
  let index = -1;
  for (const layer of stack) {
    index += 1;
    const place = checkLayer(layer, index);
    if (finish && place === "undercoat") {
      throw new InputError(
        "stack",
        `Layer ${index + 1}, ${metalOf(layer.metal).name}, lies above ${metalOf(finish.metal).name}. List the layers from the base metal out.`,
      );
    }
    if (place === "finish") finish = layer;
  }
}

/** @returns where a layer of this metal belongs */
function checkLayer(layer: Layer, index: number): "finish" | "undercoat" | "either" {
  const { thicknessUm, thicknessLowUm: low, thicknessHighUm: high } = layer;
  const place = PLACE_OF.get(layer.metal);
  if (place === undefined) throw new InputError(`stack.${index}.metal`, "This metal is not in the table.");
  // The field's name is put together only for a refusal: this runs for every case that is priced.
  if (!(thicknessUm > 0 && thicknessUm <= STACK_LIMITS.thicknessUm))
    requirePositive(`stack.${index}.thicknessUm`, thicknessUm, STACK_LIMITS.thicknessUm);
  if (layer.valence !== undefined) requireValence(layer.metal, layer.valence, `stack.${index}.valence`);
  if (low === undefined && high === undefined) return place;
  if (low === undefined || high === undefined || !(low > 0 && low <= layer.thicknessUm && layer.thicknessUm <= high)) {
    throw new InputError(`stack.${index}.thicknessUm`, "A range runs from low over likely to high, all above 0.");
  }
  requirePositive(`stack.${index}.thicknessHighUm`, high, STACK_LIMITS.thicknessUm);
  return place;
}

/** A layer weighed, for all parts together. */
export interface WeighedLayer {
  metal: DepositMetal;
  thicknessUm: number;
  massG: number;
}

/**
 * Mass of each layer and of all, g, over `quantity` parts of `areaDm2` each. Parts sum to the whole.
 * Throws `InputError` naming the field.
 *
 * Example: 12 shells of 0.62 dm² with 0.8 µm of gold carry 1.15 g of it.
 */
export function weighStack(
  stack: readonly Layer[],
  areaDm2: number,
  quantity = 1,
): { layers: WeighedLayer[]; totalG: number; totalUm: number } {
  checkStack(stack);
  requirePositive("quantity", quantity, 1e6);
  let totalG = 0;
  let totalUm = 0;
  const layers = stack.map(({ metal, thicknessUm }) => {
    const massG = layerMassG({ metal }, areaDm2, thicknessUm) * quantity;
    totalG += massG;
    totalUm += thicknessUm;
    return { metal, thicknessUm, massG };
  });
  return { layers, totalG, totalUm };
}

/** What the metal in weighed layers is worth, cents with fractions; a metal without a price throws `InputError`. */
export function metalValueCents(
  layers: readonly WeighedLayer[],
  metalCentsPerG: Readonly<Partial<Record<DepositMetal, number>>>,
): number {
  return layers.reduce((sum, layer) => {
    const price = metalCentsPerG[layer.metal];
    if (price === undefined || !(price >= 0)) {
      throw new InputError("metalCentsPerG", `Give a price for ${metalOf(layer.metal).name}.`);
    }
    return sum + layer.massG * price;
  }, 0);
}

/**
 * What lies on the part when the fault is seen at the strike: the copper strike and what is under it, no thicker than a
 * strike gets. A stack that lists no copper is taken to start with a flash of its own first metal. Never more than the stack.
 */
export function strikeOf(stack: readonly Layer[]): Layer[] {
  const copper = stack.findIndex((layer) => layer.metal === "Cu");
  if (copper >= 0) return stack.slice(0, copper + 1).map((layer) => thinTo(layer, THICKEST_STRIKE_UM));
  return stack.slice(0, 1).map((layer) => thinTo(layer, USUAL_STRIKE_UM));
}

function thinTo(layer: Layer, mostUm: number): Layer {
  const { thicknessLowUm: low, thicknessHighUm: high } = layer;
  if (layer.thicknessUm <= mostUm && low === undefined && high === undefined) return layer;
  const thin: Layer = { ...layer, thicknessUm: Math.min(layer.thicknessUm, mostUm) };
  if (low !== undefined) thin.thicknessLowUm = Math.min(low, mostUm);
  if (high !== undefined) thin.thicknessHighUm = Math.min(high, mostUm);
  return thin;
}
