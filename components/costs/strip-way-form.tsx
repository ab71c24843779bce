"use client";

import { useRouter } from "next/navigation";
import { useActionState, useEffect, useState } from "react";
import { useAnswerFocus } from "@/components/cases/use-answer-focus";
import { StripBathFields, type StripBathView } from "@/components/costs/strip-bath-fields";
import { ThreeFields, type ThreeFieldsView } from "@/components/costs/three-fields";
import { FormAnswer } from "@/components/crew/form-answer";
import { Field } from "@/components/ui/field";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import { STRIP_LIMITS } from "@/lib/costs/strip-row.schema";

/** What the action answers. */
export interface SavedWayAnswer {
  slug: string;
  rowId: number;
  changed: number;
}
export type WayAction = (previous: ActState<SavedWayAnswer>, form: FormData) => Promise<ActState<SavedWayAnswer>>;

export interface StripWayFormProps {
  /** The thumb bar's button sends it by this id. */
  id: string;
  slug: string;
  /** The row that the figures are of. */
  startedFrom: number;
  /** A bath, or polishing by hand. */
  bath: StripBathView | null;
  polishing: { rate: ThreeFieldsView; source: string } | null;
  action: WayAction;
}

/** Changes a way to strip. After a conflict what now holds stands beside what was typed, and saving again puts it on top. */
export function StripWayForm({ id, slug, startedFrom, bath, polishing, action }: StripWayFormProps) {
  const [state, send] = useActionState(action, null);
  const form = useAnswerFocus(state);
  const router = useRouter();
  const isOvertaken = state !== null && !state.ok && state.fault.code === "conflict";
  const begun = useBegun(state, isOvertaken, startedFrom);
  useEffect(() => {
    // The row that somebody else saved: the next save begins from it.
    if (isOvertaken) router.refresh();
  }, [isOvertaken, router]);
  return (
    <form className="strip-way-form" id={id} action={send} ref={form}>
      <FormAnswer state={state} done={{ title: "The way is saved", words: doneWords(state) }} />
      <input type="hidden" name="slug" value={slug} />
      <input type="hidden" name="startedFrom" value={begun} />
      {bath && <StripBathFields view={bath} state={state} />}
      {polishing && (
        <>
          <ThreeFields view={polishing.rate} state={state} />
          <Field
            label="Where the figures come from"
            name="source"
            required
            maxLength={STRIP_LIMITS.sourceChars}
            defaultValue={typed(state, "source", polishing.source)}
            error={fieldFault(state, "source")}
          />
        </>
      )}
      <SubmitButton variant="main" className="desk-only">
        Save this way
      </SubmitButton>
    </form>
  );
}

/**
 * The row that what stands in the fields began from. It stays the same when the page behind the form is read again, or
 * somebody else's row would pass for the one that was seen; it moves with one's own save, and once a conflict is said.
 */
function useBegun(state: ActState<SavedWayAnswer>, isOvertaken: boolean, startedFrom: number): number {
  const [begun, setBegun] = useState(startedFrom);
  const [answered, setAnswered] = useState(state);
  if (state !== answered) {
    setAnswered(state);
    if (state?.ok) setBegun(state.value.rowId);
  } else if (isOvertaken && begun !== startedFrom) {
    setBegun(startedFrom);
  }
  return begun;
}

function doneWords(state: ActState<SavedWayAnswer>): string | undefined {
  if (!state?.ok) return undefined;
  const { changed } = state.value;
  return `${changed === 1 ? "One thing differs" : `${changed} things differ`} from before. It holds for parts snapped from now on.`;
}
