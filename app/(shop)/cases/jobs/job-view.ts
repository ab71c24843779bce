import type { JobFigures } from "@/components/cases/job-cost-fields";
import type { JobView } from "@/components/cases/job-table";
import type { SignedIn } from "@/db/queries/crew";
import type { JobRow } from "@/db/queries/work-orders";
import { layersWords } from "@/lib/cases/job-words";
import { metalWords } from "@/lib/cases/part-words";
import type { Misfit } from "@/lib/metals/misfit";
import { formatMoney } from "@/lib/money";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";

/**
 * A job for its list: the value only for those who may see money, the way in only for those who may change it.
 * @param misfit where its newest weighing does not fit what it declares
 */
export function jobView(job: JobRow, member: SignedIn, misfit?: Misfit): JobView {
  const { partValueCents, closedAt } = job;
  const value = partValueCents === 0 ? "not set" : formatMoney(partValueCents, member.shop.currency);
  return {
    id: job.id,
    number: job.number,
    customer: job.customer,
    partName: job.partName,
    metal: metalWords(job.baseMetal, job.alloy),
    quantity: job.quantity,
    layers: layersWords(job.finalStack),
    weighHref: routes.partCheck({ job: job.number }),
    misfit,
    held: job.heldCases === 0 ? "" : String(job.heldCases),
    ...(can(member, "money.case") ? { value } : {}),
    ...(can(member, "strip.estimate") ? { stripHref: routes.strip({ job: job.number }) } : {}),
    ...(can(member, "job.change")
      ? { changeHref: routes.jobs({ change: String(job.id), ...(closedAt === null ? {} : { closed: "1" }) }) }
      : {}),
  };
}

/** A job's figures for its form. */
export function jobFigures(job: JobRow, member: SignedIn): JobFigures {
  const { quantity, areaDm2, finalStack, partValueCents } = job;
  const partValue = partValueCents === 0 ? "" : (partValueCents / 100).toFixed(2);
  return { quantity, areaDm2, finalStack, ...(can(member, "money.case") ? { partValue } : {}) };
}
