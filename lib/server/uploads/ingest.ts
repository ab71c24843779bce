import "server-only";
import { getUploadedFile, isKeyTaken } from "@/db/queries/uploads";
import { LIMITS } from "@/lib/cases/case-words";
import { FAULT_STATUS, FaultError, fault, type Fault } from "@/lib/fault";
import { incomingPath } from "@/lib/photos/photo-path";
import { refusalBeforeSending } from "@/lib/photos/photo-refusals";
import { faultOf } from "@/lib/server/faults";
import { inUploads, removeFile, sizeOf } from "@/lib/server/storage";
import { tellComplete } from "./callback";
import { receivePart } from "./receive-part";
import { readSignedUpload, type SignedUpload } from "./signed-url";
import type { UploadDesk } from "./upload-desk";
import { takeOver } from "./writers";

/** The stand-in's side of an upload: where the hosted service would take the bytes. The signed address is the permit. */

/** `HEAD`: how many bytes we hold, so that the phone sends only the rest. */
export async function answerHead(desk: UploadDesk, key: string, request: Request): Promise<Response> {
  try {
    const upload = permit(desk, key, request);
    // A connection that still trickles is given up: its sender is asking where to go on.
    const release = await takeOver(upload.customId);
    const held = await heldBytes(desk, upload).finally(release);
    return new Response(null, { headers: { "x-ut-range-start": String(held), "Cache-Control": "no-store" } });
  } catch (error) {
    return refusal(faultOf(error, "upload HEAD"));
  }
}

/** `PUT`: the rest of the file. Once it is whole it is looked at, and the answer says what became of it. */
export async function answerPut(desk: UploadDesk, key: string, request: Request): Promise<Response> {
  try {
    const upload = permit(desk, key, request);
    const abort = new AbortController();
    const release = await takeOver(upload.customId, () => abort.abort());
    try {
      return await receive(desk, upload, request, abort.signal);
    } finally {
      release();
    }
  } catch (error) {
    return refusal(faultOf(error, "upload PUT"));
  }
}

/** Who may send what: signed by us, begun through the kit, not larger than we keep, not onto another file. */
function permit(desk: UploadDesk, key: string, request: Request): SignedUpload {
  const { config, db } = desk;
  if (!config.isLocal || !config.ingestUrl) throw fault("not-found", "Uploads go to the hosted service.");
  const search = request.url.slice(request.url.indexOf("?"));
  const upload = readSignedUpload({ key, search }, { apiKey: config.apiKey, ingestUrl: config.ingestUrl }, Date.now());
  const words = refusalBeforeSending(upload);
  if (words) throw fault(upload.size > LIMITS.photoBytes ? "too-large" : "unsupported", words);
  if (isKeyTaken(db, key, upload.customId)) {
    throw fault("conflict", "This upload's number is taken. Take the photo again.");
  }
  if (!getUploadedFile(db, upload.customId)) {
    throw fault("not-found", "This upload was not begun, or it was withdrawn. Start it again.");
  }
  return upload;
}

async function heldBytes({ db, root }: UploadDesk, { customId, size }: SignedUpload): Promise<number> {
  if (getUploadedFile(db, customId)?.finishedAt) return size;
  const file = inUploads(root, incomingPath(customId));
  const held = await sizeOf(file);
  if (held <= size) return held;
  // More than the file has: a different file was begun under this number.
  await removeFile(file);
  return 0;
}

async function receive(desk: UploadDesk, upload: SignedUpload, request: Request, signal: AbortSignal): Promise<Response> {
  const held = await heldBytes(desk, upload);
  const from = Number(/^bytes=(\d+)-$/.exec(request.headers.get("range") ?? "bytes=0-")?.[1] ?? NaN);
  if (from !== held) return outOfStep(416, held);
  const file = inUploads(desk.root, incomingPath(upload.customId));
  if (held < upload.size) {
    const broken = await receivePart({ request, file, most: upload.size - held, signal }).then(
      () => null,
      (error: unknown) => ({ error }),
    );
    if (broken?.error instanceof FaultError) await removeFile(file);
    if (broken && (broken.error instanceof FaultError || isDiskError(broken.error))) throw broken.error;
    // Anything else is a line that broke: what came is kept.
    const now = await sizeOf(file);
    if (now < upload.size) return outOfStep(408, now);
  }
  return tellComplete(desk, upload, file);
}

function isDiskError(error: unknown): boolean {
  return error instanceof Error && "syscall" in error && ["open", "write", "close"].includes(String(error.syscall));
}

/** Not a refusal: the phone asks again where to go on. */
function outOfStep(status: number, held: number): Response {
  const error = `The upload goes on at byte ${held}.`;
  return Response.json({ error }, { status, headers: { "x-ut-range-start": String(held) } });
}

function refusal({ code, message, ref }: Fault): Response {
  return Response.json({ error: message, detail: message, code, ref }, { status: FAULT_STATUS[code] });
}
