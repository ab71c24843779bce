import fs from "node:fs";
import path from "node:path";
import Database from "better-sqlite3";
import { drizzle, type BetterSQLite3Database } from "drizzle-orm/better-sqlite3";
import { migrate } from "drizzle-orm/better-sqlite3/migrator";
import * as schema from "./schema";
import { installTriggers } from "./triggers";

export type Db = BetterSQLite3Database<typeof schema> & { $client: Database.Database };
/** What a query takes first: the database, or the transaction it belongs to. */
export type Handle = Pick<Db, "select" | "selectDistinct" | "insert" | "update" | "delete" | "all" | "get" | "run">;

const MIGRATIONS = path.resolve(/*turbopackIgnore: true*/ process.cwd(), "db/migrations");

/**
 * Opens (and makes, if need be) a database, brings it up to date and checks it.
 * What was accepted survives a power cut: WAL with synchronous=FULL.
 * @param file path, or ":memory:"
 * @throws Error when a migration leaves a row that points nowhere; the copy made before it is named in the message
 */
export function openDatabase(file: string, migrationsFolder: string = MIGRATIONS): Db {
  if (file !== ":memory:") fs.mkdirSync(path.dirname(file), { recursive: true });
  const client = new Database(file);
  client.pragma("journal_mode = WAL");
  client.pragma("synchronous = FULL");
  client.pragma("busy_timeout = 5000");
  const db = drizzle(client, { schema });
  migrateSafely(db, file, migrationsFolder);
  client.pragma("foreign_keys = ON");
  return db;
}

/** The database's file name inside the data folder. */
export function databaseFile(dataDir: string): string {
  return path.resolve(/*turbopackIgnore: true*/ dataDir, "coppertell.db");
}

/**
 * Drizzle's migrator runs inside a transaction, where switching foreign keys off does nothing, so a rebuilt parent
 * table would empty its children. They are off before it begins, and checked after.
 */
function migrateSafely(db: Db, file: string, migrationsFolder: string): void {
  const client = db.$client;
  client.pragma("foreign_keys = OFF");
  const copy = copyIfPending(client, file, migrationsFolder);
  migrate(db, { migrationsFolder });
  // A rebuilt table has lost its triggers: they are made again each time.
  installTriggers(client);
  const broken = client.pragma("foreign_key_check") as unknown[];
  if (broken.length > 0) {
    client.close();
    throw new Error(
      `The migration left ${broken.length} rows that point nowhere. The database as it was: ${copy ?? "none"}`,
    );
  }
}

/** A copy beside the file before anything is changed. Null when there is nothing to change or nothing to lose. */
function copyIfPending(client: Database.Database, file: string, migrationsFolder: string): string | null {
  const hasTables = client.prepare("select 1 from sqlite_master where name = '__drizzle_migrations'").get();
  if (!hasTables || file === ":memory:") return null;
  const journal = JSON.parse(fs.readFileSync(path.join(migrationsFolder, "meta/_journal.json"), "utf8")) as {
    entries: { when: number }[];
  };
  const last = client.prepare("select max(created_at) as at from __drizzle_migrations").get() as { at: number | null };
  const newest = Math.max(0, ...journal.entries.map((entry) => entry.when));
  if (newest <= (last.at ?? 0)) return null;
  const copy = `${file}.before-${newest}`;
  fs.rmSync(copy, { force: true });
  client.prepare("vacuum into ?").run(copy);
  return copy;
}
