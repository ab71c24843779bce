import { describe, expect, it } from "vitest";
import { correctionRows, minutesCorrections, NO_CORRECTIONS, type EstimatePair } from "@/lib/costs/estimate-record";

const pairs = (count: number, pair: Partial<EstimatePair>): EstimatePair[] =>
  Array.from({ length: count }, (_, index) => ({
    ref: `CT-2607-${index}`,
    classSlug: "dewetting",
    method: "polish-back",
    estimated: 10,
    recorded: 14,
    ...pair,
  }));

describe("the shop's record", () => {
  it("has a row for each way over all classes, then its classes, the one with the most cases first", () => {
    const rows = correctionRows([
      ...pairs(2, { classSlug: "peeling", method: "electrolytic" }),
      ...pairs(1, { classSlug: "pitting" }),
      ...pairs(9, {}),
    ]);
    expect(rows.map((row) => [row.method, row.classSlug, row.pairs])).toEqual([
      ["polish-back", null, 10],
      ["polish-back", "dewetting", 9],
      ["polish-back", "pitting", 1],
      ["electrolytic", null, 2],
      ["electrolytic", "peeling", 2],
    ]);
    expect(rows[1]).toMatchObject({ estimatedMinutes: 90, recordedMinutes: 126 });
  });

  it("corrects by the class's own record before that of all classes, and by nothing where both are thin", () => {
    const rows = correctionRows([
      ...pairs(8, { classSlug: "dewetting", recorded: 14 }),
      ...pairs(8, { classSlug: "peeling", recorded: 6 }),
      ...pairs(3, { classSlug: "peeling", method: "chemical" }),
    ]);
    // By the rule: 8 pairs go half the way from 1 to 1.4 and to 0.6; all 16 together are right on average.
    expect(minutesCorrections(rows, "dewetting")["polish-back"]).toBeCloseTo(1.2, 9);
    expect(minutesCorrections(rows, "peeling")["polish-back"]).toBeCloseTo(0.8, 9);
    expect(minutesCorrections(rows, "handling")["polish-back"]).toBeCloseTo(1, 9);
    expect(minutesCorrections(rows, null)["polish-back"]).toBeCloseTo(1, 9);
    expect(minutesCorrections(rows, "peeling").chemical).toBe(1);
    expect(minutesCorrections([], "peeling")).toEqual(NO_CORRECTIONS);
  });

  it("never multiplies by more than twenty, whatever was typed into the cards", () => {
    const rows = correctionRows(pairs(1000, { estimated: 1, recorded: 1440 }));
    expect(minutesCorrections(rows, "dewetting")["polish-back"]).toBe(20);
  });
});
