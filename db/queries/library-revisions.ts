import { and, desc, eq, inArray, max, ne, or, sql } from "drizzle-orm";
import type { DraftBody, EntryKind, ShelfKind } from "@/lib/library/entry-kinds";
import type { Handle } from "../open";
import { libraryRevisions, members } from "../schema";

const columns = {
  id: libraryRevisions.id,
  entry: libraryRevisions.entry,
  slug: libraryRevisions.slug,
  revision: libraryRevisions.revision,
  state: libraryRevisions.state,
  body: libraryRevisions.body,
  baseRevision: libraryRevisions.baseRevision,
  note: libraryRevisions.note,
  memberId: libraryRevisions.memberId,
  memberName: members.name,
  at: libraryRevisions.at,
};

const selectRevisions = (db: Handle) =>
  db
    .select(columns)
    .from(libraryRevisions)
    .leftJoin(members, and(eq(members.shopId, libraryRevisions.shopId), eq(members.id, libraryRevisions.memberId)));

const ofEntry = (shopId: number, kind: ShelfKind, slug: string) =>
  and(eq(libraryRevisions.shopId, shopId), eq(libraryRevisions.entry, kind), eq(libraryRevisions.slug, slug));

/** Every revision of an entry, drafts of all its editors included, the newest first. */
export function listRevisions(db: Handle, shopId: number, kind: ShelfKind, slug: string) {
  return selectRevisions(db)
    .where(ofEntry(shopId, kind, slug))
    .orderBy(desc(libraryRevisions.id))
    .all();
}

export type RevisionRow = ReturnType<typeof listRevisions>[number];

/** One row of an entry, or null. */
export function getRevisionRow(
  db: Handle,
  shopId: number,
  { entry, slug, id }: { entry: ShelfKind; slug: string; id: number },
): RevisionRow | null {
  return (
    selectRevisions(db)
      .where(and(ofEntry(shopId, entry, slug), eq(libraryRevisions.id, id)))
      .get() ?? null
  );
}

/** What was published (or removed) under a revision number: the words that an editor began from. Null for none. */
export function getPublished(
  db: Handle,
  shopId: number,
  { entry, slug, revision }: { entry: ShelfKind; slug: string; revision: number },
): RevisionRow | null {
  const where = and(
    ofEntry(shopId, entry, slug),
    eq(libraryRevisions.revision, revision),
    ne(libraryRevisions.state, "draft"),
  );
  return selectRevisions(db).where(where).orderBy(desc(libraryRevisions.id)).limit(1).get() ?? null;
}

/** The number of the newest revision that was published or removed; 0 for an entry that never was. */
export function lastRevision(db: Handle, shopId: number, kind: ShelfKind, slug: string): number {
  const row = db
    .select({ last: max(libraryRevisions.revision) })
    .from(libraryRevisions)
    .where(and(ofEntry(shopId, kind, slug), ne(libraryRevisions.state, "draft")))
    .get();
  return row?.last ?? 0;
}

/** Slugs of a kind that were ever used in the shop, in drafts and by removed entries too. */
export function listUsedSlugs(db: Handle, shopId: number, kind: ShelfKind): string[] {
  return db
    .selectDistinct({ slug: libraryRevisions.slug })
    .from(libraryRevisions)
    .where(and(eq(libraryRevisions.shopId, shopId), eq(libraryRevisions.entry, kind)))
    .all()
    .map((row) => row.slug);
}

/** A draft without words: its member has dropped it. Rows are never taken out, so dropping is a row too. */
export const DROPPED: DraftBody = {};
const isKept = sql`${libraryRevisions.body} <> '{}'`;

/**
 * The drafts that wait: of each member the newest row of an entry, where it is a draft and was not dropped. One that was
 * published is followed by its published row.
 */
export function listDrafts(db: Handle, shopId: number, only?: { entry: EntryKind; slug: string }) {
  const newest = db
    .select({ id: max(libraryRevisions.id) })
    .from(libraryRevisions)
    .where(only ? ofEntry(shopId, only.entry, only.slug) : eq(libraryRevisions.shopId, shopId))
    .groupBy(libraryRevisions.entry, libraryRevisions.slug, libraryRevisions.memberId);
  return selectRevisions(db)
    .where(
      and(
        eq(libraryRevisions.shopId, shopId),
        inArray(libraryRevisions.id, newest),
        eq(libraryRevisions.state, "draft"),
        isKept,
        or(eq(libraryRevisions.entry, "class"), eq(libraryRevisions.entry, "cause"), eq(libraryRevisions.entry, "fix")),
      ),
    )
    .orderBy(desc(libraryRevisions.id))
    .all();
}
