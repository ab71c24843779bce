import { openDB, type DBSchema, type IDBPDatabase } from "idb";
import type { SnapBody, SnapDraft } from "@/lib/cases/snap-draft";
import { sendSnap, type SendAnswer, type SnapFault } from "./snap-send";

/** A snap that the server has not taken yet. It lies on this phone, under the person who made it. */
export interface KeptSnap {
  snapKey: string;
  memberId: number;
  draft: SnapDraft;
  body: SnapBody;
  /** "J-3318 Orrin & Pike, 3 parts": what to call it while it has no number. */
  title: string;
  keptAt: number;
  /** The server would not take it as it is: what has to change. Null: it only waits for the signal. */
  fault: SnapFault | null;
}

interface Outbox extends DBSchema {
  snaps: { key: string; value: KeptSnap };
}

let opened: Promise<IDBPDatabase<Outbox>> | null = null;

function outbox(): Promise<IDBPDatabase<Outbox>> {
  opened ??= openDB<Outbox>("coppertell-snaps", 1, {
    upgrade: (database) => void database.createObjectStore("snaps", { keyPath: "snapKey" }),
  });
  return opened;
}

/**
 * Keeps a snap on the phone until the server has it.
 * @returns false where the browser keeps nothing (a private window): then the page has to stay open
 */
export async function keepSnap(snap: KeptSnap): Promise<boolean> {
  try {
    await (await outbox()).put("snaps", snap);
    return true;
  } catch {
    // Nothing is lost yet: the caller still holds the snap and says that the page must stay open.
    return false;
  }
}

export async function dropSnap(snapKey: string): Promise<void> {
  try {
    await (await outbox()).delete("snaps", snapKey);
  } catch {
    // Where nothing could be kept, nothing is there to be dropped.
  }
}

/** This person's snaps on this phone, oldest first. Another person's stay until they sign in here again. */
export async function listSnaps(memberId: number): Promise<KeptSnap[]> {
  try {
    const all = await (await outbox()).getAll("snaps");
    return all.filter((snap) => snap.memberId === memberId).toSorted((a, b) => a.keptAt - b.keptAt);
  } catch {
    return [];
  }
}

/** A slow line may take its time behind the next snap; after this it is dead. */
const PATIENCE_MS = 60_000;

const underway = new Set<string>();

/** Sends one kept snap. It leaves the phone only when the server has it; a refused one stays, with the reason. */
export async function deliver(snap: KeptSnap): Promise<SendAnswer> {
  underway.add(snap.snapKey);
  try {
    const answer = await sendSnap(snap.body, PATIENCE_MS);
    if (answer.kind === "hung") await dropSnap(snap.snapKey);
    if (answer.kind === "refused") await keepSnap({ ...snap, fault: answer.fault });
    return answer;
  } finally {
    underway.delete(snap.snapKey);
  }
}

/**
 * Sends whatever waits, one after the other, and stops at the first that does not get through.
 * @returns snapKey → answer, for those that were tried
 */
export async function flushSnaps(memberId: number): Promise<Map<string, SendAnswer>> {
  const answers = new Map<string, SendAnswer>();
  for (const snap of await listSnaps(memberId)) {
    if (snap.fault || underway.has(snap.snapKey)) continue;
    const answer = await deliver(snap);
    answers.set(snap.snapKey, answer);
    if (answer.kind === "waits") break;
  }
  return answers;
}
