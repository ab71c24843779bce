import "server-only";
import { createHash } from "node:crypto";
import { createReadStream } from "node:fs";
import { pipeline } from "node:stream/promises";
import { NextRequest } from "next/server";
import { getUploadedFile } from "@/db/queries/uploads";
import { FAULT_STATUS, fault, type FaultCode } from "@/lib/fault";
import type { UploadVerdict } from "@/lib/photos/photo-upload.schema";
import { routes } from "@/lib/routes";
import { exists } from "@/lib/server/storage";
import { sign, type SignedUpload } from "./signed-url";
import type { UploadDesk } from "./upload-desk";

/**
 * The stand-in tells the app that a file has come in, as the hosted service does: a signed callback, whose answer comes
 * as a call of its own. All in this process.
 * @returns the answer to the phone's PUT: 2xx when the photo is kept, the refusal's status when it is not
 * @throws FaultError "broken" when the app did not answer: the file stays and the phone tries again
 */
export async function tellComplete(desk: UploadDesk, upload: SignedUpload, file: string): Promise<Response> {
  const { config, answers, db } = desk;
  const begun = getUploadedFile(db, upload.customId);
  if (!begun) throw fault("not-found", "This upload was withdrawn.");
  const stored = describe(desk, upload, await md5(file));
  const { metadata } = begun.callback;
  const body = JSON.stringify({ status: "uploaded", file: stored, origin: config.ingestUrl, metadata });
  let verdict: unknown;
  answers.set(upload.key, (answer) => (verdict = answer));
  try {
    await desk.kit(callbackRequest(config, begun.callback.slug, body));
  } finally {
    answers.delete(upload.key);
  }
  // The kit swallows what the app throws: that no answer came is the only sign.
  if (!isVerdict(verdict)) throw fault("broken", "The photo came in, but could not be put away. It is tried again by itself.");
  const { url, appUrl, ufsUrl, fileHash } = stored;
  const answer = { url, appUrl, ufsUrl, fileHash, serverData: verdict };
  if (verdict.state === "kept") return Response.json(answer);
  const { code, sentence } = verdict;
  return Response.json(
    { error: sentence, detail: sentence, code, serverData: verdict },
    { status: statusOf(code) },
  );
}

function describe({ config }: UploadDesk, { customId, key, name, size, type }: SignedUpload, fileHash: string) {
  const origin = new URL(config.callbackUrl).origin;
  // The only address at which a photo is ever served: guarded.
  const url = `${origin}${routes.photo(customId, "original")}`;
  return { name, size, type, customId, key, url, appUrl: url, ufsUrl: url, fileHash, lastModified: Date.now() };
}

function callbackRequest(config: UploadDesk["config"], slug: string, body: string): NextRequest {
  return new NextRequest(`${config.callbackUrl}?slug=${encodeURIComponent(slug)}`, {
    method: "POST",
    body,
    headers: {
      "content-type": "application/json",
      "uploadthing-hook": "callback",
      "x-uploadthing-signature": sign(body, config.apiKey),
    },
  });
}

/** Empty when the file was put away before: the phone asks again because it missed our answer. */
async function md5(file: string): Promise<string> {
  if (!(await exists(file))) return "";
  const hash = createHash("md5");
  await pipeline(createReadStream(file), hash);
  return hash.digest("hex");
}

function isVerdict(answer: unknown): answer is UploadVerdict {
  const state = typeof answer === "object" && answer !== null && "state" in answer ? answer.state : undefined;
  return state === "kept" || state === "refused";
}

function statusOf(code: string): number {
  return code in FAULT_STATUS ? FAULT_STATUS[code as FaultCode] : 400;
}
