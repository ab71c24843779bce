import "server-only";

/** Runs tasks, at most so many at once, the rest in the order in which they came. */
export function slots(most: number): <T>(task: () => Promise<T>) => Promise<T> {
  const waiting: (() => void)[] = [];
  let busy = 0;
  return async (task) => {
    if (busy >= most) await new Promise<void>((resolve) => waiting.push(resolve));
    else busy++;
    try {
      return await task();
    } finally {
      // The slot goes straight to the next in line, or is free.
      const next = waiting.shift();
      if (next) next();
      else busy--;
    }
  };
}

interface Slots {
  picture: ReturnType<typeof slots>;
  heic: ReturnType<typeof slots>;
}

/** Held globally: the bundler may load this file once for each route, and the limit is the server's. */
const holder = globalThis as typeof globalThis & { coppertellSlots?: Slots };
const shared = (holder.coppertellSlots ??= { picture: slots(2), heic: slots(1) });

/** Two pictures at once keep two cores busy; more would only take memory. */
export const pictureSlot = shared.picture;

/** The HEIC decoder takes hundreds of megabytes: one at a time. */
export const heicSlot = shared.heic;
