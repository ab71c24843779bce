import { confirmationSchema } from "@/lib/cases/case.schema";
import { confirm } from "@/lib/server/cases/change-case";
import { handle } from "@/lib/server/handle";

export const POST = handle({
  permission: "case.confirm",
  input: confirmationSchema,
  run: ({ input, ...doing }) => confirm(doing, input),
  status: 201,
});
