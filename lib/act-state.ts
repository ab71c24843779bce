import type { Fault } from "@/lib/fault";

/** What a form gets back from its action: nothing yet, the result, or a fault with what was typed. */
export type ActState<Result = unknown> =
  null | { ok: true; value: Result } | { ok: false; fault: Fault; values: Record<string, string | string[]> };

/** What was typed into a field, or `otherwise`. Secrets are never sent back. */
export function typed(state: ActState, name: string, otherwise = ""): string {
  if (!state || state.ok) return otherwise;
  const value = state.values[name];
  return typeof value === "string" ? value : (value?.[0] ?? otherwise);
}

/** The sentence for a field, if the fault has one. */
export function fieldFault(state: ActState, name: string): string | undefined {
  return state && !state.ok ? state.fault.fields?.[name] : undefined;
}
