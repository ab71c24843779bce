import type { Metadata } from "next";
import Link from "next/link";
import { AskForm } from "@/components/practice/ask-form";
import { DrillLine } from "@/components/practice/drill-line";
import type { MainAction } from "@/components/shell/main-action";
import { ShopShell } from "@/components/shell/shop-shell";
import { Empty } from "@/components/ui/empty";
import { Lead } from "@/components/ui/lead";
import { Section } from "@/components/ui/section";
import { TooFew } from "@/components/ui/too-few";
import { getDb } from "@/db/client";
import { dayWords } from "@/lib/cases/moment-words";
import { can } from "@/lib/permissions";
import { waitingWords } from "@/lib/practice/practice-words";
import { LEAST_CALLS } from "@/lib/practice/progress";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { askForPhoto } from "./actions";
import { loadPractice } from "./load-practice";

export const metadata: Metadata = { title: "Practice" };

const START_FORM = "practice-start";

/** Practice: set drills first, then what is due, then how one's eye stands. */
export default async function PracticePage() {
  const member = await guardPage("practice.do", routes.practice());
  const now = Date.now();
  const loaded = loadPractice(getDb(), member, now);
  const { actor, counts } = shellFor(member);
  const label = loaded.due + loaded.fresh > 0 ? "Call a photo" : "Practise ahead";
  const main: MainAction | null = loaded.canAsk ? { label, form: START_FORM, glyph: "ui-next" } : null;
  return (
    <ShopShell actor={actor} counts={counts} here="practice" main={main} className="practice">
      <Lead below={belowWords(loaded)}>{leadWords(loaded)}</Lead>
      {loaded.canAsk && (
        <AskForm
          id={START_FORM}
          drillId={null}
          label={label}
          onAsk={askForPhoto}
          button={{ variant: "main", glyph: "ui-next", keyCap: "N", className: "desk-only" }}
        />
      )}
      {!loaded.canAsk && <NothingToAsk answers={loaded.answers} />}
      <div className="today">
        <SetDrills drills={loaded.drills} now={now} timeZone={member.shop.timeZone} />
        <YourEye loaded={loaded} />
      </div>
      {can(member, "drill.set") && (
        <p className="mt-6">
          <Link className="solo" href={routes.practiceDrills()}>
            Set a drill
          </Link>
        </p>
      )}
    </ShopShell>
  );
}

type Loaded = ReturnType<typeof loadPractice>;

function leadWords({ due, fresh, canAsk, answers }: Loaded): string {
  if (!canAsk && answers === 0) return "No photo to practise on yet";
  return waitingWords(due, fresh);
}

function belowWords({ due, fresh, canAsk }: Loaded): string {
  if (due > 0 && fresh > 0) return `And ${fresh} new to you. A photo, your call, how sure you are; then what it was.`;
  if (due + fresh > 0) return "A photo, your call, how sure you are; then what it was.";
  return canAsk ? "You may go on early all the same." : "";
}

function NothingToAsk({ answers }: { answers: number }) {
  if (answers > 0)
    return <Empty title="All called.">What was called comes back on its day, new cases as they come.</Empty>;
  return (
    <Empty title="Practice begins with the first confirmed photo.">
      Each case that gets its second look becomes a photo to call. None has a confirmed class and a photo yet.
    </Empty>
  );
}

function SetDrills({ drills, now, timeZone }: { drills: Loaded["drills"]; now: number; timeZone: string }) {
  if (drills.length === 0) return null;
  return (
    <Section title="Set for you" aside={`${drills.filter((drill) => !drill.standing.isDone).length} to do`}>
      <ul>
        {drills.map((drill) => (
          <DrillLine
            key={drill.id}
            title={drill.title}
            classTitles={drill.classTitles}
            // The last moment of the day before the stored end.
            dueWords={drill.dueAt === null ? null : `by ${dayWords(drill.dueAt - 1, timeZone)}`}
            isLate={drill.dueAt !== null && drill.dueAt <= now && !drill.standing.isDone}
            standing={drill.standing}
          >
            {!drill.standing.isDone && (
              <AskForm
                drillId={drill.id}
                label={drill.standing.called === 0 ? "Begin" : "Go on"}
                onAsk={askForPhoto}
                button={{ "aria-label": `${drill.standing.called === 0 ? "Begin" : "Go on"}: ${drill.title}` }}
              />
            )}
          </DrillLine>
        ))}
      </ul>
    </Section>
  );
}

function YourEye({ loaded: { score, worst, answers } }: { loaded: Loaded }) {
  const link = (
    <Link className="solo" href={routes.practiceProgress()}>
      Score, mix-ups, how sure against how right
    </Link>
  );
  if (score.calls < LEAST_CALLS) {
    return (
      <Section title="Your eye in practice">
        <TooFew have={score.calls} need={LEAST_CALLS} what="calls">
          Your score shows from {LEAST_CALLS} first calls on.
        </TooFew>
        {answers > 0 && link}
      </Section>
    );
  }
  return (
    <Section title="Your eye in practice" rests={`First call on each of ${score.calls} photos.`}>
      <p className="prose">
        You called <strong>{`${score.right} of ${score.calls}`}</strong> right.
        {worst &&
          ` ${worst.times} times it was ${worst.confirmed.toLowerCase()} that you called ${worst.called.toLowerCase()}.`}
      </p>
      {link}
    </Section>
  );
}
