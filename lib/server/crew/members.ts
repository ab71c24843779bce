import type { Db, Handle } from "@/db/open";
import { insertAudit } from "@/db/queries/audit";
import { countOtherOwners, getCrewMember, type CrewMember, type SignedIn } from "@/db/queries/crew";
import { markMemberRemoved, setRoles } from "@/db/queries/crew-changes";
import type { Role } from "@/lib/cases/case-words";
import { fault } from "@/lib/fault";

/**
 * Gives a member other roles; they hold from that person's next request.
 * @throws FaultError "not-found" outside the owner's crew, "conflict" when the shop would be left without an owner
 */
export function changeRoles(db: Db, owner: SignedIn, input: { memberId: number; roles: Role[] }, now: number): void {
  const { shopId, memberId: byId } = owner;
  const { memberId, roles } = input;
  db.transaction(
    (tx) => {
      const member = requireMember(tx, shopId, memberId);
      if (!roles.includes("owner")) demandAnotherOwner(tx, shopId, member);
      setRoles(tx, shopId, memberId, roles);
      const detail = { from: member.roles, to: roles };
      insertAudit(tx, { shopId, memberId: byId, action: "member.roles", subject: member.name, detail, now });
    },
    { behavior: "immediate" },
  );
}

/**
 * Takes a member out of the crew: signed out at their next request, while what they did stays in every history.
 * @throws FaultError "not-found" outside the owner's crew, "conflict" for the last owner
 */
export function removeMember(db: Db, owner: SignedIn, memberId: number, now: number): void {
  const { shopId, memberId: byId } = owner;
  db.transaction(
    (tx) => {
      const member = requireMember(tx, shopId, memberId);
      demandAnotherOwner(tx, shopId, member);
      markMemberRemoved(tx, shopId, memberId, now);
      const detail = { roles: member.roles, email: member.email };
      insertAudit(tx, { shopId, memberId: byId, action: "member.removed", subject: member.name, detail, now });
    },
    { behavior: "immediate" },
  );
}

function requireMember(db: Handle, shopId: number, memberId: number): CrewMember {
  const member = getCrewMember(db, shopId, memberId);
  if (!member) throw fault("not-found", "They are not in the crew any more. Reload to see it as it is.");
  return member;
}

function demandAnotherOwner(tx: Handle, shopId: number, member: CrewMember): void {
  if (!member.roles.includes("owner") || countOtherOwners(tx, shopId, member.memberId) > 0) return;
  throw fault("conflict", `${member.name} is the only owner. Make somebody else an owner first.`);
}
