import { foreignKey, index, integer, real, sqliteTable, text, unique } from "drizzle-orm/sqlite-core";
import type { StoredRates } from "@/lib/costs/stored-rates";
import { STRIP_METHODS, type StripRow } from "@/lib/costs/strip-methods";
import { cases } from "./cases";
import { moment, ownerShopId, rowId } from "./columns";
import { members } from "./crew";

/** What the shop pays, from a date on. Never changed: a later row supersedes. A case keeps the rates of its day. */
export const shopRates = sqliteTable(
  "shop_rates",
  {
    id: rowId(),
    shopId: ownerShopId(),
    validFromAt: moment("valid_from_at").notNull(),
    rates: text("rates", { mode: "json" }).$type<StoredRates>().notNull(),
    setById: integer("set_by_id"),
    setAt: moment("set_at").notNull(),
  },
  (t) => [
    unique("shop_rates_row").on(t.shopId, t.id),
    index("shop_rates_from").on(t.shopId, t.validFromAt),
    foreignKey({ columns: [t.shopId, t.setById], foreignColumns: [members.shopId, members.id] }),
  ],
);

/**
 * The shop's ways to take a deposit off: baths and polishing. Never changed: the newest row of a slug holds from then on,
 * and a case keeps the table of its day.
 */
export const stripRows = sqliteTable(
  "strip_rows",
  {
    id: rowId(),
    shopId: ownerShopId(),
    slug: text("slug").notNull(),
    row: text("row", { mode: "json" }).$type<StripRow>().notNull(),
    /** No longer offered. */
    retired: integer("retired", { mode: "boolean" }).notNull().default(false),
    /** Order in which baths for the same deposit are preferred. */
    position: integer("position").notNull(),
    /** Null: came with the shop. */
    setById: integer("set_by_id"),
    setAt: moment("set_at").notNull(),
  },
  (t) => [
    index("strip_rows_slug").on(t.shopId, t.slug, t.id),
    foreignKey({ columns: [t.shopId, t.setById], foreignColumns: [members.shopId, members.id] }),
  ],
);

export interface StoredCostLine {
  name: string;
  meanCents: number;
}

/** Every figure that a case was ever given: estimates as they were made, then what was recorded. Append-only. */
export const caseCosts = sqliteTable(
  "case_costs",
  {
    id: rowId(),
    shopId: ownerShopId(),
    caseId: integer("case_id").notNull(),
    round: integer("round").notNull(),
    basis: text("basis", { enum: ["estimate", "recorded"] }).notNull(),
    meanCents: integer("mean_cents").notNull(),
    low90Cents: integer("low90_cents").notNull(),
    high90Cents: integer("high90_cents").notNull(),
    lines: text("lines", { mode: "json" }).$type<StoredCostLine[]>().notNull(),
    ratesId: integer("rates_id").notNull(),
    /** How the deposit comes off in this figure. Null: rows from before it was kept, or nothing to take off. */
    method: text("method", { enum: STRIP_METHODS }),
    /** Hands-on minutes of all rounds that the figure rests on. */
    minutes: real("minutes"),
    /** What the estimated minutes were multiplied by, from this shop's own records; 1 without. */
    minutesCorrection: real("minutes_correction").notNull().default(1),
    at: moment("at").notNull(),
  },
  (t) => [
    index("case_costs_case").on(t.shopId, t.caseId, t.id),
    foreignKey({ columns: [t.shopId, t.caseId], foreignColumns: [cases.shopId, cases.id] }),
    foreignKey({ columns: [t.shopId, t.ratesId], foreignColumns: [shopRates.shopId, shopRates.id] }),
  ],
);
