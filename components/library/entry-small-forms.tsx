"use client";

import { useActionState } from "react";
import { FormAnswer } from "@/components/crew/form-answer";
import type { EntryAction } from "@/components/library/entry-form";
import { Field } from "@/components/ui/field";
import { SubmitButton } from "@/components/ui/submit-button";
import type { EntryKind } from "@/lib/library/entry-kinds";
import { LIBRARY_LIMITS } from "@/lib/library/library.schema";

interface AimProps {
  entry: EntryKind;
  slug: string;
  action: EntryAction;
}

/** Lets one's own draft go; its rows stay in the revisions. */
export function DropDraftForm({ entry, slug, action }: AimProps) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" action={send}>
      <FormAnswer state={state} />
      <input type="hidden" name="entry" value={entry} />
      <input type="hidden" name="slug" value={slug} />
      <SubmitButton variant="quiet">Drop my draft</SubmitButton>
    </form>
  );
}

/** Takes an entry out of the library. */
export function RemoveEntryForm({ entry, slug, baseRevision, action }: AimProps & { baseRevision: number }) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" action={send}>
      <p>Nothing points at it. Its words stay in the revisions, and it can be brought back.</p>
      <FormAnswer state={state} />
      <input type="hidden" name="entry" value={entry} />
      <input type="hidden" name="slug" value={slug} />
      <input type="hidden" name="baseRevision" value={baseRevision} />
      <Field label="Why it goes" name="note" maxLength={LIBRARY_LIMITS.lineChars} />
      <SubmitButton variant="hold">Remove from the library</SubmitButton>
    </form>
  );
}

interface BringBackFormProps extends AimProps {
  baseRevision: number;
  revisionId: number;
  /** Said to readers: which one comes back. */
  words: string;
}

/** Publishes an earlier revision once more. */
export function BringBackForm({ entry, slug, baseRevision, revisionId, words, action }: BringBackFormProps) {
  const [state, send] = useActionState(action, null);
  return (
    <form action={send}>
      <FormAnswer state={state} />
      <input type="hidden" name="entry" value={entry} />
      <input type="hidden" name="slug" value={slug} />
      <input type="hidden" name="baseRevision" value={baseRevision} />
      <input type="hidden" name="revisionId" value={revisionId} />
      <SubmitButton aria-label={`Bring this one back: ${words}`}>Bring this one back</SubmitButton>
    </form>
  );
}
