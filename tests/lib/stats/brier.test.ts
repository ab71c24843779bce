import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { brierScore, brierScoreOverClasses, reliabilityBins } from "@/lib/stats/brier";

// scikit-learn, docstring of brier_score_loss.
const FORECASTS = [
  { probability: 0.1, happened: false },
  { probability: 0.9, happened: true },
  { probability: 0.8, happened: true },
  { probability: 0.3, happened: false },
];

describe("how good the chances were", () => {
  it("scores 0.0375 for the worked example (scikit-learn docstring), and twice that over two classes (Brier 1950)", () => {
    const score = brierScore(FORECASTS);
    expect(score).toMatchObject({ enough: true, cases: 4 });
    expect(score.enough && score.score).toBeCloseTo(0.0375, 12);
    const classes = FORECASTS.map(({ probability, happened }) => ({
      probabilities: { yes: probability, no: 1 - probability },
      truth: happened ? "yes" : "no",
    }));
    const over = brierScoreOverClasses(classes);
    expect(over.enough && over.score).toBeCloseTo(0.075, 12);
  });

  it("counts a truth that was not ranked at all as forecast 0", () => {
    const score = brierScoreOverClasses([{ probabilities: { burning: 1 }, truth: "pitting" }]);
    expect(score.enough && score.score).toBe(2);
  });

  it("has no score without forecasts, and refuses a chance of 140 %", () => {
    expect(brierScore([])).toEqual({ enough: false, have: 0, need: 1 });
    expect(() => brierScore([{ probability: 1.4, happened: true }])).toThrow(
      expect.objectContaining({ field: "forecasts.0.probability" }),
    );
  });
});

describe("the reliability diagram", () => {
  it("of the worked example has one forecast in each of four bins, each wholly true or wholly not, at its own chance", () => {
    const filled = reliabilityBins(FORECASTS).filter((bin) => bin.cases > 0);
    expect(filled.map(({ meanProbability, happenedShare }) => [meanProbability, happenedShare])).toEqual([
      [0.1, 0],
      [0.3, 0],
      [0.8, 1],
      [0.9, 1],
    ]);
    // Murphy 1973: with one forecast a bin the score is the mean squared gap of the bins, here 0.0375.
    const gaps = filled.map((bin) => ((bin.meanProbability ?? NaN) - (bin.happenedShare ?? NaN)) ** 2);
    expect(gaps.reduce((sum, gap) => sum + gap, 0) / 4).toBeCloseTo(0.0375, 12);
  });

  it("puts every forecast into one bin, 1 into the last, and leaves empty bins without a mean", () => {
    const forecast = fc.record({ probability: fc.double({ min: 0, max: 1, noNaN: true }), happened: fc.boolean() });
    fc.assert(
      fc.property(fc.array(forecast, { maxLength: 50 }), fc.integer({ min: 1, max: 20 }), (forecasts, count) => {
        const bins = reliabilityBins(forecasts, count);
        expect(bins).toHaveLength(count);
        expect(bins.reduce((sum, bin) => sum + bin.cases, 0)).toBe(forecasts.length);
        for (const bin of bins) {
          expect(bin.meanProbability === undefined).toBe(bin.cases === 0);
          if (bin.meanProbability !== undefined) {
            expect(bin.meanProbability).toBeGreaterThanOrEqual(bin.from - 1e-9);
            expect(bin.meanProbability).toBeLessThanOrEqual(bin.to + 1e-9);
          }
        }
      }),
    );
    expect(reliabilityBins([{ probability: 1, happened: true }], 5).at(-1)).toMatchObject({
      cases: 1,
      happenedShare: 1,
    });
  });
});
