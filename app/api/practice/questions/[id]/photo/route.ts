import { questionPhotoInput } from "@/lib/practice/practice.schema";
import { handle } from "@/lib/server/handle";
import { serveQuestionPhoto } from "@/lib/server/practice/question-photo";

/** The photo of a question, for the person asked alone. Nothing in the answer leads to its case. */
export const GET = handle({
  permission: "practice.do",
  input: questionPhotoInput,
  run: ({ db, member, input }) => serveQuestionPhoto(db, member, input),
});
