"use client";

import { useSnapOutbox } from "./use-snap-outbox";

/** Shows nothing: on every page, snaps that wait on this phone go up as soon as the signal is back. */
export function SnapOutboxFlusher({ memberId }: { memberId: number }) {
  useSnapOutbox(memberId);
  return null;
}
