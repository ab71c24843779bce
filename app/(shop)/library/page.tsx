import type { Metadata } from "next";
import Link from "next/link";
import { ClassCard } from "@/components/library/class-card";
import { LibrarySearchField } from "@/components/library/library-search";
import { LineStrip } from "@/components/line/line-strip";
import { NarrowedBar } from "@/components/line/narrowed-bar";
import { placeholderUrl } from "@/components/photos/placeholder-url";
import { ShopShell } from "@/components/shell/shop-shell";
import { Empty } from "@/components/ui/empty";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { countCasesByClass, countEntries, listClassCards, type ClassCardRow } from "@/db/queries/library";
import { getStation } from "@/db/queries/line";
import { listExemplars } from "@/db/queries/second-look-against";
import { isLargeLibrary } from "@/lib/library/library-size";
import { shelfWords } from "@/lib/library/shelf-words";
import { libraryQuerySchema } from "@/lib/library/library-query.schema";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { librarySearchFor } from "@/lib/server/library/search-index";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { EditDesk } from "./edit/edit-desk";

export const metadata: Metadata = { title: "Library" };

interface LibraryPageProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** The shelf: search in the shop's own words, and below it every class. */
export default async function LibraryPage({ searchParams }: LibraryPageProps) {
  const member = await guardPage("library.see", routes.library());
  const parsed = libraryQuerySchema.safeParse(await searchParams);
  const query = parsed.success ? parsed.data : libraryQuerySchema.parse({});
  const db = getDb();
  const station = query.station ? getStation(db, member.shopId, query.station) : null;
  const all = listClassCards(db, member.shopId);
  const cards = station ? listClassCards(db, member.shopId, station.kind) : all;
  const counts = countCasesByClass(db, member.shopId);
  const exemplars = newestExemplars(member.shopId, cards);
  const { actor, counts: waiting, stations } = shellFor(member);
  const here = (to: string | null) => routes.library(to ? { station: to } : undefined);
  return (
    <ShopShell
      actor={actor}
      counts={waiting}
      here="library"
      strip={<LineStrip mode="full" stations={stations} pressed={station?.slug ?? null} hrefFor={here} />}
      narrowed={
        station && (
          <NarrowedBar
            station={station.name}
            words={`${cards.length} of ${all.length} classes have a cause there`}
            clearHref={here(null)}
          />
        )
      }
    >
      {!parsed.success && (
        <Note tone="amber" glyph="ui-caution" title="This address was not understood">
          {parsed.error.issues[0]?.message}
        </Note>
      )}
      <div className="lib-head">
        <Lead>{shelfWords(all, counts)}</Lead>
        <LibrarySearchField
          key={query.q}
          query={query.q}
          hits={query.q ? librarySearchFor(db, member.shopId)(query.q) : []}
          isLarge={isLargeLibrary(countEntries(db, member.shopId))}
          station={station?.slug ?? null}
          classTitles={Object.fromEntries(all.map((each) => [each.slug, each.title]))}
        />
        <p className="lib-head__more">
          <Link className="solo" href={routes.metalRoutes()}>
            Routes by base metal
          </Link>
          How each one is cleaned, woken and struck.
        </p>
      </div>
      {can(member, "library.edit") && <EditDesk member={member} />}
      <Section title="Classes" aside={asideWords(station?.name, all.length, exemplars)}>
        {cards.length === 0 ? (
          <Empty title="No class on the shelf arises at this station.">Show the whole line for all of them.</Empty>
        ) : (
          <ClassCards cards={cards} counts={counts} exemplars={exemplars} />
        )}
      </Section>
    </ShopShell>
  );
}

function asideWords(station: string | undefined, all: number, exemplars: ReadonlyMap<string, Exemplar>): string {
  const where = station ? `Can arise at ${station}` : `${all} on the shelf`;
  return [...exemplars.values()].some((each) => each.isRendered) ? `${where}. Rendered demo photos` : where;
}

type Exemplar = ReturnType<typeof listExemplars>[number];

function newestExemplars(shopId: number, cards: readonly ClassCardRow[]): Map<string, Exemplar> {
  const newest = new Map<string, Exemplar>();
  const slugs = cards.map((card) => card.slug);
  for (const each of listExemplars(getDb(), shopId, slugs)) {
    if (!newest.has(each.classSlug)) newest.set(each.classSlug, each);
  }
  return newest;
}

interface ClassCardsProps {
  cards: readonly ClassCardRow[];
  counts: ReadonlyMap<string, number>;
  exemplars: ReadonlyMap<string, Exemplar>;
}

function ClassCards({ cards, counts, exemplars }: ClassCardsProps) {
  return (
    <div className="class-cards">
      {cards.map((card) => {
        const exemplar = exemplars.get(card.slug);
        return (
          <ClassCard
            key={card.slug}
            {...card}
            cases={counts.get(card.slug) ?? 0}
            exemplar={exemplar ? { ...exemplar, placeholder: placeholderUrl(exemplar.placeholder) } : null}
          />
        );
      })}
    </div>
  );
}
