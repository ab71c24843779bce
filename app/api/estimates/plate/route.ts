import { handle } from "@/lib/server/handle";
import { plateAnswer, plateInput } from "@/lib/plating/plate.schema";
import { reckonPlate } from "@/lib/plating/reckon-plate";

/** How long for a thickness, or what a current and time put on: Faraday's law both ways. */
export const POST = handle({
  permission: "plating.reckon",
  input: plateInput,
  run: ({ input }) => plateAnswer.parse(reckonPlate(input)),
});
