import type { ClashView } from "@/components/library/merge-form";
import type { Db } from "@/db/open";
import { getEntry, listShelf } from "@/db/queries/library-entries";
import { getPublished, listDrafts, listRevisions, type RevisionRow } from "@/db/queries/library-revisions";
import { ENTRY_FIELDS, fieldText, type NameWords } from "@/lib/library/entry-fields";
import type { DraftBody, EntryKind } from "@/lib/library/entry-kinds";
import { mergeEntry } from "@/lib/library/merge-entry";
import { wordDiff } from "@/lib/library/word-diff";
import { standingRevision } from "@/lib/server/library/edit-entry";
import { nameWords } from "./entry-choices";

/** An entry as its editor meets it: what stands, their own draft, the drafts of others. Null for one that never was. */
export function loadEntry(db: Db, shopId: number, memberId: number, entry: EntryKind, slug: string) {
  const rows = listRevisions(db, shopId, entry, slug);
  if (rows.length === 0) return null;
  const drafts = listDrafts(db, shopId, { entry, slug });
  const live: DraftBody | null = spread(getEntry(db, shopId, entry, slug));
  const own = drafts.find((draft) => draft.memberId === memberId) ?? null;
  const standing = standingRevision(db, shopId, entry, slug);
  return {
    entry,
    slug,
    live,
    standing,
    own,
    others: drafts.filter((draft) => draft.memberId !== memberId),
    /** The newest row that was published or removed. */
    newest: rows.find((row) => row.state !== "draft") ?? null,
    merge: own && live && (own.baseRevision ?? 0) !== standing ? mergeView(db, shopId, own, live, standing) : null,
  };
}

export type LoadedEntry = NonNullable<ReturnType<typeof loadEntry>>;

const spread = (body: object | null): DraftBody | null => body && { ...body };

function mergeView(db: Db, shopId: number, own: RevisionRow, live: DraftBody, standing: number) {
  const { entry, slug } = own;
  const base = getPublished(db, shopId, { entry, slug, revision: own.baseRevision ?? 0 });
  const words = nameWords(listShelf(db, shopId));
  const merges = mergeEntry(ENTRY_FIELDS[entry], base?.body ?? null, own.body, live);
  const labels = (side: "mine" | "theirs") =>
    merges.filter((merge) => merge.standing === side).map((merge) => merge.field.label.toLowerCase());
  return {
    draftId: own.id,
    theirRevision: standing,
    onlyMine: labels("mine"),
    onlyTheirs: labels("theirs"),
    clashes: merges
      .filter((merge) => merge.standing === "clash")
      .map((merge) => clashView(merge, base !== null, words)),
  };
}

function clashView(merge: ReturnType<typeof mergeEntry>[number], hasBase: boolean, words: NameWords): ClashView {
  const { field } = merge;
  const text = (value: unknown) => fieldText(field, value, words);
  const from = hasBase ? text(merge.base) : null;
  return {
    name: field.name,
    label: field.label,
    base: from,
    mine: wordDiff(from ?? text(merge.mine), text(merge.mine)),
    theirs: wordDiff(from ?? text(merge.theirs), text(merge.theirs)),
    both: merge.both === undefined ? null : text(merge.both),
  };
}
