import { z } from "zod";
import { MOST_PIECES } from "@/lib/costs/test-pieces";
import { numberAboveZero, wholeJsonNumber } from "@/lib/json-number";

const EITHER = "Give the number of pieces, or the chance that is wanted as wantedChance.";

/** What `POST /api/estimates/test-pieces` takes: a number of pieces, a wanted chance, or both. */
export const testPiecesInput = z
  .object({
    badShare: numberAboveZero({
      what: "the share of parts that the fault spoils, where 0.05 is 5 %",
      example: 0.05,
      most: 1,
    }),
    pieces: wholeJsonNumber({ what: "the number of test pieces", example: 20, least: 1, most: MOST_PIECES }).optional(),
    wantedChance: numberAboveZero({
      what: "the chance of seeing the fault, where 0.95 is 95 %",
      example: 0.95,
      most: 1,
    })
      .lt(1, "No number of pieces makes it certain. Give a chance below 1, such as 0.95.")
      .optional(),
  })
  .superRefine(({ pieces, wantedChance }, context) => {
    if (pieces !== undefined || wantedChance !== undefined) return;
    context.addIssue({ code: "custom", path: ["pieces"], message: EITHER });
    context.addIssue({ code: "custom", path: ["wantedChance"], message: EITHER });
  });
export type TestPiecesRequest = z.output<typeof testPiecesInput>;

/** What it answers: the chance of the pieces given, the pieces for the chance wanted, or both. */
export const testPiecesAnswer = z.object({
  given: z.record(z.string(), z.number()),
  chance: z.number().optional(),
  pieces: z.number().optional(),
  sources: z.array(z.string()),
});
