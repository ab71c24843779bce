import { and, asc, eq } from "drizzle-orm";
import type { Handle } from "../open";
import { libraryCauses, libraryClasses } from "../schema";

/** The shop's classes as practice needs them: names and what tells them apart, in shelf order. */
export function listTellableClasses(db: Handle, shopId: number) {
  return db
    .select({
      slug: libraryClasses.slug,
      title: libraryClasses.title,
      short: libraryClasses.short,
      atStrike: libraryClasses.atStrike,
      tells: libraryClasses.tells,
    })
    .from(libraryClasses)
    .where(eq(libraryClasses.shopId, shopId))
    .orderBy(asc(libraryClasses.position), asc(libraryClasses.id))
    .all();
}

export type TellableClass = ReturnType<typeof listTellableClasses>[number];

/** A cause in words: what it is and why it does that. */
export function getCauseWords(db: Handle, shopId: number, causeId: number) {
  return (
    db
      .select({ title: libraryCauses.title, why: libraryCauses.why })
      .from(libraryCauses)
      .where(and(eq(libraryCauses.shopId, shopId), eq(libraryCauses.id, causeId)))
      .get() ?? null
  );
}
