import { and, count, countDistinct, eq, isNull, or, sql, type SQL } from "drizzle-orm";
import type { SQLiteColumn } from "drizzle-orm/sqlite-core";
import type { EntryKind } from "@/lib/library/entry-kinds";
import type { EntryUses } from "@/lib/library/entry-uses";
import type { Handle } from "../open";
import {
  calls,
  cases,
  exemplars,
  libraryCauseFixes,
  libraryCauses,
  libraryClassCauses,
  libraryClasses,
  libraryFixes,
  practiceAnswers,
  practiceDrills,
  reworkCards,
} from "../schema";

/** What points at an entry of the shop's library, so that it cannot be taken out. */
export function countUses(db: Handle, shopId: number, kind: EntryKind, slug: string): EntryUses {
  if (kind === "class") return classUses(db, shopId, slug);
  return kind === "cause" ? causeUses(db, shopId, slug) : fixUses(db, shopId, slug);
}

function classUses(db: Handle, shopId: number, slug: string): EntryUses {
  const called = db
    .select({ n: countDistinct(calls.caseId) })
    .from(calls)
    .where(and(eq(calls.shopId, shopId), eq(calls.classSlug, slug)))
    .get();
  return {
    cases: number(
      db
        .select({ n: count() })
        .from(cases)
        .where(and(eq(cases.shopId, shopId), or(eq(cases.confirmedClass, slug), eq(cases.calledClass, slug))))
        .get(),
    ),
    calls: number(called),
    exemplars: number(
      db
        .select({ n: count() })
        .from(exemplars)
        .where(and(eq(exemplars.shopId, shopId), eq(exemplars.classSlug, slug)))
        .get(),
    ),
    answers: number(
      db
        .select({ n: count() })
        .from(practiceAnswers)
        .where(
          and(
            eq(practiceAnswers.shopId, shopId),
            or(eq(practiceAnswers.calledClass, slug), eq(practiceAnswers.confirmedClass, slug)),
          ),
        )
        .get(),
    ),
    drills: number(
      db
        .select({ n: count() })
        .from(practiceDrills)
        .where(
          and(
            eq(practiceDrills.shopId, shopId),
            isNull(practiceDrills.withdrawnAt),
            listHolds(practiceDrills.classSlugs, sql`value = ${slug}`),
          ),
        )
        .get(),
    ),
    causes: number(
      db
        .select({ n: count() })
        .from(libraryClassCauses)
        .where(and(eq(libraryClassCauses.shopId, shopId), eq(libraryClassCauses.classSlug, slug)))
        .get(),
    ),
    lookAlikes: number(
      db
        .select({ n: count() })
        .from(libraryClasses)
        .where(
          and(
            eq(libraryClasses.shopId, shopId),
            listHolds(libraryClasses.tells, sql`json_extract(value, '$.versus') = ${slug}`),
          ),
        )
        .get(),
    ),
  };
}

function causeUses(db: Handle, shopId: number, slug: string): EntryUses {
  return {
    cases: number(
      db
        .select({ n: count() })
        .from(cases)
        .innerJoin(
          libraryCauses,
          and(eq(libraryCauses.shopId, cases.shopId), eq(libraryCauses.id, cases.confirmedCauseId)),
        )
        .where(and(eq(cases.shopId, shopId), eq(libraryCauses.slug, slug)))
        .get(),
    ),
    fixes: number(
      db
        .select({ n: count() })
        .from(libraryCauseFixes)
        .where(and(eq(libraryCauseFixes.shopId, shopId), eq(libraryCauseFixes.causeSlug, slug)))
        .get(),
    ),
  };
}

function fixUses(db: Handle, shopId: number, slug: string): EntryUses {
  const cards = db
    .select({ n: count() })
    .from(reworkCards)
    .innerJoin(libraryFixes, and(eq(libraryFixes.shopId, reworkCards.shopId), eq(libraryFixes.id, reworkCards.fixId)))
    .where(and(eq(reworkCards.shopId, shopId), eq(libraryFixes.slug, slug)))
    .get();
  return { cards: number(cards) };
}

/** Whether a JSON list holds an item; `value` names the item in the test. */
const listHolds = (column: SQLiteColumn, test: SQL) => sql`exists (select 1 from json_each(${column}) where ${test})`;
const number = (row: { n: number } | undefined) => row?.n ?? 0;
