import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { CaseFactSlips, partRows, processRows } from "@/components/cases/case-facts";
import { CaseHead } from "@/components/cases/case-head";
import { CaseHistory } from "@/components/cases/case-history";
import { CaseTrace } from "@/components/cases/case-trace";
import { LineStrip } from "@/components/line/line-strip";
import { MisfitNote } from "@/components/metals/misfit-line";
import type { MainAction } from "@/components/shell/main-action";
import { ShopShell } from "@/components/shell/shop-shell";
import { LinkButton } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { getCaseFacts, type CaseFacts } from "@/db/queries/case-page";
import type { SignedIn } from "@/db/queries/crew";
import { getLatestPartCheck } from "@/db/queries/part-checks";
import { CASE_REF_PATTERN } from "@/lib/cases/case-ref";
import { callWords } from "@/lib/cases/part-words";
import { traceWords } from "@/lib/cases/trace-words";
import { caseMisfit } from "@/lib/metals/misfit";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { CaseAlike } from "./case-alike";
import { CaseDoings } from "./case-doings";
import { CasePhotos } from "./case-photos";
import { CaseRecords } from "./case-records";
import { loadCase, type LoadedCase } from "./load-case";

interface CasePageProps {
  params: Promise<{ ref: string }>;
}

export async function generateMetadata({ params }: CasePageProps): Promise<Metadata> {
  return { title: (await params).ref };
}

/** One case, whole: its tag, where it began, photos, history, calls, cards, and its cost to those who may see it. */
export default async function CasePage({ params }: CasePageProps) {
  const { ref } = await params;
  const member = await guardPage("case.see", routes.case(ref));
  const db = getDb();
  const facts = CASE_REF_PATTERN.test(ref) ? getCaseFacts(db, member.shopId, ref) : null;
  if (!facts) notFound();
  const now = Date.now();
  const loaded = loadCase(db, member.shopId, facts, { now, timeZone: member.shop.timeZone });
  const check = getLatestPartCheck(db, member.shopId, { workOrderId: facts.job.id });
  const misfit = caseMisfit(check, facts, { shop: member.shop, now });
  const { actor, counts, stations } = shellFor(member);
  const main = mainAction(member, facts);
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="casebook"
      main={main}
      strip={
        <LineStrip
          mode="thin"
          stations={stations}
          pressed={null}
          hrefFor={(to) => routes.casebook(to ? { station: to } : undefined)}
        />
      }
    >
      <Crumb neighbours={loaded.neighbours} />
      {misfit && <MisfitNote misfit={misfit} />}
      <CaseHead
        caseRef={facts.ref}
        state={loaded.standing.state}
        stateWords={loaded.standing.words}
        classSlug={shownClass(facts).slug}
        classWords={shownClass(facts).words}
        rows={headRows(facts)}
        progress={loaded.progress}
      />
      <div className="case-bar btns">
        {main && "href" in main && (
          <LinkButton className="desk-only" variant="main" href={main.href} glyph={main.glyph} keyCap={main.keyCap}>
            {main.label}
          </LinkButton>
        )}
        <LinkButton href={routes.tag(facts.ref)} glyph="ui-print">
          Print the tag
        </LinkButton>
      </div>
      {facts.selfConfirmed && (
        <Note title="First call and second look by the same person" className="case-note">
          {facts.confirmedBy} confirmed their own first call. It stays out of the agreement figures.
        </Note>
      )}
      <CaseTrace
        words={traceWords({
          found: facts.found.kind,
          traced: facts.traced?.kind ?? null,
          isConfirmed: facts.confirmedCauseId !== null,
          isReleased: facts.closing === "released",
        })}
        stations={loaded.stations}
        foundSlug={facts.found.slug}
        tracedSlug={facts.traced?.slug ?? null}
        tracedNote={loaded.tracedNote}
        foundNote={`${facts.quantity} ${facts.state === "closed" ? "found" : "held"}`}
      />
      <div className="case-cols">
        <div>
          <CasePhotos member={member} facts={facts} shots={loaded.shots} />
          <Section title="What is known" aside={<Link href={routes.partCheck({ case: facts.ref })}>Weigh a part</Link>}>
            <CaseFactSlips facts={facts} solutions={loaded.solutions} />
          </Section>
        </div>
        <div>
          <Section title="History" aside="Rows are added, never changed">
            <CaseHistory rounds={loaded.history} />
          </Section>
        </div>
      </div>
      <CaseRecords member={member} facts={facts} loaded={loaded} />
      <CaseAlike shopId={member.shopId} facts={facts} classes={loaded.classes} />
      <CaseDoings member={member} facts={facts} classes={loaded.classes} />
    </ShopShell>
  );
}

/** What this person most likely came to do. */
function mainAction(member: SignedIn, facts: CaseFacts): MainAction | null {
  if (facts.state === "held" && can(member, "case.confirm")) {
    return { label: "Take the second look", href: routes.secondLook(facts.ref), glyph: "ui-eye", keyCap: "N" };
  }
  if ((facts.state === "confirmed" || facts.state === "in-rework") && can(member, "card.work")) {
    return { label: "Do the rework card", href: routes.rework(facts.ref), glyph: "ui-again", keyCap: "N" };
  }
  return { label: "Snap a suspect part", href: routes.snap(), glyph: "ui-camera", keyCap: "N" };
}

/** While it is held the tag says what was called, or what it was taken for in the round before; after that, what was confirmed. */
function shownClass(facts: CaseFacts): { slug: string | null; words: string } {
  if (facts.state !== "held") return { slug: facts.confirmedClass, words: callWords(facts.confirmedTitle, true) };
  if (facts.calledClass === null && facts.confirmedTitle !== null) {
    return { slug: facts.confirmedClass, words: `Was ${facts.confirmedTitle.toLowerCase()}` };
  }
  return { slug: facts.calledClass, words: callWords(facts.calledTitle, false) };
}

/** Six facts for the tag: the part's, and how it was found. */
function headRows(facts: CaseFacts) {
  const [job, parts, metal, plate] = partRows(facts);
  const [found, , run] = processRows(facts, []);
  return [job, found, parts, run, metal, plate].filter((row) => row !== undefined);
}

function Crumb({ neighbours }: { neighbours: LoadedCase["neighbours"] }) {
  return (
    <nav className="crumb" aria-label="Casebook">
      <Link href={routes.casebook()}>Casebook</Link>
      <span>
        {neighbours.earlier && (
          <Link href={routes.case(neighbours.earlier)} rel="prev" aria-label={`Earlier: ${neighbours.earlier}`}>
            Earlier
          </Link>
        )}
        {neighbours.later && (
          <Link href={routes.case(neighbours.later)} rel="next" aria-label={`Later: ${neighbours.later}`}>
            Later
          </Link>
        )}
      </span>
    </nav>
  );
}
