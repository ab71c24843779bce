import { integer } from "drizzle-orm/sqlite-core";
import { shops } from "./crew";

/** Row number. Never reused, so a history that names it stays right. */
export const rowId = () => integer("id").primaryKey({ autoIncrement: true });

/** The shop that owns the row. Every table but `shops` itself carries it, and every query filters by it. */
export const ownerShopId = () =>
  integer("shop_id")
    .notNull()
    .references(() => shops.id);

/** A moment: UTC milliseconds. */
export const moment = (name: string) => integer(name);
