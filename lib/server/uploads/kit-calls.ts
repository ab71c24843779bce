import "server-only";
import { z } from "zod";
import { registerUpload } from "@/db/queries/uploads";
import { uploadTicket } from "@/lib/photos/photo-upload.schema";
import { isSame } from "./signed-url";
import type { UploadDesk } from "./upload-desk";

type Desk = Omit<UploadDesk, "kit">;

const routeMetadata = z.object({
  fileKeys: z.array(z.string().min(1)).length(1),
  metadata: uploadTicket,
  callbackSlug: z.string(),
});
const callbackResult = z.object({ fileKey: z.string(), callbackData: z.unknown() });

/**
 * The kit's calls to the upload service, answered without leaving the process: over the network the server would wait
 * for itself, at nearly twice the cost.
 */
export async function answerKit(desk: Desk, url: RequestInfo | URL, init?: RequestInit): Promise<Response> {
  const request = new Request(url, init);
  return answerCall(desk, new URL(request.url).pathname.split("/").at(-1) ?? "", request);
}

/**
 * One call of the kit to the service: `route-metadata` before the upload, `callback-result` after it.
 * @param name the last part of the address
 */
export async function answerCall(desk: Desk, name: string, request: Request): Promise<Response> {
  if (!isSame(request.headers.get("x-uploadthing-api-key") ?? "", desk.config.apiKey)) return no(401, "Wrong key");
  const body: unknown = await request.json().catch(() => null);
  if (name === "route-metadata") return keepMetadata(desk, body);
  return name === "callback-result" ? passAnswer(desk, body) : no(404, "No such call");
}

function keepMetadata({ db }: Desk, body: unknown): Response {
  const call = routeMetadata.safeParse(body);
  const key = call.data?.fileKeys[0];
  if (!call.success || !key) return no(400, "Not understood");
  const { metadata, callbackSlug } = call.data;
  const callback = { slug: callbackSlug, metadata };
  registerUpload(db, { customId: metadata.photoId, key, callback, now: Date.now() });
  return Response.json({ ok: true });
}

function passAnswer({ answers }: Desk, body: unknown): Response {
  const call = callbackResult.safeParse(body);
  if (!call.success) return no(400, "Not understood");
  answers.get(call.data.fileKey)?.(call.data.callbackData);
  return Response.json({ ok: true });
}

function no(status: number, error: string): Response {
  return Response.json({ ok: false, error }, { status });
}
