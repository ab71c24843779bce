import type { CaseState } from "./case-state";
import type { Closing } from "./case-words";
import { progressWords } from "./card-progress";
import { waitWords } from "./moment-words";

/** What a case's tag says: its tail by name, and the words beside the reference. */
export interface TagStanding {
  state: "held" | "confirmed" | "in-rework" | "closed-sound" | "scrap" | "concession" | "regrade" | "released";
  words: string;
}

interface Standing {
  state: CaseState;
  closing: Closing | null;
  round: number;
  /** UTC milliseconds since when it waits in this round. */
  heldAt: number;
  /** How far the current card has come, where there is one. */
  card?: { steps: number; ticked: number };
}

const CLOSED: Record<Closing, (round: number) => TagStanding> = {
  sound: (round) => ({ state: "closed-sound", words: round > 1 ? `Closed, sound in round ${round}` : "Closed, sound" }),
  scrap: () => ({ state: "scrap", words: "Closed, scrapped" }),
  concession: () => ({ state: "concession", words: "Closed, concession" }),
  regrade: () => ({ state: "regrade", words: "Closed, regraded" }),
  released: () => ({ state: "released", words: "Released, it was sound" }),
};

/**
 * The tail and the words of a case's tag as it stands now.
 * @example tagStanding({ state: "held", closing: null, round: 2, heldAt: 0 }, 55 * 60_000).words === "Round 2, 55 min"
 */
export function tagStanding(standing: Standing, now: number): TagStanding {
  const { state, closing, round, heldAt, card } = standing;
  if (state === "closed") return CLOSED[closing ?? "sound"](round);
  if (state === "confirmed" || state === "in-rework") {
    return { state, words: card ? progressWords(card) : state === "confirmed" ? "Confirmed" : "In rework" };
  }
  const waited = waitWords(now - heldAt);
  return { state, words: round > 1 ? `Round ${round}, ${waited}` : `Held ${waited}` };
}
