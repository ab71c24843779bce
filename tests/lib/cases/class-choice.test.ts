import { describe, expect, it } from "vitest";
import fc from "fast-check";
import { chooseClasses } from "@/lib/cases/class-choice";

const classes = [
  { slug: "dewetting", lookAlikes: ["no-deposit"] },
  { slug: "underactivation", lookAlikes: ["dewetting", "peeling"] },
  { slug: "oxidation", lookAlikes: [] },
  { slug: "no-deposit", lookAlikes: [] },
  { slug: "peeling", lookAlikes: [] },
];

describe("the classes that the second look offers", () => {
  it("puts what was called first, then its look-alikes, then what the shop sees most", () => {
    const counts = new Map([["oxidation", 9]]);
    expect(chooseClasses({ classes, called: ["underactivation"], counts, most: 4 })).toEqual({
      first: ["underactivation", "dewetting", "peeling", "oxidation"],
      rest: ["no-deposit"],
    });
  });

  it("puts the newest call before an older one", () => {
    const { first } = chooseClasses({ classes, called: ["oxidation", "dewetting"], counts: new Map(), most: 3 });
    expect(first).toEqual(["oxidation", "dewetting", "no-deposit"]);
  });

  it("falls back to shelf order where nothing was called and nothing is counted", () => {
    expect(chooseClasses({ classes, called: [], counts: new Map(), most: 2 }).first).toEqual([
      "dewetting",
      "underactivation",
    ]);
  });

  it("offers no class that the library does not hold", () => {
    const { first, rest } = chooseClasses({ classes, called: ["gone"], counts: new Map(), most: 9 });
    expect([...first, ...rest]).not.toContain("gone");
  });

  it("shows every class exactly once, whatever was called", () => {
    const slugs = classes.map((each) => each.slug);
    fc.assert(
      fc.property(fc.array(fc.constantFrom(...slugs, "sound")), fc.integer({ min: 0, max: 7 }), (called, most) => {
        const { first, rest } = chooseClasses({ classes, called, counts: new Map(), most });
        expect([...first, ...rest].toSorted()).toEqual(slugs.toSorted());
        expect(first.length).toBe(Math.min(most, slugs.length));
      }),
    );
  });
});
