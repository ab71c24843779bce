import type { LibraryCause, LibraryCaution, LibraryClass, LibraryFix, LibrarySource } from "./library-entry";

/** What a senior edits by hand. Cautions and sources come with the shelf, with a file, or are added beside an entry. */
export const ENTRY_KINDS = ["class", "cause", "fix"] as const;
export type EntryKind = (typeof ENTRY_KINDS)[number];

/** Everything that the library keeps revisions of. */
export const SHELF_KINDS = [...ENTRY_KINDS, "caution", "source"] as const;
export type ShelfKind = (typeof SHELF_KINDS)[number];

export interface EntryBodies {
  class: LibraryClass;
  cause: LibraryCause;
  fix: LibraryFix;
  caution: LibraryCaution;
  source: LibrarySource;
}
export type AnyEntry = EntryBodies[ShelfKind];

/** An entry as a draft holds it: any field may still be blank, and a figure may be what was typed instead of a number. */
export type DraftBody = Record<string, unknown>;

/** The name by which an entry is known in its kind: slug, or key of a caution or source. */
export function entrySlugOf(body: AnyEntry): string {
  return "slug" in body ? body.slug : body.key;
}

/** What an entry is called on screen: its title, the text of a caution, the citation of a source. */
export function entryTitle(body: DraftBody): string {
  for (const name of ["title", "citation", "text", "slug"]) {
    const words = body[name];
    if (typeof words === "string" && words.trim()) return words.trim();
  }
  return "Without a title yet";
}
