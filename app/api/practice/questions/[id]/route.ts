import { questionInput } from "@/lib/practice/practice.schema";
import { handle } from "@/lib/server/handle";
import { viewQuestion } from "@/lib/server/practice/question-view";

/** A question that was put to the caller; what was confirmed is told only once they have called it. */
export const GET = handle({
  permission: "practice.do",
  input: questionInput,
  run: ({ db, member, input: { id } }) => viewQuestion(db, member, id),
});
