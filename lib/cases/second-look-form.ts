import { LIMITS, type Disposition, type StationKind } from "./case-words";
import {
  addStep,
  changeStep,
  draftFromFix,
  draftToSend,
  moveStep,
  removeStep,
  type DraftStep,
  type FixStepOffer,
} from "./card-draft";

/** What the second look may choose from, as the page hands it over. */
export interface SecondLookOffer {
  quantity: number;
  classes: { slug: string; title: string; causeIds: number[] }[];
  causes: { id: number; title: string; stationKind: StationKind; countHere: number; fixIds: number[] }[];
  fixes: { id: number; title: string; whenNot: string; steps: FixStepOffer[] }[];
  cautions: Record<string, { level: "caution" | "stop"; text: string }>;
}

/** What the senior has filled in so far. Drafts are kept for each fix, so that looking at another loses none. */
export interface SecondLookForm {
  classSlug: string | null;
  causeId: number | null;
  disposition: Disposition;
  /** Chosen fix; 0 is a card written from nothing. Null: the first that the library names for the cause. */
  fixId: number | null;
  drafts: Record<number, DraftStep[]>;
  why: string;
  addedSteps: number;
}

export type SecondLookChange =
  | { type: "class"; slug: string }
  | { type: "cause"; id: number }
  | { type: "disposition"; disposition: Disposition }
  | { type: "fix"; id: number }
  | { type: "why"; why: string }
  | { type: "step"; key: string; change: Partial<Pick<DraftStep, "title" | "detail" | "minutes">> }
  | { type: "move"; key: string; by: -1 | 1 }
  | { type: "remove"; key: string }
  | { type: "add" };

export const RELEASE = "sound";

export function startForm(classSlug: string | null): SecondLookForm {
  return { classSlug, causeId: null, disposition: "rework", fixId: null, drafts: {}, why: "", addedSteps: 0 };
}

/** The fixes that the library names for the chosen cause, the one to try first in front. */
export function fixesOf(form: SecondLookForm, offer: SecondLookOffer): SecondLookOffer["fixes"] {
  const cause = offer.causes.find((each) => each.id === form.causeId);
  return (cause?.fixIds ?? []).flatMap((id) => offer.fixes.find((fix) => fix.id === id) ?? []);
}

/** The fix that the card follows; null before a cause is named, or for a card written from nothing. */
export function chosenFix(form: SecondLookForm, offer: SecondLookOffer): SecondLookOffer["fixes"][number] | null {
  const fixes = fixesOf(form, offer);
  if (form.fixId === 0) return null;
  return fixes.find((fix) => fix.id === form.fixId) ?? fixes[0] ?? null;
}

/** The card's steps as they stand: the library's, or what the senior made of them. */
export function stepsOf(form: SecondLookForm, offer: SecondLookOffer): DraftStep[] {
  const fix = chosenFix(form, offer);
  return form.drafts[fix?.id ?? 0] ?? (fix ? draftFromFix(fix, offer.quantity) : []);
}

/** Applies one thing the senior did. A cause that the new class does not have is let go; drafts and words stay. */
export function changeForm(form: SecondLookForm, change: SecondLookChange, offer: SecondLookOffer): SecondLookForm {
  switch (change.type) {
    case "class": {
      const causeIds = offer.classes.find((each) => each.slug === change.slug)?.causeIds ?? [];
      const keeps = form.causeId !== null && causeIds.includes(form.causeId);
      return { ...form, classSlug: change.slug, causeId: keeps ? form.causeId : null };
    }
    case "cause":
      return { ...form, causeId: change.id, fixId: null };
    case "disposition":
      return { ...form, disposition: change.disposition };
    case "fix":
      return { ...form, fixId: change.id };
    case "why":
      return { ...form, why: change.why };
    default:
      return changeCard(form, change, offer);
  }
}

type CardChange = Extract<SecondLookChange, { type: "step" | "move" | "remove" | "add" }>;

function changeCard(form: SecondLookForm, change: CardChange, offer: SecondLookOffer): SecondLookForm {
  const steps = stepsOf(form, offer);
  const id = chosenFix(form, offer)?.id ?? 0;
  const withSteps = (next: DraftStep[]) => ({ ...form, drafts: { ...form.drafts, [id]: next } });
  switch (change.type) {
    case "step":
      return withSteps(changeStep(steps, change.key, change.change));
    case "move":
      return withSteps(moveStep(steps, change.key, change.by));
    case "remove":
      return withSteps(removeStep(steps, change.key));
    case "add": {
      const addedSteps = form.addedSteps + 1;
      return { ...withSteps(addStep(steps, `added-${addedSteps}`)), addedSteps };
    }
  }
}

/** Whether this is a release: the part was sound all along. */
export function isRelease(form: SecondLookForm): boolean {
  return form.classSlug === RELEASE;
}

/** What is sent, by field name. A release sends no more than its reason. */
export function formToSend(caseRef: string, form: SecondLookForm, offer: SecondLookOffer): Record<string, string> {
  if (isRelease(form)) return { ref: caseRef, why: form.why };
  const fix = chosenFix(form, offer);
  const isRework = form.disposition === "rework";
  return {
    ref: caseRef,
    classSlug: form.classSlug ?? "",
    causeId: form.causeId === null ? "" : String(form.causeId),
    disposition: form.disposition,
    why: form.why,
    fixId: isRework && fix ? String(fix.id) : "",
    cardTitle: isRework ? (fix?.title ?? "") : "",
    steps: isRework ? JSON.stringify(draftToSend(stepsOf(form, offer))) : "",
  };
}

/** What still has to be filled in before it can be sent, by field; empty when nothing is missing. */
export function formProblems(form: SecondLookForm, offer: SecondLookOffer): Record<string, string> {
  if (isRelease(form)) return {};
  if (form.classSlug === null) return { classSlug: "Choose the class." };
  const problems: Record<string, string> = {};
  if (form.causeId === null) problems.causeId = "Choose the cause.";
  if (form.disposition !== "rework") {
    if (form.why.trim().length < 3) problems.why = "Say why it is not reworked, in a few words.";
    return problems;
  }
  const steps = stepsOf(form, offer);
  if (form.causeId !== null && steps.length === 0) problems.steps = "A rework card needs at least one step.";
  if (steps.some((step) => step.title.trim() === "")) problems.steps = "Give every step a name, or take it away.";
  if (steps.some((step) => !isMinutes(step.minutes))) {
    problems.steps = `Minutes are whole numbers from 0 to ${LIMITS.minutes}.`;
  }
  return problems;
}

function isMinutes(typed: string): boolean {
  return /^\d+$/.test(typed.trim()) && Number(typed) <= LIMITS.minutes;
}

/** What the main button says. */
export function sendWords(form: SecondLookForm): string {
  if (isRelease(form)) return "Release as sound";
  if (form.disposition === "rework") return "Confirm and send the card";
  if (form.disposition === "scrap") return "Confirm and scrap it";
  return form.disposition === "regrade" ? "Confirm and regrade it" : "Confirm with concession";
}
