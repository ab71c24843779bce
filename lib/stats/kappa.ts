import { InputError } from "@/lib/input-error";

/** Words for how well two people agree. Source: Landis and Koch, Biometrics 33 (1977) 159, from memory. */
export type AgreementWord = "poor" | "slight" | "fair" | "moderate" | "substantial" | "almost perfect";

/** Agreement beyond chance. `low` and `high` are the 95 % interval. */
export interface Kappa {
  defined: true;
  cases: number;
  kappa: number;
  standardError: number;
  low: number;
  high: number;
  observed: number;
  expected: number;
  word: AgreementWord;
}

/** Chance alone would agree every time (both used one class only), or there are no cases: kappa says nothing. */
export interface KappaUndefined {
  defined: false;
  cases: number;
  why: "no cases" | "one class only";
}

/** How far apart two classes are: "none", every miss is the same miss; "linear", by steps (for ordered classes). */
export type KappaWeights = "none" | "linear";

/**
 * Counts of what each of two people called, for the same cases: `table[i][j]` is how often the first said `classes[i]`
 * and the second `classes[j]`. Throws `InputError` for a call outside `classes`.
 */
export function confusionMatrix(pairs: readonly (readonly [string, string])[], classes: readonly string[]): number[][] {
  const place = new Map(classes.map((name, index) => [name, index]));
  const table = classes.map(() => classes.map(() => 0));
  for (const [first, second] of pairs) {
    const row = table[place.get(first) ?? -1];
    const column = place.get(second);
    if (!row || column === undefined)
      throw new InputError("pairs", `"${row ? second : first}" is not among the classes.`);
    row[column] = (row[column] ?? 0) + 1;
  }
  return table;
}

/**
 * Cohen's kappa of a square table of counts: agreement of two people beyond what chance gives, with its standard error.
 * 1 is full agreement, 0 chance, below 0 worse than chance. Throws `InputError` for a table that is not square or has
 * counts below 0. Source: Cohen 1960, 1968; standard error Fleiss, Cohen and Everitt 1969.
 *
 * Example: [[20, 5], [10, 15]] gives 0.40.
 */
export function cohenKappa(
  table: readonly (readonly number[])[],
  weights: KappaWeights = "none",
): Kappa | KappaUndefined {
  const cases = countTable(table);
  if (cases === 0) return { defined: false, cases, why: "no cases" };
  const size = table.length;
  const share = (i: number, j: number) => (table[i]?.[j] ?? 0) / cases;
  const indices = table.map((_, index) => index);
  const rowShare = indices.map((i) => indices.reduce((sum, j) => sum + share(i, j), 0));
  const columnShare = indices.map((j) => indices.reduce((sum, i) => sum + share(i, j), 0));
  const weight = (i: number, j: number) => agreementWeight(i, j, size, weights);
  const sumOver = (term: (i: number, j: number) => number) =>
    indices.reduce((sum, i) => sum + indices.reduce((inner, j) => inner + term(i, j), 0), 0);

  const observed = sumOver((i, j) => weight(i, j) * share(i, j));
  const expected = sumOver((i, j) => weight(i, j) * (rowShare[i] ?? 0) * (columnShare[j] ?? 0));
  if (1 - expected < 1e-12) return { defined: false, cases, why: "one class only" };
  const kappa = (observed - expected) / (1 - expected);
  const rowWeight = indices.map((i) => indices.reduce((sum, j) => sum + weight(i, j) * (columnShare[j] ?? 0), 0));
  const columnWeight = indices.map((j) => indices.reduce((sum, i) => sum + weight(i, j) * (rowShare[i] ?? 0), 0));
  const spread = sumOver((i, j) => {
    const pull = (rowWeight[i] ?? 0) + (columnWeight[j] ?? 0);
    return share(i, j) * (weight(i, j) * (1 - expected) - pull * (1 - observed)) ** 2;
  });
  const variance = (spread - (observed * expected - 2 * expected + observed) ** 2) / (cases * (1 - expected) ** 4);
  const standardError = Math.sqrt(Math.max(0, variance));
  const half = 1.959963984540054 * standardError;
  return {
    defined: true,
    cases,
    kappa,
    standardError,
    low: Math.max(-1, kappa - half),
    high: Math.min(1, kappa + half),
    observed,
    expected,
    word: agreementWord(kappa),
  };
}

/** The word for a kappa. Throws `InputError` outside -1 to 1. */
export function agreementWord(kappa: number): AgreementWord {
  if (!(kappa >= -1 - 1e-9 && kappa <= 1 + 1e-9)) throw new InputError("kappa", "Kappa lies between -1 and 1.");
  if (kappa < 0) return "poor";
  if (kappa <= 0.2) return "slight";
  if (kappa <= 0.4) return "fair";
  if (kappa <= 0.6) return "moderate";
  if (kappa <= 0.8) return "substantial";
  return "almost perfect";
}

function agreementWeight(i: number, j: number, size: number, weights: KappaWeights): number {
  if (i === j) return 1;
  return weights === "none" ? 0 : 1 - Math.abs(i - j) / (size - 1);
}

function countTable(table: readonly (readonly number[])[]): number {
  let total = 0;
  for (const row of table) {
    if (row.length !== table.length) throw new InputError("table", "The table must be square.");
    for (const count of row) {
      if (!(count >= 0 && Number.isFinite(count))) throw new InputError("table", "Counts are 0 or more.");
      total += count;
    }
  }
  return total;
}
