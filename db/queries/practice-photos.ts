import { and, asc, desc, eq, isNotNull, lt, ne, sql, type SQL } from "drizzle-orm";
import type { Askable } from "@/lib/practice/next-photo";
import { OWN_DAYS } from "@/lib/practice/practice-words";
import type { Handle } from "../open";
import { cases, photos, practiceMemories } from "../schema";

/** Newest photos of a class from which the next one is drawn. */
const DRAWN_FROM = 24;
/** Most photos that are due which are looked through at once. */
const DUE_AT_ONCE = 60;

/**
 * What the photos of the snap show: the newest second look before the part was struck again. A later round looks at
 * another strike, so its class says nothing about the first photos; a confirmation that was taken back and given anew does.
 */
const shownClass: SQL<string | null> = sql`coalesce((
  select k.class_slug from calls k
  where k.shop_id = ${cases.shopId} and k.case_id = ${cases.id} and k.kind = 'second-look'
    and k.round <= coalesce((
      select min(e.round) from case_events e
      where e.shop_id = ${cases.shopId} and e.case_id = ${cases.id}
        and e.event in ('re-strike-failed', 're-strike-sound')), k.round)
  order by k.id desc limit 1), ${cases.confirmedClass})`;

/** One photo a case, since a second photo of the same part is already answered by the first. */
const firstPhotoOfCase = sql`(
  select p.id from photos p
  where p.shop_id = ${cases.shopId} and p.case_id = ${cases.id} and p.round = 1 and p.purpose = 'suspect' and p.state = 'ready'
  order by p.position, p.id limit 1)`;

const standsConfirmed = (shopId: number) =>
  and(eq(cases.shopId, shopId), ne(cases.state, "held"), isNotNull(cases.confirmedClass));

/** Who practises, and when. */
export interface Practising {
  shopId: number;
  memberId: number;
  now: number;
}

const columnsFor = ({ memberId, now }: Practising) => {
  const since = now - OWN_DAYS * 86_400_000;
  return {
    photoId: photos.id,
    caseId: cases.id,
    classSlug: shownClass,
    dueAt: practiceMemories.dueAt,
    isOwnRecent: sql<number>`((${cases.openedById} = ${memberId} and ${cases.openedAt} >= ${since})
      or (${cases.confirmedById} = ${memberId} and ${cases.confirmedAt} >= ${since}))`,
  };
};

const ownMemory = ({ shopId, memberId }: Practising) =>
  and(
    eq(practiceMemories.shopId, shopId),
    eq(practiceMemories.memberId, memberId),
    eq(practiceMemories.photoId, photos.id),
  );

type Row = Omit<Askable, "classSlug" | "isOwnRecent"> & { classSlug: string | null; isOwnRecent: number };

const askable = (rows: readonly Row[]): Askable[] =>
  rows.flatMap(({ classSlug, isOwnRecent, ...row }) =>
    classSlug === null ? [] : [{ ...row, classSlug, isOwnRecent: Boolean(isOwnRecent) }],
  );

/** Photos that come back to this person before a moment, the longest due first. */
export function listDuePhotos(db: Handle, who: Practising, before: number): Askable[] {
  const rows = db
    .select(columnsFor(who))
    .from(practiceMemories)
    .innerJoin(photos, and(eq(photos.shopId, practiceMemories.shopId), eq(photos.id, practiceMemories.photoId)))
    .innerJoin(cases, and(eq(cases.shopId, photos.shopId), eq(cases.id, photos.caseId)))
    .where(
      and(
        eq(practiceMemories.shopId, who.shopId),
        eq(practiceMemories.memberId, who.memberId),
        lt(practiceMemories.dueAt, before),
        eq(photos.state, "ready"),
        standsConfirmed(who.shopId),
      ),
    )
    .orderBy(asc(practiceMemories.dueAt))
    .limit(DUE_AT_ONCE)
    .all();
  return askable(rows);
}

/**
 * The shop's newest photos of each class that this person may be asked.
 * @param isNew only those that this person never called
 * @param notInDrill leaves out those that they called in this drill
 */
export function listPhotosOfClasses(
  db: Handle,
  who: Practising,
  classSlugs: readonly string[],
  { isNew = false, notInDrill }: { isNew?: boolean; notInDrill?: number } = {},
): Askable[] {
  const inDrill = sql`exists (select 1 from practice_answers a where a.shop_id = ${who.shopId} and a.photo_id = ${photos.id}
    and a.member_id = ${who.memberId} and a.drill_id = ${notInDrill ?? 0})`;
  return classSlugs.flatMap((slug) =>
    askable(
      db
        .select(columnsFor(who))
        .from(cases)
        .innerJoin(photos, and(eq(photos.shopId, cases.shopId), eq(photos.id, firstPhotoOfCase)))
        .leftJoin(practiceMemories, ownMemory(who))
        .where(
          and(
            standsConfirmed(who.shopId),
            eq(cases.confirmedClass, slug),
            isNew ? sql`${practiceMemories.dueAt} is null` : undefined,
            notInDrill === undefined ? undefined : sql`not ${inDrill}`,
          ),
        )
        .orderBy(desc(cases.openedAt), desc(cases.id))
        .limit(DRAWN_FROM)
        .all(),
    ),
  );
}

/** The class that a photo shows now, or null once it may not be asked any more. */
export function getAskablePhoto(db: Handle, shopId: number, photoId: string) {
  const row = db
    .select({
      classSlug: shownClass,
      caseId: cases.id,
      ref: cases.ref,
      causeId: cases.confirmedCauseId,
      baseMetal: cases.baseMetal,
      alloy: cases.alloy,
      method: cases.method,
      stageFound: cases.stageFound,
      isRendered: photos.isRendered,
    })
    .from(photos)
    .innerJoin(cases, and(eq(cases.shopId, photos.shopId), eq(cases.id, photos.caseId)))
    .where(and(eq(photos.shopId, shopId), eq(photos.id, photoId), eq(photos.state, "ready"), standsConfirmed(shopId)))
    .get();
  return row && row.classSlug !== null ? { ...row, classSlug: row.classSlug } : null;
}

/** When each photo that this person has called comes back; only those that can still be asked. */
export function listDueMoments(db: Handle, shopId: number, memberId: number): number[] {
  return db
    .select({ dueAt: practiceMemories.dueAt })
    .from(practiceMemories)
    .innerJoin(photos, and(eq(photos.shopId, practiceMemories.shopId), eq(photos.id, practiceMemories.photoId)))
    .innerJoin(cases, and(eq(cases.shopId, photos.shopId), eq(cases.id, photos.caseId)))
    .where(
      and(
        eq(practiceMemories.shopId, shopId),
        eq(practiceMemories.memberId, memberId),
        eq(photos.state, "ready"),
        standsConfirmed(shopId),
      ),
    )
    .all()
    .map((row) => row.dueAt);
}

/** What this person remembers of a photo. */
export function getMemory(db: Handle, shopId: number, memberId: number, photoId: string) {
  return (
    db
      .select({ dueAt: practiceMemories.dueAt, memory: practiceMemories.memory })
      .from(practiceMemories)
      .where(
        and(
          eq(practiceMemories.shopId, shopId),
          eq(practiceMemories.memberId, memberId),
          eq(practiceMemories.photoId, photoId),
        ),
      )
      .get() ?? null
  );
}
