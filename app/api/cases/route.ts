import { snapSchema } from "@/lib/cases/case.schema";
import { casebookSchema } from "@/lib/cases/casebook.schema";
import { snap } from "@/lib/server/cases/change-case";
import { listCasesFor } from "@/lib/server/cases/list-cases";
import { handle } from "@/lib/server/handle";

/**
 * The casebook as JSON: the same filters as its page's address, a page of cases and the cursor of the next. A filter or
 * cursor that cannot be used is refused by name. Money is only in it for those who may see it.
 */
export const GET = handle({
  permission: "case.see",
  input: casebookSchema,
  run: ({ member, db, now, input }) => listCasesFor(db, member, input, now),
});

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
