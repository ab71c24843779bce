import type { CSSProperties, ReactNode } from "react";
import { StateMark } from "@/components/cases/state-mark";
import type { TagState } from "@/components/cases/tag-state";

export interface TagUprightProps {
  caseRef: string;
  state: TagState;
  stateWords?: string;
  /** In rework: share of the steps ticked, 0 to 1. */
  progress?: number;
  /** form: large ref in the middle (second look, a case's head). card: ref and state on one line (casebook). */
  size?: "form" | "card";
  /** loop: twisted wire, for a single tag. hook: on the casebook's rail. */
  hang?: "loop" | "hook" | "none";
  /** Lines under the large ref: customer, parts, first call. */
  sub?: ReactNode;
  /** Makes the ref the page's heading. */
  headingLevel?: 1 | 2 | 3;
  as?: "div" | "article";
  /** Marked for comparing: a blue foot under the tag. */
  current?: boolean;
  /** What is on the tag; `.tag-bleed` inside it reaches the tag's edges, `.tag-foot` sticks to the screen's foot. */
  children?: ReactNode;
}

function Hanger({ hang }: { hang: "loop" | "hook" | "none" }) {
  if (hang === "none") return null;
  const drawing =
    hang === "loop"
      ? { box: "0 0 60 78", path: "M30 68C20 58 25 40 29 30S33 12 22 0M30 68C40 58 35 40 31 30S27 12 38 0" }
      : { box: "0 0 22 50", path: "M11 44V24C11 16 3 16 4 8S17 1 17 7" };
  return (
    <svg className={`tag__${hang}`} viewBox={drawing.box} fill="none" aria-hidden="true">
      <path d={drawing.path} stroke="currentColor" strokeWidth="2.6" strokeLinecap="round" />
    </svg>
  );
}

/** A tag hung upright, hole at the top and tail at the foot: the second look's form, a case's head, a casebook card. */
export function TagUpright(props: TagUprightProps) {
  const { caseRef, state, stateWords, progress = 0, size = "form", sub, children } = props;
  const Shell = props.as ?? "div";
  const Ref = props.headingLevel ? (`h${props.headingLevel}` as const) : "p";
  const hang = props.hang ?? (size === "card" ? "hook" : "loop");
  const className = ["tag", "tag--up", `tag--up-${size}`, `tag--${state}`, props.current && "is-current"]
    .filter(Boolean)
    .join(" ");
  return (
    <Shell className={className} style={{ "--done": progress } as CSSProperties}>
      <Hanger hang={hang} />
      <div className="tag__paper">
        <div className="tag__top">
          <Ref className="ref">{caseRef}</Ref>
          {stateWords && <StateMark state={state} words={stateWords} />}
        </div>
        {sub && <div className="tag__sub">{sub}</div>}
        {children}
        <span className="tag__tail" aria-hidden="true" />
      </div>
    </Shell>
  );
}
