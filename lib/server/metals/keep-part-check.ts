import type { Db, Handle } from "@/db/open";
import { requireCaseFacts } from "@/db/queries/case-page";
import type { SignedIn } from "@/db/queries/crew";
import { insertPartCheck } from "@/db/queries/part-checks";
import { getJob } from "@/db/queries/work-orders";
import { fault } from "@/lib/fault";
import { declaredFit } from "@/lib/metals/declared";
import type { KeepCheck } from "@/lib/metals/keep-check.schema";
import { checkPart } from "@/lib/metals/part-check";
import { readTypedCheck, type CheckInput } from "@/lib/metals/typed-check";

/** What was kept, and where. */
export interface KeptOn {
  job: string;
  caseRef: string | null;
  /** Whether the job's metal fits what was weighed. */
  fits: boolean;
}

/**
 * Keeps a weighing on a job, and on a case of it. Everything is worked out again from what was typed; a part weighed
 * again is a further row.
 * @throws FaultError "invalid" beside the field, or for a case of another job; "not-found" for no job or case of this shop
 */
export function keepPartCheck(db: Db, member: SignedIn, input: KeepCheck, now: number): KeptOn {
  const { shopId, memberId } = member;
  const weights = requireWeights(input, member);
  const { measured, candidates } = checkPart(weights);
  return db.transaction(
    (tx) => {
      const job = getJob(tx, shopId, input.jobId);
      if (!job) throw fault("not-found", "That job is not in this shop's list. Choose another.");
      const caseId = input.case === undefined ? null : requireCaseOfJob(tx, shopId, input.case, job);
      const { fits } = declaredFit(measured, job.baseMetal, job.alloy);
      insertPartCheck(tx, {
        shopId,
        memberId,
        workOrderId: job.id,
        caseId,
        weightAirG: weights.weightAirG,
        weightWaterG: weights.weightWaterG,
        waterTempC: weights.waterTempC,
        balanceErrorG: weights.balanceErrorG,
        pull: weights.pull ?? null,
        colour: weights.colour ?? null,
        densityGPerCm3: measured.densityGPerCm3,
        uncertaintyGPerCm3: measured.uncertaintyGPerCm3,
        declaredBaseMetal: job.baseMetal,
        declaredAlloy: job.alloy,
        fits,
        likelyBaseMetal: candidates[0]?.baseMetal ?? null,
        at: now,
      });
      return { job: job.number, caseRef: input.case ?? null, fits };
    },
    { behavior: "immediate" },
  );
}

function requireWeights(input: KeepCheck, member: SignedIn): CheckInput {
  const read = readTypedCheck(input, member.shop.units);
  if (read.kind === "ready") return read.input;
  const [words = "Type both weights first."] = Object.values(read.faults);
  throw fault("invalid", words, read.faults);
}

function requireCaseOfJob(tx: Handle, shopId: number, ref: string, job: { id: number; number: string }): number {
  const facts = requireCaseFacts(tx, shopId, ref);
  if (facts.job.id === job.id) return facts.id;
  const words = `${ref} is a case of job ${facts.job.number}, not of ${job.number}. Keep it on the job alone, or choose the case's own.`;
  throw fault("invalid", words, { case: words });
}
