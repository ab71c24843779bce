import type { Db } from "@/db/open";

/** Steps of a plan that grow with the whole table: it is walked from end to end, or its rows are sorted. */
const LONG = /^SCAN cases|^USE TEMP B-TREE/;

/**
 * Asks SQLite how it would run every statement that `work` prepares anew.
 * @returns the steps that would grow with the number of cases, with their statements
 */
export function longScans(db: Db, work: () => void): string[] {
  const statements = new Set<string>();
  const prepare = db.$client.prepare.bind(db.$client);
  db.$client.prepare = ((sql: string) => {
    statements.add(sql);
    return prepare(sql);
  }) as typeof db.$client.prepare; // the generic signature cannot be written for a wrapper
  try {
    work();
  } finally {
    db.$client.prepare = prepare as typeof db.$client.prepare;
  }
  if (statements.size === 0) throw new Error("Nothing was prepared: run this before the statements are kept.");
  return [...statements].flatMap((sql) => {
    const given = Array.from({ length: sql.split("?").length - 1 }, () => 1);
    const plan = prepare(`explain query plan ${sql}`).all(...given) as { detail: string }[]; // SQLite's own columns
    return plan.filter((step) => LONG.test(step.detail)).map((step) => `${step.detail}: ${sql}`);
  });
}
