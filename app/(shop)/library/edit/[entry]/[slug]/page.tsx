import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { EntryForm } from "@/components/library/entry-form";
import { MergeForm } from "@/components/library/merge-form";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { getDb } from "@/db/client";
import { formOfEntry } from "@/lib/library/entry-form";
import { ENTRY_KINDS, entryTitle } from "@/lib/library/entry-kinds";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { saveEntry, settleEntry } from "../../actions";
import { entryChoices } from "../../entry-choices";
import { loadEntry } from "../../load-entry";
import { entryHref } from "../../entry-href";
import { EditNotes } from "./edit-notes";
import { PutAway } from "./put-away";

export const metadata: Metadata = { title: "Edit the library" };

const FORM_ID = "entry";

interface EditPageProps {
  params: Promise<{ entry: string; slug: string }>;
  searchParams: Promise<{ kept?: string }>;
}

/** One entry to edit: one's own draft where there is one; beside what somebody else published meanwhile where they did. */
export default async function EditPage({ params, searchParams }: EditPageProps) {
  const { entry: named, slug } = await params;
  const entry = ENTRY_KINDS.find((kind) => kind === named);
  const member = await guardPage("library.edit", entry ? routes.libraryEdit(entry, slug) : routes.library());
  const db = getDb();
  const loaded = entry && loadEntry(db, member.shopId, member.memberId, entry, slug);
  if (!entry || !loaded) notFound();
  const { actor, counts } = shellFor(member);
  const { live, own, merge, newest, standing } = loaded;
  const body = own?.body ?? live ?? newest?.body ?? {};
  const { kept } = await searchParams;
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="library"
      back={routes.library()}
      main={{ label: merge ? "Publish on top" : "Publish", form: FORM_ID }}
    >
      <p className="lib-crumb">
        <Link href={routes.library()}>Library</Link>
        {live && <Link href={entryHref(db, member.shopId, entry, slug)}>As it stands</Link>}
        <Link href={routes.libraryRevisions(entry, slug)}>Revisions</Link>
      </p>
      <Lead
        size="page"
        below={live ? `A ${entry} of the library, revision ${standing}.` : `A ${entry}, not in the library.`}
      >
        {entryTitle(body)}
      </Lead>
      <EditNotes loaded={loaded} member={member} isKept={kept === "draft"} />
      {merge ? (
        <MergeForm
          key={`${merge.draftId}-${merge.theirRevision}`}
          id={FORM_ID}
          entry={entry}
          slug={slug}
          {...merge}
          theirName={newest?.memberName ?? "the shelf"}
          action={settleEntry}
        />
      ) : (
        // Keyed: a kept draft is a new beginning. What others publish is none: the form keeps the revision it began from.
        <EntryForm
          key={own?.id ?? 0}
          id={FORM_ID}
          entry={entry}
          slug={slug}
          baseRevision={live ? (own ? (own.baseRevision ?? 0) : standing) : 0}
          values={formOfEntry(entry, body)}
          choices={entryChoices(db, member.shopId, entry)}
          action={saveEntry}
        />
      )}
      <PutAway loaded={loaded} member={member} />
    </ShopShell>
  );
}
