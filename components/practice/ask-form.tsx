"use client";

import { FaultNote } from "@/components/cases/fault-note";
import { useSend, type FormAct } from "@/components/cases/use-send";
import type { ButtonProps } from "@/components/ui/button";
import { SubmitButton } from "@/components/ui/submit-button";

export interface AskFormProps {
  /** Id of the form, where the thumb bar submits it too. */
  id?: string;
  /** Null: one's own practice. */
  drillId: number | null;
  label: string;
  onAsk: FormAct<{ id: string }>;
  button?: Pick<ButtonProps, "variant" | "glyph" | "keyCap" | "className" | "aria-label">;
}

/** Asks for the next photo. A form and not a link, since asking puts the question down in the shop's books. */
export function AskForm({ id, drillId, label, onAsk, button }: AskFormProps) {
  const { state, isBusy, form } = useSend(onAsk);
  return (
    <form id={id} {...form} className="ask-form">
      <FaultNote state={state} title="No photo" />
      {drillId !== null && <input type="hidden" name="drillId" value={drillId} />}
      <SubmitButton busy={isBusy} {...button}>
        {label}
      </SubmitButton>
    </form>
  );
}
