import { changedFields } from "./compare-entry";
import { entrySlugOf, entryTitle, type AnyEntry, type ShelfKind } from "./entry-kinds";
import type { Shelf } from "./library-entry";
import { entriesOf } from "./read-library-file";

/** How an entry of a file stands to the shop's library. */
export interface FileEntry {
  kind: ShelfKind;
  slug: string;
  title: string;
  standing: "new" | "changed" | "same";
  /** As the file has it. */
  body: AnyEntry;
  /** As the shop has it; null for a new one. */
  own: AnyEntry | null;
}

/**
 * Sets a file against the shop's library, entry by entry: sources and cautions first, then classes, causes and fixes. What
 * the shop has and the file has not is left out: a file never removes. A class's place on the shelf is the shop's own.
 */
export function compareLibrary(own: Shelf, file: Shelf): FileEntry[] {
  const standing = new Map(entriesOf(own).map(({ kind, body }) => [`${kind}/${entrySlugOf(body)}`, body] as const));
  return entriesOf(file).map(({ kind, body }) => {
    const slug = entrySlugOf(body);
    const mine = standing.get(`${kind}/${slug}`) ?? null;
    const differs = mine !== null && changedFields(kind, { ...mine }, { ...body }).length > 0;
    return {
      kind,
      slug,
      title: entryTitle({ ...body }),
      standing: mine === null ? "new" : differs ? "changed" : "same",
      body,
      own: mine,
    };
  });
}
