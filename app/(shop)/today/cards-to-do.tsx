import Link from "next/link";
import { ReworkTag } from "@/components/cases/rework-tag";
import { tagPhoto } from "@/components/cases/tag-photo";
import { TagWire } from "@/components/cases/tag-wire";
import { Empty } from "@/components/ui/empty";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listPhotosOfCases } from "@/db/queries/photos";
import { countReworkTags, listReworkTags } from "@/db/queries/rework";
import { routes } from "@/lib/routes";

const SHOWN = 4;

/** Cards that wait for hands: those this person began come first. */
export function CardsToDo({ member }: { member: SignedIn }) {
  const db = getDb();
  const mine = listReworkTags(db, member.shopId, { begunBy: member.memberId, limit: SHOWN });
  const rest = listReworkTags(db, member.shopId, { notBegunBy: member.memberId, limit: SHOWN });
  const cards = [...mine, ...rest].slice(0, SHOWN);
  const all = countReworkTags(db, member.shopId);
  const photos = listPhotosOfCases(db, member.shopId, cards.map((card) => card.caseId)); // prettier-ignore
  return (
    <Section
      title="Cards to do"
      aside={cards.length < all ? <Link href={routes.reworkList()}>{`All ${all}`}</Link> : undefined}
    >
      {cards.length === 0 ? (
        <Empty title="No card waits.">A card comes here when a senior tech has confirmed a part.</Empty>
      ) : (
        <TagWire label="Cards to do">
          {cards.map((card) => (
            <ReworkTag key={card.ref} card={card} photo={tagPhoto(photos.get(card.caseId))} />
          ))}
        </TagWire>
      )}
    </Section>
  );
}
