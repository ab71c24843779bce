import { stationGlyph } from "@/components/cases/class-glyph";
import { Caution } from "@/components/ui/caution";
import { Glyph } from "@/components/ui/glyph";
import type { RouteStep, StepLiquid } from "@/lib/metals/pretreatment/route";

const LIQUID_WORDS: Partial<Record<StepLiquid, string>> = { acid: "Acid", cyanide: "Cyanide", alkali: "Alkali" };

/** Steps as a column of tanks, each with what is done, how to see that it worked, its cautions and its source. */
export function StepColumn({ steps, label }: { steps: readonly RouteStep[]; label: string }) {
  return (
    <ol className="route-steps" aria-label={label}>
      {steps.map((step, index) => (
        <Step key={`${index} ${step.title}`} step={step} />
      ))}
    </ol>
  );
}

function Step({ step }: { step: RouteStep }) {
  const liquid = LIQUID_WORDS[step.liquid];
  return (
    <li className="route-step">
      <span className="route-step__pot" data-liquid={step.liquid}>
        <Glyph name={stationGlyph(step.station)} />
      </span>
      <div className="route-step__words">
        <p className="route-step__head">
          <strong>{step.title}</strong>
          {step.minutesWords && <span className="fig">{step.minutesWords}</span>}
        </p>
        <p>{step.detail}</p>
        {step.proof && (
          <p>
            <b>Proof:</b> {step.proof}
          </p>
        )}
        {step.cautions.map((caution) => (
          <Caution key={caution.text} level={caution.level}>
            {caution.text}
          </Caution>
        ))}
        <p className="route-source">
          {liquid && <b>{liquid}. </b>}Source: {step.source}
        </p>
      </div>
    </li>
  );
}
