import { and, count, eq, gt, isNull } from "drizzle-orm";
import type { Handle } from "../open";
import { members, passwordResets } from "../schema";

interface NewPasswordReset {
  shopId: number;
  memberId: number;
  tokenHash: string;
  now: number;
  expiresAt: number;
}

export function insertPasswordReset(tx: Handle, reset: NewPasswordReset): void {
  const { now, ...row } = reset;
  tx.insert(passwordResets)
    .values({ ...row, createdAt: now })
    .run();
}

/** How many links a member was sent since a moment. */
export function countResetsSince(db: Handle, shopId: number, memberId: number, since: number): number {
  const row = db
    .select({ links: count() })
    .from(passwordResets)
    .where(
      and(
        eq(passwordResets.shopId, shopId),
        eq(passwordResets.memberId, memberId),
        gt(passwordResets.createdAt, since),
      ),
    )
    .get();
  return row?.links ?? 0;
}

export interface OpenReset {
  id: number;
  shopId: number;
  memberId: number;
  email: string;
  name: string;
}

/** The reset behind a link; null when it is used, run out, of a removed member or never was. The link names the shop. */
export function getOpenReset(db: Handle, tokenHash: string, now: number): OpenReset | null {
  const row = db
    .select({
      id: passwordResets.id,
      shopId: passwordResets.shopId,
      memberId: passwordResets.memberId,
      email: members.email,
      name: members.name,
    })
    .from(passwordResets)
    .innerJoin(members, and(eq(members.shopId, passwordResets.shopId), eq(members.id, passwordResets.memberId)))
    .where(
      and(
        eq(passwordResets.tokenHash, tokenHash),
        isNull(passwordResets.usedAt),
        gt(passwordResets.expiresAt, now),
        isNull(members.removedAt),
      ),
    )
    .get();
  return row ?? null;
}

/** Uses a link up, and with it every other open one of the same member. False when somebody was faster. */
export function takeReset(tx: Handle, reset: OpenReset, now: number): boolean {
  const open = and(eq(passwordResets.shopId, reset.shopId), isNull(passwordResets.usedAt));
  const done = tx
    .update(passwordResets)
    .set({ usedAt: now })
    .where(and(open, eq(passwordResets.id, reset.id), gt(passwordResets.expiresAt, now)))
    .run();
  if (done.changes !== 1) return false;
  tx.update(passwordResets)
    .set({ usedAt: now })
    .where(and(open, eq(passwordResets.memberId, reset.memberId)))
    .run();
  return true;
}
