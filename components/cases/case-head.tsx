import type { CSSProperties } from "react";
import { classGlyph } from "@/components/cases/class-glyph";
import { StateMark } from "@/components/cases/state-mark";
import type { TagState } from "@/components/cases/tag-state";
import { Glyph } from "@/components/ui/glyph";
import { Slip, type SlipRow } from "@/components/ui/slip";

interface CaseHeadProps {
  caseRef: string;
  state: TagState;
  stateWords: string;
  classSlug: string | null;
  classWords: string;
  rows: readonly SlipRow[];
  /** In rework: share of the steps ticked. */
  progress: number;
}

/** A case's page begins with its tag: lying on a wide screen, hung upright on a narrow one. */
export function CaseHead({ caseRef, state, stateWords, classSlug, classWords, rows, progress }: CaseHeadProps) {
  return (
    <article className={`tag case-head tag--${state}`} style={{ "--done": progress } as CSSProperties}>
      <div className="tag__paper">
        <div className="case-head__id">
          <h1 className="ref">{caseRef}</h1>
          <StateMark state={state} words={stateWords} />
        </div>
        <p className="case-head__class">
          <Glyph name={classGlyph(classSlug)} />
          {classWords}
        </p>
        <Slip rows={rows} />
        <span className="tag__tail" aria-hidden="true" />
      </div>
    </article>
  );
}
