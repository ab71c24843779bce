import { insertRevision, nextClassPosition, putEntry } from "@/db/changes/library-entry";
import type { Handle } from "@/db/open";
import { insertAudit } from "@/db/queries/audit";
import type { SignedIn } from "@/db/queries/crew";
import { getEntry, listKnownNames } from "@/db/queries/library-entries";
import { lastRevision } from "@/db/queries/library-revisions";
import { fault } from "@/lib/fault";
import { brokenLinks } from "@/lib/library/entry-links";
import {
  entrySlugOf,
  type AnyEntry,
  type DraftBody,
  type EntryBodies,
  type EntryKind,
  type ShelfKind,
} from "@/lib/library/entry-kinds";
import {
  libraryCauseSchema,
  libraryCautionSchema,
  libraryClassSchema,
  libraryFixSchema,
  librarySourceSchema,
} from "@/lib/library/library.schema";
import { parseInput } from "../faults";

/** What is to be published, and why. */
export interface Publication<Kind extends ShelfKind = ShelfKind> {
  kind: Kind;
  body: EntryBodies[Kind];
  /** What the editor began from; null for an entry that is new. */
  baseRevision: number | null;
  note: string;
}

/**
 * A draft as an entry that may be published.
 * @throws FaultError "invalid" with the first field that is not filled in rightly
 */
export function wholeEntry(tx: Handle, shopId: number, kind: EntryKind, slug: string, draft: DraftBody): AnyEntry {
  const standing = kind === "class" ? getEntry(tx, shopId, "class", slug) : null;
  const raw = { ...draft, slug };
  const body =
    kind === "class"
      ? parseInput(libraryClassSchema, { ...raw, position: standing?.position ?? nextClassPosition(tx, shopId) })
      : kind === "cause"
        ? parseInput(libraryCauseSchema, raw)
        : parseInput(libraryFixSchema, raw);
  const problems = brokenLinks(body, listKnownNames(tx, shopId));
  const [first] = Object.values(problems);
  if (first !== undefined) throw fault("invalid", `Not published. ${first}`, problems);
  return body;
}

/** An entry of any kind, read by its own schema. Throws as `wholeEntry`. */
export function readEntry(kind: ShelfKind, raw: DraftBody): AnyEntry {
  if (kind === "class") return parseInput(libraryClassSchema, raw);
  if (kind === "cause") return parseInput(libraryCauseSchema, raw);
  if (kind === "fix") return parseInput(libraryFixSchema, raw);
  return kind === "caution" ? parseInput(libraryCautionSchema, raw) : parseInput(librarySourceSchema, raw);
}

/**
 * Publishes an entry within its caller's transaction: the live row, the row of its history, nothing else. That its links
 * lead somewhere is the caller's to see to.
 * @returns the revision that it now is
 */
export function publish(
  tx: Handle,
  member: SignedIn,
  { kind, body, baseRevision, note }: Publication,
  now: number,
): number {
  const { shopId, memberId } = member;
  const slug = entrySlugOf(body);
  const revision = lastRevision(tx, shopId, kind, slug) + 1;
  putEntry(tx, shopId, kind, body, revision);
  insertRevision(tx, {
    shopId,
    entry: kind,
    slug,
    revision,
    state: "published",
    body: { ...body },
    baseRevision,
    note,
    memberId,
    now,
  });
  return revision;
}

/** Records in the audit trail what was done to an entry. */
export function recordEntry(
  tx: Handle,
  { shopId, memberId }: SignedIn,
  {
    action,
    kind,
    title,
    detail = {},
  }: { action: LibraryAction; kind: ShelfKind | "entries"; title: string; detail?: Record<string, unknown> },
  now: number,
): void {
  insertAudit(tx, { shopId, memberId, action, subject: `${kind} ${title}`, detail, now });
}

type LibraryAction = "library.published" | "library.removed" | "library.brought-back" | "library.brought-in";
