import { and, eq } from "drizzle-orm";
import { fault } from "@/lib/fault";
import type { Handle } from "../open";
import { cases } from "../schema";

/** What a change needs to know of a case before it begins. */
export interface CaseStanding {
  id: number;
  ref: string;
  state: (typeof cases.$inferSelect)["state"];
  round: number;
  shopId: number;
  /** Who opened it: the "own" of the permission matrix. */
  ownerId: number;
}

/**
 * The case with this reference in this shop.
 * @throws FaultError "not-found": another shop's reference is as unknown as one that never was
 */
export function requireCase(db: Handle, shopId: number, ref: string): CaseStanding {
  const row = db
    .select({
      id: cases.id,
      ref: cases.ref,
      state: cases.state,
      round: cases.round,
      shopId: cases.shopId,
      ownerId: cases.openedById,
    })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), eq(cases.ref, ref)))
    .get();
  if (!row) throw fault("not-found", `There is no case ${ref} in this shop. Check the reference on the tag.`);
  return row;
}
