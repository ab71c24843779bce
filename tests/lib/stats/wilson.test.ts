import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { wilsonInterval } from "@/lib/stats/wilson";

describe("the interval of a share", () => {
  // Newcombe, Statistics in Medicine 17 (1998) 857, Table I, method 3; R package binom, binom.confint wilson.
  const PUBLISHED = [
    [81, 263, 0.2553, 0.3662, 4],
    [0, 20, 0, 0.1611, 4],
    [18, 20, 0.6989664, 0.9721335, 7],
    [4, 200, 0.0078044, 0.0502871, 7],
    [0, 30, 0, 0.1135134, 7],
    [30, 30, 0.8864866, 1, 7],
  ] as const;
  it.each(PUBLISHED)("%i of %i: %f to %f", (count, total, low, high, digits) => {
    const interval = wilsonInterval(count, total);
    expect(interval.low).toBeCloseTo(low, digits);
    expect(interval.high).toBeCloseTo(high, digits);
  });

  it("holds the share seen, stays within 0 and 1, mirrors good and bad, and narrows with more parts", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 5000 }), fc.double({ min: 0, max: 1, noNaN: true }), (total, part) => {
        const count = Math.round(part * total);
        const { low, high } = wilsonInterval(count, total);
        expect(low).toBeGreaterThanOrEqual(0);
        expect(high).toBeLessThanOrEqual(1);
        expect(low).toBeLessThanOrEqual(count / total);
        expect(high).toBeGreaterThanOrEqual(count / total);
        const mirror = wilsonInterval(total - count, total);
        expect(mirror.low).toBeCloseTo(1 - high, 9);
        const more = wilsonInterval(count * 4, total * 4);
        expect(more.high - more.low).toBeLessThan(high - low);
        const surer = wilsonInterval(count, total, "99");
        expect(surer.high - surer.low).toBeGreaterThan(high - low);
      }),
    );
  });

  it("knows nothing without parts, and refuses impossible counts by name", () => {
    expect(wilsonInterval(0, 0)).toEqual({ low: 0, high: 1 });
    expect(() => wilsonInterval(3, 2)).toThrow(expect.objectContaining({ field: "count" }));
    expect(() => wilsonInterval(-1, 2)).toThrow(expect.objectContaining({ field: "count" }));
    expect(() => wilsonInterval(0, 2.5)).toThrow(expect.objectContaining({ field: "total" }));
  });
});
