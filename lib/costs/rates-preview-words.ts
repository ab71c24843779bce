import { countWords } from "@/lib/cases/part-words";
import type { PreviewStage, RatesPreview } from "@/lib/costs/rates-preview";
import { formatMoney } from "@/lib/money";

/**
 * The day from which rates would hold, in a sentence: the year shows only when it is not today's.
 * @param day "2026-08-01"; null comes back for what is no day
 * @example startDayWords("2026-08-01", "2026-07-14") === "on 1 August"
 */
export function startDayWords(day: string, today: string): string | null {
  const at = /^\d{4}-\d{2}-\d{2}$/.test(day) ? Date.parse(`${day}T12:00:00Z`) : Number.NaN;
  if (Number.isNaN(at)) return null;
  if (day === today) return "today";
  const year = day.slice(0, 4) === today.slice(0, 4) ? undefined : "numeric";
  return `on ${new Intl.DateTimeFormat("en-GB", { timeZone: "UTC", day: "numeric", month: "long", year }).format(at)}`;
}

/** The same, short, for a column: "1 Aug". @param day "2026-08-01" */
export function shortDayWords(day: string, today: string): string {
  if (day === today) return "today";
  const at = Date.parse(`${day}T12:00:00Z`);
  if (Number.isNaN(at)) return "then";
  return new Intl.DateTimeFormat("en-GB", { timeZone: "UTC", day: "numeric", month: "short" }).format(at);
}

/** The labels of what changes, in a few words. @example namedChanges(["Labour", "Gold"]) === "Labour, gold" */
export function namedChanges(labels: readonly string[]): string {
  const named = labels.slice(0, 3).map((label, index) => (index === 0 ? label : lowerFirst(label)));
  const left = labels.length - named.length;
  return `${named.join(", ")}${left > 0 ? ` and ${left} more` : ""}`;
}

const lowerFirst = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);

interface LeadFacts {
  /** How many rates differ from what holds. */
  changed: number;
  /** "on 1 August"; null: no day is given. */
  day: string | null;
  /** Labels of the rates that are no numbers yet. */
  waitsFor: readonly string[];
  later: PreviewStage | null;
}

/** The opening sentence while rates are typed. @example "Three rates change on 1 August. The same rework would cost 2% more." */
export function ratesLead({ changed, day, waitsFor, later }: LeadFacts): string {
  const count = countWords(changed);
  const rates = `${count.charAt(0).toUpperCase()}${count.slice(1)} ${changed === 1 ? "rate changes" : "rates change"}`;
  const opening = changed === 0 ? "" : `${rates} ${day ?? "on a day yet to be chosen"}. `;
  if (waitsFor.length > 0) return `${opening}${waitWords(waitsFor)}`;
  return later ? `${opening}The same rework would cost ${shareMore(later)}.` : opening.trim();
}

/** @example waitWords(["Labour", "Gold"]) === "Labour and gold are no numbers yet." */
export function waitWords(labels: readonly string[]): string {
  const small = labels.map((label, index) => (index === 0 ? label : lowerFirst(label)));
  const last = small.at(-1) ?? "";
  if (small.length === 1) return `${last} is no number yet.`;
  return `${small.slice(0, -1).join(", ")} and ${last} are no numbers yet.`;
}

function shareMore({ now, then }: PreviewStage): string {
  const share = now.meanCents === 0 ? 0 : then.meanCents / now.meanCents - 1;
  if (then.meanCents === now.meanCents) return "the same";
  const percent = Math.round(Math.abs(share) * 100);
  const size = percent === 0 ? "under 1%" : `${percent.toLocaleString("en-US")}%`;
  return `${size} ${share < 0 ? "less" : "more"}`;
}

/** What it comes to, for the example. @example "$35.70 more to strip these 12. $5.38 more at the strike." */
export function previewHeadline({ later, atStrike }: RatesPreview, quantity: number, currency: string): string {
  const parts = quantity === 1 ? "this one" : `these ${quantity.toLocaleString("en-US")}`;
  const laterMore = moreCents(later);
  const strikeMore = moreCents(atStrike);
  if (laterMore === 0 && strikeMore === 0) return `It changes nothing for ${parts}.`;
  return `${moreWords(laterMore, currency)} to strip ${parts}. ${moreWords(strikeMore, currency)} at the strike.`;
}

function moreCents({ now, then }: PreviewStage): number {
  return then.meanCents - now.meanCents;
}

function moreWords(cents: number, currency: string): string {
  if (cents === 0) return "The same";
  return `${formatMoney(Math.abs(cents), currency)} ${cents < 0 ? "less" : "more"}`;
}
