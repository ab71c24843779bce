import { z } from "zod";
import { listShelf } from "@/db/queries/library-entries";
import { LIBRARY_FORMAT, LIBRARY_VERSION, type LibraryFile } from "@/lib/library/library-file.schema";
import { routes } from "@/lib/routes";
import { handle } from "@/lib/server/handle";

/**
 * The whole library as one file of the published format, sent piece by piece. For those who edit it: whoever keeps the shop's
 * knowledge right may also take it along.
 */
export const GET = handle({
  permission: "library.edit",
  input: z.object({}),
  run: ({ db, member, now }) => {
    const shelf = listShelf(db, member.shopId);
    const exportedAt = new Date(now).toISOString();
    const file: LibraryFile = {
      $schema: routes.librarySchema(),
      format: LIBRARY_FORMAT,
      version: LIBRARY_VERSION,
      shop: member.shop.name,
      exportedAt,
      ...shelf,
    };
    return new Response(streamOf(pieces(file)), {
      headers: {
        "Content-Type": "application/json; charset=utf-8",
        "Content-Disposition": `attachment; filename="${member.shop.slug}-library-${exportedAt.slice(0, 10)}.json"`,
        "Cache-Control": "no-store",
      },
    });
  },
});

/** The file's text, one entry at a time. */
function* pieces(file: LibraryFile): Generator<string> {
  let before = "{\n";
  for (const [name, value] of Object.entries(file)) {
    yield `${before}${JSON.stringify(name)}: `;
    before = ",\n";
    if (!Array.isArray(value)) {
      yield JSON.stringify(value);
      continue;
    }
    for (const [index, entry] of value.entries()) yield `${index === 0 ? "[\n" : ",\n"}${JSON.stringify(entry)}`;
    yield value.length === 0 ? "[]" : "\n]";
  }
  yield "\n}\n";
}

function streamOf(texts: Generator<string>): ReadableStream<Uint8Array> {
  const encoder = new TextEncoder();
  return new ReadableStream({
    pull(controller) {
      const next = texts.next();
      if (next.done) controller.close();
      else controller.enqueue(encoder.encode(next.value));
    },
  });
}
