"use client";

import { useActionState } from "react";
import type { ReactNode } from "react";
import { FormAnswer } from "@/components/crew/form-answer";
import { SubmitButton } from "@/components/ui/submit-button";
import type { ActState } from "@/lib/act-state";

export interface JobTurnFormProps {
  jobId: number;
  /** "Close the job" */
  label: string;
  variant: "main" | "plain";
  /** The thumb bar's button sends it by this id, and the form shows its own only on a wide screen. */
  id?: string;
  /** What it means. */
  children: ReactNode;
  action: (previous: ActState<{ number: string }>, form: FormData) => Promise<ActState<{ number: string }>>;
}

/** Closes a job or opens it again: one button. */
export function JobTurnForm({ jobId, label, variant, id, children, action }: JobTurnFormProps) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" id={id} action={send}>
      <p>{children}</p>
      <FormAnswer state={state} />
      <input type="hidden" name="jobId" value={jobId} />
      <div className={id ? "desk-only" : undefined}>
        <SubmitButton variant={variant}>{label}</SubmitButton>
      </div>
    </form>
  );
}
