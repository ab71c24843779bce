"use client";

import Link from "next/link";
import { useActionState } from "react";
import { FormAnswer } from "@/components/crew/form-answer";
import { Field, SelectField } from "@/components/ui/field";
import { Note } from "@/components/ui/note";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import { BASE_METAL_TITLES, BASE_METALS, LIMITS } from "@/lib/cases/case-words";
import { JOB_LIMITS } from "@/lib/cases/job.schema";
import { JobCostFields } from "./job-cost-fields";
import { useAnswerFocus } from "./use-answer-focus";

export interface JobOpenFormProps {
  /** The thumb bar's button sends it by this id. */
  id: string;
  customers: readonly string[];
  currencySign: string | null;
  /** Where the person goes on once the job is open. */
  onward: { href: string; words: string };
  action: (previous: ActState<{ number: string }>, form: FormData) => Promise<ActState<{ number: string }>>;
}

/** Opens a job: whose parts, what they are, what goes on them. */
export function JobOpenForm({ id, customers, currencySign, onward, action }: JobOpenFormProps) {
  const [state, send] = useActionState(action, null);
  const form = useAnswerFocus(state);
  return (
    <form className="form" id={id} action={send} ref={form}>
      {state?.ok ? (
        <Note tone="green" title={`Job ${state.value.number} is open`} role="status">
          <Link className="solo" href={onward.href}>
            {onward.words}
          </Link>
        </Note>
      ) : (
        <FormAnswer state={state} />
      )}
      <JobNames state={state} customers={customers} />
      <JobCostFields state={state} currencySign={currencySign} />
      {currencySign === null && <p className="small quiet">A senior fills in the part&rsquo;s value.</p>}
      <div className="desk-only">
        <SubmitButton variant="main">Open the job</SubmitButton>
      </div>
    </form>
  );
}

/** What the job and its parts are called, and what they are made of. */
function JobNames({ state, customers }: { state: ActState; customers: readonly string[] }) {
  const wiring = (name: string) => ({ name, defaultValue: typed(state, name), error: fieldFault(state, name) });
  return (
    <>
      <div className="form__pair">
        <Field label="Job number" required maxLength={JOB_LIMITS.numberChars} {...wiring("number")} />
        <Field label="Customer" required maxLength={LIMITS.nameChars} list="job-customers" {...wiring("customer")} />
        <datalist id="job-customers">
          {customers.map((name) => (
            <option key={name} value={name} />
          ))}
        </datalist>
      </div>
      <Field
        label="Part"
        required
        maxLength={LIMITS.nameChars}
        hint="One word or two: shell, rotor, cable lug."
        {...wiring("partName")}
      />
      <div className="form__pair">
        <SelectField
          label="Base metal"
          required
          placeholder="Choose one"
          options={BASE_METALS.map((metal) => ({ value: metal, label: BASE_METAL_TITLES[metal] }))}
          {...wiring("baseMetal")}
        />
        <Field label="Alloy" optional maxLength={LIMITS.nameChars} {...wiring("alloy")} />
      </div>
    </>
  );
}
