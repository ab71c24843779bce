/** `npm run db:reset`: throws the local database and photos away. Refuses where a real shop works. */
import fs from "node:fs";
import path from "node:path";
import Database from "better-sqlite3";
import { readEnv } from "@/lib/env";
import { databaseFile } from "../open";

const env = readEnv();
const file = databaseFile(env.DATA_DIR);
if (fs.existsSync(file)) {
  const db = new Database(file);
  const hasShops = db.prepare("select 1 from sqlite_master where name = 'shops'").get();
  const real = hasShops ? (db.prepare("select count(*) from shops where is_demo = 0").pluck().get() as number) : 0;
  db.close();
  if (real > 0) throw new Error(`${file} holds a real shop. It is not thrown away; move it by hand if you mean to.`);
}
for (const end of ["", "-wal", "-shm"]) fs.rmSync(file + end, { force: true });
for (const each of fs.existsSync(env.UPLOADS_DIR) ? fs.readdirSync(env.UPLOADS_DIR) : []) {
  if (each !== ".gitkeep") fs.rmSync(path.join(env.UPLOADS_DIR, each), { recursive: true });
}
console.log("Database and photos are gone. npm run demo makes them anew.");
