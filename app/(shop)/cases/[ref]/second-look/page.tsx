import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { CallsTable } from "@/components/cases/case-calls";
import { CaseFactSlips } from "@/components/cases/case-facts";
import { stagePhotos } from "@/components/cases/case-shots";
import { Against, MostAlike } from "@/components/cases/second-look-against";
import { SecondLookForm } from "@/components/cases/second-look-form";
import { Stake } from "@/components/cases/second-look-stake";
import { MisfitNote } from "@/components/metals/misfit-line";
import { InStepArea } from "@/components/photos/photo-stage-view";
import { PhotoStage } from "@/components/photos/photo-stage";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { getCaseMoney } from "@/db/queries/case-costs";
import { getCaseFacts, type CaseFacts } from "@/db/queries/case-page";
import type { CaseCall } from "@/db/queries/case-records";
import type { SignedIn } from "@/db/queries/crew";
import { getStation } from "@/db/queries/line";
import { getLatestPartCheck } from "@/db/queries/part-checks";
import { CASE_REF_PATTERN } from "@/lib/cases/case-ref";
import { opinionWords } from "@/lib/cases/history-words";
import { dayWords } from "@/lib/cases/moment-words";
import { metalInSentence } from "@/lib/cases/metal-words";
import { partsOf } from "@/lib/cases/part-words";
import { tagStanding } from "@/lib/cases/tag-standing";
import { caseMisfit } from "@/lib/metals/misfit";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { confirmCase, releaseCase } from "../../actions";
import { AlreadyLooked } from "./already-looked";
import { loadSecondLook } from "./load";
import { QueueShell } from "./queue-shell";

interface SecondLookPageProps {
  params: Promise<{ ref: string }>;
  searchParams: Promise<{ station?: string }>;
}

export async function generateMetadata({ params }: SecondLookPageProps): Promise<Metadata> {
  return { title: `Second look, ${(await params).ref}` };
}

/** The second look of one case: photo, facts, what to hold it against, and the tag to fill in. */
export default async function SecondLookPage({ params, searchParams }: SecondLookPageProps) {
  const [{ ref }, { station: slug }] = [await params, await searchParams];
  const member = await guardPage("case.confirm", routes.secondLook(ref));
  const db = getDb();
  const facts = CASE_REF_PATTERN.test(ref) ? getCaseFacts(db, member.shopId, ref) : null;
  if (!facts) notFound();
  const station = slug ? getStation(db, member.shopId, slug) : null;
  const now = Date.now();
  const isOpen = facts.state === "held";
  return (
    <QueueShell member={member} caseId={facts.id} isOpen={isOpen} station={station} now={now}>
      {(nextHref) =>
        isOpen ? (
          <Desk member={member} facts={facts} nextHref={nextHref} now={now} />
        ) : (
          <AlreadyLooked facts={facts} nextHref={nextHref} now={now} timeZone={member.shop.timeZone} />
        )
      }
    </QueueShell>
  );
}

interface DeskProps {
  member: SignedIn;
  facts: CaseFacts;
  nextHref: string;
  now: number;
}

function Desk({ member, facts, nextHref, now }: DeskProps) {
  const look = loadSecondLook(getDb(), member.shopId, facts, now);
  const stageable = stagePhotos(facts.ref, look.shots);
  const firstCall = look.calls.find((call) => call.kind === "first");
  const standing = tagStanding(facts, now);
  const check = getLatestPartCheck(getDb(), member.shopId, { workOrderId: facts.job.id });
  const misfit = caseMisfit(check, facts, { shop: member.shop, now });
  return (
    <>
      {misfit && (
        <div className="sl-misfit">
          <MisfitNote misfit={misfit} />
        </div>
      )}
      <InStepArea className="sl-desk">
        <div className="sl-look">
          <PhotoStage photos={stageable} startAt={newestReady(look.shots)} />
          <Section title="What is known" className="sl-known">
            <CaseFactSlips facts={facts} solutions={look.solutions} />
            <CallsTable calls={look.calls} caption="Calls so far" />
          </Section>
        </div>
        <div className="sl-against">
          <Against classes={look.against} />
          <MostAlike
            cases={look.alike}
            allHref={routes.casebook({ metal: facts.baseMetal, ...classFilter(look.startWith) })}
          />
        </div>
        <SecondLookForm
          key={`${facts.ref}-${facts.round}`}
          caseRef={facts.ref}
          stateWords={standing.words}
          sub={<SubLines facts={facts} firstCall={firstCall} />}
          ownCall={firstCall?.memberId === member.memberId}
          offer={look.offer}
          first={look.first}
          rest={look.rest}
          startWith={look.startWith}
          stake={can(member, "money.case") && <StakeOf member={member} facts={facts} />}
          nextHref={nextHref}
          onConfirm={confirmCase}
          onRelease={releaseCase}
        />
      </InStepArea>
    </>
  );
}

const classFilter = (slug: string | null): Record<string, string> => (slug ? { class: slug } : {});

/** The stage begins with the newest photo of the newest round that can be looked at. */
function newestReady(shots: readonly { round: number; state: string }[]): number {
  const round = Math.max(0, ...shots.filter((shot) => shot.state === "ready").map((shot) => shot.round));
  return Math.max(
    0,
    shots.findIndex((shot) => shot.round === round && shot.state === "ready"),
  );
}

function SubLines({ facts, firstCall }: { facts: CaseFacts; firstCall: CaseCall | undefined }) {
  const parts = `${partsOf(facts.quantity, facts.run?.partsStruck ?? null)} ${facts.job.partName}`;
  return (
    <>
      {facts.job.customer}, {parts}, {metalInSentence(facts.baseMetal, facts.alloy)}
      {firstCall && (
        <>
          <br />
          First call by {firstCall.by}: {opinionWords(firstCall)}
        </>
      )}
    </>
  );
}

function StakeOf({ member, facts }: { member: SignedIn; facts: CaseFacts }) {
  const money = getCaseMoney(getDb(), member.shopId, facts.id);
  if (!money) return null;
  return (
    <Stake
      money={{ atRisk: money.atRisk, rightNow: money.estimate }}
      currency={member.shop.currency}
      quantity={facts.quantity}
      ratesFrom={dayWords(money.rates.validFromAt, member.shop.timeZone)}
      assumed={money.assumed}
      stripHref={can(member, "strip.estimate") ? routes.strip({ case: facts.ref }) : undefined}
    />
  );
}
