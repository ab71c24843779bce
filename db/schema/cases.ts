import { desc, sql, type SQL } from "drizzle-orm";
import {
  foreignKey,
  index,
  integer,
  primaryKey,
  sqliteTable,
  text,
  unique,
  uniqueIndex,
  type AnySQLiteColumn,
} from "drizzle-orm/sqlite-core";
import { BASE_METALS, CLOSINGS, DISPOSITIONS, METHODS, OUTCOMES, STAGES_FOUND } from "@/lib/cases/case-words";
import type { Sureness, Symptom } from "@/lib/cases/case-words";
import { CASE_EVENTS, CASE_STATES } from "@/lib/cases/case-state";
import { STRIP_METHODS } from "@/lib/costs/strip-methods";
import { moment, ownerShopId, rowId } from "./columns";
import { members } from "./crew";
import { libraryCauses, libraryClasses, libraryFixes } from "./library";
import { runs, solutions, stations, workOrders } from "./line";

/** The last running number given out, per shop and month, so that a reference is never given twice. */
export const caseNumbers = sqliteTable(
  "case_numbers",
  { shopId: ownerShopId(), yearMonth: text("year_month").notNull(), last: integer("last").notNull() },
  (t) => [primaryKey({ columns: [t.shopId, t.yearMonth] })],
);

interface ClassColumns {
  state: AnySQLiteColumn;
  calledClass: AnySQLiteColumn;
  confirmedClass: AnySQLiteColumn;
}

/**
 * The class that a case stands under: while it is held the newest call, else what the second look confirmed. One
 * expression for index and queries, since the index answers only for exactly this one; without a comma, at which
 * drizzle-kit would cut it in two.
 */
export const standingClass = (t: ClassColumns): SQL<string | null> =>
  sql`(case when ${t.state} = 'held' and ${t.calledClass} is not null then ${t.calledClass} else ${t.confirmedClass} end)`;

export const cases = sqliteTable(
  "cases",
  {
    id: rowId(),
    shopId: ownerShopId(),
    ref: text("ref").notNull(),
    /** Made by the phone at the snap: sending the same snap twice opens one case. */
    snapKey: text("snap_key").notNull(),
    state: text("state", { enum: CASE_STATES }).notNull(),
    closing: text("closing", { enum: CLOSINGS }),
    round: integer("round").notNull().default(1),

    workOrderId: integer("work_order_id").notNull(),
    runId: integer("run_id"),
    baseMetal: text("base_metal", { enum: BASE_METALS }).notNull(),
    alloy: text("alloy"),
    method: text("method", { enum: METHODS }).notNull(),
    stageFound: text("stage_found", { enum: STAGES_FOUND }).notNull(),
    /** How many parts look like this. */
    quantity: integer("quantity").notNull(),
    /** Where on the line it was seen. */
    foundStationId: integer("found_station_id").notNull(),
    /** Where it began, as far as is known: from the first call's likeliest cause, then from the confirmed one. */
    tracedStationId: integer("traced_station_id"),
    symptoms: text("symptoms", { mode: "json" }).$type<Symptom[]>().notNull(),
    note: text("note").notNull().default(""),

    openedById: integer("opened_by_id").notNull(),
    openedAt: moment("opened_at").notNull(),
    /** Since when it waits for a second look in this round. */
    heldAt: moment("held_at").notNull(),
    /** The newest call before the second look; a shortcut to the row in `calls`. */
    calledClass: text("called_class"),
    calledSure: integer("called_sure").$type<Sureness>(),

    confirmedClass: text("confirmed_class"),
    confirmedCauseId: integer("confirmed_cause_id"),
    confirmedById: integer("confirmed_by_id"),
    confirmedAt: moment("confirmed_at"),
    /** The senior confirmed their own first call: shown, and left out of the agreement figures. */
    selfConfirmed: integer("self_confirmed", { mode: "boolean" }).notNull().default(false),
    disposition: text("disposition", { enum: DISPOSITIONS }),
    closedAt: moment("closed_at"),
    /** The way to take the deposit off that a senior chose on the strip estimator. Null: the cheapest that is safe. */
    stripMethod: text("strip_method", { enum: STRIP_METHODS }),

    /** What it is likely to cost if it goes on and fails later. Orders the queue. */
    atRiskCents: integer("at_risk_cents").notNull(),
    /** Best figure so far: recorded once a card is done, before that the estimate. */
    costCents: integer("cost_cents").notNull(),
    costBasis: text("cost_basis", { enum: ["estimate", "recorded"] }).notNull(),
  },
  (t) => [
    unique("cases_shop_row").on(t.shopId, t.id),
    uniqueIndex("cases_ref").on(t.shopId, t.ref),
    uniqueIndex("cases_snap_key").on(t.shopId, t.snapKey),
    index("cases_by_time").on(t.shopId, t.openedAt, t.id),
    index("cases_by_state").on(t.shopId, t.state, t.openedAt, t.id),
    index("cases_by_class").on(t.shopId, t.confirmedClass, t.openedAt, t.id),
    index("cases_by_cause").on(t.shopId, t.confirmedCauseId, t.openedAt, t.id),
    index("cases_by_traced").on(t.shopId, t.tracedStationId, t.openedAt, t.id),
    index("cases_by_metal").on(t.shopId, t.baseMetal, t.openedAt, t.id),
    index("cases_by_opener").on(t.shopId, t.openedById, t.openedAt),
    // In the queue's own order: most money first, then who waits longest.
    index("cases_queue").on(t.shopId, t.state, desc(t.atRiskCents), t.heldAt, t.id),
    // The casebook's filters: each leads straight to its cases in the order in which they are shown.
    index("cases_by_standing_class").on(t.shopId, standingClass(t), t.openedAt, t.id),
    index("cases_by_closing").on(t.shopId, t.closing, t.openedAt, t.id),
    index("cases_by_stage").on(t.shopId, t.stageFound, t.openedAt, t.id),
    index("cases_by_job").on(t.shopId, t.workOrderId, t.openedAt, t.id),
    // A closing period leads by itself; the columns after the id let the other filters be tested in the index.
    index("cases_by_closed_time").on(
      t.shopId,
      t.closedAt,
      t.id,
      t.state,
      t.closing,
      t.confirmedCauseId,
      standingClass(t),
      t.tracedStationId,
      t.workOrderId,
      t.baseMetal,
    ),
    foreignKey({ columns: [t.shopId, t.workOrderId], foreignColumns: [workOrders.shopId, workOrders.id] }),
    foreignKey({ columns: [t.shopId, t.runId], foreignColumns: [runs.shopId, runs.id] }),
    foreignKey({ columns: [t.shopId, t.foundStationId], foreignColumns: [stations.shopId, stations.id] }),
    foreignKey({ columns: [t.shopId, t.tracedStationId], foreignColumns: [stations.shopId, stations.id] }),
    foreignKey({ columns: [t.shopId, t.openedById], foreignColumns: [members.shopId, members.id] }),
    foreignKey({ columns: [t.shopId, t.confirmedById], foreignColumns: [members.shopId, members.id] }),
    foreignKey({ columns: [t.shopId, t.calledClass], foreignColumns: [libraryClasses.shopId, libraryClasses.slug] }),
    foreignKey({ columns: [t.shopId, t.confirmedClass], foreignColumns: [libraryClasses.shopId, libraryClasses.slug] }),
    foreignKey({ columns: [t.shopId, t.confirmedCauseId], foreignColumns: [libraryCauses.shopId, libraryCauses.id] }),
  ],
);

export const caseSolutions = sqliteTable(
  "case_solutions",
  { shopId: ownerShopId(), caseId: integer("case_id").notNull(), solutionId: integer("solution_id").notNull() },
  (t) => [
    primaryKey({ columns: [t.caseId, t.solutionId] }),
    foreignKey({ columns: [t.shopId, t.caseId], foreignColumns: [cases.shopId, cases.id] }),
    foreignKey({ columns: [t.shopId, t.solutionId], foreignColumns: [solutions.shopId, solutions.id] }),
  ],
);

/** One person's opinion of the class. Append-only by trigger. Null class: "can't tell". */
export const calls = sqliteTable(
  "calls",
  {
    id: rowId(),
    shopId: ownerShopId(),
    caseId: integer("case_id").notNull(),
    round: integer("round").notNull(),
    kind: text("kind", { enum: ["first", "further", "second-look"] }).notNull(),
    memberId: integer("member_id").notNull(),
    /** The caller was only a trainee at the time. */
    asTrainee: integer("as_trainee", { mode: "boolean" }).notNull(),
    classSlug: text("class_slug"),
    sure: integer("sure").$type<Sureness>().notNull(),
    at: moment("at").notNull(),
  },
  (t) => [
    index("calls_case").on(t.shopId, t.caseId, t.id),
    index("calls_member").on(t.shopId, t.memberId, t.at),
    foreignKey({ columns: [t.shopId, t.caseId], foreignColumns: [cases.shopId, cases.id] }),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
    foreignKey({ columns: [t.shopId, t.classSlug], foreignColumns: [libraryClasses.shopId, libraryClasses.slug] }),
  ],
);

/** The case's history: every change of state and every correction. Append-only by trigger. */
export const caseEvents = sqliteTable(
  "case_events",
  {
    id: rowId(),
    shopId: ownerShopId(),
    caseId: integer("case_id").notNull(),
    round: integer("round").notNull(),
    event: text("event", { enum: CASE_EVENTS }).notNull(),
    fromState: text("from_state", { enum: CASE_STATES }),
    toState: text("to_state", { enum: CASE_STATES }).notNull(),
    memberId: integer("member_id").notNull(),
    why: text("why").notNull().default(""),
    detail: text("detail", { mode: "json" }).$type<Record<string, unknown>>().notNull(),
    at: moment("at").notNull(),
  },
  (t) => [
    index("case_events_case").on(t.shopId, t.caseId, t.id),
    foreignKey({ columns: [t.shopId, t.caseId], foreignColumns: [cases.shopId, cases.id] }),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);

export const reworkCards = sqliteTable(
  "rework_cards",
  {
    id: rowId(),
    shopId: ownerShopId(),
    caseId: integer("case_id").notNull(),
    round: integer("round").notNull(),
    fixId: integer("fix_id"),
    title: text("title").notNull(),
    madeById: integer("made_by_id").notNull(),
    madeAt: moment("made_at").notNull(),
    doneAt: moment("done_at"),
    outcome: text("outcome", { enum: OUTCOMES }),
    outcomeNote: text("outcome_note").notNull().default(""),
    outcomeById: integer("outcome_by_id"),
  },
  (t) => [
    unique("rework_cards_row").on(t.shopId, t.id),
    uniqueIndex("rework_cards_round").on(t.shopId, t.caseId, t.round),
    foreignKey({ columns: [t.shopId, t.caseId], foreignColumns: [cases.shopId, cases.id] }),
    foreignKey({ columns: [t.shopId, t.fixId], foreignColumns: [libraryFixes.shopId, libraryFixes.id] }),
    foreignKey({ columns: [t.shopId, t.madeById], foreignColumns: [members.shopId, members.id] }),
    foreignKey({ columns: [t.shopId, t.outcomeById], foreignColumns: [members.shopId, members.id] }),
  ],
);

export interface StoredCaution {
  level: "caution" | "stop";
  text: string;
}

export const reworkSteps = sqliteTable(
  "rework_steps",
  {
    id: rowId(),
    shopId: ownerShopId(),
    cardId: integer("card_id").notNull(),
    position: integer("position").notNull(),
    title: text("title").notNull(),
    detail: text("detail").notNull(),
    plannedMinutes: integer("planned_minutes").notNull(),
    /** The cautions as they stood when the card was sent: beside the step, whatever the library says later. */
    cautions: text("cautions", { mode: "json" }).$type<StoredCaution[]>().notNull(),
    tickedById: integer("ticked_by_id"),
    tickedAt: moment("ticked_at"),
    spentMinutes: integer("spent_minutes"),
  },
  (t) => [
    uniqueIndex("rework_steps_position").on(t.shopId, t.cardId, t.position),
    foreignKey({ columns: [t.shopId, t.cardId], foreignColumns: [reworkCards.shopId, reworkCards.id] }),
    foreignKey({ columns: [t.shopId, t.tickedById], foreignColumns: [members.shopId, members.id] }),
  ],
);

/** The words of a case that the full-text index holds; `case_search` (FTS5) reads this table. */
export const caseTexts = sqliteTable(
  "case_texts",
  {
    caseId: integer("case_id").primaryKey(),
    shopId: ownerShopId(),
    /** One word that names the shop, so that the index itself keeps shops apart. */
    scope: text("scope").generatedAlwaysAs(sql`'s' || shop_id`, { mode: "stored" }),
    ref: text("ref").notNull(),
    job: text("job").notNull(),
    class: text("class").notNull(),
    cause: text("cause").notNull(),
    notes: text("notes").notNull(),
  },
  (t) => [
    index("case_texts_shop").on(t.shopId),
    foreignKey({ columns: [t.shopId, t.caseId], foreignColumns: [cases.shopId, cases.id] }),
  ],
);
