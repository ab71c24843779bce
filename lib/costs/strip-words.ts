import type { StageFound } from "@/lib/cases/case-words";
import { counted } from "@/lib/cases/part-words";
import type { StripReckoning } from "@/lib/costs/reckon-strip";
import type { StripBatch } from "@/lib/costs/read-strip";
import { formatMoney, splitCents } from "@/lib/money";
import { metalOf, type DepositMetal } from "@/lib/plating/metals";

/** Below this cents matter. */
const WHOLE_FROM_CENTS = 10_000;

/** Money as an estimate says it: whole units from a hundred up. @example roundMoney(177_517, "USD") === "$1,775" */
export function roundMoney(cents: number, currency: string): string {
  return formatMoney(cents, currency, { whole: cents === 0 || cents >= WHOLE_FROM_CENTS });
}

/**
 * The lines of a sum as `roundMoney` writes the sum: where that is in whole units the lines are too, and still add up.
 * @example linesWords([14_070, 2_560, 53_700], "USD") is $141, $25, $537, which make $703
 */
export function linesWords(cents: readonly number[], currency: string): string[] {
  const total = cents.reduce((sum, each) => sum + each, 0);
  if (total < WHOLE_FROM_CENTS) return cents.map((each) => formatMoney(each, currency));
  return splitCents(cents.map((each) => each / 100)).map((units) =>
    formatMoney(units * 100, currency, { whole: true }),
  );
}

/** "5 h 15 min"; from a hundred hours up in whole hours. */
export function minutesWords(minutes: number): string {
  const whole = Math.round(minutes);
  if (whole < 60) return `${whole} min`;
  const hours = Math.floor(whole / 60);
  if (hours >= 100) return `${Math.round(whole / 60).toLocaleString("en-US")} h`;
  return whole % 60 === 0 ? `${hours} h` : `${hours} h ${whole % 60} min`;
}

/** Three figures that count: "1.15 g", "0.0123 g", "12.4 kg". */
export function massWords(massG: number): string {
  if (massG >= 10_000) return `${figureWords(massG / 1000)} kg`;
  return `${figureWords(massG)} g`;
}

/** Three figures that count, with a thousands mark. @example figureWords(0.012345) === "0.0123" */
export function figureWords(figure: number): string {
  return figure.toLocaleString("en-US", { maximumSignificantDigits: 3 });
}

/** "Gold": the metal's name at the start of a line. */
export function metalTitle(metal: DepositMetal): string {
  const { name } = metalOf(metal);
  return name.charAt(0).toUpperCase() + name.slice(1);
}

const STAGE_STARTS: Record<StageFound, (topMetal: string) => string> = {
  "at-strike": () => "At the strike",
  "after-final-plate": (topMetal) => `After ${topMetal}`,
  returned: () => "Sent back",
};

function topMetalOf({ stack }: StripBatch): string {
  const top = stack.at(-1);
  return top ? metalOf(top.metal).name : "the plate";
}

/** The page's first sentence: the answer. "After gold, these 12 parts cost about $1,775 to do again. At the strike they cost $99." */
export function answerWords({ batch, chosen, beside }: StripReckoning, currency: string): string {
  const isOne = batch.quantity === 1;
  const parts = isOne ? "this part costs" : `these ${counted(batch.quantity, "part").replace(/^\d+/, thousands)} cost`;
  const first = `${STAGE_STARTS[batch.stageFound](topMetalOf(batch))}, ${parts} about ${roundMoney(chosen.meanCents, currency)} to do again.`;
  const it = isOne ? "it" : "they";
  const other = roundMoney(beside.estimate.meanCents, currency);
  if (beside.kind === "goes-on") return `${first} After ${topMetalOf(batch)} ${it} would cost ${other}.`;
  return `${first} At the strike ${it} ${isOne ? "costs" : "cost"} ${other}.`;
}

/** What the work is, without a figure: "Taking gold, nickel and copper off 12 parts." */
export function takingOffWords({ batch, chosen }: StripReckoning): string {
  const names = [...new Set(chosen.steps.map((step) => metalOf(step.layer.metal).name))];
  const list = names.length > 1 ? `${names.slice(0, -1).join(", ")} and ${names.at(-1)}` : names.join("");
  return `Taking ${list} off ${batch.quantity === 1 ? "1 part" : `${batch.quantity.toLocaleString("en-US")} parts`}.`;
}

const thousands = (digits: string) => Number(digits).toLocaleString("en-US");

const FRACTIONS = [
  "", "", "Half", "A third", "A quarter", "A fifth", "A sixth", "A seventh", "An eighth", "A ninth", "A tenth",
  "One eleventh", "One twelfth", "One thirteenth", "One fourteenth", "One fifteenth", "One sixteenth",
  "One seventeenth", "One eighteenth", "One nineteenth", "One twentieth",
] as const; // prettier-ignore

/**
 * What the smaller of two costs is of the greater, as a sentence.
 * @example priceShareWords(99, 1775) === "One eighteenth of the price."
 */
export function priceShareWords(smallerCents: number, greaterCents: number): string {
  if (smallerCents >= greaterCents) return "No cheaper.";
  const times = greaterCents / Math.max(1, smallerCents);
  if (times < 1.25) return "Almost the same price.";
  if (times < 1.75) return "Two thirds of the price.";
  const whole = Math.round(times);
  if (whole === 2) return "Half the price.";
  if (whole > 1000) return "Less than a thousandth of the price.";
  return `${FRACTIONS[whole] ?? `One ${ordinal(whole)}`} of the price.`;
}

function ordinal(whole: number): string {
  const end = new Intl.PluralRules("en-US", { type: "ordinal" }).select(whole);
  return `${whole}${{ one: "st", two: "nd", few: "rd", zero: "th", many: "th", other: "th" }[end]}`;
}

/** The sentence beside the way that is not the batch's own: what the other stage comes to, and why. */
export function besideWords({ batch, chosen, beside }: StripReckoning): string {
  const topMetal = topMetalOf(batch);
  if (beside.kind === "goes-on") {
    const times = beside.estimate.meanCents / Math.max(1, chosen.meanCents);
    if (times < 1.25) return "Letting it go on costs no more, as far as these figures go.";
    return `${figureWords(times)} times the price, once the ${topMetal} is on.`;
  }
  const share = priceShareWords(beside.estimate.meanCents, chosen.meanCents);
  if (batch.stack.length === 1) return `${share} It is still on its rack, and no edge is lost.`;
  return `${share} No ${topMetal} was on yet, and no edge to lose.`;
}

/** "It attacks brass. Cyanide …" as the two parts of a refusal: the headline and the reason. */
export function refusalWords(why: string): { headline: string; reason: string } {
  const end = why.indexOf(". ");
  const first = end < 0 ? why : why.slice(0, end + 1);
  return {
    headline: `Not offered: ${first.charAt(0).toLowerCase()}${first.slice(1)}`,
    reason: end < 0 ? "" : why.slice(end + 2),
  };
}
