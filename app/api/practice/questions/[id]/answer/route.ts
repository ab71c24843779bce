import { answerInput } from "@/lib/practice/practice.schema";
import { handle } from "@/lib/server/handle";
import { answerQuestion } from "@/lib/server/practice/practise";
import { viewQuestion } from "@/lib/server/practice/question-view";

/** The call on a question: `calledClass` ("cant-tell" is one) and `sure` 1 to 3. The first call stays. */
export const POST = handle({
  permission: "practice.do",
  input: answerInput,
  run: ({ db, member, input, now }) => viewQuestion(db, member, answerQuestion({ db, member, now }, input).id),
});
