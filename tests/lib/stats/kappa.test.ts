import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { agreementWord, cohenKappa, confusionMatrix } from "@/lib/stats/kappa";

function defined(result: ReturnType<typeof cohenKappa>) {
  if (!result.defined) throw new Error(`kappa is undefined: ${result.why}`);
  return result;
}

describe("agreement beyond chance", () => {
  it("is 0.40 for 50 grant applications, 20 5 / 10 15 (Wikipedia, Cohen's kappa)", () => {
    const result = defined(
      cohenKappa([
        [20, 5],
        [10, 15],
      ]),
    );
    expect(result.kappa).toBeCloseTo(0.4, 10);
    // Standard error by Fleiss, Cohen and Everitt 1969.
    expect(result.standardError).toBeCloseTo(0.127, 3);
    expect(result.low).toBeCloseTo(0.1511, 3);
    expect(result.high).toBeCloseTo(0.6489, 3);
    expect(result.word).toBe("fair");
  });

  it("is 0.348 for 20 20 / 10 50 (Artstein and Poesio, Computational Linguistics 34, 2008, Table 1)", () => {
    expect(
      defined(
        cohenKappa([
          [20, 20],
          [10, 50],
        ]),
      ).kappa,
    ).toBeCloseTo(0.348, 3);
  });

  // A statistics package's printout, kept in statsmodels' tests of inter-rater agreement.
  const PRINTOUT = [
    [0, 4, 1],
    [0, 8, 0],
    [0, 1, 5],
  ];
  it("is 0.4842 with standard error 0.1380 and interval 0.2137 to 0.7547 (package printout)", () => {
    const result = defined(cohenKappa(PRINTOUT));
    expect(result.kappa).toBeCloseTo(0.4842, 4);
    expect(result.standardError).toBeCloseTo(0.138, 4);
    expect(result.low).toBeCloseTo(0.2137, 4);
    expect(result.high).toBeCloseTo(0.7547, 4);
    expect(result.word).toBe("moderate");
  });

  it("is 0.4701 with standard error 0.1457 when a near miss counts half (same printout, linear weights)", () => {
    const result = defined(cohenKappa(PRINTOUT, "linear"));
    expect(result.kappa).toBeCloseTo(0.4701, 4);
    expect(result.standardError).toBeCloseTo(0.1457, 4);
  });

  it("is undefined, not 1, when both only ever said one class; and without cases", () => {
    expect(
      cohenKappa([
        [4, 0],
        [0, 0],
      ]),
    ).toEqual({ defined: false, cases: 4, why: "one class only" });
    expect(
      cohenKappa([
        [0, 0],
        [0, 0],
      ]),
    ).toEqual({ defined: false, cases: 0, why: "no cases" });
  });

  it("does not care who is first, nor in which order classes are listed, and full agreement is 1", () => {
    const counts = fc.array(fc.array(fc.integer({ min: 0, max: 30 }), { minLength: 3, maxLength: 3 }), {
      minLength: 3,
      maxLength: 3,
    });
    fc.assert(
      fc.property(counts, (table) => {
        const result = cohenKappa(table);
        fc.pre(result.defined);
        const { kappa, standardError } = defined(result);
        expect(Number.isFinite(kappa) && Number.isFinite(standardError)).toBe(true);
        const swapped = table.map((_, i) => table.map((row) => row[i] ?? 0));
        expect(defined(cohenKappa(swapped)).kappa).toBeCloseTo(kappa, 10);
        const turned = [...table].reverse().map((row) => [...row].reverse());
        expect(defined(cohenKappa(turned)).kappa).toBeCloseTo(kappa, 10);
      }),
    );
    expect(
      defined(
        cohenKappa([
          [7, 0],
          [0, 5],
        ]),
      ).kappa,
    ).toBeCloseTo(1, 12);
  });
});

describe("who said what", () => {
  it("counts pairs of calls, first down, second across", () => {
    const pairs = [
      ["burning", "burning"],
      ["burning", "oxidation"],
      ["oxidation", "oxidation"],
    ] as const;
    expect(confusionMatrix(pairs, ["burning", "oxidation"])).toEqual([
      [1, 1],
      [0, 1],
    ]);
    expect(() => confusionMatrix([["burning", "rust"]], ["burning"])).toThrow(/rust/);
  });

  it("uses the words of Landis and Koch (Biometrics 33, 1977, 159)", () => {
    const words = [-0.1, 0.1, 0.3, 0.5, 0.7, 0.9].map(agreementWord);
    expect(words).toEqual(["poor", "slight", "fair", "moderate", "substantial", "almost perfect"]);
    expect(() => agreementWord(Number.NaN)).toThrow(RangeError);
    expect(() => cohenKappa([[1, 2]])).toThrow(expect.objectContaining({ field: "table" }));
    expect(() => cohenKappa([[-1]])).toThrow(expect.objectContaining({ field: "table" }));
  });
});
