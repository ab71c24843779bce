import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { inspectAdvice } from "@/lib/costs/inspect";

describe("is looking at every strike worth it (Deming, Out of the Crisis, chapter 15: all above k1/k2, none below)", () => {
  it("yes, when bad parts are clearly more common than the break-even: k1 1, k2 50, 3 %", () => {
    const answer = inspectAdvice({ checkCost: 1, missCost: 50, inspected: 10_000, bad: 300 });
    expect(answer).toMatchObject({ breakEvenRate: 0.02, rate: 0.03, advice: "check-all" });
  });

  it("no, when they are clearly rarer: k1 0.25, k2 50, 0.1 %", () => {
    const answer = inspectAdvice({ checkCost: 0.25, missCost: 50, inspected: 10_000, bad: 10 });
    expect(answer).toMatchObject({ breakEvenRate: 0.005, rate: 0.001, advice: "check-none" });
  });

  it("too few runs to say, when the interval spans the break-even: 4 of 200 is .0078 to .0503 (R binom)", () => {
    const answer = inspectAdvice({ checkCost: 1, missCost: 50, inspected: 200, bad: 4 });
    expect(answer.advice).toBe("too-few-runs");
    expect(answer.interval[0]).toBeCloseTo(0.0078044, 6);
    expect(answer.interval[1]).toBeCloseTo(0.0502871, 6);
  });

  it("never, when a check costs as much as a miss", () => {
    expect(inspectAdvice({ checkCost: 5, missCost: 5, inspected: 20, bad: 20 }).advice).toBe("check-none");
    expect(inspectAdvice({ checkCost: 9, missCost: 5, inspected: 0, bad: 0 }).advice).toBe("check-none");
  });

  it("too few runs, and no rate, when nothing was looked at", () => {
    const answer = inspectAdvice({ checkCost: 1, missCost: 50, inspected: 0, bad: 0 });
    expect(answer).toMatchObject({ advice: "too-few-runs", interval: [0, 1] });
    expect("rate" in answer).toBe(false);
  });

  it("says the same in cents and in dollars, and never turns to checking less because more parts were bad", () => {
    const order = { "check-none": 0, "too-few-runs": 1, "check-all": 2 };
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 400 }),
        fc.integer({ min: 0, max: 400 }),
        fc.integer({ min: 1, max: 200 }),
        (inspected, some, checkCost) => {
          const bad = Math.min(some, inspected);
          const answer = inspectAdvice({ checkCost, missCost: 1000, inspected, bad });
          const scaled = inspectAdvice({ checkCost: checkCost * 128, missCost: 128_000, inspected, bad });
          expect(scaled.advice).toBe(answer.advice);
          if (bad < inspected) {
            const more = inspectAdvice({ checkCost, missCost: 1000, inspected, bad: bad + 1 });
            expect(order[more.advice]).toBeGreaterThanOrEqual(order[answer.advice]);
          }
        },
      ),
    );
  });

  it("refuses impossible input by name", () => {
    const good = { checkCost: 1, missCost: 50, inspected: 100, bad: 3 };
    expect(() => inspectAdvice({ ...good, missCost: 0 })).toThrow(expect.objectContaining({ field: "missCost" }));
    expect(() => inspectAdvice({ ...good, checkCost: -1 })).toThrow(expect.objectContaining({ field: "checkCost" }));
    expect(() => inspectAdvice({ ...good, bad: 101 })).toThrow(expect.objectContaining({ field: "bad" }));
    expect(() => inspectAdvice({ ...good, inspected: 1e308 })).toThrow(expect.objectContaining({ field: "inspected" }));
  });
});
