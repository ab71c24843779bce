import { BASE_METAL_TITLES, type BaseMetal } from "./case-words";

/**
 * The base metal within a sentence: the metal in lower case, the alloy as it is written.
 * @example metalInSentence("brass", "C360") === "brass C360"
 */
export function metalInSentence(baseMetal: BaseMetal, alloy: string | null): string {
  const metal = BASE_METAL_TITLES[baseMetal].toLowerCase();
  return alloy ? `${metal} ${alloy}` : metal;
}
