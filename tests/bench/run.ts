import { spawnSync } from "node:child_process";
import fs from "node:fs";
import path from "node:path";

/**
 * Runs every measurement of this folder, one after the other, each in a process of its own. Ends with 1 when any of
 * them is over its limit.
 *   node --conditions=react-server --import tsx tests/bench/run.ts
 */
const folder = import.meta.dirname;
const files = fs
  .readdirSync(folder)
  .filter((file) => file.endsWith(".bench.ts"))
  .sort();

const over: string[] = [];
for (const file of files) {
  console.log(`\n${file}`);
  // Server modules load only under this condition, as they do in the server itself.
  const flags = ["--conditions=react-server", "--import", "tsx"];
  const run = spawnSync(process.execPath, [...flags, path.join(folder, file)], { stdio: "inherit" });
  if (run.status !== 0) over.push(file);
}
console.log(over.length === 0 ? "\nEverything is within its limit." : `\nOver the limit or broken: ${over.join(", ")}`);
process.exit(over.length === 0 ? 0 : 1);
