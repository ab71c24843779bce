import { SURENESS, type Sureness } from "@/lib/cases/case-words";
import type { NotEnough } from "@/lib/input-error";
import { brierScore, reliabilityBins, type BrierScore, type Forecast } from "@/lib/stats/brier";
import { cohenKappa, confusionMatrix, type Kappa, type KappaUndefined } from "@/lib/stats/kappa";
import { wilsonInterval, type ShareInterval } from "@/lib/stats/wilson";
import type { CalledPair } from "./confusion";

/** One answer of a person, as it was kept. */
export interface PracticeAnswer extends CalledPair {
  photoId: string;
  sure: Sureness;
}

/** Fewer calls say nothing about an eye. */
export const LEAST_CALLS = 8;

/**
 * The first answer on each photo, in the order given: a photo that comes back is remembered as much as read, so only
 * the first call on it measures the eye.
 * @param answers oldest first
 */
export function firstAnswers<Answer extends PracticeAnswer>(answers: readonly Answer[]): Answer[] {
  const seen = new Set<string>();
  return answers.filter((answer) => !seen.has(answer.photoId) && seen.add(answer.photoId));
}

export interface Score {
  right: number;
  calls: number;
  /** 95 % interval of the share right. */
  interval: ShareInterval;
  /** Honest, and counted neither way. */
  cantTell: number;
}

/** How many calls were right. */
export function scoreOf(answers: readonly PracticeAnswer[]): Score {
  const calls = answers.filter((answer) => answer.called !== null);
  const right = calls.filter((answer) => answer.called === answer.confirmed).length;
  return {
    right,
    calls: calls.length,
    interval: wilsonInterval(right, calls.length),
    cantTell: answers.length - calls.length,
  };
}

export interface ConfusionTable {
  /** Every class that was called or confirmed, in the order given. */
  classes: string[];
  /** `table[i][j]`: how often a photo of `classes[i]` was called `classes[j]`. */
  table: number[][];
  /** How often "can't tell" was said to a photo of `classes[i]`. */
  cantTell: number[];
}

/**
 * Their calls against what was confirmed.
 * @param order classes in the shop's order; one that is no longer among them comes last
 */
export function confusionTable(answers: readonly CalledPair[], order: readonly string[]): ConfusionTable {
  const used = new Set(answers.flatMap((answer) => [answer.confirmed, answer.called ?? answer.confirmed]));
  const classes = [...order.filter((slug) => used.has(slug)), ...[...used].filter((slug) => !order.includes(slug))];
  return {
    classes,
    table: confusionMatrix(pairsOf(answers), classes),
    cantTell: classes.map((slug) => answers.filter((each) => each.called === null && each.confirmed === slug).length),
  };
}

/** Agreement with the confirmed class beyond what chance gives. "Can't tell" is left out. */
export function kappaOf(answers: readonly CalledPair[]): Kappa | KappaUndefined {
  const pairs = pairsOf(answers);
  return cohenKappa(confusionMatrix(pairs, [...new Set(pairs.flat())]));
}

const pairsOf = (answers: readonly CalledPair[]) =>
  answers.flatMap(({ called, confirmed }) => (called === null ? [] : [[confirmed, called] as const]));

/** What share of right calls a notch of sureness promises. From memory: the dial carries words, no numbers. */
export const STATED_SHARE: Record<Sureness, number> = { 1: 0.35, 2: 0.7, 3: 0.95 };

export interface NotchRecord {
  sure: Sureness;
  stated: number;
  calls: number;
  right: number;
  interval: ShareInterval;
}

export interface Calibration {
  notches: NotchRecord[];
  brier: BrierScore | NotEnough;
}

/**
 * How sure a person was against how often they were right: one line a notch, and the Brier score of the shares that
 * the notches promise (0 is perfect, "fifty-fifty" always scores 0.25). "Can't tell" claims nothing and is left out.
 */
export function calibrationOf(
  answers: readonly PracticeAnswer[],
  stated: Record<Sureness, number> = STATED_SHARE,
): Calibration {
  const claims = answers.filter((answer) => answer.called !== null);
  const forecasts: Forecast[] = claims.map(({ sure, called, confirmed }) => ({
    probability: stated[sure],
    happened: called === confirmed,
  }));
  const notches = SURENESS.map((sure) => {
    // One bin over the whole range: the notches promise a share each, so each is a bin of its own.
    const [bin] = reliabilityBins(forecasts.filter((_, index) => claims[index]?.sure === sure), 1); // prettier-ignore
    const calls = bin?.cases ?? 0;
    const right = Math.round((bin?.happenedShare ?? 0) * calls);
    return { sure, stated: stated[sure], calls, right, interval: wilsonInterval(right, calls) };
  });
  return { notches, brier: brierScore(forecasts) };
}

/** In words, how a notch stands: does it promise more than it keeps? Says so only where the interval is clear of it. */
export function notchWords({ stated, calls, interval }: NotchRecord): string {
  if (calls < LEAST_CALLS) return `Not enough yet: ${calls} of ${LEAST_CALLS}`;
  if (interval.high < stated) return "Surer than right";
  return interval.low > stated ? "Righter than sure" : "Sure as right";
}
