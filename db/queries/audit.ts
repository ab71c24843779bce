import { and, desc, eq, lt } from "drizzle-orm";
import type { AuditAction } from "@/lib/crew/audit-words";
import type { Handle } from "../open";
import { auditEntries, members } from "../schema";

interface NewAuditEntry {
  shopId: number;
  /** Who did it. */
  memberId: number;
  action: AuditAction;
  /** Whom or what it was done to, in words that stay readable: a name, a date, a title. */
  subject: string;
  detail?: Record<string, unknown>;
  now: number;
}

/** Writes an entry in the transaction of the change that it records, so that neither stands without the other. */
export function insertAudit(tx: Handle, entry: NewAuditEntry): void {
  const { shopId, memberId, action, subject, detail = {}, now } = entry;
  tx.insert(auditEntries).values({ shopId, memberId, action, subject, detail, at: now }).run();
}

export interface AuditEntry {
  id: number;
  /** Null where no member did it. */
  memberName: string | null;
  action: string;
  subject: string;
  detail: Record<string, unknown>;
  at: number;
}

/**
 * A page of the trail, newest first.
 * @param page `beforeId` is the last id of the page before; without it the page is the newest
 * @returns at most `limit` entries, and `nextBeforeId` where older ones remain
 */
export function listAudit(
  db: Handle,
  shopId: number,
  page: { beforeId?: number; limit: number },
): { entries: AuditEntry[]; nextBeforeId: number | null } {
  const rows = db
    .select({
      id: auditEntries.id,
      memberName: members.name,
      action: auditEntries.action,
      subject: auditEntries.subject,
      detail: auditEntries.detail,
      at: auditEntries.at,
    })
    .from(auditEntries)
    .leftJoin(members, and(eq(members.shopId, auditEntries.shopId), eq(members.id, auditEntries.memberId)))
    .where(
      and(
        eq(auditEntries.shopId, shopId),
        page.beforeId === undefined ? undefined : lt(auditEntries.id, page.beforeId),
      ),
    )
    .orderBy(desc(auditEntries.id))
    .limit(page.limit + 1)
    .all();
  const entries = rows.slice(0, page.limit);
  return { entries, nextBeforeId: rows.length > page.limit ? (entries.at(-1)?.id ?? null) : null };
}
