import Link from "next/link";
import { CallForm } from "@/components/cases/call-form";
import { ReworkFinished } from "@/components/cases/rework-finished";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import type { CasePhoto } from "@/db/queries/photos";
import type { ReworkCard } from "@/db/queries/rework";
import { listClasses } from "@/db/queries/snap-choices";
import { cardProgress } from "@/lib/cases/card-progress";
import { dayAndTime } from "@/lib/cases/shop-clock";
import { suggestedCalls } from "@/lib/cases/suggested-calls";
import { shortName } from "@/lib/crew/initials";
import { routes } from "@/lib/routes";
import { addCall } from "../../actions";
import { RoundPhotos } from "./round-photos";

interface DoneViewProps {
  card: ReworkCard;
  photos: CasePhoto[];
  member: SignedIn;
}

/** How many classes stand in sight before "Another". */
const SUGGESTED = 4;

/** The card is done: how it ended and, after another fault, the question which one. */
export function DoneView({ card, photos, member }: DoneViewProps) {
  const progress = cardProgress(card.steps);
  const { timeZone } = member.shop;
  const isHeld = card.state === "held";
  const asksForCall = isHeld && card.outcome === "another-fault" && card.round === card.caseRound - 1;
  return (
    <div className="rw">
      <p className="rw__who">
        <span>
          <Link className="ref" href={routes.case(card.ref)}>
            {card.ref}
          </Link>{" "}
          <span>{card.partName}</span>
        </span>
        <span>Round {card.round}</span>
      </p>
      <ReworkFinished
        caseRef={card.ref}
        outcome={card.outcome}
        closing={card.closing}
        isHeld={isHeld}
        round={card.caseRound}
        photos={<RoundPhotos card={card} photos={photos} timeZone={timeZone} />}
        rows={[
          { label: "Card", value: card.cardTitle },
          { label: "Steps ticked", value: `${progress.ticked} of ${progress.steps}` },
          { label: "Took", value: `${progress.spentMinutes} min, card said ${progress.plannedMinutes}` },
          ...(card.doneAt !== null && card.outcomeBy !== null
            ? [{ label: "Recorded", value: `${shortName(card.outcomeBy)}, ${dayAndTime(card.doneAt, timeZone)}` }]
            : []),
          ...(card.outcomeNote ? [{ label: "Note", value: card.outcomeNote }] : []),
        ]}
        call={asksForCall && <OtherFault card={card} shopId={member.shopId} />}
      />
    </div>
  );
}

/** Which fault is it now? Everyone who can see the case may call it. */
function OtherFault({ card, shopId }: { card: ReworkCard; shopId: number }) {
  const classes = listClasses(getDb(), shopId).filter((each) => each.slug !== card.classSlug);
  const slugs = classes.map((each) => each.slug);
  return (
    <Section title="Which fault is it now?">
      <CallForm
        caseRef={card.ref}
        classes={classes}
        suggested={suggestedCalls([], slugs, SUGGESTED)}
        onCall={addCall}
      />
    </Section>
  );
}
