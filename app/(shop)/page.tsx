import type { Metadata } from "next";
import Link from "next/link";
import { LineStrip } from "@/components/line/line-strip";
import type { MainAction } from "@/components/shell/main-action";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listQueue } from "@/db/queries/second-look";
import { countWaiting, hasCases } from "@/db/queries/waiting";
import { countOpenJobs } from "@/db/queries/work-orders";
import { countWords } from "@/lib/cases/part-words";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { EyeThisMonth } from "./today/eye-this-month";
import { HeldByMe } from "./today/held-by-me";
import { countPractice } from "./today/count-practice";
import { LineChecks } from "./today/line-checks";
import { MoneyThisMonth } from "./today/money-this-month";
import { PracticeDue } from "./today/practice-due";
import { CardsToDo } from "./today/cards-to-do";
import { WaitsForSecondLook } from "./today/waits-for-second-look";

export const metadata: Metadata = { title: "Today" };

/** Today, for whoever is signed in: what waits for them, the line, one main action. */
export default async function TodayPage() {
  const member = await guardPage("case.see", routes.today());
  const db = getDb();
  const now = Date.now();
  const waiting = countWaiting(db, member.shopId);
  const isNew = !hasCases(db, member.shopId);
  const practice = member.roles.includes("trainee") ? countPractice(member, now) : null;
  const main = mainAction(member, practice);
  const { actor, counts, stations } = shellFor(member);
  const works = can(member, "card.work") && !isOwnerOnly(member);
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="today"
      main={main}
      strip={
        <LineStrip
          mode="full"
          stations={stations}
          pressed={null}
          hrefFor={(station) => routes.casebook(station ? { station } : undefined)}
        />
      }
    >
      <Lead above={dayWords(now, member.shop.timeZone)} main={main}>
        {leadWords(member, waiting, isNew)}
      </Lead>
      {isNew && (
        <Note glyph="ui-camera" title="The casebook begins with the first part">
          A plater photographs a suspect part at the strike. It gets a hold tag here, a senior takes a second look, and
          what was learned stays.
          {can(member, "job.keep") && countOpenJobs(db, member.shopId) === 0 && (
            <Link className="solo" href={routes.jobs({ open: "1" })}>
              Open the first job
            </Link>
          )}
        </Note>
      )}
      <div className="today">
        {can(member, "case.confirm") && <WaitsForSecondLook member={member} now={now} />}
        {works && <CardsToDo member={member} />}
        {can(member, "ledger.see") && <MoneyThisMonth member={member} now={now} />}
        {practice && <PracticeDue {...practice} />}
        {can(member, "case.snap") && !isOwnerOnly(member) && <HeldByMe member={member} now={now} />}
        <LineChecks member={member} now={now} />
        {!can(member, "case.confirm") && <EyeThisMonth member={member} now={now} />}
      </div>
      {can(member, "job.keep") && (
        <p className="mt-6">
          <Link className="solo" href={routes.jobs()}>
            The shop’s jobs
          </Link>
        </p>
      )}
    </ShopShell>
  );
}

const isOwnerOnly = (member: SignedIn) => member.roles.every((role) => role === "owner");

/**
 * One main action a role: a senior's queue comes before all else, then the snap; an owner opens the ledger, and a trainee
 * practises while something is set or due.
 */
function mainAction(member: SignedIn, practice: ReturnType<typeof countPractice> | null): MainAction {
  const first = member.roles.includes("senior")
    ? listQueue(getDb(), member.shopId, { stationId: null, limit: 1 })[0]
    : null;
  if (first) return { label: "Take the second look", href: routes.secondLook(first.ref), glyph: "ui-eye", keyCap: "N" };
  if (isOwnerOnly(member)) return { label: "Open the ledger", href: routes.ledger(), glyph: "ui-money", keyCap: "N" };
  const isTraineeOnly = member.roles.every((role) => role === "trainee");
  if (isTraineeOnly && practice && practice.due + practice.drills > 0)
    return { label: "Practise", href: routes.practice(), glyph: "station-inspect", keyCap: "N" };
  return { label: "Snap a suspect part", href: routes.snap(), glyph: "ui-camera", keyCap: "N" };
}

function dayWords(now: number, timeZone: string): string {
  return new Intl.DateTimeFormat("en-GB", { timeZone, weekday: "short", day: "numeric", month: "short" }).format(now);
}

/** The sentence that the day opens with. */
function leadWords(member: SignedIn, waiting: { secondLook: number; rework: number }, isNew: boolean): string {
  if (isNew) return "Nothing has been held here yet";
  if (member.roles.includes("senior") || member.roles.includes("owner")) {
    if (waiting.secondLook > 0)
      return sentence(waiting.secondLook, "case waits for a second look", "cases wait for a second look");
    return waiting.rework > 0
      ? sentence(waiting.rework, "card is out on the floor", "cards are out on the floor")
      : "The rack is clear";
  }
  if (member.roles.includes("plater")) {
    return waiting.rework > 0
      ? sentence(waiting.rework, "part needs your hands", "parts need your hands")
      : "The rack is clear";
  }
  return waiting.secondLook > 0
    ? sentence(waiting.secondLook, "part hangs on hold", "parts hang on hold")
    : "The rack is clear";
}

function sentence(count: number, one: string, many: string): string {
  const words = countWords(count);
  return `${words.charAt(0).toUpperCase()}${words.slice(1)} ${count === 1 ? one : many}`;
}
