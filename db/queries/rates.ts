import { and, asc, desc, eq } from "drizzle-orm";
import { ratesAt, type ShopRates } from "@/lib/costs/rates";
import type { StoredRates } from "@/lib/costs/stored-rates";
import { DEPOSIT_METALS, type DepositMetal } from "@/lib/plating/metals";
import type { Handle } from "../open";
import { members, shopRates, workOrders } from "../schema";

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

/** The rates rows with who set each and when, the latest start first. Nobody: the row that the shop began with. */
export function listRatesHistory(db: Handle, shopId: number) {
  return db
    .select({
      id: shopRates.id,
      validFromAt: shopRates.validFromAt,
      rates: shopRates.rates,
      setAt: shopRates.setAt,
      setByName: members.name,
    })
    .from(shopRates)
    .leftJoin(members, and(eq(members.shopId, shopRates.shopId), eq(members.id, shopRates.setById)))
    .where(eq(shopRates.shopId, shopId))
    .orderBy(desc(shopRates.validFromAt), desc(shopRates.id))
    .all();
}

export type RatesHistoryRow = ReturnType<typeof listRatesHistory>[number];

interface NewRates {
  shopId: number;
  /** Who sets them. */
  memberId: number;
  validFromAt: number;
  rates: StoredRates;
  now: number;
}

/** Adds a row. There is no other way to change rates: rows are never written over. */
export function insertRatesRow(tx: Handle, { shopId, memberId, validFromAt, rates, now }: NewRates): number {
  return tx
    .insert(shopRates)
    .values({ shopId, validFromAt, rates, setById: memberId, setAt: now })
    .returning({ id: shopRates.id })
    .get().id;
}

/** The metals that the shop's jobs are plated with, and the copper of every strike; in the order of the table of metals. */
export function listMetalsInUse(db: Handle, shopId: number): DepositMetal[] {
  const stacks = db
    .selectDistinct({ finalStack: workOrders.finalStack })
    .from(workOrders)
    .where(eq(workOrders.shopId, shopId))
    .all();
  const used = new Set<string>(["Cu", ...stacks.flatMap((row) => row.finalStack.map((layer) => layer.metal))]);
  return DEPOSIT_METALS.filter((metal) => used.has(metal));
}
