import type { ComponentPropsWithoutRef, ReactNode } from "react";
import { Glyph } from "@/components/ui/glyph";

export interface CheckFieldProps extends Omit<ComponentPropsWithoutRef<"input">, "type" | "className"> {
  label: ReactNode;
  hint?: ReactNode;
  /** A radio of a group by the same name, instead of a tick box. */
  type?: "checkbox" | "radio";
  className?: string;
}

/** A tick box (or a radio) with its words, the whole row pressable. */
export function CheckField({ label, hint, type = "checkbox", className, ...native }: CheckFieldProps) {
  return (
    <label className={className ? `check ${className}` : "check"}>
      <input className="check__input" type={type} {...native} />
      <span className={`check__box check__box--${type}`} aria-hidden="true">
        <Glyph name="ui-tick" />
      </span>
      <span className="check__words">
        {label}
        {hint && <small>{hint}</small>}
      </span>
    </label>
  );
}
