import { chanceToShow, piecesForChance, TEST_PIECES_SOURCE } from "@/lib/costs/test-pieces";
import { testPiecesAnswer, testPiecesInput } from "@/lib/costs/test-pieces.schema";
import { handle } from "@/lib/server/handle";

/** The chance that so many test pieces show a fault, and the pieces that a wanted chance takes: whichever was asked. */
export const POST = handle({
  permission: "plating.reckon",
  input: testPiecesInput,
  run: ({ input }) => {
    const { badShare, pieces, wantedChance } = input;
    return testPiecesAnswer.parse({
      given: input,
      ...(pieces === undefined ? {} : { chance: chanceToShow(badShare, pieces) }),
      ...(wantedChance === undefined ? {} : { pieces: piecesForChance(badShare, wantedChance) }),
      sources: [TEST_PIECES_SOURCE],
    });
  },
});
