import sharp, { type Exif, type Sharp } from "sharp";
import type { PartSpec } from "./part-spec";
import { renderPart } from "./render";

/** Degrees, north and east above zero. */
export type Position = { latitude: number; longitude: number };

/** How a rendered photo is stored, as a phone would. */
export type EncodeOptions = {
  /** JPEG quality, 1 to 100; 85 unless said otherwise. */
  quality?: number;
  /** UTC milliseconds, written as DateTimeOriginal with the offset +00:00. */
  capturedAt?: number;
  /** EXIF orientation 1 to 8: pixels are stored turned, so that the photo shows upright. */
  orientation?: number;
  /** Only to prove that a clean original has lost it. */
  gps?: Position;
};

/** What every rendered photo says of itself in ImageDescription. */
export const RENDERED_NOTE = "Rendered demo photo";

/** Renders a spec and encodes it as a JPEG with EXIF. Same spec and options, same bytes, on the same sharp. */
export async function encodeJpeg(spec: PartSpec, options: EncodeOptions = {}): Promise<Buffer> {
  const { data, width, height } = renderPart(spec);
  const image = sharp(data, { raw: { width, height, channels: 3 } });
  return writeJpeg(image, RENDERED_NOTE, options);
}

/** Encodes an upright image: turns it for its orientation tag, and writes the EXIF. */
export async function writeJpeg(upright: Sharp, description: string, options: EncodeOptions = {}): Promise<Buffer> {
  const { quality = 85, orientation = 1 } = options;
  return storeTurned(upright, orientation)
    .withExif(exifFor(description, options))
    .withMetadata({ orientation })
    .jpeg({ quality })
    .toBuffer();
}

/** Turns an upright image the way a camera stores it under that EXIF orientation. Source: TIFF 6.0, tag 274; EXIF 2.32. */
export function storeTurned(upright: Sharp, orientation: number): Sharp {
  switch (orientation) {
    case 1:
      return upright;
    case 2:
      return upright.flop();
    case 3:
      return upright.rotate(180);
    case 4:
      return upright.flip();
    case 5:
      return upright.flop().rotate(270);
    case 6:
      return upright.rotate(270);
    case 7:
      return upright.flop().rotate(90);
    case 8:
      return upright.rotate(90);
    default:
      throw new RangeError(`orientation must be 1 to 8, got ${orientation}`);
  }
}

/** EXIF blocks as sharp takes them: IFD0 image, IFD2 photo, IFD3 position. */
export function exifFor(description: string, { capturedAt, gps }: EncodeOptions): Exif {
  const exif: Exif = { IFD0: { ImageDescription: description } };
  if (capturedAt !== undefined) {
    const stamp = new Date(capturedAt).toISOString().slice(0, 19).replace("T", " ").replaceAll("-", ":");
    exif.IFD2 = { DateTimeOriginal: stamp, OffsetTimeOriginal: "+00:00" };
  }
  if (gps) exif.IFD3 = positionTags(gps);
  return exif;
}

/** Position as EXIF wants it: degrees, minutes and seconds as fractions, and the hemisphere as a letter. */
export function positionTags({ latitude, longitude }: Position): Record<string, string> {
  return {
    GPSLatitudeRef: latitude < 0 ? "S" : "N",
    GPSLatitude: fractions(latitude),
    GPSLongitudeRef: longitude < 0 ? "W" : "E",
    GPSLongitude: fractions(longitude),
  };
}

function fractions(degrees: number): string {
  const hundredths = Math.round(Math.abs(degrees) * 360_000);
  const whole = Math.floor(hundredths / 360_000);
  const minutes = Math.floor((hundredths % 360_000) / 6000);
  return `${whole}/1 ${minutes}/1 ${hundredths % 6000}/100`;
}
