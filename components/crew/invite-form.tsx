"use client";

import { useActionState } from "react";
import { Field } from "@/components/ui/field";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed } from "@/lib/act-state";
import type { FormAction } from "./form-action";
import { FormAnswer } from "./form-answer";
import { RolePicks } from "./role-picks";

/** Invites somebody to the crew by mail. */
export function InviteForm({ action }: { action: FormAction }) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" action={send}>
      <FormAnswer
        state={state}
        done={{ title: "The invite is on its way", words: "Its link works once, for seven days." }}
      />
      <div className="form__pair">
        <Field
          label="Name"
          name="name"
          required
          maxLength={120}
          defaultValue={typed(state, "name")}
          error={fieldFault(state, "name")}
        />
        <Field
          label="E-mail"
          name="email"
          type="email"
          required
          maxLength={254}
          defaultValue={typed(state, "email")}
          error={fieldFault(state, "email")}
        />
      </div>
      <RolePicks state={state} roles={[]} />
      <SubmitButton variant="main" glyph="ui-mail">
        Send the invite
      </SubmitButton>
    </form>
  );
}
