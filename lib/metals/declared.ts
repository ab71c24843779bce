import { BASE_METAL_TITLES, type BaseMetal } from "@/lib/cases/case-words";
import { declaredRange } from "@/lib/metals/declared-range";
import { overlaps } from "@/lib/metals/material";
import type { MeasuredDensity } from "@/lib/metals/weigh-part";

/** Whether what the job card says the part is made of can be what was weighed. */
export interface DeclaredFit {
  /** True too when it cannot be judged. */
  fits: boolean;
  /** False when the table holds nothing to compare with: the card says "another metal". */
  known: boolean;
  lowGPerCm3: number;
  highGPerCm3: number;
  /** The declared metal as a person says it: "Brass C360". */
  name: string;
  /** The verdict in a sentence or two. */
  words: string;
}

/**
 * Compares the job card's metal with a weighing: the declared alloy's own range where it is known, else the whole
 * span of its base metal. Fits when the range and the measured one overlap. Throws nothing.
 *
 * Example: C360 brass that reads 6.64: "Brass C360 is 8.45 to 8.53 g/cm³. This part reads 6.64, outside its error."
 */
export function declaredFit(measured: MeasuredDensity, baseMetal: BaseMetal, alloy?: string | null): DeclaredFit {
  const range = declaredRange(baseMetal, alloy ?? "");
  const { lowGPerCm3, highGPerCm3 } = range;
  const name = declaredName(baseMetal, alloy ?? "");
  if (baseMetal === "other" && !range.ofAlloy) {
    const words = "The job card names no metal that is in the table, so there is nothing to compare with.";
    return { fits: true, known: false, lowGPerCm3, highGPerCm3, name, words };
  }
  const fits = overlaps(measured, range);
  const reads = measured.densityGPerCm3.toFixed(2);
  const verdict = fits ? `This part reads ${reads}: it fits.` : `This part reads ${reads}, outside its error.`;
  const span = `${lowGPerCm3.toFixed(2)} to ${highGPerCm3.toFixed(2)} g/cm³`;
  const subject = alloy?.trim() && !range.ofAlloy ? `${BASE_METAL_TITLES[baseMetal]} of any alloy` : name;
  return { fits, known: true, lowGPerCm3, highGPerCm3, name, words: `${subject} is ${span}. ${verdict}` };
}

/** "Brass C360"; a card that says "brass C360" itself is not made to say brass twice. */
function declaredName(baseMetal: BaseMetal, alloy: string): string {
  const title = BASE_METAL_TITLES[baseMetal];
  const typed = alloy.trim();
  if (!typed) return title;
  const firstWord = title.split(" ")[0] ?? title;
  if (baseMetal !== "other" && !typed.toLowerCase().includes(firstWord.toLowerCase())) return `${title} ${typed}`;
  return typed.charAt(0).toUpperCase() + typed.slice(1);
}
