"use client";

import { useActionState, useState, useTransition } from "react";
import type { FormEvent } from "react";
import type { ActState } from "@/lib/act-state";

export type FormAct<Result> = (previous: ActState<Result>, form: FormData) => Promise<ActState<Result>>;

/**
 * Wires a form to a server action so that a lost signal is a sentence and not a broken page: the form keeps what was
 * typed. Before script has loaded, or without it, the browser posts the form by itself.
 */
export function useSend<Result>(action: FormAct<Result>) {
  const [posted, formAction] = useActionState(action, null);
  const [answer, setAnswer] = useState<ActState<Result>>(null);
  const [isBusy, start] = useTransition();
  const onSubmit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    start(async () => {
      const next = await reach(action, form);
      start(() => setAnswer(next));
    });
  };
  return { state: answer ?? posted, isBusy, form: { action: formAction, onSubmit } };
}

/** Next steers by throwing marked errors: those are passed on. */
const isSteering = (error: unknown) =>
  typeof error === "object" && error !== null && "digest" in error && String(error.digest).startsWith("NEXT_");

async function reach<Result>(action: FormAct<Result>, form: FormData): Promise<ActState<Result>> {
  try {
    return await action(null, form);
  } catch (error) {
    if (isSteering(error)) throw error;
    const message = "That did not get through: no signal, or the server is down. It stays here; send it again.";
    return { ok: false, fault: { code: "broken", message }, values: {} };
  }
}
