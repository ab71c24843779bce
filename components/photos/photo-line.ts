import { changePhoto, putPhoto } from "./photo-store";
import type { SendOutcome } from "./send-photo";
import { dropUnsent, isUnsent, type UnsentPhoto } from "./unsent-photos";

/** A photo in line, with what is needed to send it. */
interface Waiting {
  photo: UnsentPhoto;
  /** It lies in the browser's database, from where another tab may send it. */
  isKept: boolean;
  tries: number;
  notBefore: number;
  abort: AbortController;
}

const IN_FLIGHT = 2;
const WAITS_MS = [2_000, 5_000, 15_000, 30_000] as const;
const SIGNED_OUT = "You are signed out. Sign in again; the photo stays on this phone.";

export const NO_SIGNAL = "No signal. It goes up by itself when the signal is back.";

/** Most pages have nothing to send, so they do not load what sends. A form that takes photos loads it while the signal is there. */
export const loadKit = () => import("./send-photo");

const line = new Map<string, Waiting>();
const inHand = new Set<string>();
let sender: number | null = null;
let turn: "none" | "asked" | "ours" = "none";
let endTurn = () => undefined as void;

/** Whose photos go up from now on. */
export function setSender(memberId: number): void {
  sender = memberId;
}

export function isInLine(id: string): boolean {
  return line.has(id);
}

export function joinLine(photo: UnsentPhoto, isKept: boolean): void {
  putPhoto(photo);
  line.set(photo.id, { photo, isKept, tries: 0, notBefore: 0, abort: new AbortController() });
}

/** @returns whether the server may have heard of it */
export function leaveLine(id: string): boolean {
  const waiting = line.get(id);
  waiting?.abort.abort();
  line.delete(id);
  return inHand.has(id) || (waiting?.tries ?? 0) > 0;
}

/** Lets these photos, or all, try at once. */
export function hurry(id?: string): void {
  for (const waiting of line.values()) if (id === undefined || waiting.photo.id === id) waiting.notBefore = 0;
  work();
}

/** Sends what is due. One tab at a time sends, where the browser can tell tabs apart. */
export function work(): void {
  if (turn === "ours") return fill();
  if (turn === "asked" || !nextDue()) return;
  turn = "asked";
  const takeTurn = () =>
    new Promise<void>((resolve) => {
      endTurn = resolve;
      turn = "ours";
      fill();
    });
  void ("locks" in navigator ? navigator.locks.request("coppertell-photos", takeTurn) : takeTurn());
}

function nextDue(): Waiting | undefined {
  const now = Date.now();
  return [...line.values()].find(
    ({ photo, notBefore }) => photo.memberId === sender && notBefore <= now && !inHand.has(photo.id),
  );
}

function fill(): void {
  for (let next = nextDue(); next && inHand.size < IN_FLIGHT; next = nextDue()) {
    const { id } = next.photo;
    inHand.add(id);
    void sendOne(next).finally(() => {
      inHand.delete(id);
      fill();
    });
  }
  if (inHand.size > 0) return;
  turn = "none";
  endTurn();
  planNext();
}

async function sendOne(waiting: Waiting): Promise<void> {
  const { photo, isKept, abort } = waiting;
  if (isKept && !(await isUnsent(photo.id))) return settle(waiting, { kind: "kept" });
  if (!navigator.onLine) return settle(waiting, { kind: "later", words: NO_SIGNAL });
  changePhoto(photo.id, { state: "sending", words: null });
  const kit = await loadKit().catch(() => null);
  if (!kit) return settle(waiting, { kind: "later", words: NO_SIGNAL });
  settle(waiting, await kit.sendPhoto(photo, (share) => changePhoto(photo.id, { share }), abort.signal));
}

function settle(waiting: Waiting, outcome: SendOutcome): void {
  const { id } = waiting.photo;
  if (outcome.kind === "stopped") return;
  if (outcome.kind === "kept" || outcome.kind === "refused") {
    line.delete(id);
    void dropUnsent(id);
    changePhoto(id, outcome.kind === "kept" ? { state: "sent", share: 1 } : { state: "refused", words: outcome.words });
    return;
  }
  waiting.notBefore = Date.now() + (WAITS_MS[waiting.tries] ?? WAITS_MS[3]);
  waiting.tries += 1;
  changePhoto(id, { state: "waiting", words: outcome.kind === "later" ? outcome.words : SIGNED_OUT });
}

function planNext(): void {
  const times = [...line.values()].map((waiting) => waiting.notBefore);
  if (times.length > 0) setTimeout(work, Math.max(500, Math.min(...times) - Date.now()));
}
