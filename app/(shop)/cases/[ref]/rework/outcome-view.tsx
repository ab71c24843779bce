import { ReworkOutcome } from "@/components/cases/rework-outcome";
import { Refused } from "@/components/ui/refused";
import type { SignedIn } from "@/db/queries/crew";
import type { CasePhoto } from "@/db/queries/photos";
import type { ReworkCard } from "@/db/queries/rework";
import { countWords } from "@/lib/cases/part-words";
import { routes } from "@/lib/routes";
import { recordOutcome } from "../../actions";
import { BeforePhoto } from "./round-photos";

interface OutcomeViewProps {
  card: ReworkCard;
  member: SignedIn;
  canWork: boolean;
  photos: CasePhoto[];
}

/** All steps are ticked: how did the re-strike come out? */
export function OutcomeView({ card, member, canWork, photos }: OutcomeViewProps) {
  const before = <BeforePhoto card={card} photos={photos} timeZone={member.shop.timeZone} />;
  const steps = card.steps.length === 1 ? "The one step is ticked" : `All ${countWords(card.steps.length)} ticked`;
  return (
    <>
      <h1 className="rw__step">{steps}. How did it come out?</h1>
      {canWork ? (
        <ReworkOutcome
          caseRef={card.ref}
          memberId={member.memberId}
          classSlug={card.classSlug}
          classTitle={card.classTitle}
          round={card.round}
          back={routes.reworkList()}
          before={before}
          onRecord={recordOutcome}
        />
      ) : (
        <>
          {before}
          <Refused
            what="A plater or senior does this card"
            who="They take the re-strike photo and say how it came out."
          />
        </>
      )}
    </>
  );
}
