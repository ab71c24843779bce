import { countWords } from "@/lib/cases/part-words";
import { LEAST_CASES } from "./shop-share";

/** The class that is no fault: what every suspect is held against. */
export const BASELINE_CLASS = "sound";

interface NamedClass {
  slug: string;
  title: string;
}

/** How a class stands among the shop's confirmed faults. */
export interface ClassStanding {
  cases: number;
  /** All cases confirmed as a fault. */
  faults: number;
  /** No fault was confirmed more often, and often enough to say so. */
  isBiggest: boolean;
}

/** @param counts confirmed cases by class; the baseline among them is no fault and is left out */
export function standingOf(slug: string, counts: ReadonlyMap<string, number>): ClassStanding {
  const faults = [...counts].filter(([each]) => each !== BASELINE_CLASS);
  const cases = counts.get(slug) ?? 0;
  const most = Math.max(0, ...faults.map(([, count]) => count));
  return {
    cases,
    faults: faults.reduce((sum, [, count]) => sum + count, 0),
    isBiggest: slug !== BASELINE_CLASS && cases >= LEAST_CASES && cases === most,
  };
}

/** The sentence that the shelf opens with: what the shop meets most, or what stands on the shelf. */
export function shelfWords(classes: readonly NamedClass[], counts: ReadonlyMap<string, number>): string {
  const biggest = classes.find((each) => standingOf(each.slug, counts).isBiggest);
  if (biggest) {
    const { cases, faults } = standingOf(biggest.slug, counts);
    return `${biggest.title} is what you meet most: ${cases} of ${faults} cases.`;
  }
  const faults = classes.filter((each) => each.slug !== BASELINE_CLASS).length;
  const many = countWords(faults);
  return `${many.charAt(0).toUpperCase()}${many.slice(1)} ${faults === 1 ? "fault" : "faults"}, each with its causes and what puts it right.`;
}
