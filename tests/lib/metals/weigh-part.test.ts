import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/input-error";
import { measureDensity, type Weighing } from "@/lib/metals/weigh-part";
import { readTable } from "@/tests/fixtures/reference/read-table";

const EXAMPLES = readTable("hydrostatic_examples.csv");
function example(id: string) {
  const row = EXAMPLES.find((each) => each.id === id);
  if (!row) throw new Error(`There is no example ${id}.`);
  const [weightAirG, weightWaterG, value] = [row.weight_air_g, row.weight_in_fluid_g, row.value].map(Number);
  return { weightAirG: weightAirG ?? NaN, weightWaterG: weightWaterG ?? NaN, value: value ?? NaN };
}

describe("density by weighing in air and in water", () => {
  it("is that of two worked examples with the lift of the air", () => {
    // H1b: the formula on a textbook's readings. H5: a balance maker's density manual, water of 25 °C.
    for (const [id, waterTempC] of [["H1b", 20] as const, ["H5", 25] as const]) {
      const { value, ...weights } = example(id);
      const { densityGPerCm3 } = measureDensity({ ...weights, waterTempC });
      expect(Math.abs(densityGPerCm3 - value), id).toBeLessThan(0.0005);
    }
  });

  it("gives the textbook's coin and stone, which leave the air out", () => {
    // H1: OpenStax College Physics 11.7, coin 10.4 ± 0.05. H2: Wikipedia, Hydrostatic weighing, stone 3.000 ± 0.001.
    // Without air, density over water's is W_air/(W_air − W_water); with air the same holds of densities less the air's.
    const airGPerCm3 = 0.0012;
    for (const [id, within] of [["H1", 0.05] as const, ["H2", 0.001] as const]) {
      const { value, ...weights } = example(id);
      const { densityGPerCm3, waterDensityGPerCm3 } = measureDensity({ ...weights, waterTempC: 20 });
      const timesWater = (densityGPerCm3 - airGPerCm3) / (waterDensityGPerCm3 - airGPerCm3);
      expect(Math.abs(timesWater - value), id).toBeLessThan(within);
    }
  });

  it("does not depend on how heavy the part is", () => {
    const weighing = fc.record({
      weightAirG: fc.double({ min: 50, max: 500, noNaN: true }),
      density: fc.double({ min: 1.5, max: 22, noNaN: true }),
      scale: fc.double({ min: 0.5, max: 100, noNaN: true }),
    });
    fc.assert(
      fc.property(weighing, ({ weightAirG, density, scale }) => {
        const weightWaterG = weightAirG * (1 - 1 / density);
        const one = measureDensity({ weightAirG, weightWaterG, waterTempC: 20 });
        const many = measureDensity({
          weightAirG: weightAirG * scale,
          weightWaterG: weightWaterG * scale,
          waterTempC: 20,
        });
        expect(many.densityGPerCm3 / one.densityGPerCm3).toBeCloseTo(1, 9);
        expect((many.uncertaintyGPerCm3 * scale) / one.uncertaintyGPerCm3).toBeCloseTo(1, 9);
      }),
    );
  });
});

const PART: Weighing = { weightAirG: 100, weightWaterG: 87.2, waterTempC: 25, balanceErrorG: 0.02 };

describe("uncertainty of the density", () => {
  it("is twice the root of the squares of what a balance error does to each reading", () => {
    // Central differences of the density itself, JCGM 100 (GUM) 5.1.2 and 6.2.
    const step = 1e-4;
    const slope = (field: "weightAirG" | "weightWaterG") => {
      const at = (by: number) => measureDensity({ ...PART, [field]: PART[field] + by }).densityGPerCm3;
      return (at(step) - at(-step)) / (2 * step);
    };
    const expected = 2 * Math.hypot(slope("weightAirG") * 0.02, slope("weightWaterG") * 0.02);
    expect(measureDensity(PART).uncertaintyGPerCm3 / expected).toBeCloseTo(1, 5);
  });

  it("holds 95 % of twenty thousand weighings with a balance that errs so", () => {
    const { densityGPerCm3, uncertaintyGPerCm3 } = measureDensity(PART);
    const draw = normalDraws(20_261_203);
    let within = 0;
    for (let time = 0; time < 20_000; time += 1) {
      const weightAirG = PART.weightAirG + 0.02 * draw();
      const weightWaterG = PART.weightWaterG + 0.02 * draw();
      const once = measureDensity({ ...PART, weightAirG, weightWaterG }).densityGPerCm3;
      if (Math.abs(once - densityGPerCm3) <= uncertaintyGPerCm3) within += 1;
    }
    // Two standard deviations of a normal distribution hold 95.45 %; 20,000 draws scatter by 0.15 %.
    expect(within / 20_000).toBeGreaterThan(0.949);
    expect(within / 20_000).toBeLessThan(0.96);
  });

  it("takes a bench balance of 0.01 g where nobody says", () => {
    const { balanceErrorG: _, ...unsaid } = PART;
    expect(measureDensity(unsaid)).toEqual(measureDensity({ ...PART, balanceErrorG: 0.01 }));
  });
});

describe("a weighing that cannot be", () => {
  const refused: [string, Partial<Weighing>, RegExp][] = [
    ["no weight", { weightAirG: 0 }, /^weightAirG: /],
    ["a negative weight", { weightAirG: -5 }, /^weightAirG: /],
    ["no number", { weightAirG: NaN }, /^weightAirG: /],
    ["more than a tonne", { weightAirG: 1e308 }, /^weightAirG: /],
    ["heavier in water", { weightWaterG: 101 }, /^weightWaterG: .*Swap the two, or weigh again\.$/],
    ["the same in water", { weightWaterG: 100 }, /^weightWaterG: .*Swap the two/],
    ["a part that floats", { weightWaterG: -3 }, /^weightWaterG: .*floats/],
    ["nothing in water", { weightWaterG: 0 }, /^weightWaterG: .*floats/],
    ["no number in water", { weightWaterG: NaN }, /^weightWaterG: /],
    ["boiling water", { waterTempC: 100 }, /^waterTempC: /],
    ["a balance without error", { balanceErrorG: 0 }, /^balanceErrorG: /],
    ["a negative error", { balanceErrorG: -0.01 }, /^balanceErrorG: /],
    ["a balance too coarse", { balanceErrorG: 10 }, /^balanceErrorG: .*Weigh a heavier part/],
  ];
  it.each(refused)("is refused, and says what to do: %s", (_, change, words) => {
    expect(() => measureDensity({ ...PART, ...change })).toThrow(InputError);
    expect(() => measureDensity({ ...PART, ...change })).toThrow(words);
  });

  it("is refused or gives finite figures above 0, whatever the numbers", () => {
    const any = fc.double();
    const near = fc.double({ min: 0, max: 1e6 });
    const weighing = fc.record({
      weightAirG: fc.oneof(any, near),
      weightWaterG: fc.oneof(any, near),
      waterTempC: fc.oneof(any, fc.double({ min: 0, max: 40 })),
      balanceErrorG: fc.oneof(any, fc.double({ min: 0, max: 1 })),
    });
    let measured = 0;
    fc.assert(
      fc.property(weighing, (input) => {
        try {
          const { densityGPerCm3, uncertaintyGPerCm3 } = measureDensity(input);
          expect(densityGPerCm3).toBeGreaterThan(0);
          expect(uncertaintyGPerCm3).toBeGreaterThanOrEqual(0);
          expect(Number.isFinite(densityGPerCm3) && Number.isFinite(uncertaintyGPerCm3)).toBe(true);
          measured += 1;
        } catch (error) {
          if (!(error instanceof InputError)) throw error;
        }
      }),
      { numRuns: 2000, seed: 7 },
    );
    expect(measured).toBeGreaterThan(50);
  });
});

/** Normal draws from a seed: a small congruential generator (Numerical Recipes) and Box–Muller. */
function normalDraws(seed: number): () => number {
  let state = seed;
  const uniform = () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return (state + 0.5) / 2 ** 32;
  };
  return () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
}
