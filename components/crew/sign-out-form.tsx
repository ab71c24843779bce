"use client";

import { useActionState } from "react";
import { SubmitButton } from "@/components/ui/submit-button";
import type { FormAction } from "./form-action";
import { FormAnswer } from "./form-answer";

export interface SignOutFormProps {
  action: FormAction;
  label: string;
  /** hold: for the one that ends every session. */
  variant?: "plain" | "hold";
}

/** One press, signed out. */
export function SignOutForm({ action, label, variant = "plain" }: SignOutFormProps) {
  const [state, send] = useActionState(action, null);
  return (
    <form action={send}>
      <FormAnswer state={state} />
      <SubmitButton variant={variant}>{label}</SubmitButton>
    </form>
  );
}
