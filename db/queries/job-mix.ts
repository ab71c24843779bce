import { and, desc, eq, gte, lt, sql } from "drizzle-orm";
import { strikeThenPlate } from "@/lib/costs/case-stack";
import type { MixJob } from "@/lib/costs/miss-cost";
import type { Handle } from "../open";
import { runs, workOrders } from "../schema";
import type { CheckSpan } from "./check-rate";

/** Jobs beyond which the mix is known well enough; the most struck ones come first. */
const MOST_JOBS = 50;

export type StruckJob = MixJob & { workOrderId: number; number: string; partName: string };

/** What the shop struck in a stretch of time, the job with the most parts first. */
export function listJobMix(db: Handle, shopId: number, { fromAt, toAt }: CheckSpan): StruckJob[] {
  const parts = sql<number>`sum(${runs.partsStruck})`;
  return db
    .select({
      workOrderId: workOrders.id,
      number: workOrders.number,
      partName: workOrders.partName,
      baseMetal: workOrders.baseMetal,
      areaDm2: workOrders.areaDm2,
      partValueCents: workOrders.partValueCents,
      finalStack: workOrders.finalStack,
      parts,
    })
    .from(runs)
    .innerJoin(workOrders, and(eq(workOrders.shopId, runs.shopId), eq(workOrders.id, runs.workOrderId)))
    .where(and(eq(runs.shopId, shopId), gte(runs.struckAt, fromAt), lt(runs.struckAt, toAt)))
    .groupBy(workOrders.id)
    .orderBy(desc(parts), workOrders.id)
    .limit(MOST_JOBS)
    .all()
    .map(({ finalStack, partValueCents, ...job }) => ({
      ...job,
      stack: strikeThenPlate(finalStack),
      // 0: the plater who opened the job did not know it.
      partValueCents: partValueCents || null,
    }));
}
