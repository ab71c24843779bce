import type { Db } from "@/db/open";
import { getNeighbours, type CaseFacts } from "@/db/queries/case-page";
import {
  listCaseCalls,
  listCaseCards,
  listCaseEvents,
  listCaseShots,
  listCaseSolutions,
  listLibraryTitles,
} from "@/db/queries/case-records";
import { listStations } from "@/db/queries/line";
import { cardProgress } from "@/lib/cases/card-progress";
import { caseTimeline } from "@/lib/cases/case-timeline";
import { momentWords } from "@/lib/cases/moment-words";
import { tagStanding } from "@/lib/cases/tag-standing";
import { solutionAge } from "@/lib/line/solution-age";

/** Everything that the page of one case shows, but for its money. */
export function loadCase(db: Db, shopId: number, facts: CaseFacts, clock: { now: number; timeZone: string }) {
  const calls = listCaseCalls(db, shopId, facts.id);
  const cards = listCaseCards(db, shopId, facts.id);
  const titles = listLibraryTitles(db, shopId);
  const solutions = listCaseSolutions(db, shopId, facts.id);
  const rounds = caseTimeline({
    ...titles,
    events: listCaseEvents(db, shopId, facts.id),
    calls,
    cards,
    quantity: facts.quantity,
  });
  const progress = progressOf(cards, facts.round);
  return {
    calls,
    cards,
    solutions,
    classes: titles.classes,
    shots: listCaseShots(db, shopId, facts.id),
    stations: listStations(db, shopId),
    neighbours: getNeighbours(db, shopId, facts),
    standing: tagStanding({ ...facts, card: progress }, clock.now),
    progress: progress?.share ?? 0,
    tracedNote: tracedAge(facts, solutions),
    history: rounds.map(({ round, entries }) => ({
      round,
      entries: entries.map(({ at, ...entry }) => ({
        ...entry,
        time: momentWords(at, clock.timeZone, clock.now),
        iso: new Date(at).toISOString(),
      })),
    })),
  };
}

export type LoadedCase = ReturnType<typeof loadCase>;

function progressOf(cards: ReturnType<typeof listCaseCards>, round: number) {
  const card = cards.find((each) => each.round === round);
  return card && cardProgress(card.steps.map((step) => ({ id: step.position, ...step })));
}

/** How old the solution was, at the place where the fault began, when the part was found. */
function tracedAge(facts: CaseFacts, solutions: ReturnType<typeof listCaseSolutions>): string | undefined {
  const there = solutions.filter((solution) => solution.stationId === facts.traced?.id);
  const oldest = there
    .map((solution) => solutionAge(solution.madeUpAt, solution.windowDays, facts.openedAt))
    .toSorted((a, b) => b.share - a.share)[0];
  return oldest?.words;
}
