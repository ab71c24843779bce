import { z } from "zod";
import { getLibraryClass } from "@/db/queries/library-class";
import { fault } from "@/lib/fault";
import { handle } from "@/lib/server/handle";

/** A class of the shop's library with its causes, fixes, cautions and sources. */
export const GET = handle({
  permission: "library.see",
  input: z.object({ class: z.string() }),
  run: ({ member, db, input }) => {
    const page = getLibraryClass(db, member.shopId, input.class);
    if (!page) throw fault("not-found", "The library has no such class. See all of them at /api/library.");
    return { ...page, causes: page.causes.map(({ id: _row, ...cause }) => cause) };
  },
});
