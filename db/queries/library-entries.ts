import { and, asc, eq } from "drizzle-orm";
import type { EntryBodies, ShelfKind } from "@/lib/library/entry-kinds";
import type { KnownNames } from "@/lib/library/entry-links";
import type { LibraryCause, LibraryFix, Shelf } from "@/lib/library/library-entry";
import type { Handle } from "../open";
import { libraryCauses, libraryCautions, libraryClasses, libraryFixes, librarySources } from "../schema";
import { causeColumns, cautionColumns, classColumns, fixColumns, sourceColumns } from "./library-columns";
import { isBaseMetal, listCauseSlugs, listClassSlugs } from "./library";

/** The whole library of a shop, each kind in its own order: what is exported, and what a file is set against. */
export function listShelf(db: Handle, shopId: number): Shelf {
  const classesOf = listClassSlugs(db, shopId);
  const causesOf = listCauseSlugs(db, shopId);
  return {
    classes: db
      .select(classColumns)
      .from(libraryClasses)
      .where(eq(libraryClasses.shopId, shopId))
      .orderBy(asc(libraryClasses.position), asc(libraryClasses.id))
      .all(),
    causes: db
      .select(causeColumns)
      .from(libraryCauses)
      .where(eq(libraryCauses.shopId, shopId))
      .orderBy(asc(libraryCauses.id))
      .all()
      .map((row) => causeOf(row, classesOf)),
    fixes: db
      .select(fixColumns)
      .from(libraryFixes)
      .where(eq(libraryFixes.shopId, shopId))
      .orderBy(asc(libraryFixes.id))
      .all()
      .map((row) => fixOf(row, causesOf)),
    cautions: db
      .select(cautionColumns)
      .from(libraryCautions)
      .where(eq(libraryCautions.shopId, shopId))
      .orderBy(asc(libraryCautions.id))
      .all(),
    sources: db
      .select(sourceColumns)
      .from(librarySources)
      .where(eq(librarySources.shopId, shopId))
      .orderBy(asc(librarySources.id))
      .all(),
  };
}

type CauseRow = Omit<LibraryCause, "classSlugs" | "baseMetals"> & { baseMetals: string[] };

function causeOf(row: CauseRow, classesOf: Map<string, string[]>): LibraryCause {
  return { ...row, classSlugs: classesOf.get(row.slug) ?? [], baseMetals: row.baseMetals.filter(isBaseMetal) };
}

function fixOf(row: Omit<LibraryFix, "causeSlugs">, causesOf: Map<string, string[]>): LibraryFix {
  return { ...row, causeSlugs: causesOf.get(row.slug) ?? [] };
}

type Readers = {
  [Kind in ShelfKind]: (db: Handle, shopId: number, slug: string) => EntryBodies[Kind] | undefined;
};

const READERS: Readers = {
  class: (db, shopId, slug) =>
    db
      .select(classColumns)
      .from(libraryClasses)
      .where(and(eq(libraryClasses.shopId, shopId), eq(libraryClasses.slug, slug)))
      .get(),
  cause: (db, shopId, slug) => {
    const row = db
      .select(causeColumns)
      .from(libraryCauses)
      .where(and(eq(libraryCauses.shopId, shopId), eq(libraryCauses.slug, slug)))
      .get();
    return row && causeOf(row, listClassSlugs(db, shopId));
  },
  fix: (db, shopId, slug) => {
    const row = db
      .select(fixColumns)
      .from(libraryFixes)
      .where(and(eq(libraryFixes.shopId, shopId), eq(libraryFixes.slug, slug)))
      .get();
    return row && fixOf(row, listCauseSlugs(db, shopId));
  },
  caution: (db, shopId, key) =>
    db
      .select(cautionColumns)
      .from(libraryCautions)
      .where(and(eq(libraryCautions.shopId, shopId), eq(libraryCautions.key, key)))
      .get(),
  source: (db, shopId, key) =>
    db
      .select(sourceColumns)
      .from(librarySources)
      .where(and(eq(librarySources.shopId, shopId), eq(librarySources.key, key)))
      .get(),
};

/** An entry as it stands in the shop's library now, or null. */
export function getEntry<Kind extends ShelfKind>(
  db: Handle,
  shopId: number,
  kind: Kind,
  slug: string,
): EntryBodies[Kind] | null {
  return READERS[kind](db, shopId, slug) ?? null;
}

/** Every name that an entry of the shop may point at. */
export function listKnownNames(db: Handle, shopId: number): KnownNames {
  const named = (rows: { name: string }[]) => new Set(rows.map((row) => row.name));
  return {
    classes: named(
      db.select({ name: libraryClasses.slug }).from(libraryClasses).where(eq(libraryClasses.shopId, shopId)).all(),
    ),
    causes: named(
      db.select({ name: libraryCauses.slug }).from(libraryCauses).where(eq(libraryCauses.shopId, shopId)).all(),
    ),
    cautions: named(
      db.select({ name: libraryCautions.key }).from(libraryCautions).where(eq(libraryCautions.shopId, shopId)).all(),
    ),
    sources: named(
      db.select({ name: librarySources.key }).from(librarySources).where(eq(librarySources.shopId, shopId)).all(),
    ),
  };
}
