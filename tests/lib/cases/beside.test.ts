import { describe, expect, it } from "vitest";
import { rankAlike, type ComparedCase } from "@/lib/cases/alike";
import { besideAddress, readRefs, toggleRef } from "@/lib/cases/beside";
import { compareFacts, differWords } from "@/lib/cases/compare-facts";
import { keepSearchSchema } from "@/lib/cases/saved-search.schema";

const REFS = ["CT-2607-0001", "CT-2607-0002", "CT-2607-0003", "CT-2607-0004", "CT-2607-0005"];

describe("cases picked for comparing", () => {
  it("are read from one field and from a field each", () => {
    expect(readRefs("CT-2607-0001,ct-2607-0002")).toEqual(REFS.slice(0, 2));
    expect(readRefs(["CT-2607-0001", "CT-2607-0002"])).toEqual(REFS.slice(0, 2));
    expect(readRefs(undefined)).toEqual([]);
  });
  it("are each there once, at most four, and nothing else", () => {
    expect(readRefs([...REFS, "CT-2607-0001"])).toEqual(REFS.slice(0, 4));
    expect(readRefs("../etc,<b>,CT-2607-0001,CT-2607-0001")).toEqual(["CT-2607-0001"]);
  });
  it("go in and out by the same tick, and a fifth waits", () => {
    expect(toggleRef(REFS.slice(0, 2), "CT-2607-0003")).toEqual(REFS.slice(0, 3));
    expect(toggleRef(REFS.slice(0, 2), "CT-2607-0001")).toEqual(["CT-2607-0002"]);
    expect(toggleRef(REFS.slice(0, 4), "CT-2607-0005")).toEqual(REFS.slice(0, 4));
  });
  it("leave the address clean when there is none", () => {
    expect(besideAddress([])).toEqual({});
    expect(besideAddress(REFS.slice(0, 2))).toEqual({ beside: "CT-2607-0001,CT-2607-0002" });
  });
});

describe("facts side by side", () => {
  const rows = compareFacts([
    [
      { label: "Class", value: "Dewetting" },
      { label: "Base metal", value: "Brass" },
      { label: "Note", value: "" },
      { label: "Cause", value: "Oil" },
    ],
    [
      { label: "Class", value: "Peeling" },
      { label: "Base metal", value: "Brass" },
      { label: "Note", value: "" },
      { label: "Cause", value: "" },
    ],
  ]);
  it("say which differ, and leave out what none has", () => {
    expect(rows.map((row) => [row.label, row.isSame])).toEqual([
      ["Class", false],
      ["Base metal", true],
      ["Cause", false],
    ]);
    expect(rows[2]?.values).toEqual(["Oil", "Not known"]);
    expect(differWords(rows)).toBe("They differ in class and cause.");
    expect(differWords([])).toBe("They share every fact that was written down.");
  });
});

describe("the cases most alike", () => {
  const own: ComparedCase = {
    id: 1,
    openedAt: 1000,
    baseMetal: "brass",
    method: "bath",
    stageFound: "at-strike",
    symptoms: ["patchy-haze", "lifts-on-tape"],
    confirmedClass: "underactivation",
    calledClass: "peeling",
  };
  const like = (id: number, change: Partial<ComparedCase> = {}): ComparedCase => ({ ...own, id, ...change });
  const idsOf = (candidates: ComparedCase[], limit = 5) =>
    rankAlike(own, candidates, limit).map(({ found }) => found.id);

  it("stand by class, then symptoms, then metal", () => {
    const other = like(2, { confirmedClass: "dewetting" });
    const steel = like(3, { baseMetal: "steel" });
    const noSymptom = like(4, { symptoms: [] });
    // By the weights: 4 + 3 + 2 + 1 + 1 for all; without the class 7, without the metal 9, without symptoms 8.
    expect(idsOf([other, steel, noSymptom, like(5)])).toEqual([5, 3, 4, 2]);
  });
  it("say why in words", () => {
    const [rank] = rankAlike(own, [like(2, { symptoms: ["patchy-haze"], method: "brush" })], 5);
    expect(rank?.why).toEqual(["same class", "shares patchy, hazy", "brass too", "found at the strike"]);
  });
  it("are compared by what was called while nobody confirmed a class", () => {
    const held = { ...own, confirmedClass: null };
    const [first] = rankAlike(held, [like(2), like(3, { confirmedClass: "peeling" })], 5);
    expect(first?.found.id).toBe(3);
    expect(first?.why[0]).toBe("confirmed as what this one was called");
  });
  it("keep their order among equals: the newer first, then the higher number", () => {
    const ties = [like(2, { openedAt: 5 }), like(3, { openedAt: 9 }), like(4, { openedAt: 9 })];
    expect(idsOf(ties)).toEqual([4, 3, 2]);
    expect(idsOf(ties.toReversed())).toEqual([4, 3, 2]);
  });
  it("leave the case itself out, and what shares little more than the bench", () => {
    const stranger = like(2, { confirmedClass: "burning", symptoms: [], baseMetal: "steel" });
    expect(idsOf([own, stranger])).toEqual([]);
  });
  it("are at most as many as asked", () =>
    expect(
      idsOf(
        [2, 3, 4].map((id) => like(id)),
        2,
      ),
    ).toHaveLength(2));
  it("count a photo's reading only where both have one", () => {
    const ranked = rankAlike(own, [like(2), like(3, { openedAt: 1 })], 5, (each) => (each.id === 3 ? 0.9 : null));
    expect(ranked.map(({ found }) => found.id)).toEqual([3, 2]);
    expect(ranked[0]?.why).toContain("photo reads alike");
  });
});

describe("a search to keep", () => {
  it("is brought to the casebook's own form, without page and tray", () => {
    const kept = keepSearchSchema.parse({
      name: "  Brass haze ",
      query: "metal=brass&class=underactivation&beside=CT-2607-0001&view=grid&cursor=zz&nonsense=1",
    });
    expect(kept).toEqual({ name: "Brass haze", query: "class=underactivation&metal=brass" });
  });
  it("must narrow something", () => {
    expect(keepSearchSchema.safeParse({ name: "All", query: "view=table" }).success).toBe(false);
    expect(keepSearchSchema.safeParse({ name: " ", query: "metal=brass" }).success).toBe(false);
  });
});
