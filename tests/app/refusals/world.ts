import { createHash } from "node:crypto";
import Database from "better-sqlite3";
import { drizzle } from "drizzle-orm/better-sqlite3";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import * as schema from "@/db/schema";
import { emptyDatabase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

/** Two shops in a database that every check gets a fresh copy of. */
export interface World {
  bytes: Buffer;
  mine: TestShop;
  other: TestShop;
}

export async function makeWorld(): Promise<World> {
  const db = emptyDatabase();
  const mine = await makeShop(db);
  const other = await makeShop(db);
  return { bytes: db.$client.serialize(), mine, other };
}

/** A copy of the world's database, for one check. */
export function copyOf(world: World): Db {
  const client = new Database(world.bytes);
  client.pragma("foreign_keys = ON");
  return drizzle(client, { schema });
}

/** The database to the last byte: a refused call leaves no trace. */
export const fingerprint = (db: Db) => createHash("sha256").update(db.$client.serialize()).digest("hex");

/** What the mocked session and client hand out. */
export const now: { db: Db | null; member: SignedIn | null } = { db: null, member: null };

export function currentDb(): Db {
  if (!now.db) throw new Error("The check has no database yet.");
  return now.db;
}
