import { Worker } from "node:worker_threads";
import type { EncodeOptions } from "./encode";
import type { PartSpec } from "./part-spec";

/** A photo to render and how to store it. */
export type PhotoOrder = PartSpec & EncodeOptions;

type Answer = { index: number; jpeg?: Uint8Array; failure?: string };

/**
 * Renders many photos on worker threads; the JPEGs come back in the order of `orders`. `onDone` hears how many are ready after each one.
 * Runs under plain node, tsx and vitest. Rejects with the first photo that cannot be rendered, naming its place in the list.
 */
export async function renderMany(
  orders: readonly PhotoOrder[],
  { workers = 2, onDone }: { workers?: number; onDone?: (ready: number) => void } = {},
): Promise<Buffer[]> {
  const jpegs: Buffer[] = new Array<Buffer>(orders.length);
  let next = 0;
  let ready = 0;
  const takeOrder = () => (next < orders.length ? { index: next, order: orders[next++] } : undefined);
  const keep = (index: number, jpeg: Uint8Array) => {
    jpegs[index] = Buffer.from(jpeg.buffer, jpeg.byteOffset, jpeg.byteLength);
    onDone?.(++ready);
  };
  const threads = Array.from({ length: Math.max(1, Math.min(workers, orders.length)) }, startWorker);
  try {
    await Promise.all(threads.map((thread) => serve(thread, takeOrder, keep)));
  } finally {
    await Promise.all(threads.map((thread) => thread.terminate()));
  }
  return jpegs;
}

/** Gives one thread an order at a time until there are none. */
function serve(
  thread: Worker,
  takeOrder: () => { index: number } | undefined,
  keep: (index: number, jpeg: Uint8Array) => void,
): Promise<void> {
  return new Promise((resolve, reject) => {
    const giveNext = () => {
      const task = takeOrder();
      if (task) thread.postMessage(task);
      else resolve();
    };
    thread.on("error", reject);
    thread.on("exit", (code) => reject(new Error(`a photo thread stopped early with code ${code}`)));
    thread.on("message", ({ index, jpeg, failure }: Answer) => {
      if (!jpeg) return reject(new Error(`photo ${index} was not rendered: ${failure ?? "no reason given"}`));
      keep(index, jpeg);
      giveNext();
    });
    giveNext();
  });
}

function startWorker(): Worker {
  return new Worker(new URL("./start-worker.mjs", import.meta.url), {
    execArgv: [],
    // Rendering makes much short-lived rubbish: a larger nursery saves the time spent on clearing it.
    resourceLimits: { maxYoungGenerationSizeMb: 64 },
  });
}
