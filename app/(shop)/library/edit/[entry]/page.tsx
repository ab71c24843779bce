import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { EntryForm } from "@/components/library/entry-form";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { getDb } from "@/db/client";
import { formOfEntry } from "@/lib/library/entry-form";
import { ENTRY_KINDS, type EntryKind } from "@/lib/library/entry-kinds";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { saveEntry } from "../actions";
import { entryChoices } from "../entry-choices";

export const metadata: Metadata = { title: "New in the library" };

const FORM_ID = "entry";

const BELOW: Record<EntryKind, string> = {
  class:
    "A fault that this shop tells apart from the others. Once it is published it can be called, confirmed and searched.",
  cause: "What goes wrong on the line, and the check that proves it.",
  fix: "The steps of a rework card, with their minutes and cautions.",
};

interface NewEntryPageProps {
  params: Promise<{ entry: string }>;
  searchParams: Promise<{ of?: string }>;
}

/** An entry of the shop's own, to write. `of` names what it is to belong to: a cause its class, a fix its cause. */
export default async function NewEntryPage({ params, searchParams }: NewEntryPageProps) {
  const { entry: named } = await params;
  const entry = ENTRY_KINDS.find((kind) => kind === named);
  const member = await guardPage("library.edit", entry ? routes.libraryNew(entry) : routes.library());
  if (!entry) notFound();
  const { of } = await searchParams;
  const { actor, counts } = shellFor(member);
  const belongs = of ? { classSlugs: [of], causeSlugs: [of] } : {};
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="library"
      back={routes.library()}
      main={{ label: "Publish", form: FORM_ID }}
    >
      <p className="lib-crumb">
        <Link href={routes.library()}>Library</Link>
      </p>
      <Lead size="page" below={BELOW[entry]}>
        A {entry} of the shop’s own
      </Lead>
      <EntryForm
        id={FORM_ID}
        entry={entry}
        slug={null}
        baseRevision={0}
        values={formOfEntry(entry, belongs)}
        choices={entryChoices(getDb(), member.shopId, entry)}
        action={saveEntry}
      />
    </ShopShell>
  );
}
