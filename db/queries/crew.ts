import { and, asc, eq, isNull } from "drizzle-orm";
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
    .select({ memberId: members.id, shopId: members.shopId, name: members.name, email: members.email, shop: shopColumns })
    .from(members)
    .innerJoin(shops, eq(shops.id, members.shopId))
    .where(and(eq(members.id, memberId), eq(members.sessionVersion, sessionVersion), isNull(members.removedAt)))
    .get();
  if (!row) return null;
  const roles = db
    .select({ role: memberRoles.role })
    .from(memberRoles)
    .where(and(eq(memberRoles.shopId, row.shopId), eq(memberRoles.memberId, memberId)))
    .orderBy(asc(memberRoles.role))
    .all()
    .map((each) => each.role);
  return roles.length > 0 ? { ...row, roles } : null;
}
