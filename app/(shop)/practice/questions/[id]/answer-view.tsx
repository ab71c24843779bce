import Link from "next/link";
import { AskForm } from "@/components/practice/ask-form";
import { PhotoLook } from "@/components/practice/photo-look";
import { ShopSplit } from "@/components/practice/shop-split";
import { TellApart } from "@/components/practice/tell-apart";
import { Verdict } from "@/components/practice/verdict";
import { Empty } from "@/components/ui/empty";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import type { PracticeQuestion } from "@/db/queries/practice-questions";
import { routes } from "@/lib/routes";
import type { AnsweredQuestion } from "@/lib/server/practice/question-view";
import { askForPhoto } from "../../actions";
import { loadAnswer } from "./load-answer";

interface AnswerViewProps {
  member: SignedIn;
  question: PracticeQuestion;
  view: AnsweredQuestion;
  now: number;
  /** How to go on; null when the drill is over. The form stands in the page, the thumb bar submits it too. */
  next: { formId: string; drillId: number | null; label: string } | null;
}

type Loaded = ReturnType<typeof loadAnswer>;

/** What was confirmed, why, what tells it apart, how the shop split. */
export function AnswerView({ member, question, view, now, next }: AnswerViewProps) {
  const loaded = loadAnswer(getDb(), member, question, view, now);
  const { confirmed, called } = loaded;
  return (
    <>
      <div className="practice-cols">
        <div>
          <PhotoLook
            src={view.photo.view}
            caption={confirmed.title}
            isRendered={view.isRendered}
            alt={`The part: ${confirmed.title.toLowerCase()}`}
          />
          <Verdict called={called} sure={view.sure} confirmed={confirmed} />
          {loaded.nowConfirmed && (
            <Note glyph="ui-again" title={`Confirmed since as ${loaded.nowConfirmed.title.toLowerCase()}`}>
              The case was looked at again after your call. Your call is held against what stood then.
            </Note>
          )}
        </div>
        <div>
          <h1 className="practice-ask">{headWords(view, loaded)}</h1>
          <TellApart pair={view.right ? [] : loaded.pair} tells={loaded.tells} />
          <p className="small mid practice-record">{loaded.record}</p>
          <Doors loaded={loaded} view={view} />
          {next && (
            <AskForm
              id={next.formId}
              drillId={next.drillId}
              label={next.label}
              onAsk={askForPhoto}
              button={{ variant: "main", glyph: "ui-next", keyCap: "N", className: "desk-only" }}
            />
          )}
        </div>
      </div>
      <Behind loaded={loaded} />
    </>
  );
}

function headWords(view: AnsweredQuestion, { confirmed, called }: Loaded): string {
  const title = confirmed.title.toLowerCase();
  if (view.right) return `Right: ${title}`;
  return called === null ? `It is ${title}` : `Missed: it is ${title}, not ${called.title.toLowerCase()}`;
}

function Doors({ loaded, view }: { loaded: Loaded; view: AnsweredQuestion }) {
  const { confirmed, otherRef } = loaded;
  return (
    <p className="btns practice-doors">
      {view.ref && otherRef && otherRef !== view.ref && (
        <Link className="solo" href={routes.compare([view.ref, otherRef])}>
          Compare the two parts
        </Link>
      )}
      <Link className="solo" href={routes.libraryClass(confirmed.slug)}>
        {`${confirmed.title} in the library`}
      </Link>
      {view.ref && (
        <Link className="solo ref" href={routes.case(view.ref)}>
          {view.ref}
        </Link>
      )}
    </p>
  );
}

function Behind({ loaded: { cause, split } }: { loaded: Loaded }) {
  const calls = split.reduce((sum, line) => sum + line.atTheTank + line.inPractice, 0);
  return (
    <div className="practice-cols practice-behind">
      <Section
        title="How the shop split"
        rests="Each person's first call: on the part before its second look, and in practice before you."
      >
        {calls === 0 ? <Empty title="Nobody called it before you." /> : <ShopSplit lines={split} />}
      </Section>
      {cause && (
        <Section title="What caused it" rests="The cause that was confirmed at the second look.">
          <h3>{cause.title}</h3>
          <p className="prose">{cause.why}</p>
        </Section>
      )}
    </div>
  );
}
