/** Expected hits are a plater's reading of each phrase, written in search-phrases.ts before the search was tuned. */
import { describe, expect, test } from "vitest";
import { shelf } from "@/db/seed/library/shelf";
import { buildLibrarySearch, type LibraryHit } from "@/lib/library/library-search";
import { LATER_PHRASES, SEARCH_PHRASES, type SearchPhrase } from "./search-phrases";

const search = buildLibrarySearch(shelf);

function isFound(phrase: SearchPhrase, hits: readonly LibraryHit[]): boolean {
  return hits
    .slice(0, 3)
    .some((hit) =>
      "class" in phrase.finds ? hit.classes.includes(phrase.finds.class) : hit.slug === phrase.finds.cause,
    );
}

describe("the library answers in the shop's words", () => {
  test("at least 40 phrases are tried, half of them slang or misspelt", () => {
    const rough = SEARCH_PHRASES.filter((phrase) => phrase.kind !== "plain");
    expect(SEARCH_PHRASES.length).toBeGreaterThanOrEqual(40);
    expect(rough.length * 2).toBeGreaterThanOrEqual(SEARCH_PHRASES.length);
  });

  test("95 of 100 phrases find their class or cause within the first three", () => {
    const missed = SEARCH_PHRASES.filter((phrase) => !isFound(phrase, search(phrase.typed)));
    const share = 1 - missed.length / SEARCH_PHRASES.length;
    console.info(`search: ${SEARCH_PHRASES.length} phrases, ${(100 * share).toFixed(1)} % in the first three`);
    for (const phrase of missed) {
      const got = search(phrase.typed).slice(0, 3);
      console.info(`missed: ${phrase.typed} → ${got.map((hit) => `${hit.slug} (${hit.matched})`).join(", ")}`);
    }
    expect(share).toBeGreaterThanOrEqual(0.95);
  });

  test("95 of 100 phrases of the later set find one of their classes within the first three", () => {
    const found = LATER_PHRASES.filter(([typed, classes]) =>
      search(typed)
        .slice(0, 3)
        .some((hit) => hit.classes.some((slug) => classes.includes(slug))),
    );
    const share = found.length / LATER_PHRASES.length;
    console.info(
      `search, later set: ${LATER_PHRASES.length} phrases, ${(100 * share).toFixed(1)} % in the first three`,
    );
    expect(share).toBeGreaterThanOrEqual(0.95);
  });

  test("every phrase finds something, best first, and says what matched", () => {
    for (const { typed } of SEARCH_PHRASES) {
      const hits = search(typed);
      const scores = hits.map((hit) => hit.score);
      expect(hits.length, typed).toBeGreaterThan(0);
      expect(scores, typed).toEqual([...scores].sort((a, b) => a - b));
      expect(hits.every((hit) => hit.matched.length > 0 && hit.classes.length > 0)).toBe(true);
    }
  });
});

describe("the library at the edges of what is typed", () => {
  test("nothing typed, or only blanks and signs, finds nothing", () => {
    expect(search("")).toEqual([]);
    expect(search("   ")).toEqual([]);
    expect(search("?! …")).toEqual([]);
  });

  test("the order of the words does not matter", () => {
    const slugs = (typed: string) => search(typed).map((hit) => hit.slug);
    expect(slugs("smut black C360")).toEqual(slugs("C360 black smut"));
  });

  test("a word still being typed already finds its class", () => {
    for (const typed of ["dew", "dewet", "overact", "oxid", "water sp", "fingerp"]) {
      expect(search(typed).length, typed).toBeGreaterThan(0);
    }
    expect(search("dewet")[0]?.slug).toBe("dewetting");
    expect(search("overact")[0]?.slug).toBe("overactivation");
  });

  test("each class is first for its own title", () => {
    for (const entry of shelf.classes) expect(search(entry.title)[0]?.slug, entry.title).toBe(entry.slug);
  });

  test("what matched is said in the entry's own words", () => {
    expect(search("sleepy brass")[0]).toMatchObject({
      slug: "underactivation",
      kind: "class",
      matched: "sleepy brass",
    });
    expect(search("tired acid")[0]).toMatchObject({ slug: "activator-spent", kind: "cause", matched: "tired acid" });
  });

  test("a very long or strange text is answered, not thrown at", () => {
    expect(() => search("rust ".repeat(400))).not.toThrow();
    expect(() => search("\\ ( [ * \" ' ` \u0000 💧")).not.toThrow();
  });

  test("an empty library finds nothing", () => {
    expect(buildLibrarySearch({ classes: [], causes: [], fixes: [] })("rust")).toEqual([]);
  });
});
