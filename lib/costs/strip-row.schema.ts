import { z } from "zod";
import { DEPOSIT_METALS } from "@/lib/plating/metals";
import { NOT_A_NUMBER, readDecimal } from "@/lib/decimal";
import type { ThreePoint } from "@/lib/costs/pert";
import { CAUTION_KEYS } from "@/lib/costs/strip-cautions";
import type { DissolvingRow } from "@/lib/costs/strip-methods";
import {
  NAMED_BASE_METALS,
  reasonFieldName,
  standingFieldName,
  STANDINGS,
  type NamedBaseMetal,
} from "@/lib/costs/strip-row-fields";

/** Far beyond any bath: a rate that dissolves a millimetre a minute, a litre that holds its own weight of metal. */
export const STRIP_LIMITS = {
  umPerMin: 1000,
  holdingGPerL: 1000,
  minutesPerDm2Um: 1000,
  pricePerL: 10_000,
  reasonChars: 200,
  solutionChars: 160,
  sourceChars: 240,
} as const;

/** A typed number above 0. */
const figure = (most: number) =>
  z
    .string({ error: "Give a number." })
    .trim()
    .min(1, "Give a number.")
    .transform((typed, context) => {
      const value = readDecimal(typed);
      if (value === undefined) context.addIssue(NOT_A_NUMBER);
      else if (!(value > 0 && value <= most)) context.addIssue(`Write more than 0, at most ${most}.`);
      else return value;
      return z.NEVER;
    });

const price = z
  .string()
  .trim()
  .default("")
  .transform((typed, context) => {
    if (typed === "") return undefined;
    const value = readDecimal(typed);
    if (value === undefined) context.addIssue(NOT_A_NUMBER);
    else if (value > STRIP_LIMITS.pricePerL) context.addIssue(`Write at most ${STRIP_LIMITS.pricePerL}.`);
    else return Number((value * 100).toFixed(8));
    return z.NEVER;
  });

const text = (missing: string, most: number) =>
  z.string({ error: missing }).trim().min(1, missing).max(most, `Keep it to ${most} characters.`);

const list = <Item extends z.ZodType>(item: Item) =>
  z.preprocess(
    (raw) => (raw === undefined || raw === "" ? [] : Array.isArray(raw) ? raw : [raw]),
    z.array(item).max(40, "Too many."),
  );

const slug = z
  .string({ error: "Choose a way." })
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, "Choose a way.")
  .max(80);
/** The row that the form was made from: a newer one means that somebody else saved in between. */
const startedFrom = z.coerce.number({ error: "Reload the page." }).int("Reload the page.").positive("Reload the page.");

const source = text(
  "Say where it comes from: a supplier’s sheet, a book, a trial of your own.",
  STRIP_LIMITS.sourceChars,
);
const rateSource = text("Say where the figures come from: measured here, with the day.", STRIP_LIMITS.sourceChars);

// Object.fromEntries forgets its keys; they are exactly the metals'.
const standing = z.enum(STANDINGS, { error: "Choose one of the three." }).default("unknown");
const reason = z
  .string()
  .trim()
  .max(STRIP_LIMITS.reasonChars, `Keep it to ${STRIP_LIMITS.reasonChars} characters.`)
  .default("");
const standingInputs = Object.fromEntries(
  NAMED_BASE_METALS.map((metal) => [standingFieldName(metal), standing]),
) as Record<ReturnType<typeof standingFieldName>, typeof standing>;
const reasonInputs = Object.fromEntries(NAMED_BASE_METALS.map((metal) => [reasonFieldName(metal), reason])) as Record<
  ReturnType<typeof reasonFieldName>,
  typeof reason
>;

const bathFields = {
  rateLow: figure(STRIP_LIMITS.umPerMin),
  rateLikely: figure(STRIP_LIMITS.umPerMin),
  rateHigh: figure(STRIP_LIMITS.umPerMin),
  holdingLow: figure(STRIP_LIMITS.holdingGPerL),
  holdingLikely: figure(STRIP_LIMITS.holdingGPerL),
  holdingHigh: figure(STRIP_LIMITS.holdingGPerL),
  price,
  cautions: list(z.enum(CAUTION_KEYS, { error: "Choose a caution of the list." })),
  source,
  rateSource,
  ...standingInputs,
  ...reasonInputs,
};

type Typed = z.output<z.ZodObject<typeof bathFields>>;

/** What of a bath the shop sets. */
export type BathFigures = Pick<
  DissolvingRow,
  "rateUmPerMin" | "holdingGPerL" | "solutionCentsPerL" | "attacks" | "cautions" | "source" | "rateSource"
> & { safe: { metal: NamedBaseMetal; reason: string }[] };

function bathFrom(typed: Typed, context: z.RefinementCtx): BathFigures {
  const attacks: Partial<Record<NamedBaseMetal, string>> = {};
  const safe: BathFigures["safe"] = [];
  for (const metal of NAMED_BASE_METALS) {
    const why = typed[reasonFieldName(metal)];
    const stands = typed[standingFieldName(metal)];
    if (stands === "safe") safe.push({ metal, reason: why });
    if (stands !== "attacks") continue;
    if (why === "") issueAt(context, reasonFieldName(metal), "Say what it does to the part, in a sentence.");
    attacks[metal] = why;
  }
  return {
    rateUmPerMin: rising(typed.rateLow, typed.rateLikely, typed.rateHigh, "rate", context),
    holdingGPerL: rising(typed.holdingLow, typed.holdingLikely, typed.holdingHigh, "holding", context),
    solutionCentsPerL: typed.price,
    attacks,
    safe,
    cautions: typed.cautions,
    source: typed.source,
    rateSource: typed.rateSource,
  };
}

/** Low ≤ likely ≤ high, or an issue beside the first figure that is below the one before. */
function rising(low: number, likely: number, high: number, name: string, context: z.RefinementCtx): ThreePoint {
  if (likely < low) issueAt(context, `${name}Likely`, "Write at least the low figure.");
  else if (high < likely) issueAt(context, `${name}High`, "Write at least the likely figure.");
  return { low, likely, high };
}

function issueAt(context: z.RefinementCtx, field: string, message: string): void {
  context.addIssue({ code: "custom", path: [field], message });
}

/** What the owner sends to change a bath that the shop has. */
export const changeBathInput = z
  .object({ slug, startedFrom, ...bathFields })
  .transform(({ slug: way, startedFrom: from, ...typed }, context) => ({
    slug: way,
    startedFrom: from,
    figures: bathFrom(typed, context),
  }));
export type ChangeBath = z.output<typeof changeBathInput>;

const temperature = z
  .string({ error: "Give the temperature." })
  .trim()
  .min(1, "Give the temperature.")
  .transform((typed, context) => {
    const value = readDecimal(typed);
    if (value !== undefined && value <= 150) return value;
    context.addIssue("Write degrees Celsius, 0 to 150.");
    return z.NEVER;
  });

/** What the owner sends to add a bath of the shop's own. */
export const addBathInput = z
  .object({
    method: z.enum(["chemical", "electrolytic"], { error: "Choose with or without current." }),
    takesOff: list(z.enum(DEPOSIT_METALS, { error: "Choose deposits of the list." })).refine(
      (metals) => metals.length > 0,
      "Choose what it takes off.",
    ),
    solution: text("Say what is in it, and how much of it.", STRIP_LIMITS.solutionChars),
    tempLow: temperature,
    tempHigh: temperature,
    current: z.string().trim().max(60, "Keep it to 60 characters.").default(""),
    ...bathFields,
  })
  .transform(({ method, takesOff, solution, tempLow, tempHigh, current, ...typed }, context) => {
    if (tempHigh < tempLow) issueAt(context, "tempHigh", "Write at least the lower temperature.");
    const figures = bathFrom(typed, context);
    const bathTempC: [number, number] = [tempLow, tempHigh];
    return { method, takesOff, solution, bathTempC, current: current || undefined, figures };
  });
export type AddBath = z.output<typeof addBathInput>;

/** What the owner sends to change polishing by hand. */
export const changePolishingInput = z
  .object({
    slug,
    startedFrom,
    rateLow: figure(STRIP_LIMITS.minutesPerDm2Um),
    rateLikely: figure(STRIP_LIMITS.minutesPerDm2Um),
    rateHigh: figure(STRIP_LIMITS.minutesPerDm2Um),
    source,
  })
  .transform(({ slug: way, startedFrom: from, rateLow, rateLikely, rateHigh, source: said }, context) => ({
    slug: way,
    startedFrom: from,
    minutesPerDm2Um: rising(rateLow, rateLikely, rateHigh, "rate", context),
    source: said,
  }));
export type ChangePolishing = z.output<typeof changePolishingInput>;

/** Retiring a way, or bringing it back. */
export const turnWayInput = z.object({ slug, startedFrom, retired: z.stringbool().or(z.boolean()) });
export type TurnWay = z.output<typeof turnWayInput>;
