import { and, asc, desc, eq, isNotNull, sql } from "drizzle-orm";
import type { CaseCostInput } from "@/lib/costs/case-cost";
import { moneyAtRisk } from "@/lib/costs/case-cost";
import { strikeThenPlate } from "@/lib/costs/case-stack";
import { NO_CORRECTIONS, type MinutesCorrections } from "@/lib/costs/estimate-record";
import { methodRefusal } from "@/lib/costs/method-refusal";
import type { Handle } from "../open";
import { caseCosts, cases, reworkCards, reworkSteps, standingClass, workOrders } from "../schema";
import { openPriceBook, type PriceBook } from "./price-book";
import type { DatedRates } from "./rates";

/** What the cost of a case rests on, as `caseCost` takes it, with the corrections by method. */
export type CostFacts = CaseCostInput & { rates: DatedRates; minutesCorrection: MinutesCorrections };

/**
 * What the cost of a case rests on: its facts, the rates and the ways to strip of its day, what the shop's own record
 * corrects its minutes by, and the minutes that its cards recorded.
 * @param book the shop's price book, where many cases are priced in one go
 */
export function getCostFacts(
  db: Handle,
  shopId: number,
  caseId: number,
  book: PriceBook = openPriceBook(db, shopId),
): CostFacts | null {
  const row = db
    .select({
      quantity: cases.quantity,
      areaDm2: workOrders.areaDm2,
      baseMetal: cases.baseMetal,
      finalStack: workOrders.finalStack,
      stageFound: cases.stageFound,
      partValueCents: workOrders.partValueCents,
      round: cases.round,
      state: cases.state,
      closing: cases.closing,
      openedAt: cases.openedAt,
      stripMethod: cases.stripMethod,
      classSlug: standingClass(cases),
    })
    .from(cases)
    .innerJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)))
    .where(and(eq(cases.shopId, shopId), eq(cases.id, caseId)))
    .get();
  if (!row) return null;
  const { finalStack, round, state, openedAt, partValueCents, stripMethod, classSlug, ...facts } = row;
  const isClosed = state === "closed";
  const minutes = spentMinutes(db, shopId, caseId);
  const stack = strikeThenPlate(finalStack);
  const table = book.stripTableAt(openedAt);
  const part = { baseMetal: facts.baseMetal, stageFound: facts.stageFound, stack, table };
  return {
    ...facts,
    // 0: the plater who opened the job did not know it. The estimate then says that scrap risk is left out.
    partValueCents: partValueCents || null,
    stack,
    table,
    // A choice that is no longer safe, because a fact of the part was corrected, falls back to the cheapest that is.
    method: stripMethod && methodRefusal(part, stripMethod) === null ? stripMethod : null,
    rounds: round,
    rates: book.ratesAt(openedAt),
    // Once it is closed its own minutes are recorded; correcting it by a record that it is part of would be a circle.
    minutesCorrection: isClosed ? NO_CORRECTIONS : book.correctionsOf(classSlug),
    recorded: isClosed && minutes !== null ? { minutes } : null,
  };
}

/** Minutes ticked on the case's cards, all rounds. Null when no step was ever ticked. */
function spentMinutes(db: Handle, shopId: number, caseId: number): number | null {
  const row = db
    .select({ minutes: sql<number | null>`sum(${reworkSteps.spentMinutes})` })
    .from(reworkSteps)
    .innerJoin(reworkCards, and(eq(reworkCards.shopId, reworkSteps.shopId), eq(reworkCards.id, reworkSteps.cardId)))
    .where(and(eq(reworkCards.shopId, shopId), eq(reworkCards.caseId, caseId), isNotNull(reworkSteps.tickedAt)))
    .get();
  return row?.minutes ?? null;
}

export type CaseFigure = Pick<
  typeof caseCosts.$inferSelect,
  "basis" | "round" | "meanCents" | "low90Cents" | "high90Cents" | "lines" | "at"
>;

export interface CaseMoney {
  /** What it is likely to cost if it goes on and fails later, with its 90 % range. */
  atRisk: { meanCents: number; low90Cents: number; high90Cents: number };
  /** Putting it right now. The newest estimate. */
  estimate: CaseFigure | null;
  /** Once the cards are done. */
  recorded: CaseFigure | null;
  /** From when the rates hold, and where they come from. */
  rates: { validFromAt: number; source: string };
  /** What was assumed because nobody said. */
  assumed: string[];
}

/** The money of one case. Only for those who may see it: the caller asks `can(member, "money.case")` first. */
export function getCaseMoney(db: Handle, shopId: number, caseId: number): CaseMoney | null {
  const facts = getCostFacts(db, shopId, caseId);
  if (!facts) return null;
  const figures = db
    .select({
      basis: caseCosts.basis,
      round: caseCosts.round,
      meanCents: caseCosts.meanCents,
      low90Cents: caseCosts.low90Cents,
      high90Cents: caseCosts.high90Cents,
      lines: caseCosts.lines,
      at: caseCosts.at,
    })
    .from(caseCosts)
    .where(and(eq(caseCosts.shopId, shopId), eq(caseCosts.caseId, caseId)))
    .orderBy(desc(caseCosts.id))
    .all();
  const { meanCents, low90Cents, high90Cents, assumed } = moneyAtRisk(facts);
  return {
    atRisk: { meanCents, low90Cents, high90Cents },
    estimate: figures.find((figure) => figure.basis === "estimate") ?? null,
    recorded: figures.find((figure) => figure.basis === "recorded") ?? null,
    rates: { validFromAt: facts.rates.validFromAt, source: facts.rates.source },
    assumed,
  };
}

/** Minutes planned against minutes taken of every done card, for the estimate's own record. Oldest first. */
export function listCardMinutes(db: Handle, shopId: number) {
  return db
    .select({
      cardId: reworkCards.id,
      plannedMinutes: sql<number>`sum(${reworkSteps.plannedMinutes})`,
      spentMinutes: sql<number>`sum(${reworkSteps.spentMinutes})`,
    })
    .from(reworkCards)
    .innerJoin(reworkSteps, and(eq(reworkSteps.shopId, reworkCards.shopId), eq(reworkSteps.cardId, reworkCards.id)))
    .where(and(eq(reworkCards.shopId, shopId), isNotNull(reworkCards.doneAt)))
    .groupBy(reworkCards.id)
    .orderBy(asc(reworkCards.id))
    .all();
}
