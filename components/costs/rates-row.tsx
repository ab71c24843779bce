import { useId } from "react";
import { Glyph } from "@/components/ui/glyph";

/** One rate of the form. */
export interface RateRowView {
  name: string;
  label: string;
  note?: string;
  /** What holds now: "$52.00 / h", "not set". */
  now: string;
  /** What stands in the field to begin with. */
  value: string;
  /** Beside the field: "$ / h", "%". */
  unit: string;
  optional: boolean;
}

interface RatesRowProps {
  row: RateRowView;
  /** What was typed before a refusal. */
  typed: string;
  error?: string;
  /** How far what is typed moves from what holds: "+7.7%". */
  move?: string;
}

/** A rate: what it is, what holds now, and the field for what holds next. */
export function RatesRow({ row, typed, error, move }: RatesRowProps) {
  const id = useId();
  const described = [`${id}-now`, row.note && `${id}-note`, error && `${id}-error`].filter(Boolean).join(" ");
  return (
    <div className={move ? "rate-row rate-row--moved" : "rate-row"}>
      <label htmlFor={id}>
        {row.label}
        {row.note && <small id={`${id}-note`}>{row.note}</small>}
      </label>
      <p className="rate-row__now" id={`${id}-now`}>
        <span>now </span>
        {row.now}
        {move && <b className="rate-row__move">{move}</b>}
      </p>
      <span className="rate-row__field">
        <input
          className="input"
          id={id}
          name={row.name}
          inputMode="decimal"
          autoComplete="off"
          required={!row.optional}
          defaultValue={typed}
          aria-describedby={described}
          aria-invalid={error ? true : undefined}
        />
        <span aria-hidden="true">{row.unit}</span>
      </span>
      {error && (
        <p className="field__error" id={`${id}-error`}>
          <Glyph name="ui-caution" size={20} />
          {error}
        </p>
      )}
    </div>
  );
}
