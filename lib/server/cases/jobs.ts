import { priceOpenCases } from "@/db/changes/price-open-cases";
import type { Db, Handle } from "@/db/open";
import { insertAudit } from "@/db/queries/audit";
import type { SignedIn } from "@/db/queries/crew";
import {
  ensureCustomer,
  findJobByNumber,
  getJob,
  insertWorkOrder,
  updateWorkOrder,
  type JobRow,
} from "@/db/queries/work-orders";
import { jobChanges, metalChanges } from "@/lib/cases/job-words";
import type { ChangeJob, OpenJob } from "@/lib/cases/job.schema";
import type { AuditAction } from "@/lib/crew/audit-words";
import { fault } from "@/lib/fault";
import { formatMoney } from "@/lib/money";
import { can } from "@/lib/permissions";

const MAY_SEE_MONEY = "A senior fills in the part's value. Reload the page and leave it out.";
const SOMEBODY_ELSE = "Somebody changed this job a moment ago. Reload to see it.";

/**
 * Opens a job. A customer that the shop does not know yet comes with it.
 * @throws FaultError "invalid" for a number that the shop has given already, "refused" for a value from somebody who may
 * not see money
 */
export function openJob(db: Db, member: SignedIn, input: OpenJob, now: number): { number: string } {
  const { shopId } = member;
  const { customer, number, partValueCents = 0, ...facts } = input;
  demandMoney(member, input.partValueCents);
  return db.transaction(
    (tx) => {
      if (findJobByNumber(tx, shopId, number) !== undefined) {
        const words = `The shop has a job ${number} already. Give this one another number.`;
        throw fault("invalid", words, { number: words });
      }
      const customerId = ensureCustomer(tx, shopId, customer);
      insertWorkOrder(tx, { shopId, customerId, number, partValueCents, ...facts, openedAt: now });
      record(tx, member, "job.opened", number, now, { customer, part: input.partName });
      return { number };
    },
    { behavior: "immediate" },
  );
}

/**
 * Changes what prices rest on. Open cases of the job are priced again; closed ones keep what they were priced at.
 * @throws FaultError "not-found" for no job of this shop, "conflict" for a closed one or where nothing changes
 */
export function changeJob(db: Db, member: SignedIn, input: ChangeJob, now: number): { number: string } {
  const { jobId, partValueCents, metal, ...facts } = input;
  demandMoney(member, partValueCents);
  return db.transaction(
    (tx) => {
      const job = demandJob(tx, member.shopId, jobId);
      if (job.closedAt !== null) throw fault("conflict", `${job.number} is closed. Open it again to change it.`);
      const after = { ...facts, partValueCents: partValueCents ?? job.partValueCents };
      const figures = jobChanges(job, after, (cents) => formatMoney(cents, member.shop.currency));
      const changed = [...(metal ? metalChanges(job, metal) : []), ...figures];
      if (changed.length === 0) throw fault("conflict", "Nothing differs from what holds. Change a figure first.");
      updateWorkOrder(tx, member.shopId, jobId, { ...after, ...metal });
      priceOpenCases(tx, { shopId: member.shopId, now }, jobId);
      record(tx, member, "job.changed", job.number, now, { changed });
      return { number: job.number };
    },
    { behavior: "immediate" },
  );
}

/** Closes a job: no snap names it any more. Its cases stay as they are. */
export function closeJob(db: Db, member: SignedIn, jobId: number, now: number): { number: string } {
  return turn(db, member, jobId, now, { closedAt: now, action: "job.closed" });
}

/** Opens a closed job again. */
export function reopenJob(db: Db, member: SignedIn, jobId: number, now: number): { number: string } {
  return turn(db, member, jobId, now, { closedAt: null, action: "job.reopened" });
}

function turn(
  db: Db,
  member: SignedIn,
  jobId: number,
  now: number,
  to: { closedAt: number | null; action: AuditAction },
): { number: string } {
  return db.transaction(
    (tx) => {
      const job = demandJob(tx, member.shopId, jobId);
      const isClosed = job.closedAt !== null;
      if (isClosed === (to.closedAt !== null)) throw fault("conflict", SOMEBODY_ELSE);
      updateWorkOrder(tx, member.shopId, jobId, { closedAt: to.closedAt });
      record(tx, member, to.action, job.number, now, {});
      return { number: job.number };
    },
    { behavior: "immediate" },
  );
}

function demandJob(tx: Handle, shopId: number, jobId: number): JobRow {
  const job = getJob(tx, shopId, jobId);
  if (!job) throw fault("not-found", "This shop has no such job. Go back to the list.");
  return job;
}

function demandMoney(member: SignedIn, partValueCents: number | undefined): void {
  if (partValueCents !== undefined && !can(member, "money.case")) throw fault("refused", MAY_SEE_MONEY);
}

function record(
  tx: Handle,
  member: SignedIn,
  action: AuditAction,
  subject: string,
  now: number,
  detail: Record<string, unknown>,
): void {
  insertAudit(tx, { shopId: member.shopId, memberId: member.memberId, action, subject, detail, now });
}
