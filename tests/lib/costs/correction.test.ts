import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { correctionFrom } from "@/lib/costs/correction";

const pairs = (count: number, estimated: number, recorded: number) =>
  Array.from({ length: count }, () => ({ estimated, recorded }));

describe("the estimate against what was recorded", () => {
  it("says nothing below 8 pairs", () => {
    expect(correctionFrom(pairs(7, 10, 20))).toEqual({ enough: false, have: 7, need: 8 });
  });

  it("goes half the way with 8 pairs, and nearly all of it with 800: by the rule, pairs / (pairs + 8)", () => {
    expect(correctionFrom(pairs(8, 10, 14))).toMatchObject({ enough: true, rawRatio: 1.4, ratio: 1.2 });
    const many = correctionFrom(pairs(800, 10, 14));
    expect(many.enough && many.ratio).toBeCloseTo(1.396, 3);
  });

  it("lies between 1 and the raw ratio, and estimates that were right stay as they are", () => {
    const pair = fc.record({
      estimated: fc.double({ min: 0.1, max: 1e5, noNaN: true }),
      recorded: fc.double({ min: 0, max: 1e5, noNaN: true }),
    });
    fc.assert(
      fc.property(fc.array(pair, { minLength: 8, maxLength: 40 }), (list) => {
        const result = correctionFrom(list);
        if (!result.enough) throw new Error("8 pairs are enough");
        expect(result.ratio).toBeGreaterThanOrEqual(Math.min(1, result.rawRatio) - 1e-9);
        expect(result.ratio).toBeLessThanOrEqual(Math.max(1, result.rawRatio) + 1e-9);
      }),
    );
    expect(correctionFrom(pairs(20, 33, 33))).toMatchObject({ ratio: 1 });
  });

  it("refuses impossible pairs by name", () => {
    expect(() => correctionFrom(pairs(8, 0, 3))).toThrow(expect.objectContaining({ field: "pairs.0.estimated" }));
    expect(() => correctionFrom(pairs(8, 3, -1))).toThrow(expect.objectContaining({ field: "pairs.0.recorded" }));
  });
});
