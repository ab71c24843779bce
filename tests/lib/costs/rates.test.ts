import { describe, expect, it } from "vitest";
import { checkRates, ratesAt } from "@/lib/costs/rates";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { DEPOSIT_METALS } from "@/lib/plating/metals";

const from = (validFromAt: number, labourCentsPerHour: number) => ({
  ...STARTING_RATES,
  validFromAt,
  labourCentsPerHour,
});

describe("rates by date", () => {
  const rows = [from(300, 5600), from(100, 4900), from(200, 5200)];

  it("a case gets the rates of its day, however the rows are listed", () => {
    expect(ratesAt(rows, 250).labourCentsPerHour).toBe(5200);
    expect(ratesAt(rows, 300).labourCentsPerHour).toBe(5600);
    expect(ratesAt(rows, 199).labourCentsPerHour).toBe(4900);
  });

  it("of two rows from the same day the later entered corrects the earlier", () => {
    expect(ratesAt([...rows, from(200, 5300)], 250).labourCentsPerHour).toBe(5300);
  });

  it("a case older than the first rates gets the first, and a shop without rates is told so", () => {
    expect(ratesAt(rows, 1).labourCentsPerHour).toBe(4900);
    expect(() => ratesAt([], 1)).toThrow(expect.objectContaining({ field: "rates" }));
  });

  it("a new shop starts with a price for every metal", () => {
    expect(() => checkRates(STARTING_RATES)).not.toThrow();
    for (const metal of DEPOSIT_METALS) expect(STARTING_RATES.metalCentsPerG[metal]).toBeGreaterThan(0);
  });

  it("refuses a rate below nothing or beyond reason by name", () => {
    expect(() => checkRates({ ...STARTING_RATES, lineCentsPerHour: -1 })).toThrow(
      expect.objectContaining({ field: "lineCentsPerHour" }),
    );
    expect(() => checkRates({ ...STARTING_RATES, wasteCentsPerL: 1e308 })).toThrow(
      expect.objectContaining({ field: "wasteCentsPerL" }),
    );
    expect(() => checkRates({ ...STARTING_RATES, recoveryShare: { Au: 1.2 } })).toThrow(
      expect.objectContaining({ field: "recoveryShare.Au" }),
    );
    expect(() => checkRates({ ...STARTING_RATES, metalCentsPerG: { Au: Number.NaN } })).toThrow(RangeError);
  });
});
