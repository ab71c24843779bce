import { StepColumn } from "@/components/metals/step-column";
import { Caution } from "@/components/ui/caution";
import type { RouteVariant } from "@/lib/metals/pretreatment/route";
import { bindUnits } from "@/lib/metals/pretreatment/unit-words";

/** The same metal in another form: what is done otherwise, with its own cautions. */
export function RouteVariants({ variants }: { variants: readonly RouteVariant[] }) {
  return variants.map((variant) => (
    <article key={variant.title} className="route-variant">
      <h3>{variant.title}</h3>
      <p>{bindUnits(variant.words)}</p>
      {variant.cautions.map((caution) => (
        <Caution key={caution.text} level={caution.level}>
          {caution.text}
        </Caution>
      ))}
      {variant.steps.length > 0 && <StepColumn steps={variant.steps} label={`What differs for ${variant.title}`} />}
      <p className="route-source">Source: {variant.source}</p>
    </article>
  ));
}
