import type { BaseMetal, Method, StageFound, StationKind } from "./case-words";
import type { SnapFacts } from "./snap-draft";

export interface JobChoice {
  id: number;
  number: string;
  customer: string;
  partName: string;
  baseMetal: BaseMetal;
  alloy: string | null;
  quantity: number;
  /** Its newest weighing does not fit its metal: said in words. */
  misfit?: string;
}

export interface StationChoice {
  id: number;
  slug: string;
  kind: StationKind;
  name: string;
}

export interface SolutionChoice {
  id: number;
  stationId: number;
  code: string;
  name: string;
  /** Null: it serves both methods. */
  method: Method | null;
  windowDays: number;
  madeUpAt: number;
}

export interface RunChoice {
  id: number;
  code: string;
  workOrderId: number;
  method: Method;
  partsStruck: number;
  struckAt: number;
  solutionIds: number[];
}

/** What a snap may name: everything of this shop that is open or in use. */
export interface SnapChoices {
  /** Open jobs, newest first. */
  jobs: JobChoice[];
  /** In line order. */
  stations: StationChoice[];
  solutions: SolutionChoice[];
  /** Newest first. */
  runs: RunChoice[];
  classes: { slug: string; title: string }[];
}

/** The facts of the last case that this person opened. */
export interface LastSnap {
  workOrderId: number;
  runId: number | null;
  baseMetal: BaseMetal;
  alloy: string | null;
  method: Method;
  foundStationId: number;
  stageFound: StageFound;
  solutionIds: number[];
}

/**
 * The facts to begin the next snap with. While the last job is open they are the last case's, except that the job's
 * newest run counts: it is the one that hangs on the rack. Else they are those of the shop's newest open job.
 * @returns `isLast` false when they are not the person's own last ones; no job when the shop has none open
 */
export function sameAsLast(choices: SnapChoices, last: LastSnap | null): { facts: SnapFacts; isLast: boolean } {
  const lastJob = choices.jobs.find((job) => job.id === last?.workOrderId);
  if (last && lastJob) {
    const run = newestRun(choices, lastJob.id);
    const method = run?.method ?? last.method;
    const used = run && run.id !== last.runId ? run.solutionIds : last.solutionIds;
    return {
      isLast: true,
      facts: {
        workOrderId: lastJob.id,
        runId: run?.id ?? null,
        baseMetal: last.baseMetal,
        alloy: last.alloy ?? "",
        method,
        foundStationId: stationFor(choices, last.foundStationId),
        solutionIds: solutionsFor(choices, method, used),
        stageFound: last.stageFound,
      },
    };
  }
  const job = choices.jobs[0];
  const facts = job ? factsOfJob(choices, job) : factsWithoutJob(choices);
  return { isLast: false, facts: { ...facts, foundStationId: stationFor(choices, last?.foundStationId ?? null) } };
}

/** What a job brings with it when it is chosen: metal, newest run, that run's method and solutions. */
export function factsOfJob(choices: SnapChoices, job: JobChoice): SnapFacts {
  const run = newestRun(choices, job.id);
  const method = run?.method ?? "bath";
  return {
    workOrderId: job.id,
    runId: run?.id ?? null,
    baseMetal: job.baseMetal,
    alloy: job.alloy ?? "",
    method,
    foundStationId: stationFor(choices, null),
    solutionIds: solutionsFor(choices, method, run?.solutionIds ?? []),
    stageFound: "at-strike",
  };
}

function factsWithoutJob(choices: SnapChoices): SnapFacts {
  return {
    workOrderId: null,
    runId: null,
    baseMetal: "steel",
    alloy: "",
    method: "bath",
    foundStationId: stationFor(choices, null),
    solutionIds: solutionsFor(choices, "bath", []),
    stageFound: "at-strike",
  };
}

function newestRun(choices: SnapChoices, jobId: number): RunChoice | undefined {
  return choices.runs.find((run) => run.workOrderId === jobId);
}

/** A fault is mostly seen at the inspection bench, else at the strike. */
function stationFor(choices: SnapChoices, wanted: number | null): number | null {
  const { stations } = choices;
  const of = (kind: StationKind) => stations.find((station) => station.kind === kind);
  const chosen = stations.find((station) => station.id === wanted) ?? of("inspect") ?? of("strike") ?? stations[0];
  return chosen?.id ?? null;
}

/**
 * The solutions to name: those used, where all are still in use. One that was retired has been replaced, so then, and
 * where none is known, each station's newest for the method.
 */
export function solutionsFor(choices: SnapChoices, method: Method, used: readonly number[]): number[] {
  const serves = choices.solutions.filter((each) => each.method === null || each.method === method);
  if (used.length > 0 && used.every((id) => serves.some((each) => each.id === id))) return [...used];
  const newest = new Map<number, SolutionChoice>();
  for (const each of serves) {
    const before = newest.get(each.stationId);
    if (!before || each.madeUpAt > before.madeUpAt) newest.set(each.stationId, each);
  }
  return [...newest.values()].map((each) => each.id);
}
