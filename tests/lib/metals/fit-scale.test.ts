import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fitScale, placeWords, type DensityRange } from "@/lib/metals/fit-scale";

const range = (lowGPerCm3: number, highGPerCm3: number): DensityRange => ({ lowGPerCm3, highGPerCm3 });
const anyRange = fc
  .tuple(fc.double({ min: 0.5, max: 22, noNaN: true }), fc.double({ min: 0.001, max: 3, noNaN: true }))
  .map(([low, width]) => range(low, low + width));

describe("the scale that metals are drawn on", () => {
  it("keeps the band and every range within the drawing, heavier to the right", () => {
    fc.assert(
      fc.property(anyRange, fc.array(anyRange, { maxLength: 9 }), (band, ranges) => {
        const { at } = fitScale(band, ranges);
        for (const each of [band, ...ranges]) {
          expect(at(each.lowGPerCm3)).toBeGreaterThanOrEqual(-1e-9);
          expect(at(each.highGPerCm3)).toBeLessThanOrEqual(100 + 1e-9);
          expect(at(each.highGPerCm3)).toBeGreaterThan(at(each.lowGPerCm3));
        }
      }),
    );
  });

  it("leaves each bar's words nearly half of the width on one side: the longest reason must fit a phone", () => {
    fc.assert(
      fc.property(anyRange, fc.array(anyRange, { minLength: 1, maxLength: 9 }), (band, ranges) => {
        const scale = fitScale(band, ranges);
        for (const each of ranges) {
          const { side, gPerCm3 } = placeWords(each, band, scale);
          const at = scale.at(gPerCm3);
          expect(side === "after" ? 100 - at : at).toBeGreaterThan(46.9);
        }
      }),
    );
  });

  it("writes its ticks with as many decimals as tell them apart, each once", () => {
    const { ticks } = fitScale(range(6.4, 6.88), [range(6.5, 6.7), range(8.45, 8.53)]);
    const words = ticks.map((tick) => tick.words);
    expect(words).toEqual(["6.5", "7.0", "7.5", "8.0", "8.5"]);
    expect(new Set(words).size).toBe(words.length);
  });

  it("puts the words of a metal that is too heavy between the band and its bar when the bar stands at the edge", () => {
    const band = range(6.4, 6.88);
    const brass = range(8.45, 8.53);
    const scale = fitScale(band, [range(6.5, 6.7), brass]);
    expect(placeWords(brass, band, scale)).toEqual({ side: "before", gPerCm3: 8.45 });
  });
});
