import { and, asc, eq, inArray } from "drizzle-orm";
import type { TellingClass } from "@/lib/library/tells-between";
import type { Handle } from "../open";
import { libraryClasses } from "../schema";

/** These classes with their tells, in shelf order. Slugs that the shop's shelf lacks are left out. */
export function listTellingClasses(db: Handle, shopId: number, slugs: readonly string[]): TellingClass[] {
  if (slugs.length === 0) return [];
  return db
    .select({ slug: libraryClasses.slug, title: libraryClasses.title, tells: libraryClasses.tells })
    .from(libraryClasses)
    .where(and(eq(libraryClasses.shopId, shopId), inArray(libraryClasses.slug, [...slugs])))
    .orderBy(asc(libraryClasses.position), asc(libraryClasses.id))
    .all();
}
