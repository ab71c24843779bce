import type { ChangeEvent, ReactNode } from "react";
import { Glyph } from "@/components/ui/glyph";
import type { GlyphName } from "@/components/ui/glyph-names";
import { KeyCap, keyAttributes } from "@/components/ui/key-cap";

export interface PickOption {
  value: string;
  label: ReactNode;
  glyph?: GlyphName;
  /** Instead of a glyph: a swatch, a drawing. It says nothing that the label does not. */
  picture?: ReactNode;
  /** Second line, rows and lists only. */
  hint?: ReactNode;
  /** Figure at the right end, lists only: "64%". */
  figure?: ReactNode;
  keyCap?: string;
  disabled?: boolean;
}

export interface PickGroupProps {
  legend: ReactNode;
  /** Quiet words at the right end of the legend. */
  legendAside?: ReactNode;
  /** The legend is for readers only (a heading above says it). */
  hideLegend?: boolean;
  name: string;
  /** radio: one of them. checkbox: any of them, FormData holds each. */
  kind: "radio" | "checkbox";
  options: readonly PickOption[];
  /** What is picked at first. Or `value` with `onChange`, in client components. */
  defaultValue?: string | readonly string[];
  value?: string | readonly string[];
  onChange?: (event: ChangeEvent<HTMLInputElement>) => void;
  /** grid: three pictures a row. rows: glyph beside the words, two a row. list: one a line, as on the tag form. bar: short words in one bar. */
  layout?: "grid" | "rows" | "list" | "bar";
  error?: string;
  required?: boolean;
  /** One more cell after the options: a button that opens more of them. */
  more?: ReactNode;
}

function holds(chosen: string | readonly string[], value: string): boolean {
  return typeof chosen === "string" ? chosen === value : chosen.includes(value);
}

function Pick({ option, group }: { option: PickOption; group: PickGroupProps }) {
  const { name, kind, defaultValue, value, onChange, layout = "grid", required, error } = group;
  const checked = value === undefined ? {} : { checked: holds(value, option.value), onChange };
  const start = value === undefined && defaultValue !== undefined ? holds(defaultValue, option.value) : undefined;
  return (
    <label className={`pick pick--${layout}`}>
      <input
        className="pick__input"
        type={kind}
        name={name}
        value={option.value}
        defaultChecked={start}
        onChange={onChange}
        {...checked}
        disabled={option.disabled}
        required={kind === "radio" ? required : undefined}
        aria-invalid={error ? true : undefined}
        {...keyAttributes(option.keyCap)}
      />
      {option.keyCap && <KeyCap>{option.keyCap}</KeyCap>}
      {option.glyph && <Glyph name={option.glyph} />}
      {option.picture}
      <span className="pick__words">
        {option.label}
        {option.hint && <small>{option.hint}</small>}
      </span>
      {option.figure !== undefined && <span className="fig pick__figure">{option.figure}</span>}
      {(layout === "grid" || layout === "rows") && (
        <span className="pick__tick" aria-hidden="true">
          <Glyph name="ui-tick" />
        </span>
      )}
    </label>
  );
}

/** Picture buttons over native radios or tick boxes: they work without script and land in FormData. */
export function PickGroup(props: PickGroupProps) {
  const { legend, legendAside, hideLegend, options, layout = "grid", error } = props;
  return (
    <fieldset className="picks-set">
      <legend className={hideLegend ? "sr-only" : undefined}>
        {legend}
        {legendAside && <small>{legendAside}</small>}
      </legend>
      <div className={`picks picks--${layout}`}>
        {options.map((option) => (
          <Pick key={option.value} option={option} group={props} />
        ))}
        {props.more}
      </div>
      {error && (
        <p className="field__error">
          <Glyph name="ui-caution" size={20} />
          {error}
        </p>
      )}
    </fieldset>
  );
}
