import type { ComparedColumn } from "@/components/cases/compare-column";
import { stackWords } from "@/components/cases/case-facts";
import { stagePhotos } from "@/components/cases/case-shots";
import type { Db } from "@/db/open";
import { getCaseFacts, type CaseFacts } from "@/db/queries/case-page";
import { listCaseCards, listCaseShots, type CaseShot } from "@/db/queries/case-records";
import { listTellingClasses } from "@/db/queries/library-tells";
import { METHOD_TITLES, STAGE_TITLES, SYMPTOMS } from "@/lib/cases/case-words";
import { compareFacts, type FactCell } from "@/lib/cases/compare-facts";
import { cardProgress } from "@/lib/cases/card-progress";
import { callWords, counted, metalWords, partsOf } from "@/lib/cases/part-words";
import { tagStanding } from "@/lib/cases/tag-standing";
import { tellsBetween } from "@/lib/library/tells-between";

/**
 * Cases set side by side, in the order of their references.
 * @returns `missing` holds references that this shop has no case of
 */
export function loadCompare(db: Db, shopId: number, refs: readonly string[], now: number) {
  const read = refs.map((ref) => ({ ref, facts: getCaseFacts(db, shopId, ref) }));
  const found = read.flatMap(({ facts }) => facts ?? []);
  const compared = found.map((facts) => compareOne(db, shopId, facts, now));
  const slugs = [...new Set(compared.flatMap(({ column }) => column.classSlug ?? []))];
  return {
    columns: compared.map(({ column }) => column),
    rows: compareFacts(compared.map(({ cells }) => cells)),
    tells: tellsBetween(listTellingClasses(db, shopId, slugs)),
    titles: [...new Set(compared.map(({ column }) => column.classWords))],
    missing: read.filter(({ facts }) => facts === null).map(({ ref }) => ref),
  };
}

export type LoadedCompare = ReturnType<typeof loadCompare>;

function compareOne(
  db: Db,
  shopId: number,
  facts: CaseFacts,
  now: number,
): { column: ComparedColumn; cells: FactCell[] } {
  const shots = listCaseShots(db, shopId, facts.id);
  const cards = listCaseCards(db, shopId, facts.id);
  const card = cards.find((each) => each.round === facts.round);
  const progress = card && cardProgress(card.steps.map((step) => ({ id: step.position, ...step })));
  const standing = tagStanding({ ...facts, card: progress }, now);
  const isCall = facts.state === "held" && facts.calledClass !== null;
  const classWords = isCall
    ? callWords(facts.calledTitle, false)
    : callWords(facts.confirmedTitle, facts.confirmedClass !== null);
  return {
    column: {
      ref: facts.ref,
      classSlug: isCall ? facts.calledClass : facts.confirmedClass,
      classWords,
      state: standing.state,
      stateWords: standing.words,
      photos: stagePhotos(facts.ref, shots),
      startAt: clearest(shots),
    },
    cells: factCells(facts, classWords, minutesOf(cards)),
  };
}

/** The exemplar of its class, where a senior chose one; else the first photo that can be looked at. */
function clearest(shots: readonly CaseShot[]): number {
  const exemplar = shots.findIndex((shot) => shot.exemplarOf !== null && shot.state === "ready");
  if (exemplar >= 0) return exemplar;
  return Math.max(
    0,
    shots.findIndex((shot) => shot.state === "ready"),
  );
}

function minutesOf(cards: ReturnType<typeof listCaseCards>): string {
  const spent = cards.flatMap((card) => card.steps.flatMap((step) => step.spentMinutes ?? []));
  return spent.length === 0 ? "" : `${spent.reduce((sum, minutes) => sum + minutes, 0)} min`;
}

function factCells(facts: CaseFacts, classWords: string, minutes: string): FactCell[] {
  return [
    { label: "Class", value: classWords },
    { label: "Cause", value: facts.causeTitle ?? "" },
    { label: "Symptoms", value: facts.symptoms.map((each) => SYMPTOMS[each].words).join("; ") },
    { label: "Base metal", value: metalWords(facts.baseMetal, facts.alloy) },
    { label: "Origin", value: facts.traced?.name ?? "" },
    { label: "Method", value: METHOD_TITLES[facts.method] },
    { label: "Found", value: STAGE_TITLES[facts.stageFound] },
    { label: "Parts", value: `${partsOf(facts.quantity, facts.run?.partsStruck ?? null)} ${facts.job.partName}` },
    { label: "Plate", value: stackWords(facts.job.finalStack) },
    { label: "Rounds", value: counted(facts.round, "round") },
    { label: "Rework", value: minutes },
    { label: "Note", value: facts.note },
  ];
}
