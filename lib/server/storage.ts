import "server-only";
import { createReadStream } from "node:fs";
import fs from "node:fs/promises";
import path from "node:path";
import { readEnv } from "@/lib/env";

/** The uploads folder, from the environment. */
export function uploadsRoot(): string {
  return path.resolve(/*turbopackIgnore: true*/ readEnv().UPLOADS_DIR);
}

/**
 * A stored path inside the uploads folder.
 * @throws RangeError "path" when it would lead out of the folder
 */
export function inUploads(root: string, stored: string): string {
  const full = path.resolve(/*turbopackIgnore: true*/ root, stored);
  if (!full.startsWith(root + path.sep)) throw new RangeError("path: leads out of the uploads folder");
  return full;
}

/** Size in bytes, 0 when there is no such file. */
export async function sizeOf(file: string): Promise<number> {
  return fs.stat(file).then(
    (stat) => stat.size,
    () => 0,
  );
}

export async function exists(file: string): Promise<boolean> {
  return fs.access(file).then(
    () => true,
    () => false,
  );
}

/** Forces what was written to the disk itself. */
export async function settle(file: string): Promise<void> {
  const handle = await fs.open(file, "r");
  try {
    await handle.sync();
  } finally {
    await handle.close();
  }
}

/** Moves a settled file to its place, so that after a power cut it is there whole or not at all. */
export async function moveDurably(from: string, to: string): Promise<void> {
  await fs.mkdir(path.dirname(to), { recursive: true });
  await fs.rename(from, to);
  await settle(path.dirname(to));
}

/** Writes a file by way of a `.part` beside it, which nothing ever serves. */
export async function writeDurably(to: string, content: Uint8Array): Promise<void> {
  await fs.mkdir(path.dirname(to), { recursive: true });
  const part = `${to}.part`;
  await fs.writeFile(part, content, { flush: true });
  await moveDurably(part, to);
}

/** Removes a file that may not be there. */
export async function removeFile(file: string): Promise<void> {
  await fs.rm(file, { force: true });
}

/** A file as the body of an answer. */
export function streamFile(file: string): ReadableStream<Uint8Array> {
  const source = createReadStream(file);
  return new ReadableStream(
    {
      start(controller) {
        source.on("data", (chunk) => {
          controller.enqueue(typeof chunk === "string" ? Buffer.from(chunk) : new Uint8Array(chunk));
          if ((controller.desiredSize ?? 0) <= 0) source.pause();
        });
        source.on("end", () => controller.close());
        source.on("error", (error) => controller.error(error));
      },
      pull: () => void source.resume(),
      cancel: () => void source.destroy(),
    },
    { highWaterMark: 256 * 1024, size: (chunk) => chunk?.byteLength ?? 0 },
  );
}
