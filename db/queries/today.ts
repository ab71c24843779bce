import { and, desc, eq, gte, inArray, isNotNull, sql } from "drizzle-orm";
import type { Handle } from "../open";
import { calls, cases, libraryClasses, workOrders } from "../schema";

/** This person's parts that are not done with: held first, newest first. */
export function listMyOpenCases(db: Handle, shopId: number, memberId: number, limit: number) {
  return db
    .select({
      id: cases.id,
      ref: cases.ref,
      state: cases.state,
      closing: cases.closing,
      round: cases.round,
      heldAt: cases.heldAt,
      quantity: cases.quantity,
      partName: workOrders.partName,
      classSlug: sql<string | null>`coalesce(${cases.calledClass}, ${cases.confirmedClass})`,
      classTitle: libraryClasses.title,
    })
    .from(cases)
    .innerJoin(workOrders, eq(workOrders.id, cases.workOrderId))
    .leftJoin(
      libraryClasses,
      and(
        eq(libraryClasses.shopId, cases.shopId),
        eq(libraryClasses.slug, sql`coalesce(${cases.calledClass}, ${cases.confirmedClass})`),
      ),
    )
    .where(and(eq(cases.shopId, shopId), eq(cases.openedById, memberId), eq(cases.state, "held")))
    .orderBy(desc(cases.openedAt))
    .limit(limit)
    .all();
}

/**
 * This person's calls since a moment, each beside the class that was confirmed in the end. Cases whose second look they
 * took themselves are left out: nobody agrees with themselves.
 */
export function listCallsAgainstConfirmed(db: Handle, shopId: number, memberId: number, sinceAt: number) {
  return db
    .select({ called: calls.classSlug, confirmed: cases.confirmedClass })
    .from(calls)
    .innerJoin(cases, eq(cases.id, calls.caseId))
    .where(
      and(
        eq(calls.shopId, shopId),
        eq(calls.memberId, memberId),
        gte(calls.at, sinceAt),
        inArray(calls.kind, ["first", "further"]),
        isNotNull(cases.confirmedClass),
        eq(cases.selfConfirmed, false),
      ),
    )
    .all();
}
