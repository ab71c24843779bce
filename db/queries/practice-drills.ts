import { and, asc, count, desc, eq, isNull, sql } from "drizzle-orm";
import type { Handle } from "../open";
import { members, practiceAnswers, practiceDrillMembers, practiceDrills } from "../schema";

const drillColumns = {
  id: practiceDrills.id,
  title: practiceDrills.title,
  classSlugs: practiceDrills.classSlugs,
  photoCount: practiceDrills.photoCount,
  setAt: practiceDrills.setAt,
  dueAt: practiceDrills.dueAt,
  withdrawnAt: practiceDrills.withdrawnAt,
};

/** A drill of the shop, whatever became of it. */
export function getDrill(db: Handle, shopId: number, id: number) {
  return (
    db
      .select(drillColumns)
      .from(practiceDrills)
      .where(and(eq(practiceDrills.shopId, shopId), eq(practiceDrills.id, id)))
      .get() ?? null
  );
}

export type Drill = NonNullable<ReturnType<typeof getDrill>>;

/** The drills that are set for a person now: those with a day first, the nearest day first. */
export function listDrillsFor(db: Handle, shopId: number, memberId: number): Drill[] {
  return db
    .select(drillColumns)
    .from(practiceDrills)
    .innerJoin(
      practiceDrillMembers,
      and(eq(practiceDrillMembers.shopId, practiceDrills.shopId), eq(practiceDrillMembers.drillId, practiceDrills.id)),
    )
    .where(
      and(
        eq(practiceDrills.shopId, shopId),
        isNull(practiceDrills.withdrawnAt),
        eq(practiceDrillMembers.memberId, memberId),
      ),
    )
    .orderBy(sql`${practiceDrills.dueAt} is null`, asc(practiceDrills.dueAt), asc(practiceDrills.setAt))
    .all();
}

/** A drill set for this person that they may still do; null when there is none. */
export function getOwnDrill(db: Handle, shopId: number, memberId: number, id: number): Drill | null {
  return listDrillsFor(db, shopId, memberId).find((drill) => drill.id === id) ?? null;
}

/** The shop's newest drills, the withdrawn ones too. */
export function listDrills(db: Handle, shopId: number, limit: number) {
  return db
    .select({ ...drillColumns, setBy: members.name })
    .from(practiceDrills)
    .innerJoin(members, and(eq(members.shopId, practiceDrills.shopId), eq(members.id, practiceDrills.setById)))
    .where(eq(practiceDrills.shopId, shopId))
    .orderBy(desc(practiceDrills.setAt), desc(practiceDrills.id))
    .limit(limit)
    .all();
}

/** Whom a drill is set for, by name, with what they called in it. */
export function listDrillPeople(db: Handle, shopId: number, drillId: number) {
  return db
    .select({
      memberId: members.id,
      name: members.name,
      called: count(practiceAnswers.id),
      right: sql<number>`coalesce(sum(${practiceAnswers.calledClass} = ${practiceAnswers.confirmedClass}), 0)`,
    })
    .from(practiceDrillMembers)
    .innerJoin(
      members,
      and(eq(members.shopId, practiceDrillMembers.shopId), eq(members.id, practiceDrillMembers.memberId)),
    )
    .leftJoin(
      practiceAnswers,
      and(
        eq(practiceAnswers.shopId, practiceDrillMembers.shopId),
        eq(practiceAnswers.drillId, practiceDrillMembers.drillId),
        eq(practiceAnswers.memberId, practiceDrillMembers.memberId),
      ),
    )
    .where(and(eq(practiceDrillMembers.shopId, shopId), eq(practiceDrillMembers.drillId, drillId)))
    .groupBy(members.id)
    .orderBy(asc(sql`lower(${members.name})`))
    .all();
}
