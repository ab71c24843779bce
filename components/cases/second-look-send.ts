"use client";

import { useRouter } from "next/navigation";
import { startTransition, useActionState } from "react";
import { sayOnNextPage } from "@/components/cases/second-look-said";
import type { ActState } from "@/lib/act-state";

export type SecondLookAction = (
  previous: ActState<{ ref: string }>,
  form: FormData,
) => Promise<ActState<{ ref: string }>>;

interface Sending {
  action: SecondLookAction;
  fields: Record<string, string>;
  /** Said once it is saved. */
  words: string;
}

/** A call that never arrived must not take the filled-in form with it, so it comes back as a fault like any other. */
const LOST: ActState<{ ref: string }> = {
  ok: false,
  fault: { code: "broken", message: "Not sent: no signal. What you filled in stays here. Send it again." },
  values: {},
};

/** Sends a second look, and once it is saved goes on to the next case. */
export function useSecondLookSend(nextHref: string) {
  const router = useRouter();
  const [state, dispatch, isSending] = useActionState(async (_before: ActState<{ ref: string }>, sending: Sending) => {
    const form = new FormData();
    for (const [name, value] of Object.entries(sending.fields)) form.set(name, value);
    let result: ActState<{ ref: string }>;
    try {
      result = await sending.action(null, form);
    } catch {
      return LOST;
    }
    if (result?.ok) {
      sayOnNextPage(sending.words);
      router.push(nextHref);
    }
    return result;
  }, null);
  return {
    fault: state && !state.ok ? state.fault : null,
    isBusy: isSending || state?.ok === true,
    send: (sending: Sending) => startTransition(() => dispatch(sending)),
  };
}
