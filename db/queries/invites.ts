import { and, desc, eq, gt, isNull } from "drizzle-orm";
import type { Role } from "@/lib/cases/case-words";
import type { Handle } from "../open";
import { invites, members, shops } from "../schema";

interface NewInvite {
  shopId: number;
  email: string;
  name: string;
  roles: Role[];
  tokenHash: string;
  invitedById: number;
  now: number;
  expiresAt: number;
}

export function insertInvite(tx: Handle, invite: NewInvite): void {
  const { now, ...row } = invite;
  tx.insert(invites)
    .values({ ...row, createdAt: now })
    .run();
}

export interface PendingInvite {
  id: number;
  email: string;
  name: string;
  roles: Role[];
  invitedBy: string;
  createdAt: number;
  expiresAt: number;
}

const isPending = and(isNull(invites.acceptedAt), isNull(invites.revokedAt));

function selectPending(db: Handle) {
  return db
    .select({
      id: invites.id,
      email: invites.email,
      name: invites.name,
      roles: invites.roles,
      invitedBy: members.name,
      createdAt: invites.createdAt,
      expiresAt: invites.expiresAt,
    })
    .from(invites)
    .innerJoin(members, and(eq(members.shopId, invites.shopId), eq(members.id, invites.invitedById)));
}

/** Invites that nobody took up or took back, newest first; those that ran out are among them. */
export function listPendingInvites(db: Handle, shopId: number): PendingInvite[] {
  return selectPending(db)
    .where(and(eq(invites.shopId, shopId), isPending))
    .orderBy(desc(invites.createdAt), desc(invites.id))
    .all();
}

export function getPendingInvite(db: Handle, shopId: number, id: number): PendingInvite | null {
  return (
    selectPending(db)
      .where(and(eq(invites.shopId, shopId), eq(invites.id, id), isPending))
      .get() ?? null
  );
}

/** An invite as the person who holds its link sees it. */
export interface OpenInvite {
  id: number;
  shopId: number;
  shopName: string;
  email: string;
  name: string;
  roles: Role[];
}

/** The invite behind a link; null when it is used, taken back, run out or never was. The link itself names the shop. */
export function getOpenInvite(db: Handle, tokenHash: string, now: number): OpenInvite | null {
  const row = db
    .select({
      id: invites.id,
      shopId: invites.shopId,
      shopName: shops.name,
      email: invites.email,
      name: invites.name,
      roles: invites.roles,
    })
    .from(invites)
    .innerJoin(shops, eq(shops.id, invites.shopId))
    .where(and(eq(invites.tokenHash, tokenHash), isPending, gt(invites.expiresAt, now)))
    .get();
  return row ?? null;
}

/** Uses an invite up. False when somebody was faster or it ran out meanwhile. */
export function takeInvite(tx: Handle, shopId: number, id: number, now: number): boolean {
  const done = tx
    .update(invites)
    .set({ acceptedAt: now })
    .where(and(eq(invites.shopId, shopId), eq(invites.id, id), isPending, gt(invites.expiresAt, now)))
    .run();
  return done.changes === 1;
}

/** Takes back every open invite to an e-mail, so that only the newest link works. */
export function revokeInvitesTo(tx: Handle, shopId: number, email: string, now: number): void {
  tx.update(invites)
    .set({ revokedAt: now })
    .where(and(eq(invites.shopId, shopId), eq(invites.email, email), isPending))
    .run();
}
