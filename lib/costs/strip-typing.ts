import { decimalText, readDecimal } from "@/lib/decimal";
import { STACK_LIMITS } from "@/lib/plating/deposit-stack";
import { dm2ToSquareInch, milToUm, squareInchToDm2, umToMil } from "@/lib/units";
import { SHAPE_LENGTHS } from "./part-area";
import type { StripTyped, TypedLayer } from "./strip-address";

/** A press beside the stack: one more layer, the top one off, or layer n under the one beneath it. */
export type StackChange = "add" | "off" | `down-${number}`;

/** What most often comes next on a metal, with a usual thickness, to type over. Common practice, from memory. */
const USUAL_NEXT: Readonly<Partial<Record<string, TypedLayer>>> = {
  Cu: { metal: "Ni", thickness: "5", to: "" },
  Ni: { metal: "Au", thickness: "0.5", to: "" },
  Ag: { metal: "Rh", thickness: "0.2", to: "" },
  Pd: { metal: "Au", thickness: "0.1", to: "" },
  Au: { metal: "Rh", thickness: "0.2", to: "" },
  Rh: { metal: "Rh", thickness: "0.2", to: "" },
};
const USUAL_FIRST: TypedLayer = { metal: "Cu", thickness: "0.5", to: "" };

/** The fields after a press beside the stack. What cannot be done leaves them as they are. */
export function changeStack(typed: StripTyped, change: string): StripTyped {
  const { layers } = typed;
  if (change === "add" && layers.length < STACK_LIMITS.layers) {
    const top = layers.at(-1);
    const next = top ? (USUAL_NEXT[top.metal] ?? { metal: "Au", thickness: "0.5", to: "" }) : USUAL_FIRST;
    const inUnit = typed.thicknessUnit === "mil" ? scaleLayer(next, umToMil) : next;
    return { ...typed, layers: [...layers, inUnit] };
  }
  if (change === "off" && layers.length > 1) return { ...typed, layers: layers.slice(0, -1) };
  const place = /^down-(\d{1,2})$/.exec(change)?.[1];
  return place === undefined ? typed : { ...typed, layers: lower(layers, Number(place)) };
}

/** Layer number `place` and the one beneath it change places. */
function lower(layers: readonly TypedLayer[], place: number): readonly TypedLayer[] {
  const upper = layers[place - 1];
  const beneath = layers[place - 2];
  if (!upper || !beneath) return layers;
  return layers.with(place - 2, upper).with(place - 1, beneath);
}

/** The same thicknesses in the other unit; what is no number stays as it was typed. */
export function withThicknessUnit(typed: StripTyped, unit: string): StripTyped {
  if (unit === typed.thicknessUnit) return typed;
  const convert = unit === "mil" ? umToMil : milToUm;
  return { ...typed, thicknessUnit: unit, layers: typed.layers.map((layer) => scaleLayer(layer, convert)) };
}

/** The same area in the other unit. */
export function withAreaUnit(typed: StripTyped, unit: string): StripTyped {
  if (unit === typed.areaUnit) return typed;
  return { ...typed, areaUnit: unit, area: scaled(typed.area, unit === "in2" ? dm2ToSquareInch : squareInchToDm2) };
}

/** The same lengths in the other unit. The inch is 2.54 cm by definition (NIST Handbook 44, appendix C). */
export function withLengthUnit(typed: StripTyped, unit: string): StripTyped {
  if (unit === typed.lengthUnit) return typed;
  const convert = (figure: number) => (unit === "in" ? figure / 2.54 : figure * 2.54);
  const lengths = Object.fromEntries(SHAPE_LENGTHS.map((name) => [name, scaled(typed[name], convert)]));
  return { ...typed, ...lengths, lengthUnit: unit };
}

function scaleLayer(layer: TypedLayer, convert: (figure: number) => number): TypedLayer {
  return { ...layer, thickness: scaled(layer.thickness, convert), to: scaled(layer.to, convert) };
}

function scaled(typed: string, convert: (figure: number) => number): string {
  const figure = readDecimal(typed);
  return figure === undefined ? typed : decimalText(convert(figure));
}
