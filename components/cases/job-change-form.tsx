"use client";

import { useActionState } from "react";
import { FormAnswer } from "@/components/crew/form-answer";
import { Field, SelectField } from "@/components/ui/field";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import { BASE_METALS, BASE_METAL_TITLES, LIMITS } from "@/lib/cases/case-words";
import type { JobMetal } from "@/lib/cases/job-words";
import { JobCostFields, type JobFigures } from "./job-cost-fields";
import { useAnswerFocus } from "./use-answer-focus";

export interface JobChangeFormProps {
  /** The thumb bar's button sends it by this id. */
  id: string;
  jobId: number;
  metal: JobMetal;
  figures: JobFigures;
  currencySign: string | null;
  action: (previous: ActState<{ number: string }>, form: FormData) => Promise<ActState<{ number: string }>>;
}

/** Changes what a job's parts are made of, and what the prices of a job's later cases rest on. */
export function JobChangeForm({ id, jobId, metal, figures, currencySign, action }: JobChangeFormProps) {
  const [state, send] = useActionState(action, null);
  const form = useAnswerFocus(state);
  return (
    <form className="form" id={id} action={send} ref={form}>
      <FormAnswer state={state} done={{ title: "The job is changed", words: "Its open cases are priced again." }} />
      <input type="hidden" name="jobId" value={jobId} />
      <div className="form__pair">
        <SelectField
          label="Base metal"
          name="baseMetal"
          options={BASE_METALS.map((each) => ({ value: each, label: BASE_METAL_TITLES[each] }))}
          defaultValue={typed(state, "baseMetal", metal.baseMetal)}
          error={fieldFault(state, "baseMetal")}
        />
        <Field
          label="Alloy"
          name="alloy"
          optional
          maxLength={LIMITS.nameChars}
          defaultValue={typed(state, "alloy", metal.alloy ?? "")}
          error={fieldFault(state, "alloy")}
        />
      </div>
      <JobCostFields state={state} figures={figures} currencySign={currencySign} />
      <div className="desk-only">
        <SubmitButton variant="main">Save the job</SubmitButton>
      </div>
    </form>
  );
}
