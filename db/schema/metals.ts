import { foreignKey, index, integer, real, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { BASE_METALS } from "@/lib/cases/case-words";
import { COLOURS, PULLS } from "@/lib/metals/material-words";
import { cases } from "./cases";
import { moment, ownerShopId, rowId } from "./columns";
import { members } from "./crew";
import { workOrders } from "./line";

/**
 * What a part weighed in air and in water, and whether the metal that the job declares fits that. Append-only: a part
 * weighed again is a further row, and the newest one of a job speaks for it.
 */
export const partChecks = sqliteTable(
  "part_checks",
  {
    id: rowId(),
    shopId: ownerShopId(),
    workOrderId: integer("work_order_id").notNull(),
    /** Weighed because of this case; null when it was weighed for the job as a whole. */
    caseId: integer("case_id"),
    weightAirG: real("weight_air_g").notNull(),
    weightWaterG: real("weight_water_g").notNull(),
    waterTempC: real("water_temp_c").notNull(),
    balanceErrorG: real("balance_error_g").notNull(),
    pull: text("pull", { enum: PULLS }),
    colour: text("colour", { enum: COLOURS }),
    densityGPerCm3: real("density_g_per_cm3").notNull(),
    uncertaintyGPerCm3: real("uncertainty_g_per_cm3").notNull(),
    declaredBaseMetal: text("declared_base_metal", { enum: BASE_METALS }).notNull(),
    declaredAlloy: text("declared_alloy"),
    /** Whether the declared metal lies within what was measured. */
    fits: integer("fits", { mode: "boolean" }).notNull(),
    /** The best candidate's base metal; null when nothing in the table fits. */
    likelyBaseMetal: text("likely_base_metal", { enum: BASE_METALS }),
    memberId: integer("member_id").notNull(),
    at: moment("at").notNull(),
  },
  (t) => [
    index("part_checks_job").on(t.shopId, t.workOrderId, t.id),
    index("part_checks_case").on(t.shopId, t.caseId, t.id),
    foreignKey({ columns: [t.shopId, t.workOrderId], foreignColumns: [workOrders.shopId, workOrders.id] }),
    foreignKey({ columns: [t.shopId, t.caseId], foreignColumns: [cases.shopId, cases.id] }),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);
