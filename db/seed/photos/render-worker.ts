import { parentPort } from "node:worker_threads";
import sharp from "sharp";
import { encodeJpeg } from "./encode";
import type { PhotoOrder } from "./render-many";

/** One order in, one JPEG out: render-many.ts hands out the next when this one is back. */
const port = parentPort;
if (!port) throw new Error("render-worker.ts is started by render-many.ts");

// The other workers have the other cores.
sharp.concurrency(1);

port.on("message", ({ index, order }: { index: number; order: PhotoOrder }) => {
  encodeJpeg(order, order).then(
    (jpeg) => port.postMessage({ index, jpeg }),
    (error: unknown) => port.postMessage({ index, failure: error instanceof Error ? error.message : String(error) }),
  );
});
