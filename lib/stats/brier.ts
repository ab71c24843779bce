import { InputError, requireBetween, requireWhole, type NotEnough } from "@/lib/input-error";

/** One forecast that has been settled: the chance that was named and whether it came true. */
export interface Forecast {
  probability: number;
  happened: boolean;
}

/** Mean squared error of the chances: 0 is perfect, 0.25 is what "fifty-fifty" always scores. */
export interface BrierScore {
  enough: true;
  score: number;
  cases: number;
}

/**
 * Brier score of yes-or-no forecasts, 0 to 1, lower is better. No forecasts give `{ enough: false }`.
 * Throws `InputError` for a probability outside 0 to 1. Source: Brier, Monthly Weather Review 78 (1950) 1.
 *
 * Example: 0.1 no, 0.9 yes, 0.8 yes, 0.3 no: 0.0375.
 */
export function brierScore(forecasts: readonly Forecast[]): BrierScore | NotEnough {
  if (forecasts.length === 0) return { enough: false, have: 0, need: 1 };
  const sum = forecasts.reduce((total, { probability, happened }, index) => {
    requireBetween(`forecasts.${index}.probability`, probability, 0, 1);
    return total + (probability - (happened ? 1 : 0)) ** 2;
  }, 0);
  return { enough: true, score: sum / forecasts.length, cases: forecasts.length };
}

/** A forecast over classes: what was ranked, and which class it was in the end. */
export interface ClassForecast {
  probabilities: Readonly<Record<string, number>>;
  truth: string;
}

/**
 * Brier score over classes, 0 to 2: sum over classes of the squared error, mean over cases. For two classes it is twice
 * `brierScore`. A truth that the forecast does not list counts as forecast 0. Throws `InputError`.
 */
export function brierScoreOverClasses(forecasts: readonly ClassForecast[]): BrierScore | NotEnough {
  if (forecasts.length === 0) return { enough: false, have: 0, need: 1 };
  const sum = forecasts.reduce((total, { probabilities, truth }, index) => {
    let error = truth in probabilities ? 0 : 1;
    for (const [name, probability] of Object.entries(probabilities)) {
      requireBetween(`forecasts.${index}.${name}`, probability, 0, 1);
      error += (probability - (name === truth ? 1 : 0)) ** 2;
    }
    return total + error;
  }, 0);
  return { enough: true, score: sum / forecasts.length, cases: forecasts.length };
}

/** One bin of a reliability diagram: of the forecasts near `meanProbability`, the share that came true. */
export interface ReliabilityBin {
  from: number;
  to: number;
  cases: number;
  /** Both absent when the bin is empty: nothing is drawn there. */
  meanProbability?: number;
  happenedShare?: number;
}

/** Forecasts sorted into equal bins of probability; 1 belongs to the last. All bins are returned, empty ones too. Throws `InputError`. */
export function reliabilityBins(forecasts: readonly Forecast[], bins = 10): ReliabilityBin[] {
  requireWhole("bins", bins, 1, 100);
  const tally = Array.from({ length: bins }, () => ({ cases: 0, probability: 0, happened: 0 }));
  for (const [index, { probability, happened }] of forecasts.entries()) {
    requireBetween(`forecasts.${index}.probability`, probability, 0, 1);
    const bin = tally[Math.min(bins - 1, Math.floor(probability * bins))];
    if (!bin) throw new InputError("bins", "No bin for this probability.");
    bin.cases += 1;
    bin.probability += probability;
    bin.happened += happened ? 1 : 0;
  }
  return tally.map(({ cases, probability, happened }, index) => ({
    from: index / bins,
    to: (index + 1) / bins,
    cases,
    ...(cases > 0 ? { meanProbability: probability / cases, happenedShare: happened / cases } : {}),
  }));
}
