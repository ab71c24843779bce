import {
  foreignKey,
  index,
  integer,
  primaryKey,
  sqliteTable,
  text,
  unique,
  uniqueIndex,
} from "drizzle-orm/sqlite-core";
import type { Sureness } from "@/lib/cases/case-words";
import { cases } from "./cases";
import { moment, ownerShopId, rowId } from "./columns";
import { members } from "./crew";
import { libraryClasses } from "./library";
import { photos } from "./photos";

/** A drill that a senior set: so many photos of these classes, for these people. */
export const practiceDrills = sqliteTable(
  "practice_drills",
  {
    id: rowId(),
    shopId: ownerShopId(),
    title: text("title").notNull(),
    /** Empty: every class that the shop has confirmed photos of. */
    classSlugs: text("class_slugs", { mode: "json" }).$type<string[]>().notNull(),
    photoCount: integer("photo_count").notNull(),
    setById: integer("set_by_id").notNull(),
    setAt: moment("set_at").notNull(),
    dueAt: moment("due_at"),
    withdrawnAt: moment("withdrawn_at"),
  },
  (t) => [
    unique("practice_drills_row").on(t.shopId, t.id),
    index("practice_drills_set").on(t.shopId, t.withdrawnAt, t.setAt),
    foreignKey({ columns: [t.shopId, t.setById], foreignColumns: [members.shopId, members.id] }),
  ],
);

export const practiceDrillMembers = sqliteTable(
  "practice_drill_members",
  { shopId: ownerShopId(), drillId: integer("drill_id").notNull(), memberId: integer("member_id").notNull() },
  (t) => [
    primaryKey({ columns: [t.drillId, t.memberId] }),
    index("practice_drill_members_member").on(t.shopId, t.memberId),
    foreignKey({ columns: [t.shopId, t.drillId], foreignColumns: [practiceDrills.shopId, practiceDrills.id] }),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);

/**
 * One question put to one person. Its random id is all that the browser gets before the answer: photo, case and class
 * are reached through it on the server only, so that nothing in an address or a file name gives the answer away.
 */
export const practiceQuestions = sqliteTable(
  "practice_questions",
  {
    id: text("id").primaryKey(),
    shopId: ownerShopId(),
    memberId: integer("member_id").notNull(),
    photoId: text("photo_id").notNull(),
    caseId: integer("case_id").notNull(),
    drillId: integer("drill_id"),
    askedAt: moment("asked_at").notNull(),
    answeredAt: moment("answered_at"),
  },
  (t) => [
    unique("practice_questions_row").on(t.shopId, t.id),
    index("practice_questions_open").on(t.shopId, t.memberId, t.answeredAt, t.askedAt),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
    foreignKey({ columns: [t.shopId, t.photoId], foreignColumns: [photos.shopId, photos.id] }),
    foreignKey({ columns: [t.shopId, t.caseId], foreignColumns: [cases.shopId, cases.id] }),
    foreignKey({ columns: [t.shopId, t.drillId], foreignColumns: [practiceDrills.shopId, practiceDrills.id] }),
  ],
);

/** What a person called, against what was confirmed when they called it. Append-only by trigger. */
export const practiceAnswers = sqliteTable(
  "practice_answers",
  {
    id: rowId(),
    shopId: ownerShopId(),
    questionId: text("question_id").notNull(),
    memberId: integer("member_id").notNull(),
    photoId: text("photo_id").notNull(),
    caseId: integer("case_id").notNull(),
    drillId: integer("drill_id"),
    /** Null: "can't tell". */
    calledClass: text("called_class"),
    sure: integer("sure").$type<Sureness>().notNull(),
    confirmedClass: text("confirmed_class").notNull(),
    at: moment("at").notNull(),
  },
  (t) => [
    uniqueIndex("practice_answers_question").on(t.shopId, t.questionId),
    index("practice_answers_member").on(t.shopId, t.memberId, t.at),
    index("practice_answers_photo").on(t.shopId, t.photoId),
    foreignKey({ columns: [t.shopId, t.questionId], foreignColumns: [practiceQuestions.shopId, practiceQuestions.id] }),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
    foreignKey({ columns: [t.shopId, t.calledClass], foreignColumns: [libraryClasses.shopId, libraryClasses.slug] }),
    foreignKey({ columns: [t.shopId, t.confirmedClass], foreignColumns: [libraryClasses.shopId, libraryClasses.slug] }),
  ],
);

/** What the spaced-repetition scheduler keeps of a photo for one person; its own fields, as the library writes them. */
export interface StoredMemory {
  stability: number;
  difficulty: number;
  elapsed_days: number;
  scheduled_days: number;
  learning_steps: number;
  reps: number;
  lapses: number;
  state: number;
  /** UTC milliseconds. */
  lastReviewAt: number | null;
}

/** When a photo comes back to a person. */
export const practiceMemories = sqliteTable(
  "practice_memories",
  {
    shopId: ownerShopId(),
    memberId: integer("member_id").notNull(),
    photoId: text("photo_id").notNull(),
    dueAt: moment("due_at").notNull(),
    memory: text("memory", { mode: "json" }).$type<StoredMemory>().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.shopId, t.memberId, t.photoId] }),
    index("practice_memories_due").on(t.shopId, t.memberId, t.dueAt),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
    foreignKey({ columns: [t.shopId, t.photoId], foreignColumns: [photos.shopId, photos.id] }),
  ],
);

/** A casebook search that somebody keeps under a name. Only they see it. */
export const savedSearches = sqliteTable(
  "saved_searches",
  {
    id: rowId(),
    shopId: ownerShopId(),
    memberId: integer("member_id").notNull(),
    name: text("name").notNull(),
    /** The casebook's address query, as its own schema reads it. */
    query: text("query").notNull(),
    at: moment("at").notNull(),
  },
  (t) => [
    uniqueIndex("saved_searches_name").on(t.shopId, t.memberId, t.name),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);
