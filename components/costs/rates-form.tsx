"use client";

import { useActionState } from "react";
import { FormAnswer } from "@/components/crew/form-answer";
import { RatesRow, type RateRowView } from "@/components/costs/rates-row";
import { Field } from "@/components/ui/field";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import { RATES_LIMITS } from "@/lib/costs/rates.schema";

export interface RatesGroup {
  title: string;
  /** What its rates mean. */
  note?: string;
  rows: readonly RateRowView[];
  /** Folded away: metals that no job here is plated with. */
  folded?: boolean;
}

/** What the action answers: the first day, and how many rates differ from before. */
interface SetAnswer {
  from: string;
  changed: number;
}

export interface RatesFormProps {
  /** The thumb bar's button sends it by this id. */
  id: string;
  groups: readonly RatesGroup[];
  /** "2026-07-14" in the shop's zone: the first day that may be chosen. */
  today: string;
  action: (previous: ActState<SetAnswer>, form: FormData) => Promise<ActState<SetAnswer>>;
}

/** Adds a row of rates from a day on. Every field begins with what holds now. */
export function RatesForm({ id, groups, today, action }: RatesFormProps) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="rates-form" id={id} action={send}>
      <FormAnswer state={state} done={{ title: "The rates are set", words: doneWords(state) }} />
      <Field
        label="Hold from"
        name="validFrom"
        type="date"
        required
        min={today}
        hint="Cases snapped from 00:00 of that day on are costed with them."
        defaultValue={typed(state, "validFrom", today)}
        error={fieldFault(state, "validFrom")}
      />
      {groups.map((group) => (
        <Group key={group.title} group={group} state={state} />
      ))}
      <Field
        label="Where the figures come from"
        name="source"
        required
        maxLength={RATES_LIMITS.sourceChars}
        hint="It stands beside every cost that rests on them: “hauler’s letter of 9 Jul”."
        defaultValue={typed(state, "source")}
        error={fieldFault(state, "source")}
      />
      <SubmitButton variant="main" className="desk-only">
        Save the rates
      </SubmitButton>
    </form>
  );
}

function doneWords(state: ActState<SetAnswer>): string | undefined {
  if (!state?.ok) return undefined;
  const { from, changed } = state.value;
  if (changed === 0) return `From ${from}, at the same figures as before.`;
  return `From ${from}. ${changed === 1 ? "One rate differs" : `${changed} rates differ`} from what held before.`;
}

function Group({ group, state }: { group: RatesGroup; state: ActState<SetAnswer> }) {
  const rows = group.rows.map((row) => (
    <RatesRow key={row.name} row={row} typed={typed(state, row.name, row.value)} error={fieldFault(state, row.name)} />
  ));
  if (!group.folded) {
    return (
      <fieldset className="rates-group">
        <legend>{group.title}</legend>
        {group.note && <p className="small mid">{group.note}</p>}
        {rows}
      </fieldset>
    );
  }
  const isWrong = group.rows.some((row) => fieldFault(state, row.name));
  return (
    <details className="rates-group" open={isWrong || undefined}>
      <summary>{group.title}</summary>
      {rows}
    </details>
  );
}
