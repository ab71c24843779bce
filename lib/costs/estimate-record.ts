import { correctionFrom, type Correction, type EstimatedAndRecorded } from "@/lib/costs/correction";
import { STRIP_METHODS, type StripMethod } from "@/lib/costs/strip-methods";
import type { NotEnough } from "@/lib/input-error";

/** One case that was put right: the hands-on minutes that the estimate alone gave it, and those that its cards recorded. */
export interface EstimatePair extends EstimatedAndRecorded {
  ref: string;
  classSlug: string;
  method: StripMethod;
}

/** The record of one class by one method, or of a method over all classes (`classSlug` null). */
export interface CorrectionRow {
  classSlug: string | null;
  method: StripMethod;
  pairs: number;
  /** Hands-on, of all the pairs together; the estimate's own, without any correction. */
  estimatedMinutes: number;
  recordedMinutes: number;
  correction: Correction | NotEnough;
}

/** What the estimated minutes of each method are multiplied by; 1 where there is too little to go by. */
export type MinutesCorrections = Readonly<Record<StripMethod, number>>;

/** Nothing recorded yet. */
export const NO_CORRECTIONS: MinutesCorrections = { "polish-back": 1, chemical: 1, electrolytic: 1 };

/**
 * The shop's record, a row for each class and method that has pairs, and one for each method over all classes. Methods in
 * their usual order; of a method first all classes, then the class with the most pairs.
 */
export function correctionRows(pairs: readonly EstimatePair[]): CorrectionRow[] {
  return STRIP_METHODS.flatMap((method) => {
    const ofMethod = pairs.filter((pair) => pair.method === method);
    if (ofMethod.length === 0) return [];
    const classes = [...new Set(ofMethod.map((pair) => pair.classSlug))];
    const rows = classes.map((slug) =>
      rowOf(
        slug,
        method,
        ofMethod.filter((pair) => pair.classSlug === slug),
      ),
    );
    return [rowOf(null, method, ofMethod), ...rows.toSorted((a, b) => b.pairs - a.pairs)];
  });
}

function rowOf(classSlug: string | null, method: StripMethod, pairs: readonly EstimatePair[]): CorrectionRow {
  return {
    classSlug,
    method,
    pairs: pairs.length,
    estimatedMinutes: pairs.reduce((sum, pair) => sum + pair.estimated, 0),
    recordedMinutes: pairs.reduce((sum, pair) => sum + pair.recorded, 0),
    correction: correctionFrom(pairs),
  };
}

/**
 * What a case of this class is corrected by, method by method: the record of class and method; where that has too few
 * pairs, the record of the method over all classes; where that has too few as well, 1.
 */
export function minutesCorrections(rows: readonly CorrectionRow[], classSlug: string | null): MinutesCorrections {
  const ratioOf = (method: StripMethod) => {
    const ofMethod = rows.filter((row) => row.method === method && row.correction.enough);
    const found =
      ofMethod.find((row) => classSlug !== null && row.classSlug === classSlug) ??
      ofMethod.find((row) => row.classSlug === null);
    return found?.correction.enough ? found.correction.ratio : 1;
  };
  return {
    "polish-back": ratioOf("polish-back"),
    chemical: ratioOf("chemical"),
    electrolytic: ratioOf("electrolytic"),
  };
}
