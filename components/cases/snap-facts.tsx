"use client";

import Link from "next/link";
import type { ChangeEvent } from "react";
import { Slip, type SlipRow } from "@/components/ui/slip";
import { Button } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import { METHOD_TITLES, STAGE_TITLES } from "@/lib/cases/case-words";
import { metalWords } from "@/lib/cases/part-words";
import type { SnapChoices } from "@/lib/cases/same-as-last";
import type { SnapFacts as Facts } from "@/lib/cases/snap-draft";
import { routes } from "@/lib/routes";
import { solutionAge } from "@/lib/line/solution-age";
import { SnapFactFields } from "./snap-fact-fields";

export interface SnapFactsProps {
  choices: SnapChoices;
  facts: Facts;
  /** The facts are the person's own last ones. */
  isLast: boolean;
  /** UTC milliseconds, for the age of the solutions. */
  now: number;
  open: boolean;
  onOpen: (open: boolean) => void;
  onChange: (facts: Partial<Facts>) => void;
  faults: Record<string, string>;
}

export type FieldChange = ChangeEvent<HTMLInputElement | HTMLSelectElement>;

/** What stays the same from part to part, as a slip; "Change" turns it into fields. */
export function SnapFacts(props: SnapFactsProps) {
  const { choices, facts, isLast, now, open, onOpen } = props;
  if (choices.jobs.length === 0) {
    return (
      <Section title="The part" className="snap-block">
        <Note tone="amber" title="Open the first job">
          No job is open, and a hold tag needs one. Your photos stay here.
          <Link className="solo" href={routes.jobs({ from: "snap" })}>
            Open a job
          </Link>
        </Note>
      </Section>
    );
  }
  const misfit = misfitOf(choices, facts);
  return (
    <Section
      title={isLast ? "Same as last time" : "The part"}
      className="snap-block"
      aside={
        <Button variant="quiet" aria-expanded={open} onClick={() => onOpen(!open)}>
          {open ? "Done" : "Change"}
        </Button>
      }
    >
      {misfit && (
        <Note tone="rust" title="The metal does not fit the job" className="snap-misfit">
          {misfit} Hold the part; set its base metal if you know it.
        </Note>
      )}
      {open ? <SnapFactFields {...props} /> : <Slip rows={slipRows(choices, facts, now)} />}
    </Section>
  );
}

/** What was weighed against the job's metal, while the part is said to be of that metal. */
function misfitOf(choices: SnapChoices, facts: Facts): string | undefined {
  const job = choices.jobs.find((each) => each.id === facts.workOrderId);
  return job?.baseMetal === facts.baseMetal ? job.misfit : undefined;
}

/** The facts in words, in the order of the mock: job, metal, run, solutions, where found. */
export function slipRows(choices: SnapChoices, facts: Facts, now: number): SlipRow[] {
  const job = choices.jobs.find((each) => each.id === facts.workOrderId);
  const run = choices.runs.find((each) => each.id === facts.runId);
  const station = choices.stations.find((each) => each.id === facts.foundStationId);
  const solutions = choices.solutions.filter((each) => facts.solutionIds.includes(each.id));
  return [
    { label: "Job", value: job ? `${job.number} ${job.customer}` : "Choose one" },
    { label: "Part", value: job?.partName ?? "–" },
    { label: "Base metal", value: metalWords(facts.baseMetal, facts.alloy) },
    {
      label: "Run",
      value: run ? `${run.code}, ${METHOD_TITLES[run.method].toLowerCase()}` : METHOD_TITLES[facts.method],
    },
    ...solutions.map((each): SlipRow => {
      const age = solutionAge(each.madeUpAt, each.windowDays, now);
      const name = choices.stations.find((place) => place.id === each.stationId)?.name ?? each.name;
      return { label: name, value: `${each.code}, ${age.words}`, tone: age.daysOver > 0 ? "warn" : undefined };
    }),
    { label: "Found", value: `${STAGE_TITLES[facts.stageFound]}${station ? `, ${station.name}` : ""}` },
  ];
}
