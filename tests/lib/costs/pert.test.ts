import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { pertMean, pertVariance, sumPert, threePoint } from "@/lib/costs/pert";

describe("figures that nobody knows exactly", () => {
  it("have mean 8.5 and variance 2.25 for 5, 8, 14 (three-point example on schematex.js.org; Malcolm et al. 1959)", () => {
    expect(pertMean(threePoint(5, 8, 14))).toBeCloseTo(8.5, 12);
    expect(pertVariance(threePoint(5, 8, 14))).toBeCloseTo(2.25, 12);
  });

  it("add to mean 17.83 and deviation 1.69 for the four tasks of the same page", () => {
    // Tasks with means 3.1667, 8.5, 4.1667, 2 and deviations 0.5, 1.5, 0.5, 0.3333.
    const tasks = [threePoint(2, 3, 5), threePoint(5, 8, 14), threePoint(3, 4, 6), threePoint(1, 2, 3)];
    const sum = sumPert(tasks);
    expect(sum.mean).toBeCloseTo(17.833, 3);
    expect(sum.standardDeviation).toBeCloseTo(1.6915, 3);
    // 1.645 deviations either side, from the table of the normal distribution.
    expect(sum.low90).toBeCloseTo(17.833 - 1.645 * 1.6915, 2);
    expect(sum.high90).toBeCloseTo(17.833 + 1.645 * 1.6915, 2);
  });

  it("have no spread when there is no doubt: 7, 7, 7", () => {
    expect(sumPert([threePoint(7, 7, 7)])).toEqual({ mean: 7, standardDeviation: 0, low90: 7, high90: 7 });
    expect(sumPert([])).toEqual({ mean: 0, standardDeviation: 0, low90: 0, high90: 0 });
  });

  it("keep their interval around the mean and within what is possible", () => {
    const figure = fc
      .tuple(...[0, 1, 2].map(() => fc.double({ min: 0, max: 1e6, noNaN: true })))
      .map((ends) => ends.sort((a, b) => a - b))
      .map(([low = 0, likely = 0, high = 0]) => threePoint(low, likely, high));
    fc.assert(
      fc.property(fc.array(figure, { minLength: 1, maxLength: 8 }), (figures) => {
        const { mean, low90, high90 } = sumPert(figures);
        expect(low90).toBeLessThanOrEqual(mean);
        expect(high90).toBeGreaterThanOrEqual(mean);
        expect(low90).toBeGreaterThanOrEqual(figures.reduce((sum, one) => sum + one.low, 0) - 1e-6);
        expect(high90).toBeLessThanOrEqual(figures.reduce((sum, one) => sum + one.high, 0) + 1e-6);
      }),
    );
  });

  it("are refused when they do not run upward", () => {
    expect(() => threePoint(3, 2, 4)).toThrow(RangeError);
    expect(() => threePoint(1, Number.NaN, 4)).toThrow(RangeError);
    expect(() => threePoint(1, 2, Infinity)).toThrow(RangeError);
  });
});
