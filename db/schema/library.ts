import {
  foreignKey,
  index,
  integer,
  primaryKey,
  real,
  sqliteTable,
  text,
  unique,
  uniqueIndex,
} from "drizzle-orm/sqlite-core";
import { STATION_KINDS } from "@/lib/cases/case-words";
import type { FixStep, LibraryTell } from "@/lib/library/library-entry";
import { moment, ownerShopId, rowId } from "./columns";
import { members } from "./crew";

/** Each shop owns its copy of the shelf from the day it is opened, so that it may edit it and keep it. */
export const librarySources = sqliteTable(
  "library_sources",
  {
    id: rowId(),
    shopId: ownerShopId(),
    key: text("key").notNull(),
    kind: text("kind", { enum: ["published", "common-practice", "from-memory"] }).notNull(),
    citation: text("citation").notNull(),
  },
  (t) => [uniqueIndex("library_sources_key").on(t.shopId, t.key)],
);

export const libraryCautions = sqliteTable(
  "library_cautions",
  {
    id: rowId(),
    shopId: ownerShopId(),
    key: text("key").notNull(),
    level: text("level", { enum: ["caution", "stop"] }).notNull(),
    text: text("text").notNull(),
    sourceKey: text("source_key").notNull(),
  },
  (t) => [
    uniqueIndex("library_cautions_key").on(t.shopId, t.key),
    foreignKey({ columns: [t.shopId, t.sourceKey], foreignColumns: [librarySources.shopId, librarySources.key] }),
  ],
);

const strings = (name: string) => text(name, { mode: "json" }).$type<string[]>().notNull();

export const libraryClasses = sqliteTable(
  "library_classes",
  {
    id: rowId(),
    shopId: ownerShopId(),
    slug: text("slug").notNull(),
    title: text("title").notNull(),
    short: text("short").notNull(),
    atStrike: text("at_strike").notNull(),
    inFinalPlate: text("in_final_plate").notNull(),
    tells: text("tells", { mode: "json" }).$type<LibraryTell[]>().notNull(),
    checks: strings("checks"),
    prevention: strings("prevention"),
    stripNote: text("strip_note").notNull(),
    /** Share of the class's cases whose cause is none of those on the shelf, 0 to 1. */
    otherLikelihood: real("other_likelihood").notNull(),
    synonyms: strings("synonyms"),
    sourceKeys: strings("source_keys"),
    position: integer("position").notNull(),
    /** Revision number; the words of each one stay in `library_revisions`. */
    revision: integer("revision").notNull().default(1),
  },
  (t) => [unique("library_classes_slug").on(t.shopId, t.slug)],
);

export const libraryCauses = sqliteTable(
  "library_causes",
  {
    id: rowId(),
    shopId: ownerShopId(),
    slug: text("slug").notNull(),
    title: text("title").notNull(),
    stationKind: text("station_kind", { enum: STATION_KINDS }).notNull(),
    why: text("why").notNull(),
    proof: text("proof").notNull(),
    /** Share of its class's cases on the shelf, 0 to 1. A shop's own cases are set beside it. */
    likelihood: real("likelihood").notNull(),
    baseMetals: strings("base_metals"),
    synonyms: strings("synonyms"),
    sourceKeys: strings("source_keys"),
    revision: integer("revision").notNull().default(1),
  },
  (t) => [unique("library_causes_row").on(t.shopId, t.id), unique("library_causes_slug").on(t.shopId, t.slug)],
);

export const libraryClassCauses = sqliteTable(
  "library_class_causes",
  {
    shopId: ownerShopId(),
    classSlug: text("class_slug").notNull(),
    causeSlug: text("cause_slug").notNull(),
    /** 0: the class that this cause shows as most. */
    position: integer("position").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.shopId, t.classSlug, t.causeSlug] }),
    foreignKey({ columns: [t.shopId, t.classSlug], foreignColumns: [libraryClasses.shopId, libraryClasses.slug] }),
    foreignKey({ columns: [t.shopId, t.causeSlug], foreignColumns: [libraryCauses.shopId, libraryCauses.slug] }),
  ],
);

export const libraryFixes = sqliteTable(
  "library_fixes",
  {
    id: rowId(),
    shopId: ownerShopId(),
    slug: text("slug").notNull(),
    title: text("title").notNull(),
    steps: text("steps", { mode: "json" }).$type<FixStep[]>().notNull(),
    whenNot: text("when_not").notNull(),
    materials: strings("materials"),
    sourceKeys: strings("source_keys"),
    revision: integer("revision").notNull().default(1),
  },
  (t) => [unique("library_fixes_row").on(t.shopId, t.id), unique("library_fixes_slug").on(t.shopId, t.slug)],
);

export const libraryCauseFixes = sqliteTable(
  "library_cause_fixes",
  {
    shopId: ownerShopId(),
    causeSlug: text("cause_slug").notNull(),
    fixSlug: text("fix_slug").notNull(),
    /** 0: the fix to try first. */
    position: integer("position").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.shopId, t.causeSlug, t.fixSlug] }),
    foreignKey({ columns: [t.shopId, t.causeSlug], foreignColumns: [libraryCauses.shopId, libraryCauses.slug] }),
    foreignKey({ columns: [t.shopId, t.fixSlug], foreignColumns: [libraryFixes.shopId, libraryFixes.slug] }),
  ],
);

export const libraryRevisions = sqliteTable(
  "library_revisions",
  {
    id: rowId(),
    shopId: ownerShopId(),
    entry: text("entry", { enum: ["class", "cause", "fix", "caution", "source"] }).notNull(),
    slug: text("slug").notNull(),
    revision: integer("revision").notNull(),
    /** Removed: its last words, kept so that it can be brought back. */
    state: text("state", { enum: ["draft", "published", "removed"] }).notNull(),
    body: text("body", { mode: "json" }).$type<Record<string, unknown>>().notNull(),
    /** The published revision that the editor began from; null for the shelf's own and for a new entry. */
    baseRevision: integer("base_revision"),
    /** Why, in the editor's words. */
    note: text("note").notNull().default(""),
    /** Null: the shelf that the shop began with. */
    memberId: integer("member_id"),
    at: moment("at").notNull(),
  },
  (t) => [
    index("library_revisions_entry").on(t.shopId, t.entry, t.slug, t.revision),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);
