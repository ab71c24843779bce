import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cleanJpeg, withColourProfile } from "@/lib/photos/jpeg-segments";

const [SOI, EOI] = [
  [0xff, 0xd8],
  [0xff, 0xd9],
];
const text = (words: string) => [...words].map((letter) => letter.charCodeAt(0));
/** A segment as ITU T.81, B.1.1.4 has it: marker, length with its own two bytes, content. */
const segment = (marker: number, content: number[]) => [
  0xff,
  marker,
  (content.length + 2) >> 8,
  (content.length + 2) & 255,
  ...content,
];
const jpeg = (...parts: number[][]) => Uint8Array.from(parts.flat());

const JFIF = segment(0xe0, text("JFIF\0\x01\x01"));
const EXIF = segment(0xe1, text("Exif\0\0GPS"));
const ICC = segment(0xe2, text("ICC_PROFILE\0\x01\x01profile"));
const MPF = segment(0xe2, text("MPF\0preview"));
const ADOBE = segment(0xee, text("Adobe\0d\0\0\0"));
const COMMENT = segment(0xfe, text("taken by Tobias"));
const TABLE = segment(0xdb, [0, 1, 2, 3]);
/** A scan: its header, then coded data with a stuffed zero and a restart marker. */
const SCAN = [...segment(0xda, [1, 1, 0, 0, 63, 0]), 0x12, 0xff, 0x00, 0x34, 0xff, 0xd0, 0x56];

describe("a cleaned JPEG", () => {
  it("keeps the picture and its colours and drops the rest", () => {
    const dirty = jpeg(SOI, JFIF, EXIF, ICC, MPF, ADOBE, COMMENT, TABLE, SCAN, EOI);
    expect(cleanJpeg(dirty)).toEqual(jpeg(SOI, JFIF, ICC, ADOBE, TABLE, SCAN, EOI));
  });

  it("ends where the picture ends", () => {
    expect(cleanJpeg(jpeg(SOI, TABLE, SCAN, EOI, text("<script>")))).toEqual(jpeg(SOI, TABLE, SCAN, EOI));
  });

  it("keeps every scan of a picture that comes in several", () => {
    const clean = jpeg(SOI, TABLE, SCAN, TABLE, SCAN, EOI);
    expect(cleanJpeg(jpeg(SOI, TABLE, SCAN, COMMENT, TABLE, SCAN, EOI))).toEqual(clean);
  });

  it("is not changed by cleaning it again", () => {
    const once = cleanJpeg(jpeg(SOI, JFIF, EXIF, TABLE, SCAN, EOI));
    expect(cleanJpeg(once)).toEqual(once);
  });

  it("is not made from what has no end or does not add up", () => {
    for (const broken of [
      jpeg(SOI, TABLE, SCAN),
      jpeg(SOI, TABLE, [0x00]),
      jpeg(SOI, [0xff, 0xe1, 0xff, 0xff]),
      jpeg(TABLE),
    ]) {
      expect(() => cleanJpeg(broken)).toThrow(RangeError);
    }
  });

  it("either comes out or is refused, whatever the bytes are", () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 300 }), (tail) => {
        const file = jpeg(SOI, [...tail]);
        try {
          expect(cleanJpeg(file).length).toBeLessThanOrEqual(file.length);
        } catch (error) {
          expect(error).toBeInstanceOf(RangeError);
        }
      }),
    );
  });
});

describe("a colour profile", () => {
  it("is put in front of the picture, in one segment or in as many as it needs", () => {
    const bare = jpeg(SOI, TABLE, SCAN, EOI);
    const small = withColourProfile(bare, Uint8Array.from(text("profile")));
    expect(small).toEqual(jpeg(SOI, segment(0xe2, text("ICC_PROFILE\0\x01\x01profile")), TABLE, SCAN, EOI));
    // ICC.1:2022 B.4: at most 65 519 bytes of profile in a segment, so 70 000 need two.
    const large = withColourProfile(bare, new Uint8Array(70_000));
    expect(large.length).toBe(bare.length + 70_000 + 2 * 18);
    expect(cleanJpeg(large)).toEqual(large);
  });

  it("that is empty changes nothing", () => {
    const bare = jpeg(SOI, TABLE, SCAN, EOI);
    expect(withColourProfile(bare, new Uint8Array())).toEqual(bare);
  });
});
