import type { ReactNode } from "react";
import { QueueTag } from "@/components/cases/second-look-queue-tag";
import { SaidBefore } from "@/components/cases/second-look-said";
import { TagWire } from "@/components/cases/tag-wire";
import { LineStrip } from "@/components/line/line-strip";
import { NarrowedBar } from "@/components/line/narrowed-bar";
import { ShopShell } from "@/components/shell/shop-shell";
import { ThumbBar } from "@/components/shell/thumb-bar";
import { LinkButton } from "@/components/ui/button";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { countQueue, getNextInQueue, getQueuePlace, listQueue, type QueuePlace } from "@/db/queries/second-look";
import { counted } from "@/lib/cases/part-words";
import { routes } from "@/lib/routes";
import { shellFor } from "@/lib/server/shell-data";
import { queueTagProps } from "../../second-look/queue-tag-props";

const ON_RAIL = 8;

interface QueueShellProps {
  member: SignedIn;
  caseId: number;
  /** The case waits for its second look. */
  isOpen: boolean;
  station: { id: number; slug: string; name: string } | null;
  now: number;
  /** Given where the work goes on after this case. */
  children: (nextHref: string) => ReactNode;
}

/** The queue around the case that is open: where it stands, what comes next, narrowed or not. */
export function QueueShell({ member, caseId, isOpen, station, now, children }: QueueShellProps) {
  const db = getDb();
  const stationId = station?.id ?? null;
  const query: Record<string, string> = station ? { station: station.slug } : {};
  const place = getQueuePlace(db, member.shopId, caseId);
  const next = place ? getNextInQueue(db, member.shopId, stationId, place) : null;
  const nextHref = next ? routes.secondLook(next, query) : routes.queue(query);
  const here = countQueue(db, member.shopId, { stationId });
  const all = station ? countQueue(db, member.shopId, { stationId: null }) : here;
  const { actor, counts, stations } = shellFor(member);
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="second-look"
      width="bleed"
      thumb={
        <ThumbBar back={routes.queue(query)}>
          {isOpen && (
            <LinkButton className="sl-to-tag" href="#second-look-form" glyph="ui-hold-tag">
              Fill in the tag
            </LinkButton>
          )}
        </ThumbBar>
      }
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
            aside="Most money at risk first, then longest wait"
          />
        )
      }
    >
      <SaidBefore key={caseId} />
      {place && here.cases > 0 && (
        <div className="sl-rail">
          <Rail
            member={member}
            place={place}
            isOpen={isOpen}
            stationId={stationId}
            query={query}
            waiting={here.cases}
            now={now}
          />
        </div>
      )}
      {children(nextHref)}
    </ShopShell>
  );
}

interface RailProps {
  member: SignedIn;
  place: QueuePlace;
  isOpen: boolean;
  stationId: number | null;
  query: Record<string, string>;
  waiting: number;
  now: number;
}

/** The open case on the wire, and those that follow it. */
function Rail({ member, place, isOpen, stationId, query, waiting, now }: RailProps) {
  const db = getDb();
  const rows = listQueue(db, member.shopId, { stationId, from: place, limit: ON_RAIL });
  const inFront = countQueue(db, member.shopId, { stationId, before: place }).cases;
  const isHere = rows.some((row) => row.id === place.id);
  const words = isOpen && isHere ? `${inFront + 1} of ${waiting}` : `${rows.length} of ${waiting}`;
  return (
    <TagWire layout="rail" label="Waiting for second look" words={words}>
      {rows.map((row) => (
        <QueueTag
          key={row.id}
          now={now}
          current={row.id === place.id}
          {...queueTagProps(member, row, undefined, query)}
        />
      ))}
    </TagWire>
  );
}
