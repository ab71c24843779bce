import os from "node:os";
import path from "node:path";

export const E2E_PORT = 3207;
export const E2E_ORIGIN = `http://localhost:${E2E_PORT}`;
/** Outside the folder that Playwright empties before each run. */
export const E2E_HOME = path.join(os.tmpdir(), "coppertell-browser-tests");
export const E2E_DATA = path.join(E2E_HOME, "data");
export const E2E_UPLOADS = path.join(E2E_HOME, "uploads");

/** What the server under test is told: everything local, a database and an uploads folder of its own. */
export function e2eEnvironment(port: number): Record<string, string> {
  return {
    PORT: String(port),
    NEXTAUTH_URL: `http://localhost:${port}`,
    NEXTAUTH_SECRET: "only for the browser tests, not a secret",
    DATA_DIR: E2E_DATA,
    UPLOADS_DIR: E2E_UPLOADS,
    COPPERTELL_GALLERY: "1",
    NEXT_TELEMETRY_DISABLED: "1",
    UPLOADTHING_TOKEN: "",
    UPLOADTHING_INGEST_URL: "",
    SMTP_URL: "",
  };
}
