"use client";

import { useActionState } from "react";
import { Field } from "@/components/ui/field";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed } from "@/lib/act-state";
import { CREW_LIMITS } from "@/lib/crew/crew-limits";
import type { FormAction } from "./form-action";
import { FormAnswer } from "./form-answer";
import { PasswordField } from "./password-field";

export interface NewPasswordFormProps {
  action: FormAction;
  /** The secret of the link. */
  token: string;
  email: string;
  /** Asks for the name too, with this as a start: the person joins. */
  name?: string;
  label: string;
}

/** Chooses a password by a mailed link: when joining a crew, or in place of a forgotten one. */
export function NewPasswordForm({ action, token, email, name, label }: NewPasswordFormProps) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" action={send}>
      <FormAnswer state={state} />
      <input type="hidden" name="token" value={token} />
      {name !== undefined && (
        <Field
          label="Your name"
          name="name"
          autoComplete="name"
          required
          maxLength={120}
          defaultValue={typed(state, "name", name)}
          error={fieldFault(state, "name")}
        />
      )}
      {/* Read-only, so that a password keeper files the new password under it. */}
      <Field label="E-mail" name="email" type="email" autoComplete="username" readOnly defaultValue={email} />
      <PasswordField
        label="New password"
        name="password"
        autoComplete="new-password"
        minLength={CREW_LIMITS.passwordLeastChars}
        hint={`At least ${CREW_LIMITS.passwordLeastChars} characters. Four plain words do well.`}
        error={fieldFault(state, "password")}
      />
      <SubmitButton variant="main" wide>
        {label}
      </SubmitButton>
    </form>
  );
}
