/**
 * `npm run db:seed -- --demo` makes the demo shops; `--cases 100000` adds that many bare closed cases to the first one,
 * for measuring. Demo data never goes into a database that holds a real shop.
 */
import { parseArgs } from "node:util";
import { readEnv } from "@/lib/env";
import { seedBulkCases } from "../seed/demo/bulk-cases";
import { seedDemo } from "../seed/demo/seed-demo";
import { databaseFile, openDatabase } from "../open";

const { values } = parseArgs({
  options: {
    demo: { type: "boolean", default: false },
    cases: { type: "string" },
    closed: { type: "string", default: "170" },
    "photo-width": { type: "string", default: "1024" },
  },
});
if (process.env.NODE_ENV === "production")
  throw new Error("Demo data does not go into a production database. Unset NODE_ENV, or set another DATA_DIR.");

const env = readEnv();
const db = openDatabase(databaseFile(env.DATA_DIR));
const say = (words: string) => console.log(`  ${words}`);
if (values.demo || values.cases) {
  await seedDemo(db, {
    now: Date.now(),
    uploads: env.UPLOADS_DIR,
    closed: Number(values.closed),
    photoWidth: Number(values["photo-width"]),
    say,
  });
}
if (values.cases) {
  const added = seedBulkCases(db, Number(values.cases), Date.now());
  say(`${added} bare cases added.`);
}
db.$client.close();
