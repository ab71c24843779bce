import type { Db, Handle } from "@/db/open";
import { insertAudit } from "@/db/queries/audit";
import { getEmailHolder, type SignedIn } from "@/db/queries/crew";
import { insertMember, reviveMember } from "@/db/queries/crew-changes";
import {
  getOpenInvite,
  getPendingInvite,
  insertInvite,
  revokeInvitesTo,
  takeInvite,
  type OpenInvite,
  type PendingInvite,
} from "@/db/queries/invites";
import type { Role } from "@/lib/cases/case-words";
import type { AuditAction } from "@/lib/crew/audit-words";
import { CREW_LIMITS } from "@/lib/crew/crew-limits";
import { inviteMail } from "@/lib/crew/mails";
import { passwordFault } from "@/lib/crew/password-rule";
import { fault } from "@/lib/fault";
import { routes } from "@/lib/routes";
import { wholeLink } from "../mail/links";
import { queueMail } from "../mail/queue-mail";
import { hashPassword } from "../passwords";
import { hashToken, newToken } from "./tokens";

export const INVITE_DEAD = "This invite was used, taken back or has run out. Ask the owner for a new one.";

interface InviteWords {
  email: string;
  name: string;
  roles: Role[];
}

/**
 * Invites somebody by mail; an earlier open invite to the same e-mail stops working. Whether the e-mail is in another
 * shop is not said here: only whoever holds the mailbox learns that, when they open the link.
 * @throws FaultError "conflict" when they are in this crew already
 */
export function invite(db: Db, owner: SignedIn, words: InviteWords, now: number): void {
  const holder = getEmailHolder(db, words.email);
  if (holder && holder.shopId === owner.shopId && !holder.isRemoved) {
    const message = `${words.email} is in the crew already. Change their roles in the list.`;
    throw fault("conflict", message, { email: message });
  }
  db.transaction((tx) => sendInvite(tx, owner, words, "member.invited", now), { behavior: "immediate" });
}

/** Sends an invite again, with a new link and seven new days. */
export function inviteAgain(db: Db, owner: SignedIn, inviteId: number, now: number): void {
  const pending = requirePending(db, owner.shopId, inviteId);
  db.transaction((tx) => sendInvite(tx, owner, pending, "invite.sent-again", now), { behavior: "immediate" });
}

/** Takes an invite back: its link stops working. */
export function revokeInvite(db: Db, owner: SignedIn, inviteId: number, now: number): void {
  db.transaction(
    (tx) => {
      const pending = requirePending(tx, owner.shopId, inviteId);
      revokeInvitesTo(tx, owner.shopId, pending.email, now);
      insertAudit(tx, { ...byMember(owner), action: "invite.revoked", subject: pending.email, now });
    },
    { behavior: "immediate" },
  );
}

/**
 * Takes up an invite: the person chooses a name and a password and is in the crew. Once only.
 * @returns the new member's id
 * @throws FaultError "not-found" for a dead link, "invalid" for a weak password, "conflict" for an e-mail that is taken
 */
export async function acceptInvite(
  db: Db,
  input: { token: string; name: string; password: string },
  now: number,
): Promise<number> {
  const open = getOpenInvite(db, hashToken(input.token), now);
  if (!open) throw fault("not-found", INVITE_DEAD);
  const wrong = passwordFault(input.password, open.email);
  if (wrong) throw fault("invalid", wrong, { password: wrong });
  const passwordHash = await hashPassword(input.password);
  return db.transaction((tx) => join(tx, open, input.name, passwordHash, now), { behavior: "immediate" });
}

function join(tx: Handle, open: OpenInvite, name: string, passwordHash: string, now: number): number {
  const { shopId, email, roles } = open;
  if (!takeInvite(tx, shopId, open.id, now)) throw fault("not-found", INVITE_DEAD);
  const holder = getEmailHolder(tx, email);
  if (holder && (holder.shopId !== shopId || !holder.isRemoved)) {
    throw fault("conflict", "This e-mail has a sign-in already. Use that, or ask the owner to invite another e-mail.");
  }
  const member = { shopId, email, name, passwordHash, roles, now };
  if (holder) reviveMember(tx, holder.memberId, member);
  const memberId = holder?.memberId ?? insertMember(tx, member);
  insertAudit(tx, { shopId, memberId, action: "member.joined", subject: name, detail: { roles }, now });
  return memberId;
}

function sendInvite(tx: Handle, owner: SignedIn, words: InviteWords, action: AuditAction, now: number): void {
  const { shopId, memberId: invitedById } = owner;
  const { email, name, roles } = words;
  const { token, tokenHash } = newToken();
  revokeInvitesTo(tx, shopId, email, now);
  insertInvite(tx, { shopId, email, name, roles, tokenHash, invitedById, now, expiresAt: now + CREW_LIMITS.inviteMs });
  const link = wholeLink(routes.acceptInvite(token));
  const mail = inviteMail({ shopName: owner.shop.name, invitedBy: owner.name, name, roles, link });
  queueMail(tx, { shopId, kind: "invite", toEmail: email, ...mail, now });
  insertAudit(tx, { ...byMember(owner), action, subject: email, detail: { roles }, now });
}

function requirePending(db: Handle, shopId: number, inviteId: number): PendingInvite {
  const pending = getPendingInvite(db, shopId, inviteId);
  if (!pending) throw fault("not-found", "That invite is gone: used or taken back. Reload to see the crew as it is.");
  return pending;
}

function byMember(member: SignedIn): { shopId: number; memberId: number } {
  return { shopId: member.shopId, memberId: member.memberId };
}
