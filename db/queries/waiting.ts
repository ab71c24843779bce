import { and, count, eq, inArray, sql } from "drizzle-orm";
import type { Handle } from "../open";
import { cases } from "../schema";

export interface Waiting {
  /** Cases that wait for a second look. */
  secondLook: number;
  /** Cases with a card that is ready or begun. */
  rework: number;
}

/** How much waits in the shop, for the bar's counts. */
export function countWaiting(db: Handle, shopId: number): Waiting {
  const rows = db
    .select({ state: cases.state, cases: count() })
    .from(cases)
    .where(and(eq(cases.shopId, shopId), inArray(cases.state, ["held", "confirmed", "in-rework"])))
    .groupBy(cases.state)
    .all();
  const of = (state: string) => rows.find((row) => row.state === state)?.cases ?? 0;
  return { secondLook: of("held"), rework: of("confirmed") + of("in-rework") };
}

/** Whether the shop has any case at all: a new shop gets other words than a tidy one. */
export function hasCases(db: Handle, shopId: number): boolean {
  return (
    db
      .select({ one: sql<number>`1` })
      .from(cases)
      .where(eq(cases.shopId, shopId))
      .limit(1)
      .get() !== undefined
  );
}
