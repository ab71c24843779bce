import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import { databaseFile, openDatabase, type Db } from "@/db/open";
import { seedBulkCases } from "@/db/seed/demo/bulk-cases";
import { seedDemo } from "@/db/seed/demo/seed-demo";

interface BenchDatabase {
  db: Db;
  /** The demo shop that holds the bulk. */
  shopId: number;
  /** Closes the database and removes its folder. */
  remove: () => void;
}

/**
 * A database of its own in the system's temporary folder: the demo shops and many bare closed cases.
 * With BENCH_DATA_DIR set it is kept there and used again, which saves the seeding while a query is being mended.
 */
export async function makeBenchDatabase(cases: number, say: (words: string) => void): Promise<BenchDatabase> {
  const kept = process.env.BENCH_DATA_DIR;
  const folder = kept ?? fs.mkdtempSync(path.join(os.tmpdir(), "coppertell-bench-"));
  const isNew = !fs.existsSync(databaseFile(folder));
  const db = openDatabase(databaseFile(folder));
  const now = Date.now();
  if (isNew) {
    // Nothing here has to survive a power cut, and waiting for the disk at each commit would double the seeding.
    db.$client.pragma("synchronous = OFF");
    say("Seeding the demo shops.");
    const uploads = path.join(folder, "uploads");
    await seedDemo(db, { now, uploads, closed: 20, photoWidth: 320, say: () => undefined });
    say(`Seeding ${cases.toLocaleString("en")} bare cases.`);
    seedBulkCases(db, cases, now);
  }
  const shop = db.$client.prepare("select shop_id as id from cases group by shop_id order by count(*) desc").get();
  const shopId = (shop as { id: number }).id; // a count over a table that was just filled has a first row
  return {
    db,
    shopId,
    remove: () => {
      db.$client.close();
      if (!kept) fs.rmSync(folder, { recursive: true, force: true });
    },
  };
}
