import type { BuiltServer } from "@/tests/fixtures/built-server";

export interface World {
  server: BuiltServer;
  cookies: { plater: string; senior: string };
  /** A good photo. */
  content: Buffer;
  kills: number;
}

export interface PhaseResult {
  faults: string[];
  /** What happened, for the reader: name → how often. */
  counts: Record<string, number>;
}

/** Kills the server somewhen within a span, and starts it again. @returns the moment that was chosen, ms */
export async function killWithin({ server }: World, spanMs: number): Promise<number> {
  const afterMs = Math.random() * spanMs;
  await new Promise((resolve) => setTimeout(resolve, afterMs));
  await server.kill();
  return afterMs;
}

/** How long a task takes undisturbed, ms: the span within which its kills fall, so that they hit its start, middle and end. */
export async function spanOf(task: () => Promise<unknown>): Promise<number> {
  const start = performance.now();
  await task();
  return performance.now() - start;
}

/** Asks until the answer is there. @throws Error naming what never came */
export async function until<T>(what: string, ask: () => Promise<T | null>, mostMs = 60_000): Promise<T> {
  const end = Date.now() + mostMs;
  for (;;) {
    const answer = await ask();
    if (answer !== null) return answer;
    if (Date.now() > end) throw new Error(`${what} never came`);
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}
