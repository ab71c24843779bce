import { randomUUID } from "node:crypto";
import http from "node:http";
import type { AddressInfo } from "node:net";
import { NextRequest } from "next/server";
import { afterEach, beforeEach, expect, it, vi } from "vitest";
import { readEnv } from "@/lib/env";
import { sign } from "@/lib/server/uploads/signed-url";
import { uploadConfig } from "@/lib/server/uploads/upload-config";
import { goodJpeg } from "@/tests/fixtures/hostile";
import { jobRows, photoRow } from "@/tests/fixtures/photo-rows";
import { makeTestDesk, ORIGIN, SECRET, type TestDesk } from "@/tests/fixtures/upload-desk";

/** What the hosted service's own side was asked, by path. */
let calls: { path: string; body: Record<string, unknown> }[];
let files: Map<string, Buffer>;
let service: http.Server;
let address: string;
let t: TestDesk;

const API_KEY = "sk_live_of_the_hosted_service";

beforeEach(async () => {
  calls = [];
  files = new Map();
  service = http.createServer(async (request, response) => {
    const file = files.get(request.url ?? "");
    if (request.method === "GET") return void response.writeHead(file ? 200 : 404).end(file);
    const chunks: Buffer[] = [];
    for await (const chunk of request) chunks.push(chunk as Buffer);
    calls.push({ path: request.url ?? "", body: JSON.parse(Buffer.concat(chunks).toString()) });
    response.writeHead(200, { "content-type": "application/json" });
    response.end(JSON.stringify({ ok: true, success: true, deletedCount: 1 }));
  });
  await new Promise<void>((resolve) => service.listen(0, "127.0.0.1", resolve));
  address = `http://127.0.0.1:${(service.address() as AddressInfo).port}`;
  vi.stubEnv("UPLOADTHING_API_URL", address);
  const token = Buffer.from(JSON.stringify({ apiKey: API_KEY, appId: "shopapp", regions: ["fra1"] })).toString(
    "base64",
  );
  // The environment alone makes the difference.
  t = await makeTestDesk({ UPLOADTHING_TOKEN: token, UPLOADTHING_INGEST_URL: `${address}/ingest` });
});
afterEach(async () => {
  vi.unstubAllEnvs();
  await t.close();
  await new Promise((resolve) => service.close(resolve));
});

/** The service says that a file has come in. */
function callback(photoId: string, key: string, size: number) {
  const { shopId, members } = t.shop;
  const metadata = { photoId, shopId, memberId: members.plater.memberId, purpose: "suspect", takenAt: null };
  const url = `${address}/f/${key}`;
  const file = {
    name: "part.jpg",
    size,
    type: "image/jpeg",
    customId: photoId,
    key,
    url,
    appUrl: url,
    ufsUrl: url,
    fileHash: "",
  };
  const body = JSON.stringify({ status: "uploaded", file, origin: `${address}/ingest`, metadata });
  return t.desk.kit(
    new NextRequest(`${ORIGIN}/api/uploadthing?slug=photo`, {
      method: "POST",
      body,
      headers: {
        "content-type": "application/json",
        "uploadthing-hook": "callback",
        "x-uploadthing-signature": sign(body, API_KEY),
      },
    }),
  );
}

it("with the hosted service's variables the phone is sent there, and the stand-in takes nothing", async () => {
  const phone = t.clientOf(t.shop.members.plater);
  const { url } = await phone.place({ content: await goodJpeg() });
  expect(url.startsWith(`${address}/ingest/`)).toBe(true);
  expect(calls.map((call) => call.path)).toEqual(["/ingest/route-metadata"]);
  expect((await phone.put(url, await goodJpeg())).status).toBe(404);
});

it("a photo that came in there is fetched, kept here and removed there; being told twice changes nothing", async () => {
  const [photoId, content] = [randomUUID(), await goodJpeg()];
  files.set("/f/KEY1", content);
  await callback(photoId, "KEY1", content.length);
  files.delete("/f/KEY1");
  await callback(photoId, "KEY1", content.length);
  expect(photoRow(t.db, photoId)).toMatchObject({ state: "processing", bytes: content.length });
  expect(jobRows(t.db)).toHaveLength(1);
  expect(await t.files()).toEqual([`${t.shop.shopId}/${photoId.slice(0, 2)}/${photoId}.received`]);
  expect(calls.map((call) => call.path)).toEqual([
    "/v6/deleteFiles",
    "/ingest/callback-result",
    "/ingest/callback-result",
  ]);
  expect(calls[1]?.body).toEqual({ fileKey: "KEY1", callbackData: { state: "kept" } });
});

it("what came in there and is no photo leaves nothing, here or there, and the phone is told why", async () => {
  files.set("/f/KEY2", Buffer.from("%PDF-1.7"));
  await callback(randomUUID(), "KEY2", 8);
  expect(await t.files()).toEqual([]);
  expect(calls[0]?.path).toBe("/v6/deleteFiles");
  expect(calls[1]?.body).toMatchObject({
    callbackData: { state: "refused", sentence: expect.stringContaining("PDF") },
  });
});

it("without any of its variables the app is its own upload service", () => {
  const config = uploadConfig(readEnv({ NEXTAUTH_URL: ORIGIN, NEXTAUTH_SECRET: SECRET }));
  expect(config).toMatchObject({ isLocal: true, ingestUrl: `${ORIGIN}/api/ingest` });
});
