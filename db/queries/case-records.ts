import { and, asc, desc, eq, inArray } from "drizzle-orm";
import type { Handle } from "../open";
import {
  calls,
  caseEvents,
  cases,
  caseSolutions,
  exemplars,
  libraryCauses,
  libraryClasses,
  members,
  photos,
  reworkCards,
  reworkSteps,
  solutions,
  stations,
} from "../schema";

/** The solutions that the part went through, in line order. */
export function listCaseSolutions(db: Handle, shopId: number, caseId: number) {
  return db
    .select({
      code: solutions.code,
      name: solutions.name,
      stationId: solutions.stationId,
      windowDays: solutions.windowDays,
      madeUpAt: solutions.madeUpAt,
    })
    .from(caseSolutions)
    .innerJoin(solutions, and(eq(solutions.shopId, caseSolutions.shopId), eq(solutions.id, caseSolutions.solutionId)))
    .innerJoin(stations, and(eq(stations.shopId, solutions.shopId), eq(stations.id, solutions.stationId)))
    .where(and(eq(caseSolutions.shopId, shopId), eq(caseSolutions.caseId, caseId)))
    .orderBy(asc(stations.position), asc(solutions.code))
    .all();
}

/** Every call on the case, oldest first. */
export function listCaseCalls(db: Handle, shopId: number, caseId: number) {
  return db
    .select({
      id: calls.id,
      round: calls.round,
      kind: calls.kind,
      memberId: calls.memberId,
      by: members.name,
      asTrainee: calls.asTrainee,
      classSlug: calls.classSlug,
      classTitle: libraryClasses.title,
      sure: calls.sure,
      at: calls.at,
    })
    .from(calls)
    .innerJoin(members, and(eq(members.shopId, calls.shopId), eq(members.id, calls.memberId)))
    .leftJoin(libraryClasses, and(eq(libraryClasses.shopId, calls.shopId), eq(libraryClasses.slug, calls.classSlug)))
    .where(and(eq(calls.shopId, shopId), eq(calls.caseId, caseId)))
    .orderBy(asc(calls.id))
    .all();
}

export type CaseCall = ReturnType<typeof listCaseCalls>[number];

/** The case's history, oldest first. */
export function listCaseEvents(db: Handle, shopId: number, caseId: number) {
  return db
    .select({
      id: caseEvents.id,
      round: caseEvents.round,
      event: caseEvents.event,
      by: members.name,
      why: caseEvents.why,
      detail: caseEvents.detail,
      at: caseEvents.at,
    })
    .from(caseEvents)
    .innerJoin(members, and(eq(members.shopId, caseEvents.shopId), eq(members.id, caseEvents.memberId)))
    .where(and(eq(caseEvents.shopId, shopId), eq(caseEvents.caseId, caseId)))
    .orderBy(asc(caseEvents.id))
    .all();
}

export type CaseHistoryRow = ReturnType<typeof listCaseEvents>[number];

/** The case's rework cards with their steps, one a round, oldest first. */
export function listCaseCards(db: Handle, shopId: number, caseId: number) {
  const cards = db
    .select({
      id: reworkCards.id,
      round: reworkCards.round,
      title: reworkCards.title,
      madeBy: members.name,
      madeAt: reworkCards.madeAt,
      outcome: reworkCards.outcome,
      outcomeNote: reworkCards.outcomeNote,
    })
    .from(reworkCards)
    .innerJoin(members, and(eq(members.shopId, reworkCards.shopId), eq(members.id, reworkCards.madeById)))
    .where(and(eq(reworkCards.shopId, shopId), eq(reworkCards.caseId, caseId)))
    .orderBy(asc(reworkCards.round))
    .all();
  if (cards.length === 0) return [];
  const steps = db
    .select({
      cardId: reworkSteps.cardId,
      position: reworkSteps.position,
      title: reworkSteps.title,
      detail: reworkSteps.detail,
      plannedMinutes: reworkSteps.plannedMinutes,
      spentMinutes: reworkSteps.spentMinutes,
      cautions: reworkSteps.cautions,
      tickedAt: reworkSteps.tickedAt,
      tickedBy: members.name,
    })
    .from(reworkSteps)
    .leftJoin(members, and(eq(members.shopId, reworkSteps.shopId), eq(members.id, reworkSteps.tickedById)))
    .where(
      and(
        eq(reworkSteps.shopId, shopId),
        inArray(
          reworkSteps.cardId,
          cards.map((card) => card.id),
        ),
      ),
    )
    .orderBy(asc(reworkSteps.cardId), asc(reworkSteps.position))
    .all();
  return cards.map((card) => ({ ...card, steps: steps.filter((step) => step.cardId === card.id) }));
}

export type CaseCard = ReturnType<typeof listCaseCards>[number];

/** The case's photos by round, with who took each and whether it is an exemplar of the confirmed class. */
export function listCaseShots(db: Handle, shopId: number, caseId: number) {
  return (
    db
      .select({
        id: photos.id,
        round: photos.round,
        purpose: photos.purpose,
        position: photos.position,
        state: photos.state,
        refusal: photos.refusal,
        placeholder: photos.placeholder,
        isRendered: photos.isRendered,
        takenAt: photos.takenAt,
        by: members.name,
        exemplarOf: exemplars.classSlug,
      })
      .from(photos)
      .innerJoin(cases, and(eq(cases.shopId, photos.shopId), eq(cases.id, photos.caseId)))
      .innerJoin(members, and(eq(members.shopId, photos.shopId), eq(members.id, photos.memberId)))
      .leftJoin(
        exemplars,
        and(
          eq(exemplars.shopId, photos.shopId),
          eq(exemplars.photoId, photos.id),
          eq(exemplars.classSlug, cases.confirmedClass),
        ),
      )
      .where(and(eq(photos.shopId, shopId), eq(photos.caseId, caseId)))
      // "suspect" after "re-strike" by letter, but taken before it: the snap comes first.
      .orderBy(asc(photos.round), desc(photos.purpose), asc(photos.position), asc(photos.id))
      .all()
  );
}

export type CaseShot = ReturnType<typeof listCaseShots>[number];

/** Titles of the shop's classes and causes, for the words of a history. */
export function listLibraryTitles(db: Handle, shopId: number) {
  const classes = db
    .select({ slug: libraryClasses.slug, title: libraryClasses.title })
    .from(libraryClasses)
    .where(eq(libraryClasses.shopId, shopId))
    .orderBy(asc(libraryClasses.position))
    .all();
  const causes = db
    .select({ id: libraryCauses.id, title: libraryCauses.title })
    .from(libraryCauses)
    .where(eq(libraryCauses.shopId, shopId))
    .all();
  return { classes, causes };
}
