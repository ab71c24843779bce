"use client";

import Link from "next/link";
import type { JobToCheck } from "@/components/metals/use-part-check";
import { SelectField } from "@/components/ui/field";
import { metalInSentence } from "@/lib/cases/metal-words";
import { routes } from "@/lib/routes";

export interface CheckForProps {
  jobs: readonly JobToCheck[];
  job: JobToCheck | null;
  caseRef: string | null;
  onChoose: (jobNumber: string) => void;
}

/** For which job the part is weighed: what its card says is what the weight is held against. */
export function CheckFor({ jobs, job, caseRef, onChoose }: CheckForProps) {
  return (
    <div className="check-for">
      <SelectField
        label="Whose part is it"
        name="job"
        value={job?.number ?? ""}
        placeholder="No job, only to know"
        options={jobs.map((each) => ({
          value: each.number,
          label: `${each.number} ${each.customer}, ${each.partName}, ${metalInSentence(each.baseMetal, each.alloy)}`,
        }))}
        onChange={(event) => onChoose(event.target.value)}
      />
      {caseRef && (
        <>
          <input type="hidden" name="case" value={caseRef} />
          <Link className="solo" href={routes.case(caseRef)}>
            Back to {caseRef}
          </Link>
        </>
      )}
    </div>
  );
}
