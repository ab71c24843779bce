"use client";

import { useActionState, type ReactNode } from "react";
import { LinkButton } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import type { ActState } from "@/lib/act-state";
import { STRIP_METHOD_TITLES, type StripMethod } from "@/lib/costs/strip-methods";

export type ChooseStrip = (before: ActState<{ ref: string }>, form: FormData) => Promise<ActState<{ ref: string }>>;

interface StripChoiceProps {
  id: string;
  caseRef: string;
  caseHref: string;
  method: StripMethod;
  /** The batch on the page is not the case's own any more. */
  isOther: boolean;
  action: ChooseStrip;
  children: ReactNode;
}

/** Puts the way that is shown on the case. The case keeps its own parts, area and stack: only the way is taken over. */
export function StripChoice({ id, caseRef, caseHref, method, isOther, action, children }: StripChoiceProps) {
  const [state, send] = useActionState(action, null);
  const title = STRIP_METHOD_TITLES[method];
  return (
    <form id={id} action={send} className="est-choice">
      <input type="hidden" name="ref" value={caseRef} />
      <input type="hidden" name="method" value={method} />
      {isOther && (
        <p className="rests">
          You changed the batch. The case takes over the way, {title.toLowerCase()}, and keeps its own parts and layers.
        </p>
      )}
      {state && !state.ok && (
        <Note tone="rust" title="It was not put on the case" role="alert">
          {state.fault.message}
        </Note>
      )}
      {state?.ok && (
        <Note tone="green" title={`${title} is on ${caseRef}`} role="status">
          The case is priced by it from now on.
          <span className="note__action">
            <LinkButton href={caseHref}>Open the case</LinkButton>
          </span>
        </Note>
      )}
      {children}
    </form>
  );
}
