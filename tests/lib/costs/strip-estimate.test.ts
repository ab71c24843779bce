import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { BASE_METALS, STAGES_FOUND } from "@/lib/cases/case-words";
import type { ReworkInput } from "@/lib/costs/rework-input";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { compareAtStrike, compareMethods, estimateRework } from "@/lib/costs/strip-estimate";
import { STRIP_METHODS } from "@/lib/costs/strip-methods";
import type { Layer } from "@/lib/plating/deposit-stack";
import { weighStack } from "@/lib/plating/deposit-stack";

const shells: ReworkInput = {
  quantity: 12,
  areaDm2: 0.62,
  baseMetal: "brass",
  stack: [
    { metal: "Cu", thicknessUm: 1 },
    { metal: "Ni", thicknessUm: 5 },
    { metal: "Au", thicknessUm: 0.8 },
  ],
  stageFound: "after-final-plate",
  partValueCents: 61_000,
  rates: STARTING_RATES,
};

const lineOf = (input: ReworkInput, key: string) => {
  const line = estimateRework(input).lines.find((one) => one.key === key);
  if (!line) throw new Error(`no line ${key}`);
  return line.meanCents;
};

// Orders in which every layer can lie on the one before it.
const anyStack = fc
  .tuple(
    fc.subarray(["Cu", "Ni", "Ag", "Au", "Rh"] as const, { minLength: 1 }),
    fc.array(fc.double({ min: 0.05, max: 40, noNaN: true }), { minLength: 5, maxLength: 5 }),
  )
  .map(([metals, thick]): Layer[] => metals.map((metal, index) => ({ metal, thicknessUm: thick[index] ?? 1 })));
const anyInput = fc.record({
  quantity: fc.integer({ min: 1, max: 500 }),
  areaDm2: fc.double({ min: 0.01, max: 50, noNaN: true }),
  baseMetal: fc.constantFrom(...BASE_METALS),
  stack: anyStack,
  stageFound: fc.constantFrom(...STAGES_FOUND),
  partValueCents: fc.integer({ min: 0, max: 1_000_000 }),
  rates: fc.constant(STARTING_RATES),
});

describe("an estimate adds up", () => {
  it("lines sum to the total to the cent, nothing is negative or broken, the range holds the mean", () => {
    fc.assert(
      fc.property(anyInput, (input) => {
        for (const option of compareMethods(input)) {
          if (!option.allowed) {
            expect(option.why.length).toBeGreaterThan(10);
            continue;
          }
          const { estimate } = option;
          expect(estimate.lines.reduce((sum, line) => sum + line.meanCents, 0)).toBe(estimate.meanCents);
          expect(estimate.lines.every((line) => Number.isSafeInteger(line.meanCents) && line.meanCents >= 0)).toBe(
            true,
          );
          expect(estimate.low90Cents).toBeGreaterThanOrEqual(0);
          expect(estimate.low90Cents).toBeLessThanOrEqual(estimate.meanCents);
          expect(estimate.high90Cents).toBeGreaterThanOrEqual(estimate.meanCents);
          expect(estimate.metalWrittenOffG).toBeGreaterThanOrEqual(0);
          const { low, likely, high, mean } = estimate.minutes;
          expect(low <= likely && likely <= high).toBe(true);
          expect(mean).toBeCloseTo((low + 4 * likely + high) / 6, 6);
          expect(estimate.spread.reduce((sum, part) => sum + part.share, 0)).toBeCloseTo(1, 9);
        }
      }),
      { numRuns: 200 },
    );
  });

  it("labour is hands-on minutes at the labour rate, line time tank minutes at the burden", () => {
    const { minutes, tankMinutes } = estimateRework(shells);
    expect(Math.abs(lineOf(shells, "labour") - (minutes.mean * 5200) / 60)).toBeLessThanOrEqual(1);
    expect(Math.abs(lineOf(shells, "line") - (tankMinutes.mean * 4200) / 60)).toBeLessThanOrEqual(1);
  });

  it("metal again is the whole stack at its price; written off is what does not come back, and polishing brings nothing back", () => {
    // By hand: 1.14992 g gold × 12860, 3.3108 g nickel × 1.8, 0.666624 g copper × 1 = 14794.6 cents; 60 % of the gold returns.
    expect(Math.abs(lineOf(shells, "metalAgain") - 14_795)).toBeLessThanOrEqual(1);
    expect(
      Math.abs(lineOf({ ...shells, method: "electrolytic" }, "metalWrittenOff") - (14_794.6 - 0.6 * 14_788)),
    ).toBeLessThanOrEqual(1.5);
    expect(lineOf({ ...shells, method: "polish-back" }, "metalWrittenOff")).toBe(
      lineOf({ ...shells, method: "polish-back" }, "metalAgain"),
    );
    const polished = estimateRework({ ...shells, method: "polish-back" });
    expect(polished.metalWrittenOffG).toBeCloseTo(weighStack(shells.stack, 0.62, 12).totalG, 9);
  });

  it("chemistry and waste are the litres that the dissolved metal spends", () => {
    const input: ReworkInput = { ...shells, method: "electrolytic" };
    // With no polish and no price for a litre only waste is left: dissolved mass over what a litre holds, mean of its range.
    const rates = { ...STARTING_RATES, abrasiveCentsPerMinute: 0, solutionCentsPerL: 100, wasteCentsPerL: 300 };
    const litres = (1.14992 * (1 / 5 + 4 / 10 + 1 / 20)) / 6 + (3.3108 * (1 / 15 + 4 / 30 + 1 / 60)) / 6;
    expect(Math.abs(lineOf({ ...input, rates }, "waste") - 300 * litres)).toBeLessThanOrEqual(1);
    expect(Math.abs(lineOf({ ...input, rates }, "chemistry") - 100 * litres)).toBeLessThanOrEqual(1);
  });

  it("leaves scrap risk out when no part value is given, and says so", () => {
    const { partValueCents: _, ...unvalued } = shells;
    expect(lineOf(unvalued, "scrapRisk")).toBe(0);
    expect(estimateRework(unvalued).assumed).toHaveLength(1);
    expect(estimateRework(shells).assumed).toEqual([]);
  });
});

describe("costs scale as they should", () => {
  it("each further part costs the same, and set-up is paid once", () => {
    fc.assert(
      fc.property(anyInput, fc.constantFrom(...STRIP_METHODS), (input, method) => {
        const option = (quantity: number) =>
          compareMethods({ ...input, quantity }).find((one) => one.method === method);
        const [one, two, three] = [1, 2, 3].map((times) => option(input.quantity * times));
        fc.pre(Boolean(one?.allowed));
        if (!one?.allowed || !two?.allowed || !three?.allowed)
          throw new Error("whether it is allowed must not hang on the number");
        const first = two.estimate.meanCents - one.estimate.meanCents;
        expect(Math.abs(three.estimate.meanCents - two.estimate.meanCents - first)).toBeLessThanOrEqual(3);
        // Twice the parts cost less than twice as much, by the set-up.
        expect(two.estimate.meanCents).toBeLessThan(2 * one.estimate.meanCents + 2);
        expect(two.estimate.metalWrittenOffG).toBeCloseTo(2 * one.estimate.metalWrittenOffG, 6);
      }),
    );
  });

  it("set-up does not grow with the batch: without hands on parts, metal and value, nothing else is left", () => {
    const bare = {
      ...STARTING_RATES,
      lineCentsPerHour: 0,
      metalCentsPerG: { Cu: 0, Ni: 0, Au: 0 },
      solutionCentsPerL: 0,
      wasteCentsPerL: 0,
      abrasiveCentsPerMinute: 0,
    };
    const tiny: ReworkInput = {
      ...shells,
      quantity: 1,
      areaDm2: 1e-6,
      partValueCents: 0,
      rates: bare,
      method: "polish-back",
    };
    // 5, 10, 20 minutes of set-up (mean 10.83) and for one part 1, 3, 6 of handling and 2, 5, 12 through the line (3.17, 5.67).
    expect(estimateRework(tiny).minutes.mean).toBeCloseTo(10.8333 + 3.1667 + 5.6667, 2);
    expect(estimateRework({ ...tiny, quantity: 11 }).minutes.mean).toBeCloseTo(10.8333 + 11 * (3.1667 + 5.6667), 2);
  });

  it("more area and a thicker deposit never cost less, by the same method", () => {
    fc.assert(
      fc.property(anyInput, fc.double({ min: 1, max: 5, noNaN: true }), (input, factor) => {
        const polish = (changed: Partial<ReworkInput>) =>
          estimateRework({ ...input, ...changed, method: "polish-back" }).meanCents;
        const base = polish({});
        expect(polish({ areaDm2: input.areaDm2 * factor })).toBeGreaterThanOrEqual(base - 1);
        expect(
          polish({ stack: input.stack.map((layer) => ({ ...layer, thicknessUm: layer.thicknessUm * factor })) }),
        ).toBeGreaterThanOrEqual(base - 1);
      }),
    );
  });

  it("rates twice as high make it twice as dear", () => {
    const dear = {
      ...STARTING_RATES,
      labourCentsPerHour: 10_400,
      lineCentsPerHour: 8400,
      solutionCentsPerL: 1220,
      wasteCentsPerL: 760,
      abrasiveCentsPerMinute: 20,
      metalCentsPerG: { Cu: 2, Ni: 3.6, Au: 25_720 },
    };
    const twice = estimateRework({ ...shells, method: "electrolytic", partValueCents: 122_000, rates: dear });
    const once = estimateRework({ ...shells, method: "electrolytic" });
    expect(Math.abs(twice.meanCents - 2 * once.meanCents)).toBeLessThanOrEqual(1);
  });

  it("a shop that takes longer than estimated has its hands-on minutes corrected, and nothing else", () => {
    const once = estimateRework({ ...shells, method: "electrolytic" });
    const slow = estimateRework({ ...shells, method: "electrolytic", minutesCorrection: 1.5 });
    expect(slow.minutes.mean).toBeCloseTo(1.5 * once.minutes.mean, 9);
    const without = (key: string, estimate: typeof once) =>
      estimate.lines.filter((line) => line.key !== key).reduce((sum, line) => sum + line.meanCents, 0);
    expect(Math.abs(without("labour", slow) - without("labour", once))).toBeLessThanOrEqual(2);
  });
});

describe("the strike check pays", () => {
  it("putting it right at the strike never costs more than later, and metal, chemistry and waste nearly vanish", () => {
    fc.assert(
      fc.property(anyInput, (input) => {
        const { atStrike, later, savedCents, options } = compareAtStrike(input);
        expect(atStrike.meanCents).toBeLessThanOrEqual(later.meanCents);
        expect(savedCents).toBe(later.meanCents - atStrike.meanCents);
        expect(atStrike.metalWrittenOffG).toBeLessThanOrEqual(
          weighStack(input.stack, input.areaDm2, input.quantity).totalG + 1e-9,
        );
        expect(options.map((option) => option.method)).toEqual([...STRIP_METHODS]);
      }),
    );
    const { atStrike, later } = compareAtStrike(shells);
    expect(atStrike.meanCents * 5).toBeLessThan(later.meanCents);
  });

  it("a part sent back costs more still: its return has to be handled", () => {
    const back = estimateRework({ ...shells, stageFound: "returned" });
    const here = estimateRework(shells);
    // 30, 60, 120 minutes, mean 65, once a batch.
    expect(back.minutes.mean - here.minutes.mean).toBeCloseTo(65, 6);
  });
});

describe("what is offered", () => {
  it("takes the cheapest way that does not attack the part, and says why the others are not offered", () => {
    const options = compareMethods(shells);
    const chemical = options.find((option) => option.method === "chemical");
    expect(chemical).toMatchObject({ allowed: false, why: expect.stringMatching(/attacks brass/) });
    expect(chemical).not.toHaveProperty("estimate");
    const costs = options.flatMap((option) => (option.allowed ? [option.estimate.meanCents] : []));
    expect(estimateRework(shells).meanCents).toBe(Math.min(...costs));
  });

  it("refuses to price a method that attacks the part", () => {
    expect(() => estimateRework({ ...shells, method: "chemical" })).toThrow(
      expect.objectContaining({ field: "method", problem: expect.stringMatching(/attacks brass/) }),
    );
  });

  it("names what widens the range: scrap risk, for dear parts; a doubtful thickness of gold, for cheap ones", () => {
    expect(estimateRework(shells).widest[0]).toBe("Scrap risk");
    const doubtful: ReworkInput = {
      ...shells,
      partValueCents: 0,
      areaDm2: 20,
      stack: [
        ...shells.stack.slice(0, 2),
        { metal: "Au", thicknessUm: 0.8, thicknessLowUm: 0.1, thicknessHighUm: 2.5 },
      ],
    };
    const estimate = estimateRework(doubtful);
    expect(estimate.widest[0]).toMatch(/^Thickness of the gold/);
    const sure = estimateRework({
      ...doubtful,
      stack: doubtful.stack.map(({ metal, thicknessUm }) => ({
        metal,
        thicknessUm: metal === "Au" ? (0.1 + 4 * 0.8 + 2.5) / 6 : thicknessUm,
      })),
    });
    expect(Math.abs(estimate.meanCents - sure.meanCents)).toBeLessThanOrEqual(1);
    expect(estimate.high90Cents - estimate.low90Cents).toBeGreaterThan(sure.high90Cents - sure.low90Cents);
  });
});

describe("impossible input is refused by name", () => {
  const cases: [string, Partial<ReworkInput>][] = [
    ["quantity", { quantity: 0 }],
    ["quantity", { quantity: 2.5 }],
    ["quantity", { quantity: 1e308 }],
    ["areaDm2", { areaDm2: -1 }],
    ["areaDm2", { areaDm2: 1e308 }],
    ["areaDm2", { areaDm2: Number.NaN }],
    ["stack", { stack: [] }],
    [
      "stack",
      {
        stack: [
          { metal: "Au", thicknessUm: 1 },
          { metal: "Cu", thicknessUm: 1 },
        ],
      },
    ],
    ["stack.0.thicknessUm", { stack: [{ metal: "Ni", thicknessUm: 1e308 }] }],
    ["partValueCents", { partValueCents: -5 }],
    ["minutesCorrection", { minutesCorrection: 0 }],
    ["labourCentsPerHour", { rates: { ...STARTING_RATES, labourCentsPerHour: -1 } }],
    ["metalCentsPerG.Au", { rates: { ...STARTING_RATES, metalCentsPerG: { Cu: 1, Ni: 2 } } }],
    ["recoveryShare.Au", { rates: { ...STARTING_RATES, recoveryShare: { Au: 2 } } }],
    [
      "quantity",
      {
        quantity: 100_000,
        areaDm2: 10_000,
        stack: [{ metal: "Au", thicknessUm: 1000 }],
        rates: { ...STARTING_RATES, metalCentsPerG: { Au: 1e9 } },
      },
    ],
  ];
  it.each(cases)("%s", (field, changed) => {
    expect(() => estimateRework({ ...shells, ...changed })).toThrow(expect.objectContaining({ field }));
  });

  it("unknown words for base metal, stage and method", () => {
    // @ts-expect-error what a body could hold
    expect(() => estimateRework({ ...shells, baseMetal: "wood" })).toThrow(
      expect.objectContaining({ field: "baseMetal" }),
    );
    // @ts-expect-error what a body could hold
    expect(() => estimateRework({ ...shells, stageFound: "later" })).toThrow(
      expect.objectContaining({ field: "stageFound" }),
    );
    // @ts-expect-error what a body could hold
    expect(() => estimateRework({ ...shells, method: "magic" })).toThrow(expect.objectContaining({ field: "method" }));
  });
});
