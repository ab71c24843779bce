import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { buildWordMap, nearWords, wordsBeginning } from "@/lib/cases/word-map";

const shelfWords = [
  "underactivation",
  "overactivation",
  "smut",
  "smuts",
  "haze",
  "hazy",
  "patchy",
  "keyway",
  "shell",
  "shells",
  "rinse",
].map((word, index) => ({ word, cases: word === "smut" ? 40 : index + 1 }));
const map = buildWordMap(shelfWords);

describe("misspelt words", () => {
  // Edits counted by hand.
  it.each([
    ["underactivaton", "underactivation"],
    ["overactivaiton", "overactivation"],
    ["smutt", "smut"],
    ["pachy", "patchy"],
    ["kepway", "keyway"],
    ["rinze", "rinse"],
  ])("%s is read as %s", (typed, meant) => expect(nearWords(map, typed)[0]).toBe(meant));

  it("reaches one edit in a short word and two in a long one", () => {
    expect(nearWords(map, "hzay")).toEqual(["hazy"]);
    expect(nearWords(map, "rnze")).toEqual([]);
    expect(nearWords(map, "kepwey")).toEqual(["keyway"]);
  });

  it("puts the nearest first, and among equals the one that most cases hold", () => {
    // smutz: one edit from smut (40 cases) and from smuts (4); smuttz: two from either.
    expect(nearWords(map, "smutz")).toEqual(["smut", "smuts"]);
    expect(nearWords(map, "smutts")).toEqual(["smuts", "smut"]);
  });

  it("never offers the word itself", () => {
    expect(nearWords(map, "haze")).not.toContain("haze");
  });

  it("finds every word that one edit spoilt", () => {
    const edited = fc.tuple(fc.constantFrom(...shelfWords), fc.nat(), fc.constantFrom("drop", "double", "swap"));
    fc.assert(
      fc.property(edited, ([{ word }, at, kind]) => {
        const place = at % (word.length - 1);
        const rest = word.slice(place + 1);
        const typed = {
          drop: word.slice(0, place) + rest,
          double: word.slice(0, place + 1) + word.slice(place),
          swap: word.slice(0, place) + (rest[0] ?? "") + (word[place] ?? "") + rest.slice(1),
        }[kind];
        fc.pre(typed !== word);
        expect(nearWords(map, typed ?? "")).toContain(word);
      }),
    );
  });
});

describe("words that begin alike", () => {
  it("come in order and no more than asked", () => {
    expect(wordsBeginning(map, "s", 10)).toEqual(["shell", "shells", "smut", "smuts"]);
    expect(wordsBeginning(map, "s", 2)).toEqual(["shell", "shells"]);
    expect(wordsBeginning(map, "zz", 2)).toEqual([]);
  });
});
