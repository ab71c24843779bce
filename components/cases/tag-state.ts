/** What a hold tag can say; each has its own tail. The last five are the ways a case ends. */
export const TAG_STATES = [
  "held",
  "confirmed",
  "in-rework",
  "closed-sound",
  "scrap",
  "concession",
  "regrade",
  "released",
] as const;
export type TagState = (typeof TAG_STATES)[number];
