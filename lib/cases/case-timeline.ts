import type { CaseEvent } from "./case-state";
import type { Sureness } from "./case-words";
import { historyWords, opinionWords, type HistoryWords } from "./history-words";

interface TimelineFacts {
  events: readonly {
    id: number;
    round: number;
    event: CaseEvent;
    by: string;
    why: string;
    detail: Record<string, unknown>;
    at: number;
  }[];
  calls: readonly {
    id: number;
    round: number;
    kind: "first" | "further" | "second-look";
    by: string;
    asTrainee: boolean;
    classTitle: string | null;
    sure: Sureness;
    at: number;
  }[];
  cards: readonly { round: number; steps: readonly { tickedAt: number | null; spentMinutes: number | null }[] }[];
  classes: readonly { slug: string; title: string }[];
  causes: readonly { id: number; title: string }[];
  quantity: number;
}

export interface TimelineEntry extends HistoryWords {
  key: string;
  at: number;
}

export interface TimelineRound {
  round: number;
  entries: TimelineEntry[];
}

/**
 * The whole history of a case in words, by round, oldest first: every change of state, every correction and every
 * further call. The first call is told with the row that opened the case, the senior's with the confirmation.
 */
export function caseTimeline(facts: TimelineFacts): TimelineRound[] {
  const entries = [...facts.events.map((row) => eventEntry(row, facts)), ...furtherCalls(facts)].toSorted(
    (a, b) => a.round - b.round || a.at - b.at,
  );
  const rounds = [...new Set(entries.map((entry) => entry.round))];
  return rounds.map((round) => ({
    round,
    entries: entries.filter((entry) => entry.round === round).map(({ round: _round, ...entry }) => entry),
  }));
}

function eventEntry(row: TimelineFacts["events"][number], facts: TimelineFacts) {
  const first = row.event === "opened" ? facts.calls.find((call) => call.kind === "first") : undefined;
  const words = historyWords(row, {
    classTitle: (slug) => facts.classes.find((each) => each.slug === slug)?.title ?? slug,
    causeTitle: (id) => facts.causes.find((each) => each.id === id)?.title ?? null,
    firstCall: first,
    card: cardOf(row.round, facts),
  });
  return { ...words, key: `event-${row.id}`, at: row.at, round: row.round };
}

function cardOf(round: number, { cards, quantity }: TimelineFacts) {
  const steps = cards.find((card) => card.round === round)?.steps;
  if (!steps) return undefined;
  const ticked = steps.filter((step) => step.tickedAt !== null);
  const minutes = ticked.reduce((sum, step) => sum + (step.spentMinutes ?? 0), 0);
  return { ticked: ticked.length, all: steps.length, minutes, quantity };
}

function furtherCalls(facts: TimelineFacts) {
  return facts.calls
    .filter((call) => call.kind === "further")
    .map((call) => ({
      key: `call-${call.id}`,
      title: "Called",
      who: `by ${call.by}${call.asTrainee ? ", trainee" : ""}`,
      lines: [`A further call: ${opinionWords(call)}`],
      tone: "plain" as const,
      at: call.at,
      round: call.round,
    }));
}
