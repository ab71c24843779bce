import { and, eq, gte, inArray, lt, sql, type SQL } from "drizzle-orm";
import { alias } from "drizzle-orm/sqlite-core";
import { CLOSINGS } from "@/lib/cases/case-words";
import type { CasebookFilter } from "@/lib/cases/casebook-filter";
import type { Handle } from "../open";
import { cases, exemplars, photos, standingClass, workOrders } from "../schema";

const given = (name: keyof CasebookFilter | "shopId") => sql.placeholder(name);

/** Which filters are set: all that a prepared query's SQL depends on. */
export function filterShape(filter: CasebookFilter): string {
  const set = Object.entries(filter).flatMap(([name, value]) => (value === undefined ? [] : [name]));
  return `${set.sort().join("+")}${isClosing(filter.status) ? "/closing" : ""}`;
}

/** Cases of a closing period are shown by when they were closed, all others by when they were opened. */
export function isByClosing(filter: CasebookFilter): boolean {
  return filter.closedFromAt !== undefined || filter.closedUntilAt !== undefined;
}

const isClosing = (status: string | undefined) => CLOSINGS.some((closing) => closing === status);

/**
 * Which columns SQLite may not search by. A plus before a column keeps it from that column's index, and so from another
 * order than the one that is asked for.
 */
export type Pinned = "nothing" | "customer" | "all";

/**
 * The filters as SQL over `cases`, with placeholders named like the filter's fields and `shopId`.
 * @param cursorBounds the end of a closing period at which the page's cursor stands instead: two bounds on one side
 *   lead SQLite to walk the whole index
 */
export function filterConditions(
  db: Handle,
  filter: CasebookFilter,
  pinned: Pinned,
  cursorBounds: "from" | "until" | null = null,
): SQL | undefined {
  const is = (name: keyof CasebookFilter, column: SQL) =>
    filter[name] === undefined ? undefined : sql`${pinned === "all" ? plus(column) : column} = ${given(name)}`;
  const job = sql`${cases.workOrderId}`;
  const opened = pinned === "all" || isByClosing(filter) ? plus(sql`${cases.openedAt}`) : sql`${cases.openedAt}`;
  const openedAt = (end: "from" | "until") => (cursorBounds === end ? plus(sql`${cases.openedAt}`) : opened);
  const closed = sql`${cases.closedAt}`;
  return and(
    eq(cases.shopId, given("shopId")),
    is("classSlug", standingClass(cases)),
    is("causeId", sql`${cases.confirmedCauseId}`),
    is("stationId", sql`${cases.tracedStationId}`),
    is("baseMetal", sql`${cases.baseMetal}`),
    is("stageFound", sql`${cases.stageFound}`),
    is("openedById", sql`${cases.openedById}`),
    is("status", isClosing(filter.status) ? sql`${cases.closing}` : sql`${cases.state}`),
    filter.customerId === undefined ? undefined : inArray(pinned === "nothing" ? job : plus(job), jobsOfCustomer(db)),
    filter.openedFromAt === undefined ? undefined : gte(openedAt("from"), given("openedFromAt")),
    filter.openedUntilAt === undefined ? undefined : lt(openedAt("until"), given("openedUntilAt")),
    // By row number, so that the few exemplars lead and not one of the many cases is tried in vain.
    filter.exemplars === undefined ? undefined : inArray(cases.id, casesWithExemplar(db)),
    filter.closedFromAt === undefined
      ? undefined
      : gte(cursorBounds === "from" ? plus(closed) : closed, given("closedFromAt")),
    filter.closedUntilAt === undefined
      ? undefined
      : lt(cursorBounds === "until" ? plus(closed) : closed, given("closedUntilAt")),
  );
}

/** Cases with an exemplar of the class they are confirmed as: one of a class that a case no longer has counts for nothing. */
function casesWithExemplar(db: Handle) {
  const shown = alias(cases, "shown");
  return db
    .select({ id: shown.id })
    .from(exemplars)
    .innerJoin(photos, and(eq(photos.shopId, exemplars.shopId), eq(photos.id, exemplars.photoId)))
    .innerJoin(
      shown,
      and(eq(shown.shopId, photos.shopId), eq(shown.id, photos.caseId), eq(shown.confirmedClass, exemplars.classSlug)),
    )
    .where(and(eq(exemplars.shopId, given("shopId")), eq(photos.state, "ready")));
}

export const plus = (column: SQL) => sql`+${column}`;

function jobsOfCustomer(db: Handle) {
  return db
    .select({ id: workOrders.id })
    .from(workOrders)
    .where(and(eq(workOrders.shopId, given("shopId")), eq(workOrders.customerId, given("customerId"))));
}
