import { expect, it } from "vitest";
import { entryAnchor, hitHref } from "@/lib/library/hit-href";
import { citeSources } from "@/lib/library/source-number";

const sources = [
  { key: "from-memory", kind: "from-memory" as const, citation: "From memory." },
  { key: "astm-b322", kind: "published" as const, citation: "ASTM B322." },
  { key: "common-practice", kind: "common-practice" as const, citation: "Common practice." },
  { key: "iso-2819", kind: "published" as const, citation: "ISO 2819." },
  { key: "unused", kind: "published" as const, citation: "Nobody needs it." },
];

it("a page numbers its published sources as they are first used, and says what is from memory", () => {
  const cited = citeSources(["from-memory", "iso-2819", "common-practice", "astm-b322", "iso-2819"], sources);
  expect(cited.map(({ key, mark }) => [key, mark])).toEqual([
    ["iso-2819", "1"],
    ["astm-b322", "2"],
    ["from-memory", "from memory"],
    ["common-practice", "common practice"],
  ]);
});

it("a key that names no source is left out", () => {
  expect(citeSources(["gone"], sources)).toEqual([]);
});

it("a hit leads to its class's page, a cause or fix to its place on it", () => {
  expect(hitHref({ kind: "class", slug: "peeling", classes: ["peeling"] })).toBe("/library/peeling");
  expect(hitHref({ kind: "cause", slug: "acid-old", classes: ["peeling", "pitting"] })).toBe(
    `/library/peeling#${entryAnchor("cause", "acid-old")}`,
  );
  expect(hitHref({ kind: "fix", slug: "alone", classes: [] })).toBe("/library");
});
