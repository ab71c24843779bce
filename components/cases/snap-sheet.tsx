"use client";

import { useEffect, useRef, useState } from "react";
import { newPhotoId as newSnapKey } from "@/components/photos/photo-id";
import type { SnapChoices } from "@/lib/cases/same-as-last";
import { newDraft, type SnapDraft, type SnapFacts } from "@/lib/cases/snap-draft";
import { SnapForm } from "./snap-form";
import { SnapHeld } from "./snap-held";
import type { SnapFault } from "./snap-send";
import { SnapWaiting } from "./snap-waiting";
import { useHang } from "./use-hang";
import { takeFromOutbox, useSnapOutbox } from "./use-snap-outbox";

export interface SnapSheetProps {
  choices: SnapChoices;
  facts: SnapFacts;
  /** The facts are the person's own last ones. */
  isLast: boolean;
  /** The server's clock when the page was made, UTC milliseconds. */
  now: number;
  member: { memberId: number; name: string; isTrainee: boolean; timeZone: string };
  /** First names of those who take the second look. */
  seniors: readonly string[];
}

/** The snap: the form, then the tag that hangs, then the next part. */
export function SnapSheet({ choices, facts, now, member, seniors, ...props }: SnapSheetProps) {
  const outbox = useSnapOutbox(member.memberId);
  const [draft, setDraft] = useState(() => newDraft(facts, newSnapKey()));
  const [isLast, setIsLast] = useState(props.isLast);
  const hang = useHang(choices, member.memberId);
  const heading = useRef<HTMLHeadingElement>(null);
  const view = hang.held ? "held" : "form";
  const shown = useRef(view);

  useEffect(() => {
    // The pressed button is gone with its view: a reader and the keyboard go on at the heading of the next.
    if (shown.current === view) return;
    shown.current = view;
    window.scrollTo({ top: 0 });
    heading.current?.focus({ preventScroll: true });
  }, [view]);

  const begin = (next: SnapDraft, fault: SnapFault | null = null) => {
    setDraft(next);
    hang.reset(fault);
  };
  const nextPart = () => {
    // The facts of this one are the last ones now.
    setIsLast(true);
    begin(newDraft(draft, newSnapKey()));
  };
  const waiting = (
    <SnapWaiting
      // The one on the screen says for itself that it waits.
      kept={outbox.kept.filter((snap) => snap.fault || snap.snapKey !== draft.snapKey)}
      onThrowAway={(snap) => void takeFromOutbox(snap)}
      onOpen={(snap) => {
        begin(snap.draft, snap.fault);
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
        member={member}
        seniors={seniors}
        held={hang.held}
        caseRef={hang.held.ref ?? outbox.numbers[draft.snapKey] ?? null}
        onNext={nextPart}
      >
        {waiting}
      </SnapHeld>
    );
  }
  return (
    <SnapForm
      key={draft.snapKey}
      headingRef={heading}
      choices={choices}
      isLast={isLast}
      now={now}
      member={member}
      draft={draft}
      onChange={(some) => setDraft((before) => ({ ...before, ...some }))}
      hang={hang}
    >
      {waiting}
    </SnapForm>
  );
}
