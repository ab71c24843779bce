/** Expected hits are a plater's reading of each phrase, written in search-phrases.ts before the search was tuned. */
import { describe, expect, test } from "vitest";
import { shelf } from "@/db/seed/library/shelf";
import { buildLibrarySearch, type LibraryHit } from "@/lib/library/library-search";
import { SEARCH_PHRASES, type SearchPhrase } from "./search-phrases";

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
