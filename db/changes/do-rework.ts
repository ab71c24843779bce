import { and, count, eq, isNull } from "drizzle-orm";
import type { OutcomeInput } from "@/lib/cases/case.schema";
import { fault } from "@/lib/fault";
import type { Handle } from "../open";
import { claimPhotos } from "../queries/photos";
import { reworkCards, reworkSteps } from "../schema";
import { moveCase, type CaseRow, type Doer } from "./case-event";
import { priceCase } from "./price-case";
import { writeCaseText } from "./write-case-text";

/**
 * Ticks a step of the case's card with the minutes it took. The first tick takes the case into rework.
 * @throws FaultError "conflict" when the step is ticked already, or an earlier one is not
 */
export function tickStep(tx: Handle, doer: Doer, row: CaseRow, tick: { stepId: number; spentMinutes: number }): void {
  const card = requireCard(tx, doer.shopId, row);
  const next = tx
    .select({ id: reworkSteps.id })
    .from(reworkSteps)
    .where(and(eq(reworkSteps.shopId, doer.shopId), eq(reworkSteps.cardId, card.id), isNull(reworkSteps.tickedAt)))
    .orderBy(reworkSteps.position)
    .limit(1)
    .get();
  if (next?.id !== tick.stepId) {
    throw fault(
      "conflict",
      "That step is ticked already, or an earlier one is not. Reload the card and go on from its first open step.",
    );
  }
  if (row.state === "confirmed") moveCase(tx, doer, row, { event: "rework-started" });
  else if (row.state !== "in-rework") throw fault("conflict", "This card is not open any more. Reload the case.");
  tx.update(reworkSteps)
    .set({ tickedAt: doer.now, tickedById: doer.memberId, spentMinutes: tick.spentMinutes })
    .where(and(eq(reworkSteps.shopId, doer.shopId), eq(reworkSteps.id, tick.stepId), isNull(reworkSteps.tickedAt)))
    .run();
}

/**
 * What the re-strike showed. Sound closes the case; a fault sends it back for another round of the same case.
 * @throws FaultError "conflict" while a step of the card is open
 */
export function recordOutcome(tx: Handle, doer: Doer, row: CaseRow, input: OutcomeInput): void {
  const card = requireCard(tx, doer.shopId, row);
  const open = tx
    .select({ steps: count() })
    .from(reworkSteps)
    .where(and(eq(reworkSteps.shopId, doer.shopId), eq(reworkSteps.cardId, card.id), isNull(reworkSteps.tickedAt)))
    .get();
  if (open && open.steps > 0) {
    throw fault(
      "conflict",
      `${open.steps} steps of the card are still open. Tick them first, with the minutes they took.`,
    );
  }
  const isSound = input.outcome === "sound";
  moveCase(tx, doer, row, {
    event: isSound ? "re-strike-sound" : "re-strike-failed",
    why: input.note,
    detail: { outcome: input.outcome },
    columns: isSound
      ? { closing: "sound", closedAt: doer.now }
      : { round: row.round + 1, heldAt: doer.now, calledClass: null, calledSure: null },
  });
  tx.update(reworkCards)
    .set({ doneAt: doer.now, outcome: input.outcome, outcomeNote: input.note, outcomeById: doer.memberId })
    .where(and(eq(reworkCards.shopId, doer.shopId), eq(reworkCards.id, card.id)))
    .run();
  claimPhotos(tx, { ...doer, caseId: row.id, round: row.round, purpose: "re-strike", ids: input.photoIds });
  priceCase(tx, doer, row.id);
  writeCaseText(tx, doer.shopId, row.id);
}

function requireCard(tx: Handle, shopId: number, row: CaseRow): { id: number } {
  const card = tx
    .select({ id: reworkCards.id })
    .from(reworkCards)
    .where(and(eq(reworkCards.shopId, shopId), eq(reworkCards.caseId, row.id), eq(reworkCards.round, row.round)))
    .get();
  if (!card) throw fault("conflict", "This case has no rework card in this round. A senior tech sends one.");
  return card;
}
