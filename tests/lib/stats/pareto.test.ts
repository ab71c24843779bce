import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { OTHER, pareto } from "@/lib/stats/pareto";

describe("the causes that cost most, first", () => {
  it("run up to 31.33, 58, 80, 91, 100 % (qcc reference manual, paretoChart)", () => {
    const bars = pareto([
      { key: "price code", amount: 80 },
      { key: "schedule date", amount: 27 },
      { key: "supplier code", amount: 66 },
      { key: "contact num.", amount: 94 },
      { key: "part num.", amount: 33 },
    ]);
    expect(bars.map((bar) => bar.key)).toEqual([
      "contact num.",
      "price code",
      "supplier code",
      "part num.",
      "schedule date",
    ]);
    expect(bars.map((bar) => bar.cumulative)).toEqual([94, 174, 240, 273, 300]);
    expect(bars.map((bar) => Number((bar.cumulativeShare * 100).toFixed(2)))).toEqual([31.33, 58, 80, 91, 100]);
  });

  it("keep their order when they cost the same, and 'other' stands last however tall", () => {
    const bars = pareto([
      { key: OTHER, amount: 99 },
      { key: "rinse", amount: 5 },
      { key: "activator", amount: 5 },
      { key: "voltage", amount: 9 },
    ]);
    expect(bars.map((bar) => bar.key)).toEqual(["voltage", "rinse", "activator", OTHER]);
  });

  it("gather in 'other' what is beyond the bars asked for, and lose nothing", () => {
    const amounts = fc.array(
      fc.record({ key: fc.string({ minLength: 1 }), amount: fc.integer({ min: 0, max: 1e6 }) }),
      { maxLength: 20 },
    );
    fc.assert(
      fc.property(amounts, fc.integer({ min: 1, max: 10 }), (list, most) => {
        const bars = pareto(list, most);
        const total = list.reduce((sum, bar) => sum + bar.amount, 0);
        expect(bars.reduce((sum, bar) => sum + bar.amount, 0)).toBe(total);
        expect(bars.length).toBeLessThanOrEqual(most + 1);
        expect(bars.every((bar) => Number.isFinite(bar.cumulativeShare) && bar.cumulativeShare <= 1 + 1e-12)).toBe(
          true,
        );
      }),
    );
  });

  it("are none when there is nothing, share nothing when all is free, and are refused below nothing", () => {
    expect(pareto([])).toEqual([]);
    expect(pareto([{ key: "rinse", amount: 0 }])[0]).toMatchObject({ share: 0, cumulativeShare: 0 });
    expect(() => pareto([{ key: "rinse", amount: -1 }])).toThrow(RangeError);
  });
});
