import { STRIP_METHOD_TITLES } from "@/lib/costs/strip-methods";
import type { CaseEvent } from "./case-state";
import {
  BASE_METAL_TITLES,
  DISPOSITION_TITLES,
  OUTCOME_TITLES,
  STAGE_TITLES,
  SURENESS_TITLES,
  type Sureness,
} from "./case-words";

/** One row of a case's history as it is stored, with the names that its numbers stand for. */
export interface HistoryRow {
  event: CaseEvent;
  by: string;
  why: string;
  detail: Record<string, unknown>;
}

export interface HistoryContext {
  classTitle: (slug: string) => string;
  causeTitle: (id: number) => string | null;
  /** The call that came with the snap; only the row that opened the case says it. */
  firstCall?: { classTitle: string | null; sure: Sureness };
  /** The card of the row's round, as far as it is done. */
  card?: { ticked: number; all: number; minutes: number; quantity: number };
}

export interface HistoryWords {
  /** What happened, in a word or two. */
  title: string;
  /** Who, after the title: "by Ines Varga", ", Marisol Okafor", "at the re-strike". */
  who: string;
  /** Lines under it: what was decided, and why. */
  lines: string[];
  tone: "plain" | "good" | "bad";
}

/**
 * A row of the history in the shop's words. Nothing is left out: the reason that the person gave is always the last line.
 * @example historyWords({ event: "taken-back", by: "Ines Varga", why: "Wrong part", detail: {} }, context).title === "Taken back"
 */
export function historyWords(row: HistoryRow, context: HistoryContext): HistoryWords {
  const { title, who = `by ${row.by}`, lines = [], tone = "plain" } = WORDS[row.event](row, context);
  return { title, who, lines: [...lines, row.why].filter((line) => line !== ""), tone };
}

type Said = { title: string; who?: string; lines?: string[]; tone?: HistoryWords["tone"] };

const WORDS: Record<CaseEvent, (row: HistoryRow, context: HistoryContext) => Said> = {
  opened: (_row, { firstCall }) => ({
    title: "Held",
    lines: firstCall ? [`First call: ${opinionWords(firstCall)}`] : [],
  }),
  amended: (row) => ({ title: "Corrected", lines: amendmentWords(row.detail) }),
  confirmed: (row, context) => ({ title: "Confirmed", lines: [confirmationWords(row.detail, context)] }),
  released: () => ({ title: "Released as sound", tone: "good" }),
  "rework-started": (row, { card }) => ({
    title: "In rework",
    who: `, ${row.by}`,
    lines: card && card.ticked > 0 ? [cardWords(card)] : [],
  }),
  "re-strike-failed": (row) => ({
    title: outcomeTitle(row.detail.outcome),
    who: `at the re-strike, ${row.by}`,
    lines: ["Back to second look, same case"],
    tone: "bad",
  }),
  "re-strike-sound": (row) => ({
    title: "Sound",
    who: `at the re-strike, ${row.by}`,
    lines: ["Case closed"],
    tone: "good",
  }),
  disposed: (row) => ({ title: dispositionTitle(row.detail.disposition), lines: ["Case closed"] }),
  "taken-back": () => ({ title: "Taken back", lines: ["Back to second look, next round"] }),
  reopened: () => ({ title: "Opened again", lines: ["Back to second look, next round"] }),
};

/** A call in words: "water spots, a guess". */
export function opinionWords(call: { classTitle: string | null; sure: Sureness }): string {
  const sure = SURENESS_TITLES[call.sure].toLowerCase();
  return call.classTitle ? `${call.classTitle.toLowerCase()}, ${sure}` : "can't tell";
}

function confirmationWords(detail: Record<string, unknown>, context: HistoryContext): string {
  const slug = typeof detail.classSlug === "string" ? context.classTitle(detail.classSlug) : null;
  const cause = typeof detail.causeId === "number" ? context.causeTitle(detail.causeId) : null;
  return [slug, cause, dispositionTitle(detail.disposition)].filter((part) => part).join(". ") + ".";
}

function dispositionTitle(disposition: unknown): string {
  const key = Object.keys(DISPOSITION_TITLES).find((each) => each === disposition) as
    | keyof typeof DISPOSITION_TITLES // found among the keys on this line
    | undefined;
  return key ? DISPOSITION_TITLES[key] : "Disposed";
}

function outcomeTitle(outcome: unknown): string {
  const key = Object.keys(OUTCOME_TITLES).find((each) => each === outcome) as
    | keyof typeof OUTCOME_TITLES // found among the keys on this line
    | undefined;
  return key ? OUTCOME_TITLES[key] : "Not sound";
}

function cardWords({ ticked, all, minutes, quantity }: NonNullable<HistoryContext["card"]>): string {
  return `${ticked} of ${all} steps, ${minutes} min for ${quantity === 1 ? "1 part" : `${quantity} parts`}`;
}

const AMENDED: Record<string, (value: unknown) => string> = {
  quantity: String,
  baseMetal: (value) => titleIn(BASE_METAL_TITLES, value).toLowerCase(),
  stageFound: (value) => titleIn(STAGE_TITLES, value).toLowerCase(),
  stripMethod: (value) =>
    value === null ? "the cheapest that is safe" : titleIn(STRIP_METHOD_TITLES, value).toLowerCase(),
  note: (value) => (value === "" ? "no note" : `“${String(value)}”`),
};

const AMENDED_NAMES: Record<string, string> = {
  quantity: "Parts",
  baseMetal: "Base metal",
  stageFound: "Found",
  stripMethod: "Taking it off",
  note: "Note",
};

function titleIn(titles: Record<string, string>, value: unknown): string {
  return typeof value === "string" ? (titles[value] ?? value) : "not known";
}

/** "Parts: 5, was 3", one line for each fact that changed. */
function amendmentWords(detail: Record<string, unknown>): string[] {
  const before = asFacts(detail.before);
  const after = asFacts(detail.after);
  return Object.entries(AMENDED).flatMap(([name, words]) =>
    name in after && after[name] !== before[name]
      ? [`${AMENDED_NAMES[name]}: ${words(after[name])}, was ${words(before[name])}`]
      : [],
  );
}

function asFacts(value: unknown): Record<string, unknown> {
  return typeof value === "object" && value !== null ? (value as Record<string, unknown>) : {}; // any object has string keys
}
