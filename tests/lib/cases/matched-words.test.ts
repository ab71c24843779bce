import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { excerpt, holdsMatch, matchedParts } from "@/lib/cases/matched-words";

const terms = [
  { typed: "keyw", readAs: [] },
  { typed: "smutt", readAs: ["smut"] },
];

describe("what a search found in a text", () => {
  it("marks words that begin as typed and words read for misspelt ones, whole", () => {
    expect(matchedParts("Smut by the keyway.", terms)).toEqual([
      { text: "Smut", isMatch: true },
      { text: " by the ", isMatch: false },
      { text: "keyway", isMatch: true },
      { text: ".", isMatch: false },
    ]);
  });

  it("does not mark a word that only begins like a reading", () => {
    expect(holdsMatch("smutty", [{ typed: "smutx", readAs: ["smut"] }])).toBe(false);
  });

  it("leaves markup in a note as the text it is", () => {
    const note = "<b>smut</b> & <script>";
    expect(
      matchedParts(note, terms)
        .map((part) => part.text)
        .join(""),
    ).toBe(note);
  });

  it("loses no letter of any text", () => {
    fc.assert(
      fc.property(fc.string(), fc.array(fc.string({ minLength: 1 })), (text, words) => {
        const parts = matchedParts(
          text,
          words.map((typed) => ({ typed, readAs: [] })),
        );
        expect(parts.map((part) => part.text).join("")).toBe(text);
      }),
    );
  });
});

describe("a long note", () => {
  const long = `${"Left in the dip over the break. ".repeat(8)}Black smut at the rim. ${"Rinsed twice. ".repeat(8)}`;

  it("is shown around what was found", () => {
    const shown = excerpt(long, terms, 80);
    expect(shown).toContain("smut");
    expect(shown.startsWith("…")).toBe(true);
    expect(shown.endsWith("…")).toBe(true);
    expect(shown.length).toBeLessThanOrEqual(90);
  });

  it("is shown from its beginning where nothing was found", () => {
    expect(excerpt(long, [], 80).startsWith("Left in the dip")).toBe(true);
  });

  it("stays whole when it is short", () => {
    expect(excerpt("Haze on the rim.", terms, 80)).toBe("Haze on the rim.");
  });
});
