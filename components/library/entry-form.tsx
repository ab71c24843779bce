"use client";

import { useRouter } from "next/navigation";
import { useActionState, useDeferredValue, useEffect, useState, useSyncExternalStore } from "react";
import { useAnswerFocus } from "@/components/cases/use-answer-focus";
import { FormAnswer } from "@/components/crew/form-answer";
import { EntryCauseFields } from "@/components/library/entry-cause-fields";
import type { EntryChoices } from "@/components/library/entry-choices";
import { EntryClassFields } from "@/components/library/entry-class-fields";
import { EntryFixFields } from "@/components/library/entry-fix-fields";
import { EntryPreview } from "@/components/library/entry-preview";
import { EntrySourceFields } from "@/components/library/entry-source-fields";
import { useKeptTyping } from "@/components/library/use-kept-typing";
import { Button } from "@/components/ui/button";
import { Field } from "@/components/ui/field";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import type { FormValues } from "@/lib/library/entry-form";
import type { EntryKind } from "@/lib/library/entry-kinds";
import { LIBRARY_LIMITS } from "@/lib/library/library.schema";

export interface KeptAnswer {
  entry: EntryKind;
  slug: string;
  published: number | null;
}
export type EntryAction = (previous: ActState<KeptAnswer>, form: FormData) => Promise<ActState<KeptAnswer>>;

export interface EntryFormProps {
  /** The thumb bar's button publishes it by this id. */
  id: string;
  entry: EntryKind;
  /** Null while it is new. */
  slug: string | null;
  /** The published revision that the words began from; 0 for none. */
  baseRevision: number;
  values: FormValues;
  choices: EntryChoices;
  action: EntryAction;
}

const FIELDS = { class: EntryClassFields, cause: EntryCauseFields, fix: EntryFixFields };

/** An entry to write: the fields, and beside them the page as it would stand. */
export function EntryForm({ id, entry, slug, baseRevision, values, choices, action }: EntryFormProps) {
  const [state, send] = useActionState(action, null);
  const form = useAnswerFocus(state);
  const router = useRouter();
  const kept = useKeptTyping(`${entry}/${slug ?? "new"}`, values);
  // What the fields begin with: the entry's words, or those that came back refused. A new version draws the fields afresh.
  // The revision that they began from stays with them, also when the page is refreshed under the form.
  const [start, setStart] = useState({ version: 0, state, values: typedOr(state, values), baseRevision });
  if (state !== start.state) setStart({ ...start, version: start.version + 1, state, values: typedOr(state, values) });
  const isLive = useSyncExternalStore(neverChanges, yes, no);
  const [shown, setShown] = useState(start.values);
  const preview = useDeferredValue(shown);
  const isOvertaken = state !== null && !state.ok && state.fault.code === "conflict";
  useEffect(() => {
    // The page now has a draft and a newer revision: it sets the two side by side.
    if (isOvertaken) router.refresh();
  }, [isOvertaken, router]);
  const keep = (values: FormValues, sent: boolean) => kept.keep({ values, baseRevision: start.baseRevision, sent });
  const read = () => {
    if (!form.current) return;
    const now = formValues(new FormData(form.current));
    setShown(now);
    keep(now, false);
  };
  const putBack = () => {
    if (!kept.offer) return;
    const { values, baseRevision } = kept.offer;
    setStart({ version: start.version + 1, state, values, baseRevision });
    setShown(values);
    kept.taken();
  };
  const Fields = FIELDS[entry];
  const errors = (state && !state.ok && state.fault.fields) || {};
  return (
    <div className="entry-desk">
      <form
        className="form entry-form"
        id={id}
        ref={form}
        action={send}
        onInput={read}
        onSubmit={(event) => keep(formValues(new FormData(event.currentTarget)), true)}
        data-live={isLive || undefined}
      >
        <FormAnswer state={state} />
        {kept.offer && (
          <Note tone="blue" title="You typed here before and did not keep it">
            <div className="btns">
              <Button onClick={putBack}>Put it back</Button>
              <Button variant="quiet" onClick={kept.drop}>
                Let it go
              </Button>
            </div>
          </Note>
        )}
        <input type="hidden" name="entry" value={entry} />
        <input type="hidden" name="slug" value={slug ?? ""} />
        <input type="hidden" name="baseRevision" value={start.baseRevision} />
        <div className="form" key={start.version}>
          {/* A row that was added or taken out stands in the form only once React has drawn it. */}
          <Fields values={start.values} errors={errors} choices={choices} slug={slug} onRows={() => setTimeout(read)} />
          <EntrySourceFields values={start.values} errors={errors} sources={choices.sources} />
          <Field
            label="Why you change it"
            name="note"
            hint="Stands in the revisions beside your name. May be left empty."
            maxLength={LIBRARY_LIMITS.lineChars}
            defaultValue={typed(state, "note")}
            error={fieldFault(state, "note")}
          />
        </div>
        <div className="btns">
          <SubmitButton name="intent" value="draft">
            Keep as my draft
          </SubmitButton>
          <SubmitButton variant="main" className="desk-only" name="intent" value="publish">
            Publish
          </SubmitButton>
        </div>
      </form>
      <Section title="As the page will show it" className="entry-desk__preview">
        <EntryPreview entry={entry} slug={slug} values={preview} choices={choices} />
      </Section>
    </div>
  );
}

/** Whether the page's scripts run: typing before that is the browser's alone. */
const neverChanges = () => () => undefined;
const yes = () => true;
const no = () => false;

const typedOr = (state: ActState<KeptAnswer>, values: FormValues): FormValues =>
  state && !state.ok ? state.values : values;

/** The form's fields by name; a name that ends in [] is a list. */
function formValues(form: FormData): FormValues {
  const values: Record<string, string | string[]> = {};
  for (const name of new Set(form.keys())) {
    const all = form.getAll(name).filter((value) => typeof value === "string");
    if (name.endsWith("[]")) values[name.slice(0, -2)] = all;
    else values[name] = all[0] ?? "";
  }
  return values;
}
