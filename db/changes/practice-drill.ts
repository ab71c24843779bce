import { and, eq, isNull } from "drizzle-orm";
import { fault } from "@/lib/fault";
import type { Handle } from "../open";
import { practiceDrillMembers, practiceDrills } from "../schema";
import type { Doer } from "./case-event";

interface NewDrill {
  title: string;
  classSlugs: string[];
  photoCount: number;
  memberIds: readonly number[];
  dueAt: number | null;
}

/** Sets a drill for people of the shop. */
export function setDrill(tx: Handle, doer: Doer, { memberIds, ...drill }: NewDrill): number {
  const { id } = tx
    .insert(practiceDrills)
    .values({ shopId: doer.shopId, setById: doer.memberId, setAt: doer.now, ...drill })
    .returning({ id: practiceDrills.id })
    .get();
  tx.insert(practiceDrillMembers)
    .values([...new Set(memberIds)].map((memberId) => ({ shopId: doer.shopId, drillId: id, memberId })))
    .run();
  return id;
}

/**
 * Takes a drill back: nobody is asked it any more, what was called in it stays.
 * @throws FaultError "not-found" when the shop has no such drill, "conflict" when it was withdrawn before
 */
export function withdrawDrill(tx: Handle, doer: Doer, drillId: number): void {
  const own = and(eq(practiceDrills.shopId, doer.shopId), eq(practiceDrills.id, drillId));
  const changed = tx
    .update(practiceDrills)
    .set({ withdrawnAt: doer.now })
    .where(and(own, isNull(practiceDrills.withdrawnAt)))
    .run();
  if (changed.changes === 1) return;
  if (!tx.select({ id: practiceDrills.id }).from(practiceDrills).where(own).get())
    throw fault("not-found", "That drill is not here.");
  throw fault("conflict", "That drill was withdrawn already.");
}
