/** `npm run backup [folder]`: a consistent copy of database and photos while the shop works on. */
import { readEnv } from "@/lib/env";
import { backUp } from "./copy-shop";

const target = process.argv[2] ?? `backups/${new Date().toISOString().replace(/[:.]/g, "-")}`;
const env = readEnv();
const made = await backUp({ dataDir: env.DATA_DIR, uploadsDir: env.UPLOADS_DIR, target });
console.log(
  `Backup in ${target}: database checked, ${made.photos} photo files, ${made.missing} that the database names were not there.`,
);
if (made.missing > 0) process.exitCode = 1;
