import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ledgerRows, vitalFew } from "@/lib/costs/ledger-view";

const amount = (key: string, costCents: number) => ({ key, label: key, cases: 1, parts: 2, costCents });

describe("the ledger's rows", () => {
  it("run up as in the published Pareto example", () => {
    // 94, 80, 66, 33, 27 run up to 31.33, 58, 80, 91 and 100 %: qcc package manual, paretoChart.
    const { rows, totalCents } = ledgerRows([27, 94, 33, 80, 66].map((cents) => amount(String(cents), cents)));
    expect(totalCents).toBe(300);
    expect(rows.map((row) => Math.round(row.cumulative * 10_000) / 100)).toEqual([31.33, 58, 80, 91, 100]);
    expect(vitalFew(rows)).toBe(3);
  });

  it("add up to the whole to the cent, however many are gathered", () => {
    fc.assert(
      fc.property(fc.array(fc.nat(10_000_000), { maxLength: 40 }), fc.integer({ min: 1, max: 12 }), (cents, most) => {
        const amounts = cents.map((each, index) => amount(`cause-${index}`, each));
        const { rows, totalCents } = ledgerRows(amounts, most);
        expect(rows.reduce((sum, row) => sum + row.cost, 0)).toBe(cents.reduce((sum, each) => sum + each, 0));
        expect(rows.reduce((sum, row) => sum + row.cases, 0)).toBe(cents.length);
        expect(totalCents).toBe(rows.reduce((sum, row) => sum + row.cost, 0));
        expect(rows.length).toBeLessThanOrEqual(most + 1);
      }),
    );
  });

  it("are none for nothing, and hide nothing when all cost nothing", () => {
    expect(ledgerRows([]).rows).toEqual([]);
    expect(ledgerRows([amount("a", 0), amount("b", 0)]).rows.map((row) => row.share)).toEqual([0, 0]);
  });
});
