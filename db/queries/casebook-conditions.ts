import { and, eq, gte, inArray, lt, sql, type SQL } from "drizzle-orm";
import { CLOSINGS } from "@/lib/cases/case-words";
import type { CasebookFilter } from "@/lib/cases/casebook-filter";
import type { Handle } from "../open";
import { cases, standingClass, workOrders } from "../schema";

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
    filter.closedFromAt === undefined
      ? undefined
      : gte(cursorBounds === "from" ? plus(closed) : closed, given("closedFromAt")),
    filter.closedUntilAt === undefined
      ? undefined
      : lt(cursorBounds === "until" ? plus(closed) : closed, given("closedUntilAt")),
  );
}

export const plus = (column: SQL) => sql`+${column}`;

function jobsOfCustomer(db: Handle) {
  return db
    .select({ id: workOrders.id })
    .from(workOrders)
    .where(and(eq(workOrders.shopId, given("shopId")), eq(workOrders.customerId, given("customerId"))));
}
