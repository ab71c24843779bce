import { describe, expect, it } from "vitest";
import { resolveFilter, type CasebookChoices } from "@/lib/cases/casebook-filter";
import { casesWords, dropWords, sentenceParts } from "@/lib/cases/casebook-words";

const choices: CasebookChoices = {
  classes: [{ slug: "underactivation", title: "Underactivation" }],
  causes: [{ id: 4, slug: "weak-activator", title: "Activator past its day" }],
  stations: [{ id: 2, slug: "activate", name: "Activate" }],
  customers: [{ id: 9, name: "Orrin & Pike" }],
  members: [{ id: 5, name: "Ruth Adair" }],
};

const sentence = (query: Parameters<typeof resolveFilter>[0]) =>
  sentenceParts(resolveFilter(query, choices, "UTC").names)
    .map((part) => ("plain" in part ? part.plain : part.words))
    .join("");

describe("the sentence that opens the casebook", () => {
  it("reads through while nothing is set", () => {
    expect(sentence({})).toBe(" of any class on any metal that began anywhere on the line, in any state");
  });

  it("says every filter, names with their capital", () => {
    expect(
      sentence({
        class: "underactivation",
        metal: "brass",
        station: "activate",
        cause: "weak-activator",
        by: 5,
        customer: 9,
      }),
    ).toBe(
      " of underactivation on brass that began at Activate, in any state, put down to activator past its day, for Orrin & Pike, snapped by Ruth Adair",
    );
  });

  it("says a closing period once", () => {
    expect(sentence({ status: "closed", closedFrom: "2026-07-01", closedTo: "2026-07-14" })).toMatch(
      /, closed from 1 Jul 2026 to 14 Jul 2026$/,
    );
    expect(sentence({ closedTo: "2026-07-14" })).toMatch(/, in any state, closed by 14 Jul 2026$/);
  });
});

describe("counts", () => {
  it("are said as far as they were counted", () => {
    expect(casesWords({ count: 1000, isCapped: true })).toBe("More than 1,000 cases");
    expect(casesWords({ count: 1, isCapped: false })).toBe("1 case");
    expect(casesWords({ count: 0, isCapped: false })).toBe("No case");
  });

  it("name how many filters could be dropped", () => {
    // look.md, section 11, "Empty".
    expect(dropWords(3)).toBe("Drop one of the three filters.");
    expect(dropWords(1)).toBe("Drop the filter.");
  });
});

describe("filters by name", () => {
  it("become the shop's own row numbers, and days begin in its time zone", () => {
    const { filter } = resolveFilter(
      { cause: "weak-activator", closedFrom: "2026-07-01", closedTo: "2026-07-01" },
      choices,
      "Europe/Stockholm",
    );
    expect(filter.causeId).toBe(4);
    // Stockholm keeps UTC+2 in July: its 1 July runs from 22:00 UTC on 30 June for a day.
    expect(filter.closedFromAt).toBe(Date.UTC(2026, 5, 30, 22));
    expect(filter.closedUntilAt).toBe(Date.UTC(2026, 6, 1, 22));
  });

  it("that the shop does not have are named as unknown and filter nothing", () => {
    const { filter, unknown } = resolveFilter({ class: "gremlins", by: 77 }, choices, "UTC");
    expect(unknown.sort()).toEqual(["by", "class"]);
    expect(filter.classSlug).toBeUndefined();
  });
});
