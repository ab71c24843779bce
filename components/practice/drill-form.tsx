"use client";

import { classGlyph } from "@/components/cases/class-glyph";
import { classWords } from "@/components/cases/class-words";
import { FaultNote } from "@/components/cases/fault-note";
import { useSend, type FormAct } from "@/components/cases/use-send";
import { Field } from "@/components/ui/field";
import { Note } from "@/components/ui/note";
import { PickGroup } from "@/components/ui/pick";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import { DRILL_LIMITS } from "@/lib/practice/drill";

export interface DrillFormProps {
  /** Id of the form, for the main action in the thumb bar. */
  id: string;
  classes: readonly { slug: string; title: string; photos: number }[];
  people: readonly { memberId: number; name: string; roleWords: string }[];
  /** Today, as in 2026-12-01: no earlier day can be chosen. */
  today: string;
  onSet: FormAct<{ id: number }>;
}

function picked(state: ActState, name: string): string[] {
  if (!state || state.ok) return [];
  const value = state.values[name];
  return value === undefined ? [] : typeof value === "string" ? [value] : value;
}

/** A senior sets a drill: what for, which classes, how many photos, for whom, by when. */
export function DrillForm({ id, classes, people, today, onSet }: DrillFormProps) {
  const { state, isBusy, form } = useSend(onSet);
  return (
    <form id={id} key={state?.ok ? state.value.id : "new"} {...form} noValidate className="form">
      <FaultNote state={state} title="The drill was not set" />
      {state?.ok && (
        <Note tone="green" title="The drill is set" role="status">
          It stands first on their practice page.
        </Note>
      )}
      <Field
        label="Name"
        name="title"
        hint="What it is for: “Dewetting against underactivation”."
        maxLength={DRILL_LIMITS.titleChars}
        defaultValue={typed(state, "title")}
        error={fieldFault(state, "title")}
      />
      <PickGroup
        legend="Classes"
        legendAside="None picked: all of them"
        name="classSlugs[]"
        kind="checkbox"
        layout="rows"
        defaultValue={picked(state, "classSlugs")}
        error={fieldFault(state, "classSlugs")}
        options={classes.map((each) => ({
          value: each.slug,
          label: classWords(each.title),
          glyph: classGlyph(each.slug),
          hint: each.photos === 1 ? "1 photo" : `${each.photos} photos`,
          disabled: each.photos === 0,
        }))}
      />
      <div className="form__pair">
        <Field
          label="Photos"
          name="photoCount"
          inputMode="numeric"
          hint={`1 to ${DRILL_LIMITS.photos}.`}
          defaultValue={typed(state, "photoCount", "10")}
          error={fieldFault(state, "photoCount")}
        />
        <Field
          label="By"
          name="dueDay"
          type="date"
          min={today}
          hint="Empty: no day is set."
          defaultValue={typed(state, "dueDay")}
          error={fieldFault(state, "dueDay")}
        />
      </div>
      <PickGroup
        legend="For"
        name="memberIds[]"
        kind="checkbox"
        layout="rows"
        defaultValue={picked(state, "memberIds")}
        error={fieldFault(state, "memberIds")}
        options={people.map((each) => ({ value: String(each.memberId), label: each.name, hint: each.roleWords }))}
      />
      <SubmitButton className="desk-only" variant="main" busy={isBusy}>
        Set the drill
      </SubmitButton>
    </form>
  );
}
