import "server-only";
import fs from "node:fs/promises";
import path from "node:path";
import { getPhoto } from "@/db/queries/photos";
import { forgetUnfinishedUploads } from "@/db/queries/uploads";
import type { Db } from "@/db/open";
import { removeFile } from "@/lib/server/storage";

const DAY_MS = 24 * 3_600_000;
/** A file beside its place that nobody has touched for this long is nobody's. */
const IDLE_MS = 10 * 60_000;
const RECEIVED = ".received";
const PART = ".part";

/**
 * Clears what killed processes and lost phones left in the uploads folder. Only files in the making are touched: a
 * stored size never, so that starting with the wrong database loses nothing.
 * @returns how many files went
 */
export async function sweepUploads(db: Db, root: string, now: number): Promise<number> {
  forgetUnfinishedUploads(db, now - DAY_MS);
  let removed = 0;
  for (const entry of await list(root)) {
    if (!entry.isFile() || !isInTheMaking(entry.name)) continue;
    const file = path.join(entry.parentPath, entry.name);
    if (!(await isLeftOver(db, root, file, now))) continue;
    await removeFile(file);
    removed++;
  }
  return removed;
}

function isInTheMaking(name: string): boolean {
  return name.endsWith(PART) || name.endsWith(RECEIVED) || name.includes(`${PART}.`);
}

async function isLeftOver(db: Db, root: string, file: string, now: number): Promise<boolean> {
  const [folder, ...rest] = path.relative(root, file).split(path.sep);
  const idleMs = await fs.stat(file).then(
    (stat) => now - stat.mtimeMs,
    () => 0,
  );
  // An upload may go on for a day.
  if (folder === "incoming") return idleMs > DAY_MS;
  const name = rest.at(-1) ?? "";
  if (!name.endsWith(RECEIVED)) return idleMs > IDLE_MS;
  const photo = getPhoto(db, Number(folder), name.slice(0, -RECEIVED.length));
  return photo ? photo.state === "ready" || photo.state === "refused" : idleMs > DAY_MS;
}

async function list(root: string) {
  return fs.readdir(root, { recursive: true, withFileTypes: true }).catch(() => []);
}
