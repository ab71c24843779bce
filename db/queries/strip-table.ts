import { asc, eq } from "drizzle-orm";
import type { DissolvingRow, PolishingRow } from "@/lib/costs/strip-methods";
import { SHIPPED_STRIP_TABLE, type StripTable } from "@/lib/costs/strip-plan";
import type { Handle } from "../open";
import { stripRows } from "../schema";

/**
 * The shop's ways to take a deposit off as they stood at a moment: the newest row of each slug not after it, or its
 * first row for a moment before that (a case older than the table is priced with it). Retired rows are left out.
 */
export function getStripTableAt(db: Handle, shopId: number, at: number): StripTable {
  const rows = db
    .select({
      slug: stripRows.slug,
      row: stripRows.row,
      retired: stripRows.retired,
      position: stripRows.position,
      setAt: stripRows.setAt,
    })
    .from(stripRows)
    .where(eq(stripRows.shopId, shopId))
    .orderBy(asc(stripRows.id))
    .all();
  const held = new Map<string, (typeof rows)[number]>();
  for (const row of rows) if (row.setAt <= at || !held.has(row.slug)) held.set(row.slug, row);
  const standing = [...held.values()].filter((row) => !row.retired).toSorted((a, b) => a.position - b.position);
  const dissolving = standing.flatMap(({ row }): DissolvingRow[] => (row.method === "polish-back" ? [] : [row]));
  const polishing = standing.map(({ row }) => row).find((row): row is PolishingRow => row.method === "polish-back");
  return { dissolving, polishing: polishing ?? SHIPPED_STRIP_TABLE.polishing };
}
