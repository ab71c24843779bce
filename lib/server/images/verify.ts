import "server-only";
import fs from "node:fs/promises";
import type { Metadata } from "sharp";
import { LIMITS } from "@/lib/cases/case-words";
import { fault, FaultError } from "@/lib/fault";
import { fileKind, HEAD_BYTES, type FileKind } from "@/lib/photos/file-kind";
import { LEAST_EDGE_PX, REFUSALS, tooLargeWords, tooSmallWords } from "@/lib/photos/photo-refusals";
import { removeFile } from "@/lib/server/storage";
import { openPicture } from "./decoder";
import { heicToJpeg } from "./heic";
import { makePlaceholder } from "./placeholder";

export interface SoundPhoto {
  format: "jpeg" | "png" | "webp" | "heif";
  /** Edges in px of the upright picture. */
  width: number;
  height: number;
  /** Base64 thumb hash. */
  placeholder: string;
  /** The camera's block of facts, if it left one. */
  exif: Buffer | undefined;
  /** The file to keep: the one that came in, or the JPEG made from a HEIC. */
  file: string;
}

/** What an interlaced PNG takes in memory at once, in bytes, at most. Others are read in strips. */
const MOST_INTERLACED_BYTES = 250 * 1024 * 1024;

/**
 * Looks at a file that came in and decodes it once, whole. Its name and declared type are not asked.
 * @param file path of the whole file
 * @throws FaultError "invalid", "too-large" or "unsupported" with one sentence that says what to do
 */
export async function verifyPhoto(file: string): Promise<SoundPhoto> {
  const metadata = await readMetadata(file);
  const format = photoFormat(metadata.format);
  if (metadata.compression !== "hevc") return { format, exif: metadata.exif, ...(await decodeOnce(file)) };
  const jpeg = `${file}.jpg`;
  await heicToJpeg(file, jpeg, metadata.icc ?? Buffer.alloc(0));
  try {
    return { format, exif: metadata.exif, ...(await decodeOnce(jpeg)) };
  } catch (error) {
    await removeFile(jpeg);
    throw error;
  }
}

async function decodeOnce(file: string) {
  const { width, height } = (await openPicture(file).metadata().catch(refuseUndecodable)).autoOrient;
  if (Math.min(width, height) < LEAST_EDGE_PX) throw fault("invalid", tooSmallWords(width, height));
  const placeholder = await makePlaceholder(file).catch(refuseUndecodable);
  return { width, height, placeholder, file };
}

/**
 * Everything that can be told without decoding.
 * @throws FaultError as above
 */
export async function readMetadata(file: string): Promise<Metadata> {
  const { size } = await fs.stat(file);
  if (size === 0) throw fault("invalid", REFUSALS.empty);
  if (size > LIMITS.photoBytes) throw fault("too-large", tooLargeWords(size));
  const kind = fileKind(await readHead(file));
  if (!isPhotoKind(kind)) throw fault("unsupported", REFUSALS[kind]);
  const metadata = await openPicture(file).metadata().catch(refuseUndecodable);
  // The image library must have seen the same thing as the first bytes said.
  if (metadata.format !== kind) throw fault("unsupported", REFUSALS.unknown);
  demandPixels(metadata);
  return metadata;
}

function demandPixels({ width, height, channels, depth, format, isProgressive }: Metadata): void {
  if (width * height > LIMITS.photoPixels) throw fault("too-large", REFUSALS.tooManyPixels);
  const bytes = width * height * channels * (depth === "ushort" ? 2 : 1);
  if (format === "png" && isProgressive && bytes > MOST_INTERLACED_BYTES) {
    throw fault("too-large", REFUSALS.tooManyPixels);
  }
}

type PhotoKind = SoundPhoto["format"];

function isPhotoKind(kind: FileKind): kind is PhotoKind {
  return kind === "jpeg" || kind === "png" || kind === "webp" || kind === "heif";
}

function photoFormat(format: string): PhotoKind {
  if (format === "jpeg" || format === "png" || format === "webp" || format === "heif") return format;
  throw fault("unsupported", REFUSALS.unknown);
}

async function readHead(file: string): Promise<Uint8Array> {
  const handle = await fs.open(file, "r");
  try {
    const { buffer, bytesRead } = await handle.read(Buffer.alloc(HEAD_BYTES), 0, HEAD_BYTES, 0);
    return buffer.subarray(0, bytesRead);
  } finally {
    await handle.close();
  }
}

/** The image library's complaint in the person's words. */
export function refuseUndecodable(error: unknown): never {
  if (error instanceof FaultError) throw error;
  const message = error instanceof Error ? error.message : String(error);
  if (/pixel limit/i.test(message)) throw refusal("too-large", REFUSALS.tooManyPixels, error);
  if (/timeout/i.test(message)) throw refusal("invalid", REFUSALS.slow, error);
  throw refusal("invalid", REFUSALS.damaged, error);
}

function refusal(code: "invalid" | "too-large", message: string, cause: unknown): FaultError {
  return Object.assign(fault(code, message), { cause });
}
