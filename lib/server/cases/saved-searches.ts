import "server-only";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import {
  deleteSavedSearch,
  insertSavedSearch,
  listSavedSearches,
  renameSavedSearch,
  type SavedSearch,
} from "@/db/queries/saved-searches";
import { MOST_SAVED, type KeepSearch } from "@/lib/cases/saved-search.schema";
import { fault } from "@/lib/fault";

interface Doing {
  db: Db;
  member: SignedIn;
  now: number;
}

/**
 * Keeps a casebook search under a name, for this person alone.
 * @throws FaultError "conflict" when they keep one by that name, whatever its capitals, or 40 of them already
 */
export function keepSearch({ db, member, now }: Doing, input: KeepSearch): { id: number; name: string } {
  return db.transaction(
    (tx) => {
      const kept = listSavedSearches(tx, member);
      demandFree(kept, input.name);
      if (kept.length >= MOST_SAVED)
        throw fault("conflict", `You keep ${MOST_SAVED} searches, which is as many as go in. Remove one first.`);
      return { ...insertSavedSearch(tx, member, { ...input, at: now }), name: input.name };
    },
    { behavior: "immediate" },
  );
}

/** @throws FaultError "not-found" for one that this person does not keep, "conflict" for a name they use already */
export function renameSearch({ db, member }: Doing, input: { id: number; name: string }): { id: number; name: string } {
  return db.transaction(
    (tx) => {
      demandFree(
        listSavedSearches(tx, member).filter((each) => each.id !== input.id),
        input.name,
      );
      if (!renameSavedSearch(tx, member, input.id, input.name)) throw gone();
      return input;
    },
    { behavior: "immediate" },
  );
}

/** @throws FaultError "not-found" for one that this person does not keep */
export function removeSearch({ db, member }: Doing, input: { id: number }): { id: number } {
  if (!deleteSavedSearch(db, member, input.id)) throw gone();
  return input;
}

const gone = () => fault("not-found", "You keep no such search. It may be removed already; reload to see.");

function demandFree(kept: readonly SavedSearch[], name: string): void {
  const same = kept.find((each) => each.name.toLowerCase() === name.toLowerCase());
  if (!same) return;
  const words = `You keep a search named “${same.name}” already. Give this one another name.`;
  throw fault("conflict", words, { name: words });
}
