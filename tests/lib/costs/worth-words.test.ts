import { describe, expect, it } from "vitest";
import { checkCents } from "@/lib/costs/check-cost";
import { aboutParts, morePartsToTell } from "@/lib/costs/inspect-more";
import { shareRangeWords, shareWords } from "@/lib/costs/share-words";
import { amountWords, worthWords, type WorthFigures } from "@/lib/costs/worth-words";
import { wilsonInterval } from "@/lib/stats/wilson";

/** Costs and counts of the design's own example: $0.53 a check, $148 a miss. */
const SHOP: WorthFigures = {
  checkCents: 53,
  missCents: 14_800,
  inspected: 14_102,
  bad: 635,
  runs: 212,
  currency: "USD",
};

describe("is the check worth it, in words (Deming, Out of the Crisis, chapter 15; Wilson 1927)", () => {
  it("says to check every part, what it costs, from where it pays and where the shop stands", () => {
    // 0.53/148 is 0.358 %; 635 of 14,102 is 4.50 %; Wilson's interval by hand: 0.0450 ± 0.0034.
    const { headline, why, then } = worthWords(SHOP);
    expect(headline).toBe("Check every part.");
    expect(why).toBe(
      "Checking one costs $0.53; a bad one that goes on costs $148 more. It pays above 0.36%; yours is 4.5% (4.2 to 4.9%, 14,102 parts in 212 runs).",
    );
    expect(then).toBe("");
  });

  it("says not to, and that money is not all, when bad parts are clearly rarer", () => {
    const { headline, then } = worthWords({ ...SHOP, checkCents: 120, missCents: 800 });
    expect(headline).toBe("Do not check every part.");
    expect(then).toContain("a customer or a standard may still ask for it");
  });

  it("says how many more parts would tell, and what to do until then", () => {
    // 3 of 100 against 2 %: 753 parts in all (see below), 653 more: about 660, at 10 parts a run 66 runs.
    const few = { ...SHOP, checkCents: 1, missCents: 50, inspected: 100, bad: 3, runs: 10 };
    const { headline, then } = worthWords(few);
    expect(headline).toBe("Too few runs to say.");
    expect(then).toBe(
      "About 660 more parts would tell, if they come as these did: some 66 runs. Until then check every part: only a part that was looked at counts.",
    );
  });

  it("does not promise an end where shop and break-even lie too close", () => {
    const near = worthWords({ ...SHOP, missCents: Math.round((53 * 14_102) / 634) });
    expect(near.headline).toBe("Too close to call.");
    expect(near.then).toContain("more than 100,000 more parts");
  });

  it("says that there is nothing to go by when nothing was looked at", () => {
    const { headline, why } = worthWords({ ...SHOP, inspected: 0, bad: 0, runs: 0 });
    expect(headline).toBe("No runs to go by yet.");
    expect(why).toContain("It pays above 0.36% bad parts.");
  });

  it("never pays when a check costs as much as a miss, even with nothing looked at", () => {
    const { headline, why } = worthWords({ ...SHOP, missCents: 53, inspected: 0, bad: 0 });
    expect(headline).toBe("Do not check every part.");
    expect(why).toContain("never pays");
  });
});

describe("how many more parts would tell (the score test that Wilson's interval inverts)", () => {
  it("is z²·p₀(1 − p₀)/(p − p₀)² parts in all: 3 % against 2 % takes 3.8415 × 0.0196/0.0001 = 752.9", () => {
    expect(morePartsToTell({ breakEvenRate: 0.02, inspected: 100, bad: 3 })).toBe(653);
  });

  it("agrees with the interval itself: it spans 2 % at 700 parts and no longer at 800", () => {
    expect(wilsonInterval(21, 700).low).toBeLessThan(0.02);
    expect(wilsonInterval(24, 800).low).toBeGreaterThan(0.02);
  });

  it("works from below, with no bad part at all: 0 bad against 2 % takes 188.2 parts", () => {
    // z²(1 − p₀)/p₀ = 3.8415 × 49.
    expect(morePartsToTell({ breakEvenRate: 0.02, inspected: 100, bad: 0 })).toBe(89);
    expect(wilsonInterval(0, 189).high).toBeLessThan(0.02);
    expect(wilsonInterval(0, 188).high).toBeGreaterThan(0.02);
  });

  it("is none once the interval has left, and unknown with nothing to go by or at the break-even itself", () => {
    expect(morePartsToTell({ breakEvenRate: 0.02, inspected: 10_000, bad: 300 })).toBe(0);
    expect(morePartsToTell({ breakEvenRate: 0.02, inspected: 0, bad: 0 })).toBeNull();
    expect(morePartsToTell({ breakEvenRate: 0.02, inspected: 100, bad: 2 })).toBeNull();
  });

  it("refuses impossible counts by name", () => {
    expect(() => morePartsToTell({ breakEvenRate: 0.02, inspected: 3, bad: 4 })).toThrow(
      expect.objectContaining({ field: "bad" }),
    );
    expect(() => morePartsToTell({ breakEvenRate: Number.NaN, inspected: 3, bad: 1 })).toThrow(
      expect.objectContaining({ field: "breakEvenRate" }),
    );
  });

  it("is told as about so many, rounded up", () => {
    expect([aboutParts(653), aboutParts(7), aboutParts(99), aboutParts(12_001)]).toEqual([660, 7, 99, 13_000]);
  });
});

describe("what a check costs", () => {
  it("is the time at the labour rate and the tape: 30 s at $52 is 43.33 cents, and 6 of tape", () => {
    expect(checkCents(5200)).toBeCloseTo(49.333, 3);
    expect(checkCents(5600, 60, 0)).toBeCloseTo(93.333, 3);
  });

  it("refuses a look of an hour and more, and one below nothing", () => {
    expect(() => checkCents(5200, 3601)).toThrow(expect.objectContaining({ field: "seconds" }));
    expect(() => checkCents(5200, -1)).toThrow(expect.objectContaining({ field: "seconds" }));
  });
});

describe("figures as an owner reads them", () => {
  it("shares keep two figures that count", () => {
    expect([0, 0.00358, 0.0452, 0.0995, 0.127, 1, 0.0000036].map(shareWords)).toEqual([
      "0%",
      "0.36%",
      "4.5%",
      "10%",
      "13%",
      "100%",
      "0.00036%",
    ]);
    expect(shareRangeWords(0.039, 0.052)).toBe("3.9 to 5.2%");
  });

  it("money has cents where they matter, and a fraction of a cent is not nothing", () => {
    expect([0, 0.2, 53.4, 9_999, 14_793].map((cents) => amountWords(cents, "USD"))).toEqual([
      "$0.00",
      "less than $0.01",
      "$0.53",
      "$99.99",
      "$148",
    ]);
  });
});
