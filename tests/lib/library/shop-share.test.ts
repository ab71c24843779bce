import { describe, expect, it } from "vitest";
import { shelfWords, standingOf } from "@/lib/library/shelf-words";
import { byLikelihood, shareHere } from "@/lib/library/shop-share";

describe("a cause's share in this shop", () => {
  it("shows with its range from eight cases on", () => {
    // Source: R package binom, binom.confint, wilson, 18 of 20 at 95 %.
    const here = shareHere(18, 20);
    expect(here).toMatchObject({ enough: true, cases: 18, of: 20, share: 0.9 });
    expect(here.enough && [here.low, here.high]).toEqual([expect.closeTo(0.6989664, 7), expect.closeTo(0.9721335, 7)]);
    expect(shareHere(0, 8).enough).toBe(true);
  });

  it("says how many are missing below eight", () => {
    expect(shareHere(3, 3)).toEqual({ enough: false, have: 3, need: 8 });
    expect(shareHere(0, 0)).toEqual({ enough: false, have: 0, need: 8 });
  });

  it("refuses more cases of a cause than there are cases", () => {
    expect(() => shareHere(9, 8)).toThrow(expect.objectContaining({ field: "count" }));
  });
});

describe("the order of causes", () => {
  const cause = (slug: string, likelihood: number, cases: number, of: number) => ({
    slug,
    likelihood,
    here: shareHere(cases, of),
  });
  const slugs = (causes: { slug: string }[]) => causes.map((each) => each.slug);

  it("is the shop's own where it has cases enough, and the shelf's among equals", () => {
    const causes = [cause("a", 0.5, 1, 10), cause("b", 0.1, 9, 10), cause("c", 0.2, 0, 10), cause("d", 0.3, 0, 10)];
    expect(slugs(byLikelihood(causes))).toEqual(["b", "a", "d", "c"]);
  });

  it("is the shelf's where the shop has too few", () => {
    expect(slugs(byLikelihood([cause("a", 0.1, 2, 2), cause("b", 0.5, 0, 2)]))).toEqual(["b", "a"]);
  });
});

describe("the sentence that the shelf opens with", () => {
  const classes = [
    { slug: "dewetting", title: "Dewetting" },
    { slug: "peeling", title: "Peeling" },
    { slug: "sound", title: "Sound" },
  ];

  it("names what the shop meets most; sound parts are no fault and count for nothing", () => {
    const counts = new Map([
      ["dewetting", 3],
      ["peeling", 9],
      ["sound", 40],
    ]);
    expect(shelfWords(classes, counts)).toBe("Peeling is what you meet most: 9 of 12 cases.");
    expect(standingOf("sound", counts).isBiggest).toBe(false);
  });

  it("claims nothing from seven cases", () => {
    expect(shelfWords(classes, new Map([["peeling", 7]]))).toBe(
      "Two faults, each with its causes and what puts it right.",
    );
  });
});
