import { z } from "zod";
import { getLibraryMark, listSearchEntries } from "@/db/queries/library";
import { handle } from "@/lib/server/handle";

/**
 * What the library's search is built from, for a browser that searches by itself. The browser keeps its copy and asks
 * each time whether it still holds.
 */
export const GET = handle({
  permission: "library.see",
  input: z.object({}),
  run: ({ member, db, request }) => {
    const etag = `"${member.shopId}-${getLibraryMark(db, member.shopId)}"`;
    const headers = { ETag: etag, "Cache-Control": "private, no-cache" };
    if (request.headers.get("if-none-match") === etag) return new Response(null, { status: 304, headers });
    return Response.json(listSearchEntries(db, member.shopId), { headers });
  },
});
