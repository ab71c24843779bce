import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { pChart, type Sample } from "@/lib/stats/p-chart";
import { runsSignals } from "@/lib/stats/runs-rules";
import { uChart } from "@/lib/stats/u-chart";
import { referenceRows } from "@/tests/fixtures/reference-rows";

function drawn<Chart extends { enough: boolean }>(chart: Chart) {
  if (!chart.enough) throw new Error("too few samples");
  return chart as Extract<Chart, { enough: true }>;
}

// NIST/SEMATECH e-Handbook 6.3.3.2: 30 wafers of 50 chips (the same data as Montgomery, Introduction to SQC).
const NIST_BAD = [
  12, 15, 8, 10, 4, 7, 16, 9, 14, 10, 5, 6, 17, 12, 22, 8, 10, 5, 13, 11, 20, 18, 24, 15, 9, 12, 7, 13, 9, 6,
];
const NIST: Sample[] = NIST_BAD.map((bad) => ({ inspected: 50, bad }));

describe("the fault rate chart", () => {
  it("is drawn from the published data, sample for sample (NIST e-Handbook 6.3.3.2)", () => {
    const rows = referenceRows("nist_pchart.csv");
    expect(NIST).toEqual(rows.map((row) => ({ inspected: Number(row.n), bad: Number(row.nonconforming) })));
    const { points } = drawn(pChart(NIST));
    points.forEach((point, index) => expect(point.rate).toBeCloseTo(Number(rows[index]?.fraction), 2));
  });

  it("has centre .2313 and limits .0524 and .4102, with samples 15 and 23 above (NIST e-Handbook 6.3.3.2)", () => {
    const { centre, points } = drawn(pChart(NIST));
    expect(centre).toBeCloseTo(0.2313, 4);
    expect(points[0]?.lower).toBeCloseTo(0.0524, 4);
    expect(points[0]?.upper).toBeCloseTo(0.4102, 4);
    expect(points.flatMap((point, index) => (point.outside === "above" ? [index + 1] : []))).toEqual([15, 23]);
    expect(points.some((point) => point.outside === "below")).toBe(false);
  });

  it("has centre .2150 and limits .0407 and .3893 without those two (Montgomery, revised limits)", () => {
    const { centre, points } = drawn(pChart(NIST.filter((_, index) => index !== 14 && index !== 22)));
    expect(centre).toBeCloseTo(0.215, 4);
    expect(points[0]?.lower).toBeCloseTo(0.0407, 4);
    expect(points[0]?.upper).toBeCloseTo(0.3893, 4);
  });

  it("keeps limits within 0 and 1, wider for a smaller sample, and never breaks", () => {
    const sample = fc
      .tuple(fc.integer({ min: 1, max: 500 }), fc.double({ min: 0, max: 1, noNaN: true }))
      .map(([inspected, part]) => ({ inspected, bad: Math.round(part * inspected) }));
    fc.assert(
      fc.property(fc.array(sample, { minLength: 8, maxLength: 40 }), (samples) => {
        const { points } = drawn(pChart(samples));
        for (const point of points) {
          expect(point.lower).toBeGreaterThanOrEqual(0);
          expect(point.upper).toBeLessThanOrEqual(1);
          expect(Number.isFinite(point.z)).toBe(true);
        }
        points.forEach((a, i) =>
          points.forEach((b, j) => {
            if ((samples[i]?.inspected ?? 0) < (samples[j]?.inspected ?? 0))
              expect(a.upper).toBeGreaterThanOrEqual(b.upper);
          }),
        );
      }),
      { numRuns: 50 },
    );
  });

  it("says how many samples it lacks, and refuses impossible ones by name", () => {
    expect(pChart(NIST.slice(0, 3))).toEqual({ enough: false, have: 3, need: 8 });
    expect(() => pChart([{ inspected: 0, bad: 0 }])).toThrow(expect.objectContaining({ field: "samples.0.inspected" }));
    expect(() => pChart([{ inspected: 5, bad: 6 }])).toThrow(expect.objectContaining({ field: "samples.0.bad" }));
  });
});

describe("the chart of faults per unit", () => {
  // Montgomery, dyed cloth: faults, units; limits of samples 1, 2 and 10.
  const CLOTH = [
    [14, 10],
    [12, 8],
    [20, 13],
    [11, 10],
    [7, 9.5],
    [10, 10],
    [21, 12],
    [16, 10.5],
    [19, 12],
    [23, 12.5],
  ].map(([faults = 0, units = 0]) => ({ faults, units }));

  it("has centre 1.4233 and limits that step with the sample (Montgomery, dyed cloth)", () => {
    const { centre, points } = drawn(uChart(CLOTH));
    expect(centre).toBeCloseTo(1.4233, 4);
    expect([points[0]?.lower, points[0]?.upper].map((limit) => limit?.toFixed(4))).toEqual(["0.2915", "2.5550"]);
    expect([points[1]?.lower, points[1]?.upper].map((limit) => limit?.toFixed(4))).toEqual(["0.1579", "2.6886"]);
    expect([points[9]?.lower, points[9]?.upper].map((limit) => limit?.toFixed(4))).toEqual(["0.4110", "2.4356"]);
    expect(points.every((point) => point.outside === "no")).toBe(true);
  });

  it("has the limits of every one of the ten samples", () => {
    const rows = referenceRows("uchart_dyed_cloth.csv");
    const { points } = drawn(
      uChart(rows.map((row) => ({ faults: Number(row.nonconformities), units: Number(row.units) }))),
    );
    expect(points).toHaveLength(10);
    for (const [index, point] of points.entries()) {
      expect(point.rate).toBeCloseTo(Number(rows[index]?.u), 4);
      expect(point.lower).toBeCloseTo(Number(rows[index]?.lcl), 4);
      expect(point.upper).toBeCloseTo(Number(rows[index]?.ucl), 4);
    }
  });

  it("agrees with the chart of counts for 26 boards samples: 19.85, 6.48 and 33.21, 6 below and 20 above (Montgomery)", () => {
    const boards = [
      21, 24, 16, 12, 15, 5, 28, 20, 31, 25, 20, 24, 16, 19, 10, 17, 13, 22, 18, 39, 30, 24, 16, 19, 17, 15,
    ];
    const { centre, points } = drawn(uChart(boards.map((faults) => ({ faults, units: 1 }))));
    expect(centre).toBeCloseTo(19.846, 3);
    expect(points[0]?.lower).toBeCloseTo(6.481, 3);
    expect(points[0]?.upper).toBeCloseTo(33.211, 3);
    expect(points[5]?.outside).toBe("below");
    expect(points[19]?.outside).toBe("above");
  });
});

describe("runs that mean something", () => {
  // Rules of Nelson, JQT 16 (1984) 237; each row is made to show its pattern and no other.
  const rulesIn = (z: readonly number[]) => [...new Set(runsSignals(z).map((signal) => signal.rule))];

  it("sees one point beyond the limits, on either side", () => {
    expect(rulesIn([0.5, -3.1, 0.2])).toEqual(["one-beyond-limits"]);
    expect(rulesIn([0.5, 2.9, -0.2])).toEqual([]);
  });

  it("sees two of three near a limit, four of five off centre, nine on one side", () => {
    expect(rulesIn([2.1, 0.1, 2.2])).toEqual(["two-of-three-near-limit"]);
    expect(rulesIn([2.1, 0.1, -2.2])).toEqual([]);
    expect(rulesIn([1.2, 1.5, -0.1, 1.1, 1.4])).toEqual(["four-of-five-off-centre"]);
    expect(rulesIn([0.1, 0.3, 0.2, 0.5, 0.4, 0.1, 0.6, 0.2, 0.3])).toEqual(["nine-on-one-side"]);
    expect(rulesIn([0.1, 0.3, 0.2, 0.5, 0, 0.1, 0.6, 0.2, 0.3])).toEqual([]);
  });

  it("sees six in a row rising or falling and fourteen up and down", () => {
    expect(rulesIn([-0.5, -0.4, -0.1, 0.2, 0.3, 0.6])).toEqual(["six-rising-or-falling"]);
    expect(rulesIn([0.6, 0.3, 0.2, -0.1, -0.4, -0.5])).toEqual(["six-rising-or-falling"]);
    expect(rulesIn(Array.from({ length: 14 }, (_, index) => (index % 2 ? 0.4 : -0.4)))).toEqual([
      "fourteen-up-and-down",
    ]);
  });

  it("names the points it saw, mirrors up and down, and is silent on a short calm row", () => {
    expect(runsSignals([0, 3.5])).toMatchObject([{ rule: "one-beyond-limits", from: 1, to: 1 }]);
    expect(runsSignals([])).toEqual([]);
    fc.assert(
      fc.property(fc.array(fc.double({ min: -4, max: 4, noNaN: true }), { maxLength: 30 }), (z) => {
        const mirrored = runsSignals(z.map((point) => -point));
        expect(mirrored).toEqual(runsSignals(z));
      }),
    );
    expect(() => runsSignals([Number.NaN])).toThrow(RangeError);
  });
});
