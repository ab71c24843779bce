import { fault } from "@/lib/fault";

export const CASE_STATES = ["held", "confirmed", "in-rework", "closed"] as const;
export type CaseState = (typeof CASE_STATES)[number];

/** What can happen to a case. `opened` begins it; `amended` corrects a fact and leaves the state as it is. */
export const CASE_EVENTS = [
  "opened",
  "amended",
  "confirmed",
  "released",
  "rework-started",
  "re-strike-failed",
  "re-strike-sound",
  "disposed",
  "taken-back",
  "reopened",
] as const;
export type CaseEvent = (typeof CASE_EVENTS)[number];

/** From which states an event may come, and where it leads. The only place that says so. */
const TRANSITIONS: Record<Exclude<CaseEvent, "opened" | "amended">, { from: readonly CaseState[]; to: CaseState }> = {
  confirmed: { from: ["held"], to: "confirmed" },
  released: { from: ["held"], to: "closed" },
  "rework-started": { from: ["confirmed"], to: "in-rework" },
  "re-strike-failed": { from: ["in-rework"], to: "held" },
  "re-strike-sound": { from: ["in-rework"], to: "closed" },
  disposed: { from: ["confirmed", "in-rework"], to: "closed" },
  "taken-back": { from: ["confirmed"], to: "held" },
  reopened: { from: ["closed"], to: "held" },
};

export const STATE_WORDS: Record<CaseState, string> = {
  held: "held",
  confirmed: "confirmed, its card is ready",
  "in-rework": "in rework",
  closed: "closed",
};

/**
 * The state that `event` leads to.
 * @throws FaultError "conflict" when the case is not in a state from which the event can come.
 * @example nextState("held", "confirmed") === "confirmed"
 */
export function nextState(from: CaseState, event: keyof typeof TRANSITIONS): CaseState {
  const transition = TRANSITIONS[event];
  if (!transition.from.includes(from)) {
    throw fault(
      "conflict",
      `That was not saved: this case is ${STATE_WORDS[from]} by now. Reload to see what changed.`,
    );
  }
  return transition.to;
}

/** Whether `event` can come while a case is in `from`: for screens that show or hide its button. */
export function canHappen(from: CaseState, event: keyof typeof TRANSITIONS): boolean {
  return TRANSITIONS[event].from.includes(from);
}
