"use client";

import { useEffect, useSyncExternalStore } from "react";
import { say } from "@/components/ui/toast";
import { dropSnap, flushSnaps, listSnaps, type KeptSnap } from "./snap-outbox";
import type { SendAnswer } from "./snap-send";

interface OutboxState {
  kept: readonly KeptSnap[];
  /** snapKey → case reference, of the snaps that this page has sent. */
  numbers: Readonly<Record<string, string>>;
}

const NOTHING: OutboxState = { kept: [], numbers: {} };
const TRY_AGAIN_MS = 20_000;

// One for the page, however many components look at it, so that nothing is sent twice at a time.
let state = NOTHING;
let sending: Promise<void> | null = null;
const listeners = new Set<() => void>();

function become(next: Partial<OutboxState>): void {
  state = { ...state, ...next };
  listeners.forEach((listener) => listener());
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** Reads the phone's store again, after a snap was kept or dropped. */
export async function rereadOutbox(memberId: number): Promise<void> {
  become({ kept: await listSnaps(memberId) });
}

/** Notes the number that a snap was given. */
export function noteNumber(snapKey: string, ref: string): void {
  become({ numbers: { ...state.numbers, [snapKey]: ref } });
}

/** Sends what waits. Called while it is sending already, it joins in. */
export function flushOutbox(memberId: number): Promise<void> {
  sending ??= flush(memberId).finally(() => {
    sending = null;
  });
  return sending;
}

async function flush(memberId: number): Promise<void> {
  await rereadOutbox(memberId);
  if (state.kept.every((snap) => snap.fault)) return;
  const answers = await flushSnaps(memberId);
  for (const [snapKey, answer] of answers) noteAnswer(snapKey, answer);
  await rereadOutbox(memberId);
}

/** Tells the person what became of a snap that they no longer look at. */
export function noteAnswer(snapKey: string, answer: SendAnswer): void {
  if (answer.kind === "refused") say("A snap that waited was not taken. It is kept on the snap page.", "amber");
  if (answer.kind !== "hung") return;
  noteNumber(snapKey, answer.ref);
  say(`${answer.ref} hangs. Write the number on the rack tag.`);
}

/** The person throws a kept snap away, or opens it in the form again. */
export async function takeFromOutbox(snap: KeptSnap): Promise<void> {
  await dropSnap(snap.snapKey);
  await rereadOutbox(snap.memberId);
}

/** Snaps that wait on this phone. Sends them at load, when the signal is back, and every 20 s while any is left. */
export function useSnapOutbox(memberId: number): OutboxState {
  const current = useSyncExternalStore(
    subscribe,
    () => state,
    () => NOTHING,
  );
  useEffect(() => {
    const go = () => void flushOutbox(memberId);
    go();
    window.addEventListener("online", go);
    const timer = window.setInterval(go, TRY_AGAIN_MS);
    return () => {
      window.removeEventListener("online", go);
      window.clearInterval(timer);
    };
  }, [memberId]);
  return current;
}
