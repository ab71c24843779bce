import type { ActState } from "@/lib/act-state";

/** A server action as a form takes it. */
export type FormAction = (previous: ActState<void>, form: FormData) => Promise<ActState<void>>;
