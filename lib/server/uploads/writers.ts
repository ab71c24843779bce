import "server-only";

interface Writer {
  stop: () => void;
  done: Promise<void>;
}

/**
 * Who is writing which file. One process serves uploads, so a map is enough; held globally, because the bundler may load
 * this file once for each route.
 */
const holder = globalThis as typeof globalThis & { coppertellWriters?: Map<string, Writer> };
const writers = (holder.coppertellWriters ??= new Map());

/**
 * Takes a file over from whoever writes it: their connection is cut and waited for, so that no two append to one file.
 * The newest comer wins, since a phone that lost its signal comes back before the server has seen the old line break.
 * @param stop how to cut our own connection, should somebody take over from us; without it they wait
 * @returns what gives the file back
 */
export async function takeOver(customId: string, stop: () => void = () => undefined): Promise<() => void> {
  for (let writer = writers.get(customId); writer; writer = writers.get(customId)) {
    writer.stop();
    await writer.done;
  }
  let release = () => undefined as void;
  const done = new Promise<void>((resolve) => (release = resolve));
  writers.set(customId, { stop, done });
  return () => {
    writers.delete(customId);
    release();
  };
}
