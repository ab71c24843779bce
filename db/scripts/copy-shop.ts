import fs from "node:fs";
import path from "node:path";
import Database from "better-sqlite3";
import { databaseFile } from "../open";

interface Places {
  dataDir: string;
  uploadsDir: string;
}

/**
 * Copies the database online and then every photo file that the copy names. Photos are written before their rows and
 * never changed, so files copied after the database are complete.
 * @throws Error when the copy does not pass SQLite's own integrity check
 */
export async function backUp({
  dataDir,
  uploadsDir,
  target,
}: Places & { target: string }): Promise<{ photos: number; missing: number }> {
  fs.mkdirSync(target, { recursive: true });
  const copyFile = path.join(target, "coppertell.db");
  const live = new Database(databaseFile(dataDir), { readonly: true });
  await live.backup(copyFile);
  live.close();

  const copy = new Database(copyFile);
  // One file, no companions: a backup that is carried off must be whole.
  copy.pragma("journal_mode = DELETE");
  const integrity = copy.pragma("integrity_check", { simple: true });
  if (integrity !== "ok")
    throw new Error(`The copy is damaged: ${String(integrity)}. Keep the last good backup and check the disk.`);
  const paths = copy.prepare("select path from photo_sizes").pluck().all() as string[];
  copy.close();

  let missing = 0;
  for (const each of paths) {
    const from = path.join(uploadsDir, each);
    if (!fs.existsSync(from)) missing += 1;
    else copyInto(from, path.join(target, "uploads", each));
  }
  copyUnfinished(uploadsDir, target, paths);
  return { photos: paths.length - missing, missing };
}

/** Accepted photos whose sizes are still being made lie outside `photo_sizes`; they are taken too. */
function copyUnfinished(uploadsDir: string, target: string, known: string[]): void {
  const taken = new Set(known.map((each) => path.normalize(each)));
  for (const each of fs.existsSync(uploadsDir)
    ? fs.readdirSync(uploadsDir, { recursive: true, encoding: "utf8" })
    : []) {
    const from = path.join(uploadsDir, each);
    if (
      taken.has(path.normalize(each)) ||
      each.endsWith(".gitkeep") ||
      !fs.statSync(from, { throwIfNoEntry: false })?.isFile()
    )
      continue;
    copyInto(from, path.join(target, "uploads", each));
  }
}

function copyInto(from: string, to: string): void {
  fs.mkdirSync(path.dirname(to), { recursive: true });
  fs.copyFileSync(from, to);
}

/**
 * Puts a backup in place. Whatever stands there is moved aside, not deleted.
 * @throws Error when the folder holds no sound backup; nothing is moved then
 */
export function restore({ dataDir, uploadsDir, source, now }: Places & { source: string; now: number }): {
  cases: number;
  photos: number;
  aside: string | null;
} {
  const from = path.join(source, "coppertell.db");
  if (!fs.existsSync(from))
    throw new Error(`${source} holds no coppertell.db. Name the folder that npm run backup printed.`);
  const check = new Database(from, { readonly: true });
  const integrity = check.pragma("integrity_check", { simple: true });
  const cases = check.prepare("select count(*) from cases").pluck().get() as number;
  const photos = check.prepare("select count(*) from photo_sizes").pluck().get() as number;
  check.close();
  if (integrity !== "ok")
    throw new Error(`The backup in ${source} is damaged: ${String(integrity)}. Use an older one.`);

  const file = databaseFile(dataDir);
  let aside: string | null = null;
  if (fs.existsSync(file)) {
    aside = path.join(dataDir, `before-restore-${now}`);
    fs.mkdirSync(aside, { recursive: true });
    for (const end of ["", "-wal", "-shm"]) {
      if (fs.existsSync(file + end)) fs.renameSync(file + end, path.join(aside, `coppertell.db${end}`));
    }
  }
  copyInto(from, file);
  const savedPhotos = path.join(source, "uploads");
  if (fs.existsSync(savedPhotos)) fs.cpSync(savedPhotos, uploadsDir, { recursive: true, force: true });
  return { cases, photos, aside };
}
