import "server-only";
import { createWriteStream } from "node:fs";
import fs from "node:fs/promises";
import path from "node:path";
import { Readable } from "node:stream";
import { pipeline } from "node:stream/promises";
import type { ReadableStream as WebStream } from "node:stream/web";
import busboy from "busboy";
import { fault } from "@/lib/fault";

interface Receipt {
  request: Request;
  /** The growing file; bytes are appended as they arrive, so that a broken connection loses only the last few. */
  file: string;
  /** How many more bytes may come. */
  most: number;
  /** Aborted when the same file begins to come in over another connection. */
  signal: AbortSignal;
}

/**
 * Appends the one file part of a multipart request to a file.
 * @throws FaultError "too-large" when more comes than was announced; "invalid" when there is no file part;
 *   Error when the connection breaks, after what came is on the disk
 */
export async function receivePart({ request, file, most, signal }: Receipt): Promise<void> {
  const type = request.headers.get("content-type") ?? "";
  if (!request.body || !type.startsWith("multipart/form-data")) throw noFile();
  await fs.mkdir(path.dirname(file), { recursive: true });
  // One byte over the limit is enough to see that too much comes.
  const parser = busboy({ headers: { "content-type": type }, limits: { files: 1, fields: 8, fileSize: most + 1 } });
  let written: Promise<number> | null = null;
  parser.on("file", (_name, part) => {
    const target = createWriteStream(file, { flags: "a" });
    written = pipeline(part, target, { signal }).then(() => target.bytesWritten);
    // Waited for below; without this a broken connection would count as unhandled before we get there.
    written.catch(() => undefined);
  });
  const body = Readable.fromWeb(request.body as WebStream<Uint8Array>);
  const parsed = await pipeline(body, parser, { signal }).then(
    () => null,
    (error: unknown) => ({ error }),
  );
  const bytes = await (written ?? Promise.reject(parsed?.error ?? noFile()));
  if (parsed) throw parsed.error;
  if (bytes > most) throw fault("too-large", "More came than was announced. Start the upload again.");
}

function noFile() {
  return fault("invalid", "No file came with the upload. Start it again.");
}
