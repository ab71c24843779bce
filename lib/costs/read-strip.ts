import { BASE_METALS, LIMITS, STAGES_FOUND, type BaseMetal, type StageFound } from "@/lib/cases/case-words";
import { NOT_A_NUMBER, readDecimal } from "@/lib/decimal";
import { InputError } from "@/lib/input-error";
import { checkStack, STACK_LIMITS, type Layer } from "@/lib/plating/deposit-stack";
import { DEPOSIT_METALS } from "@/lib/plating/metals";
import { milToUm, squareInchToDm2 } from "@/lib/units";
import { AREA_SHAPES, LENGTHS_OF, partAreaDm2, SHAPE_LENGTH_TITLES, type ShapeLength } from "./part-area";
import { REWORK_LIMITS } from "./rework-input";
import { metalField, thicknessField, toField, type StripTyped, type TypedLayer } from "./strip-address";
import { STRIP_METHODS, type StripMethod } from "./strip-methods";

/** A batch as the estimate needs it. */
export interface StripBatch {
  quantity: number;
  areaDm2: number;
  partValueCents?: number;
  baseMetal: BaseMetal;
  alloy: string | null;
  stageFound: StageFound;
  /** From the base metal out. */
  stack: Layer[];
  /** The way that was picked; none: the cheapest. */
  method?: StripMethod;
}

/** What is wrong, by field, in sentences. */
export type StripFaults = Readonly<Partial<Record<string, string>>>;

/** A batch, or what has to be mended before there is one. */
export interface StripReading {
  batch: StripBatch | null;
  /** What can be drawn, whatever else is wrong: the stack from the base metal out, and what it lies on. */
  section: { stack: readonly Layer[]; baseMetal: BaseMetal } | null;
  faults: StripFaults;
}

const CM_PER_INCH = 2.54;

/**
 * Reads the estimator's fields. Everything that is wrong is named at once, each beside its field; a way that is not
 * known is only passed over, since the cheapest stands in for it.
 */
export function readStrip(typed: StripTyped): StripReading {
  const faults: Record<string, string> = {};
  const note = (field: string, problem: string) => {
    faults[field] ??= problem;
    return NaN;
  };
  const quantity = readParts(typed.parts, note);
  const areaDm2 = readArea(typed, note);
  const partValueCents = readValue(typed.value, note);
  const baseMetal = oneOf(typed.base, BASE_METALS);
  if (!baseMetal) note("base", "Choose the base metal.");
  const stageFound = oneOf(typed.found, STAGES_FOUND);
  if (!stageFound) note("found", "Choose where it was found.");
  const stack = readStack(typed, note);
  const method = oneOf(typed.way, STRIP_METHODS);
  if (typed.way !== "" && !method) note("way", "This way is not known. The cheapest is taken.");
  const isDrawn = stack.length === typed.layers.length && faults.stack === undefined;
  const section = isDrawn ? { stack, baseMetal: baseMetal ?? "other" } : null;
  const isReady = Object.keys(faults).every((field) => field === "way");
  if (!isReady || !baseMetal || !stageFound) return { batch: null, section, faults };
  const alloy = typed.alloy || null;
  const batch = { quantity, areaDm2, partValueCents, baseMetal, alloy, stageFound, stack, method };
  return { batch, section, faults };
}

type NoteFault = (field: string, problem: string) => number;

function oneOf<Word extends string>(value: string, words: readonly Word[]): Word | undefined {
  return words.find((word) => word === value);
}

function readParts(typed: string, note: NoteFault): number {
  const parts = /^\d{1,9}$/.test(typed) ? Number(typed) : 0;
  const most = LIMITS.quantity.toLocaleString("en-US");
  return parts >= 1 && parts <= LIMITS.quantity ? parts : note("parts", `Give a whole number from 1 to ${most}.`);
}

function readArea(typed: StripTyped, note: NoteFault): number {
  const shape = oneOf(typed.shape, AREA_SHAPES);
  if (!shape) return note("shape", "Choose a shape.");
  const areaDm2 = shape === "typed" ? readTypedArea(typed, note) : readShapeArea(shape, typed, note);
  if (areaDm2 > REWORK_LIMITS.areaDm2) return note("area", `A part has at most ${REWORK_LIMITS.areaDm2} dm².`);
  return areaDm2;
}

function readTypedArea({ area, areaUnit }: StripTyped, note: NoteFault): number {
  const figure = readDecimal(area);
  if (area === "") return note("area", "Give the plated area of one part, or choose a shape.");
  if (figure === undefined) return note("area", NOT_A_NUMBER);
  if (figure <= 0) return note("area", "The area is more than 0.");
  return areaUnit === "in2" ? squareInchToDm2(figure) : figure;
}

function readShapeArea(shape: keyof typeof LENGTHS_OF, typed: StripTyped, note: NoteFault): number {
  const factor = typed.lengthUnit === "in" ? CM_PER_INCH : 1;
  const lengthsCm: Partial<Record<ShapeLength, number>> = {};
  for (const name of LENGTHS_OF[shape]) lengthsCm[name] = readLength(name, typed[name], note) * factor;
  if (LENGTHS_OF[shape].some((name) => Number.isNaN(lengthsCm[name]))) return NaN;
  try {
    return partAreaDm2(shape, lengthsCm);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return note(error.field, error.problem);
  }
}

function readLength(name: ShapeLength, typed: string, note: NoteFault): number {
  const figure = readDecimal(typed);
  if (typed === "") return note(name, `Give the ${SHAPE_LENGTH_TITLES[name].toLowerCase()}.`);
  if (figure === undefined) return note(name, NOT_A_NUMBER);
  return figure > 0 ? figure : note(name, "A length is more than 0.");
}

/** Undefined: nobody said, and scrap risk is left out. */
function readValue(typed: string, note: NoteFault): number | undefined {
  if (typed === "") return undefined;
  const figure = readDecimal(typed);
  if (figure === undefined) return note("value", NOT_A_NUMBER);
  const cents = Math.round(figure * 100);
  return cents <= REWORK_LIMITS.partValueCents ? cents : note("value", "That is more than this shop counts.");
}

function readStack(typed: StripTyped, note: NoteFault): Layer[] {
  const stack = typed.layers.flatMap((layer, index): Layer[] => {
    const read = readLayer(layer, index + 1, typed.thicknessUnit === "mil", note);
    return read ? [read] : [];
  });
  if (stack.length < typed.layers.length) return stack;
  try {
    checkStack(stack);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    note("stack", error.problem);
  }
  return stack;
}

function readLayer(layer: TypedLayer, place: number, isMil: boolean, note: NoteFault): Layer | undefined {
  const metal = oneOf(layer.metal, DEPOSIT_METALS);
  if (!metal) note(metalField(place), "Choose the metal.");
  const lowUm = readThickness(layer.thickness, thicknessField(place), isMil, note);
  const highUm = layer.to === "" ? lowUm : readThickness(layer.to, toField(place), isMil, note);
  if (highUm < lowUm) note(toField(place), "The second figure of a range is the greater one.");
  if (!metal || !(highUm >= lowUm)) return undefined;
  if (highUm === lowUm) return { metal, thicknessUm: lowUm };
  // Nobody said which is likely: the middle is.
  return { metal, thicknessUm: (lowUm + highUm) / 2, thicknessLowUm: lowUm, thicknessHighUm: highUm };
}

function readThickness(typed: string, field: string, isMil: boolean, note: NoteFault): number {
  const figure = readDecimal(typed);
  if (typed === "") return note(field, "Give the thickness.");
  if (figure === undefined) return note(field, NOT_A_NUMBER);
  const um = isMil ? milToUm(figure) : figure;
  if (um > 0 && um <= STACK_LIMITS.thicknessUm) return um;
  return note(field, `A layer is more than 0 and at most ${STACK_LIMITS.thicknessUm} µm.`);
}
