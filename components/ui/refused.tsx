import type { ReactNode } from "react";
import { Note } from "@/components/ui/note";

/** Not theirs to do: says so, and who can. */
export function Refused({ what, who, action }: { what: string; who: string; action?: ReactNode }) {
  return (
    <Note glyph="ui-hold-tag" title={what}>
      {who}
      {action && <div className="note__action">{action}</div>}
    </Note>
  );
}
