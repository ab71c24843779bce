import type { CheckStart, JobToCheck } from "@/components/metals/use-part-check";
import type { Db } from "@/db/open";
import { getCaseFacts } from "@/db/queries/case-page";
import type { SignedIn } from "@/db/queries/crew";
import { listLatestPartChecks, type PartCheckRow } from "@/db/queries/part-checks";
import { findJobByNumber, getJob, listJobs, type JobRow } from "@/db/queries/work-orders";
import { CASE_REF_PATTERN } from "@/lib/cases/case-ref";
import { momentWords } from "@/lib/cases/moment-words";
import { JOB_LIMITS } from "@/lib/cases/job.schema";
import { checkFromAddress, wordOf, type Query } from "@/lib/metals/check-address";
import { densityWords } from "@/lib/metals/check-words";

/** More open jobs than fit a list are no help; the address can name any job. */
const JOBS = 200;

/** What the address says, and the jobs that a part may be of. A job or case that this shop has not counts as none named. */
export function loadCheck(db: Db, member: SignedIn, query: Query, now: number) {
  const { shopId } = member;
  const caseRef = wordOf(query, "case");
  const facts = caseRef && CASE_REF_PATTERN.test(caseRef) ? getCaseFacts(db, shopId, caseRef) : null;
  const named = namedJob(db, shopId, wordOf(query, "job", JOB_LIMITS.numberChars));
  // A case brings its own job; one of another job than the address names is left out.
  const ofCase = facts && (!named || named.id === facts.job.id) ? facts : null;
  const job = named ?? (ofCase ? getJob(db, shopId, ofCase.job.id) : undefined);

  const open = listJobs(db, shopId, { closed: false, limit: JOBS });
  const rows = job && !open.some((each) => each.id === job.id) ? [job, ...open] : open;
  const last = listLatestPartChecks(
    db,
    shopId,
    rows.map((each) => each.id),
  );
  const jobs = rows.map((each) => jobToCheck(each, last.get(each.id), member.shop.timeZone, now));
  const start: CheckStart = {
    ...checkFromAddress(query, member.shop.units),
    job: job?.number ?? null,
    caseRef: ofCase?.ref ?? null,
  };
  return { start, jobs };
}

function namedJob(db: Db, shopId: number, number: string | undefined): JobRow | undefined {
  const id = number === undefined ? undefined : findJobByNumber(db, shopId, number);
  return id === undefined ? undefined : getJob(db, shopId, id);
}

/** Named one by one: what goes to the browser holds no money. */
function jobToCheck(job: JobRow, last: PartCheckRow | undefined, timeZone: string, now: number): JobToCheck {
  const { id, number, customer, partName, quantity, baseMetal, alloy } = job;
  return {
    id,
    number,
    customer,
    partName,
    quantity,
    baseMetal,
    alloy,
    last: last ? `${densityWords(last)}, ${last.by}, ${momentWords(last.at, timeZone, now)}.` : null,
  };
}
