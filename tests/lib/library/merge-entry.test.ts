import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ENTRY_FIELDS } from "@/lib/library/entry-fields";
import type { DraftBody } from "@/lib/library/entry-kinds";
import { MERGE_CHOICES, mergeEntry, settleMerge, type MergeChoice } from "@/lib/library/merge-entry";

const FIELDS = ENTRY_FIELDS.cause;
const base: DraftBody = {
  title: "Cleaner spent",
  station: "clean",
  classSlugs: ["dewetting"],
  why: "Oil stays.",
  proof: "Water break test.",
  likelihood: 0.3,
  baseMetals: ["steel"],
  synonyms: ["tired soap"],
  sourceKeys: ["from-memory"],
};
const standings = (mine: DraftBody, theirs: DraftBody, from: DraftBody | null = base) =>
  Object.fromEntries(mergeEntry(FIELDS, from, mine, theirs).map(({ field, standing }) => [field.name, standing]));

describe("two editors of one entry", () => {
  it("merges by itself what only one of them changed", () => {
    const mine = { ...base, why: "Oil stays on the part." };
    const theirs = { ...base, likelihood: 0.4 };
    expect(standings(mine, theirs)).toMatchObject({ why: "mine", likelihood: "theirs", proof: "same" });
    expect(settleMerge(mergeEntry(FIELDS, base, mine, theirs), {})).toEqual({
      settled: true,
      body: { ...base, why: "Oil stays on the part.", likelihood: 0.4 },
    });
  });

  it("asks only where both changed a field in different ways", () => {
    const mine = { ...base, proof: "Water break after the rinse.", title: "Cleaner worn out" };
    const theirs = { ...base, proof: "Atomizer test.", title: "Cleaner worn out" };
    expect(standings(mine, theirs)).toMatchObject({ proof: "clash", title: "alike" });
    const merges = mergeEntry(FIELDS, base, mine, theirs);
    expect(settleMerge(merges, {})).toEqual({ settled: false, open: ["proof"] });
    const settled = settleMerge(merges, { proof: "theirs" });
    expect(settled).toMatchObject({ settled: true, body: { proof: "Atomizer test." } });
  });

  it("keeps every item of both lists, each once, when both are wanted", () => {
    const mine = { ...base, synonyms: ["tired soap", "dead cleaner"] };
    const theirs = { ...base, synonyms: ["tired soap", "weak bath"] };
    const settled = settleMerge(mergeEntry(FIELDS, base, mine, theirs), { synonyms: "both" });
    expect(settled).toMatchObject({ body: { synonyms: ["tired soap", "weak bath", "dead cleaner"] } });
  });

  it("offers no 'both' where a field has room for one only", () => {
    const mine = { ...base, likelihood: 0.1 };
    const theirs = { ...base, likelihood: 0.5 };
    const merges = mergeEntry(FIELDS, base, mine, theirs);
    expect(settleMerge(merges, { likelihood: "both" })).toEqual({ settled: false, open: ["likelihood"] });
  });

  it("takes every difference for a clash where it is not known what both began from", () => {
    expect(standings({ ...base, why: "Other." }, base, null)).toMatchObject({ why: "clash", proof: "same" });
  });
});

const words = fc.constantFrom("oil", "soap", "rinse", "brass", "smut", "");
const lines = fc.array(words.filter(Boolean), { maxLength: 4 });
const body = fc.record<DraftBody>({
  title: words,
  station: fc.constantFrom("clean", "rinse"),
  classSlugs: lines,
  why: words,
  proof: words,
  likelihood: fc.constantFrom(0.1, 0.2, "abc"),
  baseMetals: lines,
  synonyms: lines,
  sourceKeys: lines,
});
const choices = fc.dictionary(fc.constantFrom(...FIELDS.map((field) => field.name)), fc.constantFrom(...MERGE_CHOICES));

const has = (whole: unknown, part: unknown): boolean =>
  Array.isArray(part) && Array.isArray(whole)
    ? part.every((item) => whole.includes(item))
    : typeof part === "string" && typeof whole === "string"
      ? whole.includes(part)
      : whole === part;

describe("whatever two editors typed", () => {
  it("a field changed by one alone comes out as that one left it, and an untouched one as it was", () => {
    fc.assert(
      fc.property(body, body, body, choices, (from, mine, theirs, chosen) => {
        const settled = settleMerge(mergeEntry(FIELDS, from, mine, theirs), chosen);
        if (!settled.settled) return;
        for (const { name } of FIELDS) {
          const [was, my, their] = [from, mine, theirs].map((each) => JSON.stringify(each[name]));
          if (my === was) expect(settled.body[name]).toEqual(theirs[name]);
          else if (their === was) expect(settled.body[name]).toEqual(mine[name]);
        }
      }),
    );
  });

  it("nothing typed is dropped unseen: a field is never settled against a word of either without a choice", () => {
    fc.assert(
      fc.property(body, body, body, (from, mine, theirs) => {
        const open = settleMerge(mergeEntry(FIELDS, from, mine, theirs), {});
        const undecided = open.settled ? [] : open.open;
        for (const { name } of FIELDS) {
          const bothMoved = [mine, theirs].every((each) => JSON.stringify(each[name]) !== JSON.stringify(from[name]));
          const differ = JSON.stringify(mine[name]) !== JSON.stringify(theirs[name]);
          expect(undecided.includes(name)).toBe(bothMoved && differ);
        }
      }),
    );
  });

  it("'both' holds every word of mine and of theirs", () => {
    fc.assert(
      fc.property(body, body, body, (from, mine, theirs) => {
        for (const merge of mergeEntry(FIELDS, from, mine, theirs)) {
          if (merge.both === undefined) continue;
          expect(has(merge.both, merge.mine)).toBe(true);
          expect(has(merge.both, merge.theirs)).toBe(true);
        }
      }),
    );
  });

  it("turning the two round turns the choice round and nothing else", () => {
    const turned: Record<MergeChoice, MergeChoice> = { mine: "theirs", theirs: "mine", both: "both" };
    fc.assert(
      fc.property(body, body, body, fc.constantFrom<MergeChoice>("mine", "theirs"), (from, mine, theirs, choice) => {
        const all = (each: MergeChoice) => Object.fromEntries(FIELDS.map(({ name }) => [name, each]));
        const one = settleMerge(mergeEntry(FIELDS, from, mine, theirs), all(choice));
        const other = settleMerge(mergeEntry(FIELDS, from, theirs, mine), all(turned[choice]));
        expect(other).toEqual(one);
      }),
    );
  });
});
