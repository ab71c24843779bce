import { and, asc, count, eq, inArray, lt, lte, sql } from "drizzle-orm";
import type { Handle } from "../open";
import { jobs } from "../schema";

export type Job = Pick<typeof jobs.$inferSelect, "id" | "shopId" | "kind" | "payload" | "attempts">;

/**
 * Takes the job that has been due longest, so that no other worker takes it.
 * Its once-key is given up: what happens from now on is worth another job.
 */
export function claimNextJob(db: Handle, now: number): Job | null {
  const due = db
    .select({ id: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.state, "waiting"), lte(jobs.runAfterAt, now)))
    .orderBy(asc(jobs.runAfterAt), asc(jobs.id))
    .limit(1)
    .get();
  if (!due) return null;
  return (
    db
      .update(jobs)
      .set({ state: "running", startedAt: now, onceKey: null })
      .where(and(eq(jobs.id, due.id), eq(jobs.state, "waiting")))
      .returning({ id: jobs.id, shopId: jobs.shopId, kind: jobs.kind, payload: jobs.payload, attempts: jobs.attempts })
      .get() ?? null
  );
}

export function finishJob(db: Handle, id: number, now: number): void {
  db.update(jobs).set({ state: "done", doneAt: now, lastError: null }).where(eq(jobs.id, id)).run();
}

/** Puts a job back for another try. */
export function postponeJob(db: Handle, id: number, runAfterAt: number, lastError: string): void {
  db.update(jobs)
    .set({ state: "waiting", runAfterAt, lastError, attempts: sql`${jobs.attempts} + 1` })
    .where(eq(jobs.id, id))
    .run();
}

/** Gives a job up for good. */
export function failJob(db: Handle, id: number, now: number, lastError: string): void {
  db.update(jobs)
    .set({ state: "failed", doneAt: now, lastError, attempts: sql`${jobs.attempts} + 1` })
    .where(eq(jobs.id, id))
    .run();
}

/**
 * Jobs that a killed process left in the middle wait again. It does not count as a failed try: the job did nothing wrong.
 * Only at the start of the one process that works on jobs.
 * @returns how many
 */
export function requeueRunningJobs(db: Handle): number {
  return db.update(jobs).set({ state: "waiting", startedAt: null }).where(eq(jobs.state, "running")).run().changes;
}

/** Removes done jobs from before a moment. Failed ones stay to be looked at. */
export function pruneDoneJobs(db: Handle, before: number): number {
  return db
    .delete(jobs)
    .where(and(eq(jobs.state, "done"), lt(jobs.doneAt, before)))
    .run().changes;
}

export interface QueueLengths {
  waiting: number;
  running: number;
  failed: number;
}

/** How much work lies there, over all shops: numbers only. */
export function countJobs(db: Handle): QueueLengths {
  const rows = db
    .select({ state: jobs.state, jobs: count() })
    .from(jobs)
    .where(inArray(jobs.state, ["waiting", "running", "failed"]))
    .groupBy(jobs.state)
    .all();
  const of = (state: string) => rows.find((row) => row.state === state)?.jobs ?? 0;
  return { waiting: of("waiting"), running: of("running"), failed: of("failed") };
}
