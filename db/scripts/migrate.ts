/** `npm run db:migrate`: brings the database up to date, as every start of the server does too. */
import { readEnv } from "@/lib/env";
import { bringCostsUpToDate } from "../changes/bring-costs-up-to-date";
import { databaseFile, openDatabase } from "../open";

const file = databaseFile(readEnv().DATA_DIR);
const db = openDatabase(file);
const { repriced } = bringCostsUpToDate(db, Date.now());
db.$client.close();
console.log(`${file} is up to date.${repriced > 0 ? ` ${repriced} cases were priced again.` : ""}`);
