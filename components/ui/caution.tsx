import type { ReactNode } from "react";
import { Glyph } from "@/components/ui/glyph";

export interface CautionProps {
  /** stop: people get hurt if it is skipped. caution: the usual care. */
  level: "caution" | "stop";
  children: ReactNode;
}

/** A safety line; it stands beside the step it belongs to, never on another page. */
export function Caution({ level, children }: CautionProps) {
  return (
    <p className={`caution caution--${level}`}>
      <Glyph name={level === "stop" ? "ui-stop" : "ui-caution"} label={level === "stop" ? "Stop" : "Caution"} />
      <span>{children}</span>
    </p>
  );
}
