import "server-only";
import readExif from "exif-reader";
import { captureTimeAt } from "@/lib/photos/capture-time";

/** A clock this far ahead of ours is wrong, not fast. */
const AHEAD_MS = 24 * 3_600_000;

/**
 * When a photo was taken, from the camera's own record or, where it left none, from the file's own time.
 * @param exif the camera's block; a broken one counts as none
 * @param timeZone the shop's
 * @returns UTC ms, or null when nobody knows
 */
export function takenAt(
  exif: Buffer | undefined,
  timeZone: string,
  fileTimeAt: number | null,
  now: number,
): number | null {
  const at = cameraTimeAt(exif, timeZone) ?? fileTimeAt;
  return at !== null && at <= now + AHEAD_MS ? at : null;
}

function cameraTimeAt(exif: Buffer | undefined, timeZone: string): number | null {
  if (!exif) return null;
  const photo = parseExif(exif)?.Photo;
  const shown = photo?.DateTimeOriginal;
  if (!(shown instanceof Date)) return null;
  const offset = photo?.OffsetTimeOriginal;
  return captureTimeAt(
    { wallClockMs: shown.getTime(), offset: typeof offset === "string" ? offset : undefined },
    timeZone,
  );
}

function parseExif(exif: Buffer) {
  try {
    return readExif(exif);
  } catch {
    // Cameras write broken blocks; the photo is good all the same.
    return null;
  }
}
