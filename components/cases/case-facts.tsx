import { Slip, type SlipRow } from "@/components/ui/slip";
import {
  METHOD_TITLES,
  STAGE_TITLES,
  SYMPTOMS,
  type BaseMetal,
  type Method,
  type StageFound,
  type Symptom,
} from "@/lib/cases/case-words";
import { metalWords, partsOf } from "@/lib/cases/part-words";
import { solutionAge } from "@/lib/line/solution-age";

export interface FactsOfCase {
  openedAt: number;
  openedBy: string;
  baseMetal: BaseMetal;
  alloy: string | null;
  method: Method;
  stageFound: StageFound;
  quantity: number;
  symptoms: readonly Symptom[];
  note: string;
  job: {
    number: string;
    partName: string;
    customer: string;
    finalStack: readonly { metal: string; thicknessUm: number }[];
  };
  run: { code: string; partsStruck: number } | null;
  found: { name: string };
}

export interface FactSolution {
  code: string;
  name: string;
  windowDays: number;
  madeUpAt: number;
}

/** "Ni 5 µm, Au 0.8 µm": what was to come on the strike. */
export function stackWords(stack: FactsOfCase["job"]["finalStack"]): string {
  return stack.length === 0 ? "None" : stack.map((layer) => `${layer.metal} ${layer.thicknessUm} µm`).join(", ");
}

/** A solution with the age that it had when the part was found. */
function solutionRow(solution: FactSolution, at: number): SlipRow {
  const age = solutionAge(solution.madeUpAt, solution.windowDays, at);
  return {
    label: solution.name,
    value: `${solution.code}, ${age.words}`,
    tone: age.share > 1 ? "warn" : undefined,
  };
}

/** Rows about the part and its job. */
export function partRows(facts: FactsOfCase): SlipRow[] {
  const { job, run } = facts;
  return [
    { label: "Job", value: `${job.number} ${job.customer}` },
    { label: "Parts", value: `${partsOf(facts.quantity, run?.partsStruck ?? null)} ${job.partName}` },
    { label: "Base metal", value: metalWords(facts.baseMetal, facts.alloy) },
    { label: "Plate", value: stackWords(job.finalStack) },
  ];
}

/** Rows about the process: method, place, run and the solutions as old as they were then. */
export function processRows(facts: FactsOfCase, solutions: readonly FactSolution[]): SlipRow[] {
  return [
    { label: "Found", value: STAGE_TITLES[facts.stageFound] },
    { label: "Station", value: `${facts.found.name}, ${METHOD_TITLES[facts.method].toLowerCase()}` },
    { label: "Run", value: facts.run?.code ?? "Not logged" },
    ...solutions.map((solution) => solutionRow(solution, facts.openedAt)),
  ];
}

/** What is known of a part, in two slips and the plater's own words. */
export function CaseFactSlips({ facts, solutions }: { facts: FactsOfCase; solutions: readonly FactSolution[] }) {
  return (
    <>
      <div className="fact-slips">
        <Slip rows={partRows(facts)} />
        <Slip rows={processRows(facts, solutions)} />
      </div>
      <p className="fact-words">
        <b>Ticked: </b>
        {facts.symptoms.length === 0
          ? "no symptom"
          : facts.symptoms.map((each) => SYMPTOMS[each].words.toLowerCase()).join("; ")}
      </p>
      {facts.note !== "" && (
        <p className="fact-words">
          <b>{facts.openedBy} wrote: </b>
          {facts.note}
        </p>
      )}
    </>
  );
}
