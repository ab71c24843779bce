"use client";

import { useEffect, useRef, useState } from "react";
import type { FormEvent } from "react";
import { newPhotoId as newSnapKey } from "@/components/photos/photo-id";
import { PhotoPicker } from "@/components/photos/photo-picker";
import { ThumbBar } from "@/components/shell/thumb-bar";
import { Button } from "@/components/ui/button";
import { Glyph } from "@/components/ui/glyph";
import { Note } from "@/components/ui/note";
import { PickGroup } from "@/components/ui/pick";
import { Section } from "@/components/ui/section";
import { Stops } from "@/components/ui/stops";
import { TextAreaField } from "@/components/ui/field";
import { LIMITS, SURENESS, SYMPTOM_KEYS, SYMPTOMS } from "@/lib/cases/case-words";
import type { SnapChoices } from "@/lib/cases/same-as-last";
import { CANT_TELL, newDraft, type SnapDraft, type SnapFacts as Facts } from "@/lib/cases/snap-draft";
import { suggestedCalls } from "@/lib/cases/suggested-calls";
import { CallPicks } from "./call-picks";
import { CountStepper } from "./count-stepper";
import { SnapFacts } from "./snap-facts";
import { SnapHeld } from "./snap-held";

import { SnapWaiting } from "./snap-waiting";
import { useHang } from "./use-hang";
import { takeFromOutbox, useSnapOutbox } from "./use-snap-outbox";

export interface SnapSheetProps {
  choices: SnapChoices;
  facts: Facts;
  isLast: boolean;
  /** The server's clock when the page was made, UTC milliseconds. */
  now: number;
  member: { memberId: number; name: string; isTrainee: boolean; timeZone: string };
  /** First names of those who take the second look. */
  seniors: readonly string[];
}

/** How many classes stand beside "Can't tell" and "Another". */
const SUGGESTED = 4;
const FORM = "snap";
/** Fields in the facts block: a fault in one of them opens it. */
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

/** The snap: photo, what stays the same, what is seen, the call. Then the tag, and the next part. */
export function SnapSheet(props: SnapSheetProps) {
  const { choices, member } = props;
  const outbox = useSnapOutbox(member.memberId);
  const [draft, setDraft] = useState(() => newDraft(props.facts, newSnapKey()));
  const [isLast, setIsLast] = useState(props.isLast);
  const hang = useHang(choices, member.memberId);
  const heading = useRef<HTMLHeadingElement>(null);
  const view = hang.held ? "held" : "form";

  useEffect(() => {
    if (view === "held") heading.current?.focus();
  }, [view]);

  const begin = (next: SnapDraft) => {
    setDraft(next);
    hang.reset();
    window.scrollTo({ top: 0 });
  };
  const nextPart = () => {
    // The facts of this one are the last ones now.
    setIsLast(true);
    begin(newDraft(draft, newSnapKey()));
  };
  const waiting = outbox.kept.filter((snap) => snap.snapKey !== draft.snapKey);
  const waitingList = (
    <SnapWaiting
      kept={waiting}
      onThrowAway={(snap) => void takeFromOutbox(snap)}
      onOpen={(snap) => {
        begin(snap.draft);
        void takeFromOutbox(snap);
      }}
    />
  );

  if (hang.held) {
    return (
      <SnapHeld
        headingRef={heading}
        draft={draft}
        choices={choices}
        now={props.now}
        member={member}
        seniors={props.seniors}
        held={hang.held}
        caseRef={hang.held.ref ?? outbox.numbers[draft.snapKey] ?? null}
        onNext={nextPart}
      >
        {waitingList}
      </SnapHeld>
    );
  }
  return (
    <SnapForm key={draft.snapKey} {...props} isLast={isLast} draft={draft} setDraft={setDraft} hang={hang}>
      {waitingList}
    </SnapForm>
  );
}

interface SnapFormProps extends SnapSheetProps {
  draft: SnapDraft;
  setDraft: (change: (before: SnapDraft) => SnapDraft) => void;
  hang: ReturnType<typeof useHang>;
  children: React.ReactNode;
}

function SnapForm({ choices, isLast, now, member, draft, setDraft, hang, children }: SnapFormProps) {
  const [factsOpen, setFactsOpen] = useState(draft.workOrderId === null);
  const { faults, message, isBusy } = hang;
  const change = (some: Partial<SnapDraft>) => setDraft((before) => ({ ...before, ...some }));
  const openFacts = factsOpen || FACT_FIELDS.some((field) => faults[field]);
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = event.currentTarget;
    void hang.send(draft).then((isHeld) => {
      if (!isHeld) requestAnimationFrame(() => firstFault(form)?.focus());
    });
  };
  const button = (className: string) => (
    <Button type="submit" form={FORM} variant="main" glyph="ui-hold-tag" busy={isBusy} className={className} wide>
      Hang the hold tag
    </Button>
  );
  return (
    <form id={FORM} className="snap" onSubmit={submit} noValidate>
      <div className="snap__col">
        <h1>Snap a suspect part</h1>
        {children}
        {message && (
          <Note tone="rust" title="The tag does not hang yet" role="alert">
            {message}
          </Note>
        )}
        <div className="snap__photos">
          <PhotoPicker
            purpose="suspect"
            max={LIMITS.photosPerSnap}
            memberId={member.memberId}
            existing={draft.photoIds}
            onChange={(photos) =>
              change({ photoIds: photos.filter((photo) => photo.state !== "refused").map((photo) => photo.id) })
            }
          />
          <FieldFault words={faults.photoIds} />
        </div>
        <SnapFacts
          choices={choices}
          facts={draft}
          isLast={isLast}
          now={now}
          open={openFacts}
          onOpen={setFactsOpen}
          onChange={change}
          faults={faults}
        />
        <CountStepper
          name="quantity"
          label="Parts that look like this"
          words={draft.quantity === 1 ? "part looks like this" : "parts look like this"}
          start={draft.quantity}
          min={1}
          max={LIMITS.quantity}
          onChange={(quantity) => change({ quantity })}
          error={faults.quantity}
        />
      </div>
      <div className="snap__col">
        <Section title="What do you see?" className="snap-block">
          <PickGroup
            legend="What do you see?"
            hideLegend
            name="symptoms"
            kind="checkbox"
            value={draft.symptoms}
            options={SYMPTOM_KEYS.map((key) => ({
              value: key,
              label: SYMPTOMS[key].words,
              glyph: SYMPTOMS[key].glyph,
            }))}
            onChange={(event) =>
              change({
                symptoms: SYMPTOM_KEYS.filter((key) =>
                  key === event.target.value ? event.target.checked : draft.symptoms.includes(key),
                ),
              })
            }
            error={faults.symptoms}
          />
        </Section>
        <SnapCall choices={choices} isTrainee={member.isTrainee} draft={draft} change={change} faults={faults} />
        <details className="snap-note">
          <summary>Add a note</summary>
          <TextAreaField
            label="Note"
            name="note"
            maxLength={LIMITS.noteChars}
            value={draft.note}
            onChange={(event) => change({ note: event.target.value })}
            error={faults.note}
          />
        </details>
        {button("desk-only")}
      </div>
      <ThumbBar back="/">{button("")}</ThumbBar>
    </form>
  );
}

interface SnapCallProps {
  choices: SnapChoices;
  isTrainee: boolean;
  draft: SnapDraft;
  change: (some: Partial<SnapDraft>) => void;
  faults: Record<string, string>;
}

/** The first call: which class, and how sure. Who can't tell is not asked how sure. */
function SnapCall({ choices, isTrainee, draft, change, faults }: SnapCallProps) {
  const slugs = choices.classes.map((each) => each.slug);
  return (
    <Section title="Your call" className="snap-block" rests={isTrainee ? "Marked as a trainee's call." : undefined}>
      <CallPicks
        legend="Your call"
        hideLegend
        classes={choices.classes}
        suggested={suggestedCalls(draft.symptoms, slugs, SUGGESTED)}
        value={draft.calledClass}
        onChange={(calledClass) => change({ calledClass })}
        error={faults.calledClass}
      />
      {draft.calledClass !== CANT_TELL && (
        <div className="snap-sure">
          <Stops
            name="sure"
            hideLegend
            value={draft.sure}
            onChange={(event) =>
              change({ sure: SURENESS.find((notch) => String(notch) === event.target.value) ?? null })
            }
            error={faults.sure}
          />
        </div>
      )}
    </Section>
  );
}

function FieldFault({ words }: { words: string | undefined }) {
  if (!words) return null;
  return (
    <p className="field__error" id="photo-fault">
      <Glyph name="ui-caution" size={20} />
      {words}
    </p>
  );
}

/** The field to go to after a refusal: the first that is marked, or the first control beside a sentence. */
function firstFault(form: HTMLFormElement): HTMLElement | null {
  const sentence = form.querySelector(".field__error");
  const place = sentence?.closest(".field, .picks-set, .count-block, .snap__photos");
  return place?.querySelector<HTMLElement>("input, select, textarea, button") ?? null;
}
