import { and, asc, desc, eq } from "drizzle-orm";
import type { Handle } from "../open";
import { libraryCauses, libraryClassCauses, stations } from "../schema";

/**
 * The station where a class most likely begins: that of its likeliest cause.
 * @returns null where nothing is known: no class called, or a class without causes
 */
export function tracedStation(db: Handle, shopId: number, classSlug: string | null): number | null {
  if (!classSlug) return null;
  const cause = db
    .select({ kind: libraryCauses.stationKind })
    .from(libraryClassCauses)
    .innerJoin(
      libraryCauses,
      and(eq(libraryCauses.shopId, libraryClassCauses.shopId), eq(libraryCauses.slug, libraryClassCauses.causeSlug)),
    )
    .where(and(eq(libraryClassCauses.shopId, shopId), eq(libraryClassCauses.classSlug, classSlug)))
    .orderBy(desc(libraryCauses.likelihood), asc(libraryCauses.id))
    .limit(1)
    .get();
  return cause ? stationOfKind(db, shopId, cause.kind) : null;
}

/** The first station of a kind along the line, or null when the shop has none. */
export function stationOfKind(db: Handle, shopId: number, kind: (typeof stations.$inferSelect)["kind"]): number | null {
  const row = db
    .select({ id: stations.id })
    .from(stations)
    .where(and(eq(stations.shopId, shopId), eq(stations.kind, kind)))
    .orderBy(asc(stations.position))
    .limit(1)
    .get();
  return row?.id ?? null;
}
