import { and, desc, eq, isNull, lt, max } from "drizzle-orm";
import type { Handle } from "../open";
import { outbox } from "../schema";

export type OutboxKind = (typeof outbox.$inferSelect)["kind"];

export interface NewOutboxMail {
  shopId: number;
  kind: OutboxKind;
  toEmail: string;
  subject: string;
  text: string;
  html: string;
  now: number;
}

/** @returns the row's id */
export function insertOutboxMail(tx: Handle, mail: NewOutboxMail): number {
  const { now, ...words } = mail;
  return tx
    .insert(outbox)
    .values({ ...words, createdAt: now })
    .returning({ id: outbox.id })
    .get().id;
}

export interface OutboxMail {
  id: number;
  kind: OutboxKind;
  toEmail: string;
  subject: string;
  text: string;
  html: string;
  createdAt: number;
  /** Null while it only lies in the outbox. */
  sentAt: number | null;
}

const mailColumns = {
  id: outbox.id,
  kind: outbox.kind,
  toEmail: outbox.toEmail,
  subject: outbox.subject,
  text: outbox.text,
  html: outbox.html,
  createdAt: outbox.createdAt,
  sentAt: outbox.sentAt,
};

export function getOutboxMail(db: Handle, shopId: number, id: number): OutboxMail | null {
  return (
    db
      .select(mailColumns)
      .from(outbox)
      .where(and(eq(outbox.shopId, shopId), eq(outbox.id, id)))
      .get() ?? null
  );
}

/** Newest first; `nextBeforeId` where older ones remain. */
export function listOutbox(
  db: Handle,
  shopId: number,
  page: { beforeId?: number; limit: number },
): { mails: OutboxMail[]; nextBeforeId: number | null } {
  const rows = db
    .select(mailColumns)
    .from(outbox)
    .where(and(eq(outbox.shopId, shopId), page.beforeId === undefined ? undefined : lt(outbox.id, page.beforeId)))
    .orderBy(desc(outbox.id))
    .limit(page.limit + 1)
    .all();
  const mails = rows.slice(0, page.limit);
  return { mails, nextBeforeId: rows.length > page.limit ? (mails.at(-1)?.id ?? null) : null };
}

/**
 * Marks a message as sent.
 * @param kept what stays in place of the words, where they held a secret link
 */
export function markOutboxSent(tx: Handle, shopId: number, id: number, now: number, kept?: string): void {
  tx.update(outbox)
    .set({ sentAt: now, ...(kept === undefined ? {} : { text: kept, html: kept }) })
    .where(and(eq(outbox.shopId, shopId), eq(outbox.id, id), isNull(outbox.sentAt)))
    .run();
}

/** When this person last got a message of this kind; null when never. */
export function lastMailAt(db: Handle, shopId: number, kind: OutboxKind, toEmail: string): number | null {
  const row = db
    .select({ at: max(outbox.createdAt) })
    .from(outbox)
    .where(and(eq(outbox.shopId, shopId), eq(outbox.kind, kind), eq(outbox.toEmail, toEmail)))
    .get();
  return row?.at ?? null;
}
