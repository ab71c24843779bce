import Link from "next/link";
import type { ReactNode } from "react";
import { StateMark } from "@/components/cases/state-mark";
import { ReworkHops } from "@/components/cases/rework-hops";
import { ReworkSteps } from "@/components/cases/rework-steps";
import type { WrittenStep } from "@/lib/cases/written-step";
import { Section } from "@/components/ui/section";
import type { TagState } from "@/components/cases/tag-state";

export interface ReworkCardProps {
  caseRef: string;
  caseHref: string;
  /** "4 brackets" */
  parts: string;
  state: TagState;
  stateWords: string;
  steps: readonly WrittenStep[];
  /** The step on the screen, from 1; null for the outcome. */
  shown: number | null;
  stepHref: (step: number) => string;
  cardTitle: string;
  /** "Sent by Ines V, 14 Jul, 08:12" */
  sent: string;
  /** "12 of 28 min" */
  minutes: string;
  children: ReactNode;
  /** Under the card: what a senior may do. */
  foot?: ReactNode;
}

/** A rework card on its screen: where it stands, the one thing to do now, and the whole card beside or below. */
export function ReworkCard(props: ReworkCardProps) {
  const { caseRef, steps, shown } = props;
  return (
    <div className="rw">
      <p className="rw__who">
        <span>
          <Link className="ref" href={props.caseHref}>
            {caseRef}
          </Link>{" "}
          <span>{props.parts}</span>
        </span>
        <StateMark state={props.state} words={props.stateWords} />
      </p>
      <ReworkHops ticked={steps.map((step) => step.ticked !== null)} shown={shown} hrefFor={props.stepHref} />
      <div className="rw__cols">
        <div>{props.children}</div>
        <div>
          <Section title="The card" aside={props.sent}>
            <p className="rw__title">{props.cardTitle}</p>
            <ReworkSteps steps={steps} shown={shown} />
            <p className="clock">
              <span>All steps</span>
              <span className="fig">{props.minutes}</span>
            </p>
          </Section>
          {props.foot}
        </div>
      </div>
    </div>
  );
}
