import { z } from "zod";
import { numberAboveZero, wholeJsonNumber } from "@/lib/json-number";
import { PLATE_LIMITS } from "@/lib/plating/faraday";
import { typedMetal } from "@/lib/plating/metal.schema";

const deposit = {
  metal: typedMetal,
  valence: wholeJsonNumber({
    what: "the valence, the charge of the metal's ion",
    example: 2,
    least: 1,
    most: 8,
  }).optional(),
  efficiency: numberAboveZero({
    what: "the cathode efficiency as a share, where 0.95 is 95 %",
    example: 0.95,
    most: 1,
  }).optional(),
  areaDm2: numberAboveZero({ what: "the area in dm²", example: 2.5, most: PLATE_LIMITS.areaDm2 }),
  densityGCm3: numberAboveZero({ what: "the deposit's own density in g/cm³", example: 8.9, most: 30 }).optional(),
};

const forThickness = z.object({
  form: z.literal("for-thickness"),
  ...deposit,
  thicknessUm: numberAboveZero({ what: "the thickness in µm", example: 5, most: PLATE_LIMITS.thicknessUm }),
  currentDensityADm2: numberAboveZero({
    what: "the current density in A/dm²",
    example: 4,
    most: PLATE_LIMITS.currentDensityADm2,
  }),
});

const byCurrent = z.object({
  form: z.literal("by-current"),
  ...deposit,
  currentA: numberAboveZero({ what: "the current in A", example: 10, most: PLATE_LIMITS.currentA }),
  minutes: numberAboveZero({ what: "the time in minutes", example: 20, most: PLATE_LIMITS.minutes }),
});

/**
 * Which question is asked: how long for a thickness, or what a current and time give. Told by the fields that are there;
 * of two halves the one with more of its fields, so that what is missing is named for the form that was meant.
 */
function formOf(sent: object): "for-thickness" | "by-current" {
  const has = (field: string) => Number(Object.hasOwn(sent, field));
  return has("currentA") + has("minutes") > has("thicknessUm") + has("currentDensityADm2")
    ? "by-current"
    : "for-thickness";
}

/** What `POST /api/estimates/plate` takes: one of its two forms, with all that belongs to it. */
export const plateInput = z
  .record(z.string(), z.unknown())
  .superRefine((sent, context) => {
    if (["thicknessUm", "currentDensityADm2", "currentA", "minutes"].every((field) => Object.hasOwn(sent, field))) {
      const message = "Give a thickness and a current density, or a current and minutes, not both.";
      context.addIssue({ code: "custom", path: ["currentA"], message });
    }
  })
  .transform((sent) => ({ ...sent, form: formOf(sent) }))
  .pipe(z.discriminatedUnion("form", [forThickness, byCurrent]));
export type PlateInput = z.output<typeof plateInput>;

/** What it answers. Mass and charge in both forms; the rest is what was asked for. */
export const plateAnswer = z.object({
  given: z.record(z.string(), z.union([z.string(), z.number()])),
  /** What the words and gaps of `given` were taken for. */
  metal: z.string(),
  valence: z.number(),
  efficiency: z.number(),
  massG: z.number(),
  equivalentGPerAh: z.number(),
  ampereHours: z.number(),
  minutes: z.number(),
  currentA: z.number(),
  thicknessUm: z.number(),
  assumed: z.array(z.string()),
  sources: z.array(z.string()),
});
export type PlateAnswer = z.output<typeof plateAnswer>;
