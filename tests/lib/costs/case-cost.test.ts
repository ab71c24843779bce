import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { BASE_METALS, CLOSINGS, STAGES_FOUND } from "@/lib/cases/case-words";
import { caseCost, moneyAtRisk, type CaseCostInput } from "@/lib/costs/case-cost";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { estimateRework } from "@/lib/costs/strip-estimate";

const held: CaseCostInput = {
  quantity: 3,
  areaDm2: 1.2,
  baseMetal: "brass",
  stack: [
    { metal: "Cu", thicknessUm: 0.5 },
    { metal: "Ni", thicknessUm: 5 },
    { metal: "Au", thicknessUm: 0.8 },
  ],
  stageFound: "at-strike",
  partValueCents: 4200,
  rates: STARTING_RATES,
};
const lineOf = (input: CaseCostInput, key: string) =>
  caseCost(input).lines.find((line) => line.key === key)?.meanCents ?? 0;

describe("what a case costs", () => {
  it("is the estimate at its stage while it is open", () => {
    const { areaDm2, stack, partValueCents } = held;
    const estimate = estimateRework({
      ...held,
      areaDm2: areaDm2 ?? 1,
      stack: stack ?? [],
      method: undefined,
      partValueCents: partValueCents ?? 0,
    });
    expect(caseCost(held)).toMatchObject({
      basis: "estimated",
      meanCents: estimate.meanCents,
      low90Cents: estimate.low90Cents,
      high90Cents: estimate.high90Cents,
      assumed: [],
    });
  });

  it("is paid again for every round, and the range widens less than the cost", () => {
    const [one, two] = [caseCost(held), caseCost({ ...held, rounds: 2 })];
    expect(two.meanCents).toBe(2 * one.meanCents);
    expect(two.minutes).toBeCloseTo(2 * one.minutes, 9);
    expect(two.high90Cents - two.meanCents).toBeLessThan(2 * (one.high90Cents - one.meanCents));
    expect(two.high90Cents - two.meanCents).toBeGreaterThan(one.high90Cents - one.meanCents);
  });

  it("takes recorded minutes in place of the estimate: 79 minutes at $52 are $68.47", () => {
    const cost = caseCost({ ...held, closing: "sound", recorded: { minutes: 79 } });
    expect(cost.basis).toBe("recorded");
    expect(cost.minutes).toBe(79);
    expect(cost.lines.find((line) => line.key === "labour")?.meanCents).toBe(6847);
    expect(cost.lines.some((line) => line.key === "scrapRisk")).toBe(false);
    expect(cost.assumed).toHaveLength(1);
  });

  it("has no range left once everything is recorded", () => {
    const cost = caseCost({
      ...held,
      closing: "sound",
      recorded: { minutes: 60, tankMinutes: 30, materialsCents: 715 },
    });
    // 60 min × $52/h + 30 min × $42/h + $7.15
    expect(cost).toMatchObject({ meanCents: 5200 + 2100 + 715, low90Cents: 8015, high90Cents: 8015, assumed: [] });
  });

  it("of scrapped parts is their value and the work that went in", () => {
    const cost = caseCost({ ...held, closing: "scrap", recorded: { minutes: 30 } });
    expect(cost.basis).toBe("scrapped");
    expect(cost.lines.find((line) => line.key === "partsScrapped")?.meanCents).toBe(3 * 4200);
    expect(cost.lines.find((line) => line.key === "labour")?.meanCents).toBe(2600);
    expect(cost.low90Cents).toBe(cost.high90Cents);
    expect(caseCost({ ...held, closing: "scrap", partValueCents: null }).assumed).toHaveLength(1);
  });

  it("of a false alarm, a concession or a regrade is only the minutes recorded", () => {
    for (const closing of ["released", "concession", "regrade"] as const) {
      expect(caseCost({ ...held, closing })).toMatchObject({ basis: "no rework", meanCents: 0, lines: [] });
      expect(caseCost({ ...held, closing, recorded: { minutes: 6 } }).meanCents).toBe(520);
    }
  });

  it("stands on usual values where nobody said, and names each", () => {
    const cost = caseCost({ ...held, areaDm2: null, stack: null, partValueCents: null });
    expect(cost.meanCents).toBeGreaterThan(0);
    expect(cost.assumed).toHaveLength(3);
    const { Au: _, ...withoutGold } = STARTING_RATES.metalCentsPerG;
    const unpriced = caseCost({ ...held, rates: { ...STARTING_RATES, metalCentsPerG: withoutGold } });
    expect(unpriced.assumed.join()).toMatch(/No price set for gold/);
    expect(unpriced.meanCents).toBe(caseCost(held).meanCents);
  });

  it("adds up to the cent, is never negative or broken, however it ended", () => {
    const anyCase = fc.record({
      quantity: fc.integer({ min: 1, max: 200 }),
      areaDm2: fc.option(fc.double({ min: 0.01, max: 50, noNaN: true })),
      baseMetal: fc.constantFrom(...BASE_METALS),
      stack: fc.constantFrom(held.stack, null),
      stageFound: fc.constantFrom(...STAGES_FOUND),
      partValueCents: fc.option(fc.integer({ min: 0, max: 1e6 })),
      rates: fc.constant(STARTING_RATES),
      rounds: fc.integer({ min: 1, max: 4 }),
      closing: fc.option(fc.constantFrom(...CLOSINGS)),
      recorded: fc.option(
        fc.record({
          minutes: fc.double({ min: 0, max: 600, noNaN: true }),
          materialsCents: fc.option(fc.integer({ min: 0, max: 1e5 })),
        }),
      ),
    });
    fc.assert(
      fc.property(anyCase, (input) => {
        const cost = caseCost(input);
        expect(cost.lines.reduce((sum, line) => sum + line.meanCents, 0)).toBe(cost.meanCents);
        for (const figure of [cost.meanCents, cost.low90Cents, cost.high90Cents])
          expect(Number.isSafeInteger(figure) && figure >= 0).toBe(true);
        expect(cost.low90Cents).toBeLessThanOrEqual(cost.meanCents);
        expect(cost.high90Cents).toBeGreaterThanOrEqual(cost.meanCents);
        expect(Number.isFinite(cost.minutes) && Number.isFinite(cost.metalWrittenOffG)).toBe(true);
      }),
    );
  });

  it("refuses recorded minutes below nothing and impossible facts by name", () => {
    expect(() => caseCost({ ...held, recorded: { minutes: -1 } })).toThrow(
      expect.objectContaining({ field: "recorded.minutes" }),
    );
    expect(() => caseCost({ ...held, quantity: 0 })).toThrow(expect.objectContaining({ field: "quantity" }));
    expect(() => caseCost({ ...held, rounds: 0 })).toThrow(expect.objectContaining({ field: "rounds" }));
    expect(() => caseCost({ ...held, method: "chemical", stageFound: "after-final-plate" })).toThrow(
      expect.objectContaining({ field: "method" }),
    );
  });
});

describe("money at risk while a part hangs", () => {
  it("at the strike is what stripping it after the final plate would cost, and more than putting it right now", () => {
    const risk = moneyAtRisk(held);
    const later = caseCost({ ...held, stageFound: "after-final-plate" });
    expect(risk).toMatchObject({
      meanCents: later.meanCents,
      low90Cents: later.low90Cents,
      high90Cents: later.high90Cents,
    });
    expect(risk.rightNowCents).toBe(caseCost(held).meanCents);
    expect(risk.rightNowCents).toBeLessThan(risk.meanCents);
  });

  it("after the final plate is what having it sent back would cost", () => {
    const plated: CaseCostInput = { ...held, stageFound: "after-final-plate" };
    expect(moneyAtRisk(plated).meanCents).toBe(caseCost({ ...held, stageFound: "returned" }).meanCents);
    expect(lineOf({ ...held, stageFound: "returned" }, "labour")).toBeGreaterThan(lineOf(plated, "labour"));
  });
});
