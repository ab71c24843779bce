#!/usr/bin/env node
/** `npm run verify`: everything that must hold before a change lands. Ends with a line "N passed, N failed". */
import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import { spawnSync } from "node:child_process";
import { demandNode, findBrowser, installPackages, say } from "./steps.mjs";

const results = fs.mkdtempSync(path.join(os.tmpdir(), "coppertell-verify-"));
const counts = { passed: 0, failed: 0 };
const began = Date.now();

/** One check that either holds or does not. */
function check(name, command, args, env = {}) {
  say(name);
  const from = Date.now();
  const done = spawnSync(command, args, {
    stdio: "inherit",
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: "1", ...env },
  });
  const holds = done.status === 0;
  console.log(`${holds ? "✓" : "✗"} ${name} (${Math.round((Date.now() - from) / 1000)} s)`);
  return holds;
}

function count(holds) {
  counts[holds ? "passed" : "failed"] += 1;
  return holds;
}

/** Adds a test runner's own counts. A runner that fails without naming a failed test counts as one failure. */
function countTests(holds, file, read) {
  const found = fs.existsSync(file) ? read(JSON.parse(fs.readFileSync(file, "utf8"))) : { passed: 0, failed: 0 };
  counts.passed += found.passed;
  counts.failed += holds ? found.failed : Math.max(1, found.failed);
  if (holds && found.passed === 0) counts.failed += 1;
}

function verify() {
  demandNode();
  installPackages();
  const chromium = findBrowser();
  count(check("Format", "npx", ["prettier", "--check", "--log-level", "warn", "."]));
  count(check("Lint", "npx", ["eslint", ".", "--max-warnings", "0"]));
  // A fresh checkout lacks the declarations that the framework writes for images and routes.
  count(check("Declarations", "node", ["node_modules/next/dist/bin/next", "typegen"]));
  count(check("Types", "npx", ["tsc", "--noEmit"]));
  const unit = path.join(results, "unit.json");
  countTests(
    check("Unit tests", "npx", ["vitest", "run", "--reporter=default", "--reporter=json", `--outputFile.json=${unit}`]),
    unit,
    (report) => ({ passed: report.numPassedTests, failed: report.numFailedTests }),
  );
  if (count(check("Build", "node", ["node_modules/next/dist/bin/next", "build"]))) {
    const e2e = path.join(results, "e2e.json");
    countTests(
      check("Browser tests", "npx", ["playwright", "test"], {
        CHROMIUM_PATH: chromium,
        PLAYWRIGHT_JSON_OUTPUT_NAME: e2e,
      }),
      e2e,
      (report) => ({ passed: report.stats.expected, failed: report.stats.unexpected + report.stats.flaky }),
    );
  }
  console.log(`\nTook ${Math.round((Date.now() - began) / 1000)} s.`);
}

try {
  verify();
} catch (error) {
  console.error(`\n✗ ${error.message}`);
  counts.failed += 1;
}
console.log(`${counts.passed} passed, ${counts.failed} failed`);
process.exit(counts.failed > 0 ? 1 : 0);
