import { execSync, spawnSync } from "node:child_process";
import { createHash, randomBytes } from "node:crypto";
import fs from "node:fs";

/** Steps that the demo and the verification share. Plain JavaScript: they run before anything is installed. */

export function say(words) {
  console.log(`\n▸ ${words}`);
}

/** Runs a command and shows its output. @throws Error naming the step when it fails */
export function run(step, command, args, env = {}) {
  say(step);
  const done = spawnSync(command, args, { stdio: "inherit", env: { ...process.env, ...env } });
  if (done.status !== 0) throw new Error(`${step}: failed (${command} ${args.join(" ")}).`);
}

export function demandNode() {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major < 20 || (major === 20 && minor < 9) || major > 22) {
    throw new Error(
      `Coppertell runs on Node.js 20.9 to 22; this is ${process.versions.node}. Install Node.js 20 and run this again.`,
    );
  }
}

const STAMP = "node_modules/.coppertell-lock";

/** Installs the packages of the lock file, unless they are in place already. */
export function installPackages() {
  const lock = createHash("sha256").update(fs.readFileSync("package-lock.json")).digest("hex");
  if (fs.existsSync(STAMP) && fs.readFileSync(STAMP, "utf8") === lock) {
    say("Packages are in place.");
    return;
  }
  run("Installing packages (about two minutes, one of them is compiled)", "npm", ["ci", "--no-audit", "--no-fund"]);
  fs.writeFileSync(STAMP, lock);
}

/** Makes `.env` with fresh secrets, unless there is one. What stands in it is never changed. */
export function makeSecrets(port) {
  if (fs.existsSync(".env")) {
    say("Secrets: .env is in place.");
    return;
  }
  say("Making secrets in .env");
  const origin = `http://localhost:${port}`;
  fs.writeFileSync(
    ".env",
    Object.entries(localEnvironment(origin))
      .map(([name, value]) => `${name}=${value}\n`)
      .join(""),
    { mode: 0o600 },
  );
}

/** All that a local installation needs to be told: without further variables uploads and mail stay on this machine. */
export function localEnvironment(origin) {
  return { NEXTAUTH_URL: origin, NEXTAUTH_SECRET: randomBytes(32).toString("hex") };
}

/** The variables of `.env`, as a program that does not read it needs them. */
export function readSecrets() {
  const lines = fs.existsSync(".env") ? fs.readFileSync(".env", "utf8").split("\n") : [];
  return Object.fromEntries(
    lines
      .filter((line) => line.includes("="))
      .map((line) => [line.slice(0, line.indexOf("=")), line.slice(line.indexOf("=") + 1)]),
  );
}

const BROWSERS = [
  process.env.CHROMIUM_PATH,
  "/usr/bin/chromium",
  "/usr/bin/chromium-browser",
  "/usr/bin/google-chrome",
];

/** Finds a Chromium, or installs one. @returns its path, or "" for Playwright's own */
export function findBrowser() {
  const found = () => BROWSERS.find((path) => path && fs.existsSync(path));
  if (found()) {
    say(`Browser: ${found()}`);
    return found();
  }
  if (process.getuid?.() === 0 && fs.existsSync("/usr/bin/apt-get")) {
    run("Looking up Debian's packages", "apt-get", ["update", "-qq"]);
    run("Installing Chromium", "apt-get", ["install", "-y", "-qq", "--no-install-recommends", "chromium"], {
      DEBIAN_FRONTEND: "noninteractive",
    });
    if (found()) return found();
  }
  run("Installing Playwright's Chromium", "npx", ["playwright", "install", "chromium"]);
  return "";
}

/** Whether something answers at this address already. */
export function isPortTaken(port) {
  try {
    execSync(
      `node -e "require('net').connect(${port},'127.0.0.1').on('connect',()=>process.exit(0)).on('error',()=>process.exit(1))"`,
      { stdio: "ignore" },
    );
    return true;
  } catch {
    return false;
  }
}

/** Waits until the server answers its health route. @throws Error after `seconds` */
export async function waitForHealth(origin, seconds) {
  const until = Date.now() + seconds * 1000;
  while (Date.now() < until) {
    const answer = await fetch(`${origin}/api/health`).catch(() => null);
    if (answer?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 300));
  }
  throw new Error(`The server did not answer at ${origin} within ${seconds} seconds.`);
}
