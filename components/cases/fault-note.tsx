import { Note } from "@/components/ui/note";
import type { ActState } from "@/lib/act-state";

/** Why a form was not saved, over the form; nothing while there is no fault. */
export function FaultNote({ state, title = "Not saved" }: { state: ActState; title?: string }) {
  if (!state || state.ok) return null;
  return (
    <Note tone="rust" title={title} role="alert">
      {state.fault.message}
    </Note>
  );
}
