import { listClassCards } from "@/db/queries/library";
import { libraryQuerySchema } from "@/lib/library/library-query.schema";
import { handle } from "@/lib/server/handle";
import { librarySearchFor } from "@/lib/server/library/search-index";

/** Search over classes, causes and fixes, best hits first. Without `q` no hits, and the shelf's classes in their order. */
export const GET = handle({
  permission: "library.see",
  input: libraryQuerySchema,
  run: ({ member, db, input }) =>
    input.q
      ? { hits: librarySearchFor(db, member.shopId)(input.q) }
      : { hits: [], classes: listClassCards(db, member.shopId) },
});
