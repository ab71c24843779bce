import { and, eq } from "drizzle-orm";
import { caseCost, moneyAtRisk, type CaseCost } from "@/lib/costs/case-cost";
import type { Handle } from "../open";
import { getCostFacts, type CostFacts } from "../queries/case-costs";
import type { PriceBook } from "../queries/price-book";
import { caseCosts, cases } from "../schema";

/** Whose case it is, and when it is priced. */
export interface Pricing {
  shopId: number;
  now: number;
  /** Where many cases are priced in one go. */
  book?: PriceBook;
}

/**
 * Works out what the case costs as it now stands and adds that figure to its record. Called in the transaction of
 * every change that can move it, so that queue, case page and ledger never disagree.
 */
export function priceCase(tx: Handle, pricing: Pricing, caseId: number): void {
  const facts = getCostFacts(tx, pricing.shopId, caseId, pricing.book);
  if (!facts) return;
  const cost = caseCost(facts);
  tx.insert(caseCosts)
    .values(figureOf(pricing, caseId, facts, cost))
    .run();
  tx.update(cases)
    .set({ costCents: cost.meanCents, costBasis: basisOf(cost), atRiskCents: moneyAtRisk(facts).meanCents })
    .where(and(eq(cases.shopId, pricing.shopId), eq(cases.id, caseId)))
    .run();
}

export type NewFigure = typeof caseCosts.$inferInsert;

/** A case's cost as a row of its record. */
export function figureOf(pricing: Pricing, caseId: number, facts: CostFacts, cost: CaseCost): NewFigure {
  const { method } = cost;
  return {
    shopId: pricing.shopId,
    caseId,
    round: facts.rounds ?? 1,
    basis: basisOf(cost),
    meanCents: cost.meanCents,
    low90Cents: cost.low90Cents,
    high90Cents: cost.high90Cents,
    lines: cost.lines.map(({ name, meanCents }) => ({ name, meanCents })),
    ratesId: facts.rates.id,
    method,
    minutes: cost.minutes,
    minutesCorrection: method === null ? 1 : facts.minutesCorrection[method],
    at: pricing.now,
  };
}

/** What a stored figure rests on: an estimate, or what the cards or the closing recorded. */
export function basisOf(cost: CaseCost): "estimate" | "recorded" {
  return cost.basis === "estimated" ? "estimate" : "recorded";
}
