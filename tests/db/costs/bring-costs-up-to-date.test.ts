import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import Database from "better-sqlite3";
import { asc, eq } from "drizzle-orm";
import { drizzle } from "drizzle-orm/better-sqlite3";
import { migrate } from "drizzle-orm/better-sqlite3/migrator";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { bringCostsUpToDate } from "@/db/changes/bring-costs-up-to-date";
import { openDatabase, type Db } from "@/db/open";
import { listEstimatePairs } from "@/db/queries/estimate-record";
import { getStripTableAt } from "@/db/queries/strip-table";
import { caseCosts, cases, shops, stripRows } from "@/db/schema";
import { COST_MODEL } from "@/lib/costs/cost-model";
import { DISSOLVING_ROWS, POLISHING_ROW } from "@/lib/costs/strip-method-rows";
import { closeSound } from "@/tests/fixtures/closed-case";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { confirmFor, makeCase, makeShop } from "@/tests/fixtures/shop-factory";

const MIGRATIONS = path.resolve("db/migrations");
/** The last migration of the first release: it knew neither a shop's own strips nor the minutes of a figure. */
const FIRST_RELEASE = 4;
const LATER = TEST_NOW + 30 * 86_400_000;
let home: string;

beforeEach(() => {
  home = fs.mkdtempSync(path.join(os.tmpdir(), "coppertell-costs-"));
});
afterEach(() => fs.rmSync(home, { recursive: true }));

/** The migrations of the first release alone. */
function firstMigrations(): string {
  const folder = path.join(home, "migrations");
  fs.cpSync(MIGRATIONS, folder, { recursive: true });
  const file = path.join(folder, "meta/_journal.json");
  const journal = JSON.parse(fs.readFileSync(file, "utf8")) as { entries: { idx: number }[] };
  journal.entries = journal.entries.filter((entry) => entry.idx <= FIRST_RELEASE);
  fs.writeFileSync(file, JSON.stringify(journal));
  return folder;
}

const tablesOf = (client: Database.Database, of = "main") =>
  client
    .prepare(
      `select name from ${of}.sqlite_master where type = 'table' and name not like 'sqlite_%'
        and name not like 'case_search%' and name not like 'case_words%' and name not like '__drizzle%'`,
    )
    .pluck()
    .all() as string[];
const columnsOf = (client: Database.Database, table: string) =>
  (client.prepare(`pragma table_xinfo("${table}")`).all() as { name: string; hidden: number }[])
    .filter((column) => column.hidden === 0)
    .map((column) => `"${column.name}"`);

/** Two shops at work, then all of it put into a database as the first release had it. */
async function oldDatabase(): Promise<{ file: string; columns: Map<string, string> }> {
  const now = path.join(home, "now.db");
  const db = openDatabase(now);
  const shop = await makeShop(db);
  closeSound(db, shop, 20);
  makeCase(db, shop, { stageFound: "after-final-plate" });
  confirmFor(db, shop, makeCase(db, shop));
  confirmFor(db, shop, makeCase(db, shop), { disposition: "scrap", why: "eaten away", steps: [] });
  const other = await makeShop(db);
  makeCase(db, other);
  db.$client.close();

  const file = path.join(home, "coppertell.db");
  const old = new Database(file);
  migrate(drizzle(old), { migrationsFolder: firstMigrations() });
  old.pragma("foreign_keys = OFF");
  old.prepare("attach ? as now").run(now);
  const columns = new Map(tablesOf(old).map((table) => [table, columnsOf(old, table).join(", ")]));
  for (const [table, names] of columns)
    old.exec(`insert into "${table}" (${names}) select ${names} from now."${table}"`);
  old.close();
  return { file, columns };
}

/** Every row of every table that the first release had, in the columns that it had. */
function rowsOf(client: Database.Database, columns: Map<string, string>) {
  return new Map(
    [...columns].map(([table, names]) => [
      table,
      client.prepare(`select ${names} from "${table}" order by rowid`).raw().all(),
    ]),
  );
}

const newestFigure = (db: Db, caseId: number) =>
  db.select().from(caseCosts).where(eq(caseCosts.caseId, caseId)).orderBy(asc(caseCosts.id)).all().at(-1);

describe("a database from before the shops had their own strips", () => {
  it("loses nothing, gives each shop its ways from the day it was opened, and prices every case", async () => {
    const { file, columns } = await oldDatabase();
    const raw = new Database(file, { readonly: true });
    expect(tablesOf(raw)).not.toContain("strip_rows");
    const before = rowsOf(raw, columns);
    raw.close();
    expect(before.get("cases")).toHaveLength(5);
    expect(before.get("case_costs")?.length).toBeGreaterThan(5);

    const db = openDatabase(file);
    expect(bringCostsUpToDate(db, LATER)).toEqual({ repriced: 5 });

    const after = rowsOf(db.$client, columns);
    for (const [table, rows] of before) {
      // A figure of a case is added to, never changed; the case's own row shows the newest.
      if (table !== "cases") expect(after.get(table)?.slice(0, rows.length), table).toEqual(rows);
      if (table !== "case_costs") expect(after.get(table), table).toHaveLength(rows.length);
    }
    expect(db.$client.pragma("foreign_key_check")).toEqual([]);
    for (const { id, createdAt, costModel } of db.select().from(shops).all()) {
      const ways = db.select().from(stripRows).where(eq(stripRows.shopId, id)).all();
      expect(ways).toHaveLength(DISSOLVING_ROWS.length + 1);
      expect(new Set(ways.map((way) => way.setAt))).toEqual(new Set([createdAt]));
      expect(getStripTableAt(db, id, createdAt)).toEqual({ dissolving: DISSOLVING_ROWS, polishing: POLISHING_ROW });
      expect(costModel).toBe(COST_MODEL);
    }
    for (const { id, costCents } of db.select().from(cases).all()) {
      const figure = newestFigure(db, id);
      expect(figure).toMatchObject({ meanCents: costCents, at: LATER });
      expect(figure?.minutes).not.toBeNull();
    }
    db.$client.close();
  });

  it("keeps the minutes that its closed cases recorded, and sets them beside this version's estimate", async () => {
    const { file } = await oldDatabase();
    const db = openDatabase(file);
    const closed = db.select().from(cases).where(eq(cases.closing, "sound")).get();
    const was = db
      .select()
      .from(caseCosts)
      .where(eq(caseCosts.caseId, closed?.id ?? 0))
      .all()
      .at(-1);
    bringCostsUpToDate(db, LATER);
    // Two steps of 20 minutes.
    expect(newestFigure(db, closed?.id ?? 0)).toMatchObject({ basis: "recorded", minutes: 40, ratesId: was?.ratesId });
    expect(listEstimatePairs(db, closed?.shopId ?? 0)).toMatchObject([{ ref: closed?.ref, recorded: 40 }]);
    db.$client.close();
  });

  it("is left alone at the next start", async () => {
    const { file, columns } = await oldDatabase();
    const db = openDatabase(file);
    bringCostsUpToDate(db, LATER);
    const once = rowsOf(db.$client, columns);
    expect(bringCostsUpToDate(db, LATER + 1)).toEqual({ repriced: 0 });
    expect(rowsOf(db.$client, columns)).toEqual(once);
    db.$client.close();
  });

  it("goes on where a start was cut short, without pricing a case twice", async () => {
    const { file } = await oldDatabase();
    const db = openDatabase(file);
    // The second shop's case cannot be written: the first shop is done by then.
    const last = db.select({ id: cases.id }).from(cases).orderBy(asc(cases.id)).all().at(-1)?.id ?? 0;
    db.$client.exec(`create trigger power_cut before insert on case_costs when new.case_id = ${last}
      begin select raise(abort, 'power cut'); end`);
    expect(() => bringCostsUpToDate(db, LATER)).toThrow(/power cut/);
    const [first, second] = db.select().from(shops).orderBy(asc(shops.id)).all();
    expect([first?.costModel, second?.costModel]).toEqual([COST_MODEL, 0]);
    db.$client.exec("drop trigger power_cut");
    const figures = db.select().from(caseCosts).all().length;
    // As if the first shop had been cut short after its last case and before it was marked as done.
    db.update(shops)
      .set({ costModel: 0 })
      .where(eq(shops.id, first?.id ?? 0))
      .run();
    expect(bringCostsUpToDate(db, LATER + 1)).toEqual({ repriced: 1 });
    expect(db.select().from(caseCosts).all()).toHaveLength(figures + 1);
    db.$client.close();
  });
});
