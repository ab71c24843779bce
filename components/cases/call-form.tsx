"use client";

import { useState } from "react";
import { Note } from "@/components/ui/note";
import { Stops } from "@/components/ui/stops";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault } from "@/lib/act-state";
import { SURENESS, type Sureness } from "@/lib/cases/case-words";
import { CANT_TELL } from "@/lib/cases/snap-draft";
import { CallPicks } from "./call-picks";
import { FaultNote } from "./fault-note";
import { useSend, type FormAct } from "./use-send";

export interface CallFormProps {
  caseRef: string;
  classes: readonly { slug: string; title: string }[];
  suggested: readonly string[];
  onCall: FormAct<{ ref: string }>;
}

/** A further call on a part that is held: which class, how sure. */
export function CallForm({ caseRef, classes, suggested, onCall }: CallFormProps) {
  const { state, isBusy, form } = useSend(onCall);
  const [called, setCalled] = useState<string | null>(null);
  const [sure, setSure] = useState<Sureness | null>(null);
  if (state?.ok) {
    return (
      <Note tone="green" title="Your call is in" role="status">
        The senior tech sees it at the second look.
      </Note>
    );
  }
  return (
    <form {...form} noValidate className="stack-tight">
      <input type="hidden" name="ref" value={caseRef} />
      <FaultNote state={state} title="The call was not saved" />
      <CallPicks
        legend="Your call"
        hideLegend
        classes={classes}
        suggested={suggested}
        value={called}
        onChange={setCalled}
        error={fieldFault(state, "calledClass")}
      />
      {called === CANT_TELL ? (
        <input type="hidden" name="sure" value="1" />
      ) : (
        <Stops
          name="sure"
          hideLegend
          value={sure}
          onChange={(event) => setSure(SURENESS.find((notch) => String(notch) === event.target.value) ?? null)}
          error={fieldFault(state, "sure")}
        />
      )}
      <SubmitButton busy={isBusy} disabledReason={called === null ? "Pick a class, or can't tell." : undefined}>
        That&apos;s my call
      </SubmitButton>
    </form>
  );
}
