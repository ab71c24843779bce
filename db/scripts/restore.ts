/** `npm run restore <folder>`: brings a backup back. The server must be stopped; what is there now is kept aside. */
import { readEnv } from "@/lib/env";
import { restore } from "./copy-shop";

const source = process.argv[2];
if (!source) {
  console.error("Name the backup's folder: npm run restore backups/2026-…");
  process.exit(1);
}
const env = readEnv();
const back = restore({ dataDir: env.DATA_DIR, uploadsDir: env.UPLOADS_DIR, source, now: Date.now() });
console.log(
  `Restored ${source}: ${back.cases} cases, ${back.photos} photo files. What was there before: ${back.aside ?? "nothing"}.`,
);
