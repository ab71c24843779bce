import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { listRevisions } from "@/db/queries/library-revisions";
import { counted } from "@/lib/cases/part-words";
import { ENTRY_KINDS, entryTitle } from "@/lib/library/entry-kinds";
import { routes } from "@/lib/routes";
import { standingRevision } from "@/lib/server/library/edit-entry";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { entryHref } from "../../../entry-href";
import { Comparison } from "./comparison";
import { RevisionRows } from "./revision-rows";

export const metadata: Metadata = { title: "Revisions" };

interface RevisionsPageProps {
  params: Promise<{ entry: string; slug: string }>;
  searchParams: Promise<{ before?: string; after?: string; published?: string }>;
}

/** Every revision of an entry; any two of them word by word. */
export default async function RevisionsPage({ params, searchParams }: RevisionsPageProps) {
  const { entry: named, slug } = await params;
  const entry = ENTRY_KINDS.find((kind) => kind === named);
  const member = await guardPage("library.edit", entry ? routes.libraryRevisions(entry, slug) : routes.library());
  const db = getDb();
  const rows = entry ? listRevisions(db, member.shopId, entry, slug).filter((row) => "title" in row.body) : [];
  const newest = rows[0];
  if (!entry || !newest) notFound();
  const query = await searchParams;
  const rowOf = (id: string | undefined) => rows.find((row) => String(row.id) === id);
  const after = rowOf(query.after) ?? newest;
  const earlier = rows.filter((row) => row.id < after.id);
  const before = rowOf(query.before) ?? earlier.find((row) => row.state !== "draft") ?? earlier[0] ?? after;
  const standing = standingRevision(db, member.shopId, entry, slug);
  const { actor, counts } = shellFor(member);
  const view = { entry, slug, rows, standing, before, after, member };
  return (
    <ShopShell actor={actor} counts={counts} here="library" back={routes.libraryEdit(entry, slug)}>
      <p className="lib-crumb">
        <Link href={routes.library()}>Library</Link>
        {standing > 0 && <Link href={entryHref(db, member.shopId, entry, slug)}>As it stands</Link>}
        <Link href={routes.libraryEdit(entry, slug)}>Edit</Link>
      </p>
      <Lead size="page" below={`${counted(rows.length, "row")} in its history; none is ever lost.`}>
        {entryTitle(newest.body)}: revisions
      </Lead>
      <div className="entry-notes">
        {query.published && (
          <Note tone="green" title={`Revision ${query.published} is published`} role="status">
            The page and the search show it now.
          </Note>
        )}
        {standing === 0 && (
          <Note tone="grey" title="It is not in the library now">
            Bring a revision back to publish it again.
          </Note>
        )}
      </div>
      <div className="cols revisions">
        <Section title="What differs" aside={before === after ? undefined : "Word by word"}>
          <Comparison {...view} />
        </Section>
        <Section title="All revisions" aside="The newest first">
          <RevisionRows {...view} />
        </Section>
      </div>
    </ShopShell>
  );
}
