import Link from "next/link";
import { stationGlyph } from "@/components/cases/class-glyph";
import { SourceMarks } from "@/components/library/source-marks";
import { Caution } from "@/components/ui/caution";
import { Glyph } from "@/components/ui/glyph";
import type { StationKind } from "@/lib/cases/case-words";
import { FixRecordView } from "@/components/library/fix-record";
import { workedWords } from "@/lib/library/evidence-words";
import type { FixRecord } from "@/lib/library/fix-record";
import { entryAnchor } from "@/lib/library/hit-href";
import type { CautionLevel, FixStep } from "@/lib/library/library-entry";
import type { CitedSource } from "@/lib/library/source-number";

export interface FixStepView extends Omit<FixStep, "cautionKeys"> {
  cautions: readonly { key: string; level: CautionLevel; text: string }[];
}

export interface FixView {
  slug: string;
  title: string;
  steps: readonly FixStepView[];
  whenNot: string;
  materials: readonly string[];
  sourceKeys: readonly string[];
  /** Titles of the causes on this page that it puts right. */
  causes: readonly string[];
  /** What became of it in this shop, against this class; left out where a page has no cases to speak of. */
  record?: FixRecord;
}

/** "12 min, and 6 min a part": the working time of all steps. */
export function fixMinutes(steps: readonly Pick<FixStep, "minutes" | "perPart">[]): string {
  const sum = (perPart: boolean) =>
    steps.reduce((minutes, step) => minutes + (step.perPart === perPart ? step.minutes : 0), 0);
  const [batch, part] = [sum(false), sum(true)];
  if (part === 0) return `${round(batch)} min`;
  return batch === 0 ? `${round(part)} min a part` : `${round(batch)} min, and ${round(part)} min a part`;
}

const round = (minutes: number) => Math.round(minutes * 10) / 10;

function placeWords(station: StationKind | null): string {
  return station === null ? "At the bench" : `${station.charAt(0).toUpperCase()}${station.slice(1)}`;
}

/** One step: its cautions come before what to do. */
function FixStepLine({ step }: { step: FixStepView }) {
  return (
    <li className="fix-step">
      <Glyph name={step.station ? stationGlyph(step.station) : "ui-part"} />
      <div>
        <h4>
          {step.title}
          <span className="fig">
            {round(step.minutes)} min{step.perPart ? " a part" : ""}
          </span>
        </h4>
        {step.cautions.map((caution) => (
          <Caution key={caution.key} level={caution.level}>
            {caution.text}
          </Caution>
        ))}
        <p>{step.detail}</p>
        <p className="quiet small">{placeWords(step.station)}</p>
      </div>
    </li>
  );
}

interface FixCardProps {
  fix: FixView;
  sources: readonly CitedSource[];
  open: boolean;
  /** For those who may edit it. */
  editHref?: string;
}

/**
 * A fix, folded to its title and time. What it holds carries the anchor, because a browser opens a fold when a link leads
 * into it, not to it.
 */
export function FixCard({ fix, sources, open, editHref }: FixCardProps) {
  return (
    <details className="fix" open={open}>
      <summary>
        <Glyph name="ui-next" />
        <h3>{fix.title}</h3>
        <span className="fig">{fixMinutes(fix.steps)}</span>
        {fix.record && fix.record.tries.length > 0 && <span className="fix__worked">{workedWords(fix.record)}</span>}
      </summary>
      <div className="fix__body" id={entryAnchor("fix", fix.slug)}>
        <p className="small mid">For: {fix.causes.join(", ")}</p>
        {fix.record && <FixRecordView record={fix.record} />}
        <ol>
          {fix.steps.map((step, index) => (
            <FixStepLine key={index} step={step} />
          ))}
        </ol>
        <p>
          <strong>When not to:</strong> {fix.whenNot}
        </p>
        {fix.materials.length > 0 && (
          <p>
            <strong>Have ready:</strong> {fix.materials.join(", ")}
          </p>
        )}
        <SourceMarks keys={fix.sourceKeys} sources={sources} />
        {editHref && (
          <Link className="solo no-print" href={editHref} aria-label={`Edit the fix “${fix.title}”`}>
            Edit
          </Link>
        )}
      </div>
    </details>
  );
}
