import { CaseFilm } from "@/components/cases/case-film";
import { stagePhotos } from "@/components/cases/case-shots";
import { BeforeAfter } from "@/components/photos/before-after";
import { PhotoStage } from "@/components/photos/photo-stage";
import { Section } from "@/components/ui/section";
import type { CaseFacts } from "@/db/queries/case-page";
import type { CaseShot } from "@/db/queries/case-records";
import type { SignedIn } from "@/db/queries/crew";
import { can } from "@/lib/permissions";
import { setExemplar } from "../actions";

interface CasePhotosProps {
  member: SignedIn;
  facts: CaseFacts;
  shots: readonly CaseShot[];
}

/** The first photo of the snap against the last of a re-strike; null while one of the two is missing. */
function pairOf(shots: readonly CaseShot[]): { before: CaseShot; after: CaseShot } | null {
  const ready = shots.filter((shot) => shot.state === "ready");
  const before = ready.find((shot) => shot.purpose === "suspect");
  const after = ready.findLast((shot) => shot.purpose === "re-strike");
  return before && after ? { before, after } : null;
}

/** The class stands: a case that is held again may turn out to be another. */
function isSettled(facts: CaseFacts): boolean {
  return facts.confirmedClass !== null && facts.state !== "held";
}

/** Before and after, then all photos by round. A part that was not struck again shows its snap large instead. */
export function CasePhotos({ member, facts, shots }: CasePhotosProps) {
  const photos = stagePhotos(facts.ref, shots);
  const pair = pairOf(shots);
  const of = (shot: CaseShot, caption: string) => {
    const photo = photos[shots.indexOf(shot)];
    return { id: shot.id, caption, placeholder: photo?.placeholder, isRendered: shot.isRendered };
  };
  const firstReady = shots.findIndex((shot) => shot.state === "ready");
  return (
    <Section title={pair ? "Before and after" : "Photos"}>
      {pair ? (
        <BeforeAfter
          before={of(pair.before, `Round ${pair.before.round}, held`)}
          after={of(pair.after, `Round ${pair.after.round}, re-strike`)}
        />
      ) : (
        firstReady >= 0 && <PhotoStage photos={photos} startAt={firstReady} hideFilm />
      )}
      <CaseFilm
        caseRef={facts.ref}
        shots={shots.flatMap((shot, index) => {
          const photo = photos[index];
          return photo ? { photo, round: shot.round, isExemplar: shot.exemplarOf !== null } : [];
        })}
        onExemplar={isSettled(facts) && can(member, "exemplar.choose") ? setExemplar : undefined}
      />
    </Section>
  );
}
