import type { PhotoPurpose, PhotoState } from "./photo-words";

export interface ShotStanding {
  /** Its number among the case's photos, from 1. */
  number: number;
  purpose: PhotoPurpose;
  round: number;
  state: PhotoState;
  /** Why it could not be kept, in words for the person. */
  refusal: string | null;
  /** Who took it. */
  by: string;
}

/** Under a photo: "Snap", "Re-strike, round 2". */
export function shotCaption({ purpose, round }: Pick<ShotStanding, "purpose" | "round">): string {
  const what = purpose === "suspect" ? "Snap" : "Re-strike";
  return round > 1 ? `${what}, round ${round}` : what;
}

/**
 * What stands in a photo's place while there is nothing to look at. Undefined when it is ready.
 * @example shotMissing({ number: 2, purpose: "suspect", round: 1, state: "awaited", refusal: null, by: "Tobias Lindqvist" }) ===
 *   "Photo 2 is still on its way from Tobias's phone."
 */
export function shotMissing({ number, state, refusal, by }: ShotStanding): string | undefined {
  switch (state) {
    case "ready":
      return undefined;
    case "awaited":
      return `Photo ${number} is still on its way from ${firstName(by)}'s phone.`;
    case "processing":
      return `Photo ${number} is in. Its sizes are being made; reload in a moment.`;
    case "refused":
      return `Photo ${number} was not kept. ${refusal ?? "Take it again."}`;
  }
}

function firstName(name: string): string {
  return name.trim().split(/\s+/)[0] ?? name;
}
