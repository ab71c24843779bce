import "server-only";
import { cache } from "react";
import { forbidden, redirect } from "next/navigation";
import { getServerSession } from "next-auth";
import { getDb } from "@/db/client";
import { getSignedIn, type SignedIn } from "@/db/queries/crew";
import { can, type Permission } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { authOptions } from "./auth-options";

/** Who is signed in, read from the database at each request: a removed role or member is gone at the next one. */
export const currentMember = cache(async (): Promise<SignedIn | null> => {
  const session = await getServerSession(authOptions);
  if (!session?.memberId) return null;
  return getSignedIn(getDb(), session.memberId, session.sessionVersion);
});

/**
 * The first line of every page: sends a stranger to the sign-in page and answers 403 where the roles do not reach.
 * A layout is not a guard: it does not run again when people move between pages.
 */
export async function guardPage(permission: Permission, here: string): Promise<SignedIn> {
  const member = await currentMember();
  if (!member) redirect(routes.signIn(here));
  if (!can(member, permission)) forbidden();
  return member;
}
