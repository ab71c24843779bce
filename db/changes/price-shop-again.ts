import { isDeepStrictEqual } from "node:util";
import { and, eq, getTableColumns, gt, lte, max, sql } from "drizzle-orm";
import { caseCost, moneyAtRisk, type CaseCost } from "@/lib/costs/case-cost";
import type { Db, Handle } from "../open";
import { listCostFacts, type PricedCase } from "../queries/case-costs";
import { openPriceBook } from "../queries/price-book";
import { caseCosts, cases } from "../schema";
import { basisOf, figureOf, type NewFigure, type Pricing } from "./price-case";

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
      const batch = listCostFacts(db, shopId, { isClosed, after, limit: BATCH }, book);
      const last = batch.at(-1);
      if (last === undefined) break;
      repriced += db.transaction((tx) => priceBatch(tx, { shopId, now }, batch, after), { behavior: "immediate" });
      after = last.caseId;
    }
  }
  return repriced;
}

/** @returns how many of them got a new figure */
function priceBatch(tx: Handle, pricing: Pricing, batch: readonly PricedCase[], after: number): number {
  const before = newestFigures(tx, pricing.shopId, after, batch.at(-1)?.caseId ?? after);
  const added = batch.map((each) => {
    const cost = caseCost(each.facts);
    showAgain(tx, pricing.shopId, each, cost);
    return newFigures(pricing, each, cost, before);
  });
  const rows = added.flat();
  if (rows.length > 0) tx.insert(caseCosts).values(rows).run();
  return added.filter((figures) => figures.length > 0).length;
}

type Figure = typeof caseCosts.$inferSelect;
const keyOf = ({ caseId, basis }: Pick<Figure, "caseId" | "basis">) => `${caseId} ${basis}`;

/** A closed case gets both: what this version would have estimated, and after it its record at what it took. */
function newFigures(
  pricing: Pricing,
  { caseId, facts }: PricedCase,
  cost: CaseCost,
  before: ReadonlyMap<string, Figure>,
): NewFigure[] {
  const isNew = (figure: NewFigure) => !isSame(before.get(keyOf(figure)), figure);
  const figure = figureOf(pricing, caseId, facts, cost);
  if (facts.recorded && facts.closing === "sound") {
    const estimate = figureOf(pricing, caseId, facts, caseCost({ ...facts, recorded: null }));
    if (isNew(estimate)) return [estimate, figure];
  }
  return isNew(figure) ? [figure] : [];
}

function isSame(last: Figure | undefined, figure: NewFigure): boolean {
  if (!last) return false;
  const { id: _id, at: _at, ...before } = last;
  const { at: _now, ...after } = figure;
  return isDeepStrictEqual(before, after);
}

/** The newest figure of each kind, of the cases after one row number up to another. */
function newestFigures(tx: Handle, shopId: number, after: number, last: number): Map<string, Figure> {
  const newest = tx
    .select({ id: max(caseCosts.id).as("newest_id") })
    .from(caseCosts)
    .where(and(eq(caseCosts.shopId, shopId), gt(caseCosts.caseId, after), lte(caseCosts.caseId, last)))
    .groupBy(caseCosts.caseId, caseCosts.basis)
    .as("newest");
  const rows = tx
    .select(getTableColumns(caseCosts))
    .from(newest)
    .innerJoin(caseCosts, sql`${caseCosts.id} = ${newest.id}`)
    .all();
  return new Map(rows.map((row) => [keyOf(row), row]));
}

/** The figure on the case's own row, where it has moved. */
function showAgain(tx: Handle, shopId: number, { caseId, facts, shown }: PricedCase, cost: CaseCost): void {
  const now = { costCents: cost.meanCents, costBasis: basisOf(cost), atRiskCents: moneyAtRisk(facts).meanCents };
  if (isDeepStrictEqual(now, shown)) return;
  tx.update(cases)
    .set(now)
    .where(and(eq(cases.shopId, shopId), eq(cases.id, caseId)))
    .run();
}
