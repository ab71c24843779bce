import { describe, expect, it } from "vitest";
import { shelf } from "@/db/seed/library/shelf";
import { saveEntryInput } from "@/lib/library/entry-edit.schema";
import { entryFromForm, formOfEntry, type FormValues } from "@/lib/library/entry-form";
import type { EntryKind } from "@/lib/library/entry-kinds";
import { entrySlug, RESERVED_SLUGS } from "@/lib/library/entry-slug";
import { wordDiff } from "@/lib/library/word-diff";
import { readForm } from "@/lib/server/form";

const all: [EntryKind, { slug: string }[]][] = [
  ["class", shelf.classes],
  ["cause", shelf.causes],
  ["fix", shelf.fixes],
];
const entries = all.flatMap(([kind, bodies]) => bodies.map((body) => ({ kind, slug: body.slug, body })));

/** A browser's form: list names end in [], line ends are CR LF. */
function sent(kind: EntryKind, body: object): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(formOfEntry(kind, { ...body }))) {
    if (typeof value === "string") form.append(name, value.replaceAll("\n", "\r\n"));
    else for (const each of value) form.append(`${name}[]`, each);
  }
  return form;
}

describe("the editor's form", () => {
  it.each(entries)("opening $kind $slug and saving it untouched changes nothing", ({ kind, body }) => {
    // Slug and place on the shelf are not the form's to say.
    const words = Object.entries(body).filter(([name]) => name !== "slug" && name !== "position");
    expect(entryFromForm(kind, readForm(sent(kind, body)) as FormValues)).toEqual(Object.fromEntries(words));
  });

  it("keeps a figure that is no number as it was typed", () => {
    const draft = entryFromForm("fix", { "steps.0.title": "Rinse", "steps.0.minutes": "two" });
    expect(draft.steps).toMatchObject([{ title: "Rinse", minutes: "two" }]);
    expect(formOfEntry("fix", draft)["steps.0.minutes"]).toBe("two");
  });

  it("leaves out a step without words, and keeps the order in which steps stand", () => {
    const draft = entryFromForm("fix", { "steps.2.title": "Strike", "steps.0.title": "Polish", "steps.1.title": " " });
    expect(draft.steps).toMatchObject([{ title: "Polish" }, { title: "Strike" }]);
  });

  it("refuses an entry that nobody could publish for its length", () => {
    const huge = { entry: "class", slug: "", baseRevision: "0", intent: "draft", atStrike: "x".repeat(200_000) };
    expect(saveEntryInput.safeParse(huge).success).toBe(false);
  });
});

describe("the slug of an entry of the shop's own", () => {
  it("says the title in small letters without accents", () => {
    expect(entrySlug("Smörig, grau", new Set())).toBe("smorig-grau");
  });
  it("is never one that stands, nor a word of the library's addresses", () => {
    expect(entrySlug("Peeling", new Set(["peeling", "peeling-2"]))).toBe("peeling-3");
    for (const word of RESERVED_SLUGS) expect(entrySlug(word, new Set())).toBe(`${word}-2`);
  });
  it("is something even where the title has no letters that an address can hold", () => {
    expect(entrySlug("銅", new Set())).toBe("entry");
  });
});

describe("word by word", () => {
  it("says what went and what came", () => {
    expect(wordDiff("a short rinse", "a long rinse")).toEqual([
      { standing: "same", text: "a " },
      { standing: "removed", text: "short" },
      { standing: "added", text: "long" },
      { standing: "same", text: " rinse" },
    ]);
  });
  it("loses no letter of either text", () => {
    const texts = shelf.causes.map((cause) => cause.why).slice(0, 20);
    for (const [index, before] of texts.entries()) {
      const after = texts[(index + 1) % texts.length] ?? "";
      const of = (left: string) =>
        wordDiff(before, after)
          .filter((part) => part.standing !== left)
          .map((part) => part.text)
          .join("");
      expect(of("added")).toBe(before);
      expect(of("removed")).toBe(after);
    }
  });
});
