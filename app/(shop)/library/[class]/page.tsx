import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { LineStrip } from "@/components/line/line-strip";
import { NarrowedBar } from "@/components/line/narrowed-bar";
import { ShopShell } from "@/components/shell/shop-shell";
import { getDb } from "@/db/client";
import { getLibraryClass } from "@/db/queries/library-class";
import { getStation } from "@/db/queries/line";
import { formatMoney } from "@/lib/money";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { currentMember, guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { ClassDesk } from "../edit/edit-desk";
import { ClassHead, Exemplars, Looks, Tells } from "./class-looks";
import { Causes, Fixes, Prevention } from "./class-causes";
import { Sources, TypicalCost } from "./class-cost";
import { Trend } from "./class-trend";
import { loadClass } from "./load-class";

interface ClassPageProps {
  params: Promise<{ class: string }>;
  searchParams: Promise<{ station?: string }>;
}

export async function generateMetadata({ params }: ClassPageProps): Promise<Metadata> {
  const member = await currentMember();
  const found = member && getLibraryClass(getDb(), member.shopId, (await params).class);
  return { title: found ? `${found.class.title} · Library` : "Library" };
}

/** One class: how it looks, how to tell it, what causes it here, what puts it right, what it costs to take off. */
export default async function LibraryClassPage({ params, searchParams }: ClassPageProps) {
  const { class: slug } = await params;
  const member = await guardPage("library.see", routes.libraryClass(slug));
  const db = getDb();
  const { station: stationSlug } = await searchParams;
  const station = stationSlug ? getStation(db, member.shopId, stationSlug) : null;
  const loaded = loadClass(db, member.shopId, slug, station?.kind ?? null, {
    now: Date.now(),
    timeZone: member.shop.timeZone,
  });
  if (!loaded) notFound();
  const { actor, counts, stations } = shellFor(member);
  const here = (to: string | null) => routes.libraryClass(slug, to ? { station: to } : undefined);
  const { timeZone, currency } = member.shop;
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="library"
      back={routes.library()}
      strip={<LineStrip mode="full" stations={stations} pressed={station?.slug ?? null} hrefFor={here} />}
      narrowed={
        station && (
          <NarrowedBar
            station={station.name}
            words={`${loaded.causes.length} of ${loaded.allCauses} causes arise there`}
            clearHref={here(null)}
          />
        )
      }
      className="lib-class"
    >
      <nav className="lib-crumb no-print" aria-label="On this page">
        <Link href={routes.library()}>Library</Link>
        {loaded.tells.length > 0 && <a href="#tells">Tell it from</a>}
        <a href="#trend">In this shop</a>
        {loaded.allCauses > 0 && <a href="#causes">Causes</a>}
        {loaded.allCauses > 0 && <a href="#fixes">Fixes</a>}
        <a href="#cost">Cost to strip</a>
        <a href="#sources">Sources</a>
      </nav>
      {can(member, "library.edit") && (
        <ClassDesk
          member={member}
          slug={slug}
          otherLikelihood={loaded.entry.otherLikelihood}
          likelihoods={station ? null : loaded.causes.map((cause) => cause.likelihood)}
        />
      )}
      <ClassHead loaded={loaded} timeZone={timeZone} />
      <Exemplars loaded={loaded} />
      <Looks loaded={loaded} />
      <Tells loaded={loaded} />
      <Trend loaded={loaded} timeZone={timeZone} />
      <Causes
        loaded={loaded}
        canEdit={can(member, "library.edit")}
        station={station?.name ?? null}
        timeZone={timeZone}
      />
      <Fixes loaded={loaded} canEdit={can(member, "library.edit")} />
      <Prevention loaded={loaded} />
      <TypicalCost
        loaded={loaded}
        money={(cents) => formatMoney(cents, currency, { whole: true })}
        timeZone={timeZone}
        canEstimate={can(member, "strip.estimate")}
      />
      <Sources loaded={loaded} />
    </ShopShell>
  );
}
