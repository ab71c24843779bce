import { askInput } from "@/lib/practice/practice.schema";
import { handle } from "@/lib/server/handle";
import { askQuestion } from "@/lib/server/practice/practise";
import { viewQuestion } from "@/lib/server/practice/question-view";

/** Asks for a photo to call, of a drill or of one's own practice. An open question is handed out again. */
export const POST = handle({
  permission: "practice.do",
  input: askInput,
  run: ({ db, member, input, now }) => viewQuestion(db, member, askQuestion({ db, member, now }, input).id),
});
