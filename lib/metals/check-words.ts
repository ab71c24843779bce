import type { BaseMetal } from "@/lib/cases/case-words";
import { metalInSentence } from "@/lib/cases/metal-words";
import { countWords } from "@/lib/cases/part-words";
import type { DeclaredFit } from "@/lib/metals/declared";
import type { Material } from "@/lib/metals/material";
import { AIR_DENSITY_G_PER_CM3 } from "@/lib/metals/water-density";

/** What a job card says its parts are made of. */
export interface Declared {
  baseMetal: BaseMetal;
  alloy: string | null;
}

/** "6.64 ± 0.24 g/cm³" */
export function densityWords(measured: { densityGPerCm3: number; uncertaintyGPerCm3: number }): string {
  return `${measured.densityGPerCm3.toFixed(2)} ± ${errorWords(measured.uncertaintyGPerCm3)} g/cm³`;
}

/** An error smaller than the digits shown is not none. */
export const errorWords = (uncertaintyGPerCm3: number): string =>
  uncertaintyGPerCm3 < 0.005 ? uncertaintyGPerCm3.toPrecision(1) : uncertaintyGPerCm3.toFixed(2);

/** "6.5 to 6.7" */
export const rangeWords = (range: { lowGPerCm3: number; highGPerCm3: number }): string =>
  `${Number(range.lowGPerCm3.toFixed(2))} to ${Number(range.highGPerCm3.toFixed(2))}`;

/** What stands in brackets tells specialists more and everybody else nothing. */
const BRACKETS = / \(.*\)$/;

/** "Zinc die cast Alloy 3": a metal as a line of its own, without what stands in brackets. */
export const shortName = ({ name }: Pick<Material, "name">): string => capital(name.replace(BRACKETS, ""));

/**
 * The kinds of metal among candidates, best first: base metals, and by name those outside our base metals.
 * @example kindsOf([Alloy 3, Alloy 5]) // ["zinc die cast"]
 */
export function kindsOf(candidates: readonly Material[]): string[] {
  return [...new Set(candidates.map(kindOf))];
}

const kindOf = ({ baseMetal, name }: Material): string =>
  baseMetal === "other" ? name : metalInSentence(baseMetal, null);

/** More than this many names in a sentence say less than their number. */
const NAMED = 3;

/**
 * The sentence that the check opens with.
 * @param declared what the job says, and whether that fits; null where no job is chosen
 * @example verdictWords([zinc], brass that does not fit) // "It weighs like zinc die cast. The job says brass."
 */
export function verdictWords(
  candidates: readonly Material[],
  declared: { metal: Declared; fit: DeclaredFit } | null,
): string {
  const kinds = kindsOf(candidates);
  const like = kinds.length === 0 ? "It weighs like no metal in the table." : `It weighs like ${orWords(kinds)}.`;
  if (!declared || !declared.fit.known) return like;
  const says = metalInSentence(declared.metal.baseMetal, null);
  if (!declared.fit.fits) {
    // The kind may be right and the alloy wrong: then the alloy is what the job says wrongly.
    const said = kinds.includes(says) ? metalInSentence(declared.metal.baseMetal, declared.metal.alloy) : says;
    return `${like} The job says ${said}.`;
  }
  if (kinds.length === 1 && kinds[0] === says) return `${like} The job says so too.`;
  return kinds.includes(says) ? `${like} The job says ${says}.` : `${like} By weight alone the job's ${says} fits too.`;
}

function orWords(kinds: readonly string[]): string {
  const [first = "", ...others] = kinds;
  if (others.length === 0) return first;
  if (kinds.length > NAMED) return `${first}, or ${countWords(others.length)} other metals`;
  return `${kinds.slice(0, -1).join(", ")} or ${kinds.at(-1)}`;
}

/** What the candidates leave open, in a line under the density. */
export function openWords(candidates: readonly Material[]): string {
  const [best] = candidates;
  if (!best) return "Nothing in the table fits. See what may have misled.";
  const kinds = kindsOf(candidates);
  if (kinds.length > 1) return `The weight leaves ${countWords(kinds.length)} metals open. Their routes differ.`;
  if (candidates.length === 1) return `Only ${best.name.replace(BRACKETS, "")} fits.`;
  return `${capital(kinds[0] ?? "")}. This does not tell its alloys apart; the route is the same.`;
}

const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/**
 * What the result rests on: the water, the air, the balance, and where the ranges come from.
 * @param shown the metals whose ranges are drawn
 * @param tempTyped the temperature as the shop reads it: "22.0 °C"
 */
export function restsWords(
  measured: { waterDensityGPerCm3: number },
  shown: readonly Pick<Material, "name" | "source">[],
  { tempTyped, balanceErrorG }: { tempTyped: string; balanceErrorG: number },
): string {
  const air = `air ${AIR_DENSITY_G_PER_CM3}`;
  const water = `Water ${measured.waterDensityGPerCm3.toFixed(4)} g/cm³ at ${tempTyped}, ${air}; both readings may be off by ${balanceErrorG} g.`;
  return shown.length === 0 ? water : `${water} ${sourceWords(shown)}`;
}

function sourceWords(shown: readonly Pick<Material, "name" | "source">[]): string {
  const remembered = shown.filter(({ source }) => source.includes("from memory")).map(shortName);
  if (remembered.length === 0) return "Ranges published.";
  if (remembered.length === shown.length) return "Ranges from memory.";
  return `Ranges: ${remembered.join(", ")} from memory, the rest published.`;
}
