import { insertRevision, nextClassPosition } from "@/db/changes/library-entry";
import type { Db, Handle } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { listKnownNames, listShelf } from "@/db/queries/library-entries";
import { lastRevision } from "@/db/queries/library-revisions";

import { fault } from "@/lib/fault";
import { compareLibrary, type FileEntry } from "@/lib/library/compare-library";
import { brokenLinks, type KnownNames } from "@/lib/library/entry-links";
import { ENTRY_KINDS, type AnyEntry, type ShelfKind } from "@/lib/library/entry-kinds";
import { RESERVED_SLUGS } from "@/lib/library/entry-slug";
import type { Shelf } from "@/lib/library/library-entry";
import type { BringIn } from "@/lib/library/port.schema";
import { readLibraryFile } from "@/lib/library/read-library-file";
import { publish, recordEntry } from "./publish-entry";
import { shippedShelf } from "./shipped-shelf";

/** What came of bringing a file in. */
export interface BroughtIn {
  published: number;
  drafts: number;
  /** Titles of entries that somebody published meanwhile: they came in as drafts, to be set side by side. */
  overtaken: string[];
}

/** An entry of a file with the shop's revision that it is set against. */
export interface SetAgainst extends FileEntry {
  /** 0 for an entry that the shop has not. */
  revision: number;
}

/** A file's entries against the shop's library. */
export function setAgainst(db: Handle, shopId: number, file: Shelf): SetAgainst[] {
  return compareLibrary(listShelf(db, shopId), file).map((entry) => ({
    ...entry,
    revision: entry.own ? lastRevision(db, shopId, entry.kind, entry.slug) : 0,
  }));
}

/**
 * A library file's entries, read and checked.
 * @throws FaultError "invalid" with every problem and its place in the file
 */
export function readFile(text: string): Shelf {
  const read = readLibraryFile(text);
  if (!read.read) throw fault("invalid", "Nothing was brought in.", { file: read.problems.join("\n") });
  const reserved = read.shelf.classes.find((each) => RESERVED_SLUGS.some((word) => word === each.slug));
  if (reserved) {
    const words = `classes: “${reserved.slug}” is a word of the library's own addresses. Give the class another slug.`;
    throw fault("invalid", "Nothing was brought in.", { file: words });
  }
  return read.shelf;
}

/**
 * Brings the chosen entries of a file, or of the shelf that ships, into the shop's library: published, or as this member's
 * drafts. New sources and cautions that they point at come along. Nothing is ever removed.
 * @throws FaultError "invalid" for a file that is none, or an entry that would point at nothing
 */
export function bringIn(db: Db, member: SignedIn, input: BringIn, now: number): BroughtIn {
  const file = input.from === "shelf" ? shippedShelf : readFile(input.text);
  return db.transaction(
    (tx) => {
      const { shopId } = member;
      const entries = setAgainst(tx, shopId, file);
      const chosen = input.pick.flatMap(({ kind, slug, seenRevision }) => {
        const entry = entries.find((each) => each.kind === kind && each.slug === slug);
        return entry && entry.standing !== "same" ? [{ ...entry, seenRevision }] : [];
      });
      if (chosen.length === 0) throw fault("conflict", "The library says all of that already. Nothing was brought in.");
      const along = comingAlong(entries, chosen);
      const standsAtOnce = (entry: Chosen) =>
        !isEdited(entry.kind) || (input.as === "publish" && entry.seenRevision === entry.revision);
      demandLinks(tx, shopId, [...along, ...chosen.filter(standsAtOnce)]);
      for (const entry of along) publishFrom(tx, member, entry, now);
      const answer: BroughtIn = { published: 0, drafts: 0, overtaken: [] };
      // In the file's order, in which what others point at comes first.
      for (const entry of chosen.toSorted((a, b) => entries.findIndex(is(a)) - entries.findIndex(is(b)))) {
        if (along.some(is(entry))) answer.published += 1;
        else if (standsAtOnce(entry)) {
          publishFrom(tx, member, entry, now);
          answer.published += 1;
        } else {
          draftFrom(tx, member, entry, entry.seenRevision, now);
          if (entry.seenRevision === entry.revision) answer.drafts += 1;
          else answer.overtaken.push(entry.title);
        }
      }
      const detail = { published: answer.published, drafts: answer.drafts + answer.overtaken.length };
      const title = input.from === "shelf" ? "from the shelf that ships" : "from a file";
      recordEntry(tx, member, { action: "library.brought-in", kind: "entries", title, detail }, now);
      return answer;
    },
    { behavior: "immediate" },
  );
}

const is = (one: Pick<FileEntry, "kind" | "slug">) => (other: Pick<FileEntry, "kind" | "slug">) =>
  one.kind === other.kind && one.slug === other.slug;

/** Only classes, causes and fixes have drafts: sources and cautions are published or left as they are. */
const isEdited = (kind: ShelfKind) => ENTRY_KINDS.some((each) => each === kind);

/** The new cautions that the chosen entries point at, and the new sources of all of them: they stand before the rest. */
function comingAlong(entries: readonly FileEntry[], chosen: readonly FileEntry[]): FileEntry[] {
  const isNew = (kind: ShelfKind) => (entry: FileEntry) => entry.kind === kind && entry.standing === "new";
  const cautions = entries
    .filter(isNew("caution"))
    .filter((each) => chosen.some((other) => pointsAt(other.body, each.slug)));
  const pointing = [...chosen, ...cautions];
  const sources = entries
    .filter(isNew("source"))
    .filter((each) => pointing.some((other) => pointsAt(other.body, each.slug)));
  return [...sources, ...cautions];
}

function pointsAt(body: AnyEntry, key: string): boolean {
  if ("sourceKey" in body) return body.sourceKey === key;
  if ("sourceKeys" in body && body.sourceKeys.includes(key)) return true;
  return "steps" in body && body.steps.some((step) => step.cautionKeys.includes(key));
}

function publishFrom(tx: Handle, member: SignedIn, { kind, slug, body, own }: FileEntry, now: number): void {
  const { shopId } = member;
  const before = own ? lastRevision(tx, shopId, kind, slug) : null;
  // The shop's own order of its shelf stands; a new class goes to its end.
  const placed =
    "position" in body
      ? { ...body, position: own && "position" in own ? own.position : nextClassPosition(tx, shopId) }
      : body;
  publish(tx, member, { kind, body: placed, baseRevision: before, note: BROUGHT_IN }, now);
}

const BROUGHT_IN = "Brought in";

function draftFrom(tx: Handle, member: SignedIn, entry: FileEntry, baseRevision: number, now: number): void {
  const { shopId, memberId } = member;
  insertRevision(tx, {
    shopId,
    memberId,
    entry: entry.kind,
    slug: entry.slug,
    revision: baseRevision + 1,
    state: "draft",
    body: { ...entry.body },
    baseRevision: baseRevision || null,
    note: BROUGHT_IN,
    now,
  });
}

/** Everything that is published must point at what the library holds, or gets from the same file. */
function demandLinks(tx: Handle, shopId: number, published: readonly FileEntry[]): void {
  const held = listKnownNames(tx, shopId);
  const withNew = (names: ReadonlySet<string>, kind: ShelfKind) =>
    new Set([...names, ...published.filter((entry) => entry.kind === kind).map((entry) => entry.slug)]);
  const known: KnownNames = {
    classes: withNew(held.classes, "class"),
    causes: withNew(held.causes, "cause"),
    cautions: withNew(held.cautions, "caution"),
    sources: withNew(held.sources, "source"),
  };
  const problems = published.flatMap(({ kind, title, body }) =>
    Object.values(brokenLinks(body, known)).map((words) => `${kind} “${title}”: ${words} Bring that in as well.`),
  );
  if (problems.length > 0)
    throw fault("invalid", "Nothing was brought in.", { pick: problems.slice(0, 12).join("\n") });
}

type Chosen = SetAgainst & { seenRevision: number };
