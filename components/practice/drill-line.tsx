import type { ReactNode } from "react";
import { Glyph } from "@/components/ui/glyph";
import { standingWords, type DrillStanding } from "@/lib/practice/drill";

export interface DrillLineProps {
  title: string;
  /** Empty: all classes. */
  classTitles: readonly string[];
  /** "by Thu 24 Dec"; null when no day is set. */
  dueWords: string | null;
  isLate: boolean;
  standing: DrillStanding;
  /** The button that begins it or goes on; none when it is done. */
  children?: ReactNode;
}

/** A drill that a senior set, as the person sees it who is to do it. */
export function DrillLine({ title, classTitles, dueWords, isLate, standing, children }: DrillLineProps) {
  return (
    <li className="row drill-line">
      <Glyph name={standing.isDone ? "ui-tick" : "station-inspect"} size={32} />
      <span>
        <strong>{title}</strong>
        <br />
        <span className="small mid">
          {standingWords(standing)}
          {dueWords && (
            <>
              {", "}
              <span className={isLate ? "warn" : undefined}>{dueWords}</span>
            </>
          )}
          <br />
          {classTitles.length > 0 ? classTitles.join(", ") : "All classes"}
        </span>
      </span>
      {children}
    </li>
  );
}
