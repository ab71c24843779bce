import { z } from "zod";
import { strikeThenPlate } from "@/lib/costs/case-stack";
import { REWORK_LIMITS } from "@/lib/costs/rework-input";
import { NOT_A_NUMBER, readDecimal } from "@/lib/decimal";
import { InputError } from "@/lib/input-error";
import { checkStack, STACK_LIMITS, type Layer } from "@/lib/plating/deposit-stack";
import { DEPOSIT_METALS, metalOf } from "@/lib/plating/metals";
import { BASE_METALS, LIMITS } from "./case-words";

export const JOB_LIMITS = { numberChars: 40 } as const;

/** Places in the deposit that a form has rows for, counted from the base out. The strike is layer 1 and needs no row. */
export const LAYER_PLACES = [2, 3, 4, 5] as const;
type LayerPlace = (typeof LAYER_PLACES)[number];

export const layerMetalName = (place: LayerPlace) => `layer${place}Metal` as const;
export const layerThicknessName = (place: LayerPlace) => `layer${place}Um` as const;

const words = (what: string, most: number) =>
  z
    .string({ error: `Give ${what}.` })
    .trim()
    .min(1, `Give ${what}.`)
    .max(most, `Keep it to ${most} characters.`);

const jobId = z.coerce.number({ error: "Choose a job." }).int("Choose a job.").positive("Choose a job.");

const baseMetal = z.enum(BASE_METALS, { error: "Choose the base metal." });
const alloy = z.string().trim().max(LIMITS.nameChars, `Keep it to ${LIMITS.nameChars} characters.`).default("");

const quantity = z
  .string({ error: "Give the number of parts." })
  .trim()
  .regex(/^\d{1,6}$/, "Give the number of parts as a whole number.")
  .transform(Number)
  .refine((parts) => parts >= 1 && parts <= LIMITS.quantity, `A job has 1 to ${LIMITS.quantity} parts.`);

const areaDm2 = z
  .string({ error: "Give the plated area of one part." })
  .trim()
  .min(1, "Give the plated area of one part. A guess is better than none.")
  .transform((typed, context) => {
    const area = readDecimal(typed);
    if (area === undefined) context.addIssue(NOT_A_NUMBER);
    else if (area <= 0) context.addIssue("The area is more than 0.");
    else if (area > REWORK_LIMITS.areaDm2) context.addIssue(`Write at most ${REWORK_LIMITS.areaDm2} dm².`);
    else return area;
    return z.NEVER;
  });

/** Undefined: the form did not ask. Empty: nobody knows it yet, which is stored as 0. */
const partValue = z
  .string()
  .trim()
  .optional()
  .transform((typed, context) => {
    if (typed === undefined) return undefined;
    const value = typed === "" ? 0 : readDecimal(typed);
    if (value === undefined) context.addIssue(NOT_A_NUMBER);
    else if (value * 100 > REWORK_LIMITS.partValueCents) context.addIssue("That is more than this shop counts.");
    else return Math.round(value * 100);
    return z.NEVER;
  });

const metal = z.union([z.literal(""), z.enum(DEPOSIT_METALS)], { error: "Choose a metal of the list." }).default("");
const thickness = z.string().trim().default("");
// Object.fromEntries forgets its keys; they are exactly the rows'.
const layerInputs = Object.fromEntries(
  LAYER_PLACES.flatMap((place) => [
    [layerMetalName(place), metal],
    [layerThicknessName(place), thickness],
  ]),
) as Record<ReturnType<typeof layerMetalName>, typeof metal> &
  Record<ReturnType<typeof layerThicknessName>, typeof thickness>;

type TypedLayers = z.output<z.ZodObject<typeof layerInputs>>;

/** The layers in order, or issues beside the rows: half a row, a gap, an impossible thickness, layers upside down. */
function layersFrom(typed: TypedLayers, context: z.RefinementCtx): Layer[] {
  const before = context.issues.length;
  const issue = (field: string, message: string) => context.addIssue({ code: "custom", path: [field], message });
  const layers: Layer[] = [];
  for (const [index, place] of LAYER_PLACES.entries()) {
    const symbol = typed[layerMetalName(place)];
    const um = typed[layerThicknessName(place)];
    if (symbol === "" && um === "") continue;
    if (symbol === "") issue(layerMetalName(place), "Choose the metal, or clear its thickness.");
    else if (layers.length < index && context.issues.length === before)
      issue(layerMetalName(place), "Leave no row empty before it.");
    else layers.push({ metal: symbol, thicknessUm: thicknessFrom(symbol, um, layerThicknessName(place), issue) });
  }
  if (context.issues.length > before) return [];
  try {
    checkStack(strikeThenPlate(layers));
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    issue("layers", error.problem);
  }
  return layers;
}

function thicknessFrom(
  symbol: Layer["metal"],
  typed: string,
  field: string,
  issue: (field: string, message: string) => void,
): number {
  const um = readDecimal(typed);
  if (typed === "") issue(field, `Give the thickness of the ${metalOf(symbol).name}.`);
  else if (um === undefined) issue(field, NOT_A_NUMBER);
  else if (!(um > 0 && um <= STACK_LIMITS.thicknessUm))
    issue(field, `A layer is more than 0 and at most ${STACK_LIMITS.thicknessUm} µm.`);
  return um ?? 0;
}

const costFacts = { quantity, areaDm2, partValue, ...layerInputs };

interface TypedCostFacts extends TypedLayers {
  quantity: number;
  areaDm2: number;
  partValue?: number;
}

const costFactsFrom = (typed: TypedCostFacts, context: z.RefinementCtx) => ({
  quantity: typed.quantity,
  areaDm2: typed.areaDm2,
  /** Undefined: not asked for. 0: not known. */
  partValueCents: typed.partValue,
  finalStack: layersFrom(typed, context),
});

/** What opens a job: whose and what the parts are, and what their cost rests on. */
export const openJobInput = z
  .object({
    number: words("the job's number", JOB_LIMITS.numberChars),
    customer: words("the customer", LIMITS.nameChars),
    partName: words("the part a name", LIMITS.nameChars),
    baseMetal,
    alloy,
    ...costFacts,
  })
  .transform(({ number, customer, partName, baseMetal: metal, alloy: typedAlloy, ...typed }, context) => ({
    number,
    customer,
    partName,
    baseMetal: metal,
    alloy: typedAlloy || null,
    ...costFactsFrom(typed, context),
  }));
export type OpenJob = z.output<typeof openJobInput>;

/** What may be changed of an open job: that on which the prices of later cases rest, and the metal that its card got wrong. */
export const changeJobInput = z
  .object({ jobId, baseMetal: baseMetal.optional(), alloy, ...costFacts })
  .transform(({ jobId: id, baseMetal: metal, alloy: typedAlloy, ...typed }, context) => ({
    jobId: id,
    // A form that does not ask leaves the metal as it is.
    ...(metal ? { metal: { baseMetal: metal, alloy: typedAlloy || null } } : {}),
    ...costFactsFrom(typed, context),
  }));
export type ChangeJob = z.output<typeof changeJobInput>;

export const jobIdInput = z.object({ jobId });
