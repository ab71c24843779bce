import { and, asc, desc, eq, gt, inArray, lt, or } from "drizzle-orm";
import { alias } from "drizzle-orm/sqlite-core";
import { fault } from "@/lib/fault";
import type { Handle } from "../open";
import {
  calls,
  caseEvents,
  cases,
  caseSolutions,
  customers,
  exemplars,
  libraryCauses,
  libraryClasses,
  members,
  photos,
  reworkCards,
  reworkSteps,
  runs,
  solutions,
  stations,
  workOrders,
} from "../schema";

const found = alias(stations, "found_station");
const traced = alias(stations, "traced_station");
const opener = alias(members, "opener");
const confirmer = alias(members, "confirmer");
const calledAs = alias(libraryClasses, "called_as");
const confirmedAs = alias(libraryClasses, "confirmed_as");

/** Everything about a case that every member of the shop may see. Money is not in it. */
export type CaseFacts = NonNullable<ReturnType<typeof getCaseFacts>>;

const factColumns = {
  id: cases.id,
  ref: cases.ref,
  state: cases.state,
  closing: cases.closing,
  round: cases.round,
  baseMetal: cases.baseMetal,
  alloy: cases.alloy,
  method: cases.method,
  stageFound: cases.stageFound,
  quantity: cases.quantity,
  symptoms: cases.symptoms,
  note: cases.note,
  openedById: cases.openedById,
  openedBy: opener.name,
  openedAt: cases.openedAt,
  heldAt: cases.heldAt,
  calledClass: cases.calledClass,
  calledTitle: calledAs.title,
  calledSure: cases.calledSure,
  confirmedClass: cases.confirmedClass,
  confirmedTitle: confirmedAs.title,
  confirmedCauseId: cases.confirmedCauseId,
  causeTitle: libraryCauses.title,
  confirmedBy: confirmer.name,
  confirmedAt: cases.confirmedAt,
  selfConfirmed: cases.selfConfirmed,
  disposition: cases.disposition,
  closedAt: cases.closedAt,
  job: {
    id: workOrders.id,
    number: workOrders.number,
    partName: workOrders.partName,
    quantity: workOrders.quantity,
    finalStack: workOrders.finalStack,
    customer: customers.name,
  },
  run: { code: runs.code, partsStruck: runs.partsStruck, struckAt: runs.struckAt },
  found: { id: found.id, slug: found.slug, name: found.name, kind: found.kind },
  traced: { id: traced.id, slug: traced.slug, name: traced.name, kind: traced.kind },
};

/**
 * The case with this reference, with the names that its numbers stand for.
 * @returns null for another shop's reference, as for one that never was
 */
export function getCaseFacts(db: Handle, shopId: number, ref: string) {
  return (
    db
      .select(factColumns)
      .from(cases)
      .innerJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)))
      .innerJoin(customers, and(eq(customers.shopId, workOrders.shopId), eq(customers.id, workOrders.customerId)))
      .innerJoin(found, and(eq(found.shopId, cases.shopId), eq(found.id, cases.foundStationId)))
      .innerJoin(opener, and(eq(opener.shopId, cases.shopId), eq(opener.id, cases.openedById)))
      .leftJoin(traced, and(eq(traced.shopId, cases.shopId), eq(traced.id, cases.tracedStationId)))
      .leftJoin(runs, and(eq(runs.shopId, cases.shopId), eq(runs.id, cases.runId)))
      .leftJoin(confirmer, and(eq(confirmer.shopId, cases.shopId), eq(confirmer.id, cases.confirmedById)))
      .leftJoin(calledAs, and(eq(calledAs.shopId, cases.shopId), eq(calledAs.slug, cases.calledClass)))
      .leftJoin(confirmedAs, and(eq(confirmedAs.shopId, cases.shopId), eq(confirmedAs.slug, cases.confirmedClass)))
      .leftJoin(
        libraryCauses,
        and(eq(libraryCauses.shopId, cases.shopId), eq(libraryCauses.id, cases.confirmedCauseId)),
      )
      .where(and(eq(cases.shopId, shopId), eq(cases.ref, ref)))
      .get() ?? null
  );
}

/** @throws FaultError "not-found" where `getCaseFacts` gives null */
export function requireCaseFacts(db: Handle, shopId: number, ref: string): CaseFacts {
  const facts = getCaseFacts(db, shopId, ref);
  if (!facts) throw fault("not-found", `There is no case ${ref} in this shop. Check the reference on the tag.`);
  return facts;
}

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

/** The case opened just before and just after this one, for turning pages. */
export function getNeighbours(db: Handle, shopId: number, of: { id: number; openedAt: number }) {
  const one = { ref: cases.ref };
  const earlier = db
    .select(one)
    .from(cases)
    .where(
      and(
        eq(cases.shopId, shopId),
        or(lt(cases.openedAt, of.openedAt), and(eq(cases.openedAt, of.openedAt), lt(cases.id, of.id))),
      ),
    )
    .orderBy(desc(cases.openedAt), desc(cases.id))
    .limit(1)
    .get();
  const later = db
    .select(one)
    .from(cases)
    .where(
      and(
        eq(cases.shopId, shopId),
        or(gt(cases.openedAt, of.openedAt), and(eq(cases.openedAt, of.openedAt), gt(cases.id, of.id))),
      ),
    )
    .orderBy(asc(cases.openedAt), asc(cases.id))
    .limit(1)
    .get();
  return { earlier: earlier?.ref ?? null, later: later?.ref ?? null };
}
