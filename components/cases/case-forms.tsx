"use client";

import { useEffect } from "react";
import type { ReactNode } from "react";
import { FaultNote } from "@/components/cases/fault-note";
import { useSend, type FormAct } from "@/components/cases/use-send";
import { Field, SelectField, TextAreaField } from "@/components/ui/field";
import { SubmitButton } from "@/components/ui/submit-button";
import { say } from "@/components/ui/toast";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import {
  BASE_METALS,
  BASE_METAL_TITLES,
  LIMITS,
  STAGES_FOUND,
  STAGE_TITLES,
  type BaseMetal,
  type StageFound,
} from "@/lib/cases/case-words";

type CaseAct = FormAct<{ ref: string }>;

/** One thing that can be done to the case, folded away until it is wanted. */
export function CaseDoing({ title, isRefused, children }: { title: string; isRefused?: boolean; children: ReactNode }) {
  return (
    <details className="doing" open={isRefused ? true : undefined}>
      <summary>{title}</summary>
      {children}
    </details>
  );
}

/** Says that it is saved, once; the history on the page has it by then. */
function useSaid(state: ActState, words: string): void {
  const isSaved = state?.ok === true;
  useEffect(() => {
    if (isSaved) say(words);
  }, [isSaved, state, words]);
}

const isRefused = (state: ActState) => state !== null && !state.ok;

interface WhyFormProps {
  caseRef: string;
  title: string;
  /** What it means, before it is done. */
  hint: string;
  button: string;
  saidWords: string;
  action: CaseAct;
}

/** A change of state with its reason: taking back, opening again. */
export function CaseWhyForm({ caseRef, title, hint, button, saidWords, action }: WhyFormProps) {
  const { state, isBusy, form } = useSend(action);
  useSaid(state, saidWords);
  return (
    <CaseDoing title={title} isRefused={isRefused(state)}>
      <form {...form} noValidate className="form">
        <input type="hidden" name="ref" value={caseRef} />
        <FaultNote state={state} />
        <TextAreaField
          label="Why"
          hint={hint}
          name="why"
          maxLength={LIMITS.noteChars}
          defaultValue={typed(state, "why")}
          error={fieldFault(state, "why")}
        />
        <SubmitButton variant="hold" busy={isBusy}>
          {button}
        </SubmitButton>
      </form>
    </CaseDoing>
  );
}

interface AmendFormProps {
  caseRef: string;
  facts: { quantity: number; baseMetal: BaseMetal; stageFound: StageFound; note: string };
  action: CaseAct;
}

/** Correcting the facts of a part that is still held. What stood before stays in the history. */
export function CaseAmendForm({ caseRef, facts, action }: AmendFormProps) {
  const { state, isBusy, form } = useSend(action);
  useSaid(state, "Facts corrected. The history keeps what stood before.");
  return (
    <CaseDoing title="Correct the facts" isRefused={isRefused(state)}>
      <form {...form} noValidate className="form">
        <input type="hidden" name="ref" value={caseRef} />
        <FaultNote state={state} />
        <div className="form__pair">
          <Field
            label="Parts"
            name="quantity"
            inputMode="numeric"
            defaultValue={typed(state, "quantity", String(facts.quantity))}
            error={fieldFault(state, "quantity")}
          />
          <SelectField
            label="Base metal"
            name="baseMetal"
            defaultValue={typed(state, "baseMetal", facts.baseMetal)}
            options={BASE_METALS.map((value) => ({ value, label: BASE_METAL_TITLES[value] }))}
            error={fieldFault(state, "baseMetal")}
          />
        </div>
        <SelectField
          label="Found"
          name="stageFound"
          defaultValue={typed(state, "stageFound", facts.stageFound)}
          options={STAGES_FOUND.map((value) => ({ value, label: STAGE_TITLES[value] }))}
          error={fieldFault(state, "stageFound")}
        />
        <TextAreaField
          label="Note"
          name="note"
          maxLength={LIMITS.noteChars}
          defaultValue={typed(state, "note", facts.note)}
          error={fieldFault(state, "note")}
        />
        <SubmitButton busy={isBusy}>Save the correction</SubmitButton>
      </form>
    </CaseDoing>
  );
}
