import { randomUUID } from "node:crypto";
import { asc, eq, sql } from "drizzle-orm";
import { formatCaseRef, yearMonth } from "@/lib/cases/case-ref";
import { CLASS_TITLES } from "@/lib/cases/case-words";
import type { Db } from "@/db/open";
import {
  calls,
  caseEvents,
  cases,
  caseTexts,
  libraryCauses,
  libraryClassCauses,
  members,
  shops,
  stations,
  workOrders,
} from "@/db/schema";
import { seededRandom, type Random } from "@/db/seed/photos/random";
import { DEMO_FAULTS } from "./demo-jobs";
import { pick } from "./demo-plan";

const DAY_MS = 86_400_000;
const YEARS_MS = 6 * 365 * DAY_MS;
const BATCH = 2000;
/** Bare cases take numbers from here on, so that they never meet those that people open. */
const FIRST_NUMBER = 100_001;

/**
 * Adds bare closed cases over six years to the first demo shop: row, call, history, words for the search, no photos.
 * For measuring only; the figures in them are made up.
 * @returns how many were added
 */
export function seedBulkCases(db: Db, wanted: number, now: number): number {
  const shop = db.select({ id: shops.id }).from(shops).where(eq(shops.isDemo, true)).orderBy(asc(shops.id)).get();
  if (!shop) throw new Error("There is no demo shop. Run npm run db:seed -- --demo first.");
  const context = bulkContext(db, shop.id);
  const random = seededRandom(99);
  for (let from = 0; from < wanted; from += BATCH) {
    const size = Math.min(BATCH, wanted - from);
    db.transaction((tx) => {
      for (let index = 0; index < size; index += 1) {
        // Oldest first, so that row numbers grow with time as in life.
        const openedAt = Math.round(now - YEARS_MS + ((from + index) / wanted) * (YEARS_MS - 130 * DAY_MS));
        insertBare(tx, context, random, { number: FIRST_NUMBER + from + index, openedAt });
      }
    });
  }
  db.$client.exec("analyze");
  return wanted;
}

type BulkContext = ReturnType<typeof bulkContext>;

function bulkContext(db: Db, shopId: number) {
  const causes = db
    .select({
      id: libraryCauses.id,
      classSlug: libraryClassCauses.classSlug,
      title: libraryCauses.title,
      kind: libraryCauses.stationKind,
      weight: libraryCauses.likelihood,
    })
    .from(libraryClassCauses)
    .innerJoin(
      libraryCauses,
      sql`${libraryCauses.shopId} = ${libraryClassCauses.shopId} and ${libraryCauses.slug} = ${libraryClassCauses.causeSlug}`,
    )
    .where(eq(libraryClassCauses.shopId, shopId))
    .all();
  return {
    shopId,
    causes,
    jobs: db
      .select({
        id: workOrders.id,
        number: workOrders.number,
        partName: workOrders.partName,
        baseMetal: workOrders.baseMetal,
        alloy: workOrders.alloy,
      })
      .from(workOrders)
      .where(eq(workOrders.shopId, shopId))
      .all(),
    stations: db
      .select({ id: stations.id, kind: stations.kind })
      .from(stations)
      .where(eq(stations.shopId, shopId))
      .all(),
    crew: db.select({ id: members.id }).from(members).where(eq(members.shopId, shopId)).all(),
  };
}

function insertBare(
  tx: Parameters<Parameters<Db["transaction"]>[0]>[0],
  context: BulkContext,
  random: Random,
  bare: { number: number; openedAt: number },
): void {
  const { shopId } = context;
  const at = <Item>(items: readonly Item[]): Item => {
    const item = items[Math.floor(random() * items.length)];
    if (item === undefined) throw new RangeError("items: the list is empty");
    return item;
  };
  const fault = pick(random, DEMO_FAULTS);
  const cause = pick(
    random,
    context.causes.filter((each) => each.classSlug === fault.slug),
  );
  const job = at(context.jobs);
  const [opener, senior] = [at(context.crew).id, at(context.crew).id];
  const traced = context.stations.find((station) => station.kind === cause.kind)?.id ?? null;
  const ref = formatCaseRef(yearMonth(bare.openedAt, "UTC"), bare.number);
  const note = at(fault.notes);
  const closedAt = bare.openedAt + Math.round(random() * DAY_MS);
  const costCents = 800 + Math.floor(random() * random() * 30_000);
  const { id } = tx
    .insert(cases)
    .values({
      shopId,
      ref,
      snapKey: randomUUID(),
      state: "closed",
      closing: "sound",
      round: 1,
      workOrderId: job.id,
      baseMetal: job.baseMetal,
      alloy: job.alloy,
      method: "bath",
      stageFound: "at-strike",
      quantity: 1 + Math.floor(random() * 9),
      foundStationId: at(context.stations).id,
      tracedStationId: traced,
      symptoms: fault.symptoms,
      note,
      openedById: opener,
      openedAt: bare.openedAt,
      heldAt: bare.openedAt,
      calledClass: fault.slug,
      calledSure: 2,
      confirmedClass: fault.slug,
      confirmedCauseId: cause.id,
      confirmedById: senior,
      confirmedAt: bare.openedAt + 3_600_000,
      disposition: "rework",
      closedAt,
      atRiskCents: costCents * 8,
      costCents,
      costBasis: "recorded",
    }) // prettier-ignore
    .returning({ id: cases.id })
    .get();
  tx.insert(calls)
    .values({
      shopId,
      caseId: id,
      round: 1,
      kind: "first",
      memberId: opener,
      asTrainee: false,
      classSlug: fault.slug,
      sure: 2,
      at: bare.openedAt,
    })
    .run();
  const opened: typeof caseEvents.$inferInsert = {
    shopId,
    caseId: id,
    round: 1,
    event: "opened",
    fromState: null,
    toState: "held",
    memberId: opener,
    detail: {},
    at: bare.openedAt,
  };
  tx.insert(caseEvents)
    .values([opened, { ...opened, event: "re-strike-sound", fromState: "in-rework", toState: "closed", at: closedAt }])
    .run();
  tx.insert(caseTexts)
    .values({
      caseId: id,
      shopId,
      ref,
      job: `${job.number} ${job.partName} ${job.baseMetal} ${job.alloy ?? ""}`,
      class: CLASS_TITLES[fault.slug],
      cause: cause.title,
      notes: note,
    })
    .run();
}
