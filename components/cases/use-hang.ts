"use client";

import { useState } from "react";
import type { SnapChoices } from "@/lib/cases/same-as-last";
import { missingIn, snapBody, type SnapDraft } from "@/lib/cases/snap-draft";
import { deliver, dropSnap, keepSnap, type KeptSnap } from "./snap-outbox";
import type { SnapFault, Waits } from "./snap-send";
import { noteAnswer, noteNumber, rereadOutbox } from "./use-snap-outbox";

/** After the tag was hung: with its number, or without one and why. */
export interface Held {
  ref: string | null;
  waits: Waits | null;
  /** The browser keeps the snap; else the page has to stay open. */
  isKept: boolean;
  /** The phone's clock, UTC milliseconds. */
  at: number;
}

/** A person with a wet part does not wait longer than this for a number; the snap goes on behind. */
const NUMBER_WAIT_MS = 4_000;

export type Hang = ReturnType<typeof useHang>;

/** Hanging the tag: checks what is missing, keeps the snap on the phone, sends it, and says what came back. */
export function useHang(choices: SnapChoices, memberId: number) {
  const [held, setHeld] = useState<Held | null>(null);
  const [faults, setFaults] = useState<Record<string, string>>({});
  const [message, setMessage] = useState<string | null>(null);
  const [isBusy, setIsBusy] = useState(false);

  const refuse = (fields: Record<string, string>, words: string) => {
    setFaults(fields);
    setMessage(words);
    return false;
  };

  /** @returns whether the tag hangs */
  const send = async (draft: SnapDraft): Promise<boolean> => {
    const missing = missingIn(draft);
    const first = Object.values(missing)[0];
    if (first) return refuse(missing, first);
    setIsBusy(true);
    setMessage(null);
    setFaults({});
    const snap = keptFrom(draft, choices, memberId);
    // On the phone first: a page that dies while it sends loses nothing.
    const isKept = await keepSnap(snap);
    const answering = deliver(snap);
    const answer = await Promise.race([answering, later(NUMBER_WAIT_MS)]);
    setIsBusy(false);
    if (answer?.kind === "refused") {
      await dropSnap(snap.snapKey);
      return refuse(answer.fault.fields, answer.fault.message);
    }
    const ref = answer?.kind === "hung" ? answer.ref : null;
    const waits = answer === null ? "slow" : answer.kind === "waits" ? answer.why : null;
    if (ref) noteNumber(snap.snapKey, ref);
    setHeld({ ref, waits, isKept, at: Date.now() });
    await rereadOutbox(memberId);
    if (answer === null) {
      void answering.then((late) => {
        noteAnswer(snap.snapKey, late);
        return rereadOutbox(memberId);
      });
    }
    return true;
  };

  /** Back to the form: empty-handed, or with the fault of a snap that is opened again. */
  const reset = (fault: SnapFault | null = null) => {
    setHeld(null);
    setFaults(fault?.fields ?? {});
    setMessage(fault?.message ?? null);
  };
  return { held, faults, message, isBusy, send, reset };
}

const later = (ms: number) => new Promise<null>((done) => setTimeout(() => done(null), ms));

function keptFrom(draft: SnapDraft, choices: SnapChoices, memberId: number): KeptSnap {
  const job = choices.jobs.find((each) => each.id === draft.workOrderId);
  const parts = draft.quantity === 1 ? "1 part" : `${draft.quantity} parts`;
  return {
    snapKey: draft.snapKey,
    memberId,
    draft,
    body: snapBody(draft),
    title: job ? `${job.number} ${job.customer}, ${parts}` : parts,
    keptAt: Date.now(),
    fault: null,
  };
}
