import { and, asc, desc, eq } from "drizzle-orm";
import type { DissolvingRow, PolishingRow } from "@/lib/costs/strip-methods";
import { SHIPPED_STRIP_TABLE, type StripTable } from "@/lib/costs/strip-plan";
import type { Handle } from "../open";
import { members, stripRows } from "../schema";

/**
 * The shop's ways to take a deposit off as they stood at a moment: the newest row of each slug not after it. A moment
 * before the shop had its table sees the rows that came with the shop; a way that the shop added later was not there.
 * Retired rows are left out. A shop without any row has the table that ships.
 */
export function getStripTableAt(db: Handle, shopId: number, at: number): StripTable {
  return readStripTables(db, shopId)(at);
}

/** The same for many moments: the rows are read once, and a table is put together once for each stretch of time. */
export function readStripTables(db: Handle, shopId: number): (at: number) => StripTable {
  const rows = listRows(db, shopId);
  if (rows.length === 0) return () => SHIPPED_STRIP_TABLE;
  const turns = [...new Set(rows.map((row) => row.setAt))].toSorted((a, b) => a - b);
  const kept = new Map<number | undefined, StripTable>();
  return (at) => {
    const since = turns.findLast((turn) => turn <= at);
    const known = kept.get(since);
    if (known) return known;
    const table = tableAt(rows, at);
    kept.set(since, table);
    return table;
  };
}

type Row = ReturnType<typeof listRows>[number];

function listRows(db: Handle, shopId: number) {
  return db
    .select({
      slug: stripRows.slug,
      row: stripRows.row,
      retired: stripRows.retired,
      position: stripRows.position,
      setById: stripRows.setById,
      setAt: stripRows.setAt,
    })
    .from(stripRows)
    .where(eq(stripRows.shopId, shopId))
    .orderBy(asc(stripRows.id))
    .all();
}

function tableAt(rows: readonly Row[], at: number): StripTable {
  const held = new Map<string, Row>();
  for (const row of rows) {
    const cameWithTheShop = row.setById === null && !held.has(row.slug);
    if (row.setAt <= at || cameWithTheShop) held.set(row.slug, row);
  }
  const standing = [...held.values()].filter((row) => !row.retired).toSorted((a, b) => a.position - b.position);
  const dissolving = standing.flatMap(({ row }): DissolvingRow[] => (row.method === "polish-back" ? [] : [row]));
  const polishing = standing.map(({ row }) => row).find((row): row is PolishingRow => row.method === "polish-back");
  return { dissolving, polishing: polishing ?? SHIPPED_STRIP_TABLE.polishing };
}

/** Every row of the shop's ways with who set it, the newest first. Nobody: it came with the shop. */
export function listStripHistory(db: Handle, shopId: number) {
  return db
    .select({
      id: stripRows.id,
      slug: stripRows.slug,
      row: stripRows.row,
      retired: stripRows.retired,
      position: stripRows.position,
      setAt: stripRows.setAt,
      setByName: members.name,
    })
    .from(stripRows)
    .leftJoin(members, and(eq(members.shopId, stripRows.shopId), eq(members.id, stripRows.setById)))
    .where(eq(stripRows.shopId, shopId))
    .orderBy(desc(stripRows.id))
    .all();
}

export type StripHistoryRow = ReturnType<typeof listStripHistory>[number];

/** The newest row of a way; undefined when the shop has no such way. */
export function getStripRow(db: Handle, shopId: number, slug: string) {
  return db
    .select({
      id: stripRows.id,
      row: stripRows.row,
      retired: stripRows.retired,
      position: stripRows.position,
      setAt: stripRows.setAt,
    })
    .from(stripRows)
    .where(and(eq(stripRows.shopId, shopId), eq(stripRows.slug, slug)))
    .orderBy(desc(stripRows.id))
    .limit(1)
    .get();
}

type NewStripRow = Omit<typeof stripRows.$inferInsert, "id">;

/** Adds a row. There is no other way to change a way: rows are never written over. */
export function insertStripRow(tx: Handle, row: NewStripRow): number {
  return tx.insert(stripRows).values(row).returning({ id: stripRows.id }).get().id;
}
