"use client";

import { useRef, useState } from "react";
import type { ReactNode, RefObject } from "react";
import { PhotoPicker } from "@/components/photos/photo-picker";
import { ThumbBar } from "@/components/shell/thumb-bar";
import { Button } from "@/components/ui/button";
import { TextAreaField } from "@/components/ui/field";
import { Glyph } from "@/components/ui/glyph";
import { Note } from "@/components/ui/note";
import { LIMITS } from "@/lib/cases/case-words";
import type { SnapChoices } from "@/lib/cases/same-as-last";
import type { SnapDraft } from "@/lib/cases/snap-draft";
import { CountStepper } from "./count-stepper";
import { SnapCall, SnapSymptoms } from "./snap-call";
import { SnapFacts } from "./snap-facts";
import type { Hang } from "./use-hang";

export interface SnapFormProps {
  choices: SnapChoices;
  isLast: boolean;
  now: number;
  member: { memberId: number; isTrainee: boolean };
  draft: SnapDraft;
  onChange: (some: Partial<SnapDraft>) => void;
  hang: Hang;
  headingRef: RefObject<HTMLHeadingElement | null>;
  /** Snaps that wait on this phone. */
  children: ReactNode;
}

/** Fields of the facts block: a fault in one of them opens it. */
const FACT_FIELDS = [
  "workOrderId",
  "runId",
  "baseMetal",
  "alloy",
  "method",
  "foundStationId",
  "solutionIds",
  "stageFound",
];

/** One part: photo, what stays the same, how many, what is seen, the call. */
export function SnapForm(props: SnapFormProps) {
  const { choices, isLast, now, member, draft, onChange, hang, headingRef, children } = props;
  const { faults, message, isBusy, send } = hang;
  const [factsOpen, setFactsOpen] = useState(draft.workOrderId === null);
  const form = useRef<HTMLFormElement>(null);
  const submit = async () => {
    const isHeld = await send(draft);
    if (!isHeld) requestAnimationFrame(() => firstFault(form.current)?.focus());
  };
  // Not a submit button: pressed before the script has loaded, that would reload the page and lose what was ticked.
  const button = (className: string) => (
    <Button variant="main" glyph="ui-hold-tag" busy={isBusy} className={className} wide onClick={() => void submit()}>
      Hang the hold tag
    </Button>
  );
  return (
    <form
      ref={form}
      className="snap"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <div className="snap__col">
        <h1 ref={headingRef} tabIndex={-1}>
          Snap a suspect part
        </h1>
        {children}
        {message && (
          <Note tone="rust" title="The tag does not hang yet" role="alert">
            {message}
          </Note>
        )}
        <Photos draft={draft} memberId={member.memberId} fault={faults.photoIds} onChange={onChange} />
        <SnapFacts
          choices={choices}
          facts={draft}
          isLast={isLast}
          now={now}
          open={factsOpen || FACT_FIELDS.some((field) => faults[field])}
          onOpen={setFactsOpen}
          onChange={onChange}
          faults={faults}
        />
        <CountStepper
          name="quantity"
          label="Parts that look like this"
          words={draft.quantity === 1 ? "part looks like this" : "parts look like this"}
          start={draft.quantity}
          min={1}
          max={LIMITS.quantity}
          onChange={(quantity) => onChange({ quantity })}
          error={faults.quantity}
        />
      </div>
      <div className="snap__col">
        <SnapSymptoms draft={draft} onChange={onChange} faults={faults} />
        <SnapCall
          classes={choices.classes}
          isTrainee={member.isTrainee}
          draft={draft}
          onChange={onChange}
          faults={faults}
        />
        <details className="snap-note" open={faults.note ? true : undefined}>
          <summary>Add a note</summary>
          <TextAreaField
            label="Note"
            name="note"
            maxLength={LIMITS.noteChars}
            value={draft.note}
            onChange={(event) => onChange({ note: event.target.value })}
            error={faults.note}
          />
        </details>
        {button("desk-only")}
      </div>
      <ThumbBar back="/">{button("")}</ThumbBar>
    </form>
  );
}

interface PhotosProps {
  draft: SnapDraft;
  memberId: number;
  fault: string | undefined;
  onChange: SnapFormProps["onChange"];
}

/** The photos. A refused one is told beside it, and does not travel with the snap. */
function Photos({ draft, memberId, fault, onChange }: PhotosProps) {
  return (
    <div className="snap__photos">
      <PhotoPicker
        purpose="suspect"
        max={LIMITS.photosPerSnap}
        memberId={memberId}
        existing={draft.photoIds}
        onChange={(photos) =>
          onChange({ photoIds: photos.filter((photo) => photo.state !== "refused").map((photo) => photo.id) })
        }
      />
      {fault && draft.photoIds.length === 0 && (
        <p className="field__error">
          <Glyph name="ui-caution" size={20} />
          {fault}
        </p>
      )}
    </div>
  );
}

/** The control to go to after a refusal: the one beside the first sentence. */
function firstFault(form: HTMLFormElement | null): HTMLElement | null {
  const sentence = form?.querySelector(".field__error");
  const place = sentence?.closest(".field, .picks-set, .count-block, .snap__photos");
  return place?.querySelector<HTMLElement>("input:not([hidden]), select, textarea, button") ?? null;
}
