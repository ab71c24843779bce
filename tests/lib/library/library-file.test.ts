import fs from "node:fs";
import path from "node:path";
import { describe, expect, it } from "vitest";
import { shelf } from "@/db/seed/library/shelf";
import { compareLibrary } from "@/lib/library/compare-library";
import { FILE_LIMITS, librarySchemaText, LIBRARY_FORMAT } from "@/lib/library/library-file.schema";
import { readLibraryFile } from "@/lib/library/read-library-file";

const file = (over: object = {}) => ({
  format: LIBRARY_FORMAT,
  version: 1,
  shop: "Quarry Lane",
  exportedAt: "2026-12-01T10:00:00.000Z",
  ...shelf,
  ...over,
});
const problems = (text: string) => {
  const read = readLibraryFile(text);
  return read.read ? [] : read.problems;
};
const ofFile = (over: object) => problems(JSON.stringify(file(over)));

const PUBLISHED = path.resolve("public/schemas/library-1.json");

describe("the published schema", () => {
  it("is the one that the app reads by (after a change: npx vitest run -u tests/lib/library/library-file.test.ts)", async () => {
    await expect(librarySchemaText()).toMatchFileSnapshot(PUBLISHED);
  });
  it("names every field of every entry that ships", () => {
    const schema = JSON.parse(fs.readFileSync(PUBLISHED, "utf8")) as {
      properties: Record<string, { items?: { properties: Record<string, unknown>; required: string[] } }>;
    };
    for (const list of ["classes", "causes", "fixes", "cautions", "sources"] as const) {
      const named = Object.keys(schema.properties[list]?.items?.properties ?? {}).toSorted();
      expect(Object.keys(shelf[list][0] ?? {}).toSorted()).toEqual(named);
    }
  });
});

describe("a library file", () => {
  it("is read back as it was written", () => {
    const read = readLibraryFile(JSON.stringify(file()));
    expect(read).toMatchObject({ read: true, shop: "Quarry Lane", shelf });
  });

  it.each([
    ["nothing", "", "empty"],
    ["no JSON", "{", "not JSON"],
    ["a list", "[]", "not a JSON object"],
    ["another format", '{"format":"recipes"}', "format"],
    ["a later version", `{"format":"${LIBRARY_FORMAT}","version":2}`, "version 2"],
    ["a hundred thousand levels", "[".repeat(100_000), "nests deeper"],
    ["five megabytes", `"${"x".repeat(FILE_LIMITS.bytes)}"`, "larger than"],
  ])("is refused in words when it holds %s", (_what, text, words) => {
    expect(problems(text).join(" ")).toContain(words);
  });

  it("is refused with the place of what is wrong", () => {
    expect(ofFile({ causes: [{ ...shelf.causes[0], likelihood: "a lot" }] }).join()).toContain("causes.0.likelihood");
    expect(ofFile({ fixes: [{ ...shelf.fixes[0], steps: "all" }] }).join()).toContain("fixes.0.steps");
    expect(ofFile({ sources: undefined }).join()).toContain("sources");
    expect(ofFile({ classes: [shelf.classes[0], shelf.classes[0]] }).join()).toContain("stands twice");
  });

  it.each([
    "<script>alert(1)</script>",
    "a<img src=x onerror=alert(1)>",
    "javascript:alert(1)",
    "a\u0000b",
    "a\u202Eb",
  ])("is refused for text that is not plain: %j", (text) => {
    expect(ofFile({ classes: [{ ...shelf.classes[0], title: text }] }).join()).toContain("classes.0.title");
  });
  it("may say that something is less than a figure", () => {
    expect(
      ofFile({ classes: [{ ...shelf.classes[0], short: "Under < 5 µm, over > 2 V" }, ...shelf.classes.slice(1)] }),
    ).toEqual([]);
  });
  it("is refused for a name that reaches into the program", () => {
    expect(problems(`{"format":"${LIBRARY_FORMAT}","version":1,"__proto__":{"a":1}}`).join()).toContain("__proto__");
  });
  it("names a dozen problems and counts the rest", () => {
    const broken = shelf.causes.map((cause) => ({ ...cause, why: 7 }));
    expect(ofFile({ causes: broken })).toHaveLength(13);
  });
});

describe("a file set against the shop's library", () => {
  it("says of each entry whether it is new, changed or the same, and never that one is to go", () => {
    const [first, second, ...rest] = shelf.causes;
    if (!first || !second) throw new Error("The shelf has causes.");
    const own = { ...shelf, causes: [{ ...first, why: "Otherwise." }, ...rest], fixes: [] };
    const found = compareLibrary(own, { ...shelf, classes: shelf.classes.slice(0, 3) });
    const of = (standing: string, kind: string) =>
      found.filter((entry) => entry.standing === standing && entry.kind === kind).map((entry) => entry.slug);
    expect(of("changed", "cause")).toEqual([first.slug]);
    expect(of("new", "cause")).toEqual([second.slug]);
    expect(of("new", "fix")).toHaveLength(shelf.fixes.length);
    expect(of("same", "class")).toHaveLength(3);
  });
  it("leaves the order of the shelf to the shop", () => {
    const turned = shelf.classes.map((each) => ({ ...each, position: 99 - each.position }));
    expect(compareLibrary(shelf, { ...shelf, classes: turned }).every((entry) => entry.standing === "same")).toBe(true);
  });
});
