import { outcomeSchema } from "@/lib/cases/case.schema";
import { outcome } from "@/lib/server/cases/change-case";
import { handle } from "@/lib/server/handle";

export const POST = handle({
  permission: "card.work",
  input: outcomeSchema,
  run: ({ input, ...doing }) => outcome(doing, input),
  status: 201,
});
