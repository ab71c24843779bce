import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { chanceToShow, piecesForChance, testPieceSaving } from "@/lib/costs/test-pieces";

describe("test pieces before a run (success-run theorem, n = ln(1 - C)/ln R)", () => {
  it("takes 59 pieces to see 5 % bad with 95 %, and 22 to see 10 % with 90 %", () => {
    expect(piecesForChance(0.05, 0.95)).toBe(59);
    expect(piecesForChance(0.1, 0.9)).toBe(22);
  });

  it("59 good pieces leave less than 5 % that a share of 5 % hid; 58 do not", () => {
    expect(chanceToShow(0.05, 59)).toBeGreaterThanOrEqual(0.95);
    expect(chanceToShow(0.05, 58)).toBeLessThan(0.95);
  });

  it("does not ask a piece more because of rounding: half bad, 75 % takes two", () => {
    expect(piecesForChance(0.5, 0.75)).toBe(2);
    expect(piecesForChance(1, 0.99)).toBe(1);
  });

  it("keeps to the rule of three for rare faults: 0 of 100 bounds the share at 0.0295 (Hanley and Lippman-Hand 1983)", () => {
    expect(chanceToShow(0.0295, 100)).toBeCloseTo(0.95, 3);
    expect(chanceToShow(0.1926, 14)).toBeCloseTo(0.95, 3);
  });

  it("needs just as many pieces as reach the chance, and one fewer does not", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.001, max: 0.99, noNaN: true }),
        fc.double({ min: 0.01, max: 0.999, noNaN: true }),
        (share, chance) => {
          const pieces = piecesForChance(share, chance);
          expect(chanceToShow(share, pieces)).toBeGreaterThanOrEqual(chance - 1e-9);
          if (pieces > 1) expect(chanceToShow(share, pieces - 1)).toBeLessThan(chance);
        },
      ),
    );
  });

  it("shows nothing with no pieces or nothing bad", () => {
    expect(chanceToShow(0, 50)).toBe(0);
    expect(chanceToShow(0.3, 0)).toBe(0);
    expect(chanceToShow(1, 1)).toBe(1);
  });

  it("saves what a spoilt run costs, as often as it is seen, less the pieces", () => {
    // Half bad, two pieces: seen 3 times in 4. One run in ten faulty, $400 each: 0.1 × 0.75 × 400 = $30, less 2 × $5.
    const saving = testPieceSaving({
      badShare: 0.5,
      pieces: 2,
      pieceCents: 500,
      faultyRunShare: 0.1,
      spoiltRunCents: 40_000,
    });
    expect(saving).toEqual({ chance: 0.75, piecesCents: 1000, savedCents: 3000, netCents: 2000 });
  });

  it("refuses impossible input by name", () => {
    expect(() => chanceToShow(1.2, 3)).toThrow(expect.objectContaining({ field: "badShare" }));
    expect(() => chanceToShow(0.2, 3.5)).toThrow(expect.objectContaining({ field: "pieces" }));
    expect(() => piecesForChance(0, 0.9)).toThrow(expect.objectContaining({ field: "badShare" }));
    expect(() => piecesForChance(0.1, 1)).toThrow(expect.objectContaining({ field: "wantedChance" }));
    expect(() => piecesForChance(1e-300, 0.9)).toThrow(expect.objectContaining({ field: "badShare" }));
  });
});
