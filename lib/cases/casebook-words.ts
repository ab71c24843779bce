import type { ResolvedFilter } from "./casebook-filter";
import type { FilterName } from "./casebook.schema";
import { countWords } from "./part-words";

/** A count that stopped at its limit says so instead of guessing. */
export interface CappedCount {
  count: number;
  /** There are more than `count`. */
  isCapped: boolean;
}

/** @example cappedWords({ count: 1000, isCapped: true }) === "more than 1,000" */
export function cappedWords({ count, isCapped }: CappedCount): string {
  const figure = new Intl.NumberFormat("en-US").format(count);
  return isCapped ? `more than ${figure}` : figure;
}

/** The sentence's beginning: "23 cases", "More than 1,000 cases", "No case". */
export function casesWords(counted: CappedCount): string {
  if (counted.count === 0) return "No case";
  const words = cappedWords(counted);
  return `${words.charAt(0).toUpperCase()}${words.slice(1)} ${counted.count === 1 ? "case" : "cases"}`;
}

/** A stretch of the sentence that a page opens with; a filter's words lead to its field. */
export type SentencePart = { plain: string } | { filter: FilterName; words: string; isSet: boolean };

/** The four that are always in the sentence, and how it reads while they are not set. */
const ALWAYS = [
  { filter: "class", before: " of ", any: "any class" },
  { filter: "metal", before: " on ", any: "any metal" },
  { filter: "station", before: " that began ", any: "anywhere on the line" },
  { filter: "status", before: ", ", any: "in any state" },
] as const;

const WHEN_SET = [
  { filter: "openedFrom", before: ", opened from " },
  { filter: "openedTo", before: ", opened by " },
  { filter: "closedFrom", before: ", closed from " },
  { filter: "closedTo", before: ", closed by " },
  { filter: "cause", before: ", put down to " },
  { filter: "stage", before: ", found " },
  { filter: "customer", before: ", for " },
  { filter: "by", before: ", snapped by " },
  { filter: "exemplars", before: ", " },
] as const;

/** The filters as the rest of the sentence: "of underactivation on brass that began at Activate, closed". */
export function sentenceParts(names: ResolvedFilter["names"]): SentencePart[] {
  const always = ALWAYS.flatMap(({ filter, before, any }): SentencePart[] => {
    const name = names[filter];
    const at = filter === "station" && name ? "at " : "";
    return [{ plain: before + at }, { filter, words: name ? inSentence(filter, name) : any, isSet: Boolean(name) }];
  });
  const set = WHEN_SET.flatMap(({ filter, before }): SentencePart[] => {
    const name = names[filter];
    if (!name) return [];
    return [{ plain: jointBefore(filter, names) ?? before }, { filter, words: inSentence(filter, name), isSet: true }];
  });
  return [...always, ...set];
}

/** Days run on from what stands before them: "closed from 1 Jul 2026 to 14 Jul 2026". */
function jointBefore(filter: FilterName, names: ResolvedFilter["names"]): string | null {
  if (filter === "openedTo" && names.openedFrom) return " to ";
  if (filter === "closedTo" && names.closedFrom) return " to ";
  const isSaid = names.status?.startsWith("closed") && !names.status.includes(",");
  if (!isSaid || (filter !== "closedFrom" && filter !== "closedTo")) return null;
  return filter === "closedFrom" ? " from " : " by ";
}

const KEEP_CAPITAL: ReadonlySet<FilterName> = new Set([
  "station",
  "customer",
  "by",
  "openedFrom",
  "openedTo",
  "closedFrom",
  "closedTo",
]);

/** Names of people, stations and customers keep their capital; words of the trade lose it inside a sentence. */
function inSentence(filter: FilterName, name: string): string {
  return KEEP_CAPITAL.has(filter) ? name : `${name.charAt(0).toLowerCase()}${name.slice(1)}`;
}

/** What to do about an empty page: "Drop one of the three filters." */
export function dropWords(filters: number): string {
  if (filters === 0) return "";
  return filters === 1 ? "Drop the filter." : `Drop one of the ${countWords(filters)} filters.`;
}
