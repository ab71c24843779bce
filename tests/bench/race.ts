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
      const taskMs = timed(task);
      if (run >= 0) times[side]?.push(taskMs);
    }
  }
  return { oursMs: median(times[0]), bareMs: median(times[1]) };
}

/**
 * Times two ways of doing the same to many things, each thing once by either, turn by turn.
 * @returns the medians and the sums over all things, ms
 */
export function raceOver<Thing>(
  things: readonly Thing[],
  ours: (thing: Thing) => unknown,
  bare: (thing: Thing) => unknown,
) {
  for (const thing of things.slice(0, WARM_UP)) {
    ours(thing);
    bare(thing);
  }
  const oursMs: number[] = [];
  const bareMs: number[] = [];
  for (const thing of things) {
    oursMs.push(timed(() => ours(thing)));
    bareMs.push(timed(() => bare(thing)));
  }
  return {
    median: { oursMs: median(oursMs), bareMs: median(bareMs) },
    sum: { oursMs: total(oursMs), bareMs: total(bareMs) },
  };
}

/** How long one run takes, ms. */
export function timed(task: () => unknown): number {
  const start = performance.now();
  task();
  return performance.now() - start;
}

function median(values: number[]): number {
  return values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;
}

function total(values: readonly number[]): number {
  return values.reduce((sum, each) => sum + each, 0);
}
