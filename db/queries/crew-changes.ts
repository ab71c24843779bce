import { and, eq, sql } from "drizzle-orm";
import type { Role } from "@/lib/cases/case-words";
import type { Handle } from "../open";
import { memberRoles, members } from "../schema";

interface NewMember {
  shopId: number;
  email: string;
  name: string;
  passwordHash: string;
  roles: readonly Role[];
  now: number;
}

/** @returns the new member's id */
export function insertMember(tx: Handle, member: NewMember): number {
  const { shopId, email, name, passwordHash, now } = member;
  const row = tx
    .insert(members)
    .values({ shopId, email, name, passwordHash, createdAt: now })
    .returning({ id: members.id })
    .get();
  setRoles(tx, shopId, row.id, member.roles);
  return row.id;
}

/** Takes somebody back who was removed: the same row, so that their history stays theirs. Old sessions stay dead. */
export function reviveMember(tx: Handle, memberId: number, member: NewMember): void {
  const { shopId, name, passwordHash } = member;
  tx.update(members)
    .set({ name, passwordHash, removedAt: null, sessionVersion: sql`${members.sessionVersion} + 1` })
    .where(and(eq(members.shopId, shopId), eq(members.id, memberId)))
    .run();
  setRoles(tx, shopId, memberId, member.roles);
}

/** Gives a member these roles and no others. */
export function setRoles(tx: Handle, shopId: number, memberId: number, roles: readonly Role[]): void {
  tx.delete(memberRoles)
    .where(and(eq(memberRoles.shopId, shopId), eq(memberRoles.memberId, memberId)))
    .run();
  if (roles.length > 0)
    tx.insert(memberRoles)
      .values(roles.map((role) => ({ shopId, memberId, role })))
      .run();
}

/** Out of the crew and signed out everywhere. The row stays: cases name it. */
export function markMemberRemoved(tx: Handle, shopId: number, memberId: number, now: number): void {
  tx.update(members)
    .set({ removedAt: now, sessionVersion: sql`${members.sessionVersion} + 1` })
    .where(and(eq(members.shopId, shopId), eq(members.id, memberId)))
    .run();
}

export function renameMember(tx: Handle, shopId: number, memberId: number, name: string): void {
  tx.update(members)
    .set({ name })
    .where(and(eq(members.shopId, shopId), eq(members.id, memberId)))
    .run();
}

/** A new password ends every session that the old one began. */
export function setPasswordHash(tx: Handle, shopId: number, memberId: number, passwordHash: string): void {
  tx.update(members)
    .set({ passwordHash, sessionVersion: sql`${members.sessionVersion} + 1` })
    .where(and(eq(members.shopId, shopId), eq(members.id, memberId)))
    .run();
}

/** Signs a member out on every device at their next request. */
export function endSessions(tx: Handle, shopId: number, memberId: number): void {
  tx.update(members)
    .set({ sessionVersion: sql`${members.sessionVersion} + 1` })
    .where(and(eq(members.shopId, shopId), eq(members.id, memberId)))
    .run();
}
