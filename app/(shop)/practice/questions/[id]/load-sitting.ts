import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { getDrill } from "@/db/queries/practice-drills";
import { getAnswer, listDrillAnswers, listOwnAnswers, type PracticeQuestion } from "@/db/queries/practice-questions";
import { dayOf, dayStart, nextDay } from "@/lib/costs/period";
import { SITTING } from "@/lib/practice/practice-words";
import { sittingOf } from "@/lib/practice/sitting";
import { drillPhotos, waitingPhotos } from "@/lib/server/practice/choose-photo";

/** The sitting that a question belongs to: its drill, or the ten photos of the day it falls among. */
export function loadSitting(db: Db, member: SignedIn, question: PracticeQuestion, now: number) {
  const drill = question.drillId === null ? null : getDrill(db, member.shopId, question.drillId);
  const isOpen = question.answeredAt === null;
  const waiting = drill
    ? drillPhotos({ db, member, now }, drill)
    : Object.values(waitingPhotos({ db, member, now })).flat();
  const left = waiting.filter((photo) => photo.photoId !== question.photoId).length;
  const answers = (
    drill ? listDrillAnswers(db, member.shopId, member.memberId, drill.id) : ownAnswers(db, member, question, now)
  ).map((answer) => ({ questionId: answer.questionId, isRight: answer.called === answer.confirmed }));
  const size = drill?.photoCount ?? SITTING;
  return {
    drillId: drill?.withdrawnAt === null ? drill.id : null,
    drillTitle: drill?.title,
    isDrillOver: drill !== null && !isOpen && (answers.length >= size || left === 0),
    sitting: sittingOf({ answers, questionId: question.id, size, left }),
  };
}

/** What was called outside drills on the shop's day that the question was answered, or today. */
function ownAnswers(db: Db, member: SignedIn, question: PracticeQuestion, now: number) {
  const { timeZone } = member.shop;
  const day = dayOf(getAnswer(db, member.shopId, question.id)?.at ?? now, timeZone);
  return listOwnAnswers(db, member.shopId, member.memberId, dayStart(day, timeZone), dayStart(nextDay(day), timeZone));
}
