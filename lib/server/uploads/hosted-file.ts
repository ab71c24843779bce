import "server-only";
import { createWriteStream } from "node:fs";
import fs from "node:fs/promises";
import path from "node:path";
import { Readable, Transform } from "node:stream";
import { pipeline } from "node:stream/promises";
import type { ReadableStream as WebStream } from "node:stream/web";
import { UTApi } from "uploadthing/server";
import { LIMITS } from "@/lib/cases/case-words";

export interface HostedFile {
  key: string;
  ufsUrl: string;
}

/** Longest that the hosted service may take to hand a file over. */
const FETCH_TIMEOUT_MS = 120_000;

/**
 * Fetches a file from the hosted upload service. The address comes from the service's own signed message.
 * @param to the file in the incoming folder; written anew
 * @throws Error when it cannot be fetched whole; the service tries its message again
 */
export async function fetchHosted({ key, ufsUrl }: HostedFile, to: string): Promise<void> {
  const response = await fetch(ufsUrl, { signal: AbortSignal.timeout(FETCH_TIMEOUT_MS) });
  if (!response.ok || !response.body) throw new Error(`the upload service answered ${response.status} for ${key}`);
  await fs.mkdir(path.dirname(to), { recursive: true });
  await pipeline(Readable.fromWeb(response.body as WebStream<Uint8Array>), stopAfterLimit(), createWriteStream(to));
}

/** Removes a file from the hosted service, once it is safe here: photos live with the shop. */
export async function removeHosted({ key }: HostedFile, token: string): Promise<void> {
  // Left behind it costs money and nothing else.
  await new UTApi({ token }).deleteFiles(key).catch((error: unknown) => console.error("the upload service keeps a copy", error));
}

/** One byte more than a photo may have is let through, so that the check sees that it is too large. */
function stopAfterLimit(): Transform {
  let left = LIMITS.photoBytes + 1;
  return new Transform({
    transform(chunk: Buffer, _encoding, done) {
      const part = chunk.subarray(0, left);
      left -= part.length;
      done(null, part.length > 0 ? part : undefined);
    },
  });
}
