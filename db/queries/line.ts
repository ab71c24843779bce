import { and, asc, desc, eq, inArray, isNull, sql } from "drizzle-orm";
import type { Handle } from "../open";
import { cases, solutionChecks, solutions, stations } from "../schema";

/** The shop's stations in line order. */
export function listStations(db: Handle, shopId: number) {
  return db
    .select({ id: stations.id, slug: stations.slug, kind: stations.kind, name: stations.name })
    .from(stations)
    .where(eq(stations.shopId, shopId))
    .orderBy(asc(stations.position))
    .all();
}

/** The station with this slug, or null: for `?station=` in a URL. */
export function getStation(db: Handle, shopId: number, slug: string) {
  return listStations(db, shopId).find((station) => station.slug === slug) ?? null;
}

/** Solutions in use, by station and code. */
export function listSolutions(db: Handle, shopId: number) {
  return db
    .select({
      id: solutions.id,
      stationId: solutions.stationId,
      code: solutions.code,
      name: solutions.name,
      method: solutions.method,
      windowDays: solutions.windowDays,
      madeUpAt: solutions.madeUpAt,
    })
    .from(solutions)
    .where(and(eq(solutions.shopId, shopId), isNull(solutions.retiredAt)))
    .orderBy(asc(solutions.stationId), asc(solutions.code))
    .all();
}

/** Parts on hold or in rework by the station that they trace back to. */
export function countHeldByStation(db: Handle, shopId: number): Map<number, number> {
  const rows = db
    .select({ stationId: cases.tracedStationId, parts: sql<number>`sum(${cases.quantity})` })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), inArray(cases.state, ["held", "confirmed", "in-rework"])))
    .groupBy(cases.tracedStationId)
    .all();
  return new Map(rows.flatMap((row) => (row.stationId === null ? [] : [[row.stationId, row.parts]])));
}

/** The newest check of each solution in use, by solution. */
export function listLastChecks(db: Handle, shopId: number) {
  return db
    .select({
      solutionId: solutionChecks.solutionId,
      bathTempC: solutionChecks.bathTempC,
      volts: solutionChecks.volts,
      secondsToDeposit: solutionChecks.secondsToDeposit,
      at: sql<number>`max(${solutionChecks.at})`,
    })
    .from(solutionChecks)
    .where(eq(solutionChecks.shopId, shopId))
    .groupBy(solutionChecks.solutionId)
    .orderBy(desc(sql`max(${solutionChecks.at})`))
    .all();
}
