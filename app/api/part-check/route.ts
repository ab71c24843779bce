import { checkPart } from "@/lib/metals/part-check";
import { partCheckAnswer } from "@/lib/metals/part-check-answer";
import { partCheckSchema } from "@/lib/metals/part-check.schema";
import { handle } from "@/lib/server/handle";

/** What is this part made of? Two weighings, a magnet and a look give the metals that fit. Nothing is stored. */
export const POST = handle({
  permission: "part.check",
  input: partCheckSchema,
  run: ({ input }) => partCheckAnswer(input, checkPart(input)),
});
