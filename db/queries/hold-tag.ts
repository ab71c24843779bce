import { and, eq, sql } from "drizzle-orm";
import type { Handle } from "../open";
import { cases, customers, libraryClasses, members, runs, workOrders } from "../schema";

/** While the part is held its tag says what was called; once confirmed, what was confirmed. */
const shownClass = sql<
  string | null
>`case when ${cases.state} = 'held' then ${cases.calledClass} else ${cases.confirmedClass} end`;

/** What is printed on a hold tag, or null when the case is not of this shop. */
export function getHoldTag(db: Handle, shopId: number, ref: string) {
  return (
    db
      .select({
        ref: cases.ref,
        state: cases.state,
        closing: cases.closing,
        quantity: cases.quantity,
        partsStruck: runs.partsStruck,
        runCode: runs.code,
        partName: workOrders.partName,
        jobNumber: workOrders.number,
        customer: customers.name,
        baseMetal: cases.baseMetal,
        alloy: cases.alloy,
        stageFound: cases.stageFound,
        openedAt: cases.openedAt,
        openedBy: members.name,
        round: cases.round,
        classSlug: shownClass,
        classTitle: libraryClasses.title,
      })
      .from(cases)
      .innerJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)))
      .innerJoin(customers, and(eq(customers.shopId, cases.shopId), eq(customers.id, workOrders.customerId)))
      .innerJoin(members, and(eq(members.shopId, cases.shopId), eq(members.id, cases.openedById)))
      .leftJoin(runs, and(eq(runs.shopId, cases.shopId), eq(runs.id, cases.runId)))
      .leftJoin(libraryClasses, and(eq(libraryClasses.shopId, cases.shopId), eq(libraryClasses.slug, shownClass)))
      .where(and(eq(cases.shopId, shopId), eq(cases.ref, ref)))
      .get() ?? null
  );
}
