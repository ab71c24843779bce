import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import Database from "better-sqlite3";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { openDatabase } from "@/db/open";
import { makeCase, makeShop } from "@/tests/fixtures/shop-factory";

const MIGRATIONS = path.resolve("db/migrations");
let home: string;

beforeEach(() => {
  home = fs.mkdtempSync(path.join(os.tmpdir(), "coppertell-migrations-"));
});
afterEach(() => fs.rmSync(home, { recursive: true }));

interface Journal {
  entries: { idx: number; when: number; tag: string; version: string; breakpoints: boolean }[];
}
const readJournal = (folder: string) =>
  JSON.parse(fs.readFileSync(path.join(folder, "meta/_journal.json"), "utf8")) as Journal;

/** The project's migrations, and after them one more. */
function withOneMore(sql: string): string {
  const folder = path.join(home, "migrations");
  fs.cpSync(MIGRATIONS, folder, { recursive: true });
  const journal = readJournal(folder);
  const last = journal.entries.at(-1);
  if (!last) throw new Error("There are no migrations.");
  const tag = `${String(last.idx + 1).padStart(4, "0")}_one-more`;
  journal.entries.push({ ...last, idx: last.idx + 1, when: last.when + 1000, tag });
  fs.writeFileSync(path.join(folder, "meta/_journal.json"), JSON.stringify(journal));
  fs.writeFileSync(path.join(folder, `${tag}.sql`), sql);
  return folder;
}

/** Rows of every table of the shop, by table. */
function countRows(file: string): Record<string, number> {
  const db = new Database(file, { readonly: true });
  const tables = db
    .prepare(
      "select name from sqlite_master where type = 'table' and name not like 'sqlite_%' and name not like '%case_search%' and name not like 'case_words%' and name not like '__drizzle%'",
    )
    .pluck()
    .all() as string[];
  const counts = Object.fromEntries(
    tables.map((table) => [table, db.prepare(`select count(*) from "${table}"`).pluck().get() as number]),
  );
  db.close();
  return counts;
}

/** What drizzle-kit writes when a column's default changes: a new table, the rows moved over, the old one dropped. */
function rebuild(file: string, table: string): string {
  const db = new Database(file, { readonly: true });
  const create = db
    .prepare("select sql from sqlite_master where type = 'table' and name = ?")
    .pluck()
    .get(table) as string;
  const indexes = db
    .prepare("select sql from sqlite_master where type = 'index' and tbl_name = ? and sql is not null")
    .pluck()
    .all(table) as string[];
  db.close();
  return [
    "PRAGMA foreign_keys=OFF",
    create.replace(/CREATE TABLE [`"]?\w+[`"]?/, `CREATE TABLE \`__new_${table}\``),
    `INSERT INTO \`__new_${table}\` SELECT * FROM \`${table}\``,
    `DROP TABLE \`${table}\``,
    `ALTER TABLE \`__new_${table}\` RENAME TO \`${table}\``,
    "PRAGMA foreign_keys=ON",
    ...indexes,
  ].join(";\n--> statement-breakpoint\n");
}

async function shopFile(): Promise<string> {
  const file = path.join(home, "coppertell.db");
  const db = openDatabase(file);
  const shop = await makeShop(db);
  for (let index = 0; index < 5; index += 1) makeCase(db, shop, { note: `case ${index}` });
  db.$client.close();
  return file;
}

describe("a migration on a database that holds data", () => {
  it("rebuilds the table of cases and loses no row of any table, no trigger and no search word", async () => {
    const file = await shopFile();
    const before = countRows(file);
    expect(before.cases).toBe(5);
    expect(before.calls).toBe(5);

    const db = openDatabase(file, withOneMore(rebuild(file, "cases")));
    expect(countRows(file)).toEqual(before);
    expect(db.$client.pragma("foreign_key_check")).toEqual([]);
    expect(() => db.$client.exec("delete from calls")).toThrow(/append-only/);
    expect(
      db.$client.prepare("select count(*) from case_search where case_search match 'notes:case'").pluck().get(),
    ).toBe(5);
    db.$client.close();
  });

  it("makes its triggers again when it rebuilt the table that had them", async () => {
    const file = await shopFile();
    const db = openDatabase(file, withOneMore(rebuild(file, "calls")));
    expect(db.$client.prepare("select count(*) from calls").pluck().get()).toBe(5);
    expect(() => db.$client.exec("update calls set sure = 1")).toThrow(/append-only/);
    db.$client.close();
  });

  it("keeps a copy from before, and refuses to go on with rows that point nowhere", async () => {
    const file = await shopFile();
    const before = countRows(file);
    const broken = withOneMore("DELETE FROM `work_orders`");
    expect(() => openDatabase(file, broken)).toThrow(/point nowhere.*before-/s);
    const copy = fs.readdirSync(home).find((name) => name.includes(".before-"));
    expect(copy).toBeDefined();
    expect(countRows(path.join(home, copy ?? ""))).toEqual(before);
  });

  it("only ever adds to what earlier versions did", () => {
    const { entries } = readJournal(MIGRATIONS);
    expect(entries.map((entry) => entry.idx)).toEqual(entries.map((_, index) => index));
    for (const { tag } of entries)
      expect(fs.readFileSync(path.join(MIGRATIONS, `${tag}.sql`), "utf8")).not.toMatch(
        /\b(DROP COLUMN|DELETE FROM)\b/i,
      );
  });
});

describe("what was accepted", () => {
  it("survives a power cut: the journal is written through at every commit", () => {
    const db = openDatabase(path.join(home, "coppertell.db"));
    // SQLite's own words: 2 is FULL.
    expect(db.$client.pragma("synchronous", { simple: true })).toBe(2);
    expect(db.$client.pragma("journal_mode", { simple: true })).toBe("wal");
    expect(db.$client.pragma("foreign_keys", { simple: true })).toBe(1);
    expect(db.$client.pragma("busy_timeout", { simple: true })).toBe(5000);
    db.$client.close();
  });
});
