import fs from "node:fs/promises";
import os from "node:os";
import path from "node:path";
import sharp, { type Sharp } from "sharp";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { makeSizes, type MadeSize } from "@/lib/server/images/sizes";
import { goodJpeg, picture } from "@/tests/fixtures/hostile";

let folder: string;
beforeAll(async () => {
  folder = await fs.mkdtemp(path.join(os.tmpdir(), "sizes-"));
});
afterAll(() => fs.rm(folder, { recursive: true }));

async function sizesOf(content: Uint8Array): Promise<Record<MadeSize["size"], MadeSize>> {
  const file = path.join(folder, "received");
  await fs.writeFile(file, content);
  const made = await makeSizes(file);
  const named = Object.fromEntries(made.map((each) => [each.size, each])) as Record<MadeSize["size"], MadeSize>;
  expect(Object.keys(named).toSorted()).toEqual(["original", "thumb", "view"]);
  return named;
}

/** What a phone writes into a photo: who, when, where. */
const withPrivateFacts = (photo: Sharp) =>
  photo
    .withExif({
      IFD0: { Make: "TattleCam", Artist: "Tobias Lindqvist" },
      IFD2: { DateTimeOriginal: "2026:07:14 09:12:00" },
      IFD3: { GPSLatitudeRef: "N", GPSLatitude: "57/1 42/1 0/1", GPSLongitudeRef: "E", GPSLongitude: "11/1 58/1 0/1" },
    })
    .withXmp('<x:xmpmeta xmlns:x="adobe:ns:meta/"><secret>TattleXmp</secret></x:xmpmeta>');

describe("the three sizes", () => {
  it("are a thumbnail of 320 px, a view of 1280 px and the whole picture", async () => {
    const { thumb, view, original } = await sizesOf(await goodJpeg(1600, 1200));
    expect([thumb.width, thumb.height, thumb.mime]).toEqual([320, 240, "image/webp"]);
    expect([view.width, view.height, view.mime]).toEqual([1280, 960, "image/webp"]);
    expect([original.width, original.height, original.mime]).toEqual([1600, 1200, "image/jpeg"]);
    for (const each of [thumb, view, original]) {
      const { width, height } = await sharp(each.content).metadata();
      expect([width, height]).toEqual([each.width, each.height]);
    }
  });

  it("are never larger than the photo", async () => {
    const { thumb, view } = await sizesOf(await goodJpeg(100, 80));
    expect([thumb.width, view.width]).toEqual([100, 100]);
  });

  it("tell nothing of who took the photo, when and where, upright or turned", async () => {
    for (const orientation of [1, 6]) {
      const photo = withPrivateFacts(picture()).withMetadata({ orientation }).jpeg();
      const content = Buffer.concat([await photo.toBuffer(), Buffer.from("TattleTail after the end")]);
      expect(content.includes("TattleCam")).toBe(true);
      for (const { size, content: kept } of Object.values(await sizesOf(content))) {
        const metadata = await sharp(kept).metadata();
        expect([metadata.exif, metadata.xmp, metadata.iptc, metadata.orientation], size).toEqual([
          undefined,
          undefined,
          undefined,
          undefined,
        ]);
        for (const secret of ["Tattle", "Tobias", "GPS", "Exif"])
          expect(Buffer.from(kept).includes(secret), size).toBe(false);
      }
    }
  });

  it("tell nothing when the photo was a PNG or a WebP either", async () => {
    for (const photo of [withPrivateFacts(picture()).png(), withPrivateFacts(picture()).webp()]) {
      for (const { size, content } of Object.values(await sizesOf(await photo.toBuffer()))) {
        for (const secret of ["Tattle", "Tobias"]) expect(Buffer.from(content).includes(secret), size).toBe(false);
      }
    }
  });

  it("keep a JPEG that lies upright pixel for pixel", async () => {
    const content = await withPrivateFacts(picture()).jpeg().toBuffer();
    const { original } = await sizesOf(content);
    const pixels = (file: Uint8Array) => sharp(file).raw().toBuffer();
    expect((await pixels(original.content)).equals(await pixels(content))).toBe(true);
  });
});

describe("the picture lies upright", () => {
  it("for each of the eight ways in which a camera can be held", async () => {
    // tests/fixtures/exif_orientation.csv: TIFF 6.0 / Exif tag 274; its last column was made with another tool.
    const rows = (await fs.readFile("tests/fixtures/exif_orientation.csv", "utf8")).trim().split("\n").slice(1);
    expect(rows).toHaveLength(8);
    for (const row of rows) {
      const cells = row.split(",");
      const upright = (cells[5] ?? "").split("/").map((line) => line.split(" ").map(Number));
      const sizes = await sizesOf(await blocks(Number(cells[0])));
      for (const { size, content } of Object.values(sizes)) {
        const grid = await readBlocks(content, upright[0]?.length ?? 0, upright.length);
        grid.flat().forEach((grey, at) => {
          expect(Math.abs(grey - (upright.flat()[at] ?? NaN)), `${size}, orientation ${cells[0]}`).toBeLessThanOrEqual(
            6,
          );
        });
      }
    }
  });
});

const BLOCK = 60;

/** Two by three grey blocks, 10 40 / 80 120 / 160 200 as stored, marked with how the camera was held. */
function blocks(orientation: number): Promise<Buffer> {
  const stored = Uint8Array.of(10, 40, 80, 120, 160, 200);
  return sharp(stored, { raw: { width: 2, height: 3, channels: 1 } })
    .resize(2 * BLOCK, 3 * BLOCK, { kernel: "nearest" })
    .withMetadata({ orientation })
    .jpeg({ quality: 95 })
    .toBuffer();
}

async function readBlocks(content: Uint8Array, columns: number, rows: number): Promise<number[][]> {
  const { data, info } = await sharp(content).greyscale().raw().toBuffer({ resolveWithObject: true });
  expect([info.width, info.height]).toEqual([columns * BLOCK, rows * BLOCK]);
  const middle = (index: number) => index * BLOCK + BLOCK / 2;
  return Array.from({ length: rows }, (_, row) =>
    Array.from(
      { length: columns },
      (_, column) => data[(middle(row) * info.width + middle(column)) * info.channels] ?? NaN,
    ),
  );
}

describe("the colours of the part", () => {
  /** Copper as it is often drawn (#B87333), stored in a phone's wider colour space. */
  const copper = [184, 115, 51] as const;
  const inPhoneColours = (orientation: number) =>
    sharp({ create: { width: 120, height: 90, channels: 3, background: { r: copper[0], g: copper[1], b: copper[2] } } })
      .withMetadata({ orientation, icc: "p3" })
      .jpeg({ quality: 100, chromaSubsampling: "4:4:4" })
      .toBuffer();

  it("come out the same in every size, though the phone stored them otherwise", async () => {
    for (const orientation of [1, 6]) {
      const content = await inPhoneColours(orientation);
      const stored = await sharp(content, { ignoreIcc: true }).raw().toBuffer();
      expect(Math.abs((stored[0] ?? 0) - copper[0])).toBeGreaterThan(4);
      for (const { size, content: made } of Object.values(await sizesOf(content))) {
        const shown = await sharp(made).toColourspace("srgb").raw().toBuffer();
        copper.forEach((value, channel) => {
          expect(Math.abs((shown[channel] ?? NaN) - value), `${size}, orientation ${orientation}`).toBeLessThanOrEqual(
            4,
          );
        });
      }
    }
  });
});

it("a photo made for print, in four inks, comes out as any other", async () => {
  const print = await picture().toColourspace("cmyk").jpeg().toBuffer();
  expect((await sharp(print).metadata()).space).toBe("cmyk");
  for (const { size, content } of Object.values(await sizesOf(print))) {
    expect((await sharp(content).metadata()).space, size).toBe("srgb");
  }
});
