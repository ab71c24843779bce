import type { Db } from "@/db/open";
import { insertAudit } from "@/db/queries/audit";
import { getCredentials, type SignedIn } from "@/db/queries/crew";
import { endSessions, renameMember, setPasswordHash } from "@/db/queries/crew-changes";
import { setMailRefusals } from "@/db/queries/mail-choices";
import { forgiveTries, takeTry } from "@/db/queries/sign-in-attempts";
import { CREW_LIMITS } from "@/lib/crew/crew-limits";
import { MAIL_KINDS, type MailKind } from "@/lib/crew/mail-kinds";
import { passwordFault } from "@/lib/crew/password-rule";
import { tryAgainWords } from "@/lib/crew/try-again";
import { fault } from "@/lib/fault";
import { hashPassword, verifyPassword } from "../passwords";

/** One's own name, as the crew and every history show it. */
export function renameSelf(db: Db, member: SignedIn, name: string, now: number): void {
  const { shopId, memberId } = member;
  db.transaction((tx) => {
    renameMember(tx, shopId, memberId, name);
    const detail = { from: member.name, to: name };
    insertAudit(tx, { shopId, memberId, action: "account.renamed", subject: name, detail, now });
  });
}

/**
 * A new password in place of the current one. It signs the person out everywhere, here too.
 * @throws FaultError "invalid" for a wrong current or a weak new one, "too-many" after eight wrong ones in 15 minutes
 */
export async function changePassword(
  db: Db,
  member: SignedIn,
  input: { currentPassword: string; password: string },
  now: number,
): Promise<void> {
  const { shopId, memberId, email, name } = member;
  await proveCurrent(db, member, input.currentPassword, now);
  const wrong =
    input.password === input.currentPassword
      ? "That is the one you have. Choose another."
      : passwordFault(input.password, email);
  if (wrong) throw fault("invalid", wrong, { password: wrong });
  const passwordHash = await hashPassword(input.password);
  db.transaction((tx) => {
    setPasswordHash(tx, shopId, memberId, passwordHash);
    insertAudit(tx, { shopId, memberId, action: "account.password", subject: name, now });
  });
}

/** Whoever finds a phone unlocked must not get to guess at the password without end. */
async function proveCurrent(db: Db, member: SignedIn, password: string, now: number): Promise<void> {
  const keys = [{ key: `c:${member.memberId}`, most: CREW_LIMITS.signInTriesPerEmail }];
  const taken = db.transaction((tx) => takeTry(tx, keys, CREW_LIMITS.signInWindowMs, now), { behavior: "immediate" });
  if (!taken.ok) throw fault("too-many", `Too many tries. Try again ${tryAgainWords(taken.waitMs)}.`);
  const credentials = getCredentials(db, member.email);
  if (credentials && (await verifyPassword(credentials.passwordHash, password))) {
    forgiveTries(db, taken.tryIds);
    return;
  }
  const message = "That is not your current password. Type it again.";
  throw fault("invalid", message, { currentPassword: message });
}

/** Ends every session of the member, this one too, at its next request. */
export function signOutEverywhere(db: Db, member: SignedIn, now: number): void {
  const { shopId, memberId, name } = member;
  db.transaction((tx) => {
    endSessions(tx, shopId, memberId);
    insertAudit(tx, { shopId, memberId, action: "account.signed-out-everywhere", subject: name, now });
  });
}

/** @param wanted the messages that the member wants; every other one of `MAIL_KINDS` is turned off */
export function chooseMails(db: Db, member: SignedIn, wanted: readonly MailKind[]): void {
  const refused = MAIL_KINDS.filter((kind) => !wanted.includes(kind));
  db.transaction((tx) => setMailRefusals(tx, member.shopId, member.memberId, refused));
}
