import type { Db } from "@/db/open";
import { insertAudit } from "@/db/queries/audit";
import { getCredentials, getCrewMember } from "@/db/queries/crew";
import { setPasswordHash } from "@/db/queries/crew-changes";
import { countResetsSince, getOpenReset, insertPasswordReset, takeReset } from "@/db/queries/password-resets";
import { forgiveTries } from "@/db/queries/sign-in-attempts";
import { CREW_LIMITS } from "@/lib/crew/crew-limits";
import { passwordResetMail } from "@/lib/crew/mails";
import { passwordFault } from "@/lib/crew/password-rule";
import { fault } from "@/lib/fault";
import { routes } from "@/lib/routes";
import { wholeLink } from "../mail/links";
import { queueMail } from "../mail/queue-mail";
import { hashPassword } from "../passwords";
import { emailKey } from "./sign-in";
import { hashToken, newToken } from "./tokens";

export const RESET_DEAD = "This link was used or has run out. Ask for a new one.";

/**
 * Mails a link to whoever has that e-mail. Says nothing about whether anybody has: the caller answers the same each
 * time. More than three links within the hour are not sent.
 */
export function requestPasswordReset(db: Db, email: string, now: number): void {
  db.transaction(
    (tx) => {
      const found = getCredentials(tx, email);
      const member = found && getCrewMember(tx, found.shopId, found.memberId);
      if (!found || !member) return;
      const { shopId, memberId } = found;
      if (countResetsSince(tx, shopId, memberId, now - CREW_LIMITS.resetMs) >= CREW_LIMITS.resetsAtOnce) return;
      const { token, tokenHash } = newToken();
      insertPasswordReset(tx, { shopId, memberId, tokenHash, now, expiresAt: now + CREW_LIMITS.resetMs });
      const mail = passwordResetMail({ name: member.name, link: wholeLink(routes.resetPassword(token)) });
      queueMail(tx, { shopId, kind: "password-reset", toEmail: email, ...mail, now });
    },
    { behavior: "immediate" },
  );
}

/**
 * Sets a new password by a mailed link, once. Every session that the old one began ends, and every other open link.
 * @throws FaultError "not-found" for a dead link, "invalid" for a weak password
 */
export async function resetPassword(db: Db, input: { token: string; password: string }, now: number): Promise<void> {
  const open = getOpenReset(db, hashToken(input.token), now);
  if (!open) throw fault("not-found", RESET_DEAD);
  const wrong = passwordFault(input.password, open.email);
  if (wrong) throw fault("invalid", wrong, { password: wrong });
  const passwordHash = await hashPassword(input.password);
  const { shopId, memberId } = open;
  db.transaction(
    (tx) => {
      if (!takeReset(tx, open, now)) throw fault("not-found", RESET_DEAD);
      setPasswordHash(tx, shopId, memberId, passwordHash);
      // They have proved that the mailbox is theirs: earlier slips do not keep them out.
      forgiveTries(tx, [], emailKey(open.email));
      insertAudit(tx, { shopId, memberId, action: "account.password-reset", subject: open.name, now });
    },
    { behavior: "immediate" },
  );
}
