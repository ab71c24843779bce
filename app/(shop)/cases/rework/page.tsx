import type { Metadata } from "next";
import { ReworkTag } from "@/components/cases/rework-tag";
import { tagPhoto } from "@/components/cases/tag-photo";
import { TagWire } from "@/components/cases/tag-wire";
import { LineStrip } from "@/components/line/line-strip";
import { NarrowedBar } from "@/components/line/narrowed-bar";
import { ShopShell } from "@/components/shell/shop-shell";
import { Empty } from "@/components/ui/empty";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Pager } from "@/components/ui/pager";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { getStation } from "@/db/queries/line";
import { listPhotosOfCases, type CasePhoto } from "@/db/queries/photos";
import { countReworkTags, listReworkTags, type ReworkTag as Card } from "@/db/queries/rework";
import { counted, countWords } from "@/lib/cases/part-words";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { readCursor, writeCursor } from "@/lib/cases/card-cursor";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";

export const metadata: Metadata = { title: "Rework" };

interface ListPageProps {
  searchParams: Promise<{ station?: string; after?: string }>;
}

const PAGE = 30;

/** The rework cards: those this person has begun, then the rest, oldest first. */
export default async function ReworkListPage({ searchParams }: ListPageProps) {
  const { station: slug, after } = await searchParams;
  const member = await guardPage("case.see", routes.reworkList());
  const db = getDb();
  const station = slug ? getStation(db, member.shopId, slug) : null;
  const narrow = station ? { stationId: station.id } : {};
  const mine = after ? [] : listReworkTags(db, member.shopId, { ...narrow, begunBy: member.memberId, limit: PAGE });
  const rest = listReworkTags(db, member.shopId, {
    ...narrow,
    notBegunBy: member.memberId,
    after: readCursor(after),
    limit: PAGE + 1,
  });
  const shown = rest.slice(0, PAGE);
  const last = rest.length > PAGE ? shown.at(-1) : undefined;
  const all = countReworkTags(db, member.shopId, station?.id);
  const photos = listPhotosOfCases(
    db,
    member.shopId,
    [...mine, ...shown].map((card) => card.caseId),
  );
  const { actor, counts, stations } = shellFor(member);
  const here = (query: Record<string, string>) =>
    routes.reworkList({ ...(station ? { station: station.slug } : {}), ...query });
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="rework"
      strip={
        <LineStrip
          mode="thin"
          stations={stations}
          pressed={station?.slug ?? null}
          hrefFor={(to) => routes.reworkList(to ? { station: to } : undefined)}
        />
      }
      narrowed={
        station && <NarrowedBar station={station.name} words={counted(all, "card")} clearHref={routes.reworkList()} />
      }
    >
      <Lead size="page">{leadWords(all, mine.length)}</Lead>
      {!can(member, "card.work") && (
        <Note title="A plater or senior does a card" className="rw-list__note">
          You can read every card here.
        </Note>
      )}
      <div className="rw-list">
        {all === 0 && (
          <Empty title="The rack is clear." level={2}>
            {station
              ? "No card traces back to this station."
              : "A card comes here when a senior tech has confirmed a part."}
          </Empty>
        )}
        {mine.length > 0 && <CardList title="Begun by you" cards={mine} photos={photos} />}
        {shown.length > 0 && (
          <CardList title={mine.length > 0 ? "The others" : "Cards, oldest first"} cards={shown} photos={photos} />
        )}
      </div>
      {(last || after) && (
        <Pager
          label="Cards"
          words={`${shown.length} of ${all}`}
          nextHref={last ? here({ after: writeCursor(last) }) : null}
          previousHref={after ? here({}) : null}
          previousWords="Back to the oldest"
        />
      )}
    </ShopShell>
  );
}

function leadWords(all: number, mine: number): string {
  if (all === 0) return "Rework";
  if (mine > 0)
    return mine === 1 ? "One card is in your hands" : `${capital(countWords(mine))} cards are in your hands`;
  return all === 1 ? "One card waits for hands" : `${capital(countWords(all))} cards wait for hands`;
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

function CardList({ title, cards, photos }: { title: string; cards: Card[]; photos: Map<number, CasePhoto> }) {
  return (
    <Section title={title} aside={counted(cards.length, "card")}>
      <TagWire label={title}>
        {cards.map((card) => (
          <ReworkTag key={card.ref} card={card} photo={tagPhoto(photos.get(card.caseId))} />
        ))}
      </TagWire>
    </Section>
  );
}
