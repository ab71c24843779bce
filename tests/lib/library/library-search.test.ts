/** Expected hits are a plater's reading of each phrase, written in search-phrases.ts before the search was tuned. */
import { describe, expect, test } from "vitest";
import { shelf } from "@/db/seed/library/shelf";
import { buildLibrarySearch } from "@/lib/library/library-search";
import { HELD_OUT_PHRASES, LATER_PHRASES, NONSENSE, SEARCH_PHRASES, THIRD_PHRASES } from "./search-phrases";
import { isFound, shareFound } from "./share-found";

const search = buildLibrarySearch(shelf);

describe("the library answers in the shop's words", () => {
  test("at least 150 phrases are tried, half of them slang or misspelt, over every class, and causes and fixes by name", () => {
    const rough = SEARCH_PHRASES.filter((phrase) => phrase.kind !== "plain");
    expect(SEARCH_PHRASES.length).toBeGreaterThanOrEqual(150);
    expect(rough.length * 2).toBeGreaterThanOrEqual(SEARCH_PHRASES.length);
    const classes = new Set(SEARCH_PHRASES.flatMap(({ finds }) => ("class" in finds ? [finds.class] : [])));
    expect([...classes].sort()).toEqual(shelf.classes.map((entry) => entry.slug).sort());
    const slugs = new Set([...shelf.causes, ...shelf.fixes].map((entry) => entry.slug));
    for (const { typed, finds } of SEARCH_PHRASES) {
      if (!("class" in finds)) expect(slugs, typed).toContain("cause" in finds ? finds.cause : finds.fix);
    }
  });

  test("95 of 100 phrases find their class, cause or fix within the first three", () => {
    const missed = SEARCH_PHRASES.filter((phrase) => !isFound(phrase, search(phrase.typed)));
    const share = shareFound("all", SEARCH_PHRASES, search);
    for (const kind of ["plain", "slang", "typo"] as const) {
      shareFound(
        kind,
        SEARCH_PHRASES.filter((phrase) => phrase.kind === kind),
        search,
      );
    }
    for (const kind of ["class", "cause", "fix"] as const) {
      shareFound(
        `finds a ${kind}`,
        SEARCH_PHRASES.filter(({ finds }) => kind in finds),
        search,
      );
    }
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

  test("95 of 100 phrases of the third and the held-out set find their class, cause or fix within the first three", () => {
    expect(HELD_OUT_PHRASES).toHaveLength(40);
    expect(shareFound("third set", THIRD_PHRASES, search)).toBeGreaterThanOrEqual(0.95);
    expect(shareFound("held out", HELD_OUT_PHRASES, search)).toBeGreaterThanOrEqual(0.95);
  });

  test("nearly every phrase finds something; all say what matched, best first", () => {
    const silent = SEARCH_PHRASES.filter(({ typed }) => search(typed).length === 0);
    expect(silent.length).toBeLessThanOrEqual(2);
    for (const { typed } of SEARCH_PHRASES) {
      const hits = search(typed);
      const scores = hits.map((hit) => hit.score);
      expect(scores, typed).toEqual([...scores].sort((a, b) => a - b));
      expect(hits.every((hit) => hit.matched.length > 0 && hit.classes.length > 0)).toBe(true);
    }
  });

  test("an alloy number alone finds what is written for that alloy", () => {
    const first = (typed: string) =>
      search(typed)
        .slice(0, 3)
        .map((hit) => hit.slug);
    expect(first("C17200")).toContain("beryllium-copper-oxide");
    expect(first("C954")).toContain("aluminium-bronze-route");
    expect(first("416")).toContain("sulfur-stainless-smut");
    expect(first("german silver")).toContain("nickel-silver-route");
    expect(first("zamak 5")).toContain("gentle-zinc-route");
    expect(first("britannia")).toContain("pewter-gentle-route");
  });
});

describe("the library at the edges of what is typed", () => {
  test("nothing typed, or only blanks and signs, finds nothing", () => {
    expect(search("")).toEqual([]);
    expect(search("   ")).toEqual([]);
    expect(search("?! …")).toEqual([]);
  });

  test("what has nothing to do with the shop finds nothing", () => {
    expect(NONSENSE.filter((typed) => search(typed).length > 0)).toEqual([]);
  });

  test("one word of the shop's among strange ones is no answer unless it is most of what was typed", () => {
    expect(search("parking permit for the north gate")).toEqual([]);
    expect(search("greasy doodad")[0]?.slug).toBe("dewetting");
  });

  test("words run together are found by their letters", () => {
    expect(search("wontstick").map((hit) => hit.slug)).toContain("peeling");
    expect(search("lefttoolong")[0]?.slug).toBe("activator-dwell-long");
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

  test("the words that answered are marked in what matched, also where they were misspelt or only an explanation holds them", () => {
    const marked = (typed: string) => search(typed)[0]?.parts.flatMap(({ text, isMatch }) => (isMatch ? [text] : []));
    expect(marked("pachy hayz")).toEqual(["Patchy", "hazy"]);
    expect(marked("sleepy bras")).toEqual(["sleepy", "brass"]);
    for (const { typed } of SEARCH_PHRASES) {
      for (const { parts, matched, title } of search(typed)) {
        expect(parts.map(({ text }) => text).join("")).toBe(matched);
        expect(parts.some(({ isMatch }) => isMatch) || matched === title, `${typed}: ${matched}`).toBe(true);
      }
    }
  });

  test("a very long or strange text is answered, not thrown at", () => {
    expect(() => search("rust ".repeat(400))).not.toThrow();
    expect(() => search("\\ ( [ * \" ' ` \u0000 💧")).not.toThrow();
  });

  test("an empty library finds nothing", () => {
    expect(buildLibrarySearch({ classes: [], causes: [], fixes: [] })("rust")).toEqual([]);
  });
});
