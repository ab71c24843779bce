/** `npm run db:migrate`: brings the database up to date, as every start of the server does too. */
import { readEnv } from "@/lib/env";
import { databaseFile, openDatabase } from "../open";

const file = databaseFile(readEnv().DATA_DIR);
openDatabase(file).$client.close();
console.log(`${file} is up to date.`);
