"use server";

import { bringInInput, lookInput } from "@/lib/library/port.schema";
import { FILE_LIMITS } from "@/lib/library/library-file.schema";
import { fault } from "@/lib/fault";
import { routes } from "@/lib/routes";
import { act } from "@/lib/server/act";
import * as porting from "@/lib/server/library/bring-in";
import { portView } from "./port-view";

/** Reads a file and says what it would bring. Nothing is written. */
export const lookAtFile = act({
  permission: "library.edit",
  input: lookInput,
  run: async ({ db, member, input }) => {
    if (input.file.size > FILE_LIMITS.bytes) {
      const words = `The file is larger than ${FILE_LIMITS.bytes / 1024 / 1024} MB. A library is far smaller.`;
      throw fault("too-large", words, { file: words });
    }
    const text = await input.file.text();
    return { text, view: portView(db, member.shopId, porting.readFile(text)) };
  },
});

export const bringIn = act({
  permission: "library.edit",
  input: bringInInput,
  run: ({ db, member, input, now }) => porting.bringIn(db, member, input, now),
  revalidate: () => [routes.library(), routes.audit()],
  next: ({ published, drafts, overtaken }) =>
    routes.libraryPort({
      published: String(published),
      drafts: String(drafts),
      ...(overtaken.length > 0 ? { overtaken: overtaken.join(", ").slice(0, 300) } : {}),
    }),
});
