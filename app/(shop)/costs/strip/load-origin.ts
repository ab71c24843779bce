import type { StripOrigin } from "@/components/costs/strip-estimator";
import type { Db } from "@/db/open";
import { getCostFacts } from "@/db/queries/case-costs";
import { getCaseFacts } from "@/db/queries/case-page";
import type { SignedIn } from "@/db/queries/crew";
import { findJobByNumber, getJob, type JobRow } from "@/db/queries/work-orders";
import { CASE_REF_PATTERN } from "@/lib/cases/case-ref";
import { strikeThenPlate } from "@/lib/costs/case-stack";
import { EMPTY_STRIP, type StripTyped } from "@/lib/costs/strip-address";
import { decimalText } from "@/lib/decimal";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";

/** Where the fields come from, and the moment whose rates and ways hold for them; or why nothing was found. */
export interface LoadedOrigin {
  origin: StripOrigin | null;
  fault?: string;
  /** UTC milliseconds: the case's day, else now. */
  at: number;
}

interface Asked {
  case?: string;
  job?: string;
}

/** Fills the estimator in from the case or the job that the address names. A name that nothing answers to is no error page. */
export function loadOrigin(db: Db, member: SignedIn, asked: Asked, now: number): LoadedOrigin {
  if (asked.case) return fromCase(db, member, asked.case, now);
  if (asked.job) return fromJob(db, member, asked.job, now);
  return { origin: null, at: now };
}

function fromCase(db: Db, member: SignedIn, ref: string, now: number): LoadedOrigin {
  const facts = CASE_REF_PATTERN.test(ref) ? getCaseFacts(db, member.shopId, ref) : null;
  const job = facts && getJob(db, member.shopId, facts.job.id);
  if (!facts || !job) return { origin: null, fault: `There is no case “${ref}” in this shop.`, at: now };
  const method = getCostFacts(db, member.shopId, facts.id)?.method ?? "";
  const { baseMetal: base, alloy, stageFound: found } = facts;
  const own = {
    ...jobFields(job),
    parts: String(facts.quantity),
    base,
    alloy: alloy ?? "",
    found,
    way: method,
  };
  const origin: StripOrigin = {
    kind: "case",
    key: facts.ref,
    href: routes.case(facts.ref),
    words: `${facts.ref}, ${job.customer}`,
    ...jobWords(job),
    own,
    // As the case is priced: while it hangs, what it was called counts.
    classSlug: (facts.state === "held" ? facts.calledClass : null) ?? facts.confirmedClass,
    canChoose: facts.state !== "closed" && can(member, "case.confirm"),
  };
  return { origin, at: facts.openedAt };
}

function fromJob(db: Db, member: SignedIn, number: string, now: number): LoadedOrigin {
  const id = findJobByNumber(db, member.shopId, number);
  const job = id === undefined ? undefined : getJob(db, member.shopId, id);
  if (!job) return { origin: null, fault: `There is no job “${number}” in this shop.`, at: now };
  const origin: StripOrigin = {
    kind: "job",
    key: job.number,
    href: routes.jobs(),
    words: `${job.number}, ${job.customer}`,
    ...jobWords(job),
    own: jobFields(job),
    classSlug: null,
    canChoose: false,
  };
  return { origin, at: now };
}

const jobWords = ({ customer, partName, number }: JobRow) => ({ customer, partName, jobNumber: number });

function jobFields(job: JobRow): StripTyped {
  return {
    ...EMPTY_STRIP,
    parts: String(job.quantity),
    area: decimalText(job.areaDm2),
    // 0: nobody has filled it in.
    value: job.partValueCents > 0 ? decimalText(job.partValueCents / 100) : "",
    base: job.baseMetal,
    alloy: job.alloy ?? "",
    layers: strikeThenPlate(job.finalStack).map((layer) => ({
      metal: layer.metal,
      thickness: decimalText(layer.thicknessLowUm ?? layer.thicknessUm),
      to: layer.thicknessHighUm === undefined ? "" : decimalText(layer.thicknessHighUm),
    })),
  };
}
