/** The camera's record of the moment, as EXIF has it. */
export interface CaptureRecord {
  /** What the camera's clock showed, its fields read as if they were UTC: UTC ms of "2026-07-14 09:12" for 09:12 on the wall. */
  wallClockMs: number;
  /** "+02:00" or "-05:30" (EXIF OffsetTimeOriginal); absent on older cameras. */
  offset?: string | undefined;
}

const MINUTE_MS = 60_000;
/** Digital cameras have no photos from before; a clock that was never set shows an older year. */
const EARLIEST_MS = Date.UTC(1990, 0, 1);

/**
 * When a photo was taken. A camera that names no offset is believed to run on the shop's own time.
 * @param record what the camera wrote
 * @param timeZone the shop's zone, as in "Europe/Berlin"
 * @returns UTC ms, or null when the clock shows no year that a digital camera has seen
 * @throws RangeError when the zone is not known
 * @example captureTimeAt({ wallClockMs: Date.UTC(2026, 6, 14, 9, 12), offset: "+02:00" }, "UTC") === Date.UTC(2026, 6, 14, 7, 12)
 * Source: Exif 2.32, tags 0x9003 (DateTimeOriginal) and 0x9011 (OffsetTimeOriginal).
 */
export function captureTimeAt(record: CaptureRecord, timeZone: string): number | null {
  const wall = record.wallClockMs;
  if (!Number.isFinite(wall) || wall < EARLIEST_MS) return null;
  const offsetMinutes = parseOffset(record.offset);
  if (offsetMinutes !== null) return wall - offsetMinutes * MINUTE_MS;
  // The offset at a moment depends on the moment itself: the second pass settles it beside a clock change.
  const guess = wall - zoneOffsetMs(wall, timeZone);
  return wall - zoneOffsetMs(guess, timeZone);
}

/** @returns minutes east of UTC, or null when the text is no offset */
function parseOffset(text: string | undefined): number | null {
  const match = /^([+-])(\d{2}):?(\d{2})$/.exec(text?.replaceAll("\0", "").trim() ?? "");
  if (!match) return null;
  const minutes = Number(match[2]) * 60 + Number(match[3]);
  return match[1] === "-" ? -minutes : minutes;
}

/** How far the zone's wall clock is ahead of UTC at a moment. */
function zoneOffsetMs(at: number, timeZone: string): number {
  const parts = new Intl.DateTimeFormat("en-US", {
    timeZone,
    hourCycle: "h23",
    year: "numeric",
    month: "numeric",
    day: "numeric",
    hour: "numeric",
    minute: "numeric",
    second: "numeric",
  }).formatToParts(at);
  const read = (type: Intl.DateTimeFormatPartTypes) => Number(parts.find((part) => part.type === type)?.value);
  const wall = Date.UTC(read("year"), read("month") - 1, read("day"), read("hour"), read("minute"), read("second"));
  return wall - Math.floor(at / 1000) * 1000;
}
