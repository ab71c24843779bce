import { and, count, eq, gte, lt, ne, sql, type SQL } from "drizzle-orm";
import { BASE_METAL_TITLES, type StageFound } from "@/lib/cases/case-words";
import type { LedgerGroup } from "@/lib/costs/ledger.schema";
import type { Handle } from "../open";
import { cases, customers, libraryCauses, libraryClasses, stations, workOrders } from "../schema";

export interface LedgerScope {
  fromAt: number;
  untilAt: number;
  /** Only cases that trace back to this station. */
  stationId?: number | null;
}

export interface LedgerGroupRow {
  /** What the casebook filters by; "" for cases in which nobody named one. */
  key: string;
  label: string;
  cases: number;
  parts: number;
  costCents: number;
}

/** Closed cases of a period. Released ones cost nothing and are left out: they were no rework. */
function closedIn(shopId: number, scope: LedgerScope): SQL | undefined {
  return and(
    eq(cases.shopId, shopId),
    gte(cases.closedAt, scope.fromAt),
    lt(cases.closedAt, scope.untilAt),
    ne(cases.closing, "released"),
    scope.stationId ? eq(cases.tracedStationId, scope.stationId) : undefined,
  );
}

const sums = {
  cases: count(),
  parts: sql<number>`sum(${cases.quantity})`,
  costCents: sql<number>`sum(${cases.costCents})`,
};

/** Key and label of each grouping, and the tables that they come from. */
function grouped(db: Handle, by: LedgerGroup) {
  switch (by) {
    case "cause":
      return db
        .select({ key: libraryCauses.slug, label: libraryCauses.title, ...sums })
        .from(cases)
        .leftJoin(libraryCauses, eq(libraryCauses.id, cases.confirmedCauseId))
        .$dynamic();
    case "class":
      return db
        .select({ key: libraryClasses.slug, label: libraryClasses.title, ...sums })
        .from(cases)
        .leftJoin(
          libraryClasses,
          and(eq(libraryClasses.shopId, cases.shopId), eq(libraryClasses.slug, cases.confirmedClass)),
        )
        .$dynamic();
    case "station":
      return db
        .select({ key: stations.slug, label: stations.name, ...sums })
        .from(cases)
        .leftJoin(stations, eq(stations.id, cases.tracedStationId))
        .$dynamic();
    case "customer":
      return db
        .select({ key: sql<string>`cast(${customers.id} as text)`, label: customers.name, ...sums })
        .from(cases)
        .innerJoin(workOrders, eq(workOrders.id, cases.workOrderId))
        .leftJoin(customers, eq(customers.id, workOrders.customerId))
        .$dynamic();
    case "base-metal":
      return db
        .select({ key: cases.baseMetal, label: sql<string | null>`null`, ...sums })
        .from(cases)
        .$dynamic();
  }
}

const GROUP_KEY: Record<LedgerGroup, SQL | typeof cases.baseMetal> = {
  cause: sql`${cases.confirmedCauseId}`,
  class: sql`${cases.confirmedClass}`,
  station: sql`${cases.tracedStationId}`,
  customer: sql`${customers.id}`,
  "base-metal": cases.baseMetal,
};

/** What the period's closed cases cost, added up by one thing, dearest first. */
export function listCostBy(db: Handle, shopId: number, by: LedgerGroup, scope: LedgerScope): LedgerGroupRow[] {
  const rows: { key: string | null; label: string | null; cases: number; parts: number; costCents: number }[] = grouped(
    db,
    by,
  )
    .where(closedIn(shopId, scope))
    .groupBy(GROUP_KEY[by])
    .orderBy(sql`sum(${cases.costCents}) desc`)
    .all();
  return rows.map((row) => ({
    ...row,
    key: row.key ?? "",
    label: by === "base-metal" ? metalTitle(row.key) : (row.label ?? "Not named"),
  }));
}

function metalTitle(key: string | null): string {
  const titles: Record<string, string> = BASE_METAL_TITLES;
  return (key && titles[key]) ?? "Not named";
}

export interface StageRow {
  stage: StageFound;
  cases: number;
  costCents: number;
}

/** Where the period's faults were found, and what they cost there. */
export function listCostByStage(db: Handle, shopId: number, scope: LedgerScope): StageRow[] {
  return db
    .select({ stage: cases.stageFound, cases: count(), costCents: sums.costCents })
    .from(cases)
    .where(closedIn(shopId, scope))
    .groupBy(cases.stageFound)
    .all();
}

/** How many of the period's cases stand at recorded cost, and what lies open at estimate. */
export function countLedgerBasis(db: Handle, shopId: number, scope: LedgerScope) {
  const closed = db
    .select({ basis: cases.costBasis, cases: count() })
    .from(cases)
    .where(closedIn(shopId, scope))
    .groupBy(cases.costBasis)
    .all();
  const open = db
    .select({ cases: count(), costCents: sql<number>`coalesce(sum(${cases.costCents}), 0)` })
    .from(cases)
    .where(
      and(
        eq(cases.shopId, shopId),
        sql`${cases.state} in ('held', 'confirmed', 'in-rework')`,
        scope.stationId ? eq(cases.tracedStationId, scope.stationId) : undefined,
      ),
    )
    .get();
  const of = (basis: string) => closed.find((row) => row.basis === basis)?.cases ?? 0;
  return { recorded: of("recorded"), estimated: of("estimate"), open: open ?? { cases: 0, costCents: 0 } };
}
