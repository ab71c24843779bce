import { and, desc, eq, inArray, max } from "drizzle-orm";
import type { KeptCheck } from "@/lib/metals/check-warning";
import type { Handle } from "../open";
import { members, partChecks } from "../schema";

const columns = {
  id: partChecks.id,
  workOrderId: partChecks.workOrderId,
  caseId: partChecks.caseId,
  weightAirG: partChecks.weightAirG,
  weightWaterG: partChecks.weightWaterG,
  waterTempC: partChecks.waterTempC,
  balanceErrorG: partChecks.balanceErrorG,
  pull: partChecks.pull,
  colour: partChecks.colour,
  densityGPerCm3: partChecks.densityGPerCm3,
  uncertaintyGPerCm3: partChecks.uncertaintyGPerCm3,
  declaredBaseMetal: partChecks.declaredBaseMetal,
  declaredAlloy: partChecks.declaredAlloy,
  fits: partChecks.fits,
  likelyBaseMetal: partChecks.likelyBaseMetal,
  by: members.name,
  at: partChecks.at,
};

const rowsOf = (db: Handle) =>
  db
    .select(columns)
    .from(partChecks)
    .innerJoin(members, and(eq(members.shopId, partChecks.shopId), eq(members.id, partChecks.memberId)));

/** A kept check, with who weighed. */
export type PartCheckRow = KeptCheck & ReturnType<ReturnType<typeof rowsOf>["all"]>[number];

/** The checks of one job, or those that were weighed because of one case. */
export type CheckedThing = { workOrderId: number } | { caseId: number };

const isOf = (thing: CheckedThing) =>
  "workOrderId" in thing ? eq(partChecks.workOrderId, thing.workOrderId) : eq(partChecks.caseId, thing.caseId);

/** Checks of a job or a case, the newest first. */
export function listPartChecks(db: Handle, shopId: number, thing: CheckedThing, limit: number): PartCheckRow[] {
  return rowsOf(db)
    .where(and(eq(partChecks.shopId, shopId), isOf(thing)))
    .orderBy(desc(partChecks.id))
    .limit(limit)
    .all();
}

/** The newest check of a job, which speaks for it; null while nobody has weighed a part of it. */
export function getLatestPartCheck(db: Handle, shopId: number, thing: CheckedThing): PartCheckRow | null {
  return listPartChecks(db, shopId, thing, 1)[0] ?? null;
}

/** The newest check of each of these jobs, by job. A job that nobody has weighed is left out. */
export function listLatestPartChecks(
  db: Handle,
  shopId: number,
  workOrderIds: readonly number[],
): Map<number, PartCheckRow> {
  if (workOrderIds.length === 0) return new Map();
  const newest = db
    .select({ id: max(partChecks.id) })
    .from(partChecks)
    .where(and(eq(partChecks.shopId, shopId), inArray(partChecks.workOrderId, [...workOrderIds])))
    .groupBy(partChecks.workOrderId);
  const rows = rowsOf(db)
    .where(and(eq(partChecks.shopId, shopId), inArray(partChecks.id, newest)))
    .all();
  return new Map(rows.map((row) => [row.workOrderId, row]));
}

/** Adds a check. A part weighed again is a further row. */
export function insertPartCheck(tx: Handle, check: Omit<typeof partChecks.$inferInsert, "id">): void {
  tx.insert(partChecks).values(check).run();
}
