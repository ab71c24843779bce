"use client";

import { useState } from "react";
import type { ReactNode } from "react";
import { PhotoPicker } from "@/components/photos/photo-picker";
import { ThumbBar } from "@/components/shell/thumb-bar";
import { Button } from "@/components/ui/button";
import { TextAreaField } from "@/components/ui/field";
import { Glyph } from "@/components/ui/glyph";
import { PickGroup } from "@/components/ui/pick";
import { Section } from "@/components/ui/section";
import { fieldFault, typed } from "@/lib/act-state";
import { LIMITS, OUTCOME_TITLES, type Outcome } from "@/lib/cases/case-words";
import { classGlyph } from "./class-glyph";
import { FaultNote } from "./fault-note";
import { useSend, type FormAct } from "./use-send";

export interface ReworkOutcomeProps {
  caseRef: string;
  memberId: number;
  classSlug: string | null;
  classTitle: string | null;
  round: number;
  back: string;
  /** The photo of the part as it was held, to photograph it the same way. */
  before: ReactNode;
  onRecord: FormAct<{ ref: string }>;
}

const FORM = "outcome";

const MAIN: Record<Outcome, string> = {
  sound: "Close as sound",
  "same-fault": "Back to second look",
  "another-fault": "Back to second look",
};

/** All steps are ticked: the re-strike's photo, how it came out, a note. */
export function ReworkOutcome(props: ReworkOutcomeProps) {
  const { caseRef, memberId, classSlug, classTitle, round, back, before, onRecord } = props;
  const { state, isBusy, form } = useSend(onRecord);
  const [outcome, setOutcome] = useState<Outcome | null>(null);
  const photoFault = fieldFault(state, "photoIds");
  const still = classTitle ? `Still ${classTitle.toLowerCase()}. ` : "";
  const button = (className: string) => (
    <Button type="submit" form={FORM} variant="main" busy={isBusy} className={className} wide>
      {outcome ? MAIN[outcome] : "Record the outcome"}
    </Button>
  );
  return (
    <form id={FORM} {...form} noValidate className="rw__outcome">
      <input type="hidden" name="ref" value={caseRef} />
      <FaultNote state={state} />
      <div className="rw__photos">
        {before}
        <div className="rw__shot">
          <PhotoPicker purpose="re-strike" max={LIMITS.photosPerSnap} memberId={memberId} name="photoIds[]" />
          <p className="small mid">Re-strike: same side, same tilt. Wet is fine. Lamp glare is not.</p>
          {photoFault && (
            <p className="field__error">
              <Glyph name="ui-caution" size={20} />
              {photoFault}
            </p>
          )}
        </div>
      </div>
      <Section title="Outcome">
        <PickGroup
          legend="Outcome"
          hideLegend
          name="outcome"
          kind="radio"
          layout="rows"
          value={outcome ?? ""}
          onChange={(event) => setOutcome(OUTCOME_KEYS.find((key) => key === event.target.value) ?? null)}
          options={[
            { value: "sound", label: OUTCOME_TITLES.sound, glyph: "sound", hint: "Off hold and on to plate." },
            {
              value: "same-fault",
              label: OUTCOME_TITLES["same-fault"],
              glyph: classGlyph(classSlug),
              hint: `${still}Second look, round ${round + 1}.`,
            },
            {
              value: "another-fault",
              label: OUTCOME_TITLES["another-fault"],
              glyph: "own-class",
              hint: `Say which one next. Second look, round ${round + 1}.`,
            },
          ]}
          error={outcome ? undefined : fieldFault(state, "outcome")}
        />
      </Section>
      <TextAreaField
        label="Note"
        name="note"
        hint="Tape test, first copper, how many of them. Without a photo, say why there is none."
        maxLength={LIMITS.noteChars}
        defaultValue={typed(state, "note")}
        error={fieldFault(state, "note")}
      />
      {button("btn--tick desk-only")}
      <ThumbBar back={back}>{button("btn--tick")}</ThumbBar>
    </form>
  );
}

const OUTCOME_KEYS: readonly Outcome[] = ["sound", "same-fault", "another-fault"];
