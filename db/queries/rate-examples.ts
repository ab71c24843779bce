import { and, count, desc, eq, gte, inArray, ne, type SQL } from "drizzle-orm";
import { strikeThenPlate } from "@/lib/costs/case-stack";
import type { Handle } from "../open";
import { cases, workOrders } from "../schema";

/** Closed cases to choose from; more than that is a casebook, not a list. */
const MOST_EXAMPLES = 30;

/** The newest cases that were put right and closed, to try rates on. */
export function listExampleCases(db: Handle, shopId: number) {
  return exampleCases(db, and(eq(cases.shopId, shopId), eq(cases.closing, "sound")))
    .orderBy(desc(cases.openedAt), desc(cases.id))
    .limit(MOST_EXAMPLES)
    .all()
    .map(toExample);
}

/** The dearest case since a day that was found after the final plate or sent back; null when there was none. */
export function getDearestLaterCase(db: Handle, shopId: number, sinceAt: number) {
  const row = exampleCases(
    db,
    and(
      eq(cases.shopId, shopId),
      inArray(cases.stageFound, ["after-final-plate", "returned"]),
      gte(cases.openedAt, sinceAt),
      eq(cases.state, "closed"),
      ne(cases.closing, "released"),
    ),
  )
    .orderBy(desc(cases.costCents), desc(cases.id))
    .limit(1)
    .get();
  return row ? toExample(row) : null;
}

export type ExampleCase = ReturnType<typeof toExample>;

function exampleCases(db: Handle, where: SQL | undefined) {
  return db
    .select({
      ref: cases.ref,
      partName: workOrders.partName,
      quantity: cases.quantity,
      baseMetal: cases.baseMetal,
      stageFound: cases.stageFound,
      method: cases.stripMethod,
      classSlug: cases.confirmedClass,
      areaDm2: workOrders.areaDm2,
      partValueCents: workOrders.partValueCents,
      finalStack: workOrders.finalStack,
    })
    .from(cases)
    .innerJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)))
    .where(where)
    .$dynamic();
}

type ExampleRow = NonNullable<ReturnType<ReturnType<typeof exampleCases>["get"]>>;

function toExample({ finalStack, partValueCents, ...row }: ExampleRow) {
  // 0: the plater who opened the job did not know it.
  return { ...row, stack: strikeThenPlate(finalStack), partValueCents: partValueCents || null };
}

/** Cases that are not closed: new rates leave them as they are. */
export function countOpenCases(db: Handle, shopId: number): number {
  const row = db
    .select({ cases: count() })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), inArray(cases.state, ["held", "confirmed", "in-rework"])))
    .get();
  return row?.cases ?? 0;
}
