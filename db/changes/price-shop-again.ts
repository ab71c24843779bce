import { isDeepStrictEqual } from "node:util";
import { and, asc, desc, eq, gt, ne } from "drizzle-orm";
import { caseCost } from "@/lib/costs/case-cost";
import type { Db, Handle } from "../open";
import { getCostFacts } from "../queries/case-costs";
import { openPriceBook, type PriceBook } from "../queries/price-book";
import { caseCosts, cases } from "../schema";
import { figureOf, showFigure, type NewFigure } from "./price-case";

/** Cases priced in one transaction: a disk flush each would take hours, and one for all would lose everything at a crash. */
const BATCH = 500;

/**
 * Prices every case of a shop again, at the rates and with the table of its day. Figures are added, never changed, and
 * only where they differ from the last of their kind: a run that was cut short is simply run again. Closed cases go first,
 * because the open ones are corrected by their record.
 * @returns how many cases got a new figure
 */
export function priceShopAgain(db: Db, shopId: number, now: number): number {
  let repriced = 0;
  for (const isClosed of [true, false]) {
    const book = openPriceBook(db, shopId);
    for (let after = 0; ;) {
      const batch = listBatch(db, shopId, isClosed, after);
      const last = batch.at(-1);
      if (last === undefined) break;
      db.transaction(
        (tx) => {
          for (const caseId of batch) if (priceCaseAgain(tx, { shopId, now, book }, caseId)) repriced += 1;
        },
        { behavior: "immediate" },
      );
      after = last;
    }
  }
  return repriced;
}

function listBatch(db: Handle, shopId: number, isClosed: boolean, after: number): number[] {
  const state = isClosed ? eq(cases.state, "closed") : ne(cases.state, "closed");
  return db
    .select({ id: cases.id })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), gt(cases.id, after), state))
    .orderBy(asc(cases.id))
    .limit(BATCH)
    .all()
    .map((row) => row.id);
}

/** A closed case gets both: what this version would have estimated, and its record at what it took. */
function priceCaseAgain(tx: Handle, pricing: { shopId: number; now: number; book: PriceBook }, caseId: number) {
  const facts = getCostFacts(tx, pricing.shopId, caseId, pricing.book);
  if (!facts) return false;
  const cost = caseCost(facts);
  const estimated = facts.recorded && facts.closing === "sound" ? caseCost({ ...facts, recorded: null }) : null;
  let isNew = estimated !== null && addIfNew(tx, figureOf(pricing, caseId, facts, estimated));
  // The record stands after the estimate that it is held against.
  isNew = addIfNew(tx, figureOf(pricing, caseId, facts, cost), isNew) || isNew;
  showFigure(tx, pricing.shopId, caseId, facts, cost);
  return isNew;
}

function addIfNew(tx: Handle, figure: NewFigure, always = false): boolean {
  const last = tx
    .select()
    .from(caseCosts)
    .where(
      and(eq(caseCosts.shopId, figure.shopId), eq(caseCosts.caseId, figure.caseId), eq(caseCosts.basis, figure.basis)),
    )
    .orderBy(desc(caseCosts.id))
    .limit(1)
    .get();
  if (!always && last && isSame(last, figure)) return false;
  tx.insert(caseCosts).values(figure).run();
  return true;
}

function isSame(last: typeof caseCosts.$inferSelect, figure: NewFigure): boolean {
  const { id: _id, at: _at, ...before } = last;
  const { at: _now, ...after } = figure;
  return isDeepStrictEqual(before, after);
}
