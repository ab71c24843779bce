import { and, eq } from "drizzle-orm";
import type { CaseEvent, CaseState } from "@/lib/cases/case-state";
import { nextState } from "@/lib/cases/case-state";
import { fault } from "@/lib/fault";
import type { Handle } from "../open";
import { caseEvents, cases } from "../schema";

/** Who does it and when: the same for every change. */
export interface Doer {
  shopId: number;
  memberId: number;
  now: number;
}

export interface CaseRow {
  id: number;
  state: CaseState;
  round: number;
}

type Moving = Exclude<CaseEvent, "opened" | "amended">;
type Columns = Partial<typeof cases.$inferInsert>;

interface Move {
  event: Moving;
  why?: string;
  detail?: Record<string, unknown>;
  /** What else changes on the case's row. */
  columns?: Columns;
}

/**
 * Moves a case to the state its event leads to and writes the history row. The update repeats the state that was
 * read, so of two people at once only one gets through.
 * @throws FaultError "conflict" when the case has moved on
 */
export function moveCase(tx: Handle, doer: Doer, row: CaseRow, move: Move): void {
  const state = nextState(row.state, move.event);
  const changed = tx
    .update(cases)
    .set({ ...move.columns, state })
    .where(
      and(eq(cases.shopId, doer.shopId), eq(cases.id, row.id), eq(cases.state, row.state), eq(cases.round, row.round)),
    )
    .run();
  if (changed.changes !== 1) {
    throw fault(
      "conflict",
      "That was not saved: somebody changed this case a moment ago. Reload to see what they did.",
    );
  }
  addEvent(tx, doer, row, { event: move.event, from: row.state, to: state, why: move.why, detail: move.detail });
}

interface HistoryRow {
  event: CaseEvent;
  from: CaseState | null;
  to: CaseState;
  why?: string;
  detail?: Record<string, unknown>;
}

/** Adds a row to a case's history. Rows are only ever added. */
export function addEvent(tx: Handle, doer: Doer, row: Pick<CaseRow, "id" | "round">, history: HistoryRow): void {
  tx.insert(caseEvents)
    .values({
      shopId: doer.shopId,
      caseId: row.id,
      round: row.round,
      event: history.event,
      fromState: history.from,
      toState: history.to,
      memberId: doer.memberId,
      why: history.why ?? "",
      detail: history.detail ?? {},
      at: doer.now,
    })
    .run();
}
