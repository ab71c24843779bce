"use client";

import { useRouter } from "next/navigation";
import { useActionState, useEffect } from "react";
import { useAnswerFocus } from "@/components/cases/use-answer-focus";
import { FormAnswer } from "@/components/crew/form-answer";
import type { EntryAction } from "@/components/library/entry-form";
import { WordDiffView } from "@/components/library/word-diff-view";
import { CheckField } from "@/components/ui/check-field";
import { Field } from "@/components/ui/field";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed } from "@/lib/act-state";
import type { EntryKind } from "@/lib/library/entry-kinds";
import { LIBRARY_LIMITS } from "@/lib/library/library.schema";
import type { MergeChoice } from "@/lib/library/merge-entry";
import type { DiffPart } from "@/lib/library/word-diff";

/** A field that both changed: each one's words against what both began from. */
export interface ClashView {
  name: string;
  label: string;
  /** What both began from, as text; null where it is not known. */
  base: string | null;
  mine: readonly DiffPart[];
  theirs: readonly DiffPart[];
  /** Mine and theirs one after the other; null where the field has room for one only. */
  both: string | null;
}

export interface MergeFormProps {
  id: string;
  entry: EntryKind;
  slug: string;
  draftId: number;
  theirRevision: number;
  /** "Ines Ferreira". */
  theirName: string;
  clashes: readonly ClashView[];
  /** Labels of the fields that one side alone changed. */
  onlyMine: readonly string[];
  onlyTheirs: readonly string[];
  action: EntryAction;
}

/** Two editors' words side by side: what only one changed is merged already, for the rest one chooses. */
export function MergeForm(props: MergeFormProps) {
  const { id, entry, slug, draftId, theirRevision, theirName, clashes, onlyMine, onlyTheirs, action } = props;
  const [state, send] = useActionState(action, null);
  const form = useAnswerFocus(state);
  const router = useRouter();
  const isOvertaken = state !== null && !state.ok && state.fault.code === "conflict";
  useEffect(() => {
    if (isOvertaken) router.refresh();
  }, [isOvertaken, router]);
  return (
    <form className="form merge-form" id={id} action={send} ref={form}>
      <FormAnswer state={state} />
      <input type="hidden" name="entry" value={entry} />
      <input type="hidden" name="slug" value={slug} />
      <input type="hidden" name="draftId" value={draftId} />
      <input type="hidden" name="theirRevision" value={theirRevision} />
      <ul className="merge-form__merged">
        {onlyMine.length > 0 && <li>Only you changed {onlyMine.join(", ")}: yours stand.</li>}
        {onlyTheirs.length > 0 && (
          <li>
            Only {theirName} changed {onlyTheirs.join(", ")}: theirs stand.
          </li>
        )}
        {clashes.length === 0 && (
          <li>Nothing was changed by both of you in different ways. Publish, or read it through first.</li>
        )}
      </ul>
      {clashes.map((clash) => (
        <Clash
          key={`${clash.name}-${theirRevision}`}
          clash={clash}
          theirName={theirName}
          chosen={typed(state, `choice.${clash.name}`)}
          error={fieldFault(state, `choice.${clash.name}`)}
        />
      ))}
      <Field
        label="Why you change it"
        name="note"
        maxLength={LIBRARY_LIMITS.lineChars}
        defaultValue={typed(state, "note")}
        error={fieldFault(state, "note")}
      />
      <div className="btns">
        <SubmitButton name="intent" value="draft">
          Keep the merged words as my draft
        </SubmitButton>
        <SubmitButton variant="main" className="desk-only" name="intent" value="publish">
          Publish on top
        </SubmitButton>
      </div>
    </form>
  );
}

interface ClashProps {
  clash: ClashView;
  theirName: string;
  chosen: string;
  error: string | undefined;
}

function Clash({ clash, theirName, chosen, error }: ClashProps) {
  const choice = (value: MergeChoice, label: string) => (
    <CheckField
      type="radio"
      name={`choice.${clash.name}`}
      value={value}
      label={label}
      defaultChecked={chosen === value}
      aria-invalid={error ? true : undefined}
    />
  );
  return (
    <fieldset className="clash">
      <legend>{clash.label}: you both changed it</legend>
      {error && <p className="field__error">{error}</p>}
      {clash.base !== null && (
        <details className="clash__base">
          <summary>What you both began from</summary>
          <p className="word-diff">{clash.base || "Nothing was written here."}</p>
        </details>
      )}
      <div className="clash__sides">
        <div>
          {choice("mine", "Yours")}
          <WordDiffView parts={clash.mine} />
        </div>
        <div>
          {choice("theirs", theirName)}
          <WordDiffView parts={clash.theirs} />
        </div>
        {clash.both !== null && (
          <div className="clash__both">
            {choice("both", "Both, one after the other")}
            <details>
              <summary>Read it</summary>
              <p className="word-diff">{clash.both}</p>
            </details>
          </div>
        )}
      </div>
    </fieldset>
  );
}
