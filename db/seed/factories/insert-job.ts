import type { Handle } from "../../open";
import { customers, shopRates, workOrders } from "../../schema";
import type { StoredRates } from "@/lib/costs/stored-rates";

type WorkOrder = typeof workOrders.$inferInsert;

/** A customer, or the one of that name if the shop has it already. */
export function insertCustomer(tx: Handle, shopId: number, name: string): number {
  return tx
    .insert(customers)
    .values({ shopId, name })
    .onConflictDoUpdate({ target: [customers.shopId, customers.name], set: { name } })
    .returning({ id: customers.id })
    .get().id;
}

/** A work order: brass shells unless told otherwise. */
export function insertJob(
  tx: Handle,
  job: Partial<WorkOrder> & Pick<WorkOrder, "shopId" | "customerId" | "number">,
): number {
  return tx
    .insert(workOrders)
    .values({
      partName: "shell",
      baseMetal: "brass",
      alloy: "C360",
      quantity: 48,
      areaDm2: 1.2,
      partValueCents: 4200,
      finalStack: [
        { metal: "Ni", thicknessUm: 5 },
        { metal: "Au", thicknessUm: 0.8 },
      ],
      openedAt: 0,
      ...job,
    })
    .returning({ id: workOrders.id })
    .get().id;
}

/** The rates that hold from a moment on. */
export function insertRates(tx: Handle, shopId: number, validFromAt: number, rates: StoredRates): number {
  return tx
    .insert(shopRates)
    .values({ shopId, validFromAt, rates, setAt: validFromAt })
    .returning({ id: shopRates.id })
    .get().id;
}
