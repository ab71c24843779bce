import { asc, eq } from "drizzle-orm";
import { ratesAt, type ShopRates } from "@/lib/costs/rates";
import type { Handle } from "../open";
import { shopRates } from "../schema";

export type DatedRates = ShopRates & { id: number; source: string };

/** Every rates row of a shop, oldest first. */
export function listRates(db: Handle, shopId: number): DatedRates[] {
  return db
    .select({ id: shopRates.id, validFromAt: shopRates.validFromAt, rates: shopRates.rates })
    .from(shopRates)
    .where(eq(shopRates.shopId, shopId))
    .orderBy(asc(shopRates.validFromAt), asc(shopRates.id))
    .all()
    .map(({ rates, ...row }) => ({ ...rates, ...row }));
}

/**
 * The rates that held at a moment.
 * @throws InputError when the shop has none at all
 */
export function getRatesAt(db: Handle, shopId: number, at: number): DatedRates {
  return ratesAt(listRates(db, shopId), at);
}
