import { eq } from "drizzle-orm";
import { DISSOLVING_ROWS, POLISHING_ROW } from "@/lib/costs/strip-method-rows";
import type { Handle } from "../open";
import { stripRows } from "../schema";

/**
 * Gives a shop its own copy of the ways to strip that ship. Those that it has already, changed or retired by its owner
 * included, stay as they are.
 * @param setAt from when they hold; a case older than that is priced with them too
 * @returns how many were added
 */
export function insertStripRows(tx: Handle, shopId: number, setAt: number): number {
  const known = tx.selectDistinct({ slug: stripRows.slug }).from(stripRows).where(eq(stripRows.shopId, shopId)).all();
  const slugs = new Set(known.map((row) => row.slug));
  let added = 0;
  for (const [position, row] of [...DISSOLVING_ROWS, POLISHING_ROW].entries()) {
    if (slugs.has(row.id)) continue;
    tx.insert(stripRows).values({ shopId, slug: row.id, row, position, setAt }).run();
    added += 1;
  }
  return added;
}
