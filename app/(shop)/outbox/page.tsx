import type { Metadata } from "next";
import { OutboxMailView } from "@/components/crew/outbox-mail";
import { ShopShell } from "@/components/shell/shop-shell";
import { Empty } from "@/components/ui/empty";
import { Lead } from "@/components/ui/lead";
import { Pager } from "@/components/ui/pager";
import { getDb } from "@/db/client";
import { listOutbox } from "@/db/queries/outbox";
import { clockWords } from "@/lib/crew/clock-words";
import { pageBefore } from "@/lib/crew/page-before";
import { readEnv } from "@/lib/env";
import { routes } from "@/lib/routes";
import { SECRET_KINDS } from "@/lib/server/mail/send-mail-job";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";

export const metadata: Metadata = { title: "Outbox" };

const PAGE_MAILS = 30;
const HERE_ONLY =
  "Without SMTP_URL nothing leaves this server: messages lie here as they would be sent, and their links work.";
const SENDS = "Messages are sent as they come in. Links that open an account are only in the mail itself.";

export default async function OutboxPage({ searchParams }: { searchParams: Promise<{ before?: string | string[] }> }) {
  const member = await guardPage("outbox.see", routes.outbox());
  const { actor, counts } = shellFor(member);
  const beforeId = pageBefore((await searchParams).before);
  const { mails, nextBeforeId } = listOutbox(getDb(), member.shopId, { beforeId, limit: PAGE_MAILS });
  const doesSend = readEnv().SMTP_URL !== undefined;
  const when = (at: number) => clockWords(at, member.shop.timeZone);
  return (
    <ShopShell actor={actor} counts={counts} here="crew" back={routes.crew()}>
      <Lead size="page" below={doesSend ? SENDS : HERE_ONLY}>
        Outbox
      </Lead>
      {mails.length === 0 ? (
        <Empty level={2} title="The outbox is empty">
          Invites, password links and notices about parts show here.
        </Empty>
      ) : (
        <ul>
          {mails.map((mail, index) => (
            <OutboxMailView
              key={mail.id}
              subject={mail.subject}
              toEmail={mail.toEmail}
              whenWords={when(mail.createdAt)}
              stateWords={mail.sentAt === null ? "lies here" : `sent ${when(mail.sentAt)}`}
              text={doesSend && SECRET_KINDS.includes(mail.kind) ? null : mail.text}
              isOpen={index === 0}
            />
          ))}
        </ul>
      )}
      <Pager
        words={`${mails.length} shown, newest first`}
        nextHref={nextBeforeId === null ? null : `${routes.outbox()}?before=${nextBeforeId}`}
        nextWords="Show older ones"
        previousHref={beforeId === undefined ? null : routes.outbox()}
        previousWords="Back to the newest"
      />
    </ShopShell>
  );
}
