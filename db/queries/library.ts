import { and, asc, count, desc, eq, exists, isNotNull, max, min, ne, sql } from "drizzle-orm";
import { BASE_METALS, type BaseMetal, type StationKind } from "@/lib/cases/case-words";
import type { LibraryEntries } from "@/lib/library/search-documents";
import type { Handle } from "../open";
import {
  cases,
  libraryCauseFixes,
  libraryCauses,
  libraryClassCauses,
  libraryClasses,
  libraryFixes,
  libraryRevisions,
} from "../schema";

/**
 * A mark that changes whenever something is published in the shop's library or removed from it, and never else: what was
 * built from the library is good for as long as the mark stands. Drafts leave it.
 */
export function getLibraryMark(db: Handle, shopId: number): string {
  const row = db
    .select({ newest: max(libraryRevisions.id), revisions: count() })
    .from(libraryRevisions)
    .where(and(eq(libraryRevisions.shopId, shopId), ne(libraryRevisions.state, "draft")))
    .get();
  return `${row?.newest ?? 0}.${row?.revisions ?? 0}`;
}

/** Whether a stored word is one of the product's base metals. */
export const isBaseMetal = (metal: string): metal is BaseMetal => BASE_METALS.some((known) => known === metal);

/** How many classes, causes and fixes the shop's library has together. */
export function countEntries(db: Handle, shopId: number): number {
  return [libraryClasses, libraryCauses, libraryFixes]
    .map((table) => db.select({ entries: count() }).from(table).where(eq(table.shopId, shopId)).get())
    .reduce((sum, row) => sum + (row?.entries ?? 0), 0);
}

/** What of the shop's library is searched, each kind in shelf order. */
export function listSearchEntries(db: Handle, shopId: number): LibraryEntries {
  const { slug, title, short, atStrike, inFinalPlate, synonyms } = libraryClasses;
  const classes = db
    .select({ slug, title, short, atStrike, inFinalPlate, synonyms })
    .from(libraryClasses)
    .where(eq(libraryClasses.shopId, shopId))
    .orderBy(asc(libraryClasses.position), asc(libraryClasses.id))
    .all();
  const causes = db
    .select({
      slug: libraryCauses.slug,
      title: libraryCauses.title,
      why: libraryCauses.why,
      proof: libraryCauses.proof,
      baseMetals: libraryCauses.baseMetals,
      synonyms: libraryCauses.synonyms,
    })
    .from(libraryCauses)
    .where(eq(libraryCauses.shopId, shopId))
    .orderBy(asc(libraryCauses.id))
    .all();
  const fixes = db
    .select({
      slug: libraryFixes.slug,
      title: libraryFixes.title,
      steps: libraryFixes.steps,
      materials: libraryFixes.materials,
    })
    .from(libraryFixes)
    .where(eq(libraryFixes.shopId, shopId))
    .orderBy(asc(libraryFixes.id))
    .all();
  const classesOf = listClassSlugs(db, shopId);
  const causesOf = listCauseSlugs(db, shopId);
  return {
    classes,
    causes: causes.map((cause) => ({
      ...cause,
      baseMetals: cause.baseMetals.filter(isBaseMetal),
      classSlugs: classesOf.get(cause.slug) ?? [],
    })),
    fixes: fixes.map((fix) => ({
      ...fix,
      steps: fix.steps.map((step) => ({ title: step.title })),
      causeSlugs: causesOf.get(fix.slug) ?? [],
    })),
  };
}

/** The classes of each cause, the one that it shows as most first. */
export function listClassSlugs(db: Handle, shopId: number): Map<string, string[]> {
  const rows = db
    .select({ of: libraryClassCauses.causeSlug, slug: libraryClassCauses.classSlug })
    .from(libraryClassCauses)
    .where(eq(libraryClassCauses.shopId, shopId))
    .orderBy(asc(libraryClassCauses.causeSlug), asc(libraryClassCauses.position))
    .all();
  return gathered(rows);
}

/** The causes that each fix puts right. */
export function listCauseSlugs(db: Handle, shopId: number): Map<string, string[]> {
  const rows = db
    .select({ of: libraryCauseFixes.fixSlug, slug: libraryCauseFixes.causeSlug })
    .from(libraryCauseFixes)
    .where(eq(libraryCauseFixes.shopId, shopId))
    // In the order in which the fix names its causes, which is that of the rows.
    .orderBy(asc(libraryCauseFixes.fixSlug), sql`${libraryCauseFixes}.rowid`)
    .all();
  return gathered(rows);
}

function gathered(rows: readonly { of: string; slug: string }[]): Map<string, string[]> {
  const lists = new Map<string, string[]>();
  for (const { of, slug } of rows) lists.set(of, [...(lists.get(of) ?? []), slug]);
  return lists;
}

/**
 * The classes of the shelf, in its order.
 * @param stationKind only those that a cause at this kind of station shows as
 */
export function listClassCards(db: Handle, shopId: number, stationKind: StationKind | null = null) {
  const arisesThere = db
    .select({ slug: libraryClassCauses.causeSlug })
    .from(libraryClassCauses)
    .innerJoin(
      libraryCauses,
      and(eq(libraryCauses.shopId, libraryClassCauses.shopId), eq(libraryCauses.slug, libraryClassCauses.causeSlug)),
    )
    .where(
      and(
        eq(libraryClassCauses.shopId, shopId),
        eq(libraryClassCauses.classSlug, libraryClasses.slug),
        stationKind ? eq(libraryCauses.stationKind, stationKind) : undefined,
      ),
    );
  return db
    .select({ slug: libraryClasses.slug, title: libraryClasses.title, short: libraryClasses.short })
    .from(libraryClasses)
    .where(and(eq(libraryClasses.shopId, shopId), stationKind ? exists(arisesThere) : undefined))
    .orderBy(asc(libraryClasses.position), asc(libraryClasses.id))
    .all();
}

export type ClassCardRow = ReturnType<typeof listClassCards>[number];

/** How many of the shop's cases a second look confirmed as each class. */
export function countCasesByClass(db: Handle, shopId: number): Map<string, number> {
  const rows = db
    .select({ slug: cases.confirmedClass, cases: count() })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), isNotNull(cases.confirmedClass)))
    .groupBy(cases.confirmedClass)
    .all();
  return new Map(rows.flatMap((row) => (row.slug === null ? [] : [[row.slug, row.cases]])));
}

/**
 * Cases of a class whose causes are counted, the newest first: a share does not get truer beyond this many, and reading
 * all cases of a common class would hold the page up.
 */
export const MOST_BY_CAUSE = 1000;

/** The shop's newest cases of a class by the cause that was named, and when the first of them was opened. */
export function countCasesByCause(db: Handle, shopId: number, classSlug: string) {
  const newest = db
    .select({ causeId: cases.confirmedCauseId, openedAt: cases.openedAt })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), eq(cases.confirmedClass, classSlug), isNotNull(cases.confirmedCauseId)))
    .orderBy(desc(cases.openedAt), desc(cases.id))
    .limit(MOST_BY_CAUSE)
    .as("newest");
  const rows = db
    .select({ causeId: newest.causeId, cases: count(), firstAt: min(newest.openedAt) })
    .from(newest)
    .groupBy(newest.causeId)
    .all();
  const firsts = rows.flatMap((row) => row.firstAt ?? []);
  return {
    byCause: new Map(rows.flatMap((row) => (row.causeId === null ? [] : [[row.causeId, row.cases]]))),
    total: rows.reduce((sum, row) => sum + row.cases, 0),
    firstAt: firsts.length > 0 ? Math.min(...firsts) : null,
  };
}
