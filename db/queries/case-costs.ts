import { and, asc, desc, eq, gt, isNotNull, lte, ne, sql, type SQL } from "drizzle-orm";
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
  const row = standingRows(db)
    .where(and(eq(cases.shopId, shopId), eq(cases.id, caseId)))
    .get();
  if (!row) return null;
  const spent = spentMinutes(db, and(eq(reworkCards.shopId, shopId), eq(reworkCards.caseId, caseId)));
  return factsOf(row, spent.get(caseId) ?? null, book);
}

/** A case with what is on its own row now, for pricing it again. */
export interface PricedCase {
  caseId: number;
  facts: CostFacts;
  shown: Pick<typeof cases.$inferSelect, "costCents" | "costBasis" | "atRiskCents">;
}

/** The same for a stretch of a shop's cases, by row number, with three reads in all. */
export function listCostFacts(
  db: Handle,
  shopId: number,
  stretch: { isClosed: boolean; after: number; limit: number },
  book: PriceBook,
): PricedCase[] {
  const { isClosed, after, limit } = stretch;
  const state = isClosed ? eq(cases.state, "closed") : ne(cases.state, "closed");
  const rows = standingRows(db)
    .where(and(eq(cases.shopId, shopId), gt(cases.id, after), state))
    .orderBy(asc(cases.id))
    .limit(limit)
    .all();
  const last = rows.at(-1)?.id ?? after;
  const of = and(eq(reworkCards.shopId, shopId), gt(reworkCards.caseId, after), lte(reworkCards.caseId, last));
  const spent = spentMinutes(db, of);
  return rows.map((row) => ({
    caseId: row.id,
    facts: factsOf(row, spent.get(row.id) ?? null, book),
    shown: { costCents: row.costCents, costBasis: row.costBasis, atRiskCents: row.atRiskCents },
  }));
}

const standingRows = (db: Handle) =>
  db
    .select({
      id: cases.id,
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
      costCents: cases.costCents,
      costBasis: cases.costBasis,
      atRiskCents: cases.atRiskCents,
    })
    .from(cases)
    .innerJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)));

type StandingRow = ReturnType<ReturnType<typeof standingRows>["all"]>[number];

function factsOf(row: StandingRow, minutes: number | null, book: PriceBook): CostFacts {
  const { quantity, areaDm2, baseMetal, stageFound, closing, stripMethod } = row;
  const isClosed = row.state === "closed";
  const stack = strikeThenPlate(row.finalStack);
  const table = book.stripTableAt(row.openedAt);
  const isAllowed = stripMethod && methodRefusal({ baseMetal, stageFound, stack, table }, stripMethod) === null;
  return {
    quantity,
    areaDm2,
    baseMetal,
    stageFound,
    closing,
    // 0: the plater who opened the job did not know it. The estimate then says that scrap risk is left out.
    partValueCents: row.partValueCents || null,
    stack,
    table,
    // A choice that is no longer safe, because a fact of the part was corrected, falls back to the cheapest that is.
    method: isAllowed ? stripMethod : null,
    rounds: row.round,
    rates: book.ratesAt(row.openedAt),
    // Once it is closed its own minutes are recorded; correcting it by a record that it is part of would be a circle.
    minutesCorrection: isClosed ? NO_CORRECTIONS : book.correctionsOf(row.classSlug),
    recorded: isClosed && minutes !== null ? { minutes } : null,
  };
}

/** Minutes ticked on the cards of some cases, all rounds, by case. One whose steps were never ticked is left out. */
function spentMinutes(db: Handle, of: SQL | undefined): Map<number, number> {
  const rows = db
    .select({ caseId: reworkCards.caseId, minutes: sql<number | null>`sum(${reworkSteps.spentMinutes})` })
    .from(reworkCards)
    .innerJoin(reworkSteps, and(eq(reworkSteps.shopId, reworkCards.shopId), eq(reworkSteps.cardId, reworkCards.id)))
    .where(and(of, isNotNull(reworkSteps.tickedAt)))
    .groupBy(reworkCards.caseId)
    .all();
  return new Map(rows.flatMap(({ caseId, minutes }) => (minutes === null ? [] : [[caseId, minutes]])));
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
