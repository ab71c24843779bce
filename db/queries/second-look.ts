import { and, asc, count, desc, eq, gt, inArray, isNotNull, lt, ne, or, sql, sum } from "drizzle-orm";
import type { BaseMetal, Symptom } from "@/lib/cases/case-words";
import type { Handle } from "../open";
import { preparedOnce } from "../prepared";
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
  workOrders,
} from "../schema";

/** Where a case stands in the queue: most money at risk first, then who waits longest. */
export interface QueuePlace {
  atRiskCents: number;
  heldAt: number;
  id: number;
}

const waiting = (shopId: number, stationId: number | null) =>
  and(
    eq(cases.shopId, shopId),
    eq(cases.state, "held"),
    stationId === null ? undefined : eq(cases.tracedStationId, stationId),
  );

const behind = (place: QueuePlace | ReturnType<typeof placeNamed>) =>
  or(
    lt(cases.atRiskCents, place.atRiskCents),
    and(eq(cases.atRiskCents, place.atRiskCents), gt(cases.heldAt, place.heldAt)),
    and(eq(cases.atRiskCents, place.atRiskCents), eq(cases.heldAt, place.heldAt), gt(cases.id, place.id)),
  );

const aheadOf = (place: QueuePlace) =>
  or(
    gt(cases.atRiskCents, place.atRiskCents),
    and(eq(cases.atRiskCents, place.atRiskCents), lt(cases.heldAt, place.heldAt)),
    and(eq(cases.atRiskCents, place.atRiskCents), eq(cases.heldAt, place.heldAt), lt(cases.id, place.id)),
  );

const queueColumns = {
  id: cases.id,
  ref: cases.ref,
  round: cases.round,
  heldAt: cases.heldAt,
  atRiskCents: cases.atRiskCents,
  quantity: cases.quantity,
  baseMetal: cases.baseMetal,
  alloy: cases.alloy,
  partName: workOrders.partName,
  calledClass: cases.calledClass,
  confirmedClass: cases.confirmedClass,
  /** Of the class that was called in this round, else of the one confirmed in the round before. */
  classTitle: libraryClasses.title,
};

const queueRows = (db: Handle) =>
  db
    .select(queueColumns)
    .from(cases)
    .innerJoin(workOrders, and(eq(workOrders.shopId, cases.shopId), eq(workOrders.id, cases.workOrderId)))
    .leftJoin(
      libraryClasses,
      and(
        eq(libraryClasses.shopId, cases.shopId),
        eq(libraryClasses.slug, sql`coalesce(${cases.calledClass}, ${cases.confirmedClass})`),
      ),
    );

export type QueueRow = ReturnType<typeof listQueue>[number];

/**
 * Cases that wait for a second look.
 * @param page `after`: the last one that was shown; `from`: begin with this one; `stationId`: only those that trace
 *   back to it
 */
export function listQueue(
  db: Handle,
  shopId: number,
  page: { stationId: number | null; after?: QueuePlace | null; from?: QueuePlace; limit: number },
) {
  const { stationId, after, from, limit } = page;
  const shape = `second-look queue ${stationId !== null} ${Boolean(after)} ${Boolean(from)}`;
  const query = preparedOnce(db, shape, () =>
    queueRows(db)
      .where(
        and(
          eq(cases.shopId, sql.placeholder("shopId")),
          eq(cases.state, "held"),
          stationId === null ? undefined : eq(cases.tracedStationId, sql.placeholder("stationId")),
          after ? behind(placeNamed("after")) : undefined,
          from ? or(eq(cases.id, placeNamed("from").id), behind(placeNamed("from"))) : undefined,
        ),
      )
      .orderBy(desc(cases.atRiskCents), asc(cases.heldAt), asc(cases.id))
      .limit(sql.placeholder("limit"))
      .prepare(),
  );
  return query.all({ shopId, stationId, limit, ...valuesOf("after", after), ...valuesOf("from", from) });
}

/** A place that is only known when the prepared query runs. */
const placeNamed = (name: string) => ({
  atRiskCents: sql.placeholder(`${name}.atRiskCents`),
  heldAt: sql.placeholder(`${name}.heldAt`),
  id: sql.placeholder(`${name}.id`),
});

const valuesOf = (name: string, place: QueuePlace | null | undefined) =>
  place
    ? { [`${name}.atRiskCents`]: place.atRiskCents, [`${name}.heldAt`]: place.heldAt, [`${name}.id`]: place.id }
    : {};

/** How many cases and parts wait, all of them or those that trace back to a station; with `before`, those in front of it. */
export function countQueue(
  db: Handle,
  shopId: number,
  narrow: { stationId: number | null; before?: QueuePlace },
): { cases: number; parts: number } {
  const row = db
    .select({ cases: count(), parts: sum(cases.quantity).mapWith(Number) })
    .from(cases)
    .where(and(waiting(shopId, narrow.stationId), narrow.before ? aheadOf(narrow.before) : undefined))
    .get();
  return { cases: row?.cases ?? 0, parts: row?.parts ?? 0 };
}

/** Where a case stands, whether it still waits or not. Null for another shop's. */
export function getQueuePlace(db: Handle, shopId: number, caseId: number): QueuePlace | null {
  return (
    db
      .select({ atRiskCents: cases.atRiskCents, heldAt: cases.heldAt, id: cases.id })
      .from(cases)
      .where(and(eq(cases.shopId, shopId), eq(cases.id, caseId)))
      .get() ?? null
  );
}

/** The case to look at after this one: the next in the queue, or from its end the first. Null when no other waits. */
export function getNextInQueue(db: Handle, shopId: number, stationId: number | null, place: QueuePlace): string | null {
  const next = listQueue(db, shopId, { stationId, after: place, limit: 1 })[0];
  if (next) return next.ref;
  const first = listQueue(db, shopId, { stationId, limit: 2 }).find((row) => row.id !== place.id);
  return first?.ref ?? null;
}

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
    .innerJoin(cases, and(eq(cases.shopId, photos.shopId), eq(cases.id, photos.caseId)))
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
