import { LIMITS, type BaseMetal, type Method, type StageFound, type Sureness, type Symptom } from "./case-words";

/** The honest answer of somebody who looked and could not say. */
export const CANT_TELL = "cant-tell";

/** What stays the same from one part to the next: the "same as last time" block. */
export interface SnapFacts {
  workOrderId: number | null;
  runId: number | null;
  baseMetal: BaseMetal;
  alloy: string;
  method: Method;
  foundStationId: number | null;
  solutionIds: number[];
  stageFound: StageFound;
}

/** A snap while it is being filled in on the phone. */
export interface SnapDraft extends SnapFacts {
  /** Made once per part, so that sending the same snap twice opens one case. */
  snapKey: string;
  photoIds: string[];
  quantity: number;
  symptoms: Symptom[];
  note: string;
  /** A class, `CANT_TELL`, or null while nothing is picked. */
  calledClass: string | null;
  sure: Sureness | null;
}

/** A fresh draft for the next part, with the facts of the last one. */
export function newDraft(facts: SnapFacts, snapKey: string): SnapDraft {
  return { ...facts, snapKey, photoIds: [], quantity: 1, symptoms: [], note: "", calledClass: null, sure: null };
}

/**
 * What is still to be filled in, before anything is sent: field → sentence. The server checks all of it again.
 * @example missingIn(draft without photos).photoIds === "Take at least one photo of the part."
 */
export function missingIn(draft: SnapDraft): Record<string, string> {
  const missing: Record<string, string> = {};
  if (draft.photoIds.length === 0) missing.photoIds = "Take at least one photo of the part.";
  if (draft.workOrderId === null) missing.workOrderId = "Choose the job.";
  if (draft.foundStationId === null) missing.foundStationId = "Choose the station.";
  if (!Number.isInteger(draft.quantity) || draft.quantity < 1 || draft.quantity > LIMITS.quantity) {
    missing.quantity = `Type the number of parts, 1 to ${LIMITS.quantity}.`;
  }
  if (draft.calledClass === null) missing.calledClass = "Make your call, or say that you can't tell.";
  else if (draft.calledClass !== CANT_TELL && draft.sure === null) missing.sure = "Choose how sure you are.";
  return missing;
}

/** A draft as it is sent. Who can't tell makes no claim, so their sureness is a guess. */
export function snapBody(draft: SnapDraft) {
  return { ...draft, runId: draft.runId ?? "", sure: draft.sure ?? 1 };
}
export type SnapBody = ReturnType<typeof snapBody>;
