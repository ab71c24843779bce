import "server-only";

const holder = globalThis as typeof globalThis & { coppertellWake?: () => void };

/** Tells the worker that there may be work, so that it need not wait for its next look. Nothing happens without one. */
export function wakeJobs(): void {
  holder.coppertellWake?.();
}

/** The worker leaves its bell here when it starts. */
export function onWake(ring: () => void): void {
  holder.coppertellWake = ring;
}
