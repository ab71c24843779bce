import { insertRevision } from "@/db/changes/library-entry";

import type { Db, Handle } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { getEntry, listKnownNames } from "@/db/queries/library-entries";
import {
  DROPPED,
  getPublished,
  getRevisionRow,
  lastRevision,
  listDrafts,
  listUsedSlugs,
} from "@/db/queries/library-revisions";
import { momentWords } from "@/lib/cases/moment-words";
import { fault } from "@/lib/fault";
import type { SaveEntry, SettleEntry } from "@/lib/library/entry-edit.schema";
import { ENTRY_FIELDS } from "@/lib/library/entry-fields";
import { entryTitle, type DraftBody, type EntryKind } from "@/lib/library/entry-kinds";
import { entrySlug } from "@/lib/library/entry-slug";
import type { LibrarySource } from "@/lib/library/library-entry";
import { mergeEntry, settleMerge } from "@/lib/library/merge-entry";
import { publish, recordEntry, wholeEntry } from "./publish-entry";
import { shippedShelf } from "./shipped-shelf";

/** Where an entry stands after it was kept. */
export interface KeptEntry {
  entry: EntryKind;
  slug: string;
  /** The revision that it was published as; null for a draft. */
  published: number | null;
}

/**
 * Keeps a draft, or publishes what was typed. Every draft is a row of its own: nothing that was kept is ever lost.
 * @throws FaultError "conflict" when somebody published or removed the entry since the editor began. What was typed is then
 *   kept as a draft all the same; the page sets the two side by side. "invalid" where something is not filled in.
 */
export function saveEntry(db: Db, member: SignedIn, input: SaveEntry, now: number): KeptEntry {
  const kept = db.transaction((tx) => keep(tx, member, input, now), { behavior: "immediate" });
  if (kept.overtaken) throw fault("conflict", kept.overtaken);
  return kept;
}

function keep(tx: Handle, member: SignedIn, input: SaveEntry, now: number): KeptEntry & { overtaken: string | null } {
  const { shopId } = member;
  const { entry, intent, note } = input;
  const slug = input.slug ?? entrySlug(entryTitle(input.body), takenSlugs(tx, shopId, entry));
  demandKnown(tx, member, entry, input.slug);
  const body = withNewSource(tx, member, input, now);
  const standing = standingRevision(tx, shopId, entry, slug);
  const overtaken = standing === input.baseRevision ? null : overtakenWords(tx, member, entry, slug, now);
  if (overtaken !== null || intent === "draft") {
    addDraft(tx, member, { entry, slug, body, baseRevision: input.baseRevision, note }, now);
    return { entry, slug, published: null, overtaken };
  }
  return { ...put(tx, member, { entry, slug, body, note, standing }, now), overtaken: null };
}

interface Put {
  entry: EntryKind;
  slug: string;
  body: DraftBody;
  note: string;
  /** The revision that holds now; 0 for none. */
  standing: number;
}

function put(tx: Handle, member: SignedIn, { entry, slug, body, note, standing }: Put, now: number): KeptEntry {
  const whole = wholeEntry(tx, member.shopId, entry, slug, body);
  const published = publish(tx, member, { kind: entry, body: whole, baseRevision: standing || null, note }, now);
  const detail = { revision: published, ...(note ? { why: note } : {}) };
  recordEntry(tx, member, { action: "library.published", kind: entry, title: entryTitle({ ...whole }), detail }, now);
  return { entry, slug, published };
}

/** The revision of the entry that stands in the library; 0 where none does. */
export function standingRevision(tx: Handle, shopId: number, entry: EntryKind, slug: string): number {
  return getEntry(tx, shopId, entry, slug) ? lastRevision(tx, shopId, entry, slug) : 0;
}

/** An address may name an entry that is on the shelf, was once, or is being drafted; any other is nobody's. */
function demandKnown(tx: Handle, { shopId }: SignedIn, entry: EntryKind, slug: string | null): void {
  if (slug !== null && !listUsedSlugs(tx, shopId, entry).includes(slug))
    throw fault("not-found", "This shop's library has no such entry. Go back to the library.");
}

/** Not those of the shelf that ships either: this shop may bring its entries in later. */
function takenSlugs(tx: Handle, shopId: number, entry: EntryKind): Set<string> {
  const shipped = { class: shippedShelf.classes, cause: shippedShelf.causes, fix: shippedShelf.fixes }[entry];
  return new Set([...listUsedSlugs(tx, shopId, entry), ...shipped.map((each) => each.slug)]);
}

interface NewDraft {
  entry: EntryKind;
  slug: string;
  body: DraftBody;
  baseRevision: number;
  note: string;
}

function addDraft(tx: Handle, { shopId, memberId }: SignedIn, draft: NewDraft, now: number): void {
  insertRevision(tx, {
    ...draft,
    shopId,
    memberId,
    revision: draft.baseRevision + 1,
    state: "draft",
    baseRevision: draft.baseRevision || null,
    now,
  });
}

/** A source that was typed beside the others stands in the shop's list at once, and under the entry. */
function withNewSource(tx: Handle, member: SignedIn, input: SaveEntry, now: number): DraftBody {
  const { newCitation: citation, newKind: kind, body } = input;
  if (!citation) return body;
  const known = listKnownNames(tx, member.shopId).sources;
  const taken = new Set([
    ...known,
    ...listUsedSlugs(tx, member.shopId, "source"),
    ...shippedShelf.sources.map((each) => each.key),
  ]);
  const source: LibrarySource = { key: entrySlug(citation, taken), kind, citation };
  publish(tx, member, { kind: "source", body: source, baseRevision: null, note: "" }, now);
  recordEntry(tx, member, { action: "library.published", kind: "source", title: citation.slice(0, 80) }, now);
  const keys = Array.isArray(body.sourceKeys) ? body.sourceKeys : [];
  return { ...body, sourceKeys: [...keys, source.key] };
}

/** Who came first, for the person who comes second. */
function overtakenWords(tx: Handle, member: SignedIn, entry: EntryKind, slug: string, now: number): string {
  const { shopId, shop } = member;
  const revision = lastRevision(tx, shopId, entry, slug);
  const newest = getPublished(tx, shopId, { entry, slug, revision });
  const who = newest?.memberId === member.memberId ? "You" : (newest?.memberName ?? "Somebody");
  const what = newest?.state === "removed" ? "removed this" : "published this";
  const when = newest ? `, ${momentWords(newest.at, shop.timeZone, now)}` : "";
  return `${who} ${what} since you began${when}. What you typed is kept as your draft; both stand side by side below.`;
}

/**
 * Publishes a draft on top of what somebody else published meanwhile, or keeps the merged words as a draft on it.
 * @throws FaultError "conflict" when it was published yet again, "invalid" where a field still wants a choice
 */
export function settleEntry(db: Db, member: SignedIn, input: SettleEntry, now: number): KeptEntry {
  return db.transaction(
    (tx) => {
      const { shopId, memberId } = member;
      const { entry, slug, note, intent } = input;
      const draft = getRevisionRow(tx, shopId, { entry, slug, id: input.draftId });
      const theirs = getEntry(tx, shopId, entry, slug);
      if (!draft || draft.memberId !== memberId || draft.state !== "draft" || !theirs)
        throw fault("not-found", "This draft is not yours, or the entry is gone. Open it again.");
      const standing = standingRevision(tx, shopId, entry, slug);
      if (standing !== input.theirRevision)
        throw fault("conflict", "It was published once more while you chose. Look at both again; your draft is kept.");
      const base = getPublished(tx, shopId, { entry, slug, revision: draft.baseRevision ?? 0 });
      const merges = mergeEntry(ENTRY_FIELDS[entry], base?.body ?? null, draft.body, { ...theirs });
      const settled = settleMerge(merges, input.choices);
      if (!settled.settled) throw unsettled(settled.open);
      if (intent === "draft") {
        addDraft(tx, member, { entry, slug, body: settled.body, baseRevision: standing, note }, now);
        return { entry, slug, published: null };
      }
      return put(tx, member, { entry, slug, body: settled.body, note, standing }, now);
    },
    { behavior: "immediate" },
  );
}

function unsettled(open: readonly string[]) {
  const words = "You both changed this. Choose which words stand.";
  return fault("invalid", `Not published. ${words}`, Object.fromEntries(open.map((name) => [`choice.${name}`, words])));
}

/** Lets one's own draft go. Its rows stay in the history. */
export function dropDraft(db: Db, member: SignedIn, aim: { entry: EntryKind; slug: string }, now: number): KeptEntry {
  return db.transaction(
    (tx) => {
      const own = listDrafts(tx, member.shopId, aim).find((draft) => draft.memberId === member.memberId);
      if (!own) throw fault("not-found", "You have no draft of it.");
      addDraft(tx, member, { ...aim, body: DROPPED, baseRevision: own.baseRevision ?? 0, note: "" }, now);
      return { ...aim, published: null };
    },
    { behavior: "immediate" },
  );
}
