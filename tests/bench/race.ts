/** Runs before any is timed, so that both sides find code and pages warm. */
const WARM_UP = 10;

/**
 * Times two ways of doing the same, turn by turn, so that whatever else the machine does falls on both.
 * @param runs how often each is timed
 * @returns the medians, ms
 */
export function race(runs: number, ours: () => unknown, bare: () => unknown): { oursMs: number; bareMs: number } {
  const times: [number[], number[]] = [[], []];
  for (let run = -WARM_UP; run < runs; run += 1) {
    for (const [side, task] of [ours, bare].entries()) {
      const start = performance.now();
      task();
      if (run >= 0) times[side]?.push(performance.now() - start);
    }
  }
  return { oursMs: median(times[0]), bareMs: median(times[1]) };
}

function median(values: number[]): number {
  return values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;
}
