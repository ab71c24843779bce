import type { Metadata } from "next";
import { QueueTag } from "@/components/cases/second-look-queue-tag";
import { SaidBefore } from "@/components/cases/second-look-said";
import { TagWire } from "@/components/cases/tag-wire";
import { LineStrip } from "@/components/line/line-strip";
import { NarrowedBar } from "@/components/line/narrowed-bar";
import { ShopShell } from "@/components/shell/shop-shell";
import { LinkButton } from "@/components/ui/button";
import { Empty } from "@/components/ui/empty";
import { Lead } from "@/components/ui/lead";
import { Pager } from "@/components/ui/pager";
import { getDb } from "@/db/client";
import { getStation } from "@/db/queries/line";
import { listPhotosOfCases } from "@/db/queries/photos";
import { countQueue, listQueue } from "@/db/queries/second-look";
import { counted, countWords } from "@/lib/cases/part-words";
import { readQueueCursor, writeQueueCursor } from "@/lib/cases/queue-cursor";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { queueTagProps } from "./queue-tag-props";

export const metadata: Metadata = { title: "Second look" };

interface QueuePageProps {
  searchParams: Promise<{ station?: string; after?: string }>;
}

const PAGE = 24;
const ORDER = "Most money at risk first, then longest wait";

/** The queue: every part that waits for a second look. The first one is one press away. */
export default async function QueuePage({ searchParams }: QueuePageProps) {
  const { station: slug, after } = await searchParams;
  const member = await guardPage("case.confirm", routes.queue());
  const db = getDb();
  const station = slug ? getStation(db, member.shopId, slug) : null;
  const stationId = station?.id ?? null;
  const query: Record<string, string> = station ? { station: station.slug } : {};
  const cursor = readQueueCursor(after);
  const rows = listQueue(db, member.shopId, { stationId, after: cursor, limit: PAGE + 1 });
  const shown = rows.slice(0, PAGE);
  const last = rows.length > PAGE ? shown.at(-1) : undefined;
  const here = countQueue(db, member.shopId, { stationId });
  const all = stationId === null ? here : countQueue(db, member.shopId, { stationId: null });
  const photos = listPhotosOfCases(
    db,
    member.shopId,
    shown.map((row) => row.id),
  );
  const now = Date.now();
  const { actor, counts, stations } = shellFor(member);
  const first = shown[0];
  const main = first
    ? {
        label: `Look at ${first.ref}`,
        href: routes.secondLook(first.ref, query),
        glyph: "ui-eye" as const,
        keyCap: "N",
      }
    : null;
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="second-look"
      main={main}
      strip={
        <LineStrip
          mode="thin"
          stations={stations}
          pressed={station?.slug ?? null}
          hrefFor={(to) => routes.queue(to ? { station: to } : undefined)}
        />
      }
      narrowed={
        station && (
          <NarrowedBar
            station={station.name}
            words={`${here.cases} of ${all.cases} waiting cases, ${counted(here.parts, "held part")}`}
            clearHref={routes.queue()}
            aside={ORDER}
          />
        )
      }
    >
      <SaidBefore />
      <div className="queue-cols">
        <Lead main={main} below={here.cases > 0 ? `${ORDER}. ${counted(here.parts, "part")} on hold.` : undefined}>
          {leadWords(here.cases)}
        </Lead>
        {shown.length === 0 ? (
          <ClearRack isNarrowed={station !== null} />
        ) : (
          <div className="queue">
            <TagWire label="Waiting for a second look">
              {shown.map((row) => (
                <QueueTag key={row.id} now={now} {...queueTagProps(member, row, photos.get(row.id), query)} />
              ))}
            </TagWire>
          </div>
        )}
      </div>
      {(last || cursor) && (
        <Pager
          label="Waiting cases"
          words={`${shown.length} of ${here.cases}`}
          nextHref={last ? routes.queue({ ...query, after: writeQueueCursor(last) }) : null}
          previousHref={cursor ? routes.queue(query) : null}
          previousWords="Back to the first"
        />
      )}
    </ShopShell>
  );
}

function leadWords(cases: number): string {
  if (cases === 0) return "Nothing waits for your eye";
  const words = countWords(cases);
  return `${words.charAt(0).toUpperCase()}${words.slice(1)} ${cases === 1 ? "case waits" : "cases wait"} for your eye`;
}

function ClearRack({ isNarrowed }: { isNarrowed: boolean }) {
  return (
    <Empty
      title="The rack is clear."
      level={2}
      action={isNarrowed ? <LinkButton href={routes.queue()}>Show the whole line</LinkButton> : undefined}
    >
      {isNarrowed ? "No held case traces back to this station." : "A tag comes here as soon as somebody hangs one."}
    </Empty>
  );
}
