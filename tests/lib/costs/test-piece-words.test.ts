import { describe, expect, it } from "vitest";
import { readTestPieces, type TypedTestPieces } from "@/lib/costs/test-piece-words";

/** 10 % bad and 90 % wanted takes 22 pieces (success-run theorem, check values of the design). */
const TYPED: TypedTestPieces = {
  badPercent: "10",
  wantedPercent: "90",
  pieceMoney: "0.50",
  faultyRunPercent: "5",
  spoiltRunMoney: "840",
};
const read = (changed: Partial<TypedTestPieces> = {}) => readTestPieces({ ...TYPED, ...changed }, "USD");
const faultsOf = (changed: Partial<TypedTestPieces>) => {
  const reading = read(changed);
  return reading.ok ? {} : reading.faults;
};

describe("test pieces as they are typed", () => {
  it("says how many to strike, the chance, and what they save", () => {
    // By hand: 22 × $0.50 = $11.00; chance 1 − 0.9²² = 0.9015; 0.05 × 0.9015 × $840 = $37.86.
    expect(read()).toEqual({
      ok: true,
      pieces: 22,
      headline: "Strike 22 test pieces first.",
      chance: "22 test pieces: a 90% chance that at least one shows a fault that spoils 10% of the parts.",
      money:
        "They cost $11.00 a run and save $37.86, over all runs, when 5.0% of them start so. That leaves $26.86 a run.",
    });
  });

  it("says when the pieces cost more than they save", () => {
    // 22 × $2.00 = $44.00 against $37.86.
    expect(read({ pieceMoney: "2" })).toMatchObject({
      headline: "22 test pieces would not pay.",
      money: expect.stringContaining("They cost $6.14 a run more than they save."),
    });
  });

  it("takes one piece when every part is spoilt, and a decimal comma", () => {
    expect(read({ badPercent: "100", wantedPercent: "99,5" })).toMatchObject({ pieces: 1 });
  });

  it.each([
    ["badPercent", "0"],
    ["badPercent", "101"],
    ["badPercent", "ten"],
    ["badPercent", ""],
    ["badPercent", "1e308"],
    ["wantedPercent", "100"],
    ["wantedPercent", "0"],
    ["wantedPercent", "-5"],
    ["pieceMoney", "-1"],
    ["pieceMoney", "1,000.00"],
    ["faultyRunPercent", "140"],
    ["spoiltRunMoney", "NaN"],
  ] as const)("refuses %s %j beside its own field, and says what it waits for", (field, text) => {
    expect(Object.keys(faultsOf({ [field]: text }))).toEqual([field]);
    const reading = read({ [field]: text });
    expect(!reading.ok && reading.waitsFor).toMatch(/^Waits for the /);
  });

  it("says that a share too small takes more than a million pieces", () => {
    expect(faultsOf({ badPercent: "0.0001" })).toEqual({ badPercent: expect.stringContaining("million") });
  });
});
