import { and, eq, inArray, isNull } from "drizzle-orm";
import type { Snap } from "@/lib/cases/case.schema";
import { fault } from "@/lib/fault";
import type { Handle } from "../open";
import { libraryClasses, runs, solutions, stations, workOrders } from "../schema";

/**
 * Checks that everything a snap names is this shop's and still in use.
 * @throws FaultError "invalid" naming the field
 */
export function requireSnapFacts(db: Handle, shopId: number, snap: Snap): void {
  const fields: Record<string, string> = {};
  const order = db
    .select({ id: workOrders.id })
    .from(workOrders)
    .where(and(eq(workOrders.shopId, shopId), eq(workOrders.id, snap.workOrderId)))
    .get();
  if (!order) fields.workOrderId = "That job is not in this shop's list. Choose another.";

  if (snap.runId) {
    const run = db
      .select({ workOrderId: runs.workOrderId })
      .from(runs)
      .where(and(eq(runs.shopId, shopId), eq(runs.id, snap.runId)))
      .get();
    if (!run) fields.runId = "That run is not in this shop's list. Choose another or none.";
    else if (run.workOrderId !== snap.workOrderId)
      fields.runId = "That run belongs to another job. Choose one of this job's runs.";
  }
  const station = db
    .select({ id: stations.id })
    .from(stations)
    .where(and(eq(stations.shopId, shopId), eq(stations.id, snap.foundStationId)))
    .get();
  if (!station) fields.foundStationId = "That station is not on this shop's line. Choose another.";

  const wanted = [...new Set(snap.solutionIds)];
  const inUse = wanted.length
    ? db
        .select({ id: solutions.id })
        .from(solutions)
        .where(and(eq(solutions.shopId, shopId), inArray(solutions.id, wanted), isNull(solutions.retiredAt)))
        .all().length
    : 0;
  if (inUse !== wanted.length) fields.solutionIds = "One of the solutions is no longer in use. Choose again.";
  if (snap.calledClass && !hasClass(db, shopId, snap.calledClass))
    fields.calledClass = "That class is not in this shop's library. Choose another.";

  const first = Object.values(fields)[0];
  if (first) throw fault("invalid", first, fields);
}

/** Whether the shop's library holds a class. */
export function hasClass(db: Handle, shopId: number, slug: string): boolean {
  return (
    db
      .select({ id: libraryClasses.id })
      .from(libraryClasses)
      .where(and(eq(libraryClasses.shopId, shopId), eq(libraryClasses.slug, slug)))
      .get() !== undefined
  );
}
