import { and, asc, eq, sql } from "drizzle-orm";
import type { Handle } from "../open";
import { savedSearches } from "../schema";

interface Keeper {
  shopId: number;
  memberId: number;
}

const own = ({ shopId, memberId }: Keeper) =>
  and(eq(savedSearches.shopId, shopId), eq(savedSearches.memberId, memberId));

/** The searches that this person keeps, by name. Nobody else sees them. */
export function listSavedSearches(db: Handle, keeper: Keeper) {
  return db
    .select({ id: savedSearches.id, name: savedSearches.name, query: savedSearches.query })
    .from(savedSearches)
    .where(own(keeper))
    .orderBy(asc(sql`lower(${savedSearches.name})`), asc(savedSearches.id))
    .all();
}

export type SavedSearch = ReturnType<typeof listSavedSearches>[number];

export function insertSavedSearch(
  db: Handle,
  { shopId, memberId }: Keeper,
  search: { name: string; query: string; at: number },
): { id: number } {
  return db
    .insert(savedSearches)
    .values({ shopId, memberId, ...search })
    .returning({ id: savedSearches.id })
    .get();
}

/** @returns false where this person keeps no such search */
export function renameSavedSearch(db: Handle, keeper: Keeper, id: number, name: string): boolean {
  const { changes } = db
    .update(savedSearches)
    .set({ name })
    .where(and(own(keeper), eq(savedSearches.id, id)))
    .run();
  return changes > 0;
}

/** @returns false where this person keeps no such search */
export function deleteSavedSearch(db: Handle, keeper: Keeper, id: number): boolean {
  return (
    db
      .delete(savedSearches)
      .where(and(own(keeper), eq(savedSearches.id, id)))
      .run().changes > 0
  );
}
