import { asc, eq } from "drizzle-orm";
import { COST_MODEL } from "@/lib/costs/cost-model";
import type { Db } from "../open";
import { shops } from "../schema";
import { insertStripRows } from "./insert-strip-rows";
import { priceShopAgain } from "./price-shop-again";

/**
 * Brings what costs rest on up to date, shop by shop: each has its own copy of the ways to strip, and where the estimate
 * has moved on since its cases were priced they are priced again. Does nothing where all is in place; may be killed
 * anywhere and run again.
 * @returns how many cases were priced again, over all shops
 */
export function bringCostsUpToDate(db: Db, now: number): { repriced: number } {
  let repriced = 0;
  const columns = { id: shops.id, createdAt: shops.createdAt, costModel: shops.costModel };
  for (const shop of db.select(columns).from(shops).orderBy(asc(shops.id)).all()) {
    db.transaction((tx) => insertStripRows(tx, shop.id, shop.createdAt), { behavior: "immediate" });
    if (shop.costModel >= COST_MODEL) continue;
    repriced += priceShopAgain(db, shop.id, now);
    // Last, so that a start that was cut short prices the rest at the next one.
    db.update(shops).set({ costModel: COST_MODEL }).where(eq(shops.id, shop.id)).run();
  }
  return { repriced };
}
