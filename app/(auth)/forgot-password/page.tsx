import type { Metadata } from "next";
import Link from "next/link";
import { Door } from "@/components/crew/door";
import { ForgotForm } from "@/components/crew/forgot-form";
import { readEnv } from "@/lib/env";
import { routes } from "@/lib/routes";
import { askForReset } from "../actions";

export const metadata: Metadata = { title: "Forgot your password" };

export default function ForgotPasswordPage() {
  return (
    <Door title="Forgot your password?">
      <p>Write the e-mail that you sign in with. A link to set a new password goes there.</p>
      <ForgotForm action={askForReset} />
      {!readEnv().SMTP_URL && (
        <p className="rests">This server sends no mail itself. The owner finds every message on the outbox page.</p>
      )}
      <Link className="solo" href={routes.signIn()}>
        Back to the sign-in
      </Link>
    </Door>
  );
}
