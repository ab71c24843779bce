import type { Metadata } from "next";
import { Door } from "@/components/crew/door";
import { NewPasswordForm } from "@/components/crew/new-password-form";
import { LinkButton } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import { getDb } from "@/db/client";
import { getOpenReset } from "@/db/queries/password-resets";
import { routes } from "@/lib/routes";
import { RESET_DEAD } from "@/lib/server/crew/password-resets";
import { hashToken } from "@/lib/server/crew/tokens";
import { setNewPassword } from "../../actions";

export const metadata: Metadata = { title: "Set a new password" };

export default async function ResetPasswordPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const open = getOpenReset(getDb(), hashToken(token), Date.now());
  return (
    <Door title="Set a new password">
      {open ? (
        <NewPasswordForm action={setNewPassword} token={token} email={open.email} label="Set the password" />
      ) : (
        <>
          <Note tone="amber" title="This link does not work any more">
            {RESET_DEAD}
          </Note>
          <LinkButton href={routes.forgotPassword()} variant="main" wide>
            Ask for a new link
          </LinkButton>
        </>
      )}
    </Door>
  );
}
