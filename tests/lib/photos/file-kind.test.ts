import { describe, expect, it } from "vitest";
import { fileKind } from "@/lib/photos/file-kind";
import { refusalBeforeSending, tooLargeWords } from "@/lib/photos/photo-refusals";
import { photoPath } from "@/lib/photos/photo-path";

const bytes = (latin: string) => Uint8Array.from(latin, (letter) => letter.charCodeAt(0));

describe("what a file is", () => {
  it("is told by its first bytes", () => {
    // Signatures by the formats' own specifications; for HEIF the brands of ISO/IEC 23008-12.
    const known: [string, string][] = [
      ["\xff\xd8\xff\xe1", "jpeg"],
      ["\x89PNG\r\n\x1a\n", "png"],
      ["RIFF\x10\0\0\0WEBPVP8 ", "webp"],
      ["RIFF\x10\0\0\0WAVE", "unknown"],
      ["\0\0\0\x18ftypheic", "heif"],
      ["\0\0\0\x18ftypmif1", "heif"],
      ["\0\0\0\x18ftypavif", "heif"],
      ["\0\0\0\x18ftypmp42", "video"],
      ["GIF89a", "gif"],
      ["II*\0", "tiff"],
      ["MM\0*", "tiff"],
      ["%PDF-1.7", "pdf"],
      ["\n\n<?xml version='1.0'?><SVG>", "svg"],
      ["<!DOCTYPE html><svg>", "svg"],
      ["<!doctype HTML>", "html"],
      ["PK\x03\x04", "archive"],
      ["\x1f\x8b\x08", "archive"],
      ["", "unknown"],
      ["hello", "unknown"],
    ];
    for (const [head, kind] of known) expect(fileKind(bytes(head)), JSON.stringify(head)).toBe(kind);
  });
});

describe("before a photo travels", () => {
  it("the phone is told when it cannot be kept", () => {
    expect(refusalBeforeSending({ size: 0, type: "image/jpeg" })).toContain("0 bytes");
    expect(refusalBeforeSending({ size: 60 * 1024 ** 2, type: "image/jpeg" })).toContain("60 MB");
    expect(refusalBeforeSending({ size: 9, type: "application/pdf" })).toContain("PDF");
    expect(refusalBeforeSending({ size: 9, type: "video/mp4" })).toContain("video");
  });

  it("nothing is said of a kind that only the content can tell", () => {
    for (const type of ["image/jpeg", "image/heic", "", "application/octet-stream"]) {
      expect(refusalBeforeSending({ size: 9, type })).toBeNull();
    }
  });

  it("one byte over the limit is not called the limit itself", () => {
    expect(tooLargeWords(32 * 1024 ** 2 + 1)).toContain("33 MB and the limit is 32 MB");
  });
});

it("a photo lies in its shop's folder, under the first two letters of its number", () => {
  const id = "3f2a91d0-0c4e-4b3f-9a55-0a6a5f1a2b3c";
  expect(photoPath(7, id, "thumb", "image/webp")).toBe(`7/3f/${id}.thumb.webp`);
});
