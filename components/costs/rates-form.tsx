import { FormAnswer } from "@/components/crew/form-answer";
import { RatesRow, type RateRowView } from "@/components/costs/rates-row";
import { Field } from "@/components/ui/field";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import { RATES_LIMITS } from "@/lib/costs/typed-rates";

export interface RatesGroup {
  title: string;
  /** What its rates mean. */
  note?: string;
  rows: readonly RateRowView[];
  /** Folded away: metals that no job here is plated with. */
  folded?: boolean;
}

/** What the action answers: the first day, and how many rates differ from before. */
export interface SetAnswer {
  from: string;
  changed: number;
}

export interface RatesFormProps {
  /** Buttons outside it send it by this id. */
  id: string;
  groups: readonly RatesGroup[];
  /** "2026-07-14" in the shop's zone: the first day that may be chosen. */
  today: string;
  state: ActState<SetAnswer>;
  action: (form: FormData) => void;
  /** By field name: how far what is typed moves from what holds. */
  moves: Readonly<Record<string, string>>;
  /** The form as it stands, after every key and after React put it back. */
  onTyped: (form: HTMLFormElement) => void;
}

/** Rates from a day on. Every field begins with what holds now, and keeps what was typed when it is refused. */
export function RatesForm({ id, groups, today, state, action, moves, onTyped }: RatesFormProps) {
  return (
    <form
      className="rates-form"
      id={id}
      action={action}
      onInput={({ currentTarget }) => onTyped(currentTarget)}
      // The event comes before the fields are put back.
      onReset={({ currentTarget }) => queueMicrotask(() => onTyped(currentTarget))}
    >
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
        <Group key={group.title} group={group} state={state} moves={moves} />
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
    </form>
  );
}

function doneWords(state: ActState<SetAnswer>): string | undefined {
  if (!state?.ok) return undefined;
  const { from, changed } = state.value;
  if (changed === 0) return `From ${from}, at the same figures as before.`;
  return `From ${from}. ${changed === 1 ? "One rate differs" : `${changed} rates differ`} from what held before.`;
}

function Group({ group, state, moves }: { group: RatesGroup } & Pick<RatesFormProps, "state" | "moves">) {
  const rows = group.rows.map((row) => (
    <RatesRow
      key={row.name}
      row={row}
      typed={typed(state, row.name, row.value)}
      error={fieldFault(state, row.name)}
      move={moves[row.name]}
    />
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
