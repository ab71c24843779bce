import { describe, expect, test } from "vitest";
import { shelf } from "@/db/seed/library/shelf";
import { SHELF_CLASSES } from "@/lib/cases/case-words";
import { checkShelf } from "@/lib/library/library-check";
import { searchWords } from "@/lib/library/search-words";
import type { Shelf } from "@/lib/library/library-entry";
import { shelfSchema } from "@/lib/library/library.schema";

/** Issue's floor and ceiling for the shelf: room for what a plating engineer asks, and no padding. */
const SIZE = { classes: 13, causes: 60, fixes: [85, 95] } as const;

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
    expect(checkShelf(shelf)).toEqual([]);
  });

  test("holds at least 13 classes, 60 causes, and 85 to 95 fixes", () => {
    console.info(
      `shelf: ${shelf.classes.length} classes, ${shelf.causes.length} causes, ${shelf.fixes.length} fixes, ` +
        `${shelf.fixes.flatMap((fix) => fix.steps).length} steps, ${shelf.cautions.length} cautions, ${shelf.sources.length} sources`,
    );
    expect(shelf.classes.length).toBeGreaterThanOrEqual(SIZE.classes);
    expect(shelf.causes.length).toBeGreaterThanOrEqual(SIZE.causes);
    expect(shelf.fixes.length).toBeGreaterThanOrEqual(SIZE.fixes[0]);
    expect(shelf.fixes.length).toBeLessThanOrEqual(SIZE.fixes[1]);
  });

  test("holds exactly the classes of the shop's word list, in its order", () => {
    expect(shelf.classes.map((entry) => entry.slug)).toEqual([...SHELF_CLASSES]);
    expect(shelf.classes.map((entry) => entry.position)).toEqual(SHELF_CLASSES.map((_, index) => index));
  });

  test("passes the limits that a shop's own edits must pass", () => {
    expect(shelfSchema.parse(shelf)).toEqual(shelf);
  });

  test("gives each class but sound four causes or more, and sound, the baseline, none", () => {
    for (const { slug } of shelf.classes.filter((entry) => entry.slug !== "sound")) {
      expect(causesOf(slug).length, slug).toBeGreaterThanOrEqual(4);
      expect(fixesOf(slug).length, slug).toBeGreaterThanOrEqual(4);
    }
    expect(causesOf("sound")).toEqual([]);
  });

  test("gives each cause a fix, and each fix three to six steps, materials, and when to leave it alone", () => {
    for (const cause of shelf.causes) {
      const fixes = shelf.fixes.filter((fix) => fix.causeSlugs.includes(cause.slug));
      expect(fixes.length, cause.slug).toBeGreaterThan(0);
    }
    for (const fix of shelf.fixes) {
      expect(fix.steps.length, fix.slug).toBeGreaterThanOrEqual(3);
      expect(fix.steps.length, fix.slug).toBeLessThanOrEqual(6);
      expect(fix.materials.length, fix.slug).toBeGreaterThan(0);
      expect(fix.whenNot.length, fix.slug).toBeGreaterThan(20);
    }
  });

  test("no fix is another with words swapped: beside shared steps, none has half its words in common with another", () => {
    const times = new Map<string, number>();
    for (const { detail } of shelf.fixes.flatMap((fix) => fix.steps)) times.set(detail, (times.get(detail) ?? 0) + 1);
    const all = shelf.fixes.map((fix) => ({
      slug: fix.slug,
      words: new Set(fix.steps.flatMap(({ detail }) => (times.get(detail) === 1 ? searchWords(detail) : []))),
    }));
    const alike = all.flatMap((one, index) =>
      all.slice(index + 1).flatMap((other) => {
        const shared = [...one.words].filter((word) => other.words.has(word)).length;
        const share = shared / (one.words.size + other.words.size - shared);
        return share >= 0.5 ? [`${one.slug} and ${other.slug}: ${share.toFixed(2)}`] : [];
      }),
    );
    expect(alike).toEqual([]);
  });

  test("whatever a class is told from is told from it as well", () => {
    const told = new Set(shelf.classes.flatMap((entry) => entry.tells.map((tell) => `${entry.slug}>${tell.versus}`)));
    const oneWay = [...told].filter((pair) => !told.has(pair.split(">").reverse().join(">")));
    expect(oneWay).toEqual([]);
  });

  test("every class says what settles it, what prevents it and what it becomes under the final plate", () => {
    for (const entry of shelf.classes) {
      expect(entry.checks.length, entry.slug).toBeGreaterThanOrEqual(3);
      expect(entry.prevention.length, entry.slug).toBeGreaterThanOrEqual(3);
      expect(entry.inFinalPlate.length, entry.slug).toBeGreaterThan(40);
      expect(entry.stripNote.length, entry.slug).toBeGreaterThan(40);
    }
  });

  test("tells every class from at least two look-alikes and names its slang", () => {
    for (const entry of shelf.classes) {
      expect(entry.tells.length, entry.slug).toBeGreaterThanOrEqual(2);
      expect(entry.synonyms.length, entry.slug).toBeGreaterThanOrEqual(5);
      expect(new Set(entry.synonyms).size, entry.slug).toBe(entry.synonyms.length);
    }
  });
});

describe("every fact rests on something", () => {
  const kinds = new Map(shelf.sources.map((source) => [source.key, source]));
  const facts = [
    ...shelf.classes.map(({ slug, sourceKeys }) => ({ name: `class ${slug}`, keys: sourceKeys })),
    ...shelf.causes.map(({ slug, sourceKeys }) => ({ name: `cause ${slug}`, keys: sourceKeys })),
    ...shelf.fixes.map(({ slug, sourceKeys }) => ({ name: `fix ${slug}`, keys: sourceKeys })),
    ...shelf.cautions.map(({ key, sourceKey }) => ({ name: `caution ${key}`, keys: [sourceKey] })),
  ];

  test("each class, cause, fix and caution names sources, and the shelf holds them all", () => {
    expect(facts.filter(({ keys }) => keys.length === 0).map(({ name }) => name)).toEqual([]);
    expect(
      facts.flatMap(({ name, keys }) => keys.filter((key) => !kinds.has(key)).map((key) => `${name}: ${key}`)),
    ).toEqual([]);
  });

  test("a published source is a standard, a rule, a guide or a column by name; only memory and practice stand without", () => {
    const unnamed = shelf.sources.filter(
      ({ kind, citation }) =>
        kind === "published" && !/ASTM|ISO|CFR|Guidebook|Handbook|Science|columns|procedure/.test(citation),
    );
    expect(unnamed).toEqual([]);
    expect(shelf.sources.filter(({ kind }) => kind !== "published").map(({ key }) => key)).toEqual([
      "common-practice",
      "from-memory",
    ]);
  });

  test("says what it rests on: a named source, common practice, or memory alone", () => {
    const rests = (wanted: (key: string) => boolean) => facts.filter(({ keys }) => keys.some(wanted)).length;
    const named = rests((key) => kinds.get(key)?.kind === "published");
    const read = rests(
      (key) => kinds.get(key)?.kind === "published" && !/\(from memory\)/.test(kinds.get(key)?.citation ?? ""),
    );
    const practice = facts.filter(
      ({ keys }) => !keys.some((key) => kinds.get(key)?.kind === "published") && keys.includes("common-practice"),
    ).length;
    const memory = facts.filter(({ keys }) => keys.every((key) => key === "from-memory")).length;
    console.info(
      `sources: ${facts.length} facts; ${named} name a published source (${read} one that was seen at least in part), ` +
        `${practice} rest on common practice, ${memory} on memory alone; ${rests((key) => key === "from-memory")} hold a figure from memory`,
    );
    expect(named + practice + memory).toBe(facts.length);
    expect(memory).toBe(0);
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
    needs(/peroxide bright dip|hydrogen peroxide/i, "peroxide-dip");
    needs(/hydrosulfite stirred|dissolved in small lots/i, "hydrosulfite");
    needs(/beryllium copper|BeCu/i, "beryllium");
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

  test("a caution without a source, or with one that is not there, is named", () => {
    const change = (key: string) =>
      broken((copy) => copy.cautions.slice(0, 1).forEach((caution) => (caution.sourceKey = key)));
    expect(change("")).toEqual(["caution acid-cyanide has no source"]);
    expect(change("nowhere")).toEqual(["caution acid-cyanide points at an unknown source: nowhere"]);
  });

  test("a step without words is named", () => {
    expect(
      broken((copy) =>
        copy.fixes.slice(0, 1).forEach((fix) => fix.steps.slice(0, 1).forEach((step) => (step.detail = " "))),
      ),
    ).toEqual(["fix reclean-from-start, step 1 says nothing"]);
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
