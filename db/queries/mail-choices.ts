import { and, eq } from "drizzle-orm";
import type { MailKind } from "@/lib/crew/mail-kinds";
import type { Handle } from "../open";
import { mailRefusals } from "../schema";

/** The messages that a member has turned off. */
export function listMailRefusals(db: Handle, shopId: number, memberId: number): MailKind[] {
  return db
    .select({ kind: mailRefusals.kind })
    .from(mailRefusals)
    .where(and(eq(mailRefusals.shopId, shopId), eq(mailRefusals.memberId, memberId)))
    .all()
    .map((row) => row.kind);
}

/** Whom of the shop a kind of message must not reach. */
export function listRefusersOf(db: Handle, shopId: number, kind: MailKind): number[] {
  return db
    .select({ memberId: mailRefusals.memberId })
    .from(mailRefusals)
    .where(and(eq(mailRefusals.shopId, shopId), eq(mailRefusals.kind, kind)))
    .all()
    .map((row) => row.memberId);
}

/** Sets exactly these kinds as turned off. */
export function setMailRefusals(tx: Handle, shopId: number, memberId: number, kinds: readonly MailKind[]): void {
  tx.delete(mailRefusals)
    .where(and(eq(mailRefusals.shopId, shopId), eq(mailRefusals.memberId, memberId)))
    .run();
  if (kinds.length > 0)
    tx.insert(mailRefusals)
      .values(kinds.map((kind) => ({ shopId, memberId, kind })))
      .run();
}
