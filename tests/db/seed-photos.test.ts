import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import exifReader from "exif-reader";
import sharp from "sharp";
import { describe, expect, it } from "vitest";
import { BASE_METALS, SHELF_CLASSES, type ShelfClass } from "@/lib/cases/case-words";
import { encodeJpeg } from "../../db/seed/photos/encode";
import { outlineRings } from "../../db/seed/photos/outline";
import { PART_SHAPES, type PartSpec } from "../../db/seed/photos/part-spec";
import { renderPart } from "../../db/seed/photos/render";
import { renderMany } from "../../db/seed/photos/render-many";
import { varySpec } from "../../db/seed/photos/vary";
import { CORNERS, makeJpeg, PHONE_PART } from "../fixtures/photos";

// The decoder ships no types.
const decodeHeic: (input: {
  buffer: Uint8Array;
}) => Promise<{ width: number; height: number; data: Uint8ClampedArray }> = createRequire(import.meta.url)(
  "heic-decode",
);

const FAULTS = SHELF_CLASSES.filter((name) => name !== "sound");

function small(changes: Partial<PartSpec> = {}): PartSpec {
  return {
    shape: "coupon",
    fault: "sound",
    baseMetal: "steel",
    seed: 7,
    width: 96,
    height: 72,
    bed: "tray",
    ...changes,
  };
}

/** Each shape sound, to compare its faults with. */
const SOUND_PARTS = new Map(PART_SHAPES.map((shape) => [shape, renderPart(small({ shape }))]));

/** Mean difference from the sound part a part pixel and channel, in 8-bit levels. */
function differenceFromSound(spec: PartSpec): number {
  const first = SOUND_PARTS.get(spec.shape);
  if (!first) throw new Error(`no sound ${spec.shape}`);
  const second = renderPart(spec);
  let sum = 0;
  let count = 0;
  first.partMask.forEach((on, pixel) => {
    if (on === 0) return;
    for (let channel = 0; channel < 3; channel++) {
      sum += Math.abs((first.data[pixel * 3 + channel] ?? 0) - (second.data[pixel * 3 + channel] ?? 0));
      count++;
    }
  });
  return sum / count;
}

describe("rendered part photos", () => {
  it("the same spec gives the same bytes, another seed does not", () => {
    const spec = small({ fault: "underactivation", baseMetal: "brass", glove: true, greyCard: true });
    const first = renderPart(spec);
    renderPart(small({ fault: "burning", seed: 3 }));
    expect(Buffer.compare(renderPart(spec).data, first.data)).toBe(0);
    expect(Buffer.compare(renderPart({ ...spec, seed: 8 }).data, first.data)).not.toBe(0);
  });

  it("a photo is three bytes a pixel with a mask of the same size", () => {
    const photo = renderPart(small({ width: 64, height: 50 }));
    expect([photo.width, photo.height, photo.data.length, photo.partMask.length]).toEqual([64, 50, 9600, 3200]);
  });

  it("a sound part reads as copper on every shape and every base metal", () => {
    for (const [shape, { truth }] of SOUND_PARTS) expect(truth.copperShare, shape).toBeGreaterThanOrEqual(0.97);
    for (const baseMetal of BASE_METALS) {
      expect(renderPart(small({ baseMetal })).truth.copperShare, baseMetal).toBeGreaterThanOrEqual(0.97);
    }
  });

  it.each(SHELF_CLASSES)("%s: what is copper, bare and dark makes up the whole part", (fault) => {
    for (const shape of ["coupon", "pin"] as const) {
      const { truth, partMask } = renderPart(small({ fault, shape, amount: 1.3, seed: 21 }));
      expect(truth.copperShare + truth.bareShare + truth.darkShare).toBeCloseTo(1, 12);
      const { outline, card, ...shares } = truth;
      for (const share of Object.values(shares)) {
        expect(share).toBeGreaterThanOrEqual(0);
        expect(share).toBeLessThanOrEqual(1);
      }
      expect(card).toBeUndefined();
      expect(outline.length).toBeGreaterThan(0);
      expect(truth.partShare).toBeCloseTo(partMask.reduce((sum, on) => sum + on, 0) / partMask.length, 12);
    }
  });

  // Bare metal, dark smut or neither is how product.md describes each class; the figures are this shop's choice of how bad a bad one is.
  it.each([
    ["dewetting", "bareShare"],
    ["underactivation", "bareShare"],
    ["no-deposit", "bareShare"],
    ["peeling", "bareShare"],
    ["immersion-deposit", "bareShare"],
    ["overactivation", "darkShare"],
    ["burning", "darkShare"],
  ] as const)("%s has a %s above three in a hundred on every shape", (fault, share) => {
    for (const shape of PART_SHAPES)
      expect(renderPart(small({ fault, shape })).truth[share], shape).toBeGreaterThan(0.03);
  });

  it.each(FAULTS)("%s can be told from a sound part on every shape", (fault: ShelfClass) => {
    // Two sound parts of the same seed differ by nothing; 1.5 levels over the whole part is a mark that shows in a thumbnail.
    for (const shape of PART_SHAPES) expect(differenceFromSound(small({ fault, shape })), shape).toBeGreaterThan(1.5);
  });

  it("the snap and the re-strike of one seed show the part in the same place", () => {
    const snap = renderPart(small({ fault: "dewetting", shape: "bracket" }));
    expect(Buffer.compare(snap.partMask, renderPart(small({ shape: "bracket" })).partMask)).toBe(0);
  });

  it("a worse fault covers more of the part", () => {
    const bare = (amount: number) => renderPart(small({ fault: "dewetting", amount })).truth.bareShare;
    expect(bare(0.4)).toBeLessThan(bare(0.8));
    expect(bare(0.8)).toBeLessThan(bare(1.3));
  });

  it("bare brass is yellower than bare steel", () => {
    const blueOfBare = (baseMetal: "brass" | "steel") => {
      const { data, copperMap, partMask } = renderPart(
        small({ fault: "no-deposit", baseMetal, light: { warmth: 0, exposure: 1 } }),
      );
      let red = 0;
      let blue = 0;
      partMask.forEach((on, pixel) => {
        if (on === 0 || (copperMap[pixel] ?? 255) > 20) return;
        red += data[pixel * 3] ?? 0;
        blue += data[pixel * 3 + 2] ?? 0;
      });
      return blue / red;
    };
    expect(blueOfBare("brass")).toBeLessThan(0.75);
    expect(blueOfBare("steel")).toBeGreaterThan(0.9);
  });

  it("refuses a spec that cannot be rendered and names the field", () => {
    expect(() => renderPart(small({ width: 0 }))).toThrow(/width/);
    expect(() => renderPart(small({ amount: 4 }))).toThrow(/amount/);
    expect(() => renderPart(small({ seed: 1.5 }))).toThrow(/seed/);
    expect(() => renderPart(small({ zoom: 0 }))).toThrow(/zoom/);
    expect(() => renderPart(small({ zoom: 8, centre: { x: 9, y: 9 } }))).toThrow(/centre/);
  });
});

describe("the part's outline", () => {
  it("walks a square and its hole, outer ring first", () => {
    // A 12 x 12 square from (2, 3) with an 8 x 8 hole from (4, 5), in a 20 x 20 photo: corners worked out by hand.
    const mask = new Uint8Array(400);
    for (let y = 3; y < 15; y++)
      for (let x = 2; x < 14; x++) mask[y * 20 + x] = x >= 4 && x < 12 && y >= 5 && y < 13 ? 0 : 1;
    const [outer, hole, ...more] = outlineRings(mask, 20, 20);
    expect(more).toEqual([]);
    expect(extent(outer)).toEqual([0.1, 0.15, 0.7, 0.75]);
    expect(extent(hole)).toEqual([0.2, 0.25, 0.6, 0.65]);
  });

  it("an empty photo has no outline", () => {
    expect(outlineRings(new Uint8Array(100), 10, 10)).toEqual([]);
  });

  function extent(ring: [number, number][] = []): number[] {
    const xs = ring.map(([x]) => x);
    const ys = ring.map(([, y]) => y);
    return [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)];
  }
});

describe("encoded photos", () => {
  it("say that they are rendered and when they were taken", async () => {
    const jpeg = await encodeJpeg(small(), { capturedAt: Date.UTC(2026, 5, 22, 8, 14, 30) });
    const exif = exifReader((await sharp(jpeg).metadata()).exif ?? Buffer.alloc(0));
    expect(exif.Image?.ImageDescription).toBe("Rendered demo photo");
    expect(exif.Photo?.DateTimeOriginal).toEqual(new Date("2026-06-22T08:14:30Z"));
    expect(exif.GPSInfo).toBeUndefined();
  });

  it("carry a position when one is asked for", async () => {
    const jpeg = await makeJpeg({ width: 32, height: 24, gps: { latitude: 51.4779, longitude: -0.0015 } });
    const exif = exifReader((await sharp(jpeg).metadata()).exif ?? Buffer.alloc(0));
    // 51.4779 degrees is 51 degrees 28 minutes 40.44 seconds north; 0.0015 degrees is 5.4 seconds, west.
    expect(exif.GPSInfo).toMatchObject({
      GPSLatitudeRef: "N",
      GPSLatitude: [51, 28, 40.44],
      GPSLongitudeRef: "W",
      GPSLongitude: [0, 0, 5.4],
    });
  });

  // What each tag does to the pixels: reference/exif_orientation.csv, after TIFF 6.0, checked there against libvips.
  it.each([1, 2, 3, 4, 5, 6, 7, 8])("orientation %i shows upright when it is obeyed", async (orientation) => {
    const jpeg = await makeJpeg({ width: 64, height: 48, orientation, quality: 95 });
    const stored = await sharp(jpeg).metadata();
    expect(stored.orientation).toBe(orientation);
    expect([stored.width, stored.height]).toEqual(orientation > 4 ? [48, 64] : [64, 48]);
    const { data, info } = await sharp(jpeg).autoOrient().raw().toBuffer({ resolveWithObject: true });
    expect([info.width, info.height]).toEqual([64, 48]);
    const pixel = (x: number, y: number) => [...data.subarray((y * 64 + x) * 3, (y * 64 + x) * 3 + 3)];
    expectNear(pixel(6, 6), CORNERS.topLeft);
    expectNear(pixel(57, 6), CORNERS.topRight);
    expectNear(pixel(6, 41), CORNERS.bottomLeft);
    expectNear(pixel(57, 41), CORNERS.bottomRight);
  });

  it("rendered on threads are the same files in the same order", async () => {
    const orders = (["dewetting", "sound", "burning"] as const).map((fault, index) => ({
      ...varySpec({ shape: "shell", fault, baseMetal: "brass", seed: index, width: 96, height: 72 }),
      capturedAt: Date.UTC(2026, 5, index + 1),
    }));
    const heard: number[] = [];
    const jpegs = await renderMany(orders, { workers: 2, onDone: (ready) => heard.push(ready) });
    const alone = await Promise.all(orders.map((order) => encodeJpeg(order, order)));
    expect(jpegs.map((jpeg, index) => jpeg.equals(alone[index] ?? Buffer.alloc(0)))).toEqual([true, true, true]);
    expect(heard).toEqual([1, 2, 3]);
  });

  it("one that cannot be rendered is named, and the threads end", async () => {
    await expect(renderMany([small(), small({ amount: 9 })], { workers: 1 })).rejects.toThrow(/photo 1 .*amount/);
  });
});

describe("the committed phone photos", () => {
  it("part.jpg is stored turned and holds time and position", async () => {
    const stored = await sharp(readFileSync(PHONE_PART.jpeg)).metadata();
    expect(stored).toMatchObject({ format: "jpeg", ...PHONE_PART.jpegStored });
    const exif = exifReader(stored.exif ?? Buffer.alloc(0));
    expect(exif.Photo?.DateTimeOriginal).toEqual(new Date(PHONE_PART.capturedAt));
    expect(exif.GPSInfo?.GPSLatitudeRef).toBe("N");
  });

  it("part.heic is real HEVC, and a decoder without sharp finds the same part in it", async () => {
    const bytes = readFileSync(PHONE_PART.heic);
    const stored = await sharp(bytes).metadata();
    expect(stored).toMatchObject({ format: "heif", compression: "hevc", ...PHONE_PART.heicUpright });
    expect(exifReader(stored.exif ?? Buffer.alloc(0)).GPSInfo?.GPSLatitudeRef).toBe("N");
    const { width, height, data } = await decodeHeic({ buffer: bytes });
    expect({ width, height }).toEqual(PHONE_PART.heicUpright);
    // The ring's left rim in the middle row is copper or brass, so redder than blue; its bore shows the grey tray.
    const at = (x: number, y: number) => [...data.slice((y * width + x) * 4, (y * width + x) * 4 + 3)];
    const [rimRed = 0, , rimBlue = 0] = at(320, 450);
    expect(rimRed - rimBlue).toBeGreaterThan(30);
    const [boreRed = 0, , boreBlue = 0] = at(600, 450);
    expect(Math.abs(boreRed - boreBlue)).toBeLessThan(20);
  });
});

function expectNear(found: number[], wanted: readonly number[]): void {
  wanted.forEach((value, channel) => expect(Math.abs((found[channel] ?? 0) - value)).toBeLessThan(16));
}
