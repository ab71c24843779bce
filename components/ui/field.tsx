import type { ComponentPropsWithoutRef } from "react";
import { FieldFrame, type FieldWords } from "@/components/ui/field-wiring";

export interface FieldProps extends FieldWords, Omit<ComponentPropsWithoutRef<"input">, "className" | "id"> {
  name: string;
  /** At the right end of the field: "°C", "min". The field turns to the figure face. */
  unit?: string;
}

/** One line of input. Hand back what was typed in `defaultValue` after a refusal: React clears the form. */
export function Field({ label, hint, error, optional, className, unit, ...native }: FieldProps) {
  return (
    <FieldFrame words={{ label, hint, error, optional, className }}>
      {(wiring) => (
        <span className={unit ? "field__box field__box--unit" : "field__box"}>
          <input autoComplete="off" {...native} {...wiring} />
          {unit && <span className="field__unit">{unit}</span>}
        </span>
      )}
    </FieldFrame>
  );
}

export interface TextAreaFieldProps extends FieldWords, Omit<ComponentPropsWithoutRef<"textarea">, "className" | "id"> {
  name: string;
}

/** Several lines of input. */
export function TextAreaField({ label, hint, error, optional, className, ...native }: TextAreaFieldProps) {
  return (
    <FieldFrame words={{ label, hint, error, optional, className }}>
      {(wiring) => <textarea rows={3} {...native} {...wiring} />}
    </FieldFrame>
  );
}

export interface SelectOption {
  value: string;
  label: string;
}

export interface SelectFieldProps
  extends FieldWords, Omit<ComponentPropsWithoutRef<"select">, "className" | "id" | "children"> {
  name: string;
  options: readonly SelectOption[];
  /** First line with an empty value, for "not chosen". */
  placeholder?: string;
}

/** A closed list. */
export function SelectField(props: SelectFieldProps) {
  const { label, hint, error, optional, className, options, placeholder, ...native } = props;
  return (
    <FieldFrame words={{ label, hint, error, optional, className }}>
      {(wiring) => (
        // The key: after a form action React resets a select to its first default, so a new default needs a new element.
        <select key={String(native.defaultValue ?? "")} {...native} {...wiring}>
          {placeholder !== undefined && <option value="">{placeholder}</option>}
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </select>
      )}
    </FieldFrame>
  );
}
