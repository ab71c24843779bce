import type { ReactNode } from "react";
import { Note } from "@/components/ui/note";

export interface BrokenProps {
  /** "The queue did not load". */
  what: string;
  /** What is not lost: "The calls that were made are kept." */
  safe?: string;
  /** What to do: "Try again. If it stays, tell the owner this mark." */
  todo: string;
  /** The log's mark for it. */
  mark?: string;
  action?: ReactNode;
}

/** Something failed: what happened, what is safe, what to do. */
export function Broken({ what, safe, todo, mark, action }: BrokenProps) {
  return (
    <Note tone="rust" title={what} role="alert">
      {[safe, todo].filter(Boolean).join(" ")}
      {mark && (
        <>
          {" "}
          Mark <span className="mono">{mark}</span>
        </>
      )}
      {action && <div className="note__action">{action}</div>}
    </Note>
  );
}
