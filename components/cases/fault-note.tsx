import { Note } from "@/components/ui/note";
import type { ActState } from "@/lib/act-state";

/** Why a form was not saved, over the form; nothing while there is no fault. */
export function FaultNote({ state, title = "Not saved" }: { state: ActState; title?: string }) {
  if (!state || state.ok) return null;
  // The sentence of the first field says it without the field's inner name.
  const words = Object.values(state.fault.fields ?? {})[0] ?? state.fault.message;
  return (
    <Note tone="rust" title={title} role="alert">
      {words}
    </Note>
  );
}
