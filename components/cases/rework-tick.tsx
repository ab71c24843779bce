"use client";

import { ThumbBar } from "@/components/shell/thumb-bar";
import { Button } from "@/components/ui/button";
import { fieldFault } from "@/lib/act-state";
import { LIMITS } from "@/lib/cases/case-words";
import { CountStepper } from "./count-stepper";
import { FaultNote } from "./fault-note";
import { useSend, type FormAct } from "./use-send";

export interface ReworkTickProps {
  caseRef: string;
  stepId: number;
  /** Its place on the card, from 1. */
  step: number;
  plannedMinutes: number;
  /** Where Back leads: the card's list. */
  back: string;
  onTick: FormAct<{ ref: string }>;
}

const FORM = "tick";

/** The minutes the step took, as planned unless changed, and the tick. */
export function ReworkTick({ caseRef, stepId, step, plannedMinutes, back, onTick }: ReworkTickProps) {
  const { state, isBusy, form } = useSend(onTick);
  const button = (className: string) => (
    <Button type="submit" form={FORM} variant="main" glyph="ui-tick" busy={isBusy} className={className} wide>
      Tick step {step}
    </Button>
  );
  return (
    <form id={FORM} {...form} noValidate className="rw__tick">
      <input type="hidden" name="ref" value={caseRef} />
      <input type="hidden" name="stepId" value={stepId} />
      <FaultNote state={state} />
      <CountStepper
        name="spentMinutes"
        label="Minutes this step took"
        words={`min for this step. The card says ${plannedMinutes}`}
        start={plannedMinutes}
        min={0}
        max={LIMITS.minutes}
        error={fieldFault(state, "spentMinutes")}
      />
      {button("btn--tick desk-only")}
      <ThumbBar back={back}>{button("btn--tick")}</ThumbBar>
    </form>
  );
}
