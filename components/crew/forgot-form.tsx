"use client";

import { useActionState } from "react";
import { Field } from "@/components/ui/field";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed } from "@/lib/act-state";
import type { FormAction } from "./form-action";
import { FormAnswer } from "./form-answer";

const DONE = {
  title: "Look in your mailbox",
  words:
    "If that e-mail is in a crew, a link is on its way. It works for an hour. Nothing there? Look among the junk, or ask your owner.",
};

/** Asks for the e-mail and says the same whoever it is. */
export function ForgotForm({ action }: { action: FormAction }) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" action={send}>
      <FormAnswer state={state} done={DONE} />
      <Field
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        required
        maxLength={254}
        defaultValue={typed(state, "email")}
        error={fieldFault(state, "email")}
      />
      <SubmitButton variant="main" wide>
        Mail me a link
      </SubmitButton>
    </form>
  );
}
