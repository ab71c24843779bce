import { eq } from "drizzle-orm";
import type { Handle } from "../open";
import { shops } from "../schema";

/** True when an invented shop is in this database: the sign-in page then lists who can sign in to it. */
export function hasDemoShop(db: Handle): boolean {
  return db.select({ id: shops.id }).from(shops).where(eq(shops.isDemo, true)).limit(1).get() !== undefined;
}

/** @throws Error when there is no such shop: the caller holds an id that came from nowhere */
export function getShopName(db: Handle, shopId: number): string {
  const row = db.select({ name: shops.name }).from(shops).where(eq(shops.id, shopId)).get();
  if (!row) throw new Error(`There is no shop ${shopId}.`);
  return row.name;
}
