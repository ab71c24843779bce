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
import { BASE_METALS, METHODS, STATION_KINDS } from "@/lib/cases/case-words";
import type { Layer } from "@/lib/plating/deposit-stack";
import { moment, ownerShopId, rowId } from "./columns";
import { members } from "./crew";

export const customers = sqliteTable(
  "customers",
  { id: rowId(), shopId: ownerShopId(), name: text("name").notNull(), email: text("email") },
  (t) => [unique("customers_shop_row").on(t.shopId, t.id), uniqueIndex("customers_name").on(t.shopId, t.name)],
);

export type StoredLayer = Pick<Layer, "metal" | "thicknessUm">;

export const workOrders = sqliteTable(
  "work_orders",
  {
    id: rowId(),
    shopId: ownerShopId(),
    customerId: integer("customer_id").notNull(),
    number: text("number").notNull(),
    partName: text("part_name").notNull(),
    baseMetal: text("base_metal", { enum: BASE_METALS }).notNull(),
    alloy: text("alloy"),
    quantity: integer("quantity").notNull(),
    /** Plated surface of one part. */
    areaDm2: real("area_dm2").notNull(),
    partValueCents: integer("part_value_cents").notNull(),
    /** The layers still to come after the strike, from the strike out. */
    finalStack: text("final_stack", { mode: "json" }).$type<StoredLayer[]>().notNull(),
    openedAt: moment("opened_at").notNull(),
    closedAt: moment("closed_at"),
  },
  (t) => [
    unique("work_orders_shop_row").on(t.shopId, t.id),
    uniqueIndex("work_orders_number").on(t.shopId, t.number),
    index("work_orders_open").on(t.shopId, t.closedAt, t.openedAt),
    index("work_orders_customer").on(t.shopId, t.customerId, t.id),
    foreignKey({ columns: [t.shopId, t.customerId], foreignColumns: [customers.shopId, customers.id] }),
  ],
);

export const stations = sqliteTable(
  "stations",
  {
    id: rowId(),
    shopId: ownerShopId(),
    slug: text("slug").notNull(),
    kind: text("kind", { enum: STATION_KINDS }).notNull(),
    name: text("name").notNull(),
    position: integer("position").notNull(),
  },
  (t) => [unique("stations_shop_row").on(t.shopId, t.id), uniqueIndex("stations_slug").on(t.shopId, t.slug)],
);

export const solutions = sqliteTable(
  "solutions",
  {
    id: rowId(),
    shopId: ownerShopId(),
    stationId: integer("station_id").notNull(),
    code: text("code").notNull(),
    name: text("name").notNull(),
    /** Null: the solution serves both methods. */
    method: text("method", { enum: METHODS }),
    /** Days from make-up to the change that the shop plans. */
    windowDays: integer("window_days").notNull(),
    madeUpAt: moment("made_up_at").notNull(),
    retiredAt: moment("retired_at"),
  },
  (t) => [
    unique("solutions_shop_row").on(t.shopId, t.id),
    uniqueIndex("solutions_code").on(t.shopId, t.code),
    index("solutions_station").on(t.shopId, t.stationId, t.retiredAt),
    foreignKey({ columns: [t.shopId, t.stationId], foreignColumns: [stations.shopId, stations.id] }),
  ],
);

export const solutionEvents = sqliteTable(
  "solution_events",
  {
    id: rowId(),
    shopId: ownerShopId(),
    solutionId: integer("solution_id").notNull(),
    kind: text("kind", { enum: ["made-up", "topped-up", "changed"] }).notNull(),
    memberId: integer("member_id").notNull(),
    note: text("note").notNull().default(""),
    at: moment("at").notNull(),
  },
  (t) => [
    index("solution_events_solution").on(t.shopId, t.solutionId, t.at),
    foreignKey({ columns: [t.shopId, t.solutionId], foreignColumns: [solutions.shopId, solutions.id] }),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);

export const solutionChecks = sqliteTable(
  "solution_checks",
  {
    id: rowId(),
    shopId: ownerShopId(),
    solutionId: integer("solution_id").notNull(),
    memberId: integer("member_id").notNull(),
    bathTempC: real("bath_temp_c"),
    volts: real("volts"),
    secondsToDeposit: real("seconds_to_deposit"),
    note: text("note").notNull().default(""),
    at: moment("at").notNull(),
  },
  (t) => [
    index("solution_checks_solution").on(t.shopId, t.solutionId, t.at),
    foreignKey({ columns: [t.shopId, t.solutionId], foreignColumns: [solutions.shopId, solutions.id] }),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);

export const runs = sqliteTable(
  "runs",
  {
    id: rowId(),
    shopId: ownerShopId(),
    code: text("code").notNull(),
    workOrderId: integer("work_order_id").notNull(),
    method: text("method", { enum: METHODS }).notNull(),
    memberId: integer("member_id").notNull(),
    partsStruck: integer("parts_struck").notNull(),
    struckAt: moment("struck_at").notNull(),
  },
  (t) => [
    unique("runs_shop_row").on(t.shopId, t.id),
    uniqueIndex("runs_code").on(t.shopId, t.code),
    index("runs_struck").on(t.shopId, t.struckAt),
    foreignKey({ columns: [t.shopId, t.workOrderId], foreignColumns: [workOrders.shopId, workOrders.id] }),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);

export const runSolutions = sqliteTable(
  "run_solutions",
  { shopId: ownerShopId(), runId: integer("run_id").notNull(), solutionId: integer("solution_id").notNull() },
  (t) => [
    primaryKey({ columns: [t.runId, t.solutionId] }),
    foreignKey({ columns: [t.shopId, t.runId], foreignColumns: [runs.shopId, runs.id] }),
    foreignKey({ columns: [t.shopId, t.solutionId], foreignColumns: [solutions.shopId, solutions.id] }),
  ],
);
