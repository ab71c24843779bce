import { and, asc, count, desc, eq, inArray, sql } from "drizzle-orm";
import type { CasebookFilter } from "@/lib/cases/casebook-filter";
import type { CappedCount } from "@/lib/cases/casebook-words";
import type { Handle } from "../open";
import { preparedOnce } from "../prepared";
import { cases, libraryCauses, libraryClasses, stations, standingClass, workOrders } from "../schema";
import { filterConditions, filterShape, isByClosing, plus, type Pinned } from "./casebook-conditions";

/** A case as the casebook shows it. Its money is for those who may see it: `withoutMoney` takes it off for the others. */
export type CasebookRow = ReturnType<typeof listCasebook>[number];

const rowColumns = {
  id: cases.id,
  ref: cases.ref,
  state: cases.state,
  closing: cases.closing,
  round: cases.round,
  openedAt: cases.openedAt,
  heldAt: cases.heldAt,
  closedAt: cases.closedAt,
  quantity: cases.quantity,
  baseMetal: cases.baseMetal,
  alloy: cases.alloy,
  stageFound: cases.stageFound,
  note: cases.note,
  // A job cannot be missing; the outer join below only keeps SQLite from beginning with the jobs.
  partName: sql<string>`${workOrders.partName}`,
  classSlug: standingClass(cases),
  classTitle: libraryClasses.title,
  causeTitle: libraryCauses.title,
  stationName: stations.name,
  costCents: cases.costCents,
  costBasis: cases.costBasis,
};

const rowsOf = (db: Handle) =>
  db
    .select(rowColumns)
    .from(cases)
    .leftJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)))
    .leftJoin(
      libraryClasses,
      and(eq(libraryClasses.shopId, cases.shopId), eq(libraryClasses.slug, standingClass(cases))),
    )
    .leftJoin(libraryCauses, and(eq(libraryCauses.shopId, cases.shopId), eq(libraryCauses.id, cases.confirmedCauseId)))
    .leftJoin(stations, and(eq(stations.shopId, cases.shopId), eq(stations.id, cases.tracedStationId)));

export interface CasebookSlice {
  filter: CasebookFilter;
  order: "newest" | "oldest";
  /** Goes on after a case, or back to those before it; null begins at the first. */
  from: { kind: "on" | "back"; at: number; id: number } | null;
  limit: number;
  /** The filters are known to let many cases through. */
  isDense: boolean;
}

/** Cases by time and, at the same moment, by row number: no case is shown twice and none is left out between pages. */
export function listCasebook(db: Handle, shopId: number, slice: CasebookSlice) {
  const { filter, order, from, limit, isDense } = slice;
  const isBack = from?.kind === "back";
  const isFalling = (order === "newest") !== isBack;
  const byClosing = isByClosing(filter);
  const plan = planOf(filter, isDense);
  const shape = ["casebook", filterShape(filter), isFalling, from !== null, plan.pinned, plan.isGathered].join(" ");
  const query = preparedOnce(db, shape, () => {
    const time = sql`${byClosing ? cases.closedAt : cases.openedAt}`;
    const place = sql`(${sql.placeholder("at")}, ${sql.placeholder("id")})`;
    const direction = isFalling ? desc : asc;
    return rowsOf(db)
      .where(
        and(
          filterConditions(db, filter, plan.pinned, from && (isFalling ? "until" : "from")),
          from ? sql`(${time}, ${cases.id}) ${sql.raw(isFalling ? "<" : ">")} ${place}` : undefined,
        ),
      )
      .orderBy(direction(plan.isGathered ? plus(time) : time), direction(cases.id))
      .limit(sql.placeholder("limit"))
      .prepare();
  });
  const rows = query.all({ ...filter, shopId, limit, at: from?.at, id: from?.id });
  return isBack ? rows.reverse() : rows;
}

/**
 * What leads the search. As a rule the index of a filter, which holds its cases by time. A customer's cases lie under
 * many jobs, each in its own order: few are gathered and sorted; for many it is quicker to walk all cases by time and
 * test each. A closing period leads by itself.
 */
function planOf(filter: CasebookFilter, isDense: boolean): { pinned: Pinned; isGathered: boolean } {
  // The few cases with an exemplar are found by those, then sorted.
  if (filter.exemplars) return { pinned: "all", isGathered: true };
  if (isByClosing(filter)) return { pinned: "all", isGathered: false };
  if (filter.customerId === undefined) return { pinned: "nothing", isGathered: false };
  return isDense ? { pinned: "customer", isGathered: false } : { pinned: "nothing", isGathered: true };
}

/** These cases, in this order. Another shop's are left out. */
export function listCasebookById(db: Handle, shopId: number, ids: readonly number[]): CasebookRow[] {
  const query = preparedOnce(db, "casebook by id", () =>
    rowsOf(db)
      .where(
        and(
          eq(cases.shopId, sql.placeholder("shopId")),
          sql`${cases.id} in (select value from json_each(${sql.placeholder("ids")}))`,
        ),
      )
      .prepare(),
  );
  const rows = new Map(query.all({ shopId, ids: JSON.stringify(ids) }).map((row) => [row.id, row]));
  return ids.flatMap((id) => rows.get(id) ?? []);
}

/** Row numbers of the cases with these references, in their order; references that the shop does not have are left out. */
export function listIdsByRef(db: Handle, shopId: number, refs: readonly string[]): number[] {
  if (refs.length === 0) return [];
  const rows = db
    .select({ id: cases.id, ref: cases.ref })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), inArray(cases.ref, [...refs])))
    .all();
  return refs.flatMap((ref) => rows.find((row) => row.ref === ref)?.id ?? []);
}

/** Beyond this many, cases are not counted: nobody reads the figure, and counting would cost more than the page. */
export const MOST_COUNTED = 1000;

/** How many cases the filters let through, counted up to `MOST_COUNTED`. */
export function countCasebook(db: Handle, shopId: number, filter: CasebookFilter): CappedCount {
  const query = preparedOnce(db, `casebook count ${filterShape(filter)}`, () => {
    const some = db
      .select({ one: sql`1`.as("one") })
      .from(cases)
      .where(filterConditions(db, filter, isByClosing(filter) || filter.exemplars ? "all" : "nothing"))
      .limit(MOST_COUNTED + 1)
      .as("some");
    return db.select({ cases: count() }).from(some).prepare();
  });
  const found = query.get({ ...filter, shopId })?.cases ?? 0;
  return { count: Math.min(found, MOST_COUNTED), isCapped: found > MOST_COUNTED };
}

/** The time by which a row stands in its list. */
export function placeOf(row: CasebookRow, filter: CasebookFilter): { at: number; id: number } {
  return { at: isByClosing(filter) ? (row.closedAt ?? row.openedAt) : row.openedAt, id: row.id };
}
