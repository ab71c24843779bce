import { and, eq, ne } from "drizzle-orm";
import { methodRefusal } from "@/lib/costs/method-refusal";
import type { StripMethod } from "@/lib/costs/strip-methods";
import { fault } from "@/lib/fault";
import type { Handle } from "../open";
import { getCostFacts } from "../queries/case-costs";
import { cases } from "../schema";
import { addEvent, type CaseRow, type Doer } from "./case-event";
import { priceCase } from "./price-case";

/**
 * Puts a way to take the deposit off on an open case, or (null) takes it away again; the price follows.
 * @throws FaultError "invalid" with the reason when the way is not safe on the case's base metal, "conflict" for a closed case
 */
export function chooseStrip(tx: Handle, doer: Doer, row: CaseRow, method: StripMethod | null): void {
  const facts = getCostFacts(tx, doer.shopId, row.id);
  const why = facts && method ? methodRefusal(facts, method) : null;
  if (why !== null) throw fault("invalid", `Not on this part. ${why}`, { method: why });
  const before = tx
    .select({ stripMethod: cases.stripMethod })
    .from(cases)
    .where(and(eq(cases.shopId, doer.shopId), eq(cases.id, row.id)))
    .get();
  const changed = tx
    .update(cases)
    .set({ stripMethod: method })
    .where(
      and(
        eq(cases.shopId, doer.shopId),
        eq(cases.id, row.id),
        eq(cases.state, row.state),
        eq(cases.round, row.round),
        ne(cases.state, "closed"),
      ),
    )
    .run();
  if (changed.changes !== 1) {
    throw fault("conflict", "That was not saved: this case is closed, or somebody changed it a moment ago. Reload it.");
  }
  if (before?.stripMethod === method) return;
  const detail = { before, after: { stripMethod: method } };
  addEvent(tx, doer, row, { event: "amended", from: row.state, to: row.state, detail });
  priceCase(tx, doer, row.id);
}
