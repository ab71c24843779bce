/**
 * Where a page of the casebook goes on. In a list by time: from a case on (`on`) or back towards its beginning (`back`).
 * In a search, which is ordered by likeness: the number of matches already shown.
 */
export type CasebookCursor = { kind: "on" | "back"; at: number; id: number } | { kind: "match"; shown: number };

const BY_TIME = /^([ob])(\d{1,15})-(\d{1,15})$/;
const BY_MATCH = /^m(\d{1,3})$/;

/** @example writeCasebookCursor({ kind: "on", at: 5, id: 7 }) === "o5-7" */
export function writeCasebookCursor(cursor: CasebookCursor): string {
  if (cursor.kind === "match") return `m${cursor.shown}`;
  return `${cursor.kind === "on" ? "o" : "b"}${cursor.at}-${cursor.id}`;
}

/** The cursor in a URL; null for a text that is none of ours. */
export function readCasebookCursor(text: string): CasebookCursor | null {
  const byTime = BY_TIME.exec(text);
  if (byTime) return { kind: byTime[1] === "o" ? "on" : "back", at: Number(byTime[2]), id: Number(byTime[3]) };
  const byMatch = BY_MATCH.exec(text);
  return byMatch ? { kind: "match", shown: Number(byMatch[1]) } : null;
}
