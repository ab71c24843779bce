#!/usr/bin/env node
/** `npm run demo`: from a fresh checkout to a running demo shop. Safe to run again. */
import { spawn } from "node:child_process";
import {
  demandNode,
  installPackages,
  isPortTaken,
  makeSecrets,
  readSecrets,
  run,
  say,
  waitForHealth,
} from "./steps.mjs";

const port = Number(process.env.PORT ?? 3000);

async function demo() {
  demandNode();
  if (isPortTaken(port))
    throw new Error(`Port ${port} is in use. Stop what runs there, or choose another: PORT=3001 npm run demo`);
  installPackages();
  makeSecrets(port);
  // A chosen port goes before the address that .env was made with.
  const origin = process.env.PORT
    ? `http://localhost:${port}`
    : (readSecrets().NEXTAUTH_URL ?? `http://localhost:${port}`);
  const env = { NEXT_TELEMETRY_DISABLED: "1", NEXTAUTH_URL: origin };
  run(
    "Database and the demo shops (photos are rendered here: a minute or two)",
    "node",
    ["--conditions=react-server", "--import", "tsx", "db/scripts/seed.ts", "--demo"],
    env,
  );
  run("Building the app", "node", ["node_modules/next/dist/bin/next", "build"], env);
  say("Starting the server");
  const server = spawn("node", ["node_modules/next/dist/bin/next", "start", "-p", String(port)], {
    stdio: "inherit",
    env: { ...process.env, ...env },
  });
  for (const signal of ["SIGINT", "SIGTERM"]) process.on(signal, () => server.kill("SIGTERM"));
  server.on("exit", (code) => process.exit(code ?? 0));
  await waitForHealth(origin, 60);
  run("Who can sign in", "npx", ["tsx", "db/scripts/print-sign-ins.ts"]);
  console.log(`\nCoppertell runs at ${origin}  (stop it with Ctrl-C)\n`);
}

demo().catch((error) => {
  console.error(`\n✗ ${error.message}`);
  process.exit(1);
});
