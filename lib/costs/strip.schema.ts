import { z } from "zod";
import { LIMITS, STAGE_TITLES, STAGES_FOUND, type BaseMetal, type StageFound } from "@/lib/cases/case-words";
import { REWORK_LIMITS } from "@/lib/costs/rework-input";
import { STRIP_METHOD_TITLES, STRIP_METHODS, type StripMethod } from "@/lib/costs/strip-methods";
import { InputError } from "@/lib/input-error";
import { numberAboveZero, numberFromZero, wholeJsonNumber } from "@/lib/json-number";
import { parseBaseMetal } from "@/lib/library/parse-base-metal";
import { STACK_LIMITS } from "@/lib/plating/deposit-stack";
import { typedMetal } from "@/lib/plating/metal.schema";

const baseMetal = z
  .string({ error: "Name the base metal, such as brass, or its alloy, such as C360." })
  .transform((typed, context): { typed: string; metal: BaseMetal } => {
    try {
      return { typed, metal: parseBaseMetal(typed) };
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      context.addIssue(error.problem);
      return z.NEVER;
    }
  });

/** One of our words as people write it: the slug with hyphens or spaces, or its title. */
function word<Word extends string>(what: string, words: readonly Word[], titles: Record<Word, string>) {
  const asked = `Name ${what}, one of: ${words.join(", ")}.`;
  const plain = (text: string) =>
    text
      .trim()
      .toLowerCase()
      .replaceAll(/[\s_]+/g, "-");
  return z.string({ error: asked }).transform((typed, context): { typed: string; word: Word } => {
    const found = words.find((each) => [each, plain(titles[each])].includes(plain(typed)));
    if (found !== undefined) return { typed, word: found };
    context.addIssue(asked);
    return z.NEVER;
  });
}

const layer = z.object(
  {
    metal: typedMetal,
    thicknessUm: numberAboveZero({
      what: "the thickness of the layer in µm",
      example: 5,
      most: STACK_LIMITS.thicknessUm,
    }),
  },
  { error: "Give each layer as an object with metal and thicknessUm." },
);

const ASK_FOR_LAYERS = "List the layers from the base metal out, each with metal and thicknessUm.";

/** What `POST /api/estimates/strip` takes. Money in minor units of the shop's currency. */
export const stripInput = z.object({
  quantity: wholeJsonNumber({ what: "the number of parts", example: 12, least: 1, most: LIMITS.quantity }),
  areaDm2: numberAboveZero({ what: "the area of one part in dm²", example: 0.62, most: REWORK_LIMITS.areaDm2 }),
  baseMetal,
  stack: z
    .array(layer, { error: ASK_FOR_LAYERS })
    .min(1, ASK_FOR_LAYERS)
    .max(STACK_LIMITS.layers, `List at most ${STACK_LIMITS.layers} layers.`),
  method: word<StripMethod>("the way to take it off", STRIP_METHODS, STRIP_METHOD_TITLES).optional(),
  stageFound: word<StageFound>("where the fault was found", STAGES_FOUND, STAGE_TITLES),
  partValueCents: numberFromZero({
    what: "the value of one part in minor units",
    example: 4200,
    most: REWORK_LIMITS.partValueCents,
  }).optional(),
});
export type StripInput = z.output<typeof stripInput>;

const minutes = z.object({ low: z.number(), likely: z.number(), high: z.number(), mean: z.number() });
/** Whole minor units; the lines add up to the mean. */
const cost = z.object({
  mean: z.int(),
  low90: z.int(),
  high90: z.int(),
  lines: z.array(z.object({ key: z.string(), name: z.string(), mean: z.int() })),
});
const figures = {
  /** Hands-on, all parts together. */
  minutes,
  tankMinutes: minutes,
  metalWrittenOffG: z.number(),
  cost,
};

const option = z.discriminatedUnion("allowed", [
  z.object({
    method: z.enum(STRIP_METHODS),
    title: z.string(),
    allowed: z.literal(true),
    ...figures,
    /** What the hands-on minutes were multiplied by, from the shop's own records; 1 without. */
    minutesCorrection: z.number(),
    widest: z.array(z.string()),
    cautions: z.array(z.string()),
  }),
  z.object({ method: z.enum(STRIP_METHODS), title: z.string(), allowed: z.literal(false), why: z.string() }),
]);

/** What it answers: every way with its range, a refused one with the reason, and the same fault at the strike. */
export const stripAnswer = z.object({
  given: z.record(z.string(), z.unknown()),
  /** What the words of `given` were taken for. */
  baseMetal: z.string(),
  stageFound: z.string(),
  currency: z.string(),
  /** Start of the shop's rates that the figures rest on, UTC milliseconds. */
  ratesFromAt: z.number(),
  options: z.array(option),
  atStrike: z.object({ method: z.enum(STRIP_METHODS), ...figures }),
  assumed: z.array(z.string()),
  sources: z.array(z.string()),
});
export type StripAnswer = z.output<typeof stripAnswer>;
