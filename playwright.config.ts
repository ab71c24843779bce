import fs from "node:fs";
import { defineConfig, devices } from "@playwright/test";
import { e2eEnvironment, E2E_ORIGIN, E2E_PORT } from "./tests/e2e/environment";

const debian = "/usr/bin/chromium";
const executablePath = process.env.CHROMIUM_PATH || (fs.existsSync(debian) ? debian : undefined);

/** The browser tests run against the production build, with a database and an uploads folder of their own. */
export default defineConfig({
  testDir: "tests/e2e",
  outputDir: "test-results",
  timeout: 90_000,
  expect: { timeout: 15_000 },
  fullyParallel: false,
  workers: 1,
  forbidOnly: true,
  retries: 0,
  reporter: [["list"], ["json", { outputFile: process.env.PLAYWRIGHT_JSON_OUTPUT_NAME ?? "test-results/report.json" }]],
  use: {
    baseURL: E2E_ORIGIN,
    trace: "retain-on-failure",
    launchOptions: {
      ...(executablePath ? { executablePath } : {}),
      chromiumSandbox: false,
      args: ["--disable-background-networking", "--disable-component-update", "--disable-sync", "--no-first-run"],
    },
  },
  projects: [
    {
      name: "phone",
      use: { ...devices["Pixel 7"], viewport: { width: 360, height: 780 }, channel: undefined },
      testIgnore: /desk\./,
    },
    { name: "desk", use: { viewport: { width: 1440, height: 900 } }, testMatch: /(desk|both)\./ },
  ],
  webServer: {
    command: "node tests/e2e/serve.mjs",
    url: `${E2E_ORIGIN}/api/health`,
    timeout: 180_000,
    // While a test is being written: serve once with `node tests/e2e/serve.mjs`, then E2E_REUSE=1.
    reuseExistingServer: process.env.E2E_REUSE === "1",
    gracefulShutdown: { signal: "SIGTERM", timeout: 5_000 },
    env: e2eEnvironment(E2E_PORT),
  },
});
