import type { Db, Handle } from "@/db/open";
import {
  claimNextJob,
  failJob,
  finishJob,
  postponeJob,
  pruneDoneJobs,
  requeueRunningJobs,
  type Job,
} from "@/db/queries/jobs";
import { FaultError } from "@/lib/fault";

/** What a kind of job does. It may be killed anywhere and run again, so it must bear that. */
export interface JobHandler {
  run: (db: Db, payload: Job["payload"], now: number) => Promise<void> | void;
  /** In the transaction that gives the job up: tells whoever waits for it. */
  giveUp?: (tx: Handle, payload: Job["payload"], sentence: string) => void;
}
export type JobHandlers = Record<Job["kind"], JobHandler>;

export interface JobRunner {
  /** Looks for due jobs at once. */
  wake: () => void;
  /** Resolves when nothing is due and nothing runs. */
  settled: () => Promise<void>;
  /** Takes no more jobs; resolves when the running ones are done. */
  stop: () => Promise<void>;
}

interface RunnerParts {
  db: Db;
  handlers: JobHandlers;
  now?: () => number;
}

const AT_ONCE = 2;
const LOOK_EVERY_MS = 5_000;
const PRUNE_EVERY_MS = 3_600_000;
const KEEP_DONE_MS = 7 * 24 * 3_600_000;
const MOST_TRIES = 5;
const FIRST_WAIT_MS = 10_000;
const GIVEN_UP = "The photo could not be prepared. Take it again, or ask the owner to look at the server's log.";

/**
 * How long a job waits after a failed try: 10 s, 40 s, 160 s, 640 s, then it is given up.
 * @param failures failed tries so far, from 1
 * @returns ms, or null when it has been tried often enough
 */
export function waitAfter(failures: number): number | null {
  return failures >= MOST_TRIES ? null : FIRST_WAIT_MS * 4 ** (failures - 1);
}

/**
 * Works on jobs, two at a time, in this process. Jobs that a killed process left in the middle run again first.
 * One runner to a database.
 */
export function startJobRunner({ db, handlers, now = Date.now }: RunnerParts): JobRunner {
  requeueRunningJobs(db);
  pruneDoneJobs(db, now() - KEEP_DONE_MS);
  const running = new Set<Promise<void>>();
  let isStopped = false;

  const wake = () => {
    while (!isStopped && running.size < AT_ONCE) {
      const job = claimNextJob(db, now());
      if (!job) return;
      const work = runJob({ db, handlers, now }, job).finally(() => {
        running.delete(work);
        wake();
      });
      running.add(work);
    }
  };
  const settled = async () => {
    while (running.size > 0) await Promise.all(running);
  };
  const look = setInterval(() => safely(wake), LOOK_EVERY_MS);
  const prune = setInterval(() => safely(() => pruneDoneJobs(db, now() - KEEP_DONE_MS)), PRUNE_EVERY_MS);
  for (const timer of [look, prune]) timer.unref();
  safely(wake);
  return {
    wake: () => safely(wake),
    settled,
    stop: async () => {
      isStopped = true;
      clearInterval(look);
      clearInterval(prune);
      await settled();
    },
  };
}

async function runJob({ db, handlers, now }: Required<RunnerParts>, job: Job): Promise<void> {
  const handler = handlers[job.kind];
  try {
    await handler.run(db, job.payload, now());
    finishJob(db, job.id, now());
  } catch (error) {
    console.error(`job ${job.id} (${job.kind})`, error);
    safely(() => afterFailure(db, handler, job, error, now()));
  }
}

/** Another try later, unless trying again cannot help or has not helped. */
function afterFailure(db: Db, handler: JobHandler, job: Job, error: unknown, now: number): void {
  const message = error instanceof Error ? error.message : String(error);
  const waitMs = error instanceof FaultError ? null : waitAfter(job.attempts + 1);
  if (waitMs !== null) return postponeJob(db, job.id, now + waitMs, message);
  db.transaction((tx) => {
    failJob(tx, job.id, now, message);
    handler.giveUp?.(tx, job.payload, error instanceof FaultError ? error.message : GIVEN_UP);
  });
}

/** A worker outlives a moment in which the database cannot be reached. */
function safely(task: () => void): void {
  try {
    task();
  } catch (error) {
    console.error("job runner", error);
  }
}
