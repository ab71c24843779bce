import { useId } from "react";
import type { ReactNode } from "react";
import { Glyph } from "@/components/ui/glyph";

export interface FieldWords {
  label: ReactNode;
  /** Stands under the label, before the field is filled in. */
  hint?: ReactNode;
  /** What to do about what was typed. */
  error?: string;
  /** Appended to the label, quietly. */
  optional?: boolean;
  className?: string;
}

export interface Wiring {
  id: string;
  "aria-describedby": string | undefined;
  "aria-invalid": true | undefined;
}

/** Label, hint and error around one control, tied to it for readers. */
export function FieldFrame({ words, children }: { words: FieldWords; children: (wiring: Wiring) => ReactNode }) {
  const id = useId();
  const { label, hint, error, optional, className } = words;
  const describedBy = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(" ");
  return (
    <div className={className ? `field ${className}` : "field"}>
      <label className="field__label" htmlFor={id}>
        {label}
        {optional && <span className="field__optional"> if you know it</span>}
      </label>
      {hint && (
        <p className="field__hint" id={`${id}-hint`}>
          {hint}
        </p>
      )}
      {children({ id, "aria-describedby": describedBy || undefined, "aria-invalid": error ? true : undefined })}
      {error && (
        <p className="field__error" id={`${id}-error`}>
          <Glyph name="ui-caution" size={20} />
          {error}
        </p>
      )}
    </div>
  );
}
