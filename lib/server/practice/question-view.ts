import "server-only";
import type { Handle } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { getAskablePhoto, getMemory } from "@/db/queries/practice-photos";
import { getAnswer, type KeptAnswer } from "@/db/queries/practice-questions";
import { BASE_METAL_TITLES, METHOD_TITLES, STAGE_TITLES } from "@/lib/cases/case-words";
import { routes } from "@/lib/routes";
import { requireQuestion } from "./practise";

/**
 * What a person may know of a question before they have called it: the picture, and what a plater knows at the tank.
 * Nothing here names photo, case, job or class; tests/app/practice/no-leak.test.ts holds it to that.
 */
export interface OpenQuestion {
  id: string;
  answered: false;
  photo: { view: string; thumb: string };
  /** "Brass, bath strike", with where it was found unless at the strike itself. */
  facts: string;
  isRendered: boolean;
}

/** The photo left practice while the question was open. */
export interface GoneQuestion {
  id: string;
  answered: false;
  gone: true;
}

/** What is told once the call is in. */
export interface AnsweredQuestion {
  id: string;
  answered: true;
  photo: { view: string; thumb: string };
  isRendered: boolean;
  called: string | null;
  sure: KeptAnswer["sure"];
  confirmed: string;
  right: boolean;
  /** When the photo comes back, UTC milliseconds. */
  comesBackAt: number | null;
  /** The case; null when it has been opened again meanwhile or its photo is not there. */
  ref: string | null;
}

export type QuestionView = OpenQuestion | GoneQuestion | AnsweredQuestion;

/**
 * A question as page and route show it.
 * @throws FaultError "not-found" when no such question was put to this person
 */
export function viewQuestion(db: Handle, member: SignedIn, id: string): QuestionView {
  const question = requireQuestion(db, member, id);
  const photo = getAskablePhoto(db, member.shopId, question.photoId);
  const answer = getAnswer(db, member.shopId, id);
  const urls = { view: routes.practicePhoto(id, "view"), thumb: routes.practicePhoto(id, "thumb") };
  if (answer) {
    const { called, sure, confirmed } = answer;
    return {
      id,
      answered: true,
      photo: urls,
      isRendered: photo?.isRendered ?? false,
      called,
      sure,
      confirmed,
      right: called === confirmed,
      comesBackAt: getMemory(db, member.shopId, member.memberId, question.photoId)?.dueAt ?? null,
      ref: photo?.ref ?? null,
    };
  }
  if (!photo) return { id, answered: false, gone: true };
  return {
    id,
    answered: false,
    photo: urls,
    facts: factsOf(photo),
    isRendered: photo.isRendered,
  };
}

function factsOf({ baseMetal, method, stageFound }: NonNullable<ReturnType<typeof getAskablePhoto>>): string {
  const facts = `${BASE_METAL_TITLES[baseMetal]}, ${METHOD_TITLES[method].toLowerCase()} strike`;
  return stageFound === "at-strike" ? facts : `${facts}, found ${lowerFirst(STAGE_TITLES[stageFound])}`;
}

const lowerFirst = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);
