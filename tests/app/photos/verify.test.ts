import fs from "node:fs/promises";
import os from "node:os";
import path from "node:path";
import sharp from "sharp";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { FaultError } from "@/lib/fault";
import { verifyPhoto } from "@/lib/server/images/verify";
import { goodJpeg, hostileFiles, picture, type HostileFile } from "@/tests/fixtures/hostile";

let folder: string;
let hostile: HostileFile[];

beforeAll(async () => {
  folder = await fs.mkdtemp(path.join(os.tmpdir(), "verify-"));
  hostile = await hostileFiles();
});
afterAll(() => fs.rm(folder, { recursive: true }));

async function look(content: Uint8Array) {
  const file = path.join(folder, "incoming");
  await fs.writeFile(file, content);
  return verifyPhoto(file);
}

describe("a file that is no photo is refused in one sentence that says what to do", () => {
  it("holds for 24 hostile or broken files", async () => {
    expect(hostile).toHaveLength(24);
    for (const { name, content, says } of hostile) {
      const error: unknown = await look(content).catch((thrown: unknown) => thrown);
      expect(error, name).toBeInstanceOf(FaultError);
      if (!(error instanceof FaultError)) continue;
      expect(error.message, name).toMatch(says);
      expect(error.message, name).toMatch(/again|Send|Take|Set/);
    }
    expect(await fs.readdir(folder)).toEqual(["incoming"]);
  });
});

describe("a photo is kept", () => {
  it("whether JPEG, PNG or WebP", async () => {
    for (const [format, content] of [
      ["jpeg", await goodJpeg()],
      ["png", await picture().png().toBuffer()],
      ["webp", await picture().webp().toBuffer()],
    ] as const) {
      expect(await look(content)).toMatchObject({ format, width: 400, height: 300 });
    }
  });

  it("when it is a moving WebP, by its first frame", async () => {
    const frames = [await goodJpeg(), await picture().negate().jpeg().toBuffer()];
    const moving = await sharp(frames, { join: { animated: true } })
      .webp({ loop: 0, delay: [50, 50] })
      .toBuffer();
    expect((await sharp(moving).metadata()).pages).toBe(2);
    expect(await look(moving)).toMatchObject({ format: "webp", width: 400, height: 300 });
  });

  it("with a picture in its place that is not empty", async () => {
    // A thumb hash is 5 bytes at least (its published format: 24 + 16 bits, then the waves).
    const { placeholder } = await look(await goodJpeg());
    expect(Buffer.from(placeholder, "base64").length).toBeGreaterThan(5);
  });
});
