"use client";

import { useActionState } from "react";
import type { WayAction } from "@/components/costs/strip-way-form";
import { FormAnswer } from "@/components/crew/form-answer";
import { SubmitButton } from "@/components/ui/submit-button";

export interface StripTurnFormProps {
  /** The thumb bar's button sends it by this id. */
  id?: string;
  slug: string;
  startedFrom: number;
  isRetired: boolean;
  action: WayAction;
}

/** Retires a way, or brings it back: one button. */
export function StripTurnForm({ id, slug, startedFrom, isRetired, action }: StripTurnFormProps) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" id={id} action={send}>
      <p>
        {isRetired
          ? "Estimates from now on may take it again."
          : "Estimates from now on leave it out. Cases of earlier days keep it, and it can be brought back."}
      </p>
      <FormAnswer state={state} />
      <input type="hidden" name="slug" value={slug} />
      <input type="hidden" name="startedFrom" value={startedFrom} />
      <input type="hidden" name="retired" value={String(!isRetired)} />
      <div className={id ? "desk-only" : undefined}>
        <SubmitButton variant={isRetired ? "main" : "plain"}>
          {isRetired ? "Bring it back" : "Retire this way"}
        </SubmitButton>
      </div>
    </form>
  );
}
