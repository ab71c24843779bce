import { and, eq } from "drizzle-orm";
import { caseCost, moneyAtRisk } from "@/lib/costs/case-cost";
import type { Handle } from "../open";
import { getCostFacts } from "../queries/case-costs";
import { caseCosts, cases } from "../schema";
import type { Doer } from "./case-event";

/**
 * Works out what the case costs as it now stands and adds that figure to its record. Called in the transaction of
 * every change that can move it, so that queue, case page and ledger never disagree.
 */
export function priceCase(tx: Handle, doer: Doer, caseId: number): void {
  const facts = getCostFacts(tx, doer.shopId, caseId);
  if (!facts) return;
  const cost = caseCost(facts);
  const basis = cost.basis === "estimated" ? "estimate" : "recorded";
  tx.insert(caseCosts)
    .values({
      shopId: doer.shopId,
      caseId,
      round: facts.rounds ?? 1,
      basis,
      meanCents: cost.meanCents,
      low90Cents: cost.low90Cents,
      high90Cents: cost.high90Cents,
      lines: cost.lines.map(({ name, meanCents }) => ({ name, meanCents })),
      ratesId: facts.rates.id,
      at: doer.now,
    })
    .run();
  tx.update(cases)
    .set({ costCents: cost.meanCents, costBasis: basis, atRiskCents: moneyAtRisk(facts).meanCents })
    .where(and(eq(cases.shopId, doer.shopId), eq(cases.id, caseId)))
    .run();
}
