/** Called once by the framework when a server starts, before its first request. A build calls it too: it starts nothing. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME === "nodejs" && process.env.NEXT_PHASE !== "phase-production-build") {
    const { startUp } = await import("./lib/server/start-up");
    await startUp();
  }
}
