import { and, asc, desc, eq, gt, lt, or } from "drizzle-orm";
import { alias } from "drizzle-orm/sqlite-core";
import { fault } from "@/lib/fault";
import type { Handle } from "../open";
import { cases, customers, libraryCauses, libraryClasses, members, runs, stations, workOrders } from "../schema";

const found = alias(stations, "found_station");
const traced = alias(stations, "traced_station");
const opener = alias(members, "opener");
const confirmer = alias(members, "confirmer");
const calledAs = alias(libraryClasses, "called_as");
const confirmedAs = alias(libraryClasses, "confirmed_as");

/** Everything about a case that every member of the shop may see. Money is not in it. */
export type CaseFacts = NonNullable<ReturnType<typeof getCaseFacts>>;

const factColumns = {
  id: cases.id,
  ref: cases.ref,
  state: cases.state,
  closing: cases.closing,
  round: cases.round,
  baseMetal: cases.baseMetal,
  alloy: cases.alloy,
  method: cases.method,
  stageFound: cases.stageFound,
  quantity: cases.quantity,
  symptoms: cases.symptoms,
  note: cases.note,
  openedById: cases.openedById,
  openedBy: opener.name,
  openedAt: cases.openedAt,
  heldAt: cases.heldAt,
  calledClass: cases.calledClass,
  calledTitle: calledAs.title,
  calledSure: cases.calledSure,
  confirmedClass: cases.confirmedClass,
  confirmedTitle: confirmedAs.title,
  confirmedCauseId: cases.confirmedCauseId,
  causeTitle: libraryCauses.title,
  confirmedBy: confirmer.name,
  confirmedAt: cases.confirmedAt,
  selfConfirmed: cases.selfConfirmed,
  disposition: cases.disposition,
  closedAt: cases.closedAt,
  job: {
    id: workOrders.id,
    number: workOrders.number,
    partName: workOrders.partName,
    baseMetal: workOrders.baseMetal,
    alloy: workOrders.alloy,
    quantity: workOrders.quantity,
    finalStack: workOrders.finalStack,
    customer: customers.name,
  },
  run: { code: runs.code, partsStruck: runs.partsStruck, struckAt: runs.struckAt },
  found: { id: found.id, slug: found.slug, name: found.name, kind: found.kind },
  traced: { id: traced.id, slug: traced.slug, name: traced.name, kind: traced.kind },
};

/**
 * The case with this reference, with the names that its numbers stand for.
 * @returns null for another shop's reference, as for one that never was
 */
export function getCaseFacts(db: Handle, shopId: number, ref: string) {
  return (
    db
      .select(factColumns)
      .from(cases)
      .innerJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)))
      .innerJoin(customers, and(eq(customers.shopId, workOrders.shopId), eq(customers.id, workOrders.customerId)))
      .innerJoin(found, and(eq(found.shopId, cases.shopId), eq(found.id, cases.foundStationId)))
      .innerJoin(opener, and(eq(opener.shopId, cases.shopId), eq(opener.id, cases.openedById)))
      .leftJoin(traced, and(eq(traced.shopId, cases.shopId), eq(traced.id, cases.tracedStationId)))
      .leftJoin(runs, and(eq(runs.shopId, cases.shopId), eq(runs.id, cases.runId)))
      .leftJoin(confirmer, and(eq(confirmer.shopId, cases.shopId), eq(confirmer.id, cases.confirmedById)))
      .leftJoin(calledAs, and(eq(calledAs.shopId, cases.shopId), eq(calledAs.slug, cases.calledClass)))
      .leftJoin(confirmedAs, and(eq(confirmedAs.shopId, cases.shopId), eq(confirmedAs.slug, cases.confirmedClass)))
      .leftJoin(
        libraryCauses,
        and(eq(libraryCauses.shopId, cases.shopId), eq(libraryCauses.id, cases.confirmedCauseId)),
      )
      .where(and(eq(cases.shopId, shopId), eq(cases.ref, ref)))
      .get() ?? null
  );
}

/** @throws FaultError "not-found" where `getCaseFacts` gives null */
export function requireCaseFacts(db: Handle, shopId: number, ref: string): CaseFacts {
  const facts = getCaseFacts(db, shopId, ref);
  if (!facts) throw fault("not-found", `There is no case ${ref} in this shop. Check the reference on the tag.`);
  return facts;
}

/** The case opened just before and just after this one, for turning pages. */
export function getNeighbours(db: Handle, shopId: number, of: { id: number; openedAt: number }) {
  const one = { ref: cases.ref };
  const earlier = db
    .select(one)
    .from(cases)
    .where(
      and(
        eq(cases.shopId, shopId),
        or(lt(cases.openedAt, of.openedAt), and(eq(cases.openedAt, of.openedAt), lt(cases.id, of.id))),
      ),
    )
    .orderBy(desc(cases.openedAt), desc(cases.id))
    .limit(1)
    .get();
  const later = db
    .select(one)
    .from(cases)
    .where(
      and(
        eq(cases.shopId, shopId),
        or(gt(cases.openedAt, of.openedAt), and(eq(cases.openedAt, of.openedAt), gt(cases.id, of.id))),
      ),
    )
    .orderBy(asc(cases.openedAt), asc(cases.id))
    .limit(1)
    .get();
  return { earlier: earlier?.ref ?? null, later: later?.ref ?? null };
}
