import { callSchema } from "@/lib/cases/case.schema";
import { call } from "@/lib/server/cases/change-case";
import { handle } from "@/lib/server/handle";

export const POST = handle({
  permission: "case.call",
  input: callSchema,
  run: ({ input, ...doing }) => call(doing, input),
  status: 201,
});
