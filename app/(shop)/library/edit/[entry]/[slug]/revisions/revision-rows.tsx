import Link from "next/link";
import { BringBackForm } from "@/components/library/entry-small-forms";
import type { SignedIn } from "@/db/queries/crew";
import type { RevisionRow } from "@/db/queries/library-revisions";
import { momentWords } from "@/lib/cases/moment-words";
import type { EntryKind } from "@/lib/library/entry-kinds";
import { routes } from "@/lib/routes";
import { bringBack } from "../../../actions";

export interface RevisionsView {
  entry: EntryKind;
  slug: string;
  rows: readonly RevisionRow[];
  /** The revision that holds now; 0 for none. */
  standing: number;
  before: RevisionRow;
  after: RevisionRow;
  member: SignedIn;
}

/** "Revision 3, Ines Ferreira, 2 Dec, 14:02". */
export function rowWords(row: RevisionRow, member: SignedIn): string {
  return `${stateWords(row)}, ${row.memberName ?? "the shelf"}, ${momentWords(row.at, member.shop.timeZone, Date.now())}`;
}

function stateWords({ state, revision, baseRevision }: RevisionRow): string {
  if (state === "published") return `Revision ${revision}`;
  if (state === "removed") return "Removed";
  return baseRevision ? `Draft on revision ${baseRevision}` : "Draft of a new entry";
}

/** Every row of an entry's history, the newest first. */
export function RevisionRows({ entry, slug, rows, standing, before, after, member }: RevisionsView) {
  return (
    <ol className="rates-rows">
      {rows.map((row, index) => {
        const isNow = row.state === "published" && row.revision === standing;
        const earlier = rows[index + 1];
        return (
          <li key={row.id} className={`rates-rows__row rates-rows__row--${isNow ? "now" : "before"}`}>
            <h3>
              {stateWords(row)}
              {isNow && <small>holds now</small>}
            </h3>
            {row.note && <p>“{row.note}”</p>}
            <p className="small quiet">
              {row.memberName ?? "Came with the shop"}, {momentWords(row.at, member.shop.timeZone, Date.now())}
            </p>
            <div className="btns">
              {earlier && !(row === after && earlier === before) && (
                <Link
                  className="solo"
                  href={routes.libraryRevisions(entry, slug, { before: String(earlier.id), after: String(row.id) })}
                >
                  Compare with the one before
                </Link>
              )}
              {!isNow && (
                <BringBackForm
                  entry={entry}
                  slug={slug}
                  baseRevision={standing}
                  revisionId={row.id}
                  words={rowWords(row, member)}
                  action={bringBack}
                />
              )}
            </div>
          </li>
        );
      })}
    </ol>
  );
}
