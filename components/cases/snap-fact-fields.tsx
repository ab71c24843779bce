"use client";

import Link from "next/link";
import { CheckField } from "@/components/ui/check-field";
import { Field, SelectField } from "@/components/ui/field";
import { PickGroup } from "@/components/ui/pick";
import {
  BASE_METALS,
  BASE_METAL_TITLES,
  LIMITS,
  METHODS,
  METHOD_TITLES,
  STAGES_FOUND,
  STAGE_TITLES,
} from "@/lib/cases/case-words";
import { factsOfJob, solutionsFor } from "@/lib/cases/same-as-last";
import { solutionAge } from "@/lib/line/solution-age";
import { routes } from "@/lib/routes";
import type { SnapFactsProps } from "./snap-facts";

type FieldsProps = Pick<SnapFactsProps, "choices" | "facts" | "now" | "onChange" | "faults">;

/** The facts as fields, for when the last job does not hold any more. */
export function SnapFactFields(props: FieldsProps) {
  const { choices, facts, onChange, faults } = props;
  const job = choices.jobs.find((each) => each.id === facts.workOrderId);
  const number = (value: string) => (value === "" ? null : Number(value));
  return (
    <div className="form">
      <SelectField
        label="Job"
        name="workOrderId"
        value={facts.workOrderId ?? ""}
        placeholder={job ? undefined : "Choose a job"}
        options={choices.jobs.map((each) => ({
          value: String(each.id),
          label: `${each.number} ${each.customer}, ${each.partName}`,
        }))}
        onChange={(event) => {
          const chosen = choices.jobs.find((each) => String(each.id) === event.target.value);
          // The stage is the person's to say; a job changes it as little as it changes the station.
          if (chosen)
            onChange({
              ...factsOfJob(choices, chosen),
              foundStationId: facts.foundStationId,
              stageFound: facts.stageFound,
            });
        }}
        error={faults.workOrderId}
      />
      <Link className="solo" href={routes.jobs({ from: "snap" })}>
        Job not in the list? Open it
      </Link>
      <div className="form__pair">
        <SelectField
          label="Base metal"
          name="baseMetal"
          value={facts.baseMetal}
          options={BASE_METALS.map((metal) => ({ value: metal, label: BASE_METAL_TITLES[metal] }))}
          onChange={(event) => {
            const metal = BASE_METALS.find((each) => each === event.target.value);
            if (metal) onChange({ baseMetal: metal, alloy: metal === job?.baseMetal ? (job.alloy ?? "") : "" });
          }}
          error={faults.baseMetal}
        />
        <Field
          label="Alloy"
          name="alloy"
          optional
          maxLength={LIMITS.nameChars}
          value={facts.alloy}
          onChange={(event) => onChange({ alloy: event.target.value })}
          error={faults.alloy}
        />
      </div>
      <Link className="solo" href={routes.partCheck(job && { job: job.number })}>
        Not sure? Weigh it
      </Link>
      <PickGroup
        legend="Method"
        name="method"
        kind="radio"
        layout="bar"
        value={facts.method}
        options={METHODS.map((method) => ({ value: method, label: METHOD_TITLES[method] }))}
        onChange={(event) => {
          const method = METHODS.find((each) => each === event.target.value);
          if (method) onChange({ method, solutionIds: solutionsFor(choices, method, facts.solutionIds) });
        }}
        error={faults.method}
      />
      <SelectField
        label="Run"
        name="runId"
        value={facts.runId ?? ""}
        placeholder="No run logged"
        options={choices.runs
          .filter((run) => run.workOrderId === facts.workOrderId)
          .map((run) => ({ value: String(run.id), label: `${run.code}, ${run.partsStruck} parts` }))}
        onChange={(event) => {
          const run = choices.runs.find((each) => String(each.id) === event.target.value);
          onChange(
            run
              ? { runId: run.id, method: run.method, solutionIds: solutionsFor(choices, run.method, run.solutionIds) }
              : { runId: null },
          );
        }}
        error={faults.runId}
      />
      <Solutions {...props} />
      <SelectField
        label="When it was found"
        name="stageFound"
        value={facts.stageFound}
        options={STAGES_FOUND.map((stage) => ({ value: stage, label: STAGE_TITLES[stage] }))}
        onChange={(event) => {
          const stage = STAGES_FOUND.find((each) => each === event.target.value);
          if (stage) onChange({ stageFound: stage });
        }}
        error={faults.stageFound}
      />
      <SelectField
        label="Where on the line"
        name="foundStationId"
        value={facts.foundStationId ?? ""}
        placeholder={facts.foundStationId === null ? "Choose a station" : undefined}
        options={choices.stations.map((station) => ({ value: String(station.id), label: station.name }))}
        onChange={(event) => onChange({ foundStationId: number(event.target.value) })}
        error={faults.foundStationId}
      />
    </div>
  );
}

/** The solutions that serve the method, each with its age. */
function Solutions({ choices, facts, now, onChange, faults }: FieldsProps) {
  const serving = choices.solutions.filter((each) => each.method === null || each.method === facts.method);
  if (serving.length === 0) return null;
  return (
    <fieldset className="picks-set">
      <legend>Solutions used</legend>
      {serving.map((each) => (
        <CheckField
          key={each.id}
          name="solutionIds[]"
          value={each.id}
          label={`${each.code} ${each.name}`}
          hint={solutionAge(each.madeUpAt, each.windowDays, now).words}
          checked={facts.solutionIds.includes(each.id)}
          onChange={(event) => {
            const others = facts.solutionIds.filter((id) => id !== each.id);
            onChange({ solutionIds: event.target.checked ? [...others, each.id] : others });
          }}
        />
      ))}
      {faults.solutionIds && <p className="field__error">{faults.solutionIds}</p>}
    </fieldset>
  );
}
