import type { Metadata } from "next";
import Link from "next/link";
import { PortEntries } from "@/components/library/port-entries";
import { PortFileForm } from "@/components/library/port-file-form";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { listShelf } from "@/db/queries/library-entries";
import { shippedShelf } from "@/lib/server/library/shipped-shelf";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { bringIn, lookAtFile } from "./actions";
import { portView } from "./port-view";

export const metadata: Metadata = { title: "Take the library out, bring one in" };

interface PortPageProps {
  searchParams: Promise<{ published?: string; drafts?: string; overtaken?: string }>;
}

/** The shop owns its knowledge: the whole library as a file, and a file of another shop or the shipped shelf to bring in. */
export default async function PortPage({ searchParams }: PortPageProps) {
  const member = await guardPage("library.edit", routes.libraryPort());
  const db = getDb();
  const { published, drafts, overtaken } = await searchParams;
  const { classes, causes, fixes } = listShelf(db, member.shopId);
  const shipped = portView(db, member.shopId, shippedShelf);
  const { actor, counts } = shellFor(member);
  return (
    <ShopShell actor={actor} counts={counts} here="library" back={routes.library()}>
      <p className="lib-crumb">
        <Link href={routes.library()}>Library</Link>
      </p>
      <Lead
        size="page"
        below={`${classes.length} classes, ${causes.length} causes and ${fixes.length} fixes stand in it.`}
      >
        The library is the shop’s own
      </Lead>
      {published !== undefined && drafts !== undefined && (
        <Note tone="green" title="Brought in" role="status" className="entry-note">
          {published} published, {drafts} as your drafts.{" "}
          {overtaken && `Published by somebody meanwhile, so kept as drafts beside theirs: ${overtaken}. `}
          <Link href={routes.library()}>To the library</Link>
        </Note>
      )}
      <div className="cols port">
        <Section title="Take it out">
          <p>
            One file with every class, cause, fix, caution and source, in an{" "}
            <a href={routes.librarySchema()}>open format</a> that any program can read.
          </p>
          <p className="btns">
            <a className="btn btn--plain" href={routes.libraryExport()} download>
              <span className="btn__label">Take the library out</span>
            </a>
          </p>
        </Section>
        <Section title="Bring a file in">
          <PortFileForm look={lookAtFile} action={bringIn} />
        </Section>
      </div>
      <Section
        title="What the shipped shelf has that this shop lacks"
        aside={`${shipped.fresh.length} new, ${shipped.changed.length} worded otherwise`}
      >
        <PortEntries from="shelf" view={shipped} action={bringIn} />
      </Section>
    </ShopShell>
  );
}
