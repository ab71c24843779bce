import type { ReactNode } from "react";
import { Glyph } from "@/components/ui/glyph";

export interface TooFewProps {
  have: number;
  need: number;
  /** What is counted; "cases" without it. */
  what?: string;
  /** "A rate shows here at 8 closed cases." */
  children?: ReactNode;
}

/** Too little data for a figure: says so, and draws none. */
export function TooFew({ have, need, what = "cases", children }: TooFewProps) {
  return (
    <div className="too-few">
      <Glyph name="not-enough" size={44} />
      <span>
        <strong>
          Not enough {what} yet: {have} of {need}
        </strong>
        {children && <small>{children}</small>}
      </span>
    </div>
  );
}
