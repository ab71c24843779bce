import { and, count, eq, gt, inArray, lte, min } from "drizzle-orm";
import type { Handle } from "../open";
import { signInAttempts } from "../schema";

/** A thing whose tries are counted: `e:<e-mail>`, `i:<address>` and so on, with how many it has in the window. */
export interface TryKey {
  key: string;
  most: number;
}

export type Taken = { ok: true; tryIds: number[] } | { ok: false; waitMs: number };

/**
 * Counts a try against every key, before it is made: two at the same moment cannot both be the last one. Call it in a
 * transaction. A refused try is not counted, so the wait that is told is the wait that holds.
 */
export function takeTry(tx: Handle, keys: readonly TryKey[], windowMs: number, now: number): Taken {
  const since = now - windowMs;
  tx.delete(signInAttempts).where(lte(signInAttempts.at, since)).run();
  let waitMs = 0;
  for (const { key, most } of keys) {
    const row = tx
      .select({ tries: count(), oldestAt: min(signInAttempts.at) })
      .from(signInAttempts)
      .where(and(eq(signInAttempts.key, key), gt(signInAttempts.at, since)))
      .get();
    if (row && row.tries >= most) waitMs = Math.max(waitMs, (row.oldestAt ?? now) + windowMs - now);
  }
  if (waitMs > 0) return { ok: false, waitMs };
  const rows = tx
    .insert(signInAttempts)
    .values(keys.map(({ key }) => ({ key, at: now })))
    .returning({ id: signInAttempts.id })
    .all();
  return { ok: true, tryIds: rows.map((row) => row.id) };
}

/** Takes tries back that turned out right, and every other one against a key that has proved itself. */
export function forgiveTries(tx: Handle, tryIds: readonly number[], provenKey?: string): void {
  if (tryIds.length > 0)
    tx.delete(signInAttempts)
      .where(inArray(signInAttempts.id, [...tryIds]))
      .run();
  if (provenKey !== undefined) tx.delete(signInAttempts).where(eq(signInAttempts.key, provenKey)).run();
}
