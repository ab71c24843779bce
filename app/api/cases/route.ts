import { snapSchema } from "@/lib/cases/case.schema";
import { snap } from "@/lib/server/cases/change-case";
import { handle } from "@/lib/server/handle";

/**
 * Opens a case. Phones send a snap here and not through the action: a page's actions run one after the other and
 * cannot be given up, so on a slow line one would block the next. Sending the same `snapKey` again answers with the
 * case it opened.
 */
export const POST = handle({
  permission: "case.snap",
  input: snapSchema,
  run: ({ input, ...doing }) => snap(doing, input),
  status: 201,
});
