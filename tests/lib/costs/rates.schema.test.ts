/** Expected amounts are plain arithmetic: $18.00 a kilogram is 1,800 cents over 1,000 grams. */
import { describe, expect, it } from "vitest";
import { fieldText, RATE_FIELDS, rateChanges, rateWords } from "@/lib/costs/rate-fields";
import { ratesInput } from "@/lib/costs/rates.schema";
import { ratesStory } from "@/lib/costs/rates-story";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { readDecimal } from "@/lib/decimal";
import { readForm } from "@/lib/server/form";
import { ratesForm } from "@/tests/fixtures/rates-form";

const parse = (changed: Record<string, string> = {}) => ratesInput.safeParse(readForm(ratesForm(changed)));
const messages = (changed: Record<string, string>) =>
  parse(changed).error?.issues.map((issue) => `${issue.path.join(".")}: ${issue.message}`);

describe("rates as they are typed", () => {
  it("come out in cents: an hour, a litre, a gram of gold, a kilogram of nickel, a share", () => {
    const typed = { labour: "56.50", waste: "4,4", "price-Au": "134", "price-Ni": "18.00", "recovered-Au": "60" };
    const figures = parse(typed).data?.figures;
    expect(figures).toMatchObject({
      labourCentsPerHour: 5650,
      wasteCentsPerL: 440,
      metalCentsPerG: { Au: 13400, Ni: 1.8 },
      recoveryShare: { Au: 0.6 },
    });
  });

  it("survive a round through the form unchanged", () => {
    const { validFromAt: _start, ...starting } = STARTING_RATES;
    expect(parse().data?.figures).toEqual(starting);
  });

  it("leave a metal without a price or a share when its field is empty", () => {
    const figures = parse({ "price-In": "", "recovered-Ag": " " }).data?.figures;
    expect(figures?.metalCentsPerG).not.toHaveProperty("In");
    expect(figures?.recoveryShare).not.toHaveProperty("Ag");
  });

  it.each(["", "-1", "1e3", "1 000", "1,234", "1,234.50", "twelve", "1.23456", "NaN", "0x10", "١٢"])(
    "refuse %j with a sentence",
    (labour) => {
      expect(messages({ labour })).toEqual([expect.stringMatching(/^labour: (Write a number|Give the labour rate)/)]);
    },
  );

  it("refuse more than a rate can be, and a share above all of it", () => {
    expect(messages({ line: "10000001" })).toEqual(["line: Write at most 10,000,000."]);
    expect(messages({ "recovered-Au": "101" })).toEqual(["recovered-Au: Write at most 100."]);
  });

  it("ask for the day and for where the figures come from", () => {
    expect(messages({ validFrom: "1 Aug", source: "  " })).toEqual([
      "validFrom: Give the day from which the rates hold.",
      "source: Say where the figures come from: an invoice, a price list, your own reckoning.",
    ]);
    expect(messages({ source: "x".repeat(241) })).toEqual(["source: Keep it to 240 characters."]);
  });

  it("take a comma for a point, but not where it could mark thousands", () => {
    expect([readDecimal("4,4"), readDecimal("0,1234"), readDecimal("1,234")]).toEqual([4.4, 0.1234, undefined]);
  });
});

describe("rates in words", () => {
  const field = (name: string) => RATE_FIELDS.find((each) => each.name === name);

  it("money has a sign and a unit, a share has percent, what is not set says so", () => {
    expect(rateWords({ unit: "kg" }, 18, "USD")).toBe("$18.00 / kg");
    expect(rateWords({ unit: "kg" }, 12.345, "EUR")).toBe("€12.345 / kg");
    expect(rateWords({ unit: "%" }, 60, "USD")).toBe("60%");
    expect(rateWords({ unit: "g" }, undefined, "USD")).toBe("not set");
    expect(fieldText({ unit: "g" }, 128.6)).toBe("128.60");
  });

  it("nickel is shown by the kilogram and gold by the gram", () => {
    expect(field("price-Ni")?.read(STARTING_RATES)).toBeCloseTo(18, 9);
    expect(field("price-Au")?.read(STARTING_RATES)).toBeCloseTo(128.6, 9);
  });

  it("a row says only what it changed", () => {
    const after = { ...STARTING_RATES, labourCentsPerHour: 5600, recoveryShare: {} };
    const changes = rateChanges(STARTING_RATES, after, "USD");
    expect(changes[0]).toEqual({ label: "Labour", from: "$52.00 / h", to: "$56.00 / h" });
    expect(changes.map((change) => change.label)).toContain("Gold recovered");
    expect(rateChanges(after, after, "USD")).toEqual([]);
  });
});

describe("rows of rates by date", () => {
  const row = (id: number, validFromAt: number, labourCentsPerHour = 5000) => ({
    id,
    validFromAt,
    rates: { ...STARTING_RATES, labourCentsPerHour },
  });
  const standings = (rows: ReturnType<typeof row>[], now: number) =>
    ratesStory(rows, now, "USD").map((story) => `${story.row.id} ${story.standing}`);

  it("one holds now, those to come are ahead, the rest are past", () => {
    expect(standings([row(3, 300), row(2, 200), row(1, 100)], 250)).toEqual(["3 ahead", "2 now", "1 before"]);
  });

  it("a later row with the same start corrects the earlier one", () => {
    expect(standings([row(3, 200), row(2, 200), row(1, 100)], 250)).toEqual(["3 now", "2 before", "1 before"]);
  });

  it("before the first row starts, it holds already", () => {
    expect(standings([row(2, 200), row(1, 100)], 50)).toEqual(["2 ahead", "1 now"]);
  });

  it("the first row of all changed nothing", () => {
    const stories = ratesStory([row(2, 200, 5500), row(1, 100)], 250, "USD");
    expect(stories.map((story) => story.changes?.length ?? null)).toEqual([1, null]);
  });
});
