import { and, eq } from "drizzle-orm";
import type { Amendment } from "@/lib/cases/case.schema";
import { fault } from "@/lib/fault";
import type { Handle } from "../open";
import { cases } from "../schema";
import { addEvent, moveCase, type CaseRow, type Doer } from "./case-event";
import { priceCase } from "./price-case";
import { writeCaseText } from "./write-case-text";

/** Ends a case that will not be reworked after all: scrap, concession or regrade, with the reason. */
export function disposeCase(
  tx: Handle,
  doer: Doer,
  row: CaseRow,
  input: { disposition: "scrap" | "concession" | "regrade"; why: string },
): void {
  moveCase(tx, doer, row, {
    event: "disposed",
    why: input.why,
    detail: { disposition: input.disposition },
    columns: { disposition: input.disposition, closing: input.disposition, closedAt: doer.now },
  });
  priceCase(tx, doer, row.id);
}

/** A confirmation is withdrawn before its card was begun: back to the queue as a further round. */
export function takeBack(tx: Handle, doer: Doer, row: CaseRow, why: string): void {
  moveCase(tx, doer, row, { event: "taken-back", why, columns: { round: row.round + 1, heldAt: doer.now } });
}

/** A closed case turns out not to be: back to the queue as a further round. What was written stays. */
export function reopenCase(tx: Handle, doer: Doer, row: CaseRow, why: string): void {
  moveCase(tx, doer, row, {
    event: "reopened",
    why,
    columns: { round: row.round + 1, heldAt: doer.now, closing: null, closedAt: null },
  });
}

/** Corrects facts of a part that is still held. The values before go into the history. */
export function amendCase(tx: Handle, doer: Doer, row: CaseRow, input: Amendment): void {
  const before = tx
    .select({ quantity: cases.quantity, baseMetal: cases.baseMetal, stageFound: cases.stageFound, note: cases.note })
    .from(cases)
    .where(and(eq(cases.shopId, doer.shopId), eq(cases.id, row.id)))
    .get();
  const { ref: _ref, ...facts } = input;
  const changed = tx
    .update(cases)
    .set(facts)
    .where(
      and(eq(cases.shopId, doer.shopId), eq(cases.id, row.id), eq(cases.state, "held"), eq(cases.round, row.round)),
    )
    .run();
  if (changed.changes !== 1)
    throw fault("conflict", "Facts can be corrected only while the part is held. Tell a senior tech.");
  addEvent(tx, doer, row, { event: "amended", from: "held", to: "held", detail: { before, after: facts } });
  priceCase(tx, doer, row.id);
  writeCaseText(tx, doer.shopId, row.id);
}
