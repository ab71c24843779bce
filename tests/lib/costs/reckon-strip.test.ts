/** Expected figures here are identities (parts sum to the whole, ends hold the middle) and sentences of the design. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { NO_CORRECTIONS } from "@/lib/costs/estimate-record";
import { reckonStrip, scaleEndCents, type StripShop } from "@/lib/costs/reckon-strip";
import type { StripBatch } from "@/lib/costs/read-strip";
import { sectionScale } from "@/lib/costs/section-scale";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { basisRows, rateRows, sourceKind } from "@/lib/costs/strip-basis";
import { SHIPPED_STRIP_TABLE } from "@/lib/costs/strip-plan";
import {
  answerWords,
  linesWords,
  massWords,
  minutesWords,
  priceShareWords,
  refusalWords,
  takingOffWords,
} from "@/lib/costs/strip-words";

const shop: StripShop = { rates: STARTING_RATES, table: SHIPPED_STRIP_TABLE, corrections: NO_CORRECTIONS };
const shells: StripBatch = {
  quantity: 12,
  areaDm2: 0.62,
  partValueCents: 61_000,
  baseMetal: "brass",
  alloy: "C360",
  stageFound: "after-final-plate",
  stack: [
    { metal: "Cu", thicknessUm: 1 },
    { metal: "Ni", thicknessUm: 5 },
    { metal: "Au", thicknessUm: 0.8 },
  ],
};

describe("the ways side by side", () => {
  it("the cheapest comes first and is shown; a way that attacks brass is refused, with its bath and where it would do", () => {
    const { offered, refused, chosen } = reckonStrip(shells, shop);
    const means = offered.map((way) => way.estimate.meanCents);
    expect(means).toEqual(means.toSorted((a, b) => a - b));
    expect(chosen).toBe(offered[0]?.estimate);
    expect(refused.map((way) => way.method)).toEqual(["chemical"]);
    expect(refused[0]).toMatchObject({ layer: { metal: "Au" }, refusedRow: { id: "gold-cyanide-peroxide" } });
    expect(refused[0]?.offeredOn).toContain("stainless");
    expect(refused[0]?.offeredOn).not.toContain("brass");
    expect(refusalWords(refused[0]?.why ?? "").headline).toBe("Not offered: it attacks brass.");
  });

  it("a picked way is shown although it is dearer; a refused one is passed over with the reason", () => {
    expect(reckonStrip({ ...shells, method: "polish-back" }, shop).chosen.method).toBe("polish-back");
    const refused = reckonStrip({ ...shells, method: "chemical" }, shop);
    expect(refused.chosen.method).not.toBe("chemical");
    expect(refused.passedOver).toMatch(/attacks brass/);
  });

  it("beside it stands the strike; a batch found there has what it costs when it goes on", () => {
    expect(reckonStrip(shells, shop).beside.kind).toBe("at-strike");
    const found = reckonStrip({ ...shells, stageFound: "at-strike" }, shop);
    expect(found.beside.kind).toBe("goes-on");
    expect(found.beside.estimate.meanCents).toBeGreaterThan(found.chosen.meanCents);
  });

  it("a metal without a price has the starting one, and it is said", () => {
    const { Au: _gold, ...metalCentsPerG } = STARTING_RATES.metalCentsPerG;
    const bare = reckonStrip(shells, { ...shop, rates: { ...STARTING_RATES, metalCentsPerG } });
    expect(bare.chosen.meanCents).toBe(reckonStrip(shells, shop).chosen.meanCents);
    expect(bare.assumed.join(" ")).toMatch(/gold/);
  });

  it("twelve layers and 100,000 parts are reckoned like any other", () => {
    const stack = Array.from({ length: 12 }, (_, index) => ({
      metal: index % 2 ? ("Ni" as const) : ("Cu" as const),
      thicknessUm: 1,
    }));
    const { offered } = reckonStrip({ ...shells, quantity: 100_000, stack }, shop);
    expect(offered.at(-1)?.estimate.steps).toHaveLength(12);
    expect(offered.every((way) => Number.isSafeInteger(way.estimate.meanCents))).toBe(true);
  });

  it("names a figure for every step and the rates of the metals on the part, each with its source", () => {
    const reckoning = reckonStrip(shells, shop);
    const rows = basisRows(reckoning);
    expect(rows.map((row) => row.figure)).toEqual(expect.arrayContaining(["Gold off", "Nickel off", "Polishing"]));
    expect(rows.every((row) => row.from.length > 3)).toBe(true);
    const rates = rateRows(reckoning, { from: "1 Jun 2026", source: "invoices", currency: "USD" });
    expect(rates[0]).toEqual({ figure: "Labour", value: "$52.00 / h", from: "Shop's rate, 1 Jun 2026", kind: "shop" });
    expect(rates.map((row) => row.figure)).toContain("Gold, price");
    expect(rates.map((row) => row.figure)).not.toContain("Rhodium, price");
  });
});

describe("one scale for all ways", () => {
  it("ends on a round figure that is not below any of them", () => {
    expect(scaleEndCents([{ high90Cents: 278_000 }])).toBe(300_000);
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 1e12 })), (highs) => {
        expect(scaleEndCents(highs.map((high90Cents) => ({ high90Cents })))).toBeGreaterThanOrEqual(
          Math.max(0, ...highs),
        );
      }),
    );
  });
});

describe("the section", () => {
  const thickness = fc.double({ min: 0.001, max: 1000, noNaN: true });
  it("head, layers and base fill the height; layers to scale keep their true ratio; every layer can be seen", () => {
    fc.assert(
      fc.property(fc.array(thickness, { minLength: 1, maxLength: 12 }), (stack) => {
        const { bands, base } = sectionScale(stack);
        const sum = bands.reduce((total, band) => total + band.share, 0);
        expect(0.05 + sum + base.share).toBeCloseTo(1, 9);
        expect(base.share).toBeGreaterThan(0.15);
        expect(Math.min(...bands.map((band) => band.share))).toBeGreaterThan(0.04);
        const perUm = bands.flatMap((band, index) => (band.isToScale ? [band.share / (stack[index] ?? NaN)] : []));
        for (const each of perUm) expect(each / (perUm[0] ?? NaN)).toBeCloseTo(1, 9);
        expect(perUm.length).toBeGreaterThan(0);
      }),
    );
  });

  it("1 and 3 µm are drawn one to three, the outer one on top", () => {
    const { bands } = sectionScale([1, 3]);
    expect((bands[1]?.share ?? 0) / (bands[0]?.share ?? 1)).toBeCloseTo(3, 9);
    expect(bands[1]?.topShare).toBeLessThan(bands[0]?.topShare ?? 0);
  });

  it("a flash under hard chromium is drawn thicker than it is, and says so", () => {
    const { bands } = sectionScale([0.2, 100]);
    expect(bands.map((band) => band.isToScale)).toEqual([false, true]);
  });
});

describe("words", () => {
  it("open with the answer", () => {
    const reckoning = reckonStrip(shells, shop);
    expect(answerWords(reckoning, "USD")).toMatch(
      /^After gold, these 12 parts cost about \$[\d,.]+ to do again\. At the strike they cost \$[\d,.]+\.$/,
    );
    expect(answerWords(reckonStrip({ ...shells, quantity: 1, stageFound: "returned" }, shop), "USD")).toMatch(
      /^Sent back, this part costs about/,
    );
  });

  it("tell a customer what the work is without a figure of money", () => {
    expect(takingOffWords(reckonStrip(shells, shop))).toBe("Taking gold, nickel and copper off 12 parts.");
  });

  it("say what a small price is of a great one", () => {
    expect(priceShareWords(9_872, 177_500)).toBe("One eighteenth of the price.");
    expect(priceShareWords(100, 5_300)).toBe("One 53rd of the price.");
    expect(priceShareWords(50, 100)).toBe("Half the price.");
    expect(priceShareWords(100, 110)).toBe("Almost the same price.");
    expect(priceShareWords(200, 100)).toBe("No cheaper.");
  });

  it("show lines that add up to the sum as it is shown", () => {
    // 140.70 + 25.60 + 537.00 is 703.30: rounded one by one they would make 704.
    expect(linesWords([14_070, 2_560, 53_700], "USD")).toEqual(["$141", "$25", "$537"]);
    expect(linesWords([50, 49], "USD")).toEqual(["$0.50", "$0.49"]);
  });

  it("write minutes and grams as people do", () => {
    expect([minutesWords(59.4), minutesWords(315), minutesWords(120), minutesWords(60_000)]).toEqual([
      "59 min",
      "5 h 15 min",
      "2 h",
      "1,000 h",
    ]);
    expect([massWords(1.1523), massWords(0.012345), massWords(12_400)]).toEqual(["1.15 g", "0.0123 g", "12.4 kg"]);
  });

  it("tell a published source from one from memory, and from some of each", () => {
    expect(sourceKind("common practice, from memory")).toBe("memory");
    expect(sourceKind("trade column, pfonline.com stripping-nickel-chrome")).toBe("published");
    expect(sourceKind("trade columns, finishing.com/349/73; brass and bronze from memory")).toBe("part");
  });
});
