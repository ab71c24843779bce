import { PhotoLook } from "@/components/practice/photo-look";
import { QuestionForm } from "@/components/practice/question-form";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import type { OpenQuestion } from "@/lib/server/practice/question-view";
import { callPhoto } from "../../actions";
import { loadOffer } from "./load-ask";

/** The photo, and what would you call it? */
export function AskView({ member, view, formId }: { member: SignedIn; view: OpenQuestion; formId: string }) {
  const { first, rest } = loadOffer(getDb(), member);
  return (
    <div className="practice-cols">
      <PhotoLook
        src={view.photo.view}
        caption={view.facts}
        isRendered={view.isRendered}
        alt="The part as it was photographed. Its class is what you are asked."
      />
      <div>
        <h1 className="practice-ask">What would you call it?</h1>
        <QuestionForm id={formId} questionId={view.id} first={first} rest={rest} onCall={callPhoto} />
      </div>
    </div>
  );
}
