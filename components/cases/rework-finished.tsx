import type { ReactNode } from "react";
import { LinkButton } from "@/components/ui/button";
import { Slip, type SlipRow } from "@/components/ui/slip";
import { OUTCOME_TITLES, type Closing, type Outcome } from "@/lib/cases/case-words";
import { routes } from "@/lib/routes";

export interface ReworkFinishedProps {
  caseRef: string;
  outcome: Outcome | null;
  closing: Closing | null;
  /** The case waits for a second look again. */
  isHeld: boolean;
  /** The round that it waits in. */
  round: number;
  rows: readonly SlipRow[];
  photos: ReactNode;
  /** After another fault: the form for a call on it. */
  call?: ReactNode;
}

/** A card that is done, or was ended: what became of the part and what to do with its tag. */
export function ReworkFinished(props: ReworkFinishedProps) {
  const { caseRef, outcome, closing, isHeld, round, rows, photos, call } = props;
  const { head, todo } = endWords(outcome, closing, isHeld, round);
  return (
    <div className="rw-done">
      <div>
        <h1 className="rw__step">{head}</h1>
        <p className="rw__how">{todo}</p>
        {photos}
        {call}
        <div className="btns rw-done__ways">
          <LinkButton href={routes.reworkList()} glyph="ui-back">
            To the cards
          </LinkButton>
          <LinkButton href={routes.case(caseRef)} glyph="ui-eye">
            Open case
          </LinkButton>
        </div>
      </div>
      <Slip rows={rows} />
    </div>
  );
}

function endWords(outcome: Outcome | null, closing: Closing | null, isHeld: boolean, round: number) {
  if (closing === "sound")
    return { head: "Closed as sound", todo: "Off hold and on to plate. Take the tag off the rack." };
  if (closing === "scrap")
    return { head: "Closed as scrap", todo: "Rework is off. Put the part in the scrap bin with its tag." };
  if (closing) return { head: `Closed as ${closing}`, todo: "Rework is off. The reason is in the case." };
  if (isHeld && outcome && outcome !== "sound") {
    return {
      head: "Back on hold",
      todo: `${OUTCOME_TITLES[outcome]}. It waits for a second look, round ${round}. Leave the tag on the rack.`,
    };
  }
  if (isHeld)
    return { head: "Back on hold", todo: `The card was taken back. It waits for a second look, round ${round}.` };
  return { head: "This card is done", todo: "The case has moved on. Open it to see where it stands." };
}
