import { and, asc, desc, eq, inArray, isNull } from "drizzle-orm";
import type { JobChoice, LastSnap, RunChoice, SnapChoices } from "@/lib/cases/same-as-last";
import { checkWarning } from "@/lib/metals/check-warning";
import type { Handle } from "../open";
import {
  cases,
  caseSolutions,
  customers,
  libraryClasses,
  memberRoles,
  members,
  runs,
  runSolutions,
  workOrders,
} from "../schema";
import { listSolutions, listStations } from "./line";
import { listLatestPartChecks } from "./part-checks";

/** More open jobs than fit a phone's list are no help; the newest are what hangs on the racks. */
const JOBS = 200;
const RUNS = 200;

/** Everything of the shop that a snap may name. */
export function listSnapChoices(db: Handle, shopId: number): SnapChoices {
  return {
    jobs: withMisfits(db, shopId, listOpenJobs(db, shopId)),
    stations: listStations(db, shopId),
    solutions: listSolutions(db, shopId),
    runs: listRunsOfOpenJobs(db, shopId),
    classes: listClasses(db, shopId),
  };
}

/** Each job with what its newest weighing says against its metal. */
function withMisfits(db: Handle, shopId: number, jobs: JobChoice[]): JobChoice[] {
  const checks = listLatestPartChecks(
    db,
    shopId,
    jobs.map((job) => job.id),
  );
  return jobs.map((job) => ({ ...job, misfit: checkWarning(checks.get(job.id), job) ?? undefined }));
}

/** The classes that may be called, in the library's order. */
export function listClasses(db: Handle, shopId: number) {
  return db
    .select({ slug: libraryClasses.slug, title: libraryClasses.title })
    .from(libraryClasses)
    .where(eq(libraryClasses.shopId, shopId))
    .orderBy(asc(libraryClasses.position), asc(libraryClasses.id))
    .all();
}

function listOpenJobs(db: Handle, shopId: number) {
  return db
    .select({
      id: workOrders.id,
      number: workOrders.number,
      customer: customers.name,
      partName: workOrders.partName,
      baseMetal: workOrders.baseMetal,
      alloy: workOrders.alloy,
      quantity: workOrders.quantity,
    })
    .from(workOrders)
    .innerJoin(customers, and(eq(customers.shopId, workOrders.shopId), eq(customers.id, workOrders.customerId)))
    .where(and(eq(workOrders.shopId, shopId), isNull(workOrders.closedAt)))
    .orderBy(desc(workOrders.openedAt), desc(workOrders.id))
    .limit(JOBS)
    .all();
}

function listRunsOfOpenJobs(db: Handle, shopId: number): RunChoice[] {
  const rows = db
    .select({
      id: runs.id,
      code: runs.code,
      workOrderId: runs.workOrderId,
      method: runs.method,
      partsStruck: runs.partsStruck,
      struckAt: runs.struckAt,
    })
    .from(runs)
    .innerJoin(workOrders, and(eq(workOrders.shopId, runs.shopId), eq(workOrders.id, runs.workOrderId)))
    .where(and(eq(runs.shopId, shopId), isNull(workOrders.closedAt)))
    .orderBy(desc(runs.struckAt), desc(runs.id))
    .limit(RUNS)
    .all();
  const used = rows.length
    ? db
        .select({ runId: runSolutions.runId, solutionId: runSolutions.solutionId })
        .from(runSolutions)
        .where(
          and(
            eq(runSolutions.shopId, shopId),
            inArray(
              runSolutions.runId,
              rows.map((run) => run.id),
            ),
          ),
        )
        .all()
    : [];
  return rows.map((run) => ({
    ...run,
    solutionIds: used.filter((each) => each.runId === run.id).map((each) => each.solutionId),
  }));
}

/** The facts of the last case that this person opened, or null. */
export function getLastSnap(db: Handle, shopId: number, memberId: number): LastSnap | null {
  const last = db
    .select({
      id: cases.id,
      workOrderId: cases.workOrderId,
      runId: cases.runId,
      baseMetal: cases.baseMetal,
      alloy: cases.alloy,
      method: cases.method,
      foundStationId: cases.foundStationId,
      stageFound: cases.stageFound,
    })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), eq(cases.openedById, memberId)))
    .orderBy(desc(cases.openedAt), desc(cases.id))
    .limit(1)
    .get();
  if (!last) return null;
  const { id, ...facts } = last;
  const solutionIds = db
    .select({ solutionId: caseSolutions.solutionId })
    .from(caseSolutions)
    .where(and(eq(caseSolutions.shopId, shopId), eq(caseSolutions.caseId, id)))
    .orderBy(asc(caseSolutions.solutionId))
    .all()
    .map((each) => each.solutionId);
  return { ...facts, solutionIds };
}

/** Names of the senior techs, for "Ines gets it now". */
export function listSeniorNames(db: Handle, shopId: number): string[] {
  return db
    .select({ name: members.name })
    .from(members)
    .innerJoin(memberRoles, and(eq(memberRoles.shopId, members.shopId), eq(memberRoles.memberId, members.id)))
    .where(and(eq(members.shopId, shopId), eq(memberRoles.role, "senior"), isNull(members.removedAt)))
    .orderBy(asc(members.name))
    .all()
    .map((each) => each.name);
}
