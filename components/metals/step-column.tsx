import { stationGlyph } from "@/components/cases/class-glyph";
import { Caution } from "@/components/ui/caution";
import { Glyph } from "@/components/ui/glyph";
import type { RouteCaution, RouteStep, StepLiquid } from "@/lib/metals/pretreatment/route";
import { bindUnits } from "@/lib/metals/pretreatment/unit-words";

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
        <p>{bindUnits(step.detail)}</p>
        {step.proof && (
          <p>
            <b>Proof:</b> {bindUnits(step.proof)}
          </p>
        )}
        {stopsFirst(step.cautions).map((caution) => (
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

/** What people get hurt by is read before the usual care. */
function stopsFirst(cautions: readonly RouteCaution[]): RouteCaution[] {
  return cautions.toSorted((a, b) => Number(b.level === "stop") - Number(a.level === "stop"));
}
