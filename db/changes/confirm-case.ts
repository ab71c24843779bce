import { and, eq, inArray } from "drizzle-orm";
import type { CardStepInput, Confirmation } from "@/lib/cases/case.schema";
import { fault } from "@/lib/fault";
import type { Handle } from "../open";
import {
  calls,
  libraryCauses,
  libraryCautions,
  libraryClassCauses,
  libraryFixes,
  reworkCards,
  reworkSteps,
} from "../schema";
import { stationOfKind } from "../queries/trace";
import { addCall, type Caller } from "./add-call";
import { moveCase, type CaseRow } from "./case-event";
import { priceCase } from "./price-case";
import { writeCaseText } from "./write-case-text";

/**
 * The second look: class, cause, disposition and, for rework, the card. Scrap, concession and regrade close the
 * case at once, with their reason.
 * @throws FaultError "invalid" when the cause is not one of the class's, "conflict" when the case has moved on
 */
export function confirmCase(tx: Handle, doer: Caller, row: CaseRow, input: Confirmation): void {
  const cause = requireCause(tx, doer.shopId, input);
  const columns = {
    confirmedClass: input.classSlug,
    confirmedCauseId: input.causeId,
    confirmedById: doer.memberId,
    confirmedAt: doer.now,
    selfConfirmed: madeFirstCall(tx, doer, row),
    disposition: input.disposition,
    tracedStationId: stationOfKind(tx, doer.shopId, cause.stationKind),
  };
  moveCase(tx, doer, row, {
    event: "confirmed",
    why: input.why,
    detail: { classSlug: input.classSlug, causeId: input.causeId, disposition: input.disposition },
    columns,
  });
  addCall(tx, doer, {
    caseId: row.id,
    round: row.round,
    kind: "second-look",
    classSlug: input.classSlug,
    sure: input.sure,
  });
  if (input.disposition === "rework") {
    sendCard(tx, doer, row, input);
  } else {
    moveCase(
      tx,
      doer,
      { ...row, state: "confirmed" },
      {
        event: "disposed",
        why: input.why,
        detail: { disposition: input.disposition },
        columns: { closing: input.disposition, closedAt: doer.now },
      },
    );
  }
  priceCase(tx, doer, row.id);
  writeCaseText(tx, doer.shopId, row.id);
}

/** A false alarm: the part goes on. The confirmed class is `sound`, so that drills and figures have their baseline. */
export function releaseCase(tx: Handle, doer: Caller, row: CaseRow, why: string): void {
  moveCase(tx, doer, row, {
    event: "released",
    why,
    columns: {
      confirmedClass: "sound",
      confirmedById: doer.memberId,
      confirmedAt: doer.now,
      selfConfirmed: madeFirstCall(tx, doer, row),
      tracedStationId: null,
      closing: "released",
      closedAt: doer.now,
    },
  });
  addCall(tx, doer, { caseId: row.id, round: row.round, kind: "second-look", classSlug: "sound", sure: 3 });
  priceCase(tx, doer, row.id);
  writeCaseText(tx, doer.shopId, row.id);
}

function requireCause(tx: Handle, shopId: number, input: Confirmation) {
  const cause = tx
    .select({ stationKind: libraryCauses.stationKind })
    .from(libraryCauses)
    .innerJoin(
      libraryClassCauses,
      and(
        eq(libraryClassCauses.shopId, libraryCauses.shopId),
        eq(libraryClassCauses.causeSlug, libraryCauses.slug),
        eq(libraryClassCauses.classSlug, input.classSlug),
      ),
    )
    .where(and(eq(libraryCauses.shopId, shopId), eq(libraryCauses.id, input.causeId)))
    .get();
  if (cause) return cause;
  throw fault("invalid", "That cause does not belong to the class. Choose one of the class's causes.", {
    causeId: "Choose one of the class's causes.",
  });
}

/** Small shops: the senior may have made the first call too. It shows, and stays out of the agreement figures. */
function madeFirstCall(tx: Handle, doer: Caller, row: CaseRow): boolean {
  const first = tx
    .select({ memberId: calls.memberId })
    .from(calls)
    .where(and(eq(calls.shopId, doer.shopId), eq(calls.caseId, row.id), eq(calls.kind, "first")))
    .get();
  return first?.memberId === doer.memberId;
}

function sendCard(tx: Handle, doer: Caller, row: CaseRow, input: Confirmation): void {
  const fix = input.fixId
    ? tx
        .select({ title: libraryFixes.title })
        .from(libraryFixes)
        .where(and(eq(libraryFixes.shopId, doer.shopId), eq(libraryFixes.id, input.fixId)))
        .get()
    : undefined;
  if (input.fixId && !fix)
    throw fault("invalid", "That fix is no longer in the library. Choose another.", { fixId: "Choose another fix." });
  const { id } = tx
    .insert(reworkCards)
    .values({
      shopId: doer.shopId,
      caseId: row.id,
      round: row.round,
      fixId: input.fixId ?? null,
      title: input.cardTitle || fix?.title || "Rework",
      madeById: doer.memberId,
      madeAt: doer.now,
    })
    .returning({ id: reworkCards.id })
    .get();
  for (const [position, step] of input.steps.entries()) {
    tx.insert(reworkSteps)
      .values({
        shopId: doer.shopId,
        cardId: id,
        position,
        title: step.title,
        detail: step.detail,
        plannedMinutes: step.plannedMinutes,
        cautions: cautionsOf(tx, doer.shopId, step),
      })
      .run();
  }
}

/** The words of the step's cautions, as the library has them now. */
function cautionsOf(tx: Handle, shopId: number, step: CardStepInput) {
  if (step.cautionKeys.length === 0) return [];
  const rows = tx
    .select({ level: libraryCautions.level, text: libraryCautions.text })
    .from(libraryCautions)
    .where(and(eq(libraryCautions.shopId, shopId), inArray(libraryCautions.key, step.cautionKeys)))
    .all();
  if (rows.length !== new Set(step.cautionKeys).size) {
    throw fault("invalid", "A caution of this card is no longer in the library. Choose the fix again.");
  }
  return rows;
}
