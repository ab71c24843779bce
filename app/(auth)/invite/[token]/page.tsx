import type { Metadata } from "next";
import Link from "next/link";
import { Door } from "@/components/crew/door";
import { NewPasswordForm } from "@/components/crew/new-password-form";
import { Note } from "@/components/ui/note";
import { getDb } from "@/db/client";
import { getOpenInvite } from "@/db/queries/invites";
import { ROLE_TITLES } from "@/lib/cases/case-words";
import { routes } from "@/lib/routes";
import { INVITE_DEAD } from "@/lib/server/crew/invites";
import { hashToken } from "@/lib/server/crew/tokens";
import { joinCrew } from "../../actions";

export const metadata: Metadata = { title: "Join the crew" };

export default async function InvitePage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const open = getOpenInvite(getDb(), hashToken(token), Date.now());
  if (!open) {
    return (
      <Door title="Join the crew">
        <Note tone="amber" title="This link does not work any more">
          {INVITE_DEAD}
        </Note>
        <Link className="solo" href={routes.signIn()}>
          Go to the sign-in
        </Link>
      </Door>
    );
  }
  return (
    <Door title={`Join ${open.shopName}`}>
      <p>You come in as: {open.roles.map((role) => ROLE_TITLES[role]).join(", ")}.</p>
      <NewPasswordForm action={joinCrew} token={token} email={open.email} name={open.name} label="Join the crew" />
    </Door>
  );
}
