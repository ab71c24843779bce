import { and, asc, count, eq, sql } from "drizzle-orm";
import type { CasebookChoices } from "@/lib/cases/casebook-filter";
import type { Handle } from "../open";
import { preparedOnce } from "../prepared";
import {
  customers,
  libraryCauses,
  libraryClasses,
  members,
  photos,
  reworkCards,
  reworkSteps,
  stations,
} from "../schema";

const shopId$ = sql.placeholder("shopId");
const amongIds = (column: typeof photos.caseId | typeof reworkCards.caseId) =>
  sql`${column} in (select value from json_each(${sql.placeholder("ids")}))`;

export interface CasebookPhoto {
  id: string;
  isRendered: boolean;
}

/** The photos that tell a case at a glance: the first of the snap, and the first of the last re-strike. */
export interface CasebookPair {
  before?: CasebookPhoto;
  after?: CasebookPhoto;
}

/** Before and after of each of these cases, as far as there are photos that can be shown. */
export function listCasebookPhotos(db: Handle, shopId: number, caseIds: readonly number[]): Map<number, CasebookPair> {
  const query = preparedOnce(db, "casebook photos", () =>
    db
      .select({
        caseId: photos.caseId,
        id: photos.id,
        purpose: photos.purpose,
        round: photos.round,
        position: photos.position,
        isRendered: photos.isRendered,
      })
      .from(photos)
      .where(and(eq(photos.shopId, shopId$), amongIds(photos.caseId), eq(photos.state, "ready")))
      .prepare(),
  );
  const rows = query.all({ shopId, ids: JSON.stringify(caseIds) });
  const pairs = new Map<number, CasebookPair>();
  const afterRound = new Map<number, number>();
  for (const row of rows.sort((a, b) => a.round - b.round || a.position - b.position)) {
    if (row.caseId === null) continue;
    const pair = pairs.get(row.caseId) ?? {};
    pairs.set(row.caseId, pair);
    const photo = { id: row.id, isRendered: row.isRendered };
    if (row.purpose === "suspect") pair.before ??= photo;
    else if (row.round > (afterRound.get(row.caseId) ?? 0)) {
      afterRound.set(row.caseId, row.round);
      pair.after = photo;
    }
  }
  return pairs;
}

export interface CasebookCard {
  /** Of the newest round's card. */
  steps: number;
  ticked: number;
  /** Recorded over all rounds. */
  spentMinutes: number;
}

/** How far the card of each of these cases has come, and the minutes that went into it. Cases without a card are not in it. */
export function listCasebookCards(db: Handle, shopId: number, caseIds: readonly number[]): Map<number, CasebookCard> {
  const query = preparedOnce(db, "casebook cards", () =>
    db
      .select({
        caseId: reworkCards.caseId,
        steps: count(reworkSteps.id),
        ticked: count(reworkSteps.tickedAt),
        spentMinutes: sql<number>`coalesce(sum(${reworkSteps.spentMinutes}), 0)`,
      })
      .from(reworkCards)
      .leftJoin(reworkSteps, and(eq(reworkSteps.shopId, reworkCards.shopId), eq(reworkSteps.cardId, reworkCards.id)))
      .where(and(eq(reworkCards.shopId, shopId$), amongIds(reworkCards.caseId)))
      .groupBy(reworkCards.caseId, reworkCards.round)
      .orderBy(asc(reworkCards.caseId), asc(reworkCards.round))
      .prepare(),
  );
  const cards = new Map<number, CasebookCard>();
  for (const { caseId, spentMinutes, ...progress } of query.all({ shopId, ids: JSON.stringify(caseIds) })) {
    const earlier = cards.get(caseId)?.spentMinutes ?? 0;
    cards.set(caseId, { ...progress, spentMinutes: earlier + spentMinutes });
  }
  return cards;
}

/** What the casebook can be narrowed by, in the order in which its lists show it. */
export function listCasebookChoices(db: Handle, shopId: number): CasebookChoices {
  const queries = preparedOnce(db, "casebook choices", () => ({
    classes: db
      .select({ slug: libraryClasses.slug, title: libraryClasses.title })
      .from(libraryClasses)
      .where(eq(libraryClasses.shopId, shopId$))
      .orderBy(asc(libraryClasses.position))
      .prepare(),
    causes: db
      .select({ id: libraryCauses.id, slug: libraryCauses.slug, title: libraryCauses.title })
      .from(libraryCauses)
      .where(eq(libraryCauses.shopId, shopId$))
      .orderBy(asc(libraryCauses.title))
      .prepare(),
    stations: db
      .select({ id: stations.id, slug: stations.slug, name: stations.name })
      .from(stations)
      .where(eq(stations.shopId, shopId$))
      .orderBy(asc(stations.position))
      .prepare(),
    customers: db
      .select({ id: customers.id, name: customers.name })
      .from(customers)
      .where(eq(customers.shopId, shopId$))
      .orderBy(asc(customers.name))
      .prepare(),
    members: db
      .select({ id: members.id, name: members.name })
      .from(members)
      .where(eq(members.shopId, shopId$))
      .orderBy(asc(members.name))
      .prepare(),
  }));
  const of = { shopId };
  return {
    classes: queries.classes.all(of),
    causes: queries.causes.all(of),
    stations: queries.stations.all(of),
    customers: queries.customers.all(of),
    members: queries.members.all(of),
  };
}
