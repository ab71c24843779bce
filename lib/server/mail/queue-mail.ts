import type { Handle } from "@/db/open";
import { insertOutboxMail, type NewOutboxMail } from "@/db/queries/outbox";
import { enqueue } from "../jobs";

/** Puts a message in the outbox and asks for it to be sent, in the transaction of its reason: both or neither. */
export function queueMail(tx: Handle, mail: NewOutboxMail): void {
  const outboxId = insertOutboxMail(tx, mail);
  enqueue(tx, {
    shopId: mail.shopId,
    kind: "send-mail",
    payload: { shopId: mail.shopId, outboxId },
    now: mail.now,
    onceKey: `mail:${outboxId}`,
  });
}
