import { BASE_METAL_TITLES, SURENESS_TITLES, type BaseMetal, type Sureness } from "./case-words";

/**
 * A class as a tag says it: a first call with a question mark, a confirmed one without.
 * @param title the class's title, or null for "can't tell"
 * @example callWords("Underactivation", false) === "Underactivation?"
 */
export function callWords(title: string | null, isConfirmed: boolean): string {
  if (title === null) return "Can't tell yet";
  return isConfirmed ? title : `${title}?`;
}

/** "Brass C360": the base metal with its alloy, where one is known. */
export function metalWords(baseMetal: BaseMetal, alloy: string | null): string {
  return alloy ? `${BASE_METAL_TITLES[baseMetal]} ${alloy}` : BASE_METAL_TITLES[baseMetal];
}

/** "brass C360": the same inside a sentence; the alloy keeps its capitals. */
export function metalInside(baseMetal: BaseMetal, alloy: string | null): string {
  const words = metalWords(baseMetal, alloy);
  return words.charAt(0).toLowerCase() + words.slice(1);
}

/** "First call, fairly sure": how sure the caller was, in a sentence. Who can't tell claims nothing. */
export function firstCallWords(calledClass: string | null, sure: Sureness): string {
  return calledClass === null ? "First call: can't tell" : `First call, ${SURENESS_TITLES[sure].toLowerCase()}`;
}

/** "3 of 48", or "3" where the run's size is not known. */
export function partsOf(quantity: number, struck: number | null): string {
  return struck === null ? String(quantity) : `${quantity} of ${struck}`;
}

const COUNTS = ["none", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten"];

/** Small counts as words, larger ones as figures: "All five ticked". */
export function countWords(count: number): string {
  return COUNTS[count] ?? String(count);
}

/** "1 part", "3 parts": a count with its noun. */
export function counted(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? "" : "s"}`;
}
