import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { NO_CORRECTIONS } from "@/lib/costs/estimate-record";
import { fieldText, RATE_FIELDS, type RateFigures } from "@/lib/costs/rate-fields";
import { previewRates, type PreviewStage, type RatesExample } from "@/lib/costs/rates-preview";
import {
  namedChanges,
  previewHeadline,
  ratesLead,
  shortDayWords,
  startDayWords,
  waitWords,
} from "@/lib/costs/rates-preview-words";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { SHIPPED_STRIP_TABLE } from "@/lib/costs/strip-plan";
import { readRates } from "@/lib/costs/typed-rates";

const { validFromAt: _start, ...HELD } = STARTING_RATES;
/** Twelve gold-plated brass shells of 0.9 dm², found after the final plate. */
const SHELLS: RatesExample = {
  quantity: 12,
  areaDm2: 0.9,
  baseMetal: "brass",
  stack: [
    { metal: "Cu", thicknessUm: 0.5 },
    { metal: "Ni", thicknessUm: 5 },
    { metal: "Au", thicknessUm: 0.8 },
  ],
  partValueCents: 3800,
  stageFound: "after-final-plate",
  method: "polish-back",
  minutesCorrection: NO_CORRECTIONS,
};
const preview = (then: RateFigures, example = SHELLS) => previewRates(example, SHIPPED_STRIP_TABLE, HELD, then);
const lineOf = (stage: PreviewStage, key: string) => stage.lines.find((line) => line.key === key);
const moreOf = (stage: PreviewStage, key: string) => {
  const line = lineOf(stage, key);
  return line ? line.thenCents - line.nowCents : 0;
};

describe("what rates do to a rework before they are saved", () => {
  it("an hour from $52 to $56 makes labour dearer by 4/52 and touches nothing else but the price of a check", () => {
    const { later, atStrike, check } = preview({ ...HELD, labourCentsPerHour: 5600 });
    for (const stage of [later, atStrike]) {
      const labour = lineOf(stage, "labour");
      expect((labour?.thenCents ?? 0) / (labour?.nowCents ?? 1)).toBeCloseTo(56 / 52, 2);
      for (const key of ["line", "metalWrittenOff", "metalAgain", "chemistry", "waste", "scrapRisk"])
        expect(moreOf(stage, key), key).toBe(0);
    }
    // 30 s of $4 an hour more: 3.33 cents.
    expect(check.thenCents - check.nowCents).toBeCloseTo(10 / 3, 6);
  });

  it("gold from $128.60 to $134.00 a gram: 1.67 g on 12 shells is $9.00 more to put on again, and as much written off", () => {
    // 19.3 g/cm³ × 0.00008 cm × 1,080 cm² = 1.6675 g; × $5.40 = $9.00. Polished back, so nothing is recovered.
    const { later, atStrike } = preview({ ...HELD, metalCentsPerG: { ...HELD.metalCentsPerG, Au: 13_400 } });
    expect(Math.abs(moreOf(later, "metalAgain") - 900)).toBeLessThanOrEqual(3);
    expect(Math.abs(moreOf(later, "metalWrittenOff") - 900)).toBeLessThanOrEqual(3);
    // No gold lies on a part at the strike.
    expect(atStrike.then.meanCents).toBe(atStrike.now.meanCents);
  });

  it("puts the break-even at a check over what going on costs more", () => {
    const { later, atStrike, check, breakEven } = preview({ ...HELD, labourCentsPerHour: 5600 });
    const more = (now: "now" | "then") => (later[now].meanCents - atStrike[now].meanCents) / 12;
    expect(breakEven?.now).toBeCloseTo(check.nowCents / more("now"), 12);
    expect(breakEven?.then).toBeCloseTo(check.thenCents / more("then"), 12);
  });

  it("keeps the lines adding up to the cent, whatever is typed, and a line that no changed rate touches as it was", () => {
    const cents = fc.integer({ min: 0, max: 100_000 });
    fc.assert(
      fc.property(cents, cents, fc.integer({ min: 1, max: 60 }), (labourCentsPerHour, gold, quantity) => {
        const metalCentsPerG = { ...HELD.metalCentsPerG, Au: gold };
        const { later, atStrike } = preview({ ...HELD, labourCentsPerHour, metalCentsPerG }, { ...SHELLS, quantity });
        for (const stage of [later, atStrike]) {
          const sum = (of: "nowCents" | "thenCents") => stage.lines.reduce((total, line) => total + line[of], 0);
          expect(sum("nowCents")).toBe(stage.now.meanCents);
          expect(sum("thenCents")).toBe(stage.then.meanCents);
          expect(moreOf(stage, "scrapRisk")).toBe(0);
          expect(moreOf(stage, "waste")).toBe(0);
        }
      }),
      { numRuns: 60 },
    );
  });

  it("takes the starting price where neither old nor new rates have one, as cases do", () => {
    const { Au: _gold, ...withoutGold } = HELD.metalCentsPerG;
    const bare = { ...HELD, metalCentsPerG: withoutGold };
    const { later } = previewRates(SHELLS, SHIPPED_STRIP_TABLE, bare, bare);
    expect(later.now.meanCents).toBe(preview(HELD).later.now.meanCents);
  });
});

describe("the preview's sentences", () => {
  const stage = (now: number, then: number): PreviewStage => {
    const figures = (meanCents: number) => ({ method: "chemical" as const, meanCents, low90Cents: 0, high90Cents: 0 });
    return { now: figures(now), then: figures(then), lines: [] };
  };

  it("open with what changes, when, and what the same rework would cost", () => {
    const facts = { changed: 3, day: "on 1 August", waitsFor: [], later: stage(177_517, 181_087) };
    // $1,775.17 to $1,810.87 is 2.0 %.
    expect(ratesLead(facts)).toBe("Three rates change on 1 August. The same rework would cost 2% more.");
    expect(ratesLead({ ...facts, changed: 1, later: stage(100_000, 99_800) })).toBe(
      "One rate changes on 1 August. The same rework would cost under 1% less.",
    );
    expect(ratesLead({ ...facts, later: stage(5, 5) })).toContain("would cost the same.");
  });

  it("say which figure they wait for", () => {
    expect(ratesLead({ changed: 1, day: "today", waitsFor: ["Labour"], later: null })).toBe(
      "One rate changes today. Labour is no number yet.",
    );
    expect(waitWords(["Labour", "Hauled waste", "Gold"])).toBe("Labour, hauled waste and gold are no numbers yet.");
  });

  it("sum up in money: more, less, the same", () => {
    const check = { nowCents: 0, thenCents: 0 };
    const words = (later: PreviewStage, atStrike: PreviewStage) =>
      previewHeadline({ later, atStrike, check, breakEven: null }, 12, "USD");
    expect(words(stage(177_517, 181_087), stage(9872, 10_410))).toBe(
      "$35.70 more to strip these 12. $5.38 more at the strike.",
    );
    expect(words(stage(10_000, 9000), stage(100, 100))).toBe("$10.00 less to strip these 12. The same at the strike.");
    expect(words(stage(1, 1), stage(1, 1))).toBe("It changes nothing for these 12.");
  });

  it("name the day; the year only when it is another", () => {
    expect(startDayWords("2026-08-01", "2026-07-14")).toBe("on 1 August");
    expect(startDayWords("2027-01-01", "2026-07-14")).toBe("on 1 January 2027");
    expect(startDayWords("2026-07-14", "2026-07-14")).toBe("today");
    expect(startDayWords("", "2026-07-14")).toBeNull();
    expect(shortDayWords("2026-08-01", "2026-07-14")).toBe("1 Aug");
    expect(namedChanges(["Labour", "Gold", "Hauled waste", "Silver", "Zinc"])).toBe(
      "Labour, gold, hauled waste and 2 more",
    );
  });
});

describe("rates while they are typed", () => {
  const start = new Map(RATE_FIELDS.map((field) => [field.name, fieldText(field, field.read(HELD))]));
  const isMetal = (name: string) => name.includes("-");
  const read = (changed: Record<string, string> = {}) =>
    readRates(HELD, (name) => changed[name] ?? start.get(name), isMetal);

  it("come out as what holds when nothing is typed over", () => {
    expect(read()).toEqual({ figures: HELD, waitsFor: [], moves: {} });
  });

  it("say how far each moves: $52 to $56 is 7.7 %, $3.80 to $4.40 is 15.8 %, 60 to 65 % is 5 points", () => {
    const { figures, moves } = read({ labour: "56", waste: "4,40", "recovered-Au": "65", "price-Ni": "9.00" });
    expect(moves).toEqual({ labour: "+7.7%", waste: "+15.8%", "recovered-Au": "+5 points", "price-Ni": "−50%" });
    expect(figures).toMatchObject({ labourCentsPerHour: 5600, wasteCentsPerL: 440, recoveryShare: { Au: 0.65 } });
  });

  it.each(["", "5six", "1,000", "-4", "1e9", "9999999999"])("wait for labour while it holds %j", (labour) => {
    const { figures, waitsFor } = read({ labour });
    expect(figures).toBeNull();
    expect(waitsFor).toEqual(["Labour"]);
  });

  it("a metal may be left without a price, a share is at most 100 %", () => {
    expect(read({ "price-In": "" }).figures?.metalCentsPerG).not.toHaveProperty("In");
    expect(read({ "price-In": "" }).moves).toEqual({ "price-In": "not set" });
    expect(read({ "recovered-Au": "101" }).waitsFor).toEqual(["Gold recovered"]);
  });
});
