import type { BaseMetal } from "@/lib/cases/case-words";
import { MATERIALS } from "@/lib/metals/materials";
import { MORE_ALLOYS, type AlloyRange } from "@/lib/metals/more-alloys";

export interface DeclaredRange {
  lowGPerCm3: number;
  highGPerCm3: number;
  /** Whether it is the alloy's own; else the whole base metal's. */
  ofAlloy: boolean;
}

const ALLOYS: readonly AlloyRange[] = [...MATERIALS, ...MORE_ALLOYS];

/**
 * Densities that a declared metal can have, g/cm³: the alloy's where its name is known for that base metal ("C360",
 * "304 sheet", "6061-T6"; the longest name that is in what was typed wins), else from the lightest to the heaviest of the base metal.
 * A name shared by several ("14k") gives all of them.
 */
export function declaredRange(baseMetal: BaseMetal, alloy: string): DeclaredRange {
  const family = ALLOYS.filter((each) => each.baseMetal === baseMetal);
  const typed = wordsOf(alloy);
  let longest = 0;
  let named: AlloyRange[] = [];
  for (const each of family) {
    const length = Math.max(0, ...each.alloys.map((name) => (holds(typed, wordsOf(name)) ? squeezed(name).length : 0)));
    if (length > longest) [longest, named] = [length, []];
    if (length > 0 && length === longest) named.push(each);
  }
  return { ...spanOf(named.length > 0 ? named : family), ofAlloy: named.length > 0 };
}

function spanOf(ranges: readonly AlloyRange[]): { lowGPerCm3: number; highGPerCm3: number } {
  return {
    lowGPerCm3: Math.min(...ranges.map((each) => each.lowGPerCm3)),
    highGPerCm3: Math.max(...ranges.map((each) => each.highGPerCm3)),
  };
}

const wordsOf = (name: string): string[] => name.toLowerCase().match(/[a-z0-9]+/g) ?? [];
const squeezed = (name: string): string => wordsOf(name).join("");

/** Whether what was typed holds the name as whole words, however they are spaced: "zamak3", "Zamak-3", "zamak 3". */
function holds(typed: readonly string[], name: readonly string[]): boolean {
  const wanted = name.join("");
  return typed.some((_, start) => {
    let joined = "";
    for (const word of typed.slice(start)) {
      joined += word;
      if (joined.length >= wanted.length) return joined === wanted;
    }
    return false;
  });
}
