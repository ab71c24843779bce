import { and, asc, count, desc, eq, gt, inArray, isNull, ne, or, sql } from "drizzle-orm";
import { alias } from "drizzle-orm/sqlite-core";
import type { Handle } from "../open";
import {
  cases,
  customers,
  libraryCauses,
  libraryClasses,
  members,
  reworkCards,
  reworkSteps,
  workOrders,
} from "../schema";

/** A card as it hangs on the list. */
export interface ReworkTag {
  caseId: number;
  ref: string;
  state: "confirmed" | "in-rework";
  round: number;
  classSlug: string | null;
  classTitle: string | null;
  cardTitle: string;
  quantity: number;
  partName: string;
  baseMetal: (typeof cases.$inferSelect)["baseMetal"];
  steps: number;
  ticked: number;
  /** Who ticked the first step; null while nobody has begun. */
  begunById: number | null;
  madeAt: number;
}

interface Where {
  /** Narrowed to the cases that trace back to this station. */
  stationId?: number;
  /** Whose begun cards are asked for, or are to be left out. */
  begunBy?: number;
  notBegunBy?: number;
  /** The last tag of the page before. */
  after?: { madeAt: number; caseId: number };
  limit: number;
}

const openIn = (shopId: number) => and(eq(cases.shopId, shopId), inArray(cases.state, ["confirmed", "in-rework"]));

/** The cards of this round whose case is confirmed or in rework, oldest first. */
export function listReworkTags(db: Handle, shopId: number, where: Where): ReworkTag[] {
  const first = firstTicks(db, shopId);
  const narrowed = [
    openIn(shopId),
    where.stationId === undefined ? undefined : eq(cases.tracedStationId, where.stationId),
    where.begunBy === undefined ? undefined : eq(first.memberId, where.begunBy),
    where.notBegunBy === undefined ? undefined : or(isNull(first.memberId), ne(first.memberId, where.notBegunBy)),
    where.after
      ? or(
          gt(reworkCards.madeAt, where.after.madeAt),
          and(eq(reworkCards.madeAt, where.after.madeAt), gt(cases.id, where.after.caseId)),
        )
      : undefined,
  ];
  return db
    .select({
      caseId: cases.id,
      ref: cases.ref,
      state: sql<ReworkTag["state"]>`${cases.state}`,
      round: cases.round,
      classSlug: cases.confirmedClass,
      classTitle: libraryClasses.title,
      cardTitle: reworkCards.title,
      quantity: cases.quantity,
      partName: workOrders.partName,
      baseMetal: cases.baseMetal,
      steps: sql<number>`(select count(*) from ${reworkSteps} s where s.shop_id = ${shopId} and s.card_id = ${reworkCards.id})`,
      ticked: sql<number>`(select count(s.ticked_at) from ${reworkSteps} s where s.shop_id = ${shopId} and s.card_id = ${reworkCards.id})`,
      begunById: first.memberId,
      madeAt: reworkCards.madeAt,
    })
    .from(cases)
    .innerJoin(
      reworkCards,
      and(eq(reworkCards.shopId, cases.shopId), eq(reworkCards.caseId, cases.id), eq(reworkCards.round, cases.round)),
    )
    .innerJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)))
    .leftJoin(
      libraryClasses,
      and(eq(libraryClasses.shopId, cases.shopId), eq(libraryClasses.slug, cases.confirmedClass)),
    )
    .leftJoin(first, eq(first.cardId, reworkCards.id))
    .where(and(...narrowed))
    .orderBy(asc(reworkCards.madeAt), asc(cases.id))
    .limit(where.limit)
    .all();
}

/** Who began each card: whoever ticked its first step. */
function firstTicks(db: Handle, shopId: number) {
  return db
    .select({ cardId: reworkSteps.cardId, memberId: sql<number | null>`${reworkSteps.tickedById}`.as("begun_by_id") })
    .from(reworkSteps)
    .where(and(eq(reworkSteps.shopId, shopId), eq(reworkSteps.position, 0)))
    .as("first_ticks");
}

/** How many cards wait or run, in the shop or traced to one station. */
export function countReworkTags(db: Handle, shopId: number, stationId?: number): number {
  const row = db
    .select({ cards: count() })
    .from(cases)
    .where(and(openIn(shopId), stationId === undefined ? undefined : eq(cases.tracedStationId, stationId)))
    .get();
  return row?.cards ?? 0;
}

const makers = alias(members, "makers");
const outcomeMembers = alias(members, "outcome_members");

export type ReworkCard = NonNullable<ReturnType<typeof getReworkCard>>;

/**
 * The newest card of a case with its steps, and what its page says of the case. A card whose round is below the
 * case's is finished and has sent the part back.
 * @returns null when the case is not of this shop or no card was ever sent
 */
export function getReworkCard(db: Handle, shopId: number, ref: string) {
  const head = db
    .select({
      caseId: cases.id,
      ref: cases.ref,
      state: cases.state,
      closing: cases.closing,
      caseRound: cases.round,
      quantity: cases.quantity,
      baseMetal: cases.baseMetal,
      alloy: cases.alloy,
      openedAt: cases.openedAt,
      classSlug: cases.confirmedClass,
      classTitle: libraryClasses.title,
      causeTitle: libraryCauses.title,
      jobNumber: workOrders.number,
      partName: workOrders.partName,
      customer: customers.name,
      cardId: reworkCards.id,
      cardTitle: reworkCards.title,
      round: reworkCards.round,
      madeAt: reworkCards.madeAt,
      madeBy: makers.name,
      doneAt: reworkCards.doneAt,
      outcome: reworkCards.outcome,
      outcomeNote: reworkCards.outcomeNote,
      outcomeBy: outcomeMembers.name,
    })
    .from(cases)
    .innerJoin(reworkCards, and(eq(reworkCards.shopId, cases.shopId), eq(reworkCards.caseId, cases.id)))
    .innerJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)))
    .innerJoin(customers, and(eq(customers.shopId, cases.shopId), eq(customers.id, workOrders.customerId)))
    .innerJoin(makers, and(eq(makers.shopId, cases.shopId), eq(makers.id, reworkCards.madeById)))
    .leftJoin(
      outcomeMembers,
      and(eq(outcomeMembers.shopId, cases.shopId), eq(outcomeMembers.id, reworkCards.outcomeById)),
    )
    .leftJoin(
      libraryClasses,
      and(eq(libraryClasses.shopId, cases.shopId), eq(libraryClasses.slug, cases.confirmedClass)),
    )
    .leftJoin(libraryCauses, and(eq(libraryCauses.shopId, cases.shopId), eq(libraryCauses.id, cases.confirmedCauseId)))
    .where(and(eq(cases.shopId, shopId), eq(cases.ref, ref)))
    .orderBy(desc(reworkCards.round))
    .limit(1)
    .get();
  return head ? { ...head, steps: listSteps(db, shopId, head.cardId) } : null;
}

export type ReworkStep = ReturnType<typeof listSteps>[number];

function listSteps(db: Handle, shopId: number, cardId: number) {
  return db
    .select({
      id: reworkSteps.id,
      title: reworkSteps.title,
      detail: reworkSteps.detail,
      plannedMinutes: reworkSteps.plannedMinutes,
      cautions: reworkSteps.cautions,
      tickedAt: reworkSteps.tickedAt,
      tickedBy: members.name,
      spentMinutes: reworkSteps.spentMinutes,
    })
    .from(reworkSteps)
    .leftJoin(members, and(eq(members.shopId, reworkSteps.shopId), eq(members.id, reworkSteps.tickedById)))
    .where(and(eq(reworkSteps.shopId, shopId), eq(reworkSteps.cardId, cardId)))
    .orderBy(asc(reworkSteps.position))
    .all();
}
