import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { matchExpression, runningNumberExpression, typedWords, wordExpression } from "@/lib/cases/search-query";

describe("the words of a search", () => {
  it("drops signs, accents and doubles, and keeps the order", () => {
    expect(typedWords('Pachy "SHELLS" * (shells) Déjà-vu')).toEqual(["pachy", "shells", "deja", "vu"]);
  });

  it("leaves single letters out unless there is nothing else", () => {
    expect(typedWords("a smut")).toEqual(["smut"]);
    expect(typedWords("a")).toEqual(["a"]);
    expect(typedWords("5 a")).toEqual(["5"]);
  });

  it("finds no words in signs alone", () => {
    expect(typedWords('" * - ( ) : ^ +')).toEqual([]);
  });

  it("asks for eight words at most, however long the text", () => {
    expect(typedWords(Array.from({ length: 50 }, (_, index) => `word${index}`).join(" "))).toHaveLength(8);
  });
});

describe("the index expression", () => {
  it("quotes every word, so that an operator is a word like any other", () => {
    expect(matchExpression(7, [{ typed: "or", readAs: [] }], "all")).toBe(
      'scope : "s7" AND {ref job class cause notes} : (("or" *))',
    );
  });

  it("puts each word's readings beside it and joins the words", () => {
    const terms = [
      { typed: "smutt", readAs: ["smut", "smuts"] },
      { typed: "j3318", readAs: [] },
    ];
    expect(matchExpression(1, terms, "all")).toBe(
      'scope : "s1" AND {ref job class cause notes} : (("smutt" * OR "smut" OR "smuts") AND ("j3318" *))',
    );
    expect(matchExpression(1, terms, "any")).toContain('("smutt" * OR "smut" OR "smuts") OR ("j3318" *)');
  });

  it("names the shop in every expression", () => {
    for (const expression of [
      matchExpression(12, [{ typed: "x1", readAs: [] }], "any"),
      wordExpression(12, "smut"),
      runningNumberExpression(12, "0042"),
    ]) {
      expect(expression.startsWith('scope : "s12" AND ')).toBe(true);
    }
  });

  it("never lets a quote of the text close its own quotes", () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        const terms = typedWords(text).map((typed) => ({ typed, readAs: [text] }));
        const expression = matchExpression(1, terms, "all");
        // FTS5 documentation, 3.1: inside a string a quote is written twice, so all quotes come in pairs.
        expect((expression.match(/"/g) ?? []).length % 2).toBe(0);
      }),
    );
  });
});
