import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, it } from "vitest";
import { CheckSection } from "@/components/costs/check-section";
import { markWords, RatesTimeline } from "@/components/costs/rates-timeline";
import { TestPieces } from "@/components/costs/test-pieces";
import { WorthCheck, type WorthCheckProps } from "@/components/costs/worth-check";
import type { TypedTestPieces } from "@/lib/costs/test-piece-words";

const SHOP: WorthCheckProps = {
  checkCents: 100,
  checkSeconds: 30,
  missCents: 10_000,
  missFrom: "mean of 14 own cases",
  inspected: 10_000,
  bad: 1000,
  runs: 200,
  periodWords: "in the last 91 days",
  currency: "USD",
};
const worth = (changed: Partial<WorthCheckProps> = {}) =>
  renderToStaticMarkup(<WorthCheck {...SHOP} {...changed} />).replaceAll("<!-- -->", "");

describe("is the check worth it, on a screen", () => {
  it("says to readers what the scale shows: break-even, own share, interval", () => {
    // $1 over $100 is 1 %; 1,000 of 10,000 is 10 %, Wilson 95 % by hand: 0.1 ± 0.0059.
    expect(worth()).toContain('aria-label="Checking pays above 1.0% bad parts. Yours: 10%, 9.4 to 11%."');
  });

  it("draws on a log scale: from 0.1 to 100 % a break-even of 1 % lies a third along, 10 % two thirds", () => {
    const html = worth();
    expect(html).toMatch(/worth-scale__even" style="--x:33\.3/);
    expect(html).toMatch(/worth-scale__own" style="--x:66\.6/);
    expect(html).toContain(">0.1%</span>");
  });

  it("draws no interval and no own share where nothing was looked at", () => {
    const html = worth({ inspected: 0, bad: 0, runs: 0 });
    expect(html).toContain("No runs to go by yet.");
    expect(html).not.toContain("worth-scale__range");
    expect(html).toContain("No share of your own yet.");
  });

  it("names the rule and the interval, and what a check that misses half would change", () => {
    const html = worth();
    expect(html).toContain("Deming, Out of the Crisis, chapter 15");
    expect(html).toContain("Wilson’s");
    // Twice the break-even of 1 %.
    expect(html).toContain("sees only half of them pays above 2.0%");
    expect(worth({ missCents: 150 })).toContain("sees only half of them never pays");
  });

  it("says so when going on costs no more, instead of dividing by nothing", () => {
    expect(worth({ missCents: 0 })).toContain("No saving to weigh the check against.");
    expect(worth({ missCents: Number.NaN })).toContain("No saving to weigh the check against.");
  });
});

describe("a test piece first, on a screen", () => {
  const start: TypedTestPieces = {
    badPercent: "10",
    wantedPercent: "90",
    pieceMoney: "0.50",
    faultyRunPercent: "5",
    spoiltRunMoney: "840",
  };
  const pieces = (changed: Partial<TypedTestPieces> = {}) =>
    renderToStaticMarkup(<TestPieces start={{ ...start, ...changed }} currency="USD" rests="Own runs." />);

  it("begins with the answer for the figures that it was given", () => {
    // 10 % bad, 90 % wanted: 22 pieces (success-run theorem).
    expect(pieces()).toContain("Strike 22 test pieces first.");
  });

  it("keeps a bad figure in its field, says what is wrong beside it, and gives no answer", () => {
    const html = pieces({ wantedPercent: "100" });
    expect(html).toContain('value="100"');
    expect(html).toContain("No number of pieces makes it certain.");
    expect(html).toContain("Waits for the wanted chance.");
    expect(html).not.toContain("test pieces first.");
  });
});

describe("the owner's section", () => {
  it("says what is missing where there is nothing to weigh a check against", () => {
    const testPieces: TypedTestPieces = {
      badPercent: "10",
      wantedPercent: "95",
      pieceMoney: "2.50",
      faultyRunPercent: "5",
      spoiltRunMoney: "0.00",
    };
    const nothing = { inspected: 0, bad: 0, runs: 0, labourCentsPerHour: 5200, missCents: null, missFrom: "" };
    const html = renderToStaticMarkup(
      <CheckSection
        worth={{ ...nothing, testPieces, testPiecesRest: "" }}
        periodWords="in the last 30 days"
        currency="USD"
      />,
    );
    expect(html).toContain("Nothing was struck");
    expect(html).toContain("A test piece first");
  });
});

describe("rates by date, drawn", () => {
  it("puts today after the row that holds, and says in words which row is not saved", () => {
    const html = renderToStaticMarkup(
      <RatesTimeline
        today="14 Jul"
        marks={[
          { id: "1", from: "1 Jul 2026", standing: "now", words: "Palladium" },
          { id: "draft", from: "1 Aug 2026", standing: "draft", words: "Labour" },
        ]}
      />,
    ).replaceAll("<!-- -->", "");
    const order = ["1 Jul 2026, hold now", "today, 14 Jul", "1 Aug 2026, not saved"].map((words) =>
      html.indexOf(words),
    );
    expect(order.every((at) => at >= 0)).toBe(true);
    expect(order).toEqual(order.toSorted((a, b) => a - b));
  });

  it("names the first change and counts the others", () => {
    const change = (label: string) => ({ label, from: "$1.00 / L", to: "$2.00 / L" });
    expect(markWords([change("Hauled waste"), change("Strip solution")])).toBe(
      "Hauled waste $1.00 / L to $2.00 / L, and 1 more",
    );
    expect(markWords([])).toBe("Same figures");
    expect(markWords(null)).toBe("The first rates");
  });
});
