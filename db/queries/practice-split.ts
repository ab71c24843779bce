import { and, asc, eq, inArray, lt, lte } from "drizzle-orm";
import type { Handle } from "../open";
import { calls, practiceAnswers } from "../schema";

/** How often a class was called on a part. */
export interface SplitRow {
  classSlug: string | null;
  /** Calls on the part itself, before its second look. */
  atTheTank: number;
  /** First answers of other people, in practice. */
  inPractice: number;
}

/**
 * How the shop split over a part: the calls before the second look, and what others called in practice before.
 * Each person counts once a column, with what they called first; most called first.
 */
export function splitOf(db: Handle, shopId: number, asked: { caseId: number; photoId: string; answerId: number }) {
  const tank = db
    .select({ memberId: calls.memberId, classSlug: calls.classSlug })
    .from(calls)
    .where(
      and(
        eq(calls.shopId, shopId),
        eq(calls.caseId, asked.caseId),
        lte(calls.round, 1),
        inArray(calls.kind, ["first", "further"]),
      ),
    )
    .orderBy(asc(calls.id))
    .all();
  const practice = db
    .select({ memberId: practiceAnswers.memberId, classSlug: practiceAnswers.calledClass })
    .from(practiceAnswers)
    .where(
      and(
        eq(practiceAnswers.shopId, shopId),
        eq(practiceAnswers.photoId, asked.photoId),
        lt(practiceAnswers.id, asked.answerId),
      ),
    )
    .orderBy(asc(practiceAnswers.id))
    .all();
  return tally(oncePerPerson(tank), oncePerPerson(practice));
}

interface Said {
  memberId: number;
  classSlug: string | null;
}

function oncePerPerson(rows: readonly Said[]): Said[] {
  const seen = new Set<number>();
  return rows.filter((row) => !seen.has(row.memberId) && seen.add(row.memberId));
}

function tally(tank: readonly Said[], practice: readonly Said[]): SplitRow[] {
  const slugs = [...new Set([...tank, ...practice].map((row) => row.classSlug))];
  return slugs
    .map((classSlug) => ({
      classSlug,
      atTheTank: tank.filter((row) => row.classSlug === classSlug).length,
      inPractice: practice.filter((row) => row.classSlug === classSlug).length,
    }))
    .toSorted((a, b) => b.atTheTank + b.inPractice - (a.atTheTank + a.inPractice));
}
