import { createTransport } from "nodemailer";
import { z } from "zod";
import type { Db } from "@/db/open";
import { getOutboxMail, markOutboxSent, type OutboxKind, type OutboxMail } from "@/db/queries/outbox";
import { readEnv, type Env } from "@/lib/env";

const payloadShape = z.object({ shopId: z.number().int(), outboxId: z.number().int() });

/** Their links open an account. Once sent they are only in the mail, not in the database and its backups. */
export const SECRET_KINDS: readonly OutboxKind[] = ["invite", "password-reset"];
const SENT_SECRET = "The link was only in the mail that was sent.\n";

type MailEnv = Pick<Env, "SMTP_URL" | "MAIL_FROM" | "NEXTAUTH_URL">;

/**
 * Sends one message of the outbox where SMTP_URL is set; without it the message stays there for its page to show.
 * Running it again sends nothing twice, save where the server died between sending and marking: the same Message-ID
 * lets the receiver drop the double.
 * @throws whatever the mail server answers; the worker then tries again later
 */
export async function sendMailJob(
  db: Db,
  payload: Record<string, string | number>,
  now: number,
  env: MailEnv = readEnv(),
): Promise<void> {
  const { shopId, outboxId } = payloadShape.parse(payload);
  const mail = getOutboxMail(db, shopId, outboxId);
  if (!mail || mail.sentAt !== null || !env.SMTP_URL) return;
  await sendOut(mail, env.SMTP_URL, env);
  markOutboxSent(db, shopId, outboxId, now, SECRET_KINDS.includes(mail.kind) ? SENT_SECRET : undefined);
}

async function sendOut(mail: OutboxMail, smtpUrl: string, env: MailEnv): Promise<void> {
  const transport = createTransport({ url: smtpUrl, connectionTimeout: 10_000, socketTimeout: 20_000 });
  try {
    await transport.sendMail({
      from: env.MAIL_FROM,
      to: { name: "", address: mail.toEmail },
      subject: mail.subject,
      text: mail.text,
      html: mail.html,
      messageId: `<outbox-${mail.id}-${mail.createdAt}@${new URL(env.NEXTAUTH_URL).hostname}>`,
      disableFileAccess: true,
      disableUrlAccess: true,
    });
  } finally {
    transport.close();
  }
}
