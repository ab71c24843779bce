import "server-only";
import { bringCostsUpToDate } from "@/db/changes/bring-costs-up-to-date";
import { getDb } from "@/db/client";
import { watchPeers } from "./address";
import { onWake } from "./job-clock";
import { jobHandlers } from "./job-handlers";
import { startJobRunner, type JobRunner } from "./job-runner";
import { uploadsRoot } from "./storage";
import { sweepUploads } from "./uploads/sweep";

const holder = globalThis as typeof globalThis & { coppertellRunner?: JobRunner };

/** What a server does before its first request: the database is brought up to date, left-overs go, work goes on. */
export async function startUp(): Promise<void> {
  if (holder.coppertellRunner) return;
  watchPeers();
  const db = getDb();
  const { repriced } = bringCostsUpToDate(db, Date.now());
  if (repriced > 0) console.info(`Priced ${repriced} cases again, as this version reckons.`);
  const removed = await sweepUploads(db, uploadsRoot(), Date.now());
  if (removed > 0) console.info(`Removed ${removed} left-over files from the uploads folder.`);
  const runner = startJobRunner({ db, handlers: jobHandlers });
  holder.coppertellRunner = runner;
  onWake(runner.wake);
  // What runs is finished; whatever does not finish in time runs again after the next start.
  for (const signal of ["SIGTERM", "SIGINT"] as const) process.once(signal, () => void runner.stop());
}
