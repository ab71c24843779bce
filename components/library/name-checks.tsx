import type { ReactNode } from "react";
import { CheckField } from "@/components/ui/check-field";
import { Glyph } from "@/components/ui/glyph";

export interface NameChecksProps {
  legend: string;
  hint?: ReactNode;
  /** The field; each tick adds one to its list. */
  name: string;
  options: readonly { value: string; label: ReactNode; hint?: ReactNode }[];
  chosen: readonly string[];
  error?: string;
  /** Folded to its ticked ones: a list too long to stand open. */
  folded?: boolean;
  children?: ReactNode;
}

/** Ticks for names out of a list. The ticked ones come first, in their own order: it is the order in which they are kept. */
export function NameChecks({ legend, hint, name, options, chosen, error, folded, children }: NameChecksProps) {
  const ticked = chosen.map((value) => options.find((option) => option.value === value) ?? { value, label: value });
  const rest = options.filter((option) => !chosen.includes(option.value));
  const check = (option: NameChecksProps["options"][number], isTicked: boolean) => (
    <CheckField
      key={option.value}
      name={`${name}[]`}
      value={option.value}
      label={option.label}
      hint={option.hint}
      defaultChecked={isTicked}
      aria-invalid={error && isTicked ? true : undefined}
    />
  );
  return (
    <fieldset className="entry-names">
      <legend>{legend}</legend>
      {hint && <p className="field__hint">{hint}</p>}
      {error && (
        <p className="field__error">
          <Glyph name="ui-caution" size={20} />
          {error}
        </p>
      )}
      <div className="entry-names__list">{ticked.map((option) => check(option, true))}</div>
      {folded && rest.length > 0 ? (
        <details className="entry-names__rest" open={error !== undefined || undefined}>
          <summary>
            {ticked.length === 0 ? "Choose" : "Others"} ({rest.length})
          </summary>
          <div className="entry-names__list">{rest.map((option) => check(option, false))}</div>
        </details>
      ) : (
        <div className="entry-names__list">{rest.map((option) => check(option, false))}</div>
      )}
      {children}
    </fieldset>
  );
}
