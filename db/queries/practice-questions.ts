import { and, asc, desc, eq, gte, isNull, lt } from "drizzle-orm";
import type { Handle } from "../open";
import { practiceAnswers, practiceQuestions } from "../schema";

const questionColumns = {
  id: practiceQuestions.id,
  photoId: practiceQuestions.photoId,
  caseId: practiceQuestions.caseId,
  drillId: practiceQuestions.drillId,
  askedAt: practiceQuestions.askedAt,
  answeredAt: practiceQuestions.answeredAt,
};

/** A question that was put to this person; another's is as unknown as one that never was. */
export function getQuestion(db: Handle, shopId: number, memberId: number, id: string) {
  return (
    db
      .select(questionColumns)
      .from(practiceQuestions)
      .where(
        and(
          eq(practiceQuestions.shopId, shopId),
          eq(practiceQuestions.memberId, memberId),
          eq(practiceQuestions.id, id),
        ),
      )
      .get() ?? null
  );
}

export type PracticeQuestion = NonNullable<ReturnType<typeof getQuestion>>;

/** The question that this person has open, in a drill or (null) in their own practice. */
export function getOpenQuestion(db: Handle, shopId: number, memberId: number, drillId: number | null) {
  return (
    db
      .select(questionColumns)
      .from(practiceQuestions)
      .where(
        and(
          eq(practiceQuestions.shopId, shopId),
          eq(practiceQuestions.memberId, memberId),
          isNull(practiceQuestions.answeredAt),
          drillId === null ? isNull(practiceQuestions.drillId) : eq(practiceQuestions.drillId, drillId),
        ),
      )
      .orderBy(desc(practiceQuestions.askedAt))
      .get() ?? null
  );
}

/** The question that this person was asked last, whatever came of it. */
export function getLastQuestion(db: Handle, shopId: number, memberId: number) {
  return (
    db
      .select(questionColumns)
      .from(practiceQuestions)
      .where(and(eq(practiceQuestions.shopId, shopId), eq(practiceQuestions.memberId, memberId)))
      .orderBy(desc(practiceQuestions.askedAt))
      .get() ?? null
  );
}

const answerColumns = {
  id: practiceAnswers.id,
  questionId: practiceAnswers.questionId,
  photoId: practiceAnswers.photoId,
  called: practiceAnswers.calledClass,
  sure: practiceAnswers.sure,
  confirmed: practiceAnswers.confirmedClass,
  at: practiceAnswers.at,
};

/** The answer to a question, if there is one. */
export function getAnswer(db: Handle, shopId: number, questionId: string) {
  return (
    db
      .select(answerColumns)
      .from(practiceAnswers)
      .where(and(eq(practiceAnswers.shopId, shopId), eq(practiceAnswers.questionId, questionId)))
      .get() ?? null
  );
}

export type KeptAnswer = NonNullable<ReturnType<typeof getAnswer>>;

/** Everything that a person called in practice, oldest first. */
export function listAnswers(db: Handle, shopId: number, memberId: number) {
  return db
    .select(answerColumns)
    .from(practiceAnswers)
    .where(and(eq(practiceAnswers.shopId, shopId), eq(practiceAnswers.memberId, memberId)))
    .orderBy(asc(practiceAnswers.at), asc(practiceAnswers.id))
    .all();
}

/** A person's answers in a drill, oldest first. */
export function listDrillAnswers(db: Handle, shopId: number, memberId: number, drillId: number) {
  return db
    .select(answerColumns)
    .from(practiceAnswers)
    .where(
      and(
        eq(practiceAnswers.shopId, shopId),
        eq(practiceAnswers.memberId, memberId),
        eq(practiceAnswers.drillId, drillId),
      ),
    )
    .orderBy(asc(practiceAnswers.at), asc(practiceAnswers.id))
    .all();
}

/** A person's answers outside drills within a stretch of time, oldest first. */
export function listOwnAnswers(db: Handle, shopId: number, memberId: number, fromAt: number, untilAt: number) {
  return db
    .select(answerColumns)
    .from(practiceAnswers)
    .where(
      and(
        eq(practiceAnswers.shopId, shopId),
        eq(practiceAnswers.memberId, memberId),
        isNull(practiceAnswers.drillId),
        gte(practiceAnswers.at, fromAt),
        lt(practiceAnswers.at, untilAt),
      ),
    )
    .orderBy(asc(practiceAnswers.at), asc(practiceAnswers.id))
    .all();
}
