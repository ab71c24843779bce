import { and, eq, max } from "drizzle-orm";
import type { DraftBody, EntryBodies, ShelfKind } from "@/lib/library/entry-kinds";
import type { LibraryCause, LibraryFix } from "@/lib/library/library-entry";
import type { Handle } from "../open";
import {
  libraryCauseFixes,
  libraryCauses,
  libraryCautions,
  libraryClassCauses,
  libraryClasses,
  libraryFixes,
  libraryRevisions,
  librarySources,
} from "../schema";

export interface NewRevision {
  shopId: number;
  entry: ShelfKind;
  slug: string;
  revision: number;
  state: "draft" | "published" | "removed";
  body: DraftBody;
  baseRevision: number | null;
  note: string;
  memberId: number | null;
  now: number;
}

/** Adds a row to an entry's history, within its caller's transaction. Returns the row's number. */
export function insertRevision(tx: Handle, { now, ...row }: NewRevision): number {
  return tx
    .insert(libraryRevisions)
    .values({ ...row, at: now })
    .returning({ id: libraryRevisions.id })
    .get().id;
}

type Writers = {
  [Kind in ShelfKind]: (tx: Handle, shopId: number, body: EntryBodies[Kind], revision: number) => void;
};

const WRITERS: Writers = {
  class: (tx, shopId, body, revision) => {
    const { position, ...words } = body;
    tx.insert(libraryClasses)
      .values({ shopId, ...words, position, revision })
      // A class that stands keeps its place on the shelf.
      .onConflictDoUpdate({ target: [libraryClasses.shopId, libraryClasses.slug], set: { ...words, revision } })
      .run();
  },
  cause: writeCause,
  fix: writeFix,
  caution: (tx, shopId, body) => {
    tx.insert(libraryCautions)
      .values({ shopId, ...body })
      .onConflictDoUpdate({ target: [libraryCautions.shopId, libraryCautions.key], set: body })
      .run();
  },
  source: (tx, shopId, body) => {
    tx.insert(librarySources)
      .values({ shopId, ...body })
      .onConflictDoUpdate({ target: [librarySources.shopId, librarySources.key], set: body })
      .run();
  },
};

/** Makes an entry stand in the shop's library as it is said here. Its row keeps its number: cases point at it. */
export function putEntry<Kind extends ShelfKind>(
  tx: Handle,
  shopId: number,
  kind: Kind,
  body: EntryBodies[Kind],
  revision: number,
): void {
  WRITERS[kind](tx, shopId, body, revision);
}

/** The place of a class that is added: after all that stand. */
export function nextClassPosition(tx: Handle, shopId: number): number {
  const row = tx
    .select({ last: max(libraryClasses.position) })
    .from(libraryClasses)
    .where(eq(libraryClasses.shopId, shopId))
    .get();
  return (row?.last ?? -1) + 1;
}

function writeCause(tx: Handle, shopId: number, body: LibraryCause, revision: number): void {
  const { classSlugs, station, ...words } = body;
  const columns = { ...words, stationKind: station, revision };
  tx.insert(libraryCauses)
    .values({ shopId, ...columns })
    .onConflictDoUpdate({ target: [libraryCauses.shopId, libraryCauses.slug], set: columns })
    .run();
  tx.delete(libraryClassCauses)
    .where(and(eq(libraryClassCauses.shopId, shopId), eq(libraryClassCauses.causeSlug, body.slug)))
    .run();
  for (const [position, classSlug] of classSlugs.entries())
    tx.insert(libraryClassCauses).values({ shopId, classSlug, causeSlug: body.slug, position }).run();
}

function writeFix(tx: Handle, shopId: number, body: LibraryFix, revision: number): void {
  const { causeSlugs, ...words } = body;
  const columns = { ...words, revision };
  tx.insert(libraryFixes)
    .values({ shopId, ...columns })
    .onConflictDoUpdate({ target: [libraryFixes.shopId, libraryFixes.slug], set: columns })
    .run();
  const own = and(eq(libraryCauseFixes.shopId, shopId), eq(libraryCauseFixes.fixSlug, body.slug));
  const before = tx
    .select({ causeSlug: libraryCauseFixes.causeSlug, position: libraryCauseFixes.position })
    .from(libraryCauseFixes)
    .where(own)
    .all();
  // Written anew, because the order of the rows is the order in which the fix names its causes.
  tx.delete(libraryCauseFixes).where(own).run();
  for (const causeSlug of causeSlugs) {
    const place = before.find((row) => row.causeSlug === causeSlug)?.position ?? nextFixPosition(tx, shopId, causeSlug);
    tx.insert(libraryCauseFixes).values({ shopId, causeSlug, fixSlug: body.slug, position: place }).run();
  }
}

/** A fix that is added to a cause is tried after those that it has. */
function nextFixPosition(tx: Handle, shopId: number, causeSlug: string): number {
  const row = tx
    .select({ last: max(libraryCauseFixes.position) })
    .from(libraryCauseFixes)
    .where(and(eq(libraryCauseFixes.shopId, shopId), eq(libraryCauseFixes.causeSlug, causeSlug)))
    .get();
  return (row?.last ?? -1) + 1;
}

/** Takes a class, cause or fix out of the library. That nothing points at it any more is the caller's to see to. */
export function deleteEntry(tx: Handle, shopId: number, kind: "class" | "cause" | "fix", slug: string): void {
  if (kind === "class") {
    tx.delete(libraryClasses)
      .where(and(eq(libraryClasses.shopId, shopId), eq(libraryClasses.slug, slug)))
      .run();
    return;
  }
  if (kind === "cause") {
    tx.delete(libraryClassCauses)
      .where(and(eq(libraryClassCauses.shopId, shopId), eq(libraryClassCauses.causeSlug, slug)))
      .run();
    tx.delete(libraryCauses)
      .where(and(eq(libraryCauses.shopId, shopId), eq(libraryCauses.slug, slug)))
      .run();
    return;
  }
  tx.delete(libraryCauseFixes)
    .where(and(eq(libraryCauseFixes.shopId, shopId), eq(libraryCauseFixes.fixSlug, slug)))
    .run();
  tx.delete(libraryFixes)
    .where(and(eq(libraryFixes.shopId, shopId), eq(libraryFixes.slug, slug)))
    .run();
}
