import { COST_MODEL } from "@/lib/costs/cost-model";
import { STARTING_RATES, STARTING_RATES_SOURCE } from "@/lib/costs/starting-rates";
import { insertStripRows } from "../../changes/insert-strip-rows";
import { insertMember } from "../../queries/crew-changes";
import type { Handle } from "../../open";
import { shops } from "../../schema";
import { shelf } from "../library/shelf";
import { insertRates } from "./insert-job";
import { insertLine } from "./insert-line";
import { insertShelf } from "./insert-shelf";

interface NewShop {
  slug: string;
  name: string;
  timeZone: string;
  currency: string;
  owner: { name: string; email: string; passwordHash: string };
  now: number;
}

/**
 * Opens a real shop: the usual line, its own copy of the shelf and of the ways to strip, the starting rates (which say
 * that they are not the shop's own), and its owner, who then invites the crew.
 */
export function openShop(tx: Handle, shop: NewShop): { shopId: number; ownerId: number } {
  const { owner, now, ...columns } = shop;
  const { id: shopId } = tx
    .insert(shops)
    .values({ ...columns, costModel: COST_MODEL, createdAt: now })
    .returning({ id: shops.id })
    .get();
  // A small shop's owner looks at parts too; roles can be changed under Crew.
  const ownerId = insertMember(tx, { shopId, ...owner, roles: ["senior", "owner"], now });
  insertLine(tx, shopId);
  insertShelf(tx, shopId, shelf, now);
  insertStripRows(tx, shopId, now);
  insertRates(tx, shopId, now, { ...STARTING_RATES, source: STARTING_RATES_SOURCE });
  return { shopId, ownerId };
}
