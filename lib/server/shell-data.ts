import "server-only";
import { cache } from "react";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { countHeldByStation, listLastChecks, listSolutions, listStations } from "@/db/queries/line";
import { countWaiting } from "@/db/queries/waiting";
import { initialsOf } from "@/lib/crew/initials";
import type { StationView } from "@/lib/line/station-view";
import { stationView } from "@/lib/line/station-words";
import { can } from "@/lib/permissions";

/** What the band on top of every page shows: the person, what waits, and the line as it stands now. */
export const shellFor = cache((member: SignedIn) => {
  const db = getDb();
  const waiting = countWaiting(db, member.shopId);
  const counts = can(member, "case.confirm")
    ? { "second-look": waiting.secondLook, rework: waiting.rework }
    : { rework: waiting.rework };
  return {
    actor: { name: member.name, initials: initialsOf(member.name), roles: member.roles, shopName: member.shop.name },
    counts,
    stations: lineOf(member.shopId, waiting.secondLook),
  };
});

function lineOf(shopId: number, waiting: number): StationView[] {
  const db = getDb();
  const now = Date.now();
  const held = countHeldByStation(db, shopId);
  const solutions = listSolutions(db, shopId);
  const checks = listLastChecks(db, shopId);
  return listStations(db, shopId).map((station) => {
    const here = solutions.filter((solution) => solution.stationId === station.id);
    const check = checks.find((each) => here.some((solution) => solution.id === each.solutionId)) ?? null;
    return stationView({ ...station, held: held.get(station.id) ?? 0, solutions: here, check, waiting }, now);
  });
}
