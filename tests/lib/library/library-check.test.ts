import { describe, expect, test } from "vitest";
import { shelf } from "@/db/seed/library/shelf";
import { SHELF_CLASSES } from "@/lib/cases/case-words";
import { checkShelf } from "@/lib/library/library-check";
import type { Shelf } from "@/lib/library/library-entry";
import { shelfSchema } from "@/lib/library/library.schema";

const MAIN = ["dewetting", "underactivation", "overactivation", "water-spots", "oxidation"];
const causesOf = (slug: string) => shelf.causes.filter((cause) => cause.classSlugs.includes(slug));
const fixesOf = (slug: string) => {
  const own = new Set(causesOf(slug).map((cause) => cause.slug));
  return shelf.fixes.filter((fix) => fix.causeSlugs.some((cause) => own.has(cause)));
};
const broken = (change: (copy: Shelf) => void): string[] => {
  const copy = structuredClone(shelf);
  change(copy);
  return checkShelf(copy);
};

describe("the shelf that ships", () => {
  test("has no loose ends", () => {
    console.info(
      `shelf: ${shelf.classes.length} classes, ${shelf.causes.length} causes, ${shelf.fixes.length} fixes, ` +
        `${shelf.fixes.flatMap((fix) => fix.steps).length} steps, ${shelf.cautions.length} cautions, ${shelf.sources.length} sources`,
    );
    expect(checkShelf(shelf)).toEqual([]);
  });

  test("holds exactly the classes of the shop's word list, in its order", () => {
    expect(shelf.classes.map((entry) => entry.slug)).toEqual([...SHELF_CLASSES]);
    expect(shelf.classes.map((entry) => entry.position)).toEqual(SHELF_CLASSES.map((_, index) => index));
  });

  test("passes the limits that a shop's own edits must pass", () => {
    expect(shelfSchema.parse(shelf)).toEqual(shelf);
  });

  test("gives each main class four causes or more, and each of these a fix of three to six steps", () => {
    for (const slug of MAIN) expect(causesOf(slug).length, slug).toBeGreaterThanOrEqual(4);
    for (const cause of shelf.causes) {
      const fixes = shelf.fixes.filter((fix) => fix.causeSlugs.includes(cause.slug));
      expect(fixes.length, cause.slug).toBeGreaterThan(0);
    }
    for (const fix of shelf.fixes) {
      expect(fix.steps.length, fix.slug).toBeGreaterThanOrEqual(3);
      expect(fix.steps.length, fix.slug).toBeLessThanOrEqual(6);
    }
  });

  test("gives every other class but sound two causes and a fix, and sound none", () => {
    const others = SHELF_CLASSES.filter((slug) => !MAIN.includes(slug) && slug !== "sound");
    for (const slug of others) {
      expect(causesOf(slug).length, slug).toBeGreaterThanOrEqual(2);
      expect(fixesOf(slug).length, slug).toBeGreaterThanOrEqual(1);
    }
    expect(causesOf("sound")).toEqual([]);
  });

  test("tells every class from at least two look-alikes and names its slang", () => {
    for (const entry of shelf.classes) {
      expect(entry.tells.length, entry.slug).toBeGreaterThanOrEqual(2);
      expect(entry.synonyms.length, entry.slug).toBeGreaterThanOrEqual(5);
      expect(new Set(entry.synonyms).size, entry.slug).toBe(entry.synonyms.length);
    }
  });
});

describe("the cautions stand where the work is", () => {
  const steps = shelf.fixes.flatMap((fix) => fix.steps.map((step) => ({ ...step, fix: fix.slug })));
  const needs = (pattern: RegExp, caution: string) => {
    const found = steps.filter((step) => pattern.test(`${step.title} ${step.detail}`));
    expect(found.length).toBeGreaterThan(0);
    for (const step of found) expect(step.cautionKeys, `${step.fix}: ${step.title}`).toContain(caution);
  };

  test("every step at the activator warns that acid never meets cyanide, unless it only measures or writes", () => {
    const wet = steps.filter(
      (step) => step.station === "activate" && !/titrate|write a window/i.test(`${step.title} ${step.detail}`),
    );
    for (const step of wet) expect(step.cautionKeys, `${step.fix}: ${step.title}`).toContain("acid-cyanide");
  });

  test("nitric acid, bifluoride and persulfate in a step bring their stop with them", () => {
    needs(/nitric acid 50|in nitric|with ammonium bifluoride/i, "nitric");
    needs(/bifluoride 120|fluoboric acid, /i, "hydrofluoric");
    needs(/ammonium persulfate/i, "persulfate");
    needs(/nickel chloride/i, "nickel");
  });

  test("every polish-back warns of dust", () => {
    needs(/^polish the strike back/i, "polishing-dust");
  });

  test("an acid step that steel may go through warns of hydrogen in high-strength steel", () => {
    const steelCauses = new Set(
      shelf.causes.flatMap((cause) => (cause.baseMetals.includes("steel") ? [cause.slug] : [])),
    );
    const steelFixes = shelf.fixes.filter(
      (fix) => fix.causeSlugs.some((slug) => steelCauses.has(slug)) && !/^not steel/i.test(fix.whenNot),
    );
    const dips = steelFixes
      .flatMap((fix) => fix.steps.map((step) => ({ ...step, fix: fix.slug })))
      .filter(
        (step) =>
          step.station === "activate" &&
          step.cautionKeys.includes("sheet") &&
          /activat|dip|acid|pickle/i.test(step.title),
      )
      .filter((step) => !/make up new|zinc|first gas/i.test(`${step.title}`) && !step.title.startsWith("Titrate"));
    expect(dips.length).toBeGreaterThan(10);
    for (const step of dips) expect(step.cautionKeys, `${step.fix}: ${step.title}`).toContain("embrittlement");
  });

  test("every caution and every source on the shelf is used", () => {
    const used = new Set(steps.flatMap((step) => step.cautionKeys));
    expect(shelf.cautions.map((caution) => caution.key).filter((key) => !used.has(key))).toEqual([]);
    const cited = new Set([
      ...[...shelf.classes, ...shelf.causes, ...shelf.fixes].flatMap((entry) => entry.sourceKeys),
      ...shelf.cautions.map((caution) => caution.sourceKey),
    ]);
    expect(shelf.sources.map((source) => source.key).filter((key) => !cited.has(key))).toEqual([]);
  });

  test("nothing on the shelf says that a part is safe", () => {
    const text = JSON.stringify(shelf).replace(/zinc-safe|safety data sheet/gi, "");
    expect(text.match(/.{20}\bsafe\b.{20}/gi)).toBeNull();
  });
});

describe("a broken shelf is found out", () => {
  test("an unknown source, class, cause or caution is named", () => {
    expect(broken((copy) => copy.classes[0]?.sourceKeys.push("nowhere"))).toEqual([
      "class dewetting points at an unknown source: nowhere",
    ]);
    expect(broken((copy) => copy.causes[0]?.classSlugs.push("nowhere"))).toEqual([
      "cause cleaner-spent points at an unknown class: nowhere",
    ]);
    expect(broken((copy) => copy.fixes[0]?.causeSlugs.push("nowhere"))).toEqual([
      "fix reclean-from-start points at an unknown cause: nowhere",
    ]);
    expect(broken((copy) => copy.fixes[0]?.steps[0]?.cautionKeys.push("nowhere"))).toEqual([
      "fix reclean-from-start, step 1 points at an unknown caution: nowhere",
    ]);
  });

  test("an entry without a source, and a step without minutes, is named", () => {
    expect(broken((copy) => copy.causes.slice(0, 1).forEach((cause) => (cause.sourceKeys = [])))).toEqual([
      "cause cleaner-spent has no source",
    ]);
    expect(
      broken((copy) =>
        copy.fixes.slice(0, 1).forEach((fix) => fix.steps.slice(0, 1).forEach((step) => (step.minutes = 0))),
      ),
    ).toEqual(["fix reclean-from-start, step 1 has no minutes"]);
  });

  test("shares of a class that do not sum to 1 are named, with the sum", () => {
    expect(broken((copy) => copy.classes.slice(0, 1).forEach((entry) => (entry.otherLikelihood = 0.1)))).toEqual([
      "class dewetting: shares of its causes and 'other' sum to 1.04, not 1",
    ]);
  });

  test("a slug that stands twice is named", () => {
    expect(broken((copy) => copy.sources.push(...copy.sources.slice(0, 1)))).toEqual([
      "source common-practice stands twice",
    ]);
  });
});
