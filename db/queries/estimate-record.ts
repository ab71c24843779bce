import { and, desc, eq, isNotNull, sql, type SQL, type SQLWrapper } from "drizzle-orm";
import { alias } from "drizzle-orm/sqlite-core";
import { LEAST_PAIRS, type Correction } from "@/lib/costs/correction";
import { correctionRows, type CorrectionRow, type EstimatePair } from "@/lib/costs/estimate-record";
import type { StripMethod } from "@/lib/costs/strip-methods";
import type { NotEnough } from "@/lib/input-error";
import type { Handle } from "../open";
import { caseCosts, cases } from "../schema";

/** How many closed cases the record goes back: a shop's practice changes, and no price waits for a scan of ten years. */
export const RECORD_CASES = 400;

/**
 * Estimate against recorded, hands-on minutes, of the newest 400 cases that closed as sound; the newest first. The
 * estimate is the last one before the case closed, with the correction that was in it divided out: a correction that was
 * learnt from the record must not be learnt from again.
 */
export function listEstimatePairs(
  db: Handle,
  shopId: number,
  only: { classSlug?: string; method?: StripMethod } = {},
): EstimatePair[] {
  const closed = db
    .select({ id: cases.id, ref: cases.ref, classSlug: cases.confirmedClass, openedAt: cases.openedAt })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), eq(cases.closing, "sound")))
    .orderBy(desc(cases.openedAt), desc(cases.id))
    .limit(RECORD_CASES)
    .as("closed_cases");
  const recorded = alias(caseCosts, "recorded");
  const estimate = alias(caseCosts, "estimate");
  return db
    .select({
      ref: closed.ref,
      classSlug: closed.classSlug,
      method: estimate.method,
      estimated: sql<number>`${estimate.minutes} / ${estimate.minutesCorrection}`,
      recorded: sql<number>`${recorded.minutes}`,
    })
    .from(closed)
    .innerJoin(recorded, eq(recorded.id, newestOf(shopId, closed.id, sql`basis = 'recorded' and minutes is not null`)))
    .innerJoin(
      estimate,
      eq(estimate.id, newestOf(shopId, closed.id, sql`basis = 'estimate' and minutes > 0 and id < ${recorded.id}`)),
    )
    .where(
      and(
        isNotNull(closed.classSlug),
        isNotNull(estimate.method),
        only.classSlug === undefined ? undefined : eq(closed.classSlug, only.classSlug),
        only.method === undefined ? undefined : eq(estimate.method, only.method),
      ),
    )
    .orderBy(desc(closed.openedAt), desc(closed.id))
    .all()
    .flatMap(({ classSlug, method, ...pair }) => (classSlug && method ? [{ ...pair, classSlug, method }] : []));
}

/** The newest figure of a case that is of this kind. */
function newestOf(shopId: number, caseId: SQLWrapper, kind: SQL) {
  return sql`(select max(id) from case_costs where shop_id = ${shopId} and case_id = ${caseId} and ${kind})`;
}

/** The shop's record by class and method, and by method over all classes. */
export function listCorrections(db: Handle, shopId: number): CorrectionRow[] {
  return correctionRows(listEstimatePairs(db, shopId));
}

/** How the shop's rework by a method compares to its estimate; for one class, or (null) over all. */
export function correctionFor(
  db: Handle,
  shopId: number,
  classSlug: string | null,
  method: StripMethod,
): Correction | NotEnough {
  const row = listCorrections(db, shopId).find((each) => each.classSlug === classSlug && each.method === method);
  return row?.correction ?? { enough: false, have: 0, need: LEAST_PAIRS };
}
