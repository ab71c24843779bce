import fc from "fast-check";
import { Rating } from "ts-fsrs";
import { describe, expect, it } from "vitest";
import { SURENESS, type Sureness } from "@/lib/cases/case-words";
import { gradeOf, MEMORY_SETTINGS, remember, type JudgedCall, type PhotoMemory } from "@/lib/practice/memory";

const DAY_MS = 86_400_000;
const START = Date.UTC(2026, 11, 1, 9);

const AGAIN: JudgedCall = { isRight: false, sure: 3 };
const HARD: JudgedCall = { isRight: true, sure: 1 };
const GOOD: JudgedCall = { isRight: true, sure: 2 };
const EASY: JudgedCall = { isRight: true, sure: 3 };

/** Calls a photo each time on the day it comes back, and hands over the days in between. */
function intervals(calls: readonly JudgedCall[], settings = MEMORY_SETTINGS): number[] {
  let memory: PhotoMemory | null = null;
  let at = START;
  return calls.map((call) => {
    const next = remember(memory, call, at, settings);
    const days = (next.dueAt - at) / DAY_MS;
    memory = next.memory;
    at = next.dueAt;
    return days;
  });
}

describe("the schedule that is published", () => {
  // open-spaced-repetition/ts-fsrs, packages/fsrs/__tests__/impl/long-term_scheduler.test.ts, tests 1, 2 and 5: whole
  // days, no steps of minutes, with these weights (FSRS-5's).
  const PUBLISHED_WEIGHTS = {
    ...MEMORY_SETTINGS,
    w: [
      0.4197, 1.1869, 3.0412, 15.2441, 7.1434, 0.6477, 1.0007, 0.0674, 1.6597, 0.1712, 1.1178, 2.0225, 0.0904, 0.3025,
      2.1214, 0.2498, 2.9466, 0.4891, 0.6468,
      // What FSRS-6 adds, at the values that make it FSRS-5: no short-term exponent, decay 0.5.
      0, 0.5,
    ],
  };

  it("is kept through six right calls, two misses and the way back", () => {
    const calls = [GOOD, GOOD, GOOD, GOOD, GOOD, GOOD, AGAIN, AGAIN, GOOD, GOOD, GOOD, GOOD, GOOD];
    expect(intervals(calls, PUBLISHED_WEIGHTS)).toEqual([3, 13, 48, 155, 445, 1158, 17, 3, 11, 37, 112, 307, 773]);
  });

  it("is kept from a miss by way of a guess to certainty, twice", () => {
    const calls = [AGAIN, HARD, GOOD, EASY, AGAIN, HARD, GOOD, EASY];
    expect(intervals(calls, PUBLISHED_WEIGHTS)).toEqual([1, 2, 6, 41, 4, 7, 21, 133]);
  });

  it("is kept when it begins with certainty and then falls", () => {
    const calls = [EASY, AGAIN, HARD, GOOD, EASY, AGAIN, HARD, GOOD];
    expect(intervals(calls, PUBLISHED_WEIGHTS)).toEqual([15, 3, 6, 27, 240, 10, 17, 60]);
  });
});

describe("how a call is graded", () => {
  it("is again when wrong however sure, then hard for a guess, good, and easy for certain", () => {
    expect(SURENESS.map((sure) => gradeOf({ isRight: false, sure }))).toEqual([
      Rating.Again,
      Rating.Again,
      Rating.Again,
    ]);
    expect(SURENESS.map((sure) => gradeOf({ isRight: true, sure }))).toEqual([Rating.Hard, Rating.Good, Rating.Easy]);
  });
});

describe("when a photo comes back", () => {
  const callOf = fc.record({ isRight: fc.boolean(), sure: fc.constantFrom<Sureness>(1, 2, 3) });

  it("is a whole number of days later, at least one, and the same every time it is worked out", () => {
    fc.assert(
      fc.property(fc.array(callOf, { minLength: 1, maxLength: 12 }), (calls) => {
        const days = intervals(calls);
        for (const each of days) expect(Number.isInteger(each) && each >= 1).toBe(true);
        expect(intervals(calls)).toEqual(days);
      }),
    );
  });

  it("is never later after a miss than after a right call, and never sooner the surer a right call was", () => {
    fc.assert(
      fc.property(fc.array(callOf, { maxLength: 8 }), (before) => {
        const after = [AGAIN, HARD, GOOD, EASY].map((last) => intervals([...before, last]).at(-1) ?? 0);
        expect(after.toSorted((a, b) => a - b)).toEqual(after);
      }),
    );
  });

  it("is further off each time a photo is called right and fairly sure again", () => {
    const days = intervals([GOOD, GOOD, GOOD, GOOD, GOOD]);
    expect(new Set(days).size).toBe(days.length);
    expect(days.toSorted((a, b) => a - b)).toEqual(days);
  });
});
