import { Glyph } from "@/components/ui/glyph";
import type { WrittenStep } from "@/lib/cases/written-step";

export interface ReworkStepsProps {
  steps: readonly WrittenStep[];
  /** The step on the screen, from 1. */
  shown: number | null;
}

/** The whole card: each step, who ticked it and when, minutes taken beside those planned. */
export function ReworkSteps({ steps, shown }: ReworkStepsProps) {
  return (
    <ol className="allsteps">
      {steps.map((step, index) => {
        const state = step.ticked ? "done" : index + 1 === shown ? "now" : undefined;
        return (
          <li key={step.id} className={state}>
            <span className="n">{step.ticked ? <Glyph name="ui-tick" label="Ticked" /> : index + 1}</span>
            <b>{step.title}</b>
            <span className={step.ticked ? "fig" : "fig quiet"}>
              {step.ticked ? step.ticked.spentMinutes : step.plannedMinutes} min
            </span>
            <small>
              {step.ticked ? `${step.ticked.by}, ${step.ticked.at}. Card ${step.plannedMinutes} min` : step.detail}
            </small>
          </li>
        );
      })}
    </ol>
  );
}
