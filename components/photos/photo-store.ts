import type { PhotoPurpose } from "@/lib/photos/photo-words";
import type { UnsentPhoto } from "./unsent-photos";

/**
 * `waiting`: on this phone, not being sent just now. `sending`: going up. `sent`: the server has it and it is a photo.
 * `refused`: it cannot be kept; `words` says why.
 */
export type SendState = "waiting" | "sending" | "sent" | "refused";

/** A photo as this browser knows it, from the moment it is taken. */
export interface SentPhoto {
  id: string;
  memberId: number;
  purpose: PhotoPurpose;
  state: SendState;
  /** How much has gone up, 0 to 1. */
  share: number;
  words: string | null;
  /** Address of the picture in this browser; null where only the server has it. */
  previewUrl: string | null;
}

export interface PhotoShelf {
  /** False until this browser's database has been read. */
  isRead: boolean;
  photos: ReadonlyMap<string, SentPhoto>;
  /** Those that a form on the screen shows: it says itself what becomes of them. */
  shown: ReadonlySet<string>;
}

/** Held outside every component, so that photos go on going up when the person goes to the next page. */
const empty: PhotoShelf = { isRead: false, photos: new Map(), shown: new Set() };
let current = empty;
const listeners = new Set<() => void>();

export const photoStore = {
  get: () => current,
  getOnServer: () => empty,
  subscribe: (listener: () => void) => {
    listeners.add(listener);
    return () => void listeners.delete(listener);
  },
};

function publish(next: PhotoShelf): void {
  current = next;
  for (const listener of listeners) listener();
}

export function markRead(): void {
  publish({ ...current, isRead: true });
}

/** Puts a photo on the shelf, or leaves it as it is when it is there. */
export function putPhoto({ id, memberId, purpose, content }: UnsentPhoto): void {
  if (current.photos.has(id)) return;
  const previewUrl = URL.createObjectURL(content);
  const photo: SentPhoto = { id, memberId, purpose, state: "waiting", share: 0, words: null, previewUrl };
  publish({ ...current, photos: new Map([...current.photos, [id, photo]]) });
}

/** Changes a photo that is on the shelf. */
export function changePhoto(id: string, change: Partial<Pick<SentPhoto, "state" | "share" | "words">>): void {
  const photo = current.photos.get(id);
  if (photo) publish({ ...current, photos: new Map([...current.photos, [id, { ...photo, ...change }]]) });
}

/** Takes a photo off the shelf and frees its picture. */
export function forgetPhoto(id: string): void {
  const photo = current.photos.get(id);
  if (!photo) return;
  if (photo.previewUrl) URL.revokeObjectURL(photo.previewUrl);
  publish({ ...current, photos: new Map([...current.photos].filter(([each]) => each !== id)) });
}

/** A form shows these photos. @returns what is called when it no longer does: those that were sent need no keeping here */
export function showPhotos(ids: readonly string[]): () => void {
  publish({ ...current, shown: new Set([...current.shown, ...ids]) });
  return () => {
    publish({ ...current, shown: new Set([...current.shown].filter((id) => !ids.includes(id))) });
    for (const id of ids) if (current.photos.get(id)?.state === "sent") forgetPhoto(id);
  };
}
