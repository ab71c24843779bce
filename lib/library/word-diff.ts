import { diffWordsWithSpace } from "diff";

/** A stretch of text that stayed, came, or went. */
export interface DiffPart {
  standing: "same" | "added" | "removed";
  text: string;
}

/** Beyond this many differing words two texts are told apart as wholes: a word by word account would help nobody. */
const MOST_EDITS = 2_000;

/**
 * What changed between two texts, word by word.
 * @example wordDiff("a short rinse", "a long rinse") tells "short" removed and "long" added between "a " and " rinse"
 * @returns parts whose same and removed ones make up `before`, same and added ones `after`; none for two empty texts
 */
export function wordDiff(before: string, after: string): DiffPart[] {
  const parts = diffWordsWithSpace(before, after, { maxEditLength: MOST_EDITS });
  if (!parts) {
    const whole: DiffPart[] = [
      { standing: "removed", text: before },
      { standing: "added", text: after },
    ];
    return whole.filter((part) => part.text !== "");
  }
  return parts.map(({ added, removed, value }) => ({
    standing: added ? "added" : removed ? "removed" : "same",
    text: value,
  }));
}
