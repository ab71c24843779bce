import fs from "node:fs/promises";
import path from "node:path";
import { randomUUID } from "node:crypto";
import sharp from "sharp";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { photoPath } from "@/lib/photos/photo-path";
import { photoSizesJob, givePhotoUp } from "@/lib/server/images/photo-sizes-job";
import { startJobRunner, waitAfter, type JobHandlers } from "@/lib/server/job-runner";
import { servePhoto } from "@/lib/server/uploads/serve-photo";
import { sweepUploads } from "@/lib/server/uploads/sweep";
import { takeBackPhoto } from "@/lib/server/uploads/withdraw";
import { insertMember, insertShop } from "@/tests/fixtures/crew-factory";
import { goodJpeg } from "@/tests/fixtures/hostile";
import { jobRows, photoRow, sizeRows } from "@/tests/fixtures/photo-rows";
import { PHONE_PART } from "@/tests/fixtures/photos";
import { makeCase } from "@/tests/fixtures/shop-factory";
import { makeTestDesk, type TestDesk } from "@/tests/fixtures/upload-desk";

let t: TestDesk;
let phone: ReturnType<TestDesk["clientOf"]>;
let photoId: string;
const clock = { at: 0 };
const DAY_MS = 86_400_000;

beforeEach(async () => {
  t = await makeTestDesk();
  phone = t.clientOf(t.shop.members.plater);
  photoId = randomUUID();
  clock.at = Date.now() + 1_000;
});
afterEach(() => t.close());

/** Works until nothing is due, as the server does, with the given handler for photos. */
async function work(
  run: JobHandlers["photo-sizes"]["run"] = (db, payload, now) => photoSizesJob(db, payload, now, t.root),
) {
  const idle = { run: async () => undefined };
  const handlers = { "photo-sizes": { run, giveUp: givePhotoUp }, "send-mail": idle, "second-look-digest": idle };
  const runner = startJobRunner({ db: t.db, handlers, now: () => clock.at });
  await runner.settled();
  await runner.stop();
}

const get = (
  size: "thumb" | "view" | "original",
  member = t.shop.members.plater,
  headers: Record<string, string> = {},
) => servePhoto(t.db, member, { id: photoId, size }, new Request("http://shop.example", { headers }), t.root);

describe("a photo's sizes", () => {
  it("stand on the disk and in the rows together, and what came in is gone", async () => {
    await phone.upload({ content: await goodJpeg(), photoId });
    await work();
    expect(photoRow(t.db, photoId)).toMatchObject({ state: "ready", readyAt: clock.at });
    const rows = sizeRows(t.db, photoId);
    expect(rows.map((row) => row.size)).toEqual(["original", "thumb", "view"]);
    expect(await t.files()).toEqual(rows.map((row) => row.path).toSorted());
    for (const row of rows) expect((await fs.stat(path.join(t.root, row.path))).size).toBe(row.bytes);
    expect(jobRows(t.db).map((job) => job.state)).toEqual(["done"]);
  });

  it("come out of a phone's HEIC, with the time from its camera and without the place", async () => {
    const content = await fs.readFile(PHONE_PART.heic);
    expect((await phone.upload({ content, photoId, name: "IMG_0007.HEIC", type: "" })).status).toBe(200);
    await work();
    expect(photoRow(t.db, photoId)).toMatchObject({
      state: "ready",
      format: "heif",
      takenAt: PHONE_PART.capturedAt,
      ...PHONE_PART.heicUpright,
    });
    const original = sizeRows(t.db, photoId)[0];
    expect(original).toMatchObject({ size: "original", mime: "image/jpeg", ...PHONE_PART.heicUpright });
    expect((await sharp(path.join(t.root, original?.path ?? "")).metadata()).exif).toBeUndefined();
    expect(await t.files()).toHaveLength(3);
  });

  it("come out of a phone's JPEG that was held upright, upright", async () => {
    await phone.upload({ content: await fs.readFile(PHONE_PART.jpeg), photoId });
    await work();
    expect(photoRow(t.db, photoId)).toMatchObject({ takenAt: PHONE_PART.capturedAt, ...PHONE_PART.jpegUpright });
  });

  it("are not shown before they all stand", async () => {
    await phone.upload({ content: await goodJpeg(), photoId });
    await expect(get("thumb")).rejects.toThrow("still being prepared");
    await work();
    expect((await get("thumb")).status).toBe(200);
  });
});

describe("a job that was killed", () => {
  it("runs again after the next start, and the photo is whole", async () => {
    await phone.upload({ content: await goodJpeg(), photoId });
    // Killed in the middle: half a size lies on the disk, the job is marked as running, and nobody works on it any more.
    const half = path.join(t.root, photoPath(t.shop.shopId, photoId, "thumb", "image/webp"));
    await new Promise<void>((killed) => {
      void work(async () => {
        await fs.writeFile(`${half}.part`, "half a picture");
        killed();
        return new Promise(() => undefined);
      });
    });
    expect(photoRow(t.db, photoId)?.state).toBe("processing");
    expect(jobRows(t.db)[0]?.state).toBe("running");
    await expect(get("thumb")).rejects.toThrow("still being prepared");
    await work();
    expect(photoRow(t.db, photoId)?.state).toBe("ready");
    expect(sizeRows(t.db, photoId)).toHaveLength(3);
    expect(await t.files()).toHaveLength(3);
  });

  it("tries again with longer and longer waits, then the photo says why it is not kept", async () => {
    await phone.upload({ content: await goodJpeg(), photoId });
    const tries: number[] = [];
    const start = clock.at;
    for (let round = 0; round < 8; round++) {
      await work(async () => {
        tries.push(clock.at - start);
        throw new Error("the disk is full");
      });
      clock.at += 700_000;
    }
    expect(tries).toHaveLength(5);
    // 10 s, then four times as long each: the rule that waitAfter documents.
    expect([1, 2, 3, 4, 5].map(waitAfter)).toEqual([10_000, 40_000, 160_000, 640_000, null]);
    expect(jobRows(t.db)[0]?.state).toBe("failed");
    expect(photoRow(t.db, photoId)).toMatchObject({
      state: "refused",
      refusal: expect.stringContaining("Take it again"),
    });
  });

  it("whose file is gone is given up at once", async () => {
    await phone.upload({ content: await goodJpeg(), photoId });
    await fs.rm(path.join(t.root, (await t.files())[0] ?? ""));
    await work();
    expect(photoRow(t.db, photoId)).toMatchObject({ state: "refused", refusal: expect.stringContaining("gone") });
    // And may be sent anew.
    expect((await phone.upload({ content: await goodJpeg(), photoId })).status).toBe(200);
    await work();
    expect(photoRow(t.db, photoId)?.state).toBe("ready");
  });
});

describe("a stored photo", () => {
  beforeEach(async () => {
    await phone.upload({ content: await goodJpeg(), photoId, name: "secret customer.jpg" });
    await work();
  });

  it("is sent with headers that let this browser, and no proxy, keep it for good", async () => {
    const answer = await get("view");
    expect(Object.fromEntries(answer.headers)).toMatchObject({
      "cache-control": "private, max-age=31536000, immutable",
      "content-type": "image/webp",
      "x-content-type-options": "nosniff",
      "content-disposition": expect.stringMatching(/^inline; filename="photo-[0-9a-f]{8}-view\.webp"$/),
    });
    const bytes = Buffer.from(await answer.arrayBuffer());
    expect(answer.headers.get("content-length")).toBe(String(bytes.length));
    expect(bytes).toEqual(await fs.readFile(path.join(t.root, sizeRows(t.db, photoId)[2]?.path ?? "")));
  });

  it("is not sent again to a browser that has it", async () => {
    const etag = (await get("view")).headers.get("etag") ?? "";
    const answer = await get("view", t.shop.members.plater, { "if-none-match": etag });
    expect([answer.status, await answer.text()]).toEqual([304, ""]);
  });

  it("that no case holds is seen only by whoever took it", async () => {
    await expect(get("thumb", t.shop.members.senior)).rejects.toThrow("not here");
    makeCase(t.db, t.shop, { photoIds: [photoId] });
    expect((await get("thumb", t.shop.members.senior)).status).toBe(200);
  });

  it("is never seen by another shop, whoever asks there", async () => {
    makeCase(t.db, t.shop, { photoIds: [photoId] });
    const stranger = await insertMember(t.db, { shopId: insertShop(t.db), roles: ["owner", "senior"] });
    for (const size of ["thumb", "view", "original"] as const)
      await expect(get(size, stranger)).rejects.toThrow("not here");
  });
});

describe("a photo that is taken back", () => {
  const takeBack = (member = t.shop.members.plater) => takeBackPhoto(t.db, t.root, member, photoId);

  it("leaves nothing, ready or on its way", async () => {
    await phone.upload({ content: await goodJpeg(), photoId });
    await work();
    await takeBack();
    expect([photoRow(t.db, photoId), sizeRows(t.db, photoId), await t.files()]).toEqual([undefined, [], []]);
    const { url } = await phone.place({ content: await goodJpeg(), photoId });
    await phone.put(url, (await goodJpeg()).subarray(0, 1_000));
    await takeBack();
    expect(await t.files()).toEqual([]);
    expect((await phone.put(url, await goodJpeg())).status).toBe(404);
  });

  it("is taken back by nobody else", async () => {
    await phone.upload({ content: await goodJpeg(), photoId });
    await expect(takeBack(t.shop.members.owner)).rejects.toThrow("Somebody else took this photo");
    const stranger = await insertMember(t.db, { shopId: insertShop(t.db), roles: ["owner"] });
    await expect(takeBack(stranger)).rejects.toThrow("not here");
    expect(photoRow(t.db, photoId)?.state).toBe("processing");
  });

  it("stays once a case holds it", async () => {
    await phone.upload({ content: await goodJpeg(), photoId });
    makeCase(t.db, t.shop, { photoIds: [photoId] });
    await expect(takeBack()).rejects.toThrow("A case holds this photo");
    expect(await t.files()).toHaveLength(1);
  });
});

describe("what killed processes and lost phones left", () => {
  it("is cleared at the next start, and nothing else", async () => {
    await phone.upload({ content: await goodJpeg(), photoId });
    await work();
    const stored = await t.files();
    const { url } = await phone.place({ content: await goodJpeg(), photoId: randomUUID() });
    await phone.put(url, (await goodJpeg()).subarray(0, 1_000));
    const folder = `${t.shop.shopId}/ab`;
    await fs.mkdir(path.join(t.root, folder), { recursive: true });
    for (const name of [`${randomUUID()}.view.webp.part`, `${randomUUID()}.received`]) {
      await fs.writeFile(path.join(t.root, folder, name), "half");
    }
    expect(await sweepUploads(t.db, t.root, Date.now())).toBe(0);
    expect(await sweepUploads(t.db, t.root, Date.now() + 2 * DAY_MS)).toBe(3);
    expect(await t.files()).toEqual(stored);
  });
});
