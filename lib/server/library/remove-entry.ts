import { deleteEntry, insertRevision } from "@/db/changes/library-entry";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { getEntry } from "@/db/queries/library-entries";
import { getRevisionRow, lastRevision } from "@/db/queries/library-revisions";
import { countUses } from "@/db/queries/library-uses";
import { fault } from "@/lib/fault";
import type { BringBack, RemoveEntry } from "@/lib/library/entry-edit.schema";
import { entryTitle, type EntryKind } from "@/lib/library/entry-kinds";
import { BASELINE_CLASS } from "@/lib/library/shelf-words";
import { useLines } from "@/lib/library/entry-uses";
import { standingRevision, type KeptEntry } from "./edit-entry";
import { publish, recordEntry, wholeEntry } from "./publish-entry";

const OVERTAKEN = "Somebody published or removed this since you opened the page. Look at it again first.";

/**
 * Takes an entry out of the library. Its words stay in its history, to be brought back.
 * @throws FaultError "conflict" while something points at it, with what and how many; "not-found" for one that is gone
 */
export function removeEntry(db: Db, member: SignedIn, input: RemoveEntry, now: number): KeptEntry {
  return db.transaction(
    (tx) => {
      const { shopId, memberId } = member;
      const { entry, slug, note } = input;
      const body = getEntry(tx, shopId, entry, slug);
      if (!body) throw fault("not-found", "This shop's library has no such entry. Go back to the library.");
      const standing = standingRevision(tx, shopId, entry, slug);
      if (standing !== input.baseRevision) throw fault("conflict", OVERTAKEN);
      const reason = whyKept(entry, slug, useLines(entry, slug, countUses(tx, shopId, entry, slug)));
      if (reason) throw fault("conflict", reason);
      deleteEntry(tx, shopId, entry, slug);
      insertRevision(tx, {
        shopId,
        entry,
        slug,
        revision: standing + 1,
        state: "removed",
        body: { ...body },
        baseRevision: standing,
        note,
        memberId,
        now,
      });
      const detail = note ? { why: note } : {};
      recordEntry(tx, member, { action: "library.removed", kind: entry, title: entryTitle({ ...body }), detail }, now);
      return { entry, slug, published: null };
    },
    { behavior: "immediate" },
  );
}

/** Why an entry cannot be removed; null when it can. */
export function whyKept(entry: EntryKind, slug: string, uses: readonly { words: string }[]): string | null {
  if (entry === "class" && slug === BASELINE_CLASS) return "“Sound” stays: every other class is held against it.";
  if (uses.length === 0) return null;
  return `It cannot be removed: ${uses.map((use) => use.words).join(", ")}.`;
}

/**
 * Publishes an earlier row of an entry's history once more, as a new revision.
 * @throws FaultError "conflict" when somebody published since the page was opened, "invalid" when the earlier words no longer
 *   fit: a draft that was never whole, or one that points at an entry that is gone
 */
export function bringBack(db: Db, member: SignedIn, input: BringBack, now: number): KeptEntry {
  return db.transaction(
    (tx) => {
      const { shopId } = member;
      const { entry, slug } = input;
      const row = getRevisionRow(tx, shopId, { entry, slug, id: input.revisionId });
      if (!row) throw fault("not-found", "This entry has no such revision.");
      const standing = standingRevision(tx, shopId, entry, slug);
      if (standing !== input.baseRevision) throw fault("conflict", OVERTAKEN);
      const body = wholeEntry(tx, shopId, entry, slug, row.body);
      const note = `Brought back revision ${row.revision}`;
      const published = publish(
        tx,
        member,
        { kind: entry, body, baseRevision: lastRevision(tx, shopId, entry, slug) || null, note },
        now,
      );
      const detail = { from: `revision ${row.revision}`, to: `revision ${published}` };
      recordEntry(
        tx,
        member,
        { action: "library.brought-back", kind: entry, title: entryTitle({ ...body }), detail },
        now,
      );
      return { entry, slug, published };
    },
    { behavior: "immediate" },
  );
}
