import { useId } from "react";
import type { ReactNode } from "react";
import { Rests } from "@/components/ui/rests";

export interface SectionProps {
  title: ReactNode;
  /** Right end of the head: a count, a link. */
  aside?: ReactNode;
  /** Heading level; h2 unless the section sits inside another. */
  level?: 2 | 3;
  /** What the figures in it rest on. */
  rests?: ReactNode;
  id?: string;
  className?: string;
  children: ReactNode;
}

/** A 2 px rule, a heading, then the matter straight on the paper. */
export function Section({ title, aside, level = 2, rests, id, className, children }: SectionProps) {
  const headId = useId();
  const Heading = level === 2 ? "h2" : "h3";
  return (
    <section className={className ? `sec ${className}` : "sec"} id={id} aria-labelledby={headId}>
      <div className="sec__head">
        <Heading id={headId}>{title}</Heading>
        {aside !== undefined && <span className="sec__aside">{aside}</span>}
      </div>
      {children}
      {rests && <Rests>{rests}</Rests>}
    </section>
  );
}
