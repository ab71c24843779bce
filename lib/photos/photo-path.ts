import type { PhotoSize } from "./photo-words";

/** What the sizes are stored as. The file's ending follows from it. */
export const STORED_ENDINGS = { "image/jpeg": "jpg", "image/png": "png", "image/webp": "webp" } as const;
export type StoredMime = keyof typeof STORED_ENDINGS;

/**
 * Where a size of a photo lies, under the uploads folder. The two letters keep any one folder small.
 * @example photoPath(7, "3f2a…", "thumb", "image/webp") === "7/3f/3f2a….thumb.webp"
 */
export function photoPath(shopId: number, photoId: string, size: PhotoSize, mime: StoredMime): string {
  return `${photoFolder(shopId, photoId)}/${photoId}.${size}.${STORED_ENDINGS[mime]}`;
}

/** Where an accepted file waits, as the camera made it, until its sizes stand. Never served. */
export function receivedPath(shopId: number, photoId: string): string {
  return `${photoFolder(shopId, photoId)}/${photoId}.received`;
}

/** Where a file grows while it comes in. */
export function incomingPath(photoId: string): string {
  return `incoming/${photoId}.part`;
}

function photoFolder(shopId: number, photoId: string): string {
  return `${shopId}/${photoId.slice(0, 2)}`;
}
