import "server-only";
import fs from "node:fs/promises";
import { getDb } from "@/db/client";
import { countAppliedMigrations, countKnownMigrations } from "@/db/queries/health";
import { countJobs } from "@/db/queries/jobs";
import { uploadsRoot } from "./storage";

/** Below this a shop's photos of a day may no longer fit. */
const LEAST_FREE_BYTES = 1024 ** 3;

interface Health {
  isWell: boolean;
  report: Record<string, unknown>;
}

/** Can the server do its work? Numbers only: nothing here belongs to a shop. */
export async function health(): Promise<Health> {
  try {
    const db = getDb();
    const migrations = { applied: countAppliedMigrations(db), known: countKnownMigrations() };
    const disk = await diskState();
    // More than known: the build is older than the database, which it can still read.
    const isWell = migrations.applied >= migrations.known && !disk.isLow;
    return { isWell, report: { status: isWell ? "ok" : "unwell", migrations, disk, queue: countJobs(db) } };
  } catch (error) {
    console.error("health", error);
    return { isWell: false, report: { status: "unwell" } };
  }
}

async function diskState() {
  const root = uploadsRoot();
  await fs.mkdir(root, { recursive: true });
  const { bavail, bsize } = await fs.statfs(root);
  const freeBytes = bavail * bsize;
  return { freeBytes, isLow: freeBytes < LEAST_FREE_BYTES };
}
