import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { centsForMinutes, formatMoney, splitCents } from "@/lib/money";

describe("a bill adds up", () => {
  it("gives lines that sum to the rounded total, each within a cent of its exact amount", () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 1e9, noNaN: true }), { maxLength: 12 }), (exact) => {
        const cents = splitCents(exact);
        const total = exact.reduce((sum, amount) => sum + amount, 0);
        expect(cents.reduce((sum, amount) => sum + amount, 0)).toBe(Math.round(total));
        cents.forEach((amount, index) => {
          expect(Number.isInteger(amount)).toBe(true);
          expect(Math.abs(amount - (exact[index] ?? 0))).toBeLessThanOrEqual(1);
        });
      }),
    );
  });

  it("shares three thirds of 1 as one cent, to the earliest", () => {
    expect(splitCents([1 / 3, 1 / 3, 1 / 3])).toEqual([1, 0, 0]);
    expect(splitCents([])).toEqual([]);
  });

  it("refuses money below nothing, broken or beyond counting", () => {
    for (const bad of [-1, Number.NaN, Infinity, 1e300]) expect(() => splitCents([bad])).toThrow(RangeError);
  });
});

describe("money as people read it", () => {
  it("is written with its currency, whole in headlines", () => {
    expect(formatMoney(177517, "USD")).toBe("$1,775.17");
    expect(formatMoney(177517, "USD", { whole: true })).toBe("$1,775");
    expect(() => formatMoney(0.5, "USD")).toThrow(RangeError);
  });

  it("gives 79 minutes at $52 an hour as $68.47", () => {
    expect(Math.round(centsForMinutes(79, 5200))).toBe(6847);
  });
});
