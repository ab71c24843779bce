import type { BaseMetal } from "@/lib/cases/case-words";
import { metalInSentence } from "@/lib/cases/metal-words";
import { momentWords } from "@/lib/cases/moment-words";
import { densityWords, rangeWords, type Declared } from "@/lib/metals/check-words";
import { declaredFit, type DeclaredFit } from "@/lib/metals/declared";
import { waterDensityGPerCm3 } from "@/lib/metals/water-density";

/** A check that was kept on a job, as far as a warning needs it. */
export interface KeptCheck {
  densityGPerCm3: number;
  uncertaintyGPerCm3: number;
  waterTempC: number;
  /** The best candidate's base metal; null when nothing in the table fitted. */
  likelyBaseMetal: BaseMetal | null;
}

/**
 * What a kept check says against a declared metal: null when it fits, when nothing can be compared, or when nobody has
 * weighed. The declaration is what holds now, so a job card that is put right takes its warning away.
 * @example checkWarning(kept, { baseMetal: "brass", alloy: "C360" })
 *   === "Weighs like zinc die cast, 6.64 ± 0.24 g/cm³. Declared brass C360."
 */
export function checkWarning(check: KeptCheck | null | undefined, declared: Declared): string | null {
  if (!check) return null;
  const fit = fitOf(check, declared);
  if (fit.fits) return null;
  const name = metalInSentence(declared.baseMetal, declared.alloy);
  const { likelyBaseMetal } = check;
  // The same metal, another alloy: to say its name twice would tell nobody what is wrong.
  if (likelyBaseMetal === declared.baseMetal) {
    return `Weighs ${densityWords(check)}. Declared ${name}, which is ${rangeWords(fit)}.`;
  }
  const like = likelyBaseMetal === null ? "no metal in the table" : likeWords(likelyBaseMetal);
  return `Weighs like ${like}, ${densityWords(check)}. Declared ${name}.`;
}

/**
 * The same for a case, which states its own metal: the job's card may be wrong and the case right, or the other way round.
 */
export function caseWarning(check: KeptCheck | null, job: Declared, ofCase: Declared): string | null {
  const ofJob = checkWarning(check, job);
  if (!check || sameMetal(job, ofCase)) return ofJob;
  const own = metalInSentence(ofCase.baseMetal, ofCase.alloy);
  const isOwnRight = checkWarning(check, ofCase) === null;
  if (ofJob === null) return isOwnRight ? null : checkWarning(check, ofCase);
  return `${ofJob} This case says ${own}, which ${isOwnRight ? "fits" : "does not fit either"}.`;
}

/** "Tobias Lindqvist weighed it, 14 Jul 14:20." */
export const weighedWords = (check: { by: string; at: number }, timeZone: string, now: number): string =>
  `${check.by} weighed it, ${momentWords(check.at, timeZone, now)}.`;

const sameMetal = (one: Declared, other: Declared) =>
  one.baseMetal === other.baseMetal && (one.alloy ?? "") === (other.alloy ?? "");

const likeWords = (baseMetal: BaseMetal) =>
  baseMetal === "other" ? "a metal that this shop seldom plates" : metalInSentence(baseMetal, null);

function fitOf(
  { densityGPerCm3, uncertaintyGPerCm3, waterTempC }: KeptCheck,
  { baseMetal, alloy }: Declared,
): DeclaredFit {
  const measured = { densityGPerCm3, uncertaintyGPerCm3, waterDensityGPerCm3: waterDensityGPerCm3(waterTempC) };
  return declaredFit(measured, baseMetal, alloy);
}
