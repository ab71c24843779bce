import Link from "next/link";
import type { ReactNode } from "react";

export interface NarrowedBarProps {
  /** Name of the pressed station. */
  station: string;
  /** What is left on the screen: "4 of 6 waiting cases". */
  words?: string;
  /** The screen with the whole line. */
  clearHref: string;
  /** Right end: how the list is ordered. Not on a phone. */
  aside?: ReactNode;
}

/** Says that a station narrows the screen, and undoes it. */
export function NarrowedBar({ station, words, clearHref, aside }: NarrowedBarProps) {
  return (
    <section className="narrowed" aria-label="Narrowed">
      <div className="narrowed__in">
        <p role="status">
          Narrowed to <strong>{station}</strong>
          {words ? `: ${words}.` : "."}
        </p>
        <Link href={clearHref} scroll={false}>
          Show the whole line
        </Link>
        {aside && <span className="narrowed__aside">{aside}</span>}
      </div>
    </section>
  );
}
