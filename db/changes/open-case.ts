import { and, eq, sql } from "drizzle-orm";
import { formatCaseRef, yearMonth } from "@/lib/cases/case-ref";
import type { Snap } from "@/lib/cases/case.schema";
import type { Handle } from "../open";
import { claimPhotos } from "../queries/photos";
import { caseNumbers, cases, caseSolutions } from "../schema";
import { addCall } from "./add-call";
import { addEvent, type Doer } from "./case-event";
import { priceCase } from "./price-case";
import { writeCaseText } from "./write-case-text";
import { requireSnapFacts } from "../queries/snap-facts";
import { tracedStation } from "../queries/trace";

interface Opening extends Doer {
  timeZone: string;
  asTrainee: boolean;
}

/**
 * Opens a case from a snap: reference, facts, first call, history, price and words for the search, all or nothing.
 * Sending the same snap again returns the case that it opened.
 * @throws FaultError "invalid" when a fact is not of this shop
 */
export function openCase(tx: Handle, doer: Opening, snap: Snap): { id: number; ref: string; isNew: boolean } {
  const before = tx
    .select({ id: cases.id, ref: cases.ref })
    .from(cases)
    .where(and(eq(cases.shopId, doer.shopId), eq(cases.snapKey, snap.snapKey)))
    .get();
  if (before) return { ...before, isNew: false };

  requireSnapFacts(tx, doer.shopId, snap);
  const ref = takeRef(tx, doer);
  const { id } = tx
    .insert(cases)
    .values({
      shopId: doer.shopId,
      ref,
      snapKey: snap.snapKey,
      state: "held",
      workOrderId: snap.workOrderId,
      runId: snap.runId ?? null,
      baseMetal: snap.baseMetal,
      alloy: snap.alloy || null,
      method: snap.method,
      stageFound: snap.stageFound,
      quantity: snap.quantity,
      foundStationId: snap.foundStationId,
      tracedStationId: tracedStation(tx, doer.shopId, snap.calledClass),
      symptoms: snap.symptoms,
      note: snap.note,
      openedById: doer.memberId,
      openedAt: doer.now,
      heldAt: doer.now,
      atRiskCents: 0,
      costCents: 0,
      costBasis: "estimate",
    })
    .returning({ id: cases.id })
    .get();
  for (const solutionId of new Set(snap.solutionIds)) {
    tx.insert(caseSolutions).values({ shopId: doer.shopId, caseId: id, solutionId }).run();
  }
  addEvent(tx, doer, { id, round: 1 }, { event: "opened", from: null, to: "held" });
  addCall(tx, doer, { caseId: id, round: 1, kind: "first", classSlug: snap.calledClass, sure: snap.sure });
  claimPhotos(tx, { ...doer, caseId: id, round: 1, purpose: "suspect", ids: snap.photoIds });
  priceCase(tx, doer, id);
  writeCaseText(tx, doer.shopId, id);
  return { id, ref, isNew: true };
}

function takeRef(tx: Handle, doer: Opening): string {
  const month = yearMonth(doer.now, doer.timeZone);
  const { last } = tx
    .insert(caseNumbers)
    .values({ shopId: doer.shopId, yearMonth: month, last: 1 })
    .onConflictDoUpdate({
      target: [caseNumbers.shopId, caseNumbers.yearMonth],
      set: { last: sql`${caseNumbers.last} + 1` },
    })
    .returning({ last: caseNumbers.last })
    .get();
  return formatCaseRef(month, last);
}
