/** What a file is by its first bytes, whatever its name says. */
export type FileKind =
  "jpeg" | "png" | "webp" | "heif" | "gif" | "tiff" | "pdf" | "svg" | "html" | "video" | "archive" | "unknown";

/** How many first bytes `fileKind` wants. */
export const HEAD_BYTES = 1024;

/** HEIF brands that hold a still picture (ISO/IEC 23008-12 and the AVIF specification). */
const STILL_BRANDS = new Set(["heic", "heix", "heim", "heis", "hevc", "hevx", "mif1", "msf1", "avif", "avis"]);

const MAGIC: { kind: FileKind; bytes: readonly number[] }[] = [
  { kind: "jpeg", bytes: [0xff, 0xd8, 0xff] },
  { kind: "png", bytes: [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a] },
  { kind: "gif", bytes: [0x47, 0x49, 0x46, 0x38] },
  { kind: "tiff", bytes: [0x49, 0x49, 0x2a, 0x00] },
  { kind: "tiff", bytes: [0x4d, 0x4d, 0x00, 0x2a] },
  { kind: "tiff", bytes: [0x49, 0x49, 0x2b, 0x00] },
  { kind: "tiff", bytes: [0x4d, 0x4d, 0x00, 0x2b] },
  { kind: "archive", bytes: [0x50, 0x4b, 0x03, 0x04] },
  { kind: "archive", bytes: [0x1f, 0x8b] },
];

/**
 * Names a file by its first bytes. Only jpeg, png, webp and heif go on to the decoder; the rest is named so that the
 * refusal can say what it was.
 * @param head the first bytes, HEAD_BYTES of them where the file has as many; empty gives "unknown"
 * @example fileKind(Uint8Array.of(0xff, 0xd8, 0xff, 0xe0)) === "jpeg"
 * Source of the signatures: the file format specifications (ITU T.81, PNG, RFC 9649, TIFF 6.0, ISO 32000).
 */
export function fileKind(head: Uint8Array): FileKind {
  for (const { kind, bytes } of MAGIC) {
    if (bytes.every((byte, at) => head[at] === byte)) return kind;
  }
  const text = Array.from(head.subarray(0, HEAD_BYTES), (byte) => String.fromCharCode(byte)).join("");
  if (text.startsWith("RIFF") && text.slice(8, 12) === "WEBP") return "webp";
  if (text.slice(4, 8) === "ftyp") return STILL_BRANDS.has(text.slice(8, 12)) ? "heif" : "video";
  if (text.includes("%PDF-")) return "pdf";
  return textKind(text.toLowerCase());
}

function textKind(text: string): FileKind {
  if (text.includes("<svg")) return "svg";
  return /<!doctype html|<html|<head|<body|<script/.test(text) ? "html" : "unknown";
}
