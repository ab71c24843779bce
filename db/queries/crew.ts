import { and, asc, count, eq, isNull, ne, sql } from "drizzle-orm";
import type { Role } from "@/lib/cases/case-words";
import type { Handle } from "../open";
import { memberRoles, members, shops } from "../schema";

export interface ShopFacts {
  id: number;
  slug: string;
  name: string;
  timeZone: string;
  currency: string;
  units: "metric" | "us";
  isDemo: boolean;
}

/** A member as every request sees them. Never holds the password hash. */
export interface SignedIn {
  memberId: number;
  shopId: number;
  name: string;
  email: string;
  roles: Role[];
  shop: ShopFacts;
}

const shopColumns = {
  id: shops.id,
  slug: shops.slug,
  name: shops.name,
  timeZone: shops.timeZone,
  currency: shops.currency,
  units: shops.units,
  isDemo: shops.isDemo,
};

/**
 * The member behind a session, with the roles that hold now.
 * @returns null when the member is gone or the session version has moved on: the session is dead
 */
export function getSignedIn(db: Handle, memberId: number, sessionVersion: number): SignedIn | null {
  const row = db
    .select({
      memberId: members.id,
      shopId: members.shopId,
      name: members.name,
      email: members.email,
      shop: shopColumns,
    })
    .from(members)
    .innerJoin(shops, eq(shops.id, members.shopId))
    .where(and(eq(members.id, memberId), eq(members.sessionVersion, sessionVersion), isNull(members.removedAt)))
    .get();
  if (!row) return null;
  const roles = listRoles(db, row.shopId, memberId);
  return roles.length > 0 ? { ...row, roles } : null;
}

/** What the sign-in compares against. */
export interface Credentials {
  memberId: number;
  shopId: number;
  passwordHash: string;
  sessionVersion: number;
}

/**
 * The only way out of this file for a password hash: the sign-in, and a member who proves their own current password.
 * @param email lower case
 * @returns null when nobody who is in a crew now has that e-mail
 */
export function getCredentials(db: Handle, email: string): Credentials | null {
  const row = db
    .select({
      memberId: members.id,
      shopId: members.shopId,
      passwordHash: members.passwordHash,
      sessionVersion: members.sessionVersion,
    })
    .from(members)
    .where(and(eq(members.email, email), isNull(members.removedAt)))
    .get();
  return row?.passwordHash ? { ...row, passwordHash: row.passwordHash } : null;
}

/** A person of the crew, as the crew page and mails need them. */
export interface CrewMember {
  memberId: number;
  name: string;
  email: string;
  roles: Role[];
  createdAt: number;
}

const crewColumns = { memberId: members.id, name: members.name, email: members.email, createdAt: members.createdAt };

/** Everybody in the crew now, by name. */
export function listCrew(db: Handle, shopId: number): CrewMember[] {
  const people = db
    .select(crewColumns)
    .from(members)
    .where(and(eq(members.shopId, shopId), isNull(members.removedAt)))
    .orderBy(asc(sql`lower(${members.name})`), asc(members.id))
    .all();
  const held = db.select().from(memberRoles).where(eq(memberRoles.shopId, shopId)).orderBy(asc(memberRoles.role)).all();
  return people.map((person) => ({
    ...person,
    roles: held.filter((each) => each.memberId === person.memberId).map((each) => each.role),
  }));
}

/** One person of the crew; null when they are removed or of another shop. */
export function getCrewMember(db: Handle, shopId: number, memberId: number): CrewMember | null {
  const person = db
    .select(crewColumns)
    .from(members)
    .where(and(eq(members.shopId, shopId), eq(members.id, memberId), isNull(members.removedAt)))
    .get();
  return person ? { ...person, roles: listRoles(db, shopId, memberId) } : null;
}

/** Whose e-mail this is in any shop, the removed included: an e-mail is one person in one shop for good. */
export function getEmailHolder(
  db: Handle,
  email: string,
): { memberId: number; shopId: number; isRemoved: boolean } | null {
  const row = db
    .select({ memberId: members.id, shopId: members.shopId, removedAt: members.removedAt })
    .from(members)
    .where(eq(members.email, email))
    .get();
  return row ? { memberId: row.memberId, shopId: row.shopId, isRemoved: row.removedAt !== null } : null;
}

/** How many other people of the crew hold the owner's role now. */
export function countOtherOwners(db: Handle, shopId: number, memberId: number): number {
  const row = db
    .select({ owners: count() })
    .from(memberRoles)
    .innerJoin(members, eq(members.id, memberRoles.memberId))
    .where(
      and(
        eq(memberRoles.shopId, shopId),
        eq(memberRoles.role, "owner"),
        ne(memberRoles.memberId, memberId),
        isNull(members.removedAt),
      ),
    )
    .get();
  return row?.owners ?? 0;
}

function listRoles(db: Handle, shopId: number, memberId: number): Role[] {
  return db
    .select({ role: memberRoles.role })
    .from(memberRoles)
    .where(and(eq(memberRoles.shopId, shopId), eq(memberRoles.memberId, memberId)))
    .orderBy(asc(memberRoles.role))
    .all()
    .map((each) => each.role);
}
