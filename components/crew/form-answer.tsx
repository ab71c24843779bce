import { Note } from "@/components/ui/note";
import type { ActState } from "@/lib/act-state";

export interface FormAnswerProps {
  state: ActState<unknown>;
  /** What to say once it is done; without it the page itself shows the change. */
  done?: { title: string; words?: string };
}

/** What a form's action answered, said aloud to readers. What belongs to one field stands beside that field. */
export function FormAnswer({ state, done }: FormAnswerProps) {
  if (!state) return null;
  if (state.ok) {
    return done ? (
      <Note tone="green" title={done.title} role="status">
        {done.words}
      </Note>
    ) : null;
  }
  const { message, fields } = state.fault;
  const isBesideField = Object.keys(fields ?? {}).some((name) => name !== "form");
  return (
    <Note tone="rust" title={isBesideField ? "Not saved" : message} role="alert">
      {isBesideField ? "See what stands beside the field." : null}
    </Note>
  );
}
