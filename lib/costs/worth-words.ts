import { aboutParts, morePartsToTell, MOST_MORE_PARTS } from "@/lib/costs/inspect-more";
import { inspectAdvice, type InspectAnswer } from "@/lib/costs/inspect";
import { shareRangeWords, shareWords } from "@/lib/costs/share-words";
import { formatMoney } from "@/lib/money";

/** What the answer rests on. Money in cents; the check may have a fraction of one. */
export interface WorthFigures {
  checkCents: number;
  /**
   * What a bad part costs more when it goes on to the final plate than when it is held at the strike. Above 0. The strike
   * has to be put right either way, so that part of the cost does not count.
   */
  missCents: number;
  /** Parts looked at, and how many of them were bad. */
  inspected: number;
  bad: number;
  /** Runs that these parts came from, where known. */
  runs?: number;
  currency: string;
}

/** The answer for an owner: what to do in a few words, then why. */
export interface WorthWords {
  answer: InspectAnswer;
  headline: string;
  /** What each costs, where the break-even lies, and where the shop stands. */
  why: string;
  /** What to do until more is known, or what the figure does not settle; "" when the answer settles it. */
  then: string;
}

/** Puts the all-or-none rule into sentences. Throws `InputError` naming the field, as `inspectAdvice` does. */
export function worthWords(figures: WorthFigures): WorthWords {
  const { checkCents, missCents, inspected, bad } = figures;
  const answer = inspectAdvice({ checkCost: checkCents, missCost: missCents, inspected, bad });
  return {
    answer,
    headline: HEADLINES[headlineKey(answer, figures)],
    why: `${costWords(figures)} ${standingWords(answer, figures)}`,
    then: thenWords(answer, figures),
  };
}

const HEADLINES = {
  all: "Check every part.",
  none: "Do not check every part.",
  few: "Too few runs to say.",
  near: "Too close to call.",
  nothing: "No runs to go by yet.",
} as const;

function headlineKey(
  { advice, breakEvenRate }: InspectAnswer,
  { inspected, bad }: WorthFigures,
): keyof typeof HEADLINES {
  if (advice === "check-all") return "all";
  if (advice === "check-none") return "none";
  if (inspected === 0) return "nothing";
  return morePartsToTell({ breakEvenRate, inspected, bad }) === null ? "near" : "few";
}

function costWords({ checkCents, missCents, currency }: WorthFigures): string {
  return `Checking one costs ${amountWords(checkCents, currency)}; a bad one that goes on costs ${amountWords(missCents, currency)} more.`;
}

/** Small amounts with cents, from a hundred on in whole units. A fraction of a cent is not nothing. */
export function amountWords(cents: number, currency: string): string {
  if (cents > 0 && cents < 0.5) return `less than ${formatMoney(1, currency)}`;
  return formatMoney(Math.round(cents), currency, { whole: cents >= 10_000 });
}

function standingWords({ breakEvenRate, rate, interval }: InspectAnswer, figures: WorthFigures): string {
  if (breakEvenRate >= 1) return "A check that costs as much as a miss never pays.";
  const pays = `It pays above ${shareWords(breakEvenRate)}`;
  if (rate === undefined) return `${pays} bad parts.`;
  const parts = `${wholeWords(figures.inspected)} ${figures.inspected === 1 ? "part" : "parts"}`;
  const runs =
    figures.runs === undefined ? "" : ` in ${wholeWords(figures.runs)} ${figures.runs === 1 ? "run" : "runs"}`;
  return `${pays}; yours is ${shareWords(rate)} (${shareRangeWords(...interval)}, ${parts}${runs}).`;
}

function thenWords({ advice, breakEvenRate }: InspectAnswer, figures: WorthFigures): string {
  if (advice === "check-all") return "";
  if (advice === "check-none") {
    return "That is the money alone: a customer or a standard may still ask for it. Look again when the rate rises.";
  }
  if (figures.inspected === 0) return "Log what is struck, and every part that is held: the share comes from that.";
  const more = morePartsToTell({ breakEvenRate, inspected: figures.inspected, bad: figures.bad });
  if (more === null) {
    return `It would take more than ${wholeWords(MOST_MORE_PARTS)} more parts to tell: so near the break-even, checking all and checking none cost nearly the same.`;
  }
  return `About ${wholeWords(aboutParts(more))} more parts would tell, if they come as these did${runsMore(more, figures)}. Until then check every part: only a part that was looked at counts.`;
}

/** "…, some 12 runs", when the runs so far say how many parts one has. */
function runsMore(more: number, { inspected, runs }: WorthFigures): string {
  if (!runs) return "";
  const count = Math.max(1, Math.ceil((more * runs) / inspected));
  return `: some ${wholeWords(aboutParts(count))} ${count === 1 ? "run" : "runs"}`;
}

function wholeWords(count: number): string {
  return count.toLocaleString("en-US");
}
