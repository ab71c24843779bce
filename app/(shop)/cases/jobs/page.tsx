import type { Metadata } from "next";
import Link from "next/link";
import { JobTable } from "@/components/cases/job-table";
import type { MainAction } from "@/components/shell/main-action";
import { ShopShell } from "@/components/shell/shop-shell";
import { Empty } from "@/components/ui/empty";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Pager } from "@/components/ui/pager";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listLatestPartChecks } from "@/db/queries/part-checks";
import { countOpenJobs, getJob, listJobs, placeOfJob } from "@/db/queries/work-orders";
import { readJobCursor, writeJobCursor } from "@/lib/cases/job-cursor";
import { countWords } from "@/lib/cases/part-words";
import { jobMisfit } from "@/lib/metals/misfit";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { ChangeView } from "./change-view";
import { jobView } from "./job-view";
import { OpenView } from "./open-view";

export const metadata: Metadata = { title: "Jobs" };

interface JobsPageProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

const PAGE = 50;

/** The shop's jobs. The address says what else: `open` a new one, `change` one, or the `closed` ones. */
export default async function JobsPage({ searchParams }: JobsPageProps) {
  const query = await searchParams;
  const member = await guardPage("case.see", routes.jobs());
  const isFromSnap = query.from === "snap";
  if (can(member, "job.keep") && (isFromSnap || query.open !== undefined))
    return <OpenView member={member} isFromSnap={isFromSnap} />;
  const job = can(member, "job.change") ? getJob(getDb(), member.shopId, wholeNumber(query.change)) : undefined;
  if (job) return <ChangeView member={member} job={job} />;
  return <ListView member={member} isClosed={query.closed === "1"} after={single(query.after)} />;
}

const single = (value: string | string[] | undefined) => (typeof value === "string" ? value : undefined);
/** 0 is nobody's row. */
const wholeNumber = (value: string | string[] | undefined) =>
  /^\d{1,15}$/.test(single(value) ?? "") ? Number(value) : 0;

function ListView({ member, isClosed, after }: { member: SignedIn; isClosed: boolean; after: string | undefined }) {
  const db = getDb();
  const rows = listJobs(db, member.shopId, { closed: isClosed, after: readJobCursor(after), limit: PAGE + 1 });
  const shown = rows.slice(0, PAGE);
  const last = rows.length > PAGE ? shown.at(-1) : undefined;
  const keeps = can(member, "job.keep");
  const main: MainAction | null = keeps ? { label: "Open a job", href: routes.jobs({ open: "1" }), keyCap: "N" } : null;
  const closed: Record<string, string> = isClosed ? { closed: "1" } : {};
  const checks = listLatestPartChecks(
    db,
    member.shopId,
    shown.map((job) => job.id),
  );
  const now = Date.now();
  const { actor, counts } = shellFor(member);
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="casebook"
      back={isClosed ? routes.jobs() : routes.casebook()}
      main={main}
    >
      <Lead
        size="page"
        main={main}
        below={isClosed ? "No snap names them. Their cases stay in the casebook." : undefined}
      >
        {isClosed ? "Closed jobs" : leadWords(countOpenJobs(db, member.shopId))}
      </Lead>
      {!keeps && <Note title="A plater, a senior tech or the owner opens a job">You can read the list here.</Note>}
      <Section
        rests={can(member, "job.change") && shown.length > 0 ? numberWords(isClosed) : undefined}
        title={isClosed ? "Closed, the last first" : "Open, newest first"}
        aside={
          <Link className="solo" href={routes.jobs(isClosed ? undefined : { closed: "1" })}>
            {isClosed ? "Open jobs" : "Closed jobs"}
          </Link>
        }
      >
        {shown.length === 0 ? (
          <Empty title={isClosed ? "None is closed yet" : "No job is open"}>
            {isClosed
              ? "A senior tech closes a job once it has left the shop."
              : "A hold tag needs a job to belong to."}
          </Empty>
        ) : (
          <JobTable
            caption={isClosed ? "Closed jobs, the last closed first" : "Open jobs, newest first"}
            jobs={shown.map((job) =>
              jobView(job, member, jobMisfit(checks.get(job.id), job, { shop: member.shop, now })),
            )}
          />
        )}
      </Section>
      {(last || after) && (
        <Pager
          label="Jobs"
          words={`${shown.length} shown`}
          nextHref={last ? routes.jobs({ ...closed, after: writeJobCursor(placeOfJob(last)) }) : null}
          previousHref={after ? routes.jobs(closed) : null}
          previousWords="Back to the newest"
        />
      )}
    </ShopShell>
  );
}

function leadWords(open: number): string {
  if (open === 0) return "No job is open";
  const words = countWords(open);
  return `${words.charAt(0).toUpperCase()}${words.slice(1)} ${open === 1 ? "job is" : "jobs are"} open`;
}

const numberWords = (isClosed: boolean) =>
  isClosed
    ? "A job's number is the way to open it again."
    : "A job's number is the way to change its figures or close it.";
