import type { Handle } from "@/db/open";
import { jobs } from "@/db/schema";

type JobKind = (typeof jobs.$inferInsert)["kind"];

interface NewJob {
  shopId: number;
  kind: JobKind;
  payload: Record<string, string | number>;
  now: number;
  /** Not before this moment; at once unless said. */
  runAfterAt?: number;
  /** A second job with this key is dropped while the first has not begun. */
  onceKey?: string;
}

/** Writes a job in the caller's transaction: its reason and the job are kept together or not at all. */
export function enqueue(tx: Handle, job: NewJob): void {
  tx.insert(jobs)
    .values({
      shopId: job.shopId,
      kind: job.kind,
      payload: job.payload,
      onceKey: job.onceKey ?? null,
      runAfterAt: job.runAfterAt ?? job.now,
      createdAt: job.now,
    })
    .onConflictDoNothing()
    .run();
}
