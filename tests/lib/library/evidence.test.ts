import { describe, expect, it } from "vitest";
import { classTrend, lastMonths } from "@/lib/library/class-trend";
import { minutesWords, rateWords, trendWords, workedWords } from "@/lib/library/evidence-words";
import { fixRecord, recordsByFix, type FixTry } from "@/lib/library/fix-record";
import { tellsBetween } from "@/lib/library/tells-between";

const tries = (sound: number, failed: number, minutes: number | null = 20): FixTry[] =>
  Array.from({ length: sound + failed }, (_, index) => ({
    fixSlug: "polish",
    ref: `CT-2607-${String(index + 1).padStart(4, "0")}`,
    round: 1,
    outcome: index < sound ? "sound" : "same-fault",
    spentMinutes: minutes,
  }));

describe("the record of a fix", () => {
  // Wilson's score interval for 7 of 9 at 95 %, worked by hand with z = 1.96: (0.7778 + 0.2134 ± 0.3454) / 1.4268.
  it("says what worked with its range", () =>
    expect(workedWords(fixRecord(tries(7, 2)))).toBe("Worked 7 of 9; 45 to 94 %"));
  it("says no share below eight tries", () => {
    const record = fixRecord(tries(2, 1));
    expect(workedWords(record)).toBe("Worked 2 of 3");
    expect(record.range).toEqual({ enough: false, have: 3, need: 8 });
  });
  it("says so when nobody tried it here", () => expect(workedWords(fixRecord([]))).toBe("Not tried here yet"));
  it("counts another fault as not worked: the part was not right", () => {
    const [first, ...rest] = tries(8, 0);
    if (!first) throw new Error("no try");
    expect(fixRecord([{ ...first, outcome: "another-fault" }, ...rest]).sound).toBe(7);
  });
  it("takes the median over the cards that have minutes, and says over how many", () => {
    const record = fixRecord([...tries(1, 0, 30), ...tries(1, 0, 10), ...tries(1, 0, null)]);
    expect(minutesWords(record)).toBe("Median 20 min a card, of the 2 with minutes");
  });
  it("keeps the fixes apart", () => {
    const [one] = tries(1, 0);
    if (!one) throw new Error("no try");
    const records = recordsByFix([one, { ...one, fixSlug: "strip", outcome: "same-fault" }]);
    expect([records.get("polish")?.sound, records.get("strip")?.sound]).toEqual([1, 0]);
  });
});

describe("the trend of a class", () => {
  // 2026-12-01 15:00 UTC.
  const now = Date.UTC(2026, 11, 1, 15);
  const months = lastMonths(now, "Europe/Stockholm");
  const cases = [0, 0, 1, 0, 0, 1, 2, 3, 4, 1, 0, 1];

  it("looks back over twelve months of the shop's own calendar", () => {
    expect(months.map((month) => month.short).join(" ")).toBe("Jan Feb Mar Apr May Jun Jul Aug Sep Oct Nov Dec");
    // Stockholm is an hour ahead of UTC in winter, two in summer.
    expect(months[1]).toMatchObject({ from: "2026-02-01", to: "2026-02-28", fromAt: Date.UTC(2026, 0, 31, 23) });
    expect(months[6]?.untilAt).toBe(Date.UTC(2026, 6, 31, 22));
  });
  it("leaves no moment between two months", () => {
    for (const [index, month] of months.slice(1).entries()) expect(month.fromAt).toBe(months[index]?.untilAt);
  });
  it("says the sum, the worst month, and the two halves of a full year", () => {
    const trend = classTrend(months, { cases, partsStruck: [] }, Date.UTC(2025, 5, 1));
    expect(trendWords(trend)).toBe(
      "13 cases in the last 12 months, most in September 2026: 4. 11 in the last six months, 2 in the six before.",
    );
  });
  it("does not compare with months before the shop kept cases", () => {
    const trend = classTrend(months, { cases, partsStruck: [] }, Date.UTC(2026, 2, 9));
    expect(trendWords(trend)).toBe("13 cases in the last 12 months, most in September 2026: 4.");
    expect(trend.months.filter((month) => !month.isRecorded).map((month) => month.short)).toEqual(["Jan", "Feb"]);
  });
  it("gives cases per 1,000 parts of the months that have runs alone", () => {
    const partsStruck = [0, 0, 0, 0, 0, 0, 0, 0, 500, 300, 0, 200];
    const trend = classTrend(months, { cases, partsStruck }, null);
    // 4 + 1 + 1 cases in September, October and December; 6 / 1,000 parts.
    expect(rateWords(trend)).toBe("6.0 cases per 1,000 parts struck: 6 against 1,000 parts in the runs of 3 months.");
  });
  it("gives no rate without runs, nor on a handful of cases", () => {
    expect(rateWords(classTrend(months, { cases, partsStruck: [] }, null))).toBeNull();
    expect(rateWords(classTrend(months, { cases: [1, 1], partsStruck: [400, 400] }, null))).toBeNull();
  });
  it("says so when there was none", () =>
    expect(trendWords(classTrend(months, { cases: [], partsStruck: [] }, null))).toBe(
      "No case in the last 12 months.",
    ));
});

describe("what tells classes apart", () => {
  const classes = [
    { slug: "dewetting", title: "Dewetting", tells: [{ versus: "peeling", tell: "The edge is clean." }] },
    { slug: "peeling", title: "Peeling", tells: [] },
    { slug: "burning", title: "Burning", tells: [{ versus: "dewetting", tell: "It is rough." }] },
  ];
  it("names each pair once, with what either page says of the other", () => {
    const pairs = tellsBetween(classes);
    expect(pairs.map(({ one, other }) => [one.slug, one.tell, other.slug, other.tell])).toEqual([
      ["dewetting", "The edge is clean.", "peeling", null],
      ["dewetting", null, "burning", "It is rough."],
      ["peeling", null, "burning", null],
    ]);
  });
});
