import "server-only";
import { answerHead, answerPut } from "./ingest";
import { answerCall } from "./kit-calls";
import { uploadDesk } from "./upload-desk";

type Context = { params: Promise<{ key: string }> };

export async function answerIngestHead(request: Request, { params }: Context): Promise<Response> {
  return answerHead(uploadDesk(), (await params).key, request);
}

export async function answerIngestPut(request: Request, { params }: Context): Promise<Response> {
  return answerPut(uploadDesk(), (await params).key, request);
}

/** `route-metadata` and `callback-result`, should the kit run in another process than the stand-in. */
export async function answerIngestCall(request: Request, { params }: Context): Promise<Response> {
  return answerCall(uploadDesk(), (await params).key, request);
}
