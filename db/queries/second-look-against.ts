import { and, asc, count, desc, eq, inArray, isNotNull, ne } from "drizzle-orm";
import type { BaseMetal, Symptom } from "@/lib/cases/case-words";
import type { Handle } from "../open";
import {
  cases,
  exemplars,
  libraryCauseFixes,
  libraryCauses,
  libraryCautions,
  libraryClassCauses,
  libraryClasses,
  libraryFixes,
  photos,
} from "../schema";

/** How often the shop has confirmed each class, and each cause. */
export function countConfirmed(
  db: Handle,
  shopId: number,
): { byClass: Map<string, number>; byCause: Map<number, number> } {
  const classes = db
    .select({ slug: cases.confirmedClass, cases: count() })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), isNotNull(cases.confirmedClass)))
    .groupBy(cases.confirmedClass)
    .all();
  const causes = db
    .select({ id: cases.confirmedCauseId, cases: count() })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), isNotNull(cases.confirmedCauseId)))
    .groupBy(cases.confirmedCauseId)
    .all();
  return {
    byClass: new Map(classes.flatMap((row) => (row.slug === null ? [] : [[row.slug, row.cases]]))),
    byCause: new Map(causes.flatMap((row) => (row.id === null ? [] : [[row.id, row.cases]]))),
  };
}

/** The shop's shelf as the second look needs it: classes with their tells, causes and fixes, and every caution. */
export function getShelf(db: Handle, shopId: number) {
  const classes = db
    .select({
      slug: libraryClasses.slug,
      title: libraryClasses.title,
      short: libraryClasses.short,
      tells: libraryClasses.tells,
      revision: libraryClasses.revision,
    })
    .from(libraryClasses)
    .where(eq(libraryClasses.shopId, shopId))
    .orderBy(asc(libraryClasses.position))
    .all();
  const causes = db
    .select({
      id: libraryCauses.id,
      slug: libraryCauses.slug,
      title: libraryCauses.title,
      stationKind: libraryCauses.stationKind,
      likelihood: libraryCauses.likelihood,
      baseMetals: libraryCauses.baseMetals,
    })
    .from(libraryCauses)
    .where(eq(libraryCauses.shopId, shopId))
    .orderBy(desc(libraryCauses.likelihood), asc(libraryCauses.id))
    .all();
  const fixes = db
    .select({
      id: libraryFixes.id,
      slug: libraryFixes.slug,
      title: libraryFixes.title,
      whenNot: libraryFixes.whenNot,
      steps: libraryFixes.steps,
    })
    .from(libraryFixes)
    .where(eq(libraryFixes.shopId, shopId))
    .all();
  return { classes, causes, fixes, ...listLinks(db, shopId), cautions: listCautions(db, shopId) };
}

export type ShelfRows = ReturnType<typeof getShelf>;

function listLinks(db: Handle, shopId: number) {
  const classCauses = db
    .select({ classSlug: libraryClassCauses.classSlug, causeSlug: libraryClassCauses.causeSlug })
    .from(libraryClassCauses)
    .where(eq(libraryClassCauses.shopId, shopId))
    .all();
  const causeFixes = db
    .select({ causeSlug: libraryCauseFixes.causeSlug, fixSlug: libraryCauseFixes.fixSlug })
    .from(libraryCauseFixes)
    .where(eq(libraryCauseFixes.shopId, shopId))
    .orderBy(asc(libraryCauseFixes.causeSlug), asc(libraryCauseFixes.position))
    .all();
  return { classCauses, causeFixes };
}

function listCautions(db: Handle, shopId: number) {
  return db
    .select({ key: libraryCautions.key, level: libraryCautions.level, text: libraryCautions.text })
    .from(libraryCautions)
    .where(eq(libraryCautions.shopId, shopId))
    .all();
}

/** The newest exemplar of each of these classes that is fit to be shown. */
export function listExemplars(db: Handle, shopId: number, classSlugs: string[]) {
  if (classSlugs.length === 0) return [];
  const rows = db
    .select({
      classSlug: exemplars.classSlug,
      photoId: photos.id,
      placeholder: photos.placeholder,
      isRendered: photos.isRendered,
      ref: cases.ref,
      baseMetal: cases.baseMetal,
    })
    .from(exemplars)
    .innerJoin(photos, and(eq(photos.shopId, exemplars.shopId), eq(photos.id, exemplars.photoId)))
    // An exemplar of a class that its case no longer has would teach the wrong thing.
    .innerJoin(
      cases,
      and(eq(cases.shopId, photos.shopId), eq(cases.id, photos.caseId), eq(cases.confirmedClass, exemplars.classSlug)),
    )
    .where(and(eq(exemplars.shopId, shopId), inArray(exemplars.classSlug, classSlugs), eq(photos.state, "ready")))
    .orderBy(desc(exemplars.at), asc(exemplars.photoId))
    .all();
  return rows;
}

interface Alike {
  id: number;
  baseMetal: BaseMetal;
  classSlug: string | null;
  symptoms: readonly Symptom[];
}

/** How many of the shop's newest cases of the kind are compared by their symptoms. */
const COMPARED = 60;

/**
 * The shop's closed cases that are most like this one: the same base metal and, where one was called, the same class;
 * those that share most symptoms first, then the newest.
 */
export function listAlike(db: Handle, shopId: number, of: Alike, limit: number) {
  return db
    .select({
      id: cases.id,
      ref: cases.ref,
      round: cases.round,
      closing: cases.closing,
      symptoms: cases.symptoms,
      openedAt: cases.openedAt,
      classTitle: libraryClasses.title,
    })
    .from(cases)
    .innerJoin(
      libraryClasses,
      and(eq(libraryClasses.shopId, cases.shopId), eq(libraryClasses.slug, cases.confirmedClass)),
    )
    .where(
      and(
        eq(cases.shopId, shopId),
        eq(cases.state, "closed"),
        eq(cases.baseMetal, of.baseMetal),
        ne(cases.id, of.id),
        of.classSlug === null ? undefined : eq(cases.confirmedClass, of.classSlug),
      ),
    )
    .orderBy(desc(cases.openedAt), desc(cases.id))
    .limit(COMPARED)
    .all()
    .map(({ symptoms, ...row }) => ({ ...row, shared: symptoms.filter((each) => of.symptoms.includes(each)).length }))
    .filter((row) => of.classSlug !== null || row.shared > 0)
    .toSorted((a, b) => b.shared - a.shared)
    .slice(0, limit);
}

export type AlikeCase = ReturnType<typeof listAlike>[number];
