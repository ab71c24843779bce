import { useEffect, useRef } from "react";
import type { ActState } from "@/lib/act-state";

/**
 * A long form's answer comes up out of sight of the thumb bar that sent it: the first refused field takes the focus, and
 * without one the form's top, where the answer stands, comes into view.
 */
export function useAnswerFocus(state: ActState) {
  const form = useRef<HTMLFormElement>(null);
  useEffect(() => {
    if (!state || !form.current) return;
    const refused = form.current.querySelector<HTMLElement>("[aria-invalid]");
    if (!state.ok && refused) refused.focus();
    else form.current.scrollIntoView({ block: "start" });
  }, [state]);
  return form;
}
