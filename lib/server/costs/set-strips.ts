import type { Db, Handle } from "@/db/open";
import { insertAudit } from "@/db/queries/audit";
import type { SignedIn } from "@/db/queries/crew";
import { insertStripRow, listStripHistory, type StripHistoryRow } from "@/db/queries/strip-table";
import type { AuditAction } from "@/lib/crew/audit-words";
import { stripRowChanges, type StripChange } from "@/lib/costs/strip-row-changes";
import { addedBath, editedBath, ownSlug, unsaid } from "@/lib/costs/strip-row-edit";
import type { AddBath, ChangeBath, ChangePolishing, TurnWay } from "@/lib/costs/strip-row.schema";
import type { StripRow } from "@/lib/costs/strip-methods";
import { fault } from "@/lib/fault";

/** The way that was saved, the row that now holds, and how many of its facts differ from before. */
export interface SavedWay {
  slug: string;
  rowId: number;
  changed: number;
}

/**
 * Changes a bath by adding a row: it holds from now on, and cases of earlier days keep the row of theirs.
 * @throws FaultError "invalid" where something is unsaid, "conflict" when somebody saved the way in between or nothing differs
 */
export function changeBath(db: Db, owner: SignedIn, input: ChangeBath, now: number): SavedWay {
  return change(db, owner, input, now, (before) => {
    if (before.method === "polish-back") throw fault("not-found", NO_SUCH_WAY);
    const after = editedBath(before, input.figures);
    demandSaid(unsaid(before, after));
    return after;
  });
}

/** Changes polishing by hand. Throws as `changeBath`. */
export function changePolishing(db: Db, owner: SignedIn, input: ChangePolishing, now: number): SavedWay {
  return change(db, owner, input, now, (before) => {
    if (before.method !== "polish-back") throw fault("not-found", NO_SUCH_WAY);
    return { ...before, minutesPerDm2Um: input.minutesPerDm2Um, source: input.source };
  });
}

/**
 * Retires a way, so that it is offered no more from now on, or brings it back.
 * @throws FaultError "conflict" for polishing, which is what is left when no bath is safe
 */
export function turnWay(db: Db, owner: SignedIn, input: TurnWay, now: number): SavedWay {
  return db.transaction(
    (tx) => {
      const standing = demandStanding(tx, owner, input);
      if (standing.row.method === "polish-back")
        throw fault("conflict", "Polishing cannot be retired: it is what is left where no bath is safe.");
      if (standing.retired === input.retired)
        throw fault("conflict", `It is ${input.retired ? "retired" : "offered"} already.`);
      const rowId = addRow(tx, owner, { ...standing, retired: input.retired }, now);
      record(tx, owner, input.retired ? "strip.retired" : "strip.brought-back", standing.row, now);
      return { slug: input.slug, rowId, changed: 1 };
    },
    { behavior: "immediate" },
  );
}

/** Adds a bath of the shop's own. It stands after those that the shop has for the same deposit. */
export function addBath(db: Db, owner: SignedIn, input: AddBath, now: number): SavedWay {
  return db.transaction(
    (tx) => {
      const rows = listStripHistory(tx, owner.shopId);
      const slug = ownSlug(input.solution, new Set(rows.map((row) => row.slug)));
      const row = addedBath(slug, input);
      demandSaid(unsaid(null, row));
      const position = Math.max(0, ...rows.map((each) => each.position)) + 1;
      const rowId = addRow(tx, owner, { slug, row, position, retired: false }, now);
      record(tx, owner, "strip.added", row, now, { source: row.source });
      return { slug, rowId, changed: 1 };
    },
    { behavior: "immediate" },
  );
}

const NO_SUCH_WAY = "This shop has no such way. Go back to the list.";
const NOTHING_DIFFERS = "Nothing differs from what holds. Change a figure first.";

interface Aim {
  slug: string;
  startedFrom: number;
}

function change(db: Db, owner: SignedIn, aim: Aim, now: number, edit: (before: StripRow) => StripRow): SavedWay {
  return db.transaction(
    (tx) => {
      const standing = demandStanding(tx, owner, aim);
      const row = edit(standing.row);
      const changes = stripRowChanges(standing.row, row, owner.shop.currency);
      if (changes.length === 0) throw fault("conflict", NOTHING_DIFFERS);
      const rowId = addRow(tx, owner, { ...standing, row }, now);
      record(tx, owner, "strip.set", row, now, { changed: changes.map(changeWords) });
      return { slug: aim.slug, rowId, changed: changes.length };
    },
    { behavior: "immediate" },
  );
}

/** The row that holds, if it is still the one that the form began with. */
function demandStanding(tx: Handle, owner: SignedIn, { slug, startedFrom }: Aim): StripHistoryRow {
  const rows = listStripHistory(tx, owner.shopId).filter((row) => row.slug === slug);
  const standing = rows[0];
  const begun = rows.find((row) => row.id === startedFrom);
  if (!standing || !begun) throw fault("not-found", NO_SUCH_WAY);
  if (standing === begun) return standing;
  const changes = stripRowChanges(begun.row, standing.row, owner.shop.currency).map(changeWords);
  if (standing.retired !== begun.retired) changes.push(standing.retired ? "retired" : "brought back");
  throw fault(
    "conflict",
    `Not saved: ${standing.setByName ?? "somebody"} saved this way a moment ago (${changes.join("; ")}). ` +
      "What you typed stands beside what holds now. Save again to put yours on top.",
  );
}

const changeWords = ({ what, from, to }: StripChange) => `${what}: ${from} to ${to}`;

function demandSaid(fields: Record<string, string>): void {
  const [first] = Object.values(fields);
  if (first !== undefined) throw fault("invalid", `Not saved. ${first}`, fields);
}

type Added = Pick<StripHistoryRow, "slug" | "row" | "position" | "retired">;

function addRow(tx: Handle, owner: SignedIn, { slug, row, position, retired }: Added, now: number): number {
  return insertStripRow(tx, {
    shopId: owner.shopId,
    slug,
    row,
    position,
    retired,
    setById: owner.memberId,
    setAt: now,
  });
}

function record(
  tx: Handle,
  { shopId, memberId }: SignedIn,
  action: AuditAction,
  row: StripRow,
  now: number,
  detail: Record<string, unknown> = {},
): void {
  const subject = row.method === "polish-back" ? "polishing back" : row.solution;
  insertAudit(tx, { shopId, memberId, action, subject, detail, now });
}
