import { describe, expect, test } from "vitest";
import { editDistance, mendWords, placeWords, searchWords, vocabularyOf } from "@/lib/library/search-words";

const vocabulary = vocabularyOf([
  "tear tracks",
  "hard water ring",
  "flakes off",
  "bare islands",
  "burnt edges",
  "C360 brass",
]);

describe("what a shop types becomes words that can be looked up", () => {
  test("one word in its shapes is one word", () => {
    expect(new Set(["peel", "peels", "peeled", "peeling"].flatMap(searchWords)).size).toBe(1);
    expect(new Set(["haze", "hazy"].flatMap(searchWords)).size).toBe(1);
    expect(new Set(["pit", "pits", "pitted", "pitting"].flatMap(searchWords)).size).toBe(1);
  });

  test("American and British spelling are one", () => {
    expect(searchWords("gray aluminum in sulphuric")).toEqual(searchWords("grey aluminium in sulfuric"));
  });

  test("alloy numbers stay whole and are never mended into another alloy", () => {
    expect(searchWords("C360")).toEqual(["c360"]);
    expect(mendWords("C361", vocabulary)).toEqual(["c361"]);
  });

  test("filler goes, unless there is nothing else", () => {
    expect(searchWords("what is it on the brass")).toEqual(searchWords("brass"));
    expect(searchWords("what is it").length).toBeGreaterThan(0);
    expect(searchWords("")).toEqual([]);
  });

  test("misspelt, swapped, sound-alike and run-together words are mended", () => {
    expect(mendWords("brunt edegs", vocabulary)).toEqual(searchWords("burnt edges"));
    expect(mendWords("hrad watter rign", vocabulary)).toEqual(searchWords("hard water ring"));
    expect(mendWords("bear ilands", vocabulary)).toEqual(searchWords("bare islands"));
    expect(mendWords("hardwater", vocabulary)).toEqual(searchWords("hard water"));
  });

  test("a word with nothing near is dropped beside words that say something, and kept alone", () => {
    expect(mendWords("xylophone ring", vocabulary)).toEqual(["ring"]);
    expect(mendWords("xylophone", vocabulary)).toHaveLength(1);
  });
});

describe("how surely a typed word is meant", () => {
  const surenessOf = (typed: string) =>
    Math.max(0, ...placeWords(typed, vocabulary).flatMap((each) => each.readings.map((way) => way.sureness)));

  test("a word spelt right is sure, a beginning less, a misspelling less by every letter, and a stranger not at all", () => {
    expect(surenessOf("islands")).toBe(1);
    expect(surenessOf("isl")).toBeLessThan(1);
    expect(surenessOf("isl")).toBeGreaterThan(surenessOf("ilands"));
    expect(surenessOf("ilands")).toBeGreaterThan(surenessOf("ilnds"));
    expect(surenessOf("xylophone")).toBe(0);
  });

  test("a shop word is read as the library's, less surely than as itself", () => {
    const words = vocabularyOf(["acid", "glove"]);
    expect(placeWords("pickle", words)[0]?.readings).toEqual([{ stem: "acid", sureness: 0.6 }]);
    expect(placeWords("mitts", words)[0]?.readings.map((way) => way.stem)).toEqual(searchWords("glove"));
  });

  test("spelt by ear, a word is found; another spelling that shops use is one word with it", () => {
    const words = vocabularyOf(["oxidation", "rough", "chromium"]);
    expect(mendWords("oxadashun", words)).toEqual(searchWords("oxidation"));
    expect(mendWords("ruff", words)).toEqual(searchWords("rough"));
    expect(mendWords("krome", words)).toEqual(searchWords("chromium"));
  });

  test("a shape that the library does not use is found by its stem or by the shorter word in it", () => {
    const words = vocabularyOf(["contamination", "weld"]);
    expect(mendWords("contaminated", words)).toEqual(searchWords("contamination"));
    expect(mendWords("weldments", words)).toEqual(searchWords("weld"));
  });
});

describe("edit distance", () => {
  // kitten → sitting: 3 (Levenshtein's textbook pair). ca → abc: 3 under optimal string alignment (2 unrestricted), the
  // pair that textbooks use to tell the two apart.
  test.each([
    ["kitten", "sitting", 3],
    ["ca", "abc", 3],
    ["brwon", "brown", 1],
    ["", "rust", 4],
    ["rust", "rust", 0],
  ])("%s to %s takes %i", (from, to, edits) => {
    expect(editDistance(from, to)).toBe(edits);
    expect(editDistance(to, from)).toBe(edits);
  });
});
