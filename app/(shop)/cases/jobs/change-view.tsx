import { JobChangeForm } from "@/components/cases/job-change-form";
import { JobTurnForm } from "@/components/cases/job-turn-form";
import { MisfitNote } from "@/components/metals/misfit-line";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { getLatestPartCheck } from "@/db/queries/part-checks";
import type { JobRow } from "@/db/queries/work-orders";
import { counted, metalInside } from "@/lib/cases/part-words";
import { currencySign } from "@/lib/costs/rate-fields";
import { jobMisfit } from "@/lib/metals/misfit";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { shellFor } from "@/lib/server/shell-data";
import { changeJob, closeJob, reopenJob } from "./actions";
import { jobFigures } from "./job-view";

const FORM_ID = "job";

/** One job, for those who keep it right: its figures while it is open, the way back once it is closed. */
export function ChangeView({ member, job }: { member: SignedIn; job: JobRow }) {
  const { actor, counts } = shellFor(member);
  const isClosed = job.closedAt !== null;
  const check = getLatestPartCheck(getDb(), member.shopId, { workOrderId: job.id });
  const misfit = jobMisfit(check, job, { shop: member.shop, now: Date.now() });
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="casebook"
      back={routes.jobs(isClosed ? { closed: "1" } : undefined)}
      main={{ label: isClosed ? "Open it again" : "Save the job", form: FORM_ID }}
    >
      <Lead
        size="page"
        below={`${job.customer}: ${job.partName}, ${metalInside(job.baseMetal, job.alloy)}, ${counted(job.quantity, "part")}.`}
      >
        {isClosed ? `Job ${job.number} is closed` : `Job ${job.number}`}
      </Lead>
      {misfit && <MisfitNote misfit={misfit} />}
      {isClosed ? (
        <Section title="Open it again">
          <JobTurnForm id={FORM_ID} jobId={job.id} label="Open it again" variant="main" action={reopenJob}>
            Then a snap can name it, and its figures can be changed.
          </JobTurnForm>
        </Section>
      ) : (
        <OpenJob member={member} job={job} />
      )}
    </ShopShell>
  );
}

function OpenJob({ member, job }: { member: SignedIn; job: JobRow }) {
  return (
    <div className="cols--main">
      <Section title="The job card">
        <JobChangeForm
          id={FORM_ID}
          jobId={job.id}
          metal={{ baseMetal: job.baseMetal, alloy: job.alloy }}
          figures={jobFigures(job, member)}
          currencySign={can(member, "money.case") ? currencySign(member.shop.currency) : null}
          action={changeJob}
        />
      </Section>
      <div>
        <Note title="Closed cases keep their cost">
          Open cases of this job are priced again when it is saved, and so is their place in the queue. What a closed
          case cost stays.
        </Note>
        <Section title="Close the job">
          <JobTurnForm jobId={job.id} label="Close the job" variant="plain" action={closeJob}>
            {job.heldCases > 0 &&
              `${counted(job.heldCases, "case")} of it on hold: they stay, and are worked as before. `}
            No snap names a closed job.
          </JobTurnForm>
        </Section>
      </div>
    </div>
  );
}
