/**
 * A JPEG without what the camera wrote into it, bit for bit the same picture (ITU T.81, annex B).
 */

const MARKER = {
  app0: 0xe0,
  app2: 0xe2,
  app14: 0xee,
  app15: 0xef,
  com: 0xfe,
  sos: 0xda,
  eoi: 0xd9,
  soi: 0xd8,
} as const;
const ICC_NAME = "ICC_PROFILE\0";
/** An APP2 segment holds 65 535 bytes with its length, name and two counters (ICC.1:2022, annex B.4). */
const ICC_CHUNK_BYTES = 65_535 - 2 - ICC_NAME.length - 2;

/**
 * Drops every private segment: EXIF with GPS, XMP, maker notes, comments, previews, and whatever follows the picture's
 * end. Keeps what the colours need: JFIF, the ICC profile, Adobe's colour transform.
 * The orientation goes too, so the picture must already lie upright.
 * @param jpeg the whole file
 * @returns a new file; the input is not changed
 * @throws RangeError "jpeg" when the segments do not add up or the end is missing
 */
export function cleanJpeg(jpeg: Uint8Array): Uint8Array {
  if (jpeg[0] !== 0xff || jpeg[1] !== MARKER.soi) throw new RangeError("jpeg: does not begin with a start marker");
  const kept: Uint8Array[] = [jpeg.subarray(0, 2)];
  let at = 2;
  for (;;) {
    const segment = segmentAt(jpeg, at);
    if (segment.marker === MARKER.eoi) return concat([...kept, jpeg.subarray(at, segment.end)]);
    if (isKept(jpeg, segment)) kept.push(jpeg.subarray(at, segment.end));
    at = segment.end;
  }
}

/**
 * Puts a colour profile into a JPEG that has none.
 * @param icc the profile; an empty one changes nothing
 */
export function withColourProfile(jpeg: Uint8Array, icc: Uint8Array): Uint8Array {
  const count = Math.ceil(icc.length / ICC_CHUNK_BYTES);
  if (count > 255) throw new RangeError("icc: the profile is too long for a JPEG");
  const segments = Array.from({ length: count }, (_, index) => {
    const part = icc.subarray(index * ICC_CHUNK_BYTES, (index + 1) * ICC_CHUNK_BYTES);
    const length = 2 + ICC_NAME.length + 2 + part.length;
    const head = [0xff, MARKER.app2, length >> 8, length & 0xff, ...ascii(ICC_NAME), index + 1, count];
    return concat([Uint8Array.from(head), part]);
  });
  return concat([jpeg.subarray(0, 2), ...segments, jpeg.subarray(2)]);
}

interface Segment {
  marker: number;
  /** Where its content begins, after marker and length. */
  start: number;
  /** Where the next segment begins; a scan's coded data belongs to its header. */
  end: number;
}

function segmentAt(jpeg: Uint8Array, at: number): Segment {
  if (jpeg[at] !== 0xff) throw new RangeError(`jpeg: no marker at byte ${at}`);
  let markerAt = at + 1;
  // A marker may be led by any number of fill bytes.
  while (jpeg[markerAt] === 0xff) markerAt++;
  const marker = jpeg[markerAt];
  if (marker === undefined) throw new RangeError("jpeg: the end is missing");
  const start = markerAt + 3;
  if (marker === MARKER.eoi || isRestart(marker) || marker === 0x01) return { marker, start, end: markerAt + 1 };
  const end = markerAt + 1 + ((jpeg[markerAt + 1] ?? 0) << 8) + (jpeg[markerAt + 2] ?? 0);
  if (end < start || end > jpeg.length) throw new RangeError(`jpeg: segment at byte ${at} does not fit`);
  return { marker, start, end: marker === MARKER.sos ? endOfScan(jpeg, end) : end };
}

/** Coded data runs until a marker that is neither a stuffed zero nor a restart. */
function endOfScan(jpeg: Uint8Array, from: number): number {
  let at = jpeg.indexOf(0xff, from);
  while (at >= 0) {
    const next = jpeg[at + 1];
    if (next === undefined) break;
    if (next !== 0x00 && next !== 0xff && !isRestart(next)) return at;
    at = jpeg.indexOf(0xff, at + (next === 0xff ? 1 : 2));
  }
  throw new RangeError("jpeg: the end is missing");
}

function isKept(jpeg: Uint8Array, { marker, start }: Segment): boolean {
  if (marker === MARKER.com) return false;
  if (marker < MARKER.app0 || marker > MARKER.app15) return true;
  if (marker === MARKER.app0) return holds(jpeg, start, "JFIF\0");
  if (marker === MARKER.app2) return holds(jpeg, start, ICC_NAME);
  return marker === MARKER.app14 && holds(jpeg, start, "Adobe");
}

function holds(jpeg: Uint8Array, at: number, name: string): boolean {
  return ascii(name).every((byte, index) => jpeg[at + index] === byte);
}

function isRestart(marker: number): boolean {
  return marker >= 0xd0 && marker <= 0xd7;
}

function ascii(text: string): number[] {
  return Array.from(text, (letter) => letter.charCodeAt(0));
}

function concat(parts: Uint8Array[]): Uint8Array {
  const whole = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0));
  let at = 0;
  for (const part of parts) {
    whole.set(part, at);
    at += part.length;
  }
  return whole;
}
