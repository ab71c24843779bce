import { Tag } from "@/components/cases/tag";
import { tagPhoto } from "@/components/cases/tag-photo";
import { TagWire } from "@/components/cases/tag-wire";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listPhotosOfCases } from "@/db/queries/photos";
import { listMyOpenCases } from "@/db/queries/today";
import { callWords, counted } from "@/lib/cases/part-words";
import { tagStanding } from "@/lib/cases/tag-standing";
import { routes } from "@/lib/routes";

const SHOWN = 6;

/** The parts that this person put on hold and that still hang there. Nothing at all when there are none. */
export function HeldByMe({ member, now }: { member: SignedIn; now: number }) {
  const db = getDb();
  const rows = listMyOpenCases(db, member.shopId, member.memberId, SHOWN);
  if (rows.length === 0) return null;
  const photos = listPhotosOfCases(db, member.shopId, rows.map((row) => row.id)); // prettier-ignore
  return (
    <Section title="On hold, yours" aside={counted(rows.length, "case")}>
      <TagWire label="On hold, yours">
        {rows.map((row) => {
          const standing = tagStanding(row, now);
          return (
            <Tag
              key={row.ref}
              caseRef={row.ref}
              href={routes.case(row.ref)}
              state={standing.state}
              stateWords={standing.words}
              classSlug={row.classSlug}
              classWords={callWords(row.classTitle, false)}
              meta={`Your call. ${row.quantity} × ${row.partName}`}
              photo={tagPhoto(photos.get(row.id))}
            />
          );
        })}
      </TagWire>
    </Section>
  );
}
