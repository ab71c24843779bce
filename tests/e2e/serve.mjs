/** Seeds a small demo shop into a fresh folder and serves the production build from it, for the browser tests. */
import { spawn, spawnSync } from "node:child_process";
import fs from "node:fs";
import path from "node:path";

const { DATA_DIR, PORT } = process.env;
if (!DATA_DIR || !PORT) throw new Error("Started by Playwright, which sets DATA_DIR and PORT.");
fs.rmSync(path.dirname(DATA_DIR), { recursive: true, force: true });

const seed = [
  "--conditions=react-server",
  "--import",
  "tsx",
  "db/scripts/seed.ts",
  "--demo",
  "--closed",
  "24",
  "--photo-width",
  "480",
];
const seeded = spawnSync("node", seed, { stdio: "inherit" });
if (seeded.status !== 0) process.exit(seeded.status ?? 1);

const server = spawn("node", ["node_modules/next/dist/bin/next", "start", "-p", PORT], { stdio: "inherit" });
for (const signal of ["SIGTERM", "SIGINT"]) process.on(signal, () => server.kill("SIGTERM"));
server.on("exit", (code) => process.exit(code ?? 0));
