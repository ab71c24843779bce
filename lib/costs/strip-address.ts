import type { StageFound } from "@/lib/cases/case-words";
import { STACK_LIMITS, USUAL_STRIKE_UM } from "@/lib/plating/deposit-stack";
import type { SHAPE_LENGTHS } from "./part-area";

/** One layer as it stands in its fields. `to`: the other end, when the thickness is known only as a range. */
export interface TypedLayer {
  metal: string;
  thickness: string;
  to: string;
}

/** What the estimator's fields hold, as it was typed; the page's address holds the same. */
export interface StripTyped extends Record<(typeof STRIP_FIELDS)[number], string> {
  /** From the base metal out. */
  layers: readonly TypedLayer[];
}

/** Every field but the layers', under the name that it has in the form and in the address. */
export const STRIP_FIELDS = [
  "parts",
  "areaUnit",
  "shape",
  "area",
  "length",
  "width",
  "height",
  "diameter",
  "inside",
  "lengthUnit",
  "value",
  "base",
  "alloy",
  "found",
  "thicknessUnit",
  "way",
] as const satisfies readonly (string | (typeof SHAPE_LENGTHS)[number])[];
export type StripField = (typeof STRIP_FIELDS)[number];

/** Layers are numbered from the base metal out, from 1. */
export const metalField = (place: number) => `metal${place}`;
export const thicknessField = (place: number) => `thickness${place}`;
export const toField = (place: number) => `to${place}`;
/** One more than a deposit may have, so that one too many is refused and not dropped. */
export const MOST_LAYER_FIELDS = STACK_LIMITS.layers + 1;

const found: StageFound = "after-final-plate";

/** An empty estimator: one steel part of 1 dm² with the usual strike and 5 µm of nickel, to type over. */
export const EMPTY_STRIP: StripTyped = {
  parts: "1",
  areaUnit: "dm2",
  shape: "typed",
  area: "1",
  length: "",
  width: "",
  height: "",
  diameter: "",
  inside: "",
  lengthUnit: "cm",
  value: "",
  base: "steel",
  alloy: "",
  found,
  thicknessUnit: "um",
  way: "",
  layers: [
    { metal: "Cu", thickness: String(USUAL_STRIKE_UM), to: "" },
    { metal: "Ni", thickness: "5", to: "" },
  ],
};

/** The fields as an address fills them; what it leaves out stays as it was to start with. Layers come all or not at all. */
export function typedFrom(query: Readonly<Partial<Record<string, string>>>, start: StripTyped): StripTyped {
  const fields = Object.fromEntries(STRIP_FIELDS.map((field) => [field, query[field] ?? start[field]]));
  // Object.fromEntries forgets its keys; they are exactly the fields.
  return { ...(fields as Record<StripField, string>), layers: layersFrom(query) ?? start.layers };
}

function layersFrom(query: Readonly<Partial<Record<string, string>>>): TypedLayer[] | undefined {
  const rows = Array.from({ length: MOST_LAYER_FIELDS }, (_, index) => ({
    metal: query[metalField(index + 1)],
    thickness: query[thicknessField(index + 1)],
    to: query[toField(index + 1)],
  }));
  const last = rows.findLastIndex((row) => row.metal !== undefined || row.thickness !== undefined);
  if (last < 0) return undefined;
  return rows.slice(0, last + 1).map((row) => ({
    metal: row.metal ?? "",
    thickness: row.thickness ?? "",
    to: row.to ?? "",
  }));
}

/** The address that holds these fields: empty ones and lengths that the shape does not ask for are left out. */
export function queryOf(typed: StripTyped, from: { case?: string; job?: string } = {}): Record<string, string> {
  const query: Record<string, string> = {};
  if (from.case) query.case = from.case;
  if (from.job) query.job = from.job;
  for (const [index, layer] of typed.layers.entries()) {
    query[metalField(index + 1)] = layer.metal;
    query[thicknessField(index + 1)] = layer.thickness;
    if (layer.to !== "") query[toField(index + 1)] = layer.to;
  }
  // An empty part value is said all the same: a case would fill it in again.
  for (const field of STRIP_FIELDS) if (typed[field] !== "" || field === "value") query[field] = typed[field];
  return query;
}
