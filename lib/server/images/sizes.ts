import "server-only";
import fs from "node:fs/promises";
import sharp, { type Metadata, type Sharp } from "sharp";
import { cleanJpeg } from "@/lib/photos/jpeg-segments";
import type { StoredMime } from "@/lib/photos/photo-path";
import type { PhotoSize } from "@/lib/photos/photo-words";
import { openPicture } from "./decoder";
import { ORIGINAL_JPEG_QUALITY } from "./heic";

/** Longest edge in px and the encoder's settings: measured, WebP at these is a third of AVIF's time and near its bytes. */
const THUMB = { edge: 320, quality: 75, effort: 4 } as const;
const VIEW = { edge: 1280, quality: 78, effort: 2 } as const;
/** A see-through picture lies on white. */
const PAPER = "#ffffff";

export interface MadeSize {
  size: PhotoSize;
  mime: StoredMime;
  content: Uint8Array;
  width: number;
  height: number;
}

/**
 * Makes the three sizes of a photo: upright, without what the camera wrote into it.
 * @param file a file that has been verified
 * @throws Error from the image library when it cannot be decoded
 */
export async function makeSizes(file: string): Promise<MadeSize[]> {
  const original = await makeOriginal(file);
  // One decode serves both small sizes; the thumbnail is taken from the view.
  const view = await openPicture(file)
    .resize(VIEW.edge, VIEW.edge, { fit: "inside", withoutEnlargement: true })
    .flatten({ background: PAPER })
    .toColourspace("srgb")
    .raw()
    .toBuffer({ resolveWithObject: true });
  const { width, height, channels } = view.info;
  const raw = { raw: { width, height, channels } };
  const small = await encode("view", sharp(view.data, raw).webp({ quality: VIEW.quality, effort: VIEW.effort }));
  const smallest = await encode(
    "thumb",
    sharp(view.data, raw)
      .resize(THUMB.edge, THUMB.edge, { fit: "inside", withoutEnlargement: true })
      .webp({ quality: THUMB.quality, effort: THUMB.effort }),
  );
  return [smallest, small, original];
}

async function encode(size: PhotoSize, picture: Sharp, mime: StoredMime = "image/webp"): Promise<MadeSize> {
  const { data, info } = await picture.toBuffer({ resolveWithObject: true });
  return { size, mime, content: data, width: info.width, height: info.height };
}

/**
 * The clean original. A JPEG that lies upright keeps its very bytes but for the private parts; any other picture is
 * encoded again, since only that turns it or removes what lies in it.
 */
async function makeOriginal(file: string): Promise<MadeSize> {
  const metadata = await openPicture(file).metadata();
  const untouched = await cleanBytes(file, metadata);
  if (untouched) {
    return { size: "original", mime: "image/jpeg", content: untouched, width: metadata.width, height: metadata.height };
  }
  const picture = openPicture(file).keepIccProfile();
  if (metadata.format === "png") return encode("original", picture.png({ compressionLevel: 6 }), "image/png");
  if (metadata.format === "webp") {
    return encode("original", picture.webp({ quality: ORIGINAL_JPEG_QUALITY, effort: 2 }), "image/webp");
  }
  return encode(
    "original",
    picture.flatten({ background: PAPER }).jpeg({ quality: ORIGINAL_JPEG_QUALITY }),
    "image/jpeg",
  );
}

async function cleanBytes(file: string, { format, orientation = 1, space }: Metadata): Promise<Uint8Array | null> {
  if (format !== "jpeg" || orientation !== 1 || space === "cmyk") return null;
  try {
    return cleanJpeg(await fs.readFile(file));
  } catch (error) {
    // The decoder forgives more than we do in cutting a file up: encode it again instead.
    if (error instanceof RangeError) return null;
    throw error;
  }
}
