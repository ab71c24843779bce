import { and, asc, count, desc, eq, gt, gte, lt, or, sql, sum } from "drizzle-orm";
import type { Handle } from "../open";
import { preparedOnce } from "../prepared";
import { cases, libraryClasses, workOrders } from "../schema";

/** Where a case stands in the queue: most money at risk first, then who waits longest. */
export interface QueuePlace {
  atRiskCents: number;
  heldAt: number;
  id: number;
}

const waiting = (shopId: number, stationId: number | null) =>
  and(
    eq(cases.shopId, shopId),
    eq(cases.state, "held"),
    stationId === null ? undefined : eq(cases.tracedStationId, stationId),
  );

const behind = (place: QueuePlace | ReturnType<typeof placeNamed>) =>
  or(
    lt(cases.atRiskCents, place.atRiskCents),
    and(eq(cases.atRiskCents, place.atRiskCents), gt(cases.heldAt, place.heldAt)),
    and(eq(cases.atRiskCents, place.atRiskCents), eq(cases.heldAt, place.heldAt), gt(cases.id, place.id)),
  );

const aheadOf = (place: QueuePlace) =>
  or(
    gt(cases.atRiskCents, place.atRiskCents),
    and(eq(cases.atRiskCents, place.atRiskCents), lt(cases.heldAt, place.heldAt)),
    and(eq(cases.atRiskCents, place.atRiskCents), eq(cases.heldAt, place.heldAt), lt(cases.id, place.id)),
  );

const queueColumns = {
  id: cases.id,
  ref: cases.ref,
  round: cases.round,
  heldAt: cases.heldAt,
  atRiskCents: cases.atRiskCents,
  quantity: cases.quantity,
  baseMetal: cases.baseMetal,
  alloy: cases.alloy,
  partName: workOrders.partName,
  calledClass: cases.calledClass,
  confirmedClass: cases.confirmedClass,
  /** Of the class that was called in this round, else of the one confirmed in the round before. */
  classTitle: libraryClasses.title,
};

const queueRows = (db: Handle) =>
  db
    .select(queueColumns)
    .from(cases)
    .innerJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)))
    .leftJoin(
      libraryClasses,
      and(
        eq(libraryClasses.shopId, cases.shopId),
        eq(libraryClasses.slug, sql`coalesce(${cases.calledClass}, ${cases.confirmedClass})`),
      ),
    );

export type QueueRow = ReturnType<typeof listQueue>[number];

/**
 * Cases that wait for a second look.
 * @param page `after`: the last one that was shown; `from`: begin with this one; `stationId`: only those that trace
 *   back to it
 */
export function listQueue(
  db: Handle,
  shopId: number,
  page: { stationId: number | null; after?: QueuePlace | null; from?: QueuePlace; limit: number },
) {
  const { stationId, after, from, limit } = page;
  const shape = `second-look queue ${stationId !== null} ${Boolean(after)} ${Boolean(from)}`;
  const query = preparedOnce(db, shape, () =>
    queueRows(db)
      .where(
        and(
          eq(cases.shopId, sql.placeholder("shopId")),
          eq(cases.state, "held"),
          // True of every case: it only leads SQLite to the index that stands in the queue's order, so nothing is sorted.
          gte(cases.atRiskCents, Number.MIN_SAFE_INTEGER),
          stationId === null ? undefined : eq(cases.tracedStationId, sql.placeholder("stationId")),
          after ? behind(placeNamed("after")) : undefined,
          from ? or(eq(cases.id, placeNamed("from").id), behind(placeNamed("from"))) : undefined,
        ),
      )
      .orderBy(desc(cases.atRiskCents), asc(cases.heldAt), asc(cases.id))
      .limit(sql.placeholder("limit"))
      .prepare(),
  );
  return query.all({ shopId, stationId, limit, ...valuesOf("after", after), ...valuesOf("from", from) });
}

/** A place that is only known when the prepared query runs. */
const placeNamed = (name: string) => ({
  atRiskCents: sql.placeholder(`${name}.atRiskCents`),
  heldAt: sql.placeholder(`${name}.heldAt`),
  id: sql.placeholder(`${name}.id`),
});

const valuesOf = (name: string, place: QueuePlace | null | undefined) =>
  place
    ? { [`${name}.atRiskCents`]: place.atRiskCents, [`${name}.heldAt`]: place.heldAt, [`${name}.id`]: place.id }
    : {};

/** How many cases and parts wait, all of them or those that trace back to a station; with `before`, those in front of it. */
export function countQueue(
  db: Handle,
  shopId: number,
  narrow: { stationId: number | null; before?: QueuePlace },
): { cases: number; parts: number } {
  const row = db
    .select({ cases: count(), parts: sum(cases.quantity).mapWith(Number) })
    .from(cases)
    .where(and(waiting(shopId, narrow.stationId), narrow.before ? aheadOf(narrow.before) : undefined))
    .get();
  return { cases: row?.cases ?? 0, parts: row?.parts ?? 0 };
}

/** Where a case stands, whether it still waits or not. Null for another shop's. */
export function getQueuePlace(db: Handle, shopId: number, caseId: number): QueuePlace | null {
  return (
    db
      .select({ atRiskCents: cases.atRiskCents, heldAt: cases.heldAt, id: cases.id })
      .from(cases)
      .where(and(eq(cases.shopId, shopId), eq(cases.id, caseId)))
      .get() ?? null
  );
}

/** The case to look at after this one: the next in the queue, or from its end the first. Null when no other waits. */
export function getNextInQueue(db: Handle, shopId: number, stationId: number | null, place: QueuePlace): string | null {
  const next = listQueue(db, shopId, { stationId, after: place, limit: 1 })[0];
  if (next) return next.ref;
  const first = listQueue(db, shopId, { stationId, limit: 2 }).find((row) => row.id !== place.id);
  return first?.ref ?? null;
}
