import { and, desc, eq, gte, lt } from "drizzle-orm";
import type { Handle } from "../open";
import { cases, libraryClasses, members, workOrders } from "../schema";

export interface HeldForMail {
  ref: string;
  calledTitle: string | null;
  job: string;
  quantity: number;
}

/** Cases that were put on hold in [`fromAt`, `beforeAt`) and still are, most money at risk first. UTC milliseconds. */
export function listHeldBetween(db: Handle, shopId: number, fromAt: number, beforeAt: number): HeldForMail[] {
  return db
    .select({ ref: cases.ref, calledTitle: libraryClasses.title, job: workOrders.number, quantity: cases.quantity })
    .from(cases)
    .innerJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)))
    .leftJoin(libraryClasses, and(eq(libraryClasses.shopId, cases.shopId), eq(libraryClasses.slug, cases.calledClass)))
    .where(
      and(eq(cases.shopId, shopId), eq(cases.state, "held"), gte(cases.heldAt, fromAt), lt(cases.heldAt, beforeAt)),
    )
    .orderBy(desc(cases.atRiskCents), cases.heldAt)
    .all();
}

/** What the mail about a finished second look needs; null when the case is of another shop. */
export function getCaseForMail(db: Handle, shopId: number, caseId: number) {
  const row = db
    .select({
      ref: cases.ref,
      closing: cases.closing,
      disposition: cases.disposition,
      classTitle: libraryClasses.title,
      openedById: cases.openedById,
      confirmedById: cases.confirmedById,
      confirmedBy: members.name,
    })
    .from(cases)
    .leftJoin(members, and(eq(members.shopId, cases.shopId), eq(members.id, cases.confirmedById)))
    .leftJoin(
      libraryClasses,
      and(eq(libraryClasses.shopId, cases.shopId), eq(libraryClasses.slug, cases.confirmedClass)),
    )
    .where(and(eq(cases.shopId, shopId), eq(cases.id, caseId)))
    .get();
  return row ?? null;
}
