import { asc, eq } from "drizzle-orm";
import type { Handle } from "../open";
import { libraryClasses } from "../schema";

/** The shop's classes as practice needs them: names and what tells them apart, in shelf order. */
export function listTellableClasses(db: Handle, shopId: number) {
  return db
    .select({
      slug: libraryClasses.slug,
      title: libraryClasses.title,
      atStrike: libraryClasses.atStrike,
      tells: libraryClasses.tells,
    })
    .from(libraryClasses)
    .where(eq(libraryClasses.shopId, shopId))
    .orderBy(asc(libraryClasses.position), asc(libraryClasses.id))
    .all();
}

export type TellableClass = ReturnType<typeof listTellableClasses>[number];
