"use client";

import Link from "next/link";
import { useRef, useState, type FormEvent } from "react";
import { flushSync } from "react-dom";
import { Button } from "@/components/ui/button";
import { Field } from "@/components/ui/field";
import { signInWords } from "@/lib/crew/sign-in-words";
import { routes } from "@/lib/routes";
import { askSignIn } from "./auth-call";
import { DemoSignIns, type DemoGroup } from "./demo-sign-ins";
import { PasswordField } from "./password-field";
import styles from "./sign-in-form.module.css";

export interface SignInFormProps {
  /** Where to go afterwards; a path of this site. */
  to: string;
  /** next-auth's code when a sign-in without script came back here. */
  code: string | null;
  demo: { password: string; groups: DemoGroup[] } | null;
}

const NO_SIGNAL = "The server did not answer. Check the Wi-Fi and try again; what you typed is still here.";

/** E-mail and password. A refusal stands beside the password, and what was typed stays. */
export function SignInForm({ to, code, demo }: SignInFormProps) {
  const form = useRef<HTMLFormElement>(null);
  const [error, setError] = useState(code === null ? undefined : signInWords(code));
  const [isBusy, setBusy] = useState(false);

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    const typed = new FormData(event.currentTarget);
    setBusy(true);
    setError(undefined);
    const refusal = await askSignIn(String(typed.get("email")), String(typed.get("password"))).catch(() => "no-signal");
    // A whole new page load: everything on it is rendered for the person who is now signed in.
    if (refusal === null) return window.location.assign(to);
    // At once, so that the sentence is there when the focus arrives and readers say both.
    flushSync(() => {
      setBusy(false);
      setError(refusal === "no-signal" ? NO_SIGNAL : signInWords(refusal));
    });
    focusOn(form.current, "password");
  }

  function fillIn(email: string) {
    setValue(form.current, "email", email);
    setValue(form.current, "password", demo?.password ?? "");
    form.current?.querySelector<HTMLButtonElement>("button[type=submit]")?.focus();
  }

  return (
    // method: should the script not have loaded, the password must not end up in the address bar.
    <form ref={form} className="form" method="post" onSubmit={submit}>
      <Field label="E-mail" name="email" type="email" autoComplete="username" required maxLength={254} />
      <PasswordField label="Password" name="password" autoComplete="current-password" error={error} />
      <Button variant="main" type="submit" wide busy={isBusy}>
        Sign in
      </Button>
      <div className={styles.foot}>
        <Link className="solo" href={routes.forgotPassword()}>
          Forgot it?
        </Link>
        <span className="small quiet">No account? Ask your owner.</span>
      </div>
      {demo && <DemoSignIns groups={demo.groups} password={demo.password} onPick={fillIn} />}
    </form>
  );
}

function fieldOf(form: HTMLFormElement | null, name: string): HTMLInputElement | null {
  const found = form?.elements.namedItem(name);
  return found instanceof HTMLInputElement ? found : null;
}

function setValue(form: HTMLFormElement | null, name: string, value: string): void {
  const field = fieldOf(form, name);
  if (field) field.value = value;
}

function focusOn(form: HTMLFormElement | null, name: string): void {
  const field = fieldOf(form, name);
  field?.focus();
  field?.select();
}
