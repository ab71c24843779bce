import { and, asc, desc, eq, inArray } from "drizzle-orm";
import type { Handle } from "../open";
import {
  libraryCauseFixes,
  libraryCauses,
  libraryCautions,
  libraryClassCauses,
  libraryClasses,
  libraryFixes,
  librarySources,
} from "../schema";
import { causeColumns, cautionColumns, classColumns, fixColumns, sourceColumns } from "./library-columns";
import { isBaseMetal, listCauseSlugs, listClassSlugs } from "./library";

/** A class with all that belongs to it, or null when the shop's shelf has no such class. */
export function getLibraryClass(db: Handle, shopId: number, slug: string) {
  const entry = db
    .select({ ...classColumns, revision: libraryClasses.revision })
    .from(libraryClasses)
    .where(and(eq(libraryClasses.shopId, shopId), eq(libraryClasses.slug, slug)))
    .get();
  if (!entry) return null;
  const causes = listCausesOf(db, shopId, slug);
  const fixes = listFixesOf(
    db,
    shopId,
    causes.map((cause) => cause.slug),
  );
  const cautionKeys = fixes.flatMap((fix) => fix.steps.flatMap((step) => step.cautionKeys));
  const cautions = listCautionsOf(db, shopId, [...new Set(cautionKeys)]);
  const used = [entry, ...causes, ...fixes].flatMap((each) => each.sourceKeys);
  const sources = listSourcesOf(db, shopId, [...new Set([...used, ...cautions.map((each) => each.sourceKey)])]);
  return { class: entry, causes, fixes, cautions, sources };
}

export type ClassPage = NonNullable<ReturnType<typeof getLibraryClass>>;

function listCausesOf(db: Handle, shopId: number, classSlug: string) {
  const classesOf = listClassSlugs(db, shopId);
  return db
    .select({ id: libraryCauses.id, ...causeColumns })
    .from(libraryClassCauses)
    .innerJoin(
      libraryCauses,
      and(eq(libraryCauses.shopId, libraryClassCauses.shopId), eq(libraryCauses.slug, libraryClassCauses.causeSlug)),
    )
    .where(and(eq(libraryClassCauses.shopId, shopId), eq(libraryClassCauses.classSlug, classSlug)))
    .orderBy(desc(libraryCauses.likelihood), asc(libraryCauses.id))
    .all()
    .map((cause) => ({
      ...cause,
      baseMetals: cause.baseMetals.filter(isBaseMetal),
      classSlugs: classesOf.get(cause.slug) ?? [],
    }));
}

function listFixesOf(db: Handle, shopId: number, causeSlugs: string[]) {
  if (causeSlugs.length === 0) return [];
  const causesOf = listCauseSlugs(db, shopId);
  const rows = db
    .selectDistinct({ slug: libraryCauseFixes.fixSlug })
    .from(libraryCauseFixes)
    .where(and(eq(libraryCauseFixes.shopId, shopId), inArray(libraryCauseFixes.causeSlug, causeSlugs)))
    .all();
  return db
    .select(fixColumns)
    .from(libraryFixes)
    .where(
      and(
        eq(libraryFixes.shopId, shopId),
        inArray(
          libraryFixes.slug,
          rows.map((row) => row.slug),
        ),
      ),
    )
    .orderBy(asc(libraryFixes.id))
    .all()
    .map((fix) => ({ ...fix, causeSlugs: causesOf.get(fix.slug) ?? [] }));
}

function listCautionsOf(db: Handle, shopId: number, keys: string[]) {
  return db
    .select(cautionColumns)
    .from(libraryCautions)
    .where(and(eq(libraryCautions.shopId, shopId), inArray(libraryCautions.key, keys)))
    .orderBy(asc(libraryCautions.id))
    .all();
}

function listSourcesOf(db: Handle, shopId: number, keys: string[]) {
  return db
    .select(sourceColumns)
    .from(librarySources)
    .where(and(eq(librarySources.shopId, shopId), inArray(librarySources.key, keys)))
    .orderBy(asc(librarySources.id))
    .all();
}
