import { LIMITS } from "@/lib/cases/case-words";

/**
 * Why a photo is not kept: one sentence each, which says what to do. Shared by the phone, which says it before the
 * file travels where it can, and by the server, which has the last word.
 */

const KINDS = "Send a JPEG, PNG, WebP or HEIC photo.";

/** Shortest edge in px on which anything can be told about a deposit; common practice, far below any camera. */
export const LEAST_EDGE_PX = 40;

export const REFUSALS = {
  empty: "The file is empty (0 bytes). Take the photo again while the part is in your hand.",
  pdf: `This is a PDF, not a photo. ${KINDS}`,
  svg: `This is a drawing (SVG), not a photo. ${KINDS}`,
  gif: `This is a GIF, not a photo. ${KINDS}`,
  tiff: `This is a TIFF, which we do not keep. ${KINDS}`,
  html: `This is a web page, not a photo. ${KINDS}`,
  video: "This is a video. Take a still photo of the part.",
  archive: `This is a packed file, not a photo. ${KINDS}`,
  unknown: `This file is not a photo that we can read. ${KINDS}`,
  damaged: "The photo is damaged: part of it is missing. Take it again while the part is in your hand.",
  slow: "The photo took too long to open. Take it again with the phone's normal setting.",
  heicUnreadable: "The HEIC photo could not be opened. Set the phone's camera to JPEG and take it again.",
  tooManyPixels: `The photo has more than ${LIMITS.photoPixels / 1e6} megapixels. Take it again with the phone's normal setting.`,
  oneAtATime: "Send one photo at a time.",
  notYours: "This photo was begun by somebody else. Take it again under your own name.",
  gone: "Your account can no longer add photos. Ask the owner.",
} as const;

/**
 * @param bytes size of the file
 * @example tooLargeWords(60 * 1024 * 1024) starts "The photo is 60 MB and the limit is 32 MB."
 */
export function tooLargeWords(bytes: number): string {
  const limit = LIMITS.photoBytes / 1024 ** 2;
  const shown = Math.max(limit + 1, Math.round(bytes / 1024 ** 2));
  return `The photo is ${shown} MB and the limit is ${limit} MB. Take it again with the phone's normal setting.`;
}

/** @param width, height in px, upright */
export function tooSmallWords(width: number, height: number): string {
  return `The photo is only ${width} × ${height} px. Take it again with the camera; ${LEAST_EDGE_PX} px is the least.`;
}

/** Kinds that a browser names and that are surely no photo: said before a byte has travelled. */
const REFUSED_TYPES: Record<string, string> = {
  "application/pdf": REFUSALS.pdf,
  "image/svg+xml": REFUSALS.svg,
  "image/gif": REFUSALS.gif,
  "image/tiff": REFUSALS.tiff,
  "text/html": REFUSALS.html,
};

/**
 * What can be said of a file from its name card alone.
 * @param type MIME type as the browser gives it; it often gives none for HEIC
 * @returns the sentence, or null when the content has to decide
 */
export function refusalBeforeSending(file: { size: number; type: string }): string | null {
  if (file.size === 0) return REFUSALS.empty;
  if (file.size > LIMITS.photoBytes) return tooLargeWords(file.size);
  if (file.type.startsWith("video/")) return REFUSALS.video;
  return REFUSED_TYPES[file.type] ?? null;
}
