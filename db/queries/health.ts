import { sql } from "drizzle-orm";
import journal from "../migrations/meta/_journal.json";
import type { Handle } from "../open";

/** Migrations that this database has been through. */
export function countAppliedMigrations(db: Handle): number {
  return db.get<{ n: number }>(sql`select count(*) as n from __drizzle_migrations`).n;
}

/** Migrations that this build knows of. */
export function countKnownMigrations(): number {
  return journal.entries.length;
}
