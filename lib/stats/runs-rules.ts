import { InputError } from "@/lib/input-error";

/** What a rule sees in a row of points. Named by what it sees, not by number. */
export type RunsRule =
  | "one-beyond-limits"
  | "two-of-three-near-limit"
  | "four-of-five-off-centre"
  | "nine-on-one-side"
  | "six-rising-or-falling"
  | "fourteen-up-and-down";

/** A signal: which rule, over which points (first and last index, both included), and what it means in words. */
export interface RunsSignal {
  rule: RunsRule;
  from: number;
  to: number;
  words: string;
}

/** Each rule looks at a window of points and says whether it sees its pattern. Source: Nelson, JQT 16 (1984) 237, from memory. */
const RULES: readonly { rule: RunsRule; length: number; words: string; sees: (z: readonly number[]) => boolean }[] = [
  {
    rule: "one-beyond-limits",
    length: 1,
    words: "One point beyond the limits: look for a cause of its own.",
    sees: (z) => atLeast(z, 1, 3),
  },
  {
    rule: "two-of-three-near-limit",
    length: 3,
    words: "Two of three points close to the same limit.",
    sees: (z) => atLeast(z, 2, 2),
  },
  {
    rule: "four-of-five-off-centre",
    length: 5,
    words: "Four of five points well off the centre on one side.",
    sees: (z) => atLeast(z, 4, 1),
  },
  {
    rule: "nine-on-one-side",
    length: 9,
    words: "Nine points on one side of the centre: the level has moved.",
    sees: (z) => atLeast(z, 9, 0),
  },
  {
    rule: "six-rising-or-falling",
    length: 6,
    words: "Six points rising or falling: something drifts or wears.",
    sees: (z) => steps(z).every((step) => step > 0) || steps(z).every((step) => step < 0),
  },
  {
    rule: "fourteen-up-and-down",
    length: 14,
    words: "Fourteen points up and down by turns: two streams are mixed, two shifts or two tanks.",
    sees: (z) => steps(z).every((step, index, all) => step !== 0 && (index === 0 || step * (all[index - 1] ?? 0) < 0)),
  },
];

/**
 * Signals in a row of points, each given as standard deviations from the centre (`ChartPoint.z`), in order of the point
 * that completes them. A row too short for a rule gives no signal of it. Throws `InputError` for a point that is no number.
 */
export function runsSignals(z: readonly number[]): RunsSignal[] {
  if (z.some((point) => !Number.isFinite(point))) throw new InputError("z", "Every point is a number.");
  const found: RunsSignal[] = [];
  for (let to = 0; to < z.length; to += 1) {
    for (const { rule, length, words, sees } of RULES) {
      const from = to - length + 1;
      if (from >= 0 && sees(z.slice(from, to + 1))) found.push({ rule, from, to, words });
    }
  }
  return found;
}

/** At least `many` of the points, the last among them, lie more than `beyond` off the centre on the last one's side. */
function atLeast(z: readonly number[], many: number, beyond: number): boolean {
  const side = Math.sign(z.at(-1) ?? 0);
  const isOff = (point: number | undefined) => (point ?? 0) * side > beyond;
  return side !== 0 && isOff(z.at(-1)) && z.filter(isOff).length >= many;
}

function steps(z: readonly number[]): number[] {
  return z.slice(1).map((point, index) => point - (z[index] ?? 0));
}
