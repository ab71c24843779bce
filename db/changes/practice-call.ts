import { and, eq, isNull } from "drizzle-orm";
import type { Sureness } from "@/lib/cases/case-words";
import { fault } from "@/lib/fault";
import { remember } from "@/lib/practice/memory";
import type { Handle } from "../open";
import { getMemory } from "../queries/practice-photos";
import type { PracticeQuestion } from "../queries/practice-questions";
import { practiceAnswers, practiceMemories, practiceQuestions } from "../schema";
import type { Doer } from "./case-event";

interface NewQuestion {
  id: string;
  photoId: string;
  caseId: number;
  drillId: number | null;
}

/** Puts a question to a person. */
export function putQuestion(tx: Handle, doer: Doer, question: NewQuestion): void {
  tx.insert(practiceQuestions)
    .values({ shopId: doer.shopId, memberId: doer.memberId, askedAt: doer.now, ...question })
    .run();
}

interface Call {
  calledClass: string | null;
  sure: Sureness;
  confirmedClass: string;
}

/**
 * Keeps a person's call on a question, and when the photo comes back to them.
 * @throws FaultError "conflict" when the question was answered before: the first call stays
 */
export function keepCall(tx: Handle, doer: Doer, question: PracticeQuestion, call: Call): void {
  const { shopId, memberId, now } = doer;
  const closed = tx
    .update(practiceQuestions)
    .set({ answeredAt: now })
    .where(
      and(
        eq(practiceQuestions.shopId, shopId),
        eq(practiceQuestions.id, question.id),
        isNull(practiceQuestions.answeredAt),
      ),
    )
    .run();
  if (closed.changes !== 1) throw fault("conflict", "You called this photo already. Your first call stays.");
  const { photoId, caseId, drillId } = question;
  tx.insert(practiceAnswers)
    .values({ shopId, memberId, questionId: question.id, photoId, caseId, drillId, at: now, ...call })
    .run();
  const kept = getMemory(tx, shopId, memberId, photoId)?.memory ?? null;
  const next = remember(kept, { isRight: call.calledClass === call.confirmedClass, sure: call.sure }, now);
  tx.insert(practiceMemories)
    .values({ shopId, memberId, photoId, ...next })
    .onConflictDoUpdate({
      target: [practiceMemories.shopId, practiceMemories.memberId, practiceMemories.photoId],
      set: next,
    })
    .run();
}
