import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { FocusHeading } from "@/components/cases/focus-heading";
import { AskForm } from "@/components/practice/ask-form";
import { SittingHead } from "@/components/practice/sitting-head";
import type { MainAction } from "@/components/shell/main-action";
import { ShopShell } from "@/components/shell/shop-shell";
import { Broken } from "@/components/ui/broken";
import { getDb } from "@/db/client";
import { getQuestion } from "@/db/queries/practice-questions";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { viewQuestion, type QuestionView } from "@/lib/server/practice/question-view";
import { askForPhoto } from "../../actions";
import { AnswerView } from "./answer-view";
import { AskView } from "./ask-view";
import { loadSitting } from "./load-sitting";

// The same for every question: a title must not tell the class.
export const metadata: Metadata = { title: "Practice" };

const CALL_FORM = "practice-call";
const NEXT_FORM = "practice-next";

/** One question: first the photo and the call, then, at the same address, what was confirmed and why. */
export default async function QuestionPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const member = await guardPage("practice.do", routes.practiceQuestion(id));
  const db = getDb();
  const now = Date.now();
  const question = getQuestion(db, member.shopId, member.memberId, id);
  if (!question) notFound();
  const view = viewQuestion(db, member, id);
  const { sitting, drillId, drillTitle, isDrillOver } = loadSitting(db, member, question, now);
  const { actor, counts } = shellFor(member);
  const nextLabel = !isDrillOver && sitting.place === sitting.photos.length ? "Go on practising" : "Next photo";
  const main = mainAction(view, isDrillOver, nextLabel);
  return (
    <ShopShell actor={actor} counts={counts} here="practice" back={routes.practice()} main={main} className="practice">
      <SittingHead sitting={sitting} title={drillTitle} />
      <FocusHeading on={view.answered ? "answered" : "asked"} />
      {view.answered ? (
        <AnswerView
          member={member}
          question={question}
          view={view}
          now={now}
          next={isDrillOver ? null : { formId: NEXT_FORM, drillId, label: nextLabel }}
        />
      ) : "gone" in view ? (
        <>
          <h1 className="practice-ask">This photo has left practice</h1>
          <Broken
            what="The case was opened again or its photo taken away while you looked."
            safe="Nothing was counted."
            todo="Go on to the next photo."
            action={<AskForm id={NEXT_FORM} drillId={drillId} label="Next photo" onAsk={askForPhoto} />}
          />
        </>
      ) : (
        <AskView member={member} view={view} formId={CALL_FORM} />
      )}
    </ShopShell>
  );
}

function mainAction(view: QuestionView, isDrillOver: boolean, nextLabel: string): MainAction {
  if (isDrillOver) return { label: "Back to practice", href: routes.practice(), glyph: "ui-tick" };
  if (view.answered) return { label: nextLabel, form: NEXT_FORM, glyph: "ui-next" };
  if ("gone" in view) return { label: "Next photo", form: NEXT_FORM, glyph: "ui-next" };
  return { label: "That's my call", form: CALL_FORM };
}
