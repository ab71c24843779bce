import { refusalBeforeSending } from "@/lib/photos/photo-refusals";
import type { PhotoPurpose } from "@/lib/photos/photo-words";
import { newPhotoId } from "./photo-id";
import { hurry, isInLine, joinLine, leaveLine, setSender, work } from "./photo-line";
import { changePhoto, forgetPhoto, markRead, photoStore, putPhoto } from "./photo-store";
import { dropUnsent, keepUnsent, listUnsent, type UnsentPhoto } from "./unsent-photos";

const LOOK_EVERY_MS = 30_000;
const UNREADABLE = "The file could not be read from this phone. Take the photo again.";

let startedFor: number | null = null;

/** Begins to send this member's photos: those that an earlier page left, and those to come. Safe to call on every page. */
export async function startSending(memberId: number): Promise<void> {
  if (startedFor === memberId) return;
  if (startedFor === null) watchSignal();
  startedFor = memberId;
  setSender(memberId);
  for (const photo of await listUnsent(memberId)) {
    if (!isInLine(photo.id)) joinLine(photo, true);
  }
  markRead();
  work();
}

/** A photo was taken or chosen. @returns its number, from now on */
export function addPhoto(file: File, { purpose, memberId }: { purpose: PhotoPurpose; memberId: number }): string {
  const { name, type, lastModified: takenAt } = file;
  const photo: UnsentPhoto = { id: newPhotoId(), memberId, purpose, name, type, takenAt, content: file };
  putPhoto(photo);
  const refusal = refusalBeforeSending(file);
  if (refusal) changePhoto(photo.id, { state: "refused", words: refusal });
  else void keepAndSend(photo);
  return photo.id;
}

async function keepAndSend(photo: UnsentPhoto): Promise<void> {
  try {
    // A chosen file may vanish from the phone; its bytes may not.
    photo.content = new Blob([await photo.content.arrayBuffer()], { type: photo.type });
  } catch {
    return changePhoto(photo.id, { state: "refused", words: UNREADABLE });
  }
  const isKept = await keepUnsent(photo);
  // Taken away meanwhile.
  if (!photoStore.get().photos.has(photo.id)) return dropUnsent(photo.id);
  joinLine(photo, isKept);
  work();
}

/** The person takes a photo away: it stops going up, and the server forgets it unless a case holds it. */
export function takeAway(id: string): void {
  const state = photoStore.get().photos.get(id)?.state ?? "sent";
  const isBegun = leaveLine(id) || state === "sent";
  forgetPhoto(id);
  void dropUnsent(id);
  // Whether this arrives makes no odds: a photo that no case holds is shown to nobody else.
  if (isBegun) void fetch(`/api/photos/${id}`, { method: "DELETE" }).catch(() => undefined);
}

/** Tries again now. */
export function retryPhoto(id: string): void {
  hurry(id);
}

/** The signal is back, or the phone is out of the pocket again: no need to wait any longer. */
function watchSignal(): void {
  window.addEventListener("online", () => hurry());
  document.addEventListener("visibilitychange", () => document.visibilityState === "visible" && hurry());
  setInterval(work, LOOK_EVERY_MS);
}
