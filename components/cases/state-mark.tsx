import type { TagState } from "@/components/cases/tag-state";

/** The state in words, with a small echo of its tail: "Held 38 min", "Step 3 of 5". */
export function StateMark({ state, words }: { state: TagState; words: string }) {
  return <span className={`state state--${state}`}>{words}</span>;
}
