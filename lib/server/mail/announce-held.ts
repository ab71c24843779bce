import type { Handle } from "@/db/open";
import { CREW_LIMITS } from "@/lib/crew/crew-limits";
import { enqueue } from "../jobs";

/**
 * A part was put on hold: whoever takes the second look hears of it at the end of these ten minutes, in one message
 * with every other part that is held by then.
 */
export function announceHeldCase(tx: Handle, { shopId, now }: { shopId: number; now: number }): void {
  const bucketEndAt = (Math.floor(now / CREW_LIMITS.digestMs) + 1) * CREW_LIMITS.digestMs;
  enqueueDigest(tx, shopId, now, bucketEndAt);
}

/** Asks for one digest of a shop at a moment; asking again for the same moment changes nothing. */
export function enqueueDigest(tx: Handle, shopId: number, now: number, runAfterAt: number): void {
  const onceKey = `digest:${shopId}:${runAfterAt}`;
  enqueue(tx, { shopId, kind: "second-look-digest", payload: { shopId }, now, runAfterAt, onceKey });
}
