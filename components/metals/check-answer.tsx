import Link from "next/link";
import { Note } from "@/components/ui/note";
import type { ActState } from "@/lib/act-state";
import { metalInSentence } from "@/lib/cases/metal-words";
import type { Declared } from "@/lib/metals/check-words";
import type { DeclaredFit } from "@/lib/metals/declared";
import { routes } from "@/lib/routes";

/** Where a check was kept. */
export interface KeptCheckAnswer {
  job: string;
  caseRef: string | null;
  fits: boolean;
}

export interface CheckAnswerProps {
  /** The server's answer to these weights; null while they have not been sent. */
  state: ActState<KeptCheckAnswer>;
  declared: { metal: Declared; fit: DeclaredFit } | null;
  /** The declared base metal is among what fits, only its alloy is not. */
  isKindRight: boolean;
  /** First names of those who decide. */
  seniors: readonly string[];
}

/** What the weighing means for the job: a warning before it is kept, and where it stands once it is. */
export function CheckAnswer({ state, declared, isKindRight, seniors }: CheckAnswerProps) {
  if (state?.ok) return <KeptNote kept={state.value} seniors={seniors} />;
  return (
    <>
      {state && (
        <Note tone="rust" title="Not kept" role="alert">
          {state.fault.message}
        </Note>
      )}
      {declared && !declared.fit.fits && (
        <Note tone="rust" title={doNotWords(declared.metal, isKindRight)}>
          {declared.fit.words} Keep it on the job, so that the job carries the warning, and ask {askWords(seniors)}. A
          hollow part or a bubble reads low too.
        </Note>
      )}
    </>
  );
}

function doNotWords({ baseMetal, alloy }: Declared, isKindRight: boolean): string {
  if (isKindRight) return `It is not ${metalInSentence(baseMetal, alloy)}`;
  return `Do not run it as ${metalInSentence(baseMetal, null)}`;
}

function KeptNote({ kept, seniors }: { kept: KeptCheckAnswer; seniors: readonly string[] }) {
  const where = kept.caseRef === null ? kept.job : `${kept.job} and ${kept.caseRef}`;
  if (kept.fits) {
    return (
      <Note tone="green" title={`Kept on ${where}`} role="status">
        It fits what the job says. A warning that the job carried is gone.
      </Note>
    );
  }
  return (
    <Note tone="rust" title={`${kept.job} carries the warning now`} role="status">
      Kept on {where}. It shows with the job, at the snap and on each of its cases, until a part that fits is weighed or
      the job&rsquo;s metal is put right. Hold the parts and ask {askWords(seniors)}.{" "}
      <Link className="misfit__way" href={kept.caseRef === null ? routes.jobs() : routes.case(kept.caseRef)}>
        {kept.caseRef === null ? "See the jobs" : `See ${kept.caseRef}`}
      </Link>
    </Note>
  );
}

/** "Ines or Ruth"; "a senior tech" where there is none or a crowd. */
function askWords(seniors: readonly string[]): string {
  return seniors.length === 0 || seniors.length > 3 ? "a senior tech" : seniors.join(" or ");
}
