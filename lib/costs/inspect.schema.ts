import { z } from "zod";
import { numberAboveZero, wholeJsonNumber } from "@/lib/json-number";

const MOST_CENTS = 1e12;

/** What `POST /api/estimates/inspect` takes. Money in minor units; a fraction of one is fine. */
export const inspectInput = z
  .object({
    checkCost: numberAboveZero({ what: "what it costs to check one part", example: 45, most: MOST_CENTS }),
    missCost: numberAboveZero({ what: "what a bad part that goes on costs", example: 14_500, most: MOST_CENTS }),
    inspected: wholeJsonNumber({ what: "the number of parts inspected", example: 400, least: 0, most: 1e12 }),
    bad: wholeJsonNumber({ what: "the number of bad parts among them", example: 12, least: 0, most: 1e12 }),
  })
  .refine(({ bad, inspected }) => !(inspected >= 0 && Number.isInteger(inspected)) || bad <= inspected, {
    path: ["bad"],
    error: "There cannot be more bad parts than inspected ones. Give both counts of the same runs.",
  });
export type InspectRequest = z.output<typeof inspectInput>;

/** What it answers. `rate` is null while nothing was inspected: nobody knows it then. */
export const inspectAnswer = z.object({
  given: z.record(z.string(), z.number()),
  breakEvenRate: z.number(),
  rate: z.number().nullable(),
  interval: z.tuple([z.number(), z.number()]),
  advice: z.enum(["check-all", "check-none", "too-few-runs"]),
  sources: z.array(z.string()),
});
