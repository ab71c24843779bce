import { AlikeCases } from "@/components/cases/alike-cases";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { listAlikeCandidates } from "@/db/queries/alike-cases";
import type { CaseFacts } from "@/db/queries/case-page";
import { listCasebookPhotos } from "@/db/queries/casebook-beside";
import { rankAlike } from "@/lib/cases/alike";

/** As many as can be taken in at a look. */
const SHOWN = 5;

interface CaseAlikeProps {
  shopId: number;
  facts: CaseFacts;
  classes: readonly { slug: string; title: string }[];
}

/** The shop's confirmed cases that are most like this one; nothing while none is like it. */
export function CaseAlike({ shopId, facts, classes }: CaseAlikeProps) {
  const db = getDb();
  const ranked = rankAlike(facts, listAlikeCandidates(db, shopId, facts), SHOWN);
  if (ranked.length === 0) return null;
  const photos = listCasebookPhotos(
    db,
    shopId,
    ranked.map(({ found }) => found.id),
  );
  const titleOf = (slug: string | null) => classes.find((each) => each.slug === slug)?.title ?? "";
  return (
    <Section
      title="Most alike"
      id="alike"
      rests="Among the newest confirmed cases of its class and of its metal, by class, symptoms, metal, stage and method. How much each counts is our own choice."
    >
      <AlikeCases
        caseRef={facts.ref}
        alike={ranked.map(({ found, why }) => ({
          ref: found.ref,
          classWords: titleOf(found.confirmedClass),
          photo: photos.get(found.id)?.before ?? null,
          why: sentence(why),
        }))}
      />
    </Section>
  );
}

/** "Same class, brass too": the reasons as one line. */
function sentence(why: readonly string[]): string {
  const words = why.join(", ");
  return words.charAt(0).toUpperCase() + words.slice(1);
}
