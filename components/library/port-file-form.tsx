"use client";

import { useActionState } from "react";
import { FormAnswer } from "@/components/crew/form-answer";
import { PortEntries, type PortView } from "@/components/library/port-entries";
import { FieldFrame } from "@/components/ui/field-wiring";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, type ActState } from "@/lib/act-state";

export interface LookedAtFile {
  text: string;
  view: PortView;
}

interface PortFileFormProps {
  look: (previous: ActState<LookedAtFile>, form: FormData) => Promise<ActState<LookedAtFile>>;
  action: Parameters<typeof PortEntries>[0]["action"];
}

/** Chooses a file and shows what it would bring before anything is written. */
export function PortFileForm({ look, action }: PortFileFormProps) {
  const [state, send] = useActionState(look, null);
  const problems = fieldFault(state, "file");
  return (
    <>
      <form className="form" action={send}>
        <FormAnswer state={state} />
        <FieldFrame
          words={{
            label: "Library file",
            hint: "A JSON file that was taken out here or in another shop, at most 4 MB.",
            error: problems,
          }}
        >
          {(wiring) => <input type="file" name="file" accept="application/json,.json" required {...wiring} />}
        </FieldFrame>
        <div className="btns">
          <SubmitButton>Look at it first</SubmitButton>
        </div>
      </form>
      {state?.ok && (
        // Keyed: another file is another choice.
        <PortEntries
          key={state.value.text.length}
          from="file"
          text={state.value.text}
          view={state.value.view}
          action={action}
        />
      )}
    </>
  );
}
