/** Expected hits are a plater's reading of each phrase, written in search-phrases.ts before the search was tuned. */
import { describe, expect, test } from "vitest";
import { indexLibraryTexts } from "@/db/library-full-text";
import { shelf } from "@/db/seed/library/shelf";
import { buildLargeLibrarySearch } from "@/lib/library/large-library-search";
import { buildLibrarySearch } from "@/lib/library/library-search";
import { sizeOf } from "@/lib/library/library-size";
import { buildBySize } from "@/lib/server/library/search-index";
import { largeLibrary } from "@/tests/fixtures/large-library";
import { shareFound } from "@/tests/lib/library/share-found";
import { HELD_OUT_PHRASES, NONSENSE, SEARCH_PHRASES, THIRD_PHRASES } from "@/tests/lib/library/search-phrases";

const search = buildLargeLibrarySearch(shelf, indexLibraryTexts);

describe("a library searched through full text", () => {
  test("95 of 100 phrases find their class, cause or fix within the first three", () => {
    expect(shareFound("full text, all", SEARCH_PHRASES, search)).toBeGreaterThanOrEqual(0.95);
    expect(shareFound("full text, third set", THIRD_PHRASES, search)).toBeGreaterThanOrEqual(0.95);
    expect(shareFound("full text, held out", HELD_OUT_PHRASES, search)).toBeGreaterThanOrEqual(0.95);
  });

  test("what has nothing to do with the shop finds nothing", () => {
    expect(NONSENSE.filter((typed) => search(typed).length > 0)).toEqual([]);
  });

  test("a hit has the shape of a small library's, says what matched, and the best come first", () => {
    const [hit] = search("sleepy bras");
    expect(Object.keys(hit ?? {}).sort()).toEqual(
      Object.keys(buildLibrarySearch(shelf)("sleepy brass")[0] ?? {}).sort(),
    );
    expect(hit).toMatchObject({ slug: "underactivation", kind: "class", matched: "sleepy brass" });
    const scores = search("black smut").map(({ score }) => score);
    expect(scores).toEqual([...scores].sort((a, b) => a - b));
  });

  test("nothing typed becomes the syntax of the index", () => {
    for (const typed of ['"', "smut OR", "NEAR(smut, 2)", "named : rust", "smut * AND (", "rust ".repeat(400)]) {
      expect(() => search(typed), typed).not.toThrow();
    }
    expect(search("")).toEqual([]);
    expect(search("?! …")).toEqual([]);
  });

  test("every beginning of every phrase is answered without a throw", () => {
    for (const { typed } of SEARCH_PHRASES.slice(0, 60)) {
      for (let letters = 1; letters <= typed.length; letters += 1) search(typed.slice(0, letters));
    }
  });

  test("no other library's words answer", () => {
    const empty = buildLargeLibrarySearch({ classes: [], causes: [], fixes: [] }, indexLibraryTexts);
    expect(empty("smut")).toEqual([]);
    expect(search("smut").length).toBeGreaterThan(0);
  });
});

test("a library of some thousand entries still finds the shelf's own, by full text", () => {
  const entries = largeLibrary(shelf, 1_000);
  expect(sizeOf(entries)).toBeGreaterThanOrEqual(1_000);
  const searchLarge = buildBySize(entries);
  expect(searchLarge("sleepy brass")[0]?.slug).toMatch(/^underactivation/);
  expect(searchLarge("C17200").some(({ slug }) => slug.startsWith("beryllium-copper-oxide"))).toBe(true);
  // Only the small search takes such words apart, letter by letter over every entry.
  expect(searchLarge("lefttoolong")).toEqual([]);
});
