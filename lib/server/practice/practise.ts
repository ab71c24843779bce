import "server-only";
import { randomBytes } from "node:crypto";
import { keepCall, putQuestion } from "@/db/changes/practice-call";
import type { Db, Handle } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { getOwnDrill, type Drill } from "@/db/queries/practice-drills";
import { getAskablePhoto } from "@/db/queries/practice-photos";
import {
  getAnswer,
  getOpenQuestion,
  getQuestion,
  listDrillAnswers,
  type PracticeQuestion,
} from "@/db/queries/practice-questions";
import { hasClass } from "@/db/queries/snap-facts";
import { fault } from "@/lib/fault";
import type { AnswerInput, AskInput } from "@/lib/practice/practice.schema";
import { choosePhoto } from "./choose-photo";

/** What a person does in practice, as actions and routes call it. Whose practice it is comes from the session. */
interface Doing {
  db: Db;
  member: SignedIn;
  now: number;
  random?: () => number;
}

const NOTHING_LEFT = "There is no photo to ask just now. Another comes with the next confirmed case.";
const TAKEN_OUT = "This photo has been taken out of practice. Go on to the next one; nothing was counted.";

/**
 * Puts a question to a person. One that is still open is handed out again, so that two tabs ask the same and nobody
 * picks and chooses by reloading.
 * @throws FaultError "not-found" when the drill is not theirs or there is nothing to ask
 */
export function askQuestion(doing: Doing, { drillId }: AskInput): { id: string } {
  const { db, member, now, random } = doing;
  return db.transaction(
    (tx) => {
      const drill = drillId === undefined ? null : requireDrill(tx, member, drillId);
      const open = getOpenQuestion(tx, member.shopId, member.memberId, drill?.id ?? null);
      if (open && getAskablePhoto(tx, member.shopId, open.photoId)) return { id: open.id };
      const photo = drill && isDone(tx, member, drill) ? null : choosePhoto({ db: tx, member, now, random }, drill);
      if (!photo) throw fault("not-found", drill ? "This drill is done. Nothing of it is left to call." : NOTHING_LEFT);
      // 128 random bits: the number says nothing of photo or case, and nobody guesses another's.
      const id = randomBytes(16).toString("base64url");
      const { photoId, caseId } = photo;
      putQuestion(tx, doerOf(doing), { id, photoId, caseId, drillId: drill?.id ?? null });
      return { id };
    },
    { behavior: "immediate" },
  );
}

/**
 * Keeps a call. What was confirmed at this moment is kept with it.
 * @throws FaultError "not-found" when the question is not theirs; "conflict" when it was answered before or its photo
 *   can no longer be asked; "invalid" when the class has left the library
 */
export function answerQuestion(doing: Doing, input: AnswerInput): { id: string } {
  const { db, member } = doing;
  return db.transaction(
    (tx) => {
      const question = requireQuestion(tx, member, input.id);
      demandUnanswered(tx, member, question);
      const photo = getAskablePhoto(tx, member.shopId, question.photoId);
      if (!photo) throw fault("conflict", TAKEN_OUT);
      if (input.calledClass !== null && !hasClass(tx, member.shopId, input.calledClass)) {
        const words = "That class is no longer in the library. Pick another.";
        throw fault("invalid", words, { calledClass: words });
      }
      const { calledClass, sure } = input;
      keepCall(tx, doerOf(doing), question, { calledClass, sure, confirmedClass: photo.classSlug });
      return { id: question.id };
    },
    { behavior: "immediate" },
  );
}

/** @throws FaultError "not-found" when no such question was put to this person */
export function requireQuestion(db: Handle, member: SignedIn, id: string): PracticeQuestion {
  const question = getQuestion(db, member.shopId, member.memberId, id);
  if (!question) throw fault("not-found", "That question is not yours or is not here. Ask for the next photo.");
  return question;
}

function demandUnanswered(tx: Handle, member: SignedIn, question: PracticeQuestion): void {
  if (getAnswer(tx, member.shopId, question.id))
    throw fault("conflict", "You called this photo already. Your first call stays; go on to the next one.");
}

function requireDrill(tx: Handle, member: SignedIn, drillId: number): Drill {
  const drill = getOwnDrill(tx, member.shopId, member.memberId, drillId);
  if (!drill) throw fault("not-found", "That drill is not set for you, or it has been withdrawn.");
  return drill;
}

const isDone = (tx: Handle, { shopId, memberId }: SignedIn, drill: Drill) =>
  listDrillAnswers(tx, shopId, memberId, drill.id).length >= drill.photoCount;

const doerOf = ({ member, now }: Doing) => ({ shopId: member.shopId, memberId: member.memberId, now });
