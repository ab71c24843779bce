import { FitChart, type FitRow } from "@/components/metals/fit-chart";
import { Note } from "@/components/ui/note";
import { Rests } from "@/components/ui/rests";
import { errorWords, openWords, rangeWords, restsWords, shortName } from "@/lib/metals/check-words";
import type { DeclaredFit } from "@/lib/metals/declared";
import { declaredSource } from "@/lib/metals/declared-source";
import type { Material } from "@/lib/metals/material";
import type { PartReading } from "@/lib/metals/part-reading";

export interface CheckResultProps {
  reading: PartReading;
  /** What the job says; null without a job, or where it names no metal that is in the table. */
  declared: DeclaredFit | null;
  /** "22.0 °C", as the shop reads it. */
  tempTyped: string;
  balanceErrorG: number;
}

/** As many as are drawn: more fill a phone without telling more. */
const MOST_FITTING = 8;
const MOST_RULED_OUT = 4;

/** What fits: the density, the metals against it, and what may have misled. */
export function CheckResult({ reading, declared, tempTyped, balanceErrorG }: CheckResultProps) {
  const { measured, candidates, ruledOut, warnings } = reading;
  const fitting = candidates.slice(0, MOST_FITTING);
  const against = ruledOut.filter((each) => !isDeclared(each, declared)).slice(0, MOST_RULED_OUT);
  const more = candidates.length - fitting.length;
  const ofDeclared = declared && declaredSource(declared);
  const sourced = [...fitting, ...against, ...(declared && ofDeclared ? [{ ...declared, ...ofDeclared }] : [])];
  const rows: FitRow[] = [
    ...fitting.map((each) => ({ ...each, name: shortName(each), fits: true, why: "fits" })),
    ...against.map((each) => ({ ...each, name: shortName(each), fits: false, why: each.reason })),
    ...(declared ? [declaredRow(declared, measured.densityGPerCm3)] : []),
  ];
  return (
    <div className="check-result">
      <p className="density">
        {measured.densityGPerCm3.toFixed(2)} <small>± {errorWords(measured.uncertaintyGPerCm3)} g/cm³, 95%</small>
      </p>
      <p className="density-words">{openWords(candidates)}</p>
      <FitChart {...measured} rows={rows} />
      {more > 0 && (
        <p className="small">
          {more} more fit as well: {candidates.slice(MOST_FITTING).map(shortName).join(", ")}.
        </p>
      )}
      <Rests>{restsWords(measured, sourced, { tempTyped, balanceErrorG })}</Rests>
      <RangeSources metals={sourced} />
      <Note tone="amber" title={candidates.length === 0 ? "What may have misled" : "Before you call it"}>
        <ul className="check-warnings">
          {warnings.map((words) => (
            <li key={words}>{words}</li>
          ))}
        </ul>
      </Note>
    </div>
  );
}

type SourcedRange = Pick<Material, "name" | "source" | "lowGPerCm3" | "highGPerCm3">;

/** Where each range comes from, for whoever doubts one. */
function RangeSources({ metals }: { metals: readonly SourcedRange[] }) {
  if (metals.length === 0) return null;
  return (
    <details className="check-sources no-print">
      <summary>Where the ranges come from</summary>
      <ul>
        {metals.map((each) => (
          <li key={each.name}>
            {each.name}, {rangeWords(each)} g/cm³<span>{each.source}</span>
          </li>
        ))}
      </ul>
    </details>
  );
}

function declaredRow(declared: DeclaredFit, densityGPerCm3: number): FitRow {
  const { name, lowGPerCm3, highGPerCm3, fits } = declared;
  const gap = Math.max(lowGPerCm3 - densityGPerCm3, densityGPerCm3 - highGPerCm3);
  const way = lowGPerCm3 > densityGPerCm3 ? "heavy" : "light";
  return {
    name,
    lowGPerCm3,
    highGPerCm3,
    fits,
    isDeclared: true,
    why: fits ? "fits" : `too ${way} by ${gap.toFixed(2)}`,
  };
}

/** The declared metal has a line of its own. */
const isDeclared = (range: { lowGPerCm3: number; highGPerCm3: number }, declared: DeclaredFit | null) =>
  declared !== null && range.lowGPerCm3 === declared.lowGPerCm3 && range.highGPerCm3 === declared.highGPerCm3;
