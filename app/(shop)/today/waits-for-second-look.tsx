import Link from "next/link";
import { QueueTag } from "@/components/cases/second-look-queue-tag";
import { TagWire } from "@/components/cases/tag-wire";
import { Empty } from "@/components/ui/empty";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listPhotosOfCases } from "@/db/queries/photos";
import { countQueue, listQueue } from "@/db/queries/second-look";
import { routes } from "@/lib/routes";
import { queueTagProps } from "../cases/second-look/queue-tag-props";

const SHOWN = 4;

/** The head of the queue: most money at risk first, then the longest wait. */
export function WaitsForSecondLook({ member, now }: { member: SignedIn; now: number }) {
  const db = getDb();
  const rows = listQueue(db, member.shopId, { stationId: null, limit: SHOWN });
  const all = countQueue(db, member.shopId, { stationId: null });
  const photos = listPhotosOfCases(db, member.shopId, rows.map((row) => row.id)); // prettier-ignore
  return (
    <Section
      title="Waiting for a second look"
      aside={
        rows.length < all.cases ? <Link href={routes.queue()}>{`All ${all.cases}`}</Link> : "Most money at risk first"
      }
    >
      {rows.length === 0 ? (
        <Empty title="The rack is clear.">No part waits for a second look.</Empty>
      ) : (
        <TagWire label="Waiting for a second look">
          {rows.map((row) => (
            <QueueTag key={row.ref} now={now} {...queueTagProps(member, row, photos.get(row.id), {})} />
          ))}
        </TagWire>
      )}
    </Section>
  );
}
