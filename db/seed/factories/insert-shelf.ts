import type { Shelf } from "@/lib/library/library-entry";
import type { Handle } from "../../open";
import {
  libraryCauseFixes,
  libraryCauses,
  libraryCautions,
  libraryClassCauses,
  libraryClasses,
  libraryFixes,
  libraryRevisions,
  librarySources,
} from "../../schema";

/** Gives a shop its own copy of a shelf. Every entry's first revision is kept, so that a shop can go back to it. */
export function insertShelf(tx: Handle, shopId: number, shelf: Shelf, now: number): void {
  const keep = (entry: "class" | "cause" | "fix" | "caution" | "source", slug: string, body: object) =>
    tx
      .insert(libraryRevisions)
      .values({ shopId, entry, slug, revision: 1, state: "published", body: { ...body }, at: now })
      .run();

  for (const source of shelf.sources) {
    tx.insert(librarySources)
      .values({ shopId, ...source })
      .run();
    keep("source", source.key, source);
  }
  for (const caution of shelf.cautions) {
    tx.insert(libraryCautions)
      .values({ shopId, ...caution })
      .run();
    keep("caution", caution.key, caution);
  }
  for (const each of shelf.classes) {
    tx.insert(libraryClasses)
      .values({ shopId, ...each })
      .run();
    keep("class", each.slug, each);
  }
  for (const cause of shelf.causes) {
    const { classSlugs, station, ...columns } = cause;
    tx.insert(libraryCauses)
      .values({ shopId, stationKind: station, ...columns })
      .run();
    for (const [position, classSlug] of classSlugs.entries()) {
      tx.insert(libraryClassCauses).values({ shopId, classSlug, causeSlug: cause.slug, position }).run();
    }
    keep("cause", cause.slug, cause);
  }
  // The shelf names a cause's fixes in the order in which to try them: the part's own card before the tank's.
  const placed = new Map<string, number>();
  for (const fix of shelf.fixes) {
    const { causeSlugs, ...columns } = fix;
    tx.insert(libraryFixes)
      .values({ shopId, ...columns })
      .run();
    for (const causeSlug of causeSlugs) {
      const position = placed.get(causeSlug) ?? 0;
      placed.set(causeSlug, position + 1);
      tx.insert(libraryCauseFixes).values({ shopId, causeSlug, fixSlug: fix.slug, position }).run();
    }
    keep("fix", fix.slug, fix);
  }
}
