import { Children } from "react";
import type { ReactNode } from "react";

export interface TagWireProps {
  /** column: on an upright wire. rail: the queue, side by side on a level wire. rack: upright tags in rows (casebook). */
  layout?: "column" | "rail" | "rack";
  /** Names the list for readers. */
  label: string;
  /** "4 of 31", where not all are shown. */
  words?: string;
  /** Tags, one a child. */
  children: ReactNode;
}

/** Tags threaded on copper wire. */
export function TagWire({ layout = "column", label, words, children }: TagWireProps) {
  // A rail scrolls sideways, and what scrolls must be reachable by keyboard: its links are, so no tab stop of its own.
  return (
    <div className={`hung hung--${layout}`}>
      <ol className={layout === "column" ? "wire" : layout} aria-label={label}>
        {Children.toArray(children).map((tag, index) => (
          <li key={index}>{tag}</li>
        ))}
      </ol>
      {words && <p className="hung__words">{words}</p>}
    </div>
  );
}
