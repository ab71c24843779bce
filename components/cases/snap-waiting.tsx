"use client";

import { Button } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import type { KeptSnap } from "./snap-outbox";

export interface SnapWaitingProps {
  kept: readonly KeptSnap[];
  /** Puts a refused snap back into the form. */
  onOpen: (snap: KeptSnap) => void;
  onThrowAway: (snap: KeptSnap) => void;
}

const ONE_WAITS = "It gets its number when the signal is back. Keep the rack marked HOLD.";
const SOME_WAIT = "They get their numbers when the signal is back. Keep the racks marked HOLD.";

/** Snaps that have no number yet: those that wait for the signal, and those that the server would not take. */
export function SnapWaiting({ kept, onOpen, onThrowAway }: SnapWaitingProps) {
  const refused = kept.filter((snap) => snap.fault);
  const waiting = kept.filter((snap) => !snap.fault);
  return (
    <div className="snap-waiting" role="status">
      {waiting.length > 0 && (
        <Note
          glyph="ui-no-signal"
          title={waiting.length === 1 ? "One snap waits on this phone" : `${waiting.length} snaps wait on this phone`}
        >
          {waiting.map((snap) => snap.title).join("; ")}. {waiting.length === 1 ? ONE_WAITS : SOME_WAIT}
        </Note>
      )}
      {refused.map((snap) => (
        <Note key={snap.snapKey} tone="rust" title="A snap was not taken">
          {snap.title}. {snap.fault?.message}
          <div className="note__action">
            <Button onClick={() => onOpen(snap)}>Open it again</Button>
            <Button variant="quiet" onClick={() => onThrowAway(snap)}>
              Throw it away
            </Button>
          </div>
        </Note>
      ))}
    </div>
  );
}
