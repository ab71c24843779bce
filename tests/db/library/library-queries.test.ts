import { beforeEach, describe, expect, it } from "vitest";
import { and, eq } from "drizzle-orm";
import type { Db } from "@/db/open";
import {
  countCasesByCause,
  countCasesByClass,
  getLibraryMark,
  listClassCards,
  listSearchEntries,
} from "@/db/queries/library";
import { getLibraryClass } from "@/db/queries/library-class";
import { libraryClasses } from "@/db/schema";
import { shelf } from "@/db/seed/library/shelf";
import { SHELF_CLASSES, STATION_KINDS } from "@/lib/cases/case-words";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { causeOf, confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

let db: Db;
let shop: TestShop;
let other: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
  other = await makeShop(db);
});

function rename(of: TestShop, slug: string, title: string): void {
  db.update(libraryClasses)
    .set({ title })
    .where(and(eq(libraryClasses.shopId, of.shopId), eq(libraryClasses.slug, slug)))
    .run();
}

describe("the shelf", () => {
  it("holds the shop's classes in their order", () => {
    expect(listClassCards(db, shop.shopId).map((card) => card.slug)).toEqual([...SHELF_CLASSES]);
  });

  it("narrows to the classes that a cause at a station shows as", () => {
    for (const kind of STATION_KINDS) {
      const there = shelf.causes.filter((cause) => cause.station === kind).flatMap((cause) => cause.classSlugs);
      const expected = SHELF_CLASSES.filter((slug) => there.includes(slug));
      expect(
        listClassCards(db, shop.shopId, kind).map((card) => card.slug),
        kind,
      ).toEqual(expected);
    }
  });

  it("is each shop's own: another shop's words show on neither shelf, page nor search", () => {
    rename(other, "peeling", "Skinning");
    expect(listClassCards(db, shop.shopId).map((card) => card.title)).not.toContain("Skinning");
    expect(getLibraryClass(db, shop.shopId, "peeling")?.class.title).toBe("Peeling");
    expect(JSON.stringify(listSearchEntries(db, shop.shopId))).not.toContain("Skinning");
    expect(getLibraryClass(db, other.shopId, "peeling")?.class.title).toBe("Skinning");
  });

  it("gives the search every class, cause and fix with its links, in shelf order", () => {
    const entries = listSearchEntries(db, shop.shopId);
    expect(entries.causes.map(({ slug, classSlugs }) => ({ slug, classSlugs }))).toEqual(
      shelf.causes.map(({ slug, classSlugs }) => ({ slug, classSlugs })),
    );
    expect(entries.fixes.map(({ slug, causeSlugs }) => ({ slug, causeSlugs }))).toEqual(
      shelf.fixes.map(({ slug, causeSlugs }) => ({ slug, causeSlugs })),
    );
    expect(entries.classes.map(({ slug }) => slug)).toEqual(shelf.classes.map(({ slug }) => slug));
  });
});

describe("a class's page", () => {
  it("has every cause and fix of the class, and every caution and source that they name", () => {
    for (const slug of SHELF_CLASSES) {
      const page = getLibraryClass(db, shop.shopId, slug);
      const causes = shelf.causes.filter((cause) => cause.classSlugs.includes(slug)).map((cause) => cause.slug);
      const fixes = shelf.fixes.filter((fix) => fix.causeSlugs.some((cause) => causes.includes(cause)));
      const cautions = new Set(fixes.flatMap((fix) => fix.steps.flatMap((step) => step.cautionKeys)));
      expect(page?.causes.map((cause) => cause.slug).toSorted(), slug).toEqual(causes.toSorted());
      expect(
        page?.fixes.map((fix) => fix.slug),
        slug,
      ).toEqual(fixes.map((fix) => fix.slug));
      expect(new Set(page?.cautions.map((caution) => caution.key)), slug).toEqual(cautions);
      const known = new Set(page?.sources.map((source) => source.key));
      const used = [page?.class, ...(page?.causes ?? []), ...(page?.fixes ?? [])].flatMap((e) => e?.sourceKeys ?? []);
      for (const key of used) expect(known, `${slug} ${key}`).toContain(key);
    }
  });

  it("is nothing for a class that the shelf does not hold", () => {
    expect(getLibraryClass(db, shop.shopId, "rust-monster")).toBeNull();
  });
});

describe("what the shop saw of a class", () => {
  it("counts its own confirmed cases by class and cause, and no other shop's", () => {
    const causeId = causeOf(db, shop, "underactivation");
    confirmFor(db, shop, makeCase(db, shop, { now: TEST_NOW - 60_000 }));
    confirmFor(db, shop, makeCase(db, shop));
    makeCase(db, shop);
    confirmFor(db, other, makeCase(db, other));
    expect(countCasesByClass(db, shop.shopId)).toEqual(new Map([["underactivation", 2]]));
    const counts = countCasesByCause(db, shop.shopId, "underactivation");
    expect(counts).toEqual({ byCause: new Map([[causeId, 2]]), total: 2, firstAt: TEST_NOW - 60_000 });
  });

  it("is nothing before the first case", () => {
    const none = { byCause: new Map(), total: 0, firstAt: null };
    expect(countCasesByCause(db, shop.shopId, "peeling")).toEqual(none);
  });
});

it("the library's mark is each shop's own", () => {
  expect(getLibraryMark(db, shop.shopId)).not.toBe(getLibraryMark(db, other.shopId));
  expect(getLibraryMark(db, shop.shopId)).toBe(getLibraryMark(db, shop.shopId));
});
