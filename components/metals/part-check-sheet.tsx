"use client";

import { useActionState, useRef, useState } from "react";
import { CheckAnswer, type KeptCheckAnswer } from "@/components/metals/check-answer";
import { CheckFor } from "@/components/metals/check-for";
import { CHECK_FORM, CheckMain, KEEP_FORM, MainButton, type NextStep } from "@/components/metals/check-main";
import { CheckResult } from "@/components/metals/check-result";
import { OpenRoute, type OpenRouteProps } from "@/components/metals/check-route-lazy";
import {
  usePartCheck,
  type CheckStart,
  type JobToCheck,
  type PartCheckState,
} from "@/components/metals/use-part-check";
import { LookFields, WeighFields } from "@/components/metals/weigh-fields";
import { Button } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import type { ActState } from "@/lib/act-state";
import type { BaseMetal } from "@/lib/cases/case-words";
import { verdictWords } from "@/lib/metals/check-words";
import { COLOUR_TITLES, PULL_TITLES } from "@/lib/metals/material-words";
import { METALS_KNOWN } from "@/lib/metals/part-reading";
import { CHECK_FIELDS, tempUnit, type ShopUnits } from "@/lib/metals/typed-check";
import { routes } from "@/lib/routes";

export interface PartCheckSheetProps {
  start: CheckStart;
  units: ShopUnits;
  /** The shop's open jobs, newest first, and the one that the address names. */
  jobs: readonly JobToCheck[];
  /** First names of those who decide. */
  seniors: readonly string[];
  /** The route of what the address's weights fit. */
  givenRoute: OpenRouteProps["given"];
  back: string | null;
  keep: (previous: ActState<KeptCheckAnswer>, form: FormData) => Promise<ActState<KeptCheckAnswer>>;
}

/** What is this part made of? Weighed twice, seen, and drawn against the metals; kept on a job if somebody says so. */
export function PartCheckSheet({ start, units, jobs, seniors, givenRoute, back, keep }: PartCheckSheetProps) {
  const check = usePartCheck(start, jobs, units);
  const [state, send, isSending] = useActionState(keep, null);
  const answer = check.isChanged ? null : state;
  const form = useRef<HTMLFormElement>(null);
  const { typed, job, reading, declared } = check;
  const withDeclared = job && declared ? { metal: job, fit: declared } : null;
  const step = nextStep(check, answer, isSending, () => focusOn(form.current, "[name=job]"));
  const refused = answer && !answer.ok ? answer.fault.fields : undefined;
  const fields = { typed, units, faults: { ...check.faults, ...refused }, onType: check.type, onLeave: check.leave };
  return (
    <>
      <header className="lead-block">
        <h1 className="lead" aria-live="polite">
          {reading ? verdictWords(reading.candidates, withDeclared) : "What is this part made of?"}
        </h1>
        {job && <JobLine job={job} caseRef={check.caseRef} />}
      </header>
      <div className="check-verdict">
        <CheckAnswer
          state={answer}
          declared={withDeclared}
          isKindRight={reading?.candidates.some((each) => each.baseMetal === job?.baseMetal) ?? false}
          seniors={seniors}
        />
        <div className="check-verdict__do no-print">
          <MainButton step={step} className="desk-only" />
        </div>
      </div>
      <div className="weighing">
        <form
          ref={form}
          id={CHECK_FORM}
          className="weighing__form no-print"
          method="get"
          action={routes.partCheck()}
          noValidate
          onSubmit={(event) => {
            event.preventDefault();
            check.ask();
            requestAnimationFrame(() => focusOn(form.current, "[aria-invalid]"));
          }}
        >
          <CheckFor jobs={jobs} job={job} caseRef={check.caseRef} onChoose={check.chooseJob} />
          <WeighFields {...fields} />
          <LookFields {...fields} />
          <noscript>
            <button type="submit" className="btn btn--plain btn--wide">
              Work it out
            </button>
          </noscript>
        </form>
        <Section
          title="3. What fits"
          aside={reading ? `${reading.candidates.length} of ${METALS_KNOWN} metals` : undefined}
          className="weighing__result"
        >
          <Weights check={check} units={units} />
          {reading && check.read.kind === "ready" ? (
            <>
              <CheckResult
                reading={reading}
                declared={declared?.known ? declared : null}
                tempTyped={`${typed.temp.trim()} ${tempUnit(units)}`}
                balanceErrorG={check.read.input.balanceErrorG}
              />
              <div className="check-print no-print">
                <Button glyph="ui-print" onClick={() => window.print()}>
                  Print this check
                </Button>
              </div>
            </>
          ) : (
            <NotYet isRefused={check.read.kind === "refused"} />
          )}
        </Section>
      </div>
      {reading && <RouteOfBest check={check} given={givenRoute} />}
      <form id={KEEP_FORM} action={send} onSubmit={check.sent} hidden>
        {CHECK_FIELDS.map((field) => (
          <input key={field} type="hidden" name={field} value={typed[field]} />
        ))}
        <input type="hidden" name="jobId" value={job?.id ?? ""} />
        <input type="hidden" name="case" value={check.caseRef ?? ""} />
      </form>
      <CheckMain step={step} back={back} />
    </>
  );
}

function nextStep(
  check: PartCheckState,
  answer: ActState<KeptCheckAnswer>,
  isBusy: boolean,
  toJobs: () => void,
): NextStep {
  if (!check.reading) return { kind: "ask" };
  if (answer?.ok) return answer.value.fits ? { kind: "weigh-another", onPress: check.weighAnother } : { kind: "hold" };
  if (!check.job) return { kind: "choose-job", onPress: toJobs };
  return { kind: "keep", label: check.caseRef ? "Keep this on the case" : "Keep this on the job", isBusy };
}

function focusOn(form: HTMLFormElement | null, selector: string): void {
  form?.querySelector<HTMLElement>(selector)?.focus();
}

function JobLine({ job, caseRef }: { job: JobToCheck; caseRef: string | null }) {
  return (
    <p className="lead-block__below">
      Job <span className="ref">{job.number}</span> {job.customer}, {job.quantity} {job.partName}
      {caseRef && (
        <>
          , case <span className="ref">{caseRef}</span>
        </>
      )}
      .{job.last && ` Last weighed: ${job.last}`}
    </p>
  );
}

/** The weights in words, for the paper: the fields are not printed. */
function Weights({ check, units }: { check: PartCheckState; units: ShopUnits }) {
  const { air, water, temp, error, pull, colour } = check.typed;
  if (!check.reading) return null;
  return (
    <p className="only-print">
      {air} g in air, {water} g in water of {temp} {tempUnit(units)}, balance ± {error} g. Magnet:{" "}
      {titleOf(PULL_TITLES, pull, "not tried")}. Colour: {titleOf(COLOUR_TITLES, colour, "not seen")}.
    </p>
  );
}

const titleOf = (titles: Record<string, string>, word: string, none: string) => (titles[word] ?? none).toLowerCase();

function NotYet({ isRefused }: { isRefused: boolean }) {
  return isRefused ? (
    <Note tone="amber" title="These numbers give no answer yet">
      One of the fields holds something that cannot be. What stands beside it says what to do.
    </Note>
  ) : (
    <Note glyph="ui-part" title="Both weights, and this fills in">
      The balance tells the weight, the water the volume; the two give the density, and few metals share one.
    </Note>
  );
}

/** The route for the job's metal where that fits, else for the likeliest; the person may look at the others. */
function RouteOfBest({ check, given }: { check: PartCheckState; given: OpenRouteProps["given"] }) {
  const [wanted, setWanted] = useState<BaseMetal | null>(null);
  const metals = [...new Set(check.reading?.candidates.map((each) => each.baseMetal))];
  const likely = metals.find((metal) => metal === check.job?.baseMetal) ?? metals[0];
  const chosen = metals.find((metal) => metal === wanted) ?? likely;
  if (chosen === undefined) return null;
  return <OpenRoute metals={metals} chosen={chosen} onChoose={setWanted} given={given} />;
}
