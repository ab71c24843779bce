import { ReworkStep } from "@/components/cases/rework-step";
import { ReworkTick } from "@/components/cases/rework-tick";
import { LinkButton } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import { Refused } from "@/components/ui/refused";
import type { SignedIn } from "@/db/queries/crew";
import type { ReworkCard } from "@/db/queries/rework";
import { writeStep } from "@/lib/cases/written-step";
import { routes } from "@/lib/routes";
import { tickStep } from "../../actions";

interface StepViewProps {
  card: ReworkCard;
  member: SignedIn;
  canWork: boolean;
  /** The step on the screen, from 1. */
  shown: number;
  /** The first open step, from 1; null once all are ticked. */
  openStep: number | null;
}

/** One step: its cautions, what to do, and the tick where it is its turn. */
export function StepView({ card, member, canWork, shown, openStep }: StepViewProps) {
  const stored = card.steps[shown - 1];
  if (!stored) return null;
  const step = writeStep(stored, member.shop.timeZone);
  return (
    <>
      <ReworkStep step={step} />
      {step.ticked && (
        <Note tone="green" title={`Ticked by ${step.ticked.by}, ${step.ticked.at}`}>
          It took {step.ticked.spentMinutes} min; the card said {step.plannedMinutes}.
        </Note>
      )}
      {!canWork && <Refused what="A plater or senior does this card" who="You can read every step of it here." />}
      {canWork && shown === openStep && (
        <ReworkTick
          key={step.id}
          caseRef={card.ref}
          stepId={step.id}
          step={shown}
          plannedMinutes={step.plannedMinutes}
          back={routes.reworkList()}
          onTick={tickStep}
        />
      )}
      <div className="wet">
        {shown > 1 && (
          <LinkButton href={routes.reworkStep(card.ref, shown - 1)} glyph="ui-back" scroll={false}>
            Step {shown - 1}
          </LinkButton>
        )}
        {shown !== openStep && (
          <LinkButton href={routes.rework(card.ref)} scroll={false}>
            {openStep === null ? "To the outcome" : `To step ${openStep}, which is open`}
          </LinkButton>
        )}
      </div>
    </>
  );
}
