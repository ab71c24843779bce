import { createHash, randomUUID } from "node:crypto";
import fs from "node:fs/promises";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { jobRows, photoRow } from "@/tests/fixtures/photo-rows";
import { insertMember, insertShop } from "@/tests/fixtures/crew-factory";
import { makeCase } from "@/tests/fixtures/shop-factory";
import { goodJpeg, hostileFiles } from "@/tests/fixtures/hostile";
import { makeTestDesk, ORIGIN, type TestDesk } from "@/tests/fixtures/upload-desk";
import { markMemberRemoved } from "@/db/queries/crew-changes";
import { kitConfig, nameSender, photoRouter } from "@/lib/server/uploads/photo-handler";
import { sign } from "@/lib/server/uploads/signed-url";
import { NextRequest } from "next/server";
import { createRouteHandler } from "uploadthing/next";

let t: TestDesk;
let phone: ReturnType<TestDesk["clientOf"]>;
let content: Buffer;

beforeEach(async () => {
  t = await makeTestDesk();
  phone = t.clientOf(t.shop.members.plater);
  content = await goodJpeg();
});
afterEach(() => t.close());

describe("a photo that comes in", () => {
  it("is recorded with the job that makes its sizes, and its bytes are those that were sent", async () => {
    const photoId = randomUUID();
    const answer = await phone.upload({ content, photoId, name: "rim Ø 12 #3.jpg" });
    expect(answer.status).toBe(200);
    expect(await answer.json()).toMatchObject({
      serverData: { state: "kept" },
      // RFC 1321, by node's own crypto.
      fileHash: createHash("md5").update(content).digest("hex"),
    });
    expect(photoRow(t.db, photoId)).toMatchObject({
      state: "processing",
      shopId: t.shop.shopId,
      memberId: t.shop.members.plater.memberId,
      fileName: "rim Ø 12 #3.jpg",
      bytes: content.length,
      width: 400,
      height: 300,
    });
    expect(jobRows(t.db)).toEqual([
      { kind: "photo-sizes", state: "waiting", payload: { photoId, shopId: t.shop.shopId } },
    ]);
    expect(await t.files()).toEqual([`${t.shop.shopId}/${photoId.slice(0, 2)}/${photoId}.received`]);
    expect(await fs.readFile(path.join(t.root, (await t.files())[0] ?? ""))).toEqual(content);
  });

  it("goes on where a broken connection stopped, and the bytes still match", async () => {
    const file = { content, photoId: randomUUID() };
    const { url } = await phone.place(file);
    const half = Math.floor(content.length / 2);
    expect((await phone.put(url, content.subarray(0, half))).status).toBe(408);
    expect(await phone.held(url)).toBe(half);
    // A reload asks for a place again: the same photo gets the same key, and goes on.
    const again = await phone.place(file);
    expect(again.key).toBe(url.split("/").at(-1)?.split("?")[0]);
    expect((await phone.put(again.url, content, await phone.held(again.url))).status).toBe(200);
    expect(await fs.readFile(path.join(t.root, (await t.files())[0] ?? ""))).toEqual(content);
  });

  it("that is sent twice is one photo and one job", async () => {
    const file = { content, photoId: randomUUID() };
    const first = await phone.upload(file);
    const second = await phone.upload(file);
    expect([first.status, second.status]).toEqual([200, 200]);
    expect(jobRows(t.db)).toHaveLength(1);
    expect((await t.files()).filter((name) => name.includes("incoming"))).toEqual([]);
  });

  it("from a byte that we do not hold is told where to go on", async () => {
    const { url } = await phone.place({ content });
    const answer = await phone.put(url, content, 10);
    expect([answer.status, answer.headers.get("x-ut-range-start")]).toEqual([416, "0"]);
  });

  it("joins the case that awaits it", async () => {
    const photoId = randomUUID();
    const { id: caseId } = makeCase(t.db, t.shop, { photoIds: [photoId] });
    expect(photoRow(t.db, photoId)).toMatchObject({ state: "awaited", caseId });
    await phone.upload({ content, photoId });
    expect(photoRow(t.db, photoId)).toMatchObject({ state: "processing", caseId });
  });
});

describe("what is no photo", () => {
  it("leaves no file, no row and no job, whichever of the 24 it is, and the answer says why", async () => {
    for (const { name, type, content: bytes, says } of await hostileFiles()) {
      const answer = await phone.upload({ content: bytes, name, type });
      const body = (await answer.json()) as { detail: string };
      expect(answer.status, name).toBeGreaterThanOrEqual(400);
      expect(answer.status, name).toBeLessThan(500);
      expect(body.detail, name).toMatch(says);
    }
    expect(await t.files()).toEqual([]);
    expect(jobRows(t.db)).toEqual([]);
  });

  it("tells the case that awaited it, and a good photo may still take its place", async () => {
    const photoId = randomUUID();
    makeCase(t.db, t.shop, { photoIds: [photoId] });
    await phone.upload({ content: content.subarray(0, 2_000), photoId });
    expect(photoRow(t.db, photoId)).toMatchObject({ state: "refused", refusal: expect.stringContaining("damaged") });
    expect((await phone.upload({ content, photoId })).status).toBe(200);
    expect(photoRow(t.db, photoId)).toMatchObject({ state: "processing", refusal: null });
  });

  it("is stopped when more comes than was announced", async () => {
    const { url } = await phone.place({ content: content.subarray(0, 5_000) });
    const answer = await phone.put(url, content);
    expect(answer.status).toBe(413);
    expect(await t.files()).toEqual([]);
  });
});

describe("an upload address", () => {
  it("is refused when anything of it was changed", async () => {
    const { url } = await phone.place({ content });
    const changed = [
      url.replace(/x-ut-file-size=\d+/, "x-ut-file-size=9999999"),
      url.replace(/expires=\d+/, `expires=${Date.now() + 9e9}`),
      url.replace(/x-ut-custom-id=[^&]+/, `x-ut-custom-id=${randomUUID()}`),
      `${url.slice(0, -1)}${url.endsWith("0") ? "1" : "0"}`,
      `${url}&x-ut-acl=public-read`,
      url.split("&signature=")[0] ?? "",
    ];
    for (const each of changed) expect((await phone.put(each, content)).status, each).toBe(403);
    expect(await t.files()).toEqual([]);
  });

  it("is refused once it has expired, however well it is signed", async () => {
    const { url } = await phone.place({ content });
    const [unsigned = ""] = url.replace(/expires=\d+/, `expires=${Date.now() - 1}`).split("&signature=");
    const signed = `${unsigned}&signature=${encodeURIComponent(sign(unsigned, t.desk.config.apiKey))}`;
    expect((await phone.put(signed, content)).status).toBe(403);
  });

  it("is not given for another member's photo, nor for another shop's", async () => {
    const photoId = randomUUID();
    await phone.upload({ content, photoId });
    const stranger = await insertMember(t.db, { shopId: insertShop(t.db), roles: ["owner"] });
    for (const member of [t.shop.members.otherPlater, stranger]) {
      expect((await t.clientOf(member).ask({ content, photoId })).status).toBe(403);
    }
    expect(photoRow(t.db, photoId)).toMatchObject({ memberId: t.shop.members.plater.memberId });
  });

  it("is worth nothing once its holder has left the crew", async () => {
    const file = { content, photoId: randomUUID() };
    const { url } = await phone.place(file);
    markMemberRemoved(t.db, t.shop.shopId, t.shop.members.plater.memberId, Date.now());
    const answer = await phone.put(url, content);
    expect(answer.status).toBe(403);
    expect(photoRow(t.db, file.photoId)).toBeUndefined();
    expect(await t.files()).toEqual([]);
  });
});

describe("the callback of the upload service", () => {
  const call = (body: string, signature: string) =>
    t.desk.kit(
      new NextRequest(`${ORIGIN}/api/uploadthing?slug=photo`, {
        method: "POST",
        body,
        headers: {
          "uploadthing-hook": "callback",
          "x-uploadthing-signature": signature,
          "content-type": "application/json",
        },
      }),
    );

  it("is refused when it is forged", async () => {
    const answer = await call(JSON.stringify({ status: "uploaded" }), sign("something else", "sk_wrong"));
    expect(answer.status).toBe(400);
    expect(jobRows(t.db)).toEqual([]);
  });

  it("goes to our own address whatever host the phone named", async () => {
    // The kit would take the address from the request, and the service would then tell a stranger.
    const seen: string[] = [];
    const { POST } = createRouteHandler({
      router: photoRouter(t.desk),
      config: {
        ...kitConfig(t.desk),
        fetch: async (url, init) => {
          seen.push(String((await new Request(url, init).json()).callbackUrl));
          return Response.json({ ok: true });
        },
      },
    });
    const files = [{ name: "part.jpg", size: content.length, type: "image/jpeg", lastModified: 1 }];
    const asked = new NextRequest("http://evil.example/api/uploadthing?actionType=upload&slug=photo", {
      method: "POST",
      headers: { "content-type": "application/json" },
      body: JSON.stringify({ files, input: { photoId: randomUUID(), purpose: "suspect" } }),
    });
    nameSender(asked, t.shop.members.plater);
    expect((await POST(asked)).status).toBe(200);
    expect(seen).toEqual([`${ORIGIN}/api/uploadthing`]);
  });
});
