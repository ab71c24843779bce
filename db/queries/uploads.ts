import { and, eq, isNotNull, isNull, lt } from "drizzle-orm";
import type { Handle } from "../open";
import { members, memberRoles, shops, uploadedFiles } from "../schema";
import type { Role } from "@/lib/cases/case-words";

/** What the stand-in of the upload service knows of a file. */
export function getUploadedFile(db: Handle, customId: string) {
  return (
    db
      .select({
        customId: uploadedFiles.customId,
        key: uploadedFiles.key,
        callback: uploadedFiles.callback,
        finishedAt: uploadedFiles.finishedAt,
      })
      .from(uploadedFiles)
      .where(eq(uploadedFiles.customId, customId))
      .get() ?? null
  );
}

interface Registered {
  customId: string;
  key: string;
  callback: { slug: string; metadata: unknown };
  now: number;
}

/** Keeps what is to be handed back with a file once it has come in. Asking again for the same file renews it. */
export function registerUpload(db: Handle, { customId, key, callback, now }: Registered): void {
  db.insert(uploadedFiles)
    .values({ customId, key, callback, createdAt: now })
    .onConflictDoUpdate({ target: uploadedFiles.customId, set: { key, callback } })
    .run();
}

/** A key is short enough to collide: is it the key of another file that has come in? */
export function isKeyTaken(db: Handle, key: string, customId: string): boolean {
  const rows = db
    .select({ customId: uploadedFiles.customId })
    .from(uploadedFiles)
    .where(and(eq(uploadedFiles.key, key), isNotNull(uploadedFiles.finishedAt)))
    .all();
  return rows.some((row) => row.customId !== customId);
}

/** Marks a file as come in. */
export function finishUpload(db: Handle, customId: string, now: number): void {
  db.update(uploadedFiles).set({ finishedAt: now }).where(eq(uploadedFiles.customId, customId)).run();
}

/** Forgets a file, so that its number can be sent again. */
export function forgetUpload(db: Handle, customId: string): void {
  db.delete(uploadedFiles).where(eq(uploadedFiles.customId, customId)).run();
}

/** Forgets files that were begun before a moment and never came in. */
export function forgetUnfinishedUploads(db: Handle, before: number): number {
  return db
    .delete(uploadedFiles)
    .where(and(isNull(uploadedFiles.finishedAt), lt(uploadedFiles.createdAt, before)))
    .run().changes;
}

/** Who sends a file: asked again when it has come in, since minutes may lie between. Null when they are gone. */
export function getSender(
  db: Handle,
  shopId: number,
  memberId: number,
): { memberId: number; shopId: number; roles: Role[]; timeZone: string } | null {
  const row = db
    .select({ timeZone: shops.timeZone })
    .from(members)
    .innerJoin(shops, eq(shops.id, members.shopId))
    .where(and(eq(members.shopId, shopId), eq(members.id, memberId), isNull(members.removedAt)))
    .get();
  if (!row) return null;
  const roles = db
    .select({ role: memberRoles.role })
    .from(memberRoles)
    .where(and(eq(memberRoles.shopId, shopId), eq(memberRoles.memberId, memberId)))
    .all();
  return { memberId, shopId, roles: roles.map((each) => each.role), timeZone: row.timeZone };
}
