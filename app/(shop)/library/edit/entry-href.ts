import type { Db } from "@/db/open";
import { getEntry } from "@/db/queries/library-entries";
import type { EntryKind } from "@/lib/library/entry-kinds";
import { hitHref } from "@/lib/library/hit-href";

/** Where an entry is read: a class on its page; a cause or fix at its place on the page of the class that it shows as most. */
export function entryHref(db: Db, shopId: number, entry: EntryKind, slug: string): string {
  return hitHref({ kind: entry, slug, classes: classesOf(db, shopId, entry, slug) });
}

function classesOf(db: Db, shopId: number, entry: EntryKind, slug: string): string[] {
  if (entry === "class") return [slug];
  if (entry === "cause") return getEntry(db, shopId, "cause", slug)?.classSlugs ?? [];
  const cause = getEntry(db, shopId, "fix", slug)?.causeSlugs[0];
  return cause === undefined ? [] : classesOf(db, shopId, "cause", cause);
}
