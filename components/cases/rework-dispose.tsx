"use client";

import { SubmitButton } from "@/components/ui/submit-button";
import { TextAreaField } from "@/components/ui/field";
import { PickGroup } from "@/components/ui/pick";
import { fieldFault, typed } from "@/lib/act-state";
import { DISPOSITION_TITLES, LIMITS } from "@/lib/cases/case-words";
import { FaultNote } from "./fault-note";
import { useSend, type FormAct } from "./use-send";

export interface ReworkDisposeProps {
  caseRef: string;
  onDispose: FormAct<{ ref: string }>;
}

const WAYS = ["scrap", "concession", "regrade"] as const;

/** For a senior: the part is not reworked after all. Scrap, concession and regrade as ISO 9000 defines them. */
export function ReworkDispose({ caseRef, onDispose }: ReworkDisposeProps) {
  const { state, isBusy, form } = useSend(onDispose);
  return (
    <details className="rw__dispose" open={state !== null && !state.ok ? true : undefined}>
      <summary>Not reworked after all</summary>
      <form {...form} noValidate className="form">
        <input type="hidden" name="ref" value={caseRef} />
        <FaultNote state={state} />
        <PickGroup
          legend="What becomes of the part"
          name="disposition"
          kind="radio"
          layout="bar"
          defaultValue={typed(state, "disposition")}
          options={WAYS.map((way) => ({ value: way, label: DISPOSITION_TITLES[way] }))}
          error={fieldFault(state, "disposition")}
        />
        <TextAreaField
          label="Why"
          name="why"
          maxLength={LIMITS.noteChars}
          defaultValue={typed(state, "why")}
          error={fieldFault(state, "why")}
        />
        <SubmitButton variant="hold" busy={isBusy}>
          Close the case with this reason
        </SubmitButton>
      </form>
    </details>
  );
}
