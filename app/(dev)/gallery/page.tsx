import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { LineStrip } from "@/components/line/line-strip";
import { NarrowedBar } from "@/components/line/narrowed-bar";
import type { MainAction } from "@/components/shell/main-action";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Section } from "@/components/ui/section";
import { CheckShelf } from "./check-shelf";
import { ButtonShelf, FieldShelf } from "./control-shelf";
import { FigureShelf, TableShelf } from "./figure-shelf";
import { ACTOR, STATIONS } from "./fixtures";
import { GlyphShelf } from "./glyph-shelf";
import { LearningShelf } from "./learning-shelf";
import { LibraryEditShelf } from "./library-edit-shelf";
import { NotThereShelf } from "./not-there-shelf";
import { PracticeShelf } from "./practice-shelf";
import { RouteShelf } from "./route-shelf";
import { TagCards, TagForms, TagLists } from "./tag-shelf";
import { StripShelf } from "./strip-shelf";
import { TestPieceShelf, WorthShelf } from "./worth-shelf";

export const metadata: Metadata = { title: "Parts and states", robots: { index: false } };

const MAIN: MainAction = { label: "Snap a suspect part", href: "/gallery#main", glyph: "ui-camera", keyCap: "N" };

function isOpen(): boolean {
  return process.env.NODE_ENV !== "production" || process.env.COPPERTELL_GALLERY === "1";
}

/** Every component in its states, from plain props. Browser tests open it; a production server hides it. */
export default async function GalleryPage({ searchParams }: { searchParams: Promise<{ station?: string }> }) {
  if (!isOpen()) notFound();
  const { station } = await searchParams;
  const pressed = STATIONS.find((one) => one.slug === station) ?? null;
  const hrefFor = (slug: string | null) => (slug ? `/gallery?station=${slug}` : "/gallery");
  return (
    <ShopShell
      actor={ACTOR}
      here="second-look"
      counts={{ "second-look": 6 }}
      main={MAIN}
      strip={<LineStrip mode="full" stations={STATIONS} pressed={pressed?.slug ?? null} hrefFor={hrefFor} />}
      narrowed={
        pressed && (
          <NarrowedBar
            station={pressed.name}
            words="4 of 6 waiting cases"
            clearHref="/gallery"
            aside="Most money first"
          />
        )
      }
    >
      <Lead above="Tue 14 Jul, day shift" below="Every part of the kit in every state." main={MAIN}>
        Two parts need your hands
      </Lead>
      <TagLists />
      <TagForms />
      <TagCards />
      <NotThereShelf />
      <ButtonShelf />
      <FieldShelf />
      <FigureShelf />
      <TableShelf />
      <WorthShelf />
      <TestPieceShelf />
      <RouteShelf />
      <CheckShelf />
      <PracticeShelf />
      <StripShelf />
      <LearningShelf />
      <Section title="Thin strip">
        <div className="bg-band text-on-band band">
          <LineStrip mode="thin" stations={STATIONS} pressed="activate" hrefFor={hrefFor} label="Thin line" />
        </div>
      </Section>
      <GlyphShelf />
      <LibraryEditShelf />
    </ShopShell>
  );
}
