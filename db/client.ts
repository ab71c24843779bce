import "server-only";
import { readEnv } from "@/lib/env";
import { databaseFile, openDatabase, type Db } from "./open";

const holder = globalThis as typeof globalThis & { coppertellDb?: Db };

/** The server's one connection, opened at its first use so that a build never touches a database. */
export function getDb(): Db {
  holder.coppertellDb ??= openDatabase(databaseFile(readEnv().DATA_DIR));
  return holder.coppertellDb;
}
