import { and, asc, eq, ne } from "drizzle-orm";
import type { Handle } from "../open";
import { openPriceBook } from "../queries/price-book";
import { cases } from "../schema";
import { priceCase } from "./price-case";

/**
 * Prices the open cases of a job again, in the transaction that changed what they rest on. Closed ones keep their figure.
 * @returns how many
 */
export function priceOpenCases(tx: Handle, doer: { shopId: number; now: number }, jobId: number): number {
  const { shopId, now } = doer;
  const open = tx
    .select({ id: cases.id })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), eq(cases.workOrderId, jobId), ne(cases.state, "closed")))
    .orderBy(asc(cases.id))
    .all();
  const book = openPriceBook(tx, shopId);
  for (const { id } of open) priceCase(tx, { shopId, now, book }, id);
  return open.length;
}
