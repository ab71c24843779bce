import { JobOpenForm } from "@/components/cases/job-open-form";
import { JobTable } from "@/components/cases/job-table";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listCustomerNames, listJobs } from "@/db/queries/work-orders";
import { currencySign } from "@/lib/costs/rate-fields";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { shellFor } from "@/lib/server/shell-data";
import { openJob } from "./actions";
import { jobView } from "./job-view";

const FORM_ID = "open-job";
/** As many of the newest as help to see that a job is there already. */
const NEWEST = 8;

/** The form that opens a job, and the newest jobs beside it. */
export function OpenView({ member, isFromSnap }: { member: SignedIn; isFromSnap: boolean }) {
  const db = getDb();
  const { actor, counts } = shellFor(member);
  const newest = listJobs(db, member.shopId, { closed: false, limit: NEWEST });
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="casebook"
      back={isFromSnap ? routes.snap() : routes.jobs()}
      main={{ label: "Open the job", form: FORM_ID }}
    >
      <Lead size="page" below="A hold tag names the job that its part belongs to.">
        Open a job
      </Lead>
      <div className="cols--main">
        <Section title="The job">
          <JobOpenForm
            id={FORM_ID}
            customers={listCustomerNames(db, member.shopId)}
            currencySign={can(member, "money.case") ? currencySign(member.shop.currency) : null}
            onward={
              isFromSnap
                ? { href: routes.snap(), words: "Back to the snap" }
                : { href: routes.jobs(), words: "See the open jobs" }
            }
            action={openJob}
          />
        </Section>
        {newest.length > 0 && (
          <div>
            <Section title="Open now" aside="Newest first">
              <JobTable caption="The newest open jobs" jobs={newest.map((job) => jobView(job, member))} brief />
            </Section>
          </div>
        )}
      </div>
    </ShopShell>
  );
}
