"use client";

import { useActionState } from "react";
import { FormAnswer } from "@/components/crew/form-answer";
import { SubmitButton } from "@/components/ui/submit-button";
import type { ActState } from "@/lib/act-state";
import { JobCostFields, type JobFigures } from "./job-cost-fields";
import { useAnswerFocus } from "./use-answer-focus";

export interface JobChangeFormProps {
  /** The thumb bar's button sends it by this id. */
  id: string;
  jobId: number;
  figures: JobFigures;
  currencySign: string | null;
  action: (previous: ActState<{ number: string }>, form: FormData) => Promise<ActState<{ number: string }>>;
}

/** Changes what the prices of a job's later cases rest on. */
export function JobChangeForm({ id, jobId, figures, currencySign, action }: JobChangeFormProps) {
  const [state, send] = useActionState(action, null);
  const form = useAnswerFocus(state);
  return (
    <form className="form" id={id} action={send} ref={form}>
      <FormAnswer state={state} done={{ title: "The job is changed", words: "Its open cases are priced again." }} />
      <input type="hidden" name="jobId" value={jobId} />
      <JobCostFields state={state} figures={figures} currencySign={currencySign} />
      <div className="desk-only">
        <SubmitButton variant="main">Save the job</SubmitButton>
      </div>
    </form>
  );
}
