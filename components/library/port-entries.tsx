"use client";

import { useActionState, type MouseEvent } from "react";
import { useAnswerFocus } from "@/components/cases/use-answer-focus";
import { FormAnswer } from "@/components/crew/form-answer";
import { FieldChanges } from "@/components/library/word-diff-view";
import { Button } from "@/components/ui/button";
import { CheckField } from "@/components/ui/check-field";
import { Glyph } from "@/components/ui/glyph";
import { PickGroup } from "@/components/ui/pick";
import { Rests } from "@/components/ui/rests";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import { counted } from "@/lib/cases/part-words";
import type { FieldChange } from "@/lib/library/compare-entry";
import type { ShelfKind } from "@/lib/library/entry-kinds";

/** An entry that a file would bring. */
export interface PortEntry {
  /** Its name in the form, with the shop's revision that it was set against. */
  pick: string;
  kind: ShelfKind;
  title: string;
  /** Against what the shop has; none for a new one. */
  changes: readonly FieldChange[];
}

/** A file set against the shop's library. */
export interface PortView {
  fresh: readonly PortEntry[];
  changed: readonly PortEntry[];
  same: number;
}

export type BringInAction = (previous: ActState<never>, form: FormData) => Promise<ActState<never>>;

interface PortEntriesProps {
  from: "file" | "shelf";
  text?: string;
  view: PortView;
  // What the action answers is of no use here: it leads on to the page that says it.
  action: (previous: ActState<never>, form: FormData) => Promise<ActState<unknown>>;
}

/** What a file would bring, to choose from: the new ones ticked, the changed ones to read first. */
export function PortEntries({ from, text = "", view, action }: PortEntriesProps) {
  const [state, send] = useActionState(action as BringInAction, null);
  const form = useAnswerFocus(state);
  const { fresh, changed, same } = view;
  if (fresh.length + changed.length === 0)
    return (
      <p>The library says all of it already: {counted(same, "entry").replace(/entrys$/, "entries")}, none differs.</p>
    );
  const sent = state && !state.ok ? [state.values.pick ?? []].flat() : null;
  const ticked = (entry: PortEntry, first: boolean) => (sent ? sent.includes(entry.pick) : first);
  const error = fieldFault(state, "pick") ?? fieldFault(state, "file");
  return (
    <form className="form port-form" action={send} ref={form}>
      <FormAnswer state={state} />
      {error && (
        <p className="field__error port-form__error">
          <Glyph name="ui-caution" size={20} />
          <span>{error}</span>
        </p>
      )}
      <input type="hidden" name="from" value={from} />
      <input type="hidden" name="text" value={text} />
      {fresh.length > 0 && (
        <fieldset className="port-list" key={`fresh-${String(sent !== null)}`}>
          <legend>New: {fresh.length}</legend>
          <TickAll />
          <div className="port-list__rows">
            {fresh.map((entry) => (
              <CheckField
                key={entry.pick}
                name="pick[]"
                value={entry.pick}
                label={entry.title}
                hint={entry.kind}
                defaultChecked={ticked(entry, true)}
              />
            ))}
          </div>
        </fieldset>
      )}
      {changed.length > 0 && (
        <fieldset className="port-list" key={`changed-${String(sent !== null)}`}>
          <legend>Worded otherwise here: {changed.length}</legend>
          <p className="field__hint">Struck through is what this shop says now, underlined what comes in.</p>
          <TickAll />
          <div className="port-list__rows">
            {changed.map((entry) => (
              <ChangedEntry key={entry.pick} entry={entry} ticked={ticked(entry, false)} />
            ))}
          </div>
        </fieldset>
      )}
      <PickGroup
        legend="Bring them in"
        name="as"
        kind="radio"
        layout="bar"
        required
        options={[
          { value: "drafts", label: "As my drafts" },
          { value: "publish", label: "Publish at once" },
        ]}
        key={typed(state, "as", "drafts")}
        defaultValue={typed(state, "as", "drafts")}
      />
      <Rests>
        {same} say the same. Nothing is removed. New sources and cautions that an entry points at come along with it;
        changed ones have no drafts: ticked, they are published.
      </Rests>
      <div className="btns">
        <SubmitButton variant={from === "file" ? "main" : "plain"}>Bring in what is ticked</SubmitButton>
      </div>
    </form>
  );
}

/** One that the shop words otherwise: ticked to take it, opened to read what differs. */
function ChangedEntry({ entry, ticked }: { entry: PortEntry; ticked: boolean }) {
  return (
    <div className="port-list__changed">
      <CheckField
        name="pick[]"
        value={entry.pick}
        label={entry.title}
        hint={`${entry.kind}: ${entry.changes.map((change) => change.label.toLowerCase()).join(", ")}`}
        defaultChecked={ticked}
      />
      <details>
        <summary aria-label={`What differs in “${entry.title}”`}>What differs</summary>
        <FieldChanges changes={entry.changes} none="" />
      </details>
    </div>
  );
}

/** Ticks every row of its list, or none. The rows themselves are the browser's to keep. */
function TickAll() {
  const tick = (checked: boolean) => (event: MouseEvent<HTMLButtonElement>) => {
    const boxes = event.currentTarget.closest("fieldset")?.querySelectorAll<HTMLInputElement>("input[type=checkbox]");
    for (const box of boxes ?? []) box.checked = checked;
  };
  return (
    <div className="btns">
      <Button variant="quiet" onClick={tick(true)}>
        Tick all
      </Button>
      <Button variant="quiet" onClick={tick(false)}>
        Tick none
      </Button>
    </div>
  );
}
