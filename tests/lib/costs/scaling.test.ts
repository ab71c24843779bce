import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { BASE_METALS, STAGES_FOUND } from "@/lib/cases/case-words";
import { allowedWays } from "@/lib/costs/allowed-ways";
import { caseCost } from "@/lib/costs/case-cost";
import { sumPert, threePoint } from "@/lib/costs/pert";
import type { ShopRates } from "@/lib/costs/rates";
import type { ReworkInput } from "@/lib/costs/rework-input";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { compareMethods, estimateRework, reworkFigures } from "@/lib/costs/strip-estimate";
import { STRIP_METHODS } from "@/lib/costs/strip-methods";
import { planStrip, SHIPPED_STRIP_TABLE } from "@/lib/costs/strip-plan";
import { splitCents } from "@/lib/money";
import { checkStack, weighStack, type Layer } from "@/lib/plating/deposit-stack";
import { DEPOSIT_METALS } from "@/lib/plating/metals";

// Nothing here is a figure from print: these are the identities that the design states for every estimate.

const figure = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const isStack = (stack: Layer[]) => {
  try {
    checkStack(stack);
    return true;
  } catch {
    return false;
  }
};
/** Every stack that a shop could list: any metals, in an order that holds. */
const anyStack = fc
  .array(fc.record({ metal: fc.constantFrom(...DEPOSIT_METALS), thicknessUm: figure(0.01, 80) }), {
    minLength: 1,
    maxLength: 5,
  })
  .filter(isStack);
const perMetal = (most: number) =>
  fc.record(Object.fromEntries(DEPOSIT_METALS.map((metal) => [metal, figure(0, most)])));
const anyRates: fc.Arbitrary<ShopRates> = fc.record({
  validFromAt: fc.constant(0),
  labourCentsPerHour: figure(0, 20_000),
  lineCentsPerHour: figure(0, 20_000),
  metalCentsPerG: perMetal(20_000),
  recoveryShare: perMetal(1),
  solutionCentsPerL: figure(0, 5000),
  wasteCentsPerL: figure(0, 5000),
  abrasiveCentsPerMinute: figure(0, 100),
});
const anyInput: fc.Arbitrary<ReworkInput> = fc.record({
  quantity: fc.integer({ min: 1, max: 5000 }),
  areaDm2: figure(0.001, 500),
  baseMetal: fc.constantFrom(...BASE_METALS),
  stack: anyStack,
  stageFound: fc.constantFrom(...STAGES_FOUND),
  partValueCents: fc.integer({ min: 0, max: 1_000_000 }),
  rates: anyRates,
});
const lineOf = (input: ReworkInput, key: string) =>
  reworkFigures(input).lines.find((line) => line.key === key)?.meanCents ?? NaN;
const near = (a: number, b: number) => Math.abs(a - b) / Math.max(1, Math.abs(b));

describe("whatever the batch, the stack and the rates", () => {
  it("lines add up to the mean to the cent, the range holds it, nothing is negative or no number", () => {
    fc.assert(
      fc.property(anyInput, (input) => {
        const { meanCents, low90Cents, high90Cents, lines, minutes, tankMinutes, metalWrittenOffG } =
          reworkFigures(input);
        expect(lines.reduce((sum, line) => sum + line.meanCents, 0)).toBe(meanCents);
        for (const cents of [meanCents, low90Cents, high90Cents, ...lines.map((line) => line.meanCents)])
          expect(Number.isSafeInteger(cents) && cents >= 0).toBe(true);
        expect(low90Cents <= meanCents && meanCents <= high90Cents).toBe(true);
        for (const { low, likely, high, mean } of [minutes, tankMinutes]) {
          expect(0 <= low && low <= likely && likely <= high && Number.isFinite(high)).toBe(true);
          expect(mean).toBeCloseTo((low + 4 * likely + high) / 6, 6);
        }
        expect(Number.isFinite(metalWrittenOffG) && metalWrittenOffG >= 0).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  it("at the strike it never costs more than after the final plate, and sent back never less", () => {
    fc.assert(
      fc.property(anyInput, (input) => {
        const [atStrike = NaN, later = NaN, back = NaN] = STAGES_FOUND.map(
          (stageFound) => reworkFigures({ ...input, stageFound }).meanCents,
        );
        expect(atStrike).toBeLessThanOrEqual(later);
        expect(later).toBeLessThanOrEqual(back);
      }),
      { numRuns: 500 },
    );
  });

  it("gives the same figures way by way, one alone, or the cheapest", () => {
    fc.assert(
      fc.property(anyInput, (input) => {
        const options = compareMethods(input).flatMap((option) => (option.allowed ? [option.estimate] : []));
        for (const estimate of options) {
          expect(estimate).toMatchObject(reworkFigures({ ...input, method: estimate.method }));
        }
        const cheapest = Math.min(...options.map((estimate) => estimate.meanCents));
        expect(reworkFigures(input).meanCents).toBe(cheapest);
        expect(estimateRework(input).meanCents).toBe(cheapest);
      }),
    );
  });

  it("remembers for a stack the very ways that its plan allows, thin and thick, in any order of asking", () => {
    fc.assert(
      fc.property(fc.constantFrom(...BASE_METALS), anyStack, figure(0.1, 80), (baseMetal, stack, thicknessUm) => {
        for (const onPart of [stack, stack.map((layer) => ({ ...layer, thicknessUm }))]) {
          const ways = allowedWays(SHIPPED_STRIP_TABLE, baseMetal, onPart);
          for (const method of STRIP_METHODS) {
            const plan = planStrip(method, baseMetal, onPart, SHIPPED_STRIP_TABLE);
            const way = ways.find((each) => each.method === method);
            expect(way?.rows).toEqual(plan.allowed ? plan.steps.map((step) => step.row).toReversed() : undefined);
          }
        }
      }),
    );
  });
});

describe("costs scale as stated", () => {
  it("twice the thickness is twice the metal, written off and put on again, and twice its weight", () => {
    fc.assert(
      fc.property(anyInput, fc.constantFrom(...STRIP_METHODS), (input, method) => {
        // Below the thickest strike both may be polished, so that the way stays the same.
        const stageFound = "after-final-plate" as const;
        const thin = {
          ...input,
          stageFound,
          method,
          stack: input.stack.map((layer) => ({ ...layer, thicknessUm: Math.min(layer.thicknessUm, 2.4) })),
        };
        const ways = allowedWays(SHIPPED_STRIP_TABLE, input.baseMetal, thin.stack);
        fc.pre(ways.some((way) => way.method === method));
        const thick = { ...thin, stack: thin.stack.map((layer) => ({ ...layer, thicknessUm: 2 * layer.thicknessUm })) };
        for (const key of ["metalWrittenOff", "metalAgain"])
          expect(Math.abs(lineOf(thick, key) - 2 * lineOf(thin, key))).toBeLessThanOrEqual(3);
        const [once, twice] = [reworkFigures(thin), reworkFigures(thick)];
        expect(near(twice.metalWrittenOffG, 2 * once.metalWrittenOffG)).toBeLessThan(1e-9);
        // Set-up, handling and the line do not hang on thickness: less than twice in all.
        expect(twice.meanCents).toBeLessThanOrEqual(2 * once.meanCents + 1);
      }),
    );
  });

  it("set-up is paid once a batch; everything else grows with the parts", () => {
    fc.assert(
      fc.property(
        anyInput,
        fc.constantFrom(...STRIP_METHODS),
        fc.integer({ min: 2, max: 9 }),
        (input, method, times) => {
          fc.pre(allowedWays(SHIPPED_STRIP_TABLE, input.baseMetal, input.stack).some((way) => way.method === method));
          const batch = { ...input, stageFound: "after-final-plate" as const, method };
          const [one, many] = [reworkFigures(batch), reworkFigures({ ...batch, quantity: input.quantity * times })];
          // Hands-on: times as much, less the set-ups that fall away. 5, 10, 20 / 10, 20, 40 / 15, 30, 60 minutes, PERT means.
          const setUp = { "polish-back": 65 / 6, chemical: 130 / 6, electrolytic: 195 / 6 }[method];
          expect(near(many.minutes.mean, times * one.minutes.mean - (times - 1) * setUp)).toBeLessThan(1e-9);
          expect(near(many.tankMinutes.mean, times * one.tankMinutes.mean)).toBeLessThan(1e-9);
          expect(near(many.metalWrittenOffG, times * one.metalWrittenOffG)).toBeLessThan(1e-9);
          for (const { key, meanCents } of one.lines) {
            const grown = many.lines.find((line) => line.key === key)?.meanCents ?? NaN;
            if (key === "labour") expect(grown).toBeLessThanOrEqual(times * meanCents + times + 1);
            else expect(Math.abs(grown - times * meanCents)).toBeLessThanOrEqual(times + 1);
          }
        },
      ),
    );
  });

  it("twice the parts of half the area weigh the same and hold as much metal, and only the handling grows", () => {
    fc.assert(
      fc.property(anyInput, (input) => {
        const whole = { ...input, method: "polish-back" as const, partValueCents: 0 };
        const halved = { ...whole, quantity: 2 * input.quantity, areaDm2: input.areaDm2 / 2 };
        for (const key of ["line", "metalWrittenOff", "metalAgain", "chemistry", "waste"])
          expect(Math.abs(lineOf(halved, key) - lineOf(whole, key))).toBeLessThanOrEqual(1);
        expect(lineOf(halved, "labour")).toBeGreaterThanOrEqual(lineOf(whole, "labour") - 1);
      }),
    );
  });

  it("polished back, all of the metal that lay on the parts is written off", () => {
    fc.assert(
      fc.property(anyInput, (input) => {
        const polished = reworkFigures({ ...input, stageFound: "after-final-plate", method: "polish-back" });
        const { totalG } = weighStack(input.stack, input.areaDm2, input.quantity);
        expect(near(polished.metalWrittenOffG, totalG)).toBeLessThan(1e-9);
      }),
    );
  });
});

describe("parts and the whole", () => {
  it("the order in which independent figures are added does not matter", () => {
    const anyFigure = fc
      .tuple(figure(0, 1e6), figure(0, 1e6), figure(0, 1e6))
      .map((ends) => ends.toSorted((a, b) => a - b))
      .map(([low = 0, likely = 0, high = 0]) => threePoint(low, likely, high));
    fc.assert(
      fc.property(fc.array(anyFigure, { minLength: 1, maxLength: 10 }), (figures) => {
        const [there, back] = [sumPert(figures), sumPert(figures.toReversed())];
        for (const key of ["mean", "standardDeviation", "low90", "high90"] as const)
          expect(near(there[key], back[key])).toBeLessThan(1e-9);
      }),
    );
  });

  it("a case of several rounds costs them all, and its lines still add up", () => {
    fc.assert(
      fc.property(anyInput, fc.integer({ min: 1, max: 20 }), (input, rounds) => {
        const facts = { ...input, partValueCents: input.partValueCents ?? null };
        const [one, all] = [caseCost(facts), caseCost({ ...facts, rounds })];
        expect(all.meanCents).toBe(rounds * one.meanCents);
        expect(all.lines.map((line) => line.meanCents)).toEqual(one.lines.map((line) => rounds * line.meanCents));
        expect(all.lines.reduce((sum, line) => sum + line.meanCents, 0)).toBe(all.meanCents);
        expect(all.low90Cents <= all.meanCents && all.meanCents <= all.high90Cents).toBe(true);
      }),
    );
  });

  it("cents split over lines add up to the rounded sum, each less than a cent from its own", () => {
    fc.assert(
      fc.property(fc.array(figure(0, 1e9), { maxLength: 20 }), (exact) => {
        const cents = splitCents(exact);
        expect(cents.reduce((sum, each) => sum + each, 0)).toBe(Math.round(exact.reduce((sum, each) => sum + each, 0)));
        cents.forEach((each, index) => expect(Math.abs(each - (exact[index] ?? NaN))).toBeLessThan(1 + 1e-6));
      }),
    );
  });
});

describe("rates are checked when they are first used", () => {
  it("and a wrong one is refused by name each time, not only the first", () => {
    const input: ReworkInput = {
      ...{ quantity: 2, areaDm2: 1, baseMetal: "brass", stageFound: "after-final-plate" },
      stack: [{ metal: "Ni", thicknessUm: 5 }],
      rates: { ...STARTING_RATES, wasteCentsPerL: -1 },
    };
    for (let time = 0; time < 2; time += 1)
      expect(() => reworkFigures(input)).toThrow(expect.objectContaining({ field: "wasteCentsPerL" }));
  });
});
