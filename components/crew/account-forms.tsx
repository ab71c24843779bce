"use client";

import { useActionState } from "react";
import { CheckField } from "@/components/ui/check-field";
import { Field } from "@/components/ui/field";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed } from "@/lib/act-state";
import { CREW_LIMITS } from "@/lib/crew/crew-limits";
import { MAIL_KIND_TITLES, MAIL_KINDS, type MailKind } from "@/lib/crew/mail-kinds";
import type { FormAction } from "./form-action";
import { FormAnswer } from "./form-answer";
import { PasswordField } from "./password-field";

/** One's own name. */
export function NameForm({ action, name }: { action: FormAction; name: string }) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" action={send}>
      <Field
        key={name}
        label="Name"
        name="name"
        autoComplete="name"
        required
        maxLength={120}
        defaultValue={typed(state, "name", name)}
        error={fieldFault(state, "name")}
      />
      <FormAnswer state={state} done={{ title: "Name saved" }} />
      <div>
        <SubmitButton>Save the name</SubmitButton>
      </div>
    </form>
  );
}

/** The current password, then the new one. */
export function PasswordForm({ action, email }: { action: FormAction; email: string }) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" action={send}>
      <input type="hidden" name="email" autoComplete="username" defaultValue={email} />
      <PasswordField
        label="Current password"
        name="currentPassword"
        autoComplete="current-password"
        error={fieldFault(state, "currentPassword")}
      />
      <PasswordField
        label="New password"
        name="password"
        autoComplete="new-password"
        minLength={CREW_LIMITS.passwordLeastChars}
        hint={`At least ${CREW_LIMITS.passwordLeastChars} characters. Four plain words do well.`}
        error={fieldFault(state, "password")}
      />
      <FormAnswer state={state} />
      <div>
        <SubmitButton>Change the password</SubmitButton>
      </div>
    </form>
  );
}

/** Which messages one gets. Invites and password links always come. */
export function MailForm({ action, refused }: { action: FormAction; refused: readonly MailKind[] }) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" action={send}>
      <fieldset>
        <legend className="field__label">Mail me when</legend>
        {MAIL_KINDS.map((kind) => (
          <CheckField
            key={`${kind}-${refused.includes(kind)}`}
            name="kinds[]"
            value={kind}
            label={MAIL_KIND_TITLES[kind]}
            defaultChecked={!refused.includes(kind)}
          />
        ))}
      </fieldset>
      <FormAnswer state={state} done={{ title: "Mails chosen" }} />
      <div>
        <SubmitButton>Save the choice</SubmitButton>
      </div>
    </form>
  );
}
